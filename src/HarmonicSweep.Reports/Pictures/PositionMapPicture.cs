using System.Numerics;
using HarmonicSweep.Studies;
using ScottPlot;
using ScottPlot.Plottables;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// |Z| at the bus of a bank: its positions down, orders across, the shade is |Z| on a logarithmic scale; one map a supply
/// strength, below each other. Positions not to be dwelt on are named at their row.
/// </summary>
internal static class PositionMapPicture
{
    private const int MostRows = 16;
    private const int Columns = 400;
    private const float RowHeight = 26;
    private const float LeftRoom = 150;
    private const float RightRoom = 150;

    /// <summary>A picture for every bank in the first state it was screened in: the other states stand in the tables.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        if (context.Result.Screen is not { } screen)
        {
            yield break;
        }

        foreach (IGrouping<string, PositionMap> bank in screen.Maps.GroupBy(m => m.Bank))
        {
            string state = bank.First().BaseState;
            PositionMap[] maps = [.. bank.Where(m => m.BaseState == state && m.Orders.Count > 1 && m.StepsIn.Count > 0)];
            if (maps.Length > 0)
            {
                string title = $"|Z| at {context.BusText(maps[0].Bus)} over the positions of {bank.Key}";
                yield return new Picture($"positions-{bank.Key}-{state}", title, () => Draw(context, title, screen, maps));
            }
        }
    }

    private static Page Draw(PictureContext context, string title, ScreenResult screen, PositionMap[] maps)
    {
        double[] ohms = [.. maps.SelectMany(m => m.Ohm).SelectMany(r => r).Where(z => z is { } v && v.Magnitude > 0).Select(z => z!.Value.Magnitude)];
        var shades = new ScottPlot.Range(Math.Log10(ohms.DefaultIfEmpty(1).Min()), Math.Log10(ohms.DefaultIfEmpty(10).Max()));
        var panels = new List<Panel>();
        for (int i = 0; i < maps.Length; i++)
        {
            panels.Add(Map(screen, maps[i], shades, last: i == maps.Length - 1));
        }

        panels.Add(Scale(shades));
        panels.Add(Key.Of(
        [
            new KeyEntry("parallel resonance", new SeriesLook(Look.Ink, new LinePattern([0.01f, 100], 0, "none"), MarkerShape.OpenCircle)),
            new KeyEntry(FormattableString.Invariant($"dashed: injected orders; avoid: a parallel resonance within {screen.NearOrders} of one")),
        ]));
        return new Page(title, $"{context.CaseTitle} · from state {maps[0].BaseState}", panels);
    }

    private static Panel Map(ScreenResult screen, PositionMap map, ScottPlot.Range shades, bool last)
    {
        int[] shown = [.. Enumerable.Range(0, map.StepsIn.Count).Where(i => map.StepsIn.Count <= MostRows || i % ((map.StepsIn.Count + MostRows - 1) / MostRows) == 0)];
        double from = map.Orders[0];
        double to = map.Orders[^1];
        float top = 34;
        float bottom = last ? 46 : 12;
        Plot plot = Look.Empty(LeftRoom, RightRoom, bottom, top);
        double[,] cells = Cells(map, shown);
        Heatmap heat = plot.Add.Heatmap(cells);
        // the library wants the centres of the outermost cells
        double half = (to - from) / cells.GetLength(1) / 2;
        heat.Position = new CoordinateRect(from + half, to - half, 0, shown.Length - 1);
        heat.Colormap = Look.Heat;
        heat.ManualRange = shades;
        heat.NaNCellColor = Colors.Gray.WithAlpha(0.25);
        Axes.Orders(plot, from, to, labelled: last);
        plot.Axes.SetLimitsY(-0.5, shown.Length - 0.5);
        plot.HideGrid();
        Axes.Injected(plot, map.InjectedOrders, from, to, numbered: true, shaded: true);
        BankPosition?[] positions = [.. shown.Select(i => PositionOf(screen, map, map.StepsIn[i]))];
        int RowOf(int i) => shown.Length - 1 - i;
        plot.Axes.Left.TickGenerator = Axes.Named(shown.Select((s, i) => ((double)RowOf(i), RowText(positions[i], map.StepsIn[s]))));
        plot.Axes.Left.MajorTickStyle.Length = 0;
        plot.Axes.Right.TickGenerator = Axes.Named(positions.Select((p, i) => (Row: (double)RowOf(i), Text: Advice(p))).Where(t => t.Text.Length > 0));
        plot.Axes.Right.Range.Set(-0.5, shown.Length - 0.5);
        plot.Axes.Right.TickLabelStyle.ForeColor = Look.Limit;
        plot.Axes.Right.TickLabelStyle.Bold = true;
        for (int i = 0; i < positions.Length; i++)
        {
            foreach (Resonance peak in positions[i]?.ParallelResonances ?? [])
            {
                plot.Add.Marker(peak.Order, RowOf(i), MarkerShape.FilledCircle, 8, Colors.White);
                plot.Add.Marker(peak.Order, RowOf(i), MarkerShape.OpenCircle, 8, Look.Ink);
            }
        }

        string strength = map.Strength.Length == 0 ? "no supply in service" : $"supply strength: {map.Strength}";
        plot.Axes.Left.Label.Text = strength;
        return new Panel(plot, shown.Length * RowHeight + top + bottom);
    }

    /// <summary>log10 |Z| per shown row and column; the largest of a column's points, so that no peak is lost.</summary>
    private static double[,] Cells(PositionMap map, int[] shown)
    {
        int columns = Math.Min(Columns, map.Orders.Count);
        var cells = new double[shown.Length, columns];
        for (int row = 0; row < shown.Length; row++)
        {
            IReadOnlyList<Complex?> ohm = map.Ohm[shown[row]];
            for (int column = 0; column < columns; column++)
            {
                int first = (int)((long)column * map.Orders.Count / columns);
                int next = Math.Max(first + 1, (int)((long)(column + 1) * map.Orders.Count / columns));
                double largest = double.NaN;
                for (int i = first; i < next; i++)
                {
                    largest = ohm[i] is { } z && !(z.Magnitude <= largest) ? z.Magnitude : largest;
                }

                cells[row, column] = Math.Log10(largest);
            }
        }

        return cells;
    }

    private static BankPosition? PositionOf(ScreenResult screen, PositionMap map, int steps) => screen.Positions.FirstOrDefault(
        p => p.Bank == map.Bank && p.BaseState == map.BaseState && p.Strength == map.Strength && p.StepsIn == steps);

    private static string RowText(BankPosition? position, int steps) => position is null
        ? FormattableString.Invariant($"{steps} steps")
        : FormattableString.Invariant($"{steps} of {position.Steps} · {position.KvarIn:0} kvar");

    private static string Advice(BankPosition? position) => position switch
    {
        { DoNotDwell: true, Nearest: { } near } => $"avoid: {Figures.ComputedOrder(near.Order)} near {Figures.Order(near.NearestInjectedOrder!.Value)}",
        { Loading.Overloaded: true } => "capacitors overloaded",
        _ => "",
    };

    /// <summary>The shades as a bar with ohms.</summary>
    private static Panel Scale(ScottPlot.Range shades)
    {
        Plot plot = Look.Empty(LeftRoom, 260, 40, 6);
        const int steps = 200;
        var ramp = new double[2, steps];
        for (int i = 0; i < steps; i++)
        {
            ramp[0, i] = ramp[1, i] = shades.Min + (shades.Max - shades.Min) * i / (steps - 1);
        }

        Heatmap bar = plot.Add.Heatmap(ramp);
        double half = (shades.Max - shades.Min) / steps / 2;
        bar.Position = new CoordinateRect(shades.Min + half, shades.Max - half, 0.25, 0.75);
        bar.ManualRange = shades;
        bar.Colormap = Look.Heat;
        plot.Axes.SetLimits(shades.Min, shades.Max, 0, 1);
        plot.HideGrid();
        plot.Axes.Left.TickGenerator = Axes.Named([]);
        var ticks = new List<(double, string)>();
        for (int decade = (int)Math.Floor(shades.Min); decade <= shades.Max; decade++)
        {
            ticks.AddRange(new[] { 1, 2, 5 }
                .Select(d => d * Math.Pow(10, decade))
                .Where(v => Math.Log10(v) >= shades.Min && Math.Log10(v) <= shades.Max)
                .Select(v => (Math.Log10(v), Figures.Tick(v))));
        }

        plot.Axes.Bottom.TickGenerator = Axes.Named(ticks);
        plot.Axes.Bottom.Label.Text = "|Z| (Ω)";
        return new Panel(plot, 66);
    }
}
