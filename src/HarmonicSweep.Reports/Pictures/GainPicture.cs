using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>Voltage gain from the background at the PCC to each bus against order; over several states, the largest.</summary>
internal static class GainPicture
{
    private const double PanelHeight = 270;

    private sealed record BusGain(string Bus, IReadOnlyList<double> Orders, IReadOnlyList<double?> Gain, double Peak, double PeakOrder, string PeakState);

    /// <summary>A picture for every point the background enters at.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        foreach (string from in context.Result.States.SelectMany(s => s.Gains).Select(g => g.From).Distinct())
        {
            BusGain[] all =
            [
                .. context.Result.States.SelectMany(s => s.Gains).Where(g => g.From == from && g.Orders.Count > 0)
                    .Select(g => g.Bus).Distinct().Select(bus => LargestOver(context, from, bus)),
            ];
            if (all.Length > 0)
            {
                yield return Of(context, from, all);
            }
        }
    }

    private static Picture Of(PictureContext context, string from, BusGain[] all)
    {
        int states = context.Result.States.Count;
        var largest = all.OrderByDescending(g => g.Peak).Take(Look.Series.Length).ToHashSet();
        BusGain[] drawn = [.. all.Where(largest.Contains)];
        double[] injected = [.. context.Result.States.SelectMany(s => s.InjectedOrders).Distinct().Order()];
        List<LegendEntry> legend =
        [
            .. drawn.Select((g, i) => LegendEntry.Line(context.BusText(g.Bus), Look.Series[i], DetailsOf(g, states))),
        ];
        double top = Picture.HeaderHeight + OrderMarks.Room(injected), legendTop = top + PanelHeight + Panel.BottomRoom + 6;
        double height = legendTop + Legend.Height(legend, Picture.Width - 2 * Picture.Margin) + 6;
        string which = all.Length == drawn.Length ? "" : FormattableString.Invariant($" · the {drawn.Length} of {all.Length} buses with the largest gain");
        string subtitle = $"{context.CaseTitle} · {(states == 1 ? "" : "largest of ")}{context.StatesText(states)}{which}";
        return new Picture("background-gain", $"Voltage gain from the background at {context.BusText(from)}", subtitle, height, sheet =>
        {
            LogScale up = LogScale.Covering(drawn.SelectMany(g => g.Gain).Select(g => g ?? 0).Append(1), 0.06);
            LinearScale across = LinearScale.Over(drawn.Min(g => g.Orders[0]), drawn.Max(g => g.Orders[^1]), 12);
            var panel = new Panel(new Box(Panel.LeftRoom(up), top, Picture.Width - Picture.Margin, top + PanelHeight), across, up);
            panel.DrawGrid(sheet);
            sheet.Line(panel.Area.Left, panel.Y(1), panel.Area.Right, panel.Y(1), Look.Frame with { Width = 1.4 });
            OrderMarks.DrawLines(sheet, panel, injected);
            for (int i = drawn.Length - 1; i >= 0; i--)
            {
                Curve.Draw(sheet, Curve.Runs(panel, drawn[i].Orders.Zip(drawn[i].Gain)), Look.Series[i]);
            }

            DrawPeaks(sheet, panel, drawn);
            OrderMarks.DrawNumbers(sheet, panel, injected);
            panel.DrawFrame(sheet, "Gain (pu voltage / pu background)");
            panel.DrawAcross(sheet, "Order h (frequency / fundamental)");
            if (drawn.All(g => g.Peak is 0))
            {
                panel.DrawRemark(sheet, "no gain at any order");
            }

            Legend.Draw(sheet, legend, Picture.Margin, legendTop, Picture.Width - 2 * Picture.Margin);
        });
    }

    private static void DrawPeaks(Sheet sheet, Panel panel, BusGain[] drawn)
    {
        for (int i = 0; i < drawn.Length; i++)
        {
            if (drawn[i].Peak > 0)
            {
                sheet.Mark(Look.Series[i].Mark, panel.X(drawn[i].PeakOrder), panel.Y(drawn[i].Peak), 3.2, Look.Series[i].Colour);
            }
        }
    }

    private static string[] DetailsOf(BusGain gain, int states)
    {
        if (gain.Peak is 0)
        {
            return ["no gain"];
        }

        string peak = $"largest {Figures.Short(gain.Peak)} at order {Figures.ComputedOrder(gain.PeakOrder)}";
        return states == 1 ? [peak] : [peak, $"in {gain.PeakState}"];
    }

    /// <summary>The largest gain of a bus over the states at every order.</summary>
    private static BusGain LargestOver(PictureContext context, string from, string bus)
    {
        var largest = new SortedDictionary<double, double?>();
        double peak = 0, peakOrder = 0;
        string peakState = "";
        foreach (StateResult state in context.Result.States)
        {
            foreach ((double order, double? gain) in state.Gains.Where(g => g.From == from && g.Bus == bus).SelectMany(g => g.Orders.Zip(g.Gain)))
            {
                double? before = largest.GetValueOrDefault(order);
                largest[order] = before is null || gain > before ? gain ?? before : before;
                if (gain > peak)
                {
                    (peak, peakOrder, peakState) = (gain.Value, order, state.State);
                }
            }
        }

        return new BusGain(bus, [.. largest.Keys], [.. largest.Values], peak, peakOrder, peakState);
    }
}
