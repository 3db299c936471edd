using HarmonicSweep.Reports.Drawing;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>The shaded span between the lowest and the highest of many states.</summary>
internal static class StateSpan
{
    private const double Slice = 1.5;

    /// <summary>Shades what lies between the lowest and highest value of all traces in every slice of the panel.</summary>
    public static void Draw(Sheet sheet, Panel panel, IEnumerable<ImpedanceTrace> traces, Func<TracePoint, double?> value)
    {
        var high = new SortedDictionary<int, double>();
        var low = new SortedDictionary<int, double>();
        foreach (TracePoint point in traces.SelectMany(t => t.Points))
        {
            if (value(point) is { } v)
            {
                int slice = (int)Math.Floor(panel.X(point.Order) / Slice);
                double y = panel.Y(v);
                high[slice] = Math.Min(y, high.GetValueOrDefault(slice, double.PositiveInfinity));
                low[slice] = Math.Max(y, low.GetValueOrDefault(slice, double.NegativeInfinity));
            }
        }

        IEnumerable<Spot> upper = high.Select(p => new Spot(X(p.Key), p.Value));
        IEnumerable<Spot> lower = low.Reverse().Select(p => new Spot(X(p.Key), p.Value));
        sheet.Polygon([.. upper, .. lower], Look.Span);

        double X(int slice) => Math.Clamp((slice + 0.5) * Slice, panel.Area.Left, panel.Area.Right);
    }
}
