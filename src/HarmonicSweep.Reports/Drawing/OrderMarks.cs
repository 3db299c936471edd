namespace HarmonicSweep.Reports.Drawing;

/// <summary>Injected orders: thin upright lines through the panels, their numbers in one or two rows above.</summary>
internal static class OrderMarks
{
    private const double RowHeight = 11;
    private const double Gap = 3;
    private const double TickLength = 4;

    /// <summary>More orders than these are ticks above the frame alone, since as lines they would hide the curves.</summary>
    private const int MostLines = 40;

    private sealed record Number(string Label, double X, int Row);

    /// <summary>Room above the topmost panel.</summary>
    public static double Room(Scale across, double width, IReadOnlyList<double> orders)
    {
        List<Number> numbers = Numbers(across, 0, width, orders);
        return numbers.Count == 0 ? 4 : TickLength + 3 + RowHeight * (1 + numbers.Max(n => n.Row));
    }

    /// <summary>The lines; on a shaded panel with a white rim.</summary>
    public static void DrawLines(Sheet sheet, Panel panel, IReadOnlyList<double> orders, bool shaded = false)
    {
        double[] within = [.. Within(panel.Across, orders)];
        foreach (double x in within.Length > MostLines ? [] : within.Select(panel.X))
        {
            if (shaded)
            {
                sheet.Line(x, panel.Area.Top, x, panel.Area.Bottom, new Stroke(Look.Paper, 1.8));
            }

            sheet.Line(x, panel.Area.Top, x, panel.Area.Bottom, shaded ? Look.InjectedOrderOnShade : Look.InjectedOrder);
        }
    }

    /// <summary>The numbers above a panel; one without room is left out.</summary>
    public static void DrawNumbers(Sheet sheet, Panel panel, IReadOnlyList<double> orders)
    {
        List<Number> numbers = Numbers(panel.Across, panel.Area.Left, panel.Area.Width, orders);
        Stroke tick = Look.InjectedOrder with { Dash = [] };
        foreach (double x in Within(panel.Across, orders).Select(panel.X))
        {
            sheet.Line(x, panel.Area.Top - TickLength, x, panel.Area.Top, tick);
        }

        foreach (Number number in numbers)
        {
            double lift = number.Row * RowHeight;
            sheet.Line(number.X, panel.Area.Top - TickLength - lift, number.X, panel.Area.Top - TickLength, tick);
            sheet.Write(number.Label, number.X, panel.Area.Top - TickLength - 3 - lift, Look.InjectedLabel);
        }

        if (numbers.Count > 0)
        {
            sheet.Write("injected", panel.Area.Left - 8, panel.Area.Top - TickLength - 3, Look.InjectedLabel with { Anchor = Anchor.End });
        }
    }

    private static List<Number> Numbers(Scale across, double left, double width, IReadOnlyList<double> orders)
    {
        var numbers = new List<Number>();
        double[] within = [.. Within(across, orders)];
        double lower = double.NegativeInfinity, upper = within.Length > MostLines ? double.PositiveInfinity : double.NegativeInfinity;
        foreach (double order in within)
        {
            string label = Figures.Order(order);
            double x = left + across.Fraction(order) * width, half = Roboto.Width(label, Look.InjectedLabel) / 2;
            if (x - half > lower)
            {
                numbers.Add(new Number(label, x, 0));
                lower = x + half + Gap;
            }
            else if (x - half > upper)
            {
                numbers.Add(new Number(label, x, 1));
                upper = x + half + Gap;
                lower = Math.Max(lower, x + 2); // its tick runs through the lower row
            }
        }

        return numbers;
    }

    private static IEnumerable<double> Within(Scale across, IReadOnlyList<double> orders) =>
        orders.Where(o => o >= across.From && o <= across.To);
}
