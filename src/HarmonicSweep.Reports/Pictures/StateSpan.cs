using HarmonicSweep.Reports.Drawing;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>The shaded span between the lowest and the highest of many states.</summary>
internal static class StateSpan
{
    private const double Slice = 1.5;

    /// <summary>Shades what lies between the lowest and highest value of all traces in every slice of the panel.</summary>
    public static void Draw(Sheet sheet, Panel panel, IEnumerable<ImpedanceTrace> traces, Func<ImpedanceTrace, double?[]> values)
    {
        int slices = (int)(panel.Area.Width / Slice) + 1;
        var upper = new double[slices];
        var lower = new double[slices];
        Array.Fill(upper, double.PositiveInfinity);
        foreach (ImpedanceTrace trace in traces)
        {
            double?[] up = values(trace);
            for (int i = 0; i < up.Length; i++)
            {
                if (up[i] is { } value)
                {
                    int slice = Math.Clamp((int)((panel.X(trace.Orders[i]) - panel.Area.Left) / Slice), 0, slices - 1);
                    double y = panel.Y(value);
                    upper[slice] = Math.Min(upper[slice], y);
                    lower[slice] = Math.Max(lower[slice], y);
                }
            }
        }

        var outline = new List<Spot>();
        for (int slice = 0; slice < slices; slice++)
        {
            Add(slice, upper[slice]);
        }

        for (int slice = slices - 1; slice >= 0; slice--)
        {
            Add(slice, lower[slice]);
        }

        sheet.Polygon(outline.ToArray(), Look.Span);

        void Add(int slice, double y)
        {
            if (upper[slice] <= lower[slice])
            {
                outline.Add(new Spot(Math.Min(panel.Area.Left + (slice + 0.5) * Slice, panel.Area.Right), y));
            }
        }
    }
}
