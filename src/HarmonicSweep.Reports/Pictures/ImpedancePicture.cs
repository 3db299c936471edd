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
        string choices = $"{sequence.ToString().ToLowerInvariant()} sequence · {context.StatesText(context.Result.States.Count)}";
        double[] injected = [.. traces.SelectMany(t => t.InjectedOrders).Distinct().Order()];

        bool span = traces.Count > MostCurves;
        List<ImpedanceTrace> drawn = span ? Outstanding(traces) : traces;
        List<LegendEntry> legend = LegendOf(drawn, at == from, span ? traces.Count : 0, without);
        (Scale across, Scale ohm, Scale degrees) = Scales(traces);
        double left = Panel.LeftRoom(ohm, degrees), right = Picture.Width - Picture.Margin;
        double top = Picture.HeaderHeight + OrderMarks.Room(across, right - left, injected), bottom = top + MagnitudeHeight;
        var magnitude = new Panel(new Box(left, top, right, bottom), across, ohm);
        var angle = new Panel(new Box(left, bottom + PanelGap, right, bottom + PanelGap + AngleHeight), across, degrees);
        double legendTop = angle.Area.Bottom + Panel.BottomRoom + 6;
        double height = legendTop + Legend.Height(legend, Picture.Width - 2 * Picture.Margin) + 6;
        string name = $"{(sequence == Sequence.Positive ? "" : sequence.ToString().ToLowerInvariant() + "-")}impedance-{at}{(at == from ? "" : $"-from-{from}")}";
        return new Picture(name, title, context.CaseTitle, choices, height, sheet =>
        {
            magnitude.DrawGrid(sheet);
            angle.DrawGrid(sheet);
            if (span)
            {
                StateSpan.Draw(sheet, magnitude, traces, t => t.Ohm);
                StateSpan.Draw(sheet, angle, traces, t => t.Degrees);
            }

            OrderMarks.DrawLines(sheet, magnitude, injected);
            OrderMarks.DrawLines(sheet, angle, injected);
            for (int i = drawn.Count - 1; i >= 0; i--) // the first state, mostly the base, comes on top
            {
                SeriesLook look = Look.Series[i % Look.Series.Length];
                Curve.Draw(sheet, Curve.Runs(magnitude, drawn[i].Orders, drawn[i].Ohm), look);
                Curve.Draw(sheet, Curve.Runs(angle, drawn[i].Orders, drawn[i].Degrees, 180), look);
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

    private static (Scale Across, Scale Ohm, Scale Degrees) Scales(List<ImpedanceTrace> traces)
    {
        LinearScale across = LinearScale.Over(traces.Min(t => t.Orders[0]), traces.Max(t => t.Orders[^1]), 12);
        LogScale ohm = LogScale.Covering(traces.Select(t => t.Ohm), LabelRoom / MagnitudeHeight);
        bool wide = traces.Exists(t => Array.Exists(t.Degrees, d => d is < -90.5 or > 90.5));
        LinearScale degrees = wide ? LinearScale.Stepped(-180, 180, 90, 45) : LinearScale.Stepped(-90, 90, 45, 15);
        return (across, ohm, degrees);
    }

    /// <summary>Marks and labels of the parallel resonances, the highest first, since a label without room is left out.</summary>
    private static void DrawPeaks(Sheet sheet, Panel panel, List<ImpedanceTrace> drawn)
    {
        var labels = new Labels(panel.Area);
        var peaks = drawn.SelectMany((t, i) => t.Peaks.Select(p => (Peak: p, Look: Look.Series[i % Look.Series.Length]))).ToList();
        foreach ((Resonance peak, SeriesLook look) in peaks)
        {
            labels.ReserveMark(sheet, look, new Spot(panel.X(peak.Order), panel.Y(peak.Ohm)));
        }

        foreach ((Resonance peak, SeriesLook look) in peaks.OrderByDescending(p => p.Peak.Ohm))
        {
            labels.TryWrite(
                sheet, new Spot(panel.X(peak.Order), panel.Y(peak.Ohm)), Look.Small with { Colour = look.Colour, Bold = true },
                $"h {Figures.ComputedOrder(peak.Order)}", $"{Figures.Short(peak.Ohm)} Ω");
        }
    }

    /// <summary>The first state and those with the highest parallel resonances (else the highest |Z|).</summary>
    private static List<ImpedanceTrace> Outstanding(List<ImpedanceTrace> traces)
    {
        var others = traces.Skip(1).OrderByDescending(t => t.Highest).Take(CurvesBesideSpan - 1).ToHashSet();
        return [.. traces.Where((t, i) => i == 0 || others.Contains(t))];
    }

    private static List<LegendEntry> LegendOf(List<ImpedanceTrace> drawn, bool drivingPoint, int spanStates, List<string> without)
    {
        var entries = new List<LegendEntry>();
        for (int i = 0; i < drawn.Count; i++)
        {
            entries.Add(LegendEntry.Line(drawn[i].State, Look.Series[i % Look.Series.Length], Details(drawn[i], drivingPoint)));
        }

        if (spanStates > 0)
        {
            entries.Add(LegendEntry.Patch(FormattableString.Invariant($"span of all {spanStates} states"), Look.Span) with
            {
                Details = ["drawn as curves: the first state and those with the highest peaks"],
            });
        }

        entries.AddRange(without.Take(MostCurves).Select(s => new LegendEntry(s, null, "bus dead or not scanned in this state")));
        if (without.Count > MostCurves)
        {
            entries.Add(new LegendEntry(FormattableString.Invariant($"and {without.Count - MostCurves} more states"), null, "likewise"));
        }

        return entries;
    }

    private static string[] Details(ImpedanceTrace trace, bool drivingPoint)
    {
        if (trace.IsOpen)
        {
            return ["open: no path to ground"];
        }

        return trace.Peaks.Length == 0
            ? [drivingPoint ? "no parallel resonance in this range" : ""]
            : ["parallel at", .. trace.Peaks.Select(p => $"{Figures.ComputedOrder(p.Order)}: {Figures.Short(p.Ohm)} Ω")];
    }
}
