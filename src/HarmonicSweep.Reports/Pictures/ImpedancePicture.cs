using HarmonicSweep.Network;
using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// Impedance at a bus against order: magnitude above, angle below, states overlaid. The magnitude stands on a logarithmic
/// axis, so that a valley (a tuned filter) can be read as well as a peak.
/// </summary>
internal static class ImpedancePicture
{
    /// <summary>With more states than these the rest become a shaded span.</summary>
    private const int MostCurves = 8;

    private const int CurvesBesideSpan = 5;
    private const double MagnitudeHeight = 240;
    private const double AngleHeight = 104;
    private const double PanelGap = 12;
    private const double LabelRoom = 34;

    /// <summary>A picture for every bus (and bus of injection, and sequence) that has curves.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        var keys = context.Result.States.SelectMany(s => s.Impedance).Select(c => (c.Sequence, c.At, c.From)).Distinct();
        foreach ((Sequence sequence, string at, string from) in keys)
        {
            var traces = new List<ImpedanceTrace>();
            var without = new List<string>();
            foreach (StateResult state in context.Result.States)
            {
                ImpedanceCurve? curve = state.Impedance.FirstOrDefault(c => c.Sequence == sequence && c.At == at && c.From == from);
                if (curve is null || curve.Orders.Count == 0)
                {
                    without.Add(state.State);
                    continue;
                }

                traces.Add(ImpedanceTrace.Of(state, curve));
            }

            if (traces.Count > 0)
            {
                yield return Of(context, sequence, at, from, traces, without);
            }
        }
    }

    private static Picture Of(
        PictureContext context, Sequence sequence, string at, string from, List<ImpedanceTrace> traces, List<string> without)
    {
        string where = at == from ? $"at {context.BusText(at)}" : $"at {context.BusText(at)}, current injected at {from}";
        string title = $"{(at == from ? "Driving-point" : "Transfer")} impedance {where}";
        string subtitle = $"{context.CaseTitle} · {sequence.ToString().ToLowerInvariant()} sequence · {context.StatesText(context.Result.States.Count)}";
        double[] injected = [.. traces.SelectMany(t => t.InjectedOrders).Distinct().Order()];

        bool span = traces.Count > MostCurves;
        List<ImpedanceTrace> drawn = span ? Outstanding(traces) : traces;
        List<LegendEntry> legend = LegendOf(drawn, span ? traces.Count : 0, without);
        double top = Picture.HeaderHeight + OrderMarks.Room(injected);
        double legendTop = top + MagnitudeHeight + PanelGap + AngleHeight + Panel.BottomRoom + 6;
        double height = legendTop + Legend.Height(legend, Picture.Width - 2 * Picture.Margin) + 6;
        string name = $"{(sequence == Sequence.Positive ? "" : sequence.ToString().ToLowerInvariant() + "-")}impedance-{at}{(at == from ? "" : $"-from-{from}")}";
        return new Picture(name, title, subtitle, height, sheet =>
        {
            (Panel magnitude, Panel angle) = Panels(traces, top);
            magnitude.DrawGrid(sheet);
            angle.DrawGrid(sheet);
            if (span)
            {
                StateSpan.Draw(sheet, magnitude, traces, p => p.Ohm);
                StateSpan.Draw(sheet, angle, traces, p => p.Degrees);
            }

            OrderMarks.DrawLines(sheet, magnitude, injected);
            OrderMarks.DrawLines(sheet, angle, injected);
            for (int i = drawn.Count - 1; i >= 0; i--) // the first state, mostly the base, comes on top
            {
                SeriesLook look = Look.Series[i % Look.Series.Length];
                Curve.Draw(sheet, Curve.Runs(magnitude, drawn[i].Points.Select(p => (p.Order, p.Ohm))), look);
                Curve.Draw(sheet, Curve.Runs(angle, drawn[i].Points.Select(p => (p.Order, p.Degrees)), 180), look);
            }

            DrawPeaks(sheet, magnitude, drawn);
            OrderMarks.DrawNumbers(sheet, magnitude, injected);
            magnitude.DrawFrame(sheet, "|Z| (Ω)");
            angle.DrawFrame(sheet, "Angle (°)");
            angle.DrawAcross(sheet, "Order h (frequency / fundamental)");
            if (traces.TrueForAll(t => t.IsOpen))
            {
                magnitude.DrawRemark(sheet, "open: no path to ground at any order");
            }

            Legend.Draw(sheet, legend, Picture.Margin, legendTop, Picture.Width - 2 * Picture.Margin);
        });
    }

    private static (Panel Magnitude, Panel Angle) Panels(List<ImpedanceTrace> traces, double top)
    {
        LinearScale across = LinearScale.Over(traces.Min(t => t.Curve.Orders[0]), traces.Max(t => t.Curve.Orders[^1]), 12);
        LogScale ohm = LogScale.Covering(traces.SelectMany(t => t.Points).Select(p => p.Ohm ?? 0), LabelRoom / MagnitudeHeight);
        bool wide = traces.Exists(t => t.Points.Any(p => p.Degrees is < -90.5 or > 90.5));
        LinearScale degrees = wide ? LinearScale.Stepped(-180, 180, 90, 45) : LinearScale.Stepped(-90, 90, 45, 15);
        double left = Panel.LeftRoom(ohm, degrees), right = Picture.Width - Picture.Margin;
        double bottom = top + MagnitudeHeight;
        return (new Panel(new Box(left, top, right, bottom), across, ohm),
            new Panel(new Box(left, bottom + PanelGap, right, bottom + PanelGap + AngleHeight), across, degrees));
    }

    /// <summary>Marks and labels of the parallel resonances, the highest first, since a label without room is left out.</summary>
    private static void DrawPeaks(Sheet sheet, Panel panel, List<ImpedanceTrace> drawn)
    {
        var labels = new Labels(panel.Area);
        var peaks = drawn.SelectMany((t, i) => t.Peaks.Select(p => (Peak: p, Look: Look.Series[i % Look.Series.Length]))).ToList();
        foreach ((Resonance peak, SeriesLook look) in peaks)
        {
            double x = panel.X(peak.Order), y = panel.Y(peak.Ohm);
            sheet.Mark(look.Mark, x, y, 3.2, look.Colour);
            labels.Reserve(new Box(x - 4, y - 4, x + 4, y + 4));
        }

        foreach ((Resonance peak, SeriesLook look) in peaks.OrderByDescending(p => p.Peak.Ohm))
        {
            labels.TryWrite(
                sheet, new Spot(panel.X(peak.Order), panel.Y(peak.Ohm)), Look.Small with { Colour = look.Colour, Bold = true },
                Figures.ComputedOrder(peak.Order), Figures.Short(peak.Ohm) + " Ω");
        }
    }

    /// <summary>The first state and those with the highest parallel resonances (else the highest |Z|).</summary>
    private static List<ImpedanceTrace> Outstanding(List<ImpedanceTrace> traces)
    {
        var others = traces.Skip(1).OrderByDescending(t => t.Highest).Take(CurvesBesideSpan - 1).ToHashSet();
        return [.. traces.Where((t, i) => i == 0 || others.Contains(t))];
    }

    private static List<LegendEntry> LegendOf(List<ImpedanceTrace> drawn, int spanStates, List<string> without)
    {
        var entries = new List<LegendEntry>();
        for (int i = 0; i < drawn.Count; i++)
        {
            entries.Add(LegendEntry.Line(drawn[i].State, Look.Series[i % Look.Series.Length], Details(drawn[i])));
        }

        if (spanStates > 0)
        {
            entries.Add(LegendEntry.Patch(FormattableString.Invariant($"span of all {spanStates} states"), Look.Span) with
            {
                Details = ["drawn as curves: the first state and those with the highest peaks"],
            });
        }

        entries.AddRange(without.Take(MostCurves).Select(s => new LegendEntry(s, null, "bus dead or not scanned in this state")));
        return entries;
    }

    private static string[] Details(ImpedanceTrace trace)
    {
        if (trace.IsOpen)
        {
            return ["open: no path to ground"];
        }

        return trace.Peaks.Count == 0
            ? [trace.Curve.At == trace.Curve.From ? "no parallel resonance in this range" : ""]
            : ["parallel at", .. trace.Peaks.Select(p => $"{Figures.ComputedOrder(p.Order)}: {Figures.Short(p.Ohm)} Ω")];
    }
}
