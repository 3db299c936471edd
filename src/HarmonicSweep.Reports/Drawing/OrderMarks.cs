namespace HarmonicSweep.Reports.Drawing;

/// <summary>Injected orders: thin upright lines through the panels, their numbers in one or two rows above.</summary>
internal static class OrderMarks
{
    private const double RowHeight = 11;

    /// <summary>Room above the topmost panel.</summary>
    public static double Room(IReadOnlyList<double> orders) => orders.Count == 0 ? 4 : 2 * RowHeight + 5;

    /// <summary>The lines.</summary>
    public static void DrawLines(Sheet sheet, Panel panel, IReadOnlyList<double> orders, bool halo = false)
    {
        foreach (double order in Within(panel, orders))
        {
            double x = panel.X(order);
            if (halo)
            {
                sheet.Line(x, panel.Area.Top, x, panel.Area.Bottom, new Stroke(Look.Paper, 1.8));
            }

            sheet.Line(x, panel.Area.Top, x, panel.Area.Bottom, halo ? Look.InjectedOrder with { Width = 1, Colour = Look.Ink } : Look.InjectedOrder);
        }
    }

    /// <summary>The numbers above a panel; one without room in both rows is left out.</summary>
    public static void DrawNumbers(Sheet sheet, Panel panel, IReadOnlyList<double> orders)
    {
        if (orders.Count == 0)
        {
            return;
        }

        Span<double> free = [double.NegativeInfinity, double.NegativeInfinity];
        foreach (double order in Within(panel, orders))
        {
            string label = Figures.Order(order);
            double x = panel.X(order), half = Roboto.Width(label, Look.InjectedLabel) / 2;
            int row = x - half > free[0] ? 0 : 1;
            if (row == 1 && x - half <= free[1])
            {
                continue;
            }

            sheet.Line(x, panel.Area.Top - 3 - row * RowHeight, x, panel.Area.Top, Look.InjectedOrder with { Dash = [] });
            sheet.Write(label, x, panel.Area.Top - 5 - row * RowHeight, Look.InjectedLabel);
            free[row] = x + half + 3;
            free[0] = row == 1 ? Math.Max(free[0], x + 2) : free[0]; // its tick runs through the lower row
        }

        sheet.Write("injected", panel.Area.Left - 8, panel.Area.Top - 5, Look.InjectedLabel with { Anchor = Anchor.End });
    }

    private static IEnumerable<double> Within(Panel panel, IReadOnlyList<double> orders) =>
        orders.Where(o => o >= panel.Across.From && o <= panel.Across.To);
}
