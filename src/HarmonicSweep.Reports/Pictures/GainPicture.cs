using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>Voltage gain from the background at the PCC to each bus against order; over several states, the largest.</summary>
internal static class GainPicture
{
    private const double PanelHeight = 270;
    private const double LabelRoom = 34;

    private sealed record BusGain(string Bus, double[] Orders, double?[] Gain, double Peak, double PeakOrder, string PeakState);

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
        LogScale up = LogScale.Covering(drawn.Select(g => g.Gain).Append([1]), LabelRoom / PanelHeight);
        LinearScale across = LinearScale.Over(drawn.Min(g => g.Orders[0]), drawn.Max(g => g.Orders[^1]), 12);
        double left = Panel.LeftRoom(up), right = Picture.Width - Picture.Margin;
        double top = Picture.HeaderHeight + OrderMarks.Room(across, right - left, injected), legendTop = top + PanelHeight + Panel.BottomRoom + 6;
        double height = legendTop + Legend.Height(legend, Picture.Width - 2 * Picture.Margin) + 6;
        string which = all.Length == drawn.Length ? "" : FormattableString.Invariant($" · the {drawn.Length} of {all.Length} buses with the largest gain");
        string choices = $"{(states == 1 ? "" : "largest of ")}{context.StatesText(states)}{which}";
        return new Picture("background-gain", $"Voltage gain from the background at {context.BusText(from)}", context.CaseTitle, choices, height, sheet =>
        {
            var panel = new Panel(new Box(left, top, right, top + PanelHeight), across, up);
            panel.DrawGrid(sheet);
            sheet.Line(panel.Area.Left, panel.Y(1), panel.Area.Right, panel.Y(1), Look.Frame with { Width = 1.4 });
            OrderMarks.DrawLines(sheet, panel, injected);
            for (int i = drawn.Length - 1; i >= 0; i--)
            {
                Curve.Draw(sheet, Curve.Runs(panel, drawn[i].Orders, drawn[i].Gain), Look.Series[i]);
            }

            DrawPeaks(sheet, panel, drawn);
            OrderMarks.DrawNumbers(sheet, panel, injected);
            panel.DrawFrame(sheet, "Gain (pu voltage / pu background)");
            panel.DrawAcross(sheet, "Order h (frequency / fundamental)");
            if (drawn.All(g => g.Peak is 0))
            {
                panel.DrawRemark(sheet, "open: no path from the background at any order");
            }

            Legend.Draw(sheet, legend, Picture.Margin, legendTop, Picture.Width - 2 * Picture.Margin);
        });
    }

    private static void DrawPeaks(Sheet sheet, Panel panel, BusGain[] drawn)
    {
        var labels = new Labels(panel.Area);
        var peaks = drawn.Select((g, i) => (g.Peak, g.PeakOrder, Look: Look.Series[i])).Where(p => p.Peak > 0).ToList();
        foreach ((double peak, double order, SeriesLook look) in peaks)
        {
            labels.ReserveMark(sheet, look, new Spot(panel.X(order), panel.Y(peak)));
        }

        foreach ((double peak, double order, SeriesLook look) in peaks.OrderByDescending(p => p.Peak))
        {
            labels.TryWrite(
                sheet, new Spot(panel.X(order), panel.Y(peak)), Look.Small with { Colour = look.Colour, Bold = true },
                $"h {Figures.ComputedOrder(order)}", $"{Figures.Short(peak)} pu");
        }
    }

    private static string[] DetailsOf(BusGain gain, int states)
    {
        if (gain.Peak is 0)
        {
            return ["open at every order"];
        }

        string peak = $"largest {Figures.Short(gain.Peak)} at order {Figures.ComputedOrder(gain.PeakOrder)}";
        return states == 1 ? [peak] : [peak, $"in {gain.PeakState}"];
    }

    /// <summary>The largest gain of a bus over the states at every order; a gap where it is open in all.</summary>
    private static BusGain LargestOver(PictureContext context, string from, string bus)
    {
        double[] orders = [];
        double?[] largest = [];
        double peak = 0, peakOrder = 0;
        string peakState = "";
        foreach (StateResult state in context.Result.States)
        {
            foreach (BackgroundGain curve in state.Gains.Where(g => g.From == from && g.Bus == bus))
            {
                (orders, largest) = Merged(orders, largest, curve);
                for (int i = 0; i < curve.Orders.Count; i++)
                {
                    if (curve.Gain[i] > peak)
                    {
                        (peak, peakOrder, peakState) = (curve.Gain[i]!.Value, curve.Orders[i], state.State);
                    }
                }
            }
        }

        return new BusGain(bus, orders, largest, peak, peakOrder, peakState);
    }

    private static (double[] Orders, double?[] Largest) Merged(double[] orders, double?[] largest, BackgroundGain curve)
    {
        var mergedOrders = new List<double>(orders.Length);
        var merged = new List<double?>(orders.Length);
        for (int i = 0, j = 0; i < orders.Length || j < curve.Orders.Count;)
        {
            double a = i < orders.Length ? orders[i] : double.PositiveInfinity;
            double b = j < curve.Orders.Count ? curve.Orders[j] : double.PositiveInfinity;
            double? left = a <= b ? largest[i++] : null, right = b <= a ? curve.Gain[j++] : null;
            mergedOrders.Add(Math.Min(a, b));
            merged.Add(left is null || right > left ? right ?? left : left);
        }

        return (mergedOrders.ToArray(), merged.ToArray());
    }
}
