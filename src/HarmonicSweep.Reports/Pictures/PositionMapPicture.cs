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
    private const int MostRows = 40;
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
            var page = new List<MapSection>();
            foreach (MapSection section in bank.SelectMany(m => MapSection.Of(screen, m, MostRows)))
            {
                if (page.Count == MostPanels || (page.Count > 0 && page.Sum(s => s.Names.Length) + section.Names.Length > MostRows))
                {
                    yield return Of(context, screen, [.. page]);
                    page.Clear();
                }

                page.Add(section);
            }

            yield return Of(context, screen, [.. page]);
        }
    }

    private static Picture Of(PictureContext context, ScreenResult screen, MapSection[] sections)
    {
        PositionMap first = sections[0].Map;
        PositionMap[] maps = [.. sections.Select(s => s.Map)];
        double[] injected = [.. maps.SelectMany(m => m.InjectedOrders).Distinct().Order()];
        LinearScale across = LinearScale.Over(maps.Min(m => m.Orders[0]), maps.Max(m => m.Orders[^1]), 12);
        double left = Math.Ceiling(Picture.Margin + 26 + sections.SelectMany(s => s.Names).Max(n => Roboto.Width(n, NameStyle)));
        double right = Picture.Width - Picture.Margin - FlagRoom;
        double above = OrderMarks.Room(across, right - left, injected) + 16, rowHeight = Math.Clamp(260.0 / sections.Max(s => s.Names.Length), 14, 24);
        double[] tops = new double[sections.Length];
        double y = Picture.HeaderHeight;
        for (int i = 0; i < sections.Length; i++)
        {
            tops[i] = y + above;
            y = tops[i] + sections[i].Names.Length * rowHeight + (i < sections.Length - 1 ? PanelGap : Panel.BottomRoom);
        }

        double keyTop = y + 8;
        string choices = $"from state {first.BaseState} · bank positions down, order across";
        return new Picture($"positions-{first.Bank}-{first.BaseState}", $"|Z| at {context.BusText(first.Bus)} over the positions of {first.Bank}", context.CaseTitle, choices, keyTop + HeatKey.Height, sheet =>
        {
            LogScale shade = HeatKey.ScaleOf(maps);
            for (int i = 0; i < sections.Length; i++)
            {
                string[] names = sections[i].Names;
                var area = new Box(left, tops[i], right, tops[i] + names.Length * rowHeight);
                var panel = new Panel(area, across, new CategoryScale(names));
                HeatRows.Draw(sheet, panel, maps[i], shade, rowHeight);
                OrderMarks.DrawLines(sheet, panel, injected, shaded: true);
                DrawRows(sheet, panel, sections[i].Positions, rowHeight);
                OrderMarks.DrawNumbers(sheet, panel, injected);
                sheet.Outline(area, Look.Frame);
                sheet.Write($"Supply strength: {sections[i].StrengthText}", area.Left, tops[i] - above + 12, Look.Text with { Bold = true });
                sheet.Write("Steps in", Picture.Margin + 2, (area.Top + area.Bottom) / 2, Look.AxisTitleTurned);
                if (i == sections.Length - 1)
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
}
