using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// Harmonic voltages of a bus against order, with the limits of single orders: states side by side while that can be read,
/// else the worst state of every order, named by a letter.
/// </summary>
internal static class SpectrumPicture
{
    private const int MostBars = 110;
    private const int MostLetters = 56;
    private const int MostBusesUnasked = 12;
    private const double PanelHeight = 230;
    private const double HeadRoom = 1.12;

    /// <summary>A limit further above the bars than this would flatten them: it is written instead of drawn.</summary>
    private const double FarLimit = 5;

    /// <summary>A picture for the PCC and every bus that was scanned; without a scan, for the buses with the largest THD.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        foreach (string bus in BusesOf(context))
        {
            if (BusSpectrum.Of(context, bus) is { } spectrum)
            {
                yield return Of(context, spectrum);
            }
        }
    }

    private static IReadOnlyList<string> BusesOf(PictureContext context)
    {
        var withVoltages = context.Result.States.SelectMany(s => s.Voltages).Select(v => v.Bus).Distinct().ToList();
        var scanned = context.Result.States.SelectMany(s => s.Impedance).Select(c => c.At).Append(context.Settings.PccBus).ToHashSet();
        if (context.Result.States.Any(s => s.Impedance.Count > 0))
        {
            return [.. withVoltages.Where(scanned.Contains)];
        }

        var worst = context.Result.States.SelectMany(s => s.Distortion)
            .Where(d => d.Rule == context.Settings.Rule)
            .GroupBy(d => d.Bus)
            .OrderByDescending(g => g.Key == context.Settings.PccBus)
            .ThenByDescending(g => g.Max(d => d.PercentOfFundamental ?? 0))
            .Select(g => g.Key)
            .Take(MostBusesUnasked)
            .ToHashSet();
        return withVoltages.Count <= MostBusesUnasked ? withVoltages : [.. withVoltages.Where(worst.Contains)];
    }

    private static Picture Of(PictureContext context, BusSpectrum spectrum)
    {
        bool beside = spectrum.States.Count <= Look.Bars.Length && spectrum.States.Count * spectrum.Orders.Count <= MostBars;
        double largest = spectrum.LargestPercent;
        double highestLimit = spectrum.Limits.Where(l => l.Percent <= FarLimit * largest).Select(l => l.Percent).DefaultIfEmpty(0).Max();
        List<LegendEntry> legend = LegendOf(spectrum, beside, largest);
        double top = Picture.HeaderHeight + 6, legendTop = top + PanelHeight + Panel.BottomRoom + 6;
        double height = legendTop + Legend.Height(legend, Picture.Width - 2 * Picture.Margin) + 6;
        string choices = $"{context.RuleText} · {context.StatesText(spectrum.States.Count)}";
        return new Picture($"voltage-spectrum-{spectrum.Bus}", $"Harmonic voltages at {context.BusText(spectrum.Bus)}", context.CaseTitle, choices, height, sheet =>
        {
            LinearScale up = LinearScale.FromZero(Math.Max(largest * HeadRoom, highestLimit * 1.06), 6);
            var across = new CategoryScale([.. spectrum.Orders.Select(Figures.Order)]);
            var panel = new Panel(new Box(Panel.LeftRoom(up), top, Picture.Width - Picture.Margin, top + PanelHeight), across, up);
            panel.DrawGrid(sheet, vertical: false);
            DrawLimits(sheet, panel, spectrum);
            if (beside)
            {
                DrawBeside(sheet, panel, spectrum);
            }
            else
            {
                DrawWorst(sheet, panel, spectrum);
            }

            panel.DrawFrame(sheet, "Voltage (% of nominal)");
            panel.DrawAcross(sheet, "Order h");
            Legend.Draw(sheet, legend, Picture.Margin, legendTop, Picture.Width - 2 * Picture.Margin);
        });
    }

    private static bool HasLetters(BusSpectrum spectrum) => spectrum.Orders.Count <= MostLetters;

    private static void DrawBeside(Sheet sheet, Panel panel, BusSpectrum spectrum)
    {
        int count = spectrum.States.Count;
        for (int state = 0; state < count; state++)
        {
            for (int order = 0; order < spectrum.Orders.Count; order++)
            {
                if (spectrum.Percent[state][order] is { } percent)
                {
                    double width = 0.8 / count, from = order + 0.1 + state * width;
                    DrawBar(sheet, panel, from, from + width, percent, Look.Bars[state], spectrum.Exceeded[state][order]);
                }
            }
        }
    }

    private static void DrawWorst(Sheet sheet, Panel panel, BusSpectrum spectrum)
    {
        for (int order = 0; order < spectrum.Orders.Count; order++)
        {
            if (spectrum.WorstState(order) is not { } worst)
            {
                continue;
            }

            double percent = spectrum.Percent[worst][order]!.Value;
            DrawBar(sheet, panel, order + 0.2, order + 0.8, percent, Look.Bars[0], spectrum.Exceeded[worst][order]);
            double lowest = panel.Y(spectrum.Percent.Min(p => p[order])!.Value);
            sheet.Line(panel.X(order + 0.1), lowest, panel.X(order + 0.9), lowest, new Stroke(Look.Bars[1], 2));
            if (HasLetters(spectrum))
            {
                double lift = spectrum.Exceeded[worst][order] ? 12 : 3;
                sheet.Write(
                    spectrum.LetterOf(worst), panel.X(order + 0.5), panel.Y(percent) - lift, Look.Small with { Anchor = Anchor.Middle, Bold = true, Halo = true });
            }
        }
    }

    private static void DrawBar(Sheet sheet, Panel panel, double from, double to, double percent, Colour colour, bool exceeded)
    {
        var bar = new Box(panel.X(from), panel.Y(percent), panel.X(to), panel.Area.Bottom);
        sheet.Fill(bar, colour);
        if (bar.Width >= 4)
        {
            sheet.Outline(bar, Look.Frame with { Width = 0.5 });
        }

        if (exceeded)
        {
            sheet.Polygon(ExceededMark((bar.Left + bar.Right) / 2, bar.Top - 3), Look.Limit);
        }
    }

    private static Spot[] ExceededMark(double x, double y) => [new(x, y), new(x - 3.5, y - 6.5), new(x + 3.5, y - 6.5)];

    private static void DrawLimits(Sheet sheet, Panel panel, BusSpectrum spectrum)
    {
        foreach (SpectrumLimit limit in spectrum.Limits.Where(l => l.Percent <= panel.Up.To))
        {
            double y = panel.Y(limit.Percent);
            sheet.Line(panel.X(limit.FirstSlot), y, panel.X(limit.LastSlot + 1), y, Look.LimitLine);
        }
    }

    private static List<LegendEntry> LegendOf(BusSpectrum spectrum, bool beside, double largest)
    {
        var entries = new List<LegendEntry>();
        if (beside)
        {
            entries.AddRange(spectrum.States.Select((s, i) => LegendEntry.Patch(
                spectrum.Percent[i].All(p => p is null) ? $"{s}: bus dead or nothing injected" : s, Look.Bars[i])));
        }
        else
        {
            entries.Add(LegendEntry.Patch(FormattableString.Invariant($"worst of {spectrum.States.Count} states{(HasLetters(spectrum) ? ", its letter above" : "")}"), Look.Bars[0]));
            entries.Add(LegendEntry.Line("lowest of them", new Stroke(Look.Bars[1], 2)));
            entries.AddRange(spectrum.LetteredStates.Where(_ => HasLetters(spectrum)).Select(s => LegendEntry.Key(spectrum.States[s], spectrum.LetterOf(s))));
        }

        foreach (var limits in spectrum.Limits.GroupBy(l => l.Standard))
        {
            double[] percents = [.. limits.Select(l => l.Percent).Distinct().Order()];
            string range = percents.Length == 1 ? Figures.LimitPercent(percents[0]) : $"{Figures.LimitPercent(percents[0])} to {Figures.LimitPercent(percents[^1])}";
            string hidden = percents[0] > FarLimit * largest ? ", above this axis" : "";
            entries.Add(LegendEntry.Line($"limit of one order, {limits.Key}: {range} %{hidden}", Look.LimitLine));
        }

        if (spectrum.Exceeded.Any(e => e.Contains(true)))
        {
            entries.Add(new LegendEntry("limit exceeded", (sheet, box) => sheet.Polygon(
                ExceededMark((box.Left + box.Right) / 2, box.Bottom - 4), Look.Limit)));
        }

        return entries;
    }
}
