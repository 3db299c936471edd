namespace HarmonicSweep.Reports.Drawing;

/// <summary>A curve on a sheet: runs of spots between gaps, thinned to what the eye can tell apart.</summary>
internal static class Curve
{
    /// <summary>Width in which at most four spots are kept, sheet units; 540 units give at most 1440 spots, before straightening.</summary>
    private const double Slice = 1.5;

    /// <summary>A spot closer than this to the line between its neighbours is not drawn: 0.0015 cm on paper.</summary>
    private const double Tolerance = 0.06;

    /// <summary>The runs of a curve between its gaps (null values).</summary>
    /// <param name="panel">Where it is drawn.</param>
    /// <param name="across">Values of the horizontal axis, ascending.</param>
    /// <param name="up">Values of the vertical axis; null = gap.</param>
    /// <param name="largestStep">A larger step upwards between neighbours breaks the curve (a wrapped angle).</param>
    public static List<Spot[]> Runs(
        Panel panel, IReadOnlyList<double> across, IReadOnlyList<double?> up, double largestStep = double.PositiveInfinity)
    {
        var runs = new List<Spot[]>();
        var run = new List<Spot>();
        double last = double.NaN;
        for (int i = 0; i < across.Count; i++)
        {
            if (up[i] is not { } value)
            {
                End();
                continue;
            }

            if (Math.Abs(value - last) > largestStep)
            {
                End();
            }

            run.Add(new Spot(panel.X(across[i]), panel.Y(value)));
            last = value;
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
    public static void Draw(Sheet sheet, List<Spot[]> runs, SeriesLook look)
    {
        foreach (Spot[] run in runs)
        {
            if (run.Length == 1)
            {
                sheet.Mark(look.Mark, run[0].X, run[0].Y, 3, look.Colour);
            }
            else
            {
                sheet.Polyline(run, look.Stroke(Look.CurveWidth));
            }
        }
    }

    /// <summary>First, lowest, highest and last spot of every slice, so that no peak is lost, less those on straight lines.</summary>
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

            int last = -1;
            foreach (int index in (ReadOnlySpan<int>)[start, Math.Min(low, high), Math.Max(low, high), end - 1])
            {
                if (index > last)
                {
                    kept.Add(run[index]);
                    last = index;
                }
            }

            start = end;
        }

        return Straightened(kept);
    }

    /// <summary>Leaves out spots that lie on the line between spots kept (Douglas and Peucker 1973): most of a smooth curve.</summary>
    private static Spot[] Straightened(List<Spot> run)
    {
        var kept = new List<Spot> { run[0] };
        if (run.Count > 1)
        {
            KeepBetween(0, run.Count - 1);
        }

        return kept.ToArray();

        void KeepBetween(int first, int last)
        {
            Spot a = run[first], b = run[last];
            double length = Math.Max(Math.Sqrt((b.X - a.X) * (b.X - a.X) + (b.Y - a.Y) * (b.Y - a.Y)), 1e-9), furthest = Tolerance;
            int at = -1;
            for (int i = first + 1; i < last; i++)
            {
                double distance = Math.Abs((run[i].X - a.X) * (b.Y - a.Y) - (run[i].Y - a.Y) * (b.X - a.X)) / length;
                if (distance > furthest)
                {
                    (furthest, at) = (distance, i);
                }
            }

            if (at < 0)
            {
                kept.Add(b);
                return;
            }

            KeepBetween(first, at);
            KeepBetween(at, last);
        }
    }
}
