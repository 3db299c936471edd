using HarmonicSweep.Studies;
using ScottPlot;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>THD of every bus as lying bars, so that long names can be read: the first state and the worst one with its name.</summary>
internal static class DistortionPicture
{
    private const int MostRows = 32;
    private const float RowHeight = 30;

    /// <summary>One picture; with more buses than it has rows, the worst ones and the PCC.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        BusThd[] all = [.. BusThd.All(context)];
        if (all.All(r => r.Percent.All(p => p is null or 0)))
        {
            yield break;
        }

        var worst = all.OrderByDescending(r => r.Bus == context.Settings.PccBus).ThenByDescending(r => r.Percent.Max() ?? -1).Take(MostRows).ToHashSet();
        BusThd[] rows = [.. all.Where(worst.Contains)];
        string part = rows.Length == all.Length ? "" : FormattableString.Invariant($", the worst {rows.Length} of {all.Length}");
        string title = "Voltage distortion (THD) by bus" + part;
        yield return new Picture("thd", title, () => Draw(context, title, rows));
    }

    private static Page Draw(PictureContext context, string title, BusThd[] rows)
    {
        bool several = context.Result.States.Count > 1;
        float nameRoom = Math.Clamp(rows.Max(r => EmbeddedFonts.Width(context.BusText(r.Bus), Look.TextSize)) + 20, 60, 260);
        Plot plot = Look.Empty(nameRoom, 20, 46, 6);
        double largest = rows.SelectMany(r => r.Percent).Max(p => p ?? 0);
        double furthest = rows.SelectMany(r => r.Limits).Select(l => l.Percent).Where(l => l <= 4 * largest).DefaultIfEmpty(0).Max();
        for (int i = 0; i < rows.Length; i++)
        {
            DrawRow(plot, context, rows[i], rows.Length - 1 - i, several);
        }

        plot.Axes.Left.TickGenerator = Axes.Named(rows.Select((r, i) => ((double)(rows.Length - 1 - i), EmbeddedFonts.Fit(context.BusText(r.Bus), Look.TextSize, nameRoom - 14))));
        plot.Axes.Left.MajorTickStyle.Length = 0;
        plot.Axes.Bottom.Label.Text = "THD (% of V₁)";
        plot.Axes.SetLimits(0, Math.Max(largest * 1.42, furthest * 1.05), -0.6, rows.Length - 0.4);
        plot.Grid.YAxisStyle.IsVisible = false;
        return new Page(
            title, $"{context.CaseTitle} · orders 2 to 50, {context.RuleText} · {context.StatesText}",
            [new Panel(plot, rows.Length * RowHeight + 60), Key.Of(Entries(context, rows, several, largest))]);
    }

    private static void DrawRow(Plot plot, PictureContext context, BusThd row, int place, bool several)
    {
        double offset = several ? 0.2 : 0;
        double size = several ? 0.36 : 0.6;
        AddBar(plot, place + offset, size, row.Percent[0], row.Exceeded[0], Look.Series[0].Colour, "");
        if (several && row.WorstState is { } worst)
        {
            AddBar(plot, place - offset, size, row.Percent[worst], row.Exceeded[worst], Look.Series[1].Colour, context.Result.States[worst].State);
        }

        foreach (ThdLimit limit in row.Limits)
        {
            ScottPlot.Plottables.LinePlot line = plot.Add.Line(limit.Percent, place - 0.48, limit.Percent, place + 0.48);
            line.LineColor = Look.Limit;
            line.LineWidth = 2.4f;
        }
    }

    private static void AddBar(Plot plot, double place, double size, double? percent, bool exceeded, Color colour, string state)
    {
        string text = percent is { } p ? $"{Figures.Percent(p)}{(exceeded ? " exceeds" : "")}" : "dead bus, not judged";
        if (percent is { } value)
        {
            plot.Add.Bar(new Bar
            {
                Position = place,
                Value = value,
                Size = size,
                FillColor = colour,
                LineColor = Look.Ink,
                LineWidth = 0.5f,
                Orientation = Orientation.Horizontal,
            });
        }

        ScottPlot.Plottables.Text label = plot.Add.Text(state.Length > 0 ? $"{text} · {state}" : text, percent ?? 0, place);
        label.LabelAlignment = Alignment.MiddleLeft;
        label.OffsetX = 4;
        label.LabelFontSize = Look.SmallSize;
        label.LabelFontColor = exceeded ? Look.Limit : percent is null ? Look.Muted : Look.Ink;
        label.LabelBold = exceeded;
    }

    private static List<KeyEntry> Entries(PictureContext context, BusThd[] rows, bool several, double largest)
    {
        var entries = new List<KeyEntry> { new($"state {context.Result.States[0].State}", Fill: Look.Series[0].Colour) };
        if (several)
        {
            entries.Add(new KeyEntry("worst of all states, named beside the bar", Fill: Look.Series[1].Colour));
        }

        foreach (ThdLimit limit in rows.SelectMany(r => r.Limits).Distinct())
        {
            string beyond = limit.Percent > 4 * largest ? ", beyond this axis" : "";
            entries.Add(new KeyEntry(
                $"THD limit at the PCC, {limit.Standard}: {Figures.LimitPercent(limit.Percent)} % of nominal voltage{beyond}",
                new SeriesLook(Look.Limit, LinePattern.Solid, MarkerShape.None)));
        }

        return entries;
    }
}
