using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// Heat map of a bank: a row a position, orders across, |Z| at its bus as shade; one panel a supply strength. Positions not
/// to dwell on are flagged at their row.
/// </summary>
internal static class PositionMapPicture
{
    private const int MostPanels = 3;
    private const double PanelGap = 30;
    private const double FlagRoom = 118;

    private static readonly TextStyle NameStyle = Look.Text with { Anchor = Anchor.End, Bold = true };

    /// <summary>A picture a bank and base state; further ones when there are more supply strengths than fit one.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        if (context.Result.Screen is not { } screen)
        {
            yield break;
        }

        foreach (var bank in screen.Maps.Where(m => m.Orders.Count > 0 && m.StepsIn.Count > 0).GroupBy(m => (m.BaseState, m.Bank)))
        {
            foreach (PositionMap[] maps in bank.Chunk(MostPanels))
            {
                yield return Of(context, screen, maps);
            }
        }
    }

    private static Picture Of(PictureContext context, ScreenResult screen, PositionMap[] maps)
    {
        PositionMap first = maps[0];
        double[] injected = [.. maps.SelectMany(m => m.InjectedOrders).Distinct().Order()];
        LinearScale across = LinearScale.Over(maps.Min(m => m.Orders[0]), maps.Max(m => m.Orders[^1]), 12);
        double left = Math.Ceiling(Picture.Margin + 26 + maps.SelectMany(m => NamesOf(screen, m)).Max(n => Roboto.Width(n, NameStyle)));
        double right = Picture.Width - Picture.Margin - FlagRoom;
        double above = OrderMarks.Room(across, right - left, injected) + 16, rowHeight = Math.Clamp(260.0 / maps.Max(m => m.StepsIn.Count), 14, 24);
        double[] tops = new double[maps.Length];
        double y = Picture.HeaderHeight;
        for (int i = 0; i < maps.Length; i++)
        {
            tops[i] = y + above;
            y = tops[i] + maps[i].StepsIn.Count * rowHeight + (i < maps.Length - 1 ? PanelGap : Panel.BottomRoom);
        }

        double keyTop = y + 8;
        string choices = $"from state {first.BaseState} · bank positions down, order across";
        return new Picture($"positions-{first.Bank}-{first.BaseState}", $"|Z| at {context.BusText(first.Bus)} over the positions of {first.Bank}", context.CaseTitle, choices, keyTop + HeatKey.Height, sheet =>
        {
            LogScale shade = HeatKey.ScaleOf(maps);
            for (int i = 0; i < maps.Length; i++)
            {
                BankPosition?[] rows = PositionsOf(screen, maps[i]);
                string[] names = NamesOf(screen, maps[i]);
                var area = new Box(left, tops[i], right, tops[i] + names.Length * rowHeight);
                var panel = new Panel(area, across, new CategoryScale(names));
                HeatRows.Draw(sheet, panel, maps[i], shade, rowHeight);
                OrderMarks.DrawLines(sheet, panel, injected, shaded: true);
                DrawRows(sheet, panel, rows, rowHeight);
                OrderMarks.DrawNumbers(sheet, panel, injected);
                sheet.Outline(area, Look.Frame);
                sheet.Write($"Supply strength: {StrengthText(maps[i].Strength)}", area.Left, tops[i] - above + 12, Look.Text with { Bold = true });
                sheet.Write("Steps in", Picture.Margin + 2, (area.Top + area.Bottom) / 2, Look.AxisTitleTurned);
                if (i == maps.Length - 1)
                {
                    panel.DrawAcross(sheet, "Order h");
                }
            }

            HeatKey.Draw(sheet, shade, keyTop, screen.NearOrders);
        });
    }

    private static void DrawRows(Sheet sheet, Panel panel, BankPosition?[] rows, double rowHeight)
    {
        for (int row = 0; row < rows.Length; row++)
        {
            double top = panel.Area.Top + row * rowHeight, middle = top + rowHeight / 2;
            bool flagged = rows[row]?.DoNotDwell == true;
            sheet.Line(panel.Area.Left, top, panel.Area.Right, top, new Stroke(Look.Paper, 1));
            sheet.Write(
                panel.Up.Ticks[row].Label!, panel.Area.Left - 7, middle + 4, NameStyle with { Bold = flagged });
            foreach (Resonance peak in rows[row]?.ParallelResonances ?? [])
            {
                if (peak.Order >= panel.Across.From && peak.Order <= panel.Across.To)
                {
                    sheet.Mark(MarkShape.Circle, panel.X(peak.Order), middle, 3, Look.Ink);
                }
            }

            if (flagged)
            {
                DrawFlag(sheet, panel.Area.Right, middle, rows[row]!.Nearest);
            }
        }
    }

    private static void DrawFlag(Sheet sheet, double right, double y, Resonance? nearest)
    {
        sheet.Polygon([new(right + 3, y), new(right + 10, y - 5), new(right + 10, y + 5)], Look.Limit);
        string why = nearest is { NearestInjectedOrder: { } order }
            ? $"avoid: {Figures.ComputedOrder(nearest.Order)} near {Figures.Order(order)}"
            : "avoid";
        sheet.Write(Roboto.Fit(why, Look.Text with { Bold = true }, FlagRoom - 14), right + 14, y + 4, Look.Text with { Bold = true, Colour = Look.Limit });
    }

    /// <summary>The screened position of every row: by place when the lists match, else by the number of steps.</summary>
    private static BankPosition?[] PositionsOf(ScreenResult screen, PositionMap map)
    {
        BankPosition[] positions =
        [
            .. screen.Positions.Where(p => p.BaseState == map.BaseState && p.Bank == map.Bank && p.Strength == map.Strength),
        ];
        bool matches = positions.Select(p => p.StepsIn).SequenceEqual(map.StepsIn);
        return [.. map.StepsIn.Select((steps, row) => matches ? positions[row] : Array.Find(positions, p => p.StepsIn == steps))];
    }

    private static string[] NamesOf(ScreenResult screen, PositionMap map)
    {
        BankPosition?[] rows = PositionsOf(screen, map);
        return [.. map.StepsIn.Select((steps, row) => NameOf(steps, rows[row]))];
    }

    private static string NameOf(int stepsIn, BankPosition? position) => position is null
        ? FormattableString.Invariant($"{stepsIn}")
        : FormattableString.Invariant($"{stepsIn} of {position.Steps} · {position.KvarIn:0} kvar");

    private static string StrengthText(string strength) => strength switch
    {
        "max" => "maximum",
        "min" => "minimum",
        _ => strength + " MVA",
    };
}
