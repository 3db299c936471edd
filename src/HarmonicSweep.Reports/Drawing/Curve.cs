namespace HarmonicSweep.Reports.Drawing;

/// <summary>A curve on a sheet: runs of spots between gaps, thinned to what the eye can tell apart.</summary>
internal static class Curve
{
    /// <summary>Width in which at most four spots are kept, sheet units; 540 units give at most 1440 spots.</summary>
    private const double Slice = 1.5;

    /// <summary>The runs of a curve between its gaps (null values).</summary>
    /// <param name="panel">Where it is drawn.</param>
    /// <param name="points">Across and up values, ascending across; null up = gap.</param>
    /// <param name="largestStep">A larger step upwards between neighbours breaks the curve (a wrapped angle).</param>
    public static List<Spot[]> Runs(Panel panel, IEnumerable<(double Across, double? Up)> points, double largestStep = double.PositiveInfinity)
    {
        var runs = new List<Spot[]>();
        var run = new List<Spot>();
        double last = double.NaN;
        foreach ((double across, double? up) in points)
        {
            if (up is not { } value || Math.Abs(value - last) > largestStep)
            {
                End();
            }

            if (up is { } kept)
            {
                run.Add(new Spot(panel.X(across), panel.Y(kept)));
                last = kept;
            }
        }

        End();
        return runs;

        void End()
        {
            if (run.Count > 0)
            {
                runs.Add(Thin(run));
                run.Clear();
            }

            last = double.NaN;
        }
    }

    /// <summary>Draws the runs; a run of one spot becomes a mark.</summary>
    public static void Draw(Sheet sheet, IEnumerable<Spot[]> runs, SeriesLook look, double width = Look.CurveWidth)
    {
        foreach (Spot[] run in runs)
        {
            if (run.Length == 1)
            {
                sheet.Mark(look.Mark, run[0].X, run[0].Y, 3, look.Colour);
            }
            else
            {
                sheet.Polyline(run, look.Stroke(width));
            }
        }
    }

    /// <summary>First, lowest, highest and last spot of every slice, so that no peak is lost.</summary>
    public static Spot[] Thin(IReadOnlyList<Spot> run)
    {
        var kept = new List<Spot>();
        for (int start = 0; start < run.Count;)
        {
            double slice = Math.Floor(run[start].X / Slice);
            int low = start, high = start, end = start;
            for (; end < run.Count && Math.Floor(run[end].X / Slice) == slice; end++)
            {
                low = run[end].Y < run[low].Y ? end : low;
                high = run[end].Y > run[high].Y ? end : high;
            }

            foreach (int index in new SortedSet<int> { start, low, high, end - 1 })
            {
                kept.Add(run[index]);
            }

            start = end;
        }

        return [.. kept];
    }
}
