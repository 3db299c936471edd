using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using ScottPlot;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// Impedance at a bus against order: magnitude above, angle below, states overlaid. The magnitude stands on a logarithmic
/// axis, so that a valley (a tuned filter) can be read as well as a peak.
/// </summary>
internal static class ImpedancePicture
{
    private const float MagnitudeHeight = 330;
    private const float AngleHeight = 170;
    private const float LeftRoom = 74;
    private const float RightRoom = 20;

    /// <summary>A picture for every bus (and bus of injection, and sequence) that has curves.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        var keys = context.Result.States.SelectMany(s => s.Impedance).Select(c => (c.Sequence, c.At, c.From)).Distinct();
        foreach ((Sequence sequence, string at, string from) in keys.Where(k => context.WantsImpedance(k.At)))
        {
            ImpedanceTrace[] traces =
            [
                .. context.Result.States.SelectMany(s => s.Impedance
                    .Where(c => c.Sequence == sequence && c.At == at && c.From == from && c.Orders.Count > 0)
                    .Select(c => ImpedanceTrace.Of(s, c))),
            ];
            if (traces.Length > 0)
            {
                string where = at == from ? $"at {context.BusText(at)}" : $"at {context.BusText(at)}, current injected at {from}";
                string title = $"{(at == from ? "Driving-point" : "Transfer")} impedance {where}";
                string prefix = sequence == Sequence.Positive ? "" : sequence.ToString().ToLowerInvariant() + "-";
                string name = $"{prefix}impedance-{at}{(at == from ? "" : $"-from-{from}")}";
                string subtitle = $"{context.CaseTitle} · {sequence.ToString().ToLowerInvariant()} sequence · dashed: injected orders";
                yield return new Picture(name, title, () => Draw(title, subtitle, traces));
            }
        }
    }

    private static Page Draw(string title, string subtitle, ImpedanceTrace[] traces)
    {
        ImpedanceTrace[] drawn = Outstanding(traces);
        double from = traces.Min(t => t.Orders[0]);
        double to = Math.Max(traces.Max(t => t.Orders[^1]), from + 0.1);
        double[] injected = [.. traces.SelectMany(t => t.InjectedOrders).Distinct().Order()];
        Plot magnitude = Look.Empty(LeftRoom, RightRoom, 8, Axes.InjectedRoom);
        Plot angle = Look.Empty(LeftRoom, RightRoom, 46, 4);
        Axes.Orders(magnitude, from, to, labelled: false);
        Axes.Orders(angle, from, to, labelled: true);
        double[] ohms = [.. drawn.SelectMany(t => t.Ohm).Where(z => z > 0).Select(z => z!.Value)];
        Axes.Logarithmic(magnitude, ohms.DefaultIfEmpty(1).Min(), ohms.DefaultIfEmpty(10).Max(), "|Z| (Ω)");
        bool wide = drawn.Any(t => t.Degrees.Any(d => d is < -91 or > 91));
        angle.Axes.SetLimitsY(wide ? -190 : -95, wide ? 190 : 95);
        angle.Axes.Left.TickGenerator = Axes.Named((wide ? new[] { -180, -90, 0, 90, 180 } : [-90, -45, 0, 45, 90]).Select(d => ((double)d, Figures.Tick(d))));
        angle.Axes.Left.Label.Text = "Angle (°)";
        Axes.Injected(magnitude, injected, from, to, numbered: true);
        Axes.Injected(angle, injected, from, to, numbered: false);
        for (int i = drawn.Length - 1; i >= 0; i--) // the first state, mostly the base, comes on top
        {
            Curves.Add(magnitude, drawn[i].Orders, [.. drawn[i].Ohm.Select(z => z > 0 ? Math.Log10(z.Value) : (double?)null)], Look.Series[i]);
            Curves.Add(angle, drawn[i].Orders, drawn[i].Degrees, Look.Series[i], breakAbove: 180);
        }

        MarkPeaks(magnitude, drawn, to - from);
        if (Array.TrueForAll(drawn, t => t.IsOpen))
        {
            Curves.Remark(magnitude, (from + to) / 2, 0.5, "open: no path to ground at any order");
        }

        return new Page(title, subtitle, [new Panel(magnitude, MagnitudeHeight), new Panel(angle, AngleHeight), Key.Of(Entries(drawn, traces.Length))]);
    }

    /// <summary>The first state and those with the highest peaks, as many as there are looks.</summary>
    private static ImpedanceTrace[] Outstanding(ImpedanceTrace[] traces)
    {
        var others = traces.Skip(1).OrderByDescending(t => t.Highest).Take(Look.Series.Length - 1).ToHashSet();
        return [.. traces.Where((t, i) => i == 0 || others.Contains(t))];
    }

    /// <summary>A mark on every parallel resonance; the numbers beside those of the highest, where they do not collide.</summary>
    private static void MarkPeaks(Plot plot, ImpedanceTrace[] drawn, double span)
    {
        var labelled = new List<(double Order, double Log)>();
        double height = plot.Axes.GetLimits().VerticalSpan;
        var peaks = drawn.SelectMany((t, i) => t.Peaks.Select(p => (Peak: p, Look: Look.Series[i]))).OrderByDescending(p => p.Peak.Ohm);
        foreach ((Resonance peak, SeriesLook look) in peaks)
        {
            double log = Math.Log10(peak.Ohm);
            plot.Add.Marker(peak.Order, log, look.Mark, 8, look.Colour);
            bool room = labelled.TrueForAll(l => Math.Abs(l.Order - peak.Order) > span * 0.075 || Math.Abs(l.Log - log) > height * 0.13);
            if (room)
            {
                labelled.Add((peak.Order, log));
                string text = $"{Figures.ComputedOrder(peak.Order)}\n{Figures.Short(peak.Ohm)} Ω";
                ScottPlot.Plottables.Text label = plot.Add.Text(text, peak.Order, log);
                label.LabelAlignment = Alignment.LowerCenter;
                label.OffsetY = -7;
                label.LabelFontSize = Look.SmallSize;
                label.LabelBold = true;
                label.LabelFontColor = look.Colour;
                label.LabelBackgroundColor = Colors.White.WithAlpha(0.7);
            }
        }
    }

    private static List<KeyEntry> Entries(ImpedanceTrace[] drawn, int states)
    {
        var entries = drawn.Select((t, i) => new KeyEntry($"{t.State}:  {Details(t)}", Look.Series[i])).ToList();
        if (states > drawn.Length)
        {
            entries.Add(new KeyEntry(FormattableString.Invariant(
                $"{drawn.Length} of {states} states drawn: the first and those with the highest peaks; the tables have all")));
        }

        return entries;
    }

    private static string Details(ImpedanceTrace trace) => trace.IsOpen ? "open, no path to ground"
        : trace.Peaks.Length == 0 ? "no parallel resonance in this range"
        : "parallel at " + string.Join(", ", trace.Peaks.Select(p => $"{Figures.ComputedOrder(p.Order)} ({Figures.Short(p.Ohm)} Ω)"));
}
