using HarmonicSweep.Studies;
using ScottPlot;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// Harmonic voltages of a bus, percent of nominal: one bar an order with the worst state, the base state beside it where it
/// differs, and the limit where one is judged.
/// </summary>
internal static class SpectrumPicture
{
    private const float Height = 320;

    /// <summary>A picture for every bus that has voltages above order 1 and is wanted.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        foreach (string bus in context.Result.States.SelectMany(s => s.Voltages).Select(v => v.Bus).Distinct().Where(context.WantsImpedance))
        {
            if (BusSpectrum.Of(context, bus) is { LargestPercent: > 0 } spectrum)
            {
                string title = $"Harmonic voltages at {context.BusText(bus)}";
                yield return new Picture($"voltage-spectrum-{bus}", title, () => Draw(context, title, spectrum));
            }
        }
    }

    private static Page Draw(PictureContext context, string title, BusSpectrum spectrum)
    {
        bool several = spectrum.States.Count > 1;
        Plot plot = Look.Empty(78, 20, 46, 10);
        Color first = Look.Series[0].Colour;
        Color worst = Look.Series[1].Colour;
        double offset = several ? 0.2 : 0;
        double size = several ? 0.36 : 0.6;
        for (int i = 0; i < spectrum.Orders.Count; i++)
        {
            AddBar(plot, i - offset, size, spectrum.Percent[0][i], first, spectrum.Exceeded[0][i], "");
            if (several && spectrum.WorstState(i) is { } state)
            {
                AddBar(plot, i + offset, size, spectrum.Percent[state][i], worst, spectrum.Exceeded[state][i], spectrum.LetterOf(state));
            }
        }

        double top = spectrum.LargestPercent;
        foreach (SpectrumLimit limit in spectrum.Limits)
        {
            top = limit.Percent < 4 * spectrum.LargestPercent ? Math.Max(top, limit.Percent) : top;
            ScottPlot.Plottables.LinePlot line = plot.Add.Line(limit.FirstSlot - 0.5, limit.Percent, limit.LastSlot + 0.5, limit.Percent);
            line.LineColor = Look.Limit;
            line.LineWidth = 2;
        }

        plot.Axes.Bottom.TickGenerator = Axes.Named(spectrum.Orders.Select((h, i) => ((double)i, Figures.Order(h))));
        plot.Axes.Bottom.MajorTickStyle.Length = 0;
        plot.Axes.Bottom.Label.Text = "Order h";
        plot.Axes.Left.Label.Text = "V_h (% of nominal voltage)";
        plot.Axes.SetLimits(-0.6, spectrum.Orders.Count - 0.4, 0, top * 1.16);
        return new Page(
            title, $"{context.CaseTitle} · {context.RuleText} · {context.StatesText}", [new Panel(plot, Height), Key.Of(Entries(spectrum, several, top))]);
    }

    private static void AddBar(Plot plot, double position, double size, double? percent, Color colour, bool exceeded, string letter)
    {
        if (percent is not { } value)
        {
            return;
        }

        plot.Add.Bar(new Bar
        {
            Position = position,
            Value = value,
            Size = size,
            FillColor = colour,
            LineColor = exceeded ? Look.Limit : Look.Ink,
            LineWidth = exceeded ? 2 : 0.5f,
        });
        ScottPlot.Plottables.Text label = plot.Add.Text(letter.Length > 0 ? $"{Figures.Percent(value)}\n{letter}" : Figures.Percent(value), position, value);
        label.LabelAlignment = Alignment.LowerCenter;
        label.OffsetY = -2;
        label.LabelFontSize = Look.SmallSize - 1;
        label.LabelFontColor = exceeded ? Look.Limit : Look.Ink;
        label.LabelBold = exceeded;
    }

    private static List<KeyEntry> Entries(BusSpectrum spectrum, bool several, double top)
    {
        var entries = new List<KeyEntry> { new($"state {spectrum.States[0]}", Fill: Look.Series[0].Colour) };
        if (several)
        {
            string letters = string.Join(", ", spectrum.LetteredStates.Select(s => $"{spectrum.LetterOf(s)} = {spectrum.States[s]}"));
            entries.Add(new KeyEntry($"worst of all states: {letters}", Fill: Look.Series[1].Colour));
        }

        foreach (IGrouping<string, SpectrumLimit> standard in spectrum.Limits.GroupBy(l => l.Standard))
        {
            string percent = string.Join(", ", standard.Select(l => Figures.LimitPercent(l.Percent)).Distinct());
            string beyond = standard.All(l => l.Percent > top) ? ", beyond this axis" : "";
            entries.Add(new KeyEntry($"limit of each order, {standard.Key}: {percent} %{beyond}", new SeriesLook(Look.Limit, LinePattern.Solid, MarkerShape.None)));
        }

        return entries;
    }
}
