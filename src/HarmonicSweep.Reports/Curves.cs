using ScottPlot;

namespace HarmonicSweep.Reports;

/// <summary>Curves with gaps, thinned to what the eye can tell apart.</summary>
internal static class Curves
{
    /// <summary>Points kept of a curve at most, its extrema among them: more than a picture has columns.</summary>
    private const int MostPoints = 1200;

    /// <summary>Adds the runs of a curve between its gaps (null values).</summary>
    /// <param name="plot">Plot.</param>
    /// <param name="across">Values of the horizontal axis, ascending.</param>
    /// <param name="up">Values of the vertical axis; null = gap.</param>
    /// <param name="look">Line.</param>
    /// <param name="breakAbove">A larger step between neighbours breaks the curve (a wrapped angle).</param>
    public static void Add(
        Plot plot, IReadOnlyList<double> across, IReadOnlyList<double?> up, SeriesLook look, double breakAbove = double.PositiveInfinity)
    {
        var xs = new List<double>();
        var ys = new List<double>();
        for (int i = 0; i <= up.Count; i++)
        {
            bool ends = i == up.Count || up[i] is null || (ys.Count > 0 && Math.Abs(up[i]!.Value - ys[^1]) > breakAbove);
            if (ends && xs.Count > 0)
            {
                AddRun(plot, xs, ys, look);
                xs.Clear();
                ys.Clear();
            }

            if (i < up.Count && up[i] is { } value)
            {
                xs.Add(across[i]);
                ys.Add(value);
            }
        }
    }

    /// <summary>A remark inside a plot at a share of its height.</summary>
    public static void Remark(Plot plot, double across, double share, string text)
    {
        AxisLimits limits = plot.Axes.GetLimits();
        ScottPlot.Plottables.Text remark = plot.Add.Text(text, across, limits.Bottom + share * limits.VerticalSpan);
        remark.LabelAlignment = Alignment.MiddleCenter;
        remark.LabelFontSize = Look.TextSize + 1;
        remark.LabelFontColor = Look.Muted;
    }

    private static void AddRun(Plot plot, List<double> xs, List<double> ys, SeriesLook look)
    {
        if (xs.Count == 1)
        {
            plot.Add.Marker(xs[0], ys[0], look.Mark, 7, look.Colour);
            return;
        }

        int[] kept = Thin(ys);
        ScottPlot.Plottables.Scatter line = plot.Add.ScatterLine(
            Array.ConvertAll(kept, i => xs[i]), Array.ConvertAll(kept, i => ys[i]), look.Colour);
        line.LineWidth = Look.CurveWidth;
        line.LinePattern = look.Dash;
    }

    /// <summary>First, lowest, highest and last point of every slice, so that no peak is lost.</summary>
    internal static int[] Thin(List<double> ys)
    {
        if (ys.Count <= MostPoints)
        {
            return [.. Enumerable.Range(0, ys.Count)];
        }

        int slices = MostPoints / 4;
        var kept = new SortedSet<int>();
        for (int slice = 0; slice < slices; slice++)
        {
            int start = (int)((long)slice * ys.Count / slices);
            int end = (int)((long)(slice + 1) * ys.Count / slices);
            int low = start;
            int high = start;
            for (int i = start; i < end; i++)
            {
                low = ys[i] < ys[low] ? i : low;
                high = ys[i] > ys[high] ? i : high;
            }

            kept.UnionWith([start, low, high, end - 1]);
        }

        return [.. kept];
    }
}
