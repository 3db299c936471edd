using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>The key below a heat map: what shade is how many ohm, what the marks mean.</summary>
internal static class HeatKey
{
    /// <summary>Room it needs, sheet units.</summary>
    public const double Height = 62;

    private const double BarWidth = 250;

    /// <summary>One scale for all panels of a picture, so that they can be compared.</summary>
    public static LogScale ScaleOf(IEnumerable<PositionMap> maps) =>
        LogScale.Covering(maps.SelectMany(m => m.Ohm).Select(row => row.Select(z => z?.Magnitude)));

    public static void Draw(Sheet sheet, LogScale shade, double top, double nearOrders)
    {
        const double left = Picture.Margin + 52, barTop = 6, barHeight = 12;
        var bar = new Box(left, top + barTop, left + BarWidth, top + barTop + barHeight);
        const int parts = 125;
        for (int i = 0; i < parts; i++)
        {
            double x = left + i * BarWidth / parts;
            sheet.Fill(new Box(x, bar.Top, x + BarWidth / parts, bar.Bottom), Look.Heat((i + 0.5) / parts));
        }

        sheet.Outline(bar, Look.Frame);
        sheet.Write("|Z| (Ω)", left - 7, bar.Bottom - 2, Look.AxisTitle with { Anchor = Anchor.End });
        double free = double.NegativeInfinity;
        foreach (Tick tick in shade.Ticks.Where(t => t.Label is not null))
        {
            double x = left + shade.Fraction(tick.Value) * BarWidth, half = Roboto.Width(tick.Label!, Look.Small) / 2;
            if (x - half > free)
            {
                sheet.Line(x, bar.Bottom, x, bar.Bottom + 3, Look.Frame);
                sheet.Write(tick.Label!, x, bar.Bottom + 13, Look.Small with { Anchor = Anchor.Middle });
                free = x + half + 4;
            }
        }

        double notes = left + BarWidth + 26;
        sheet.Mark(MarkShape.Circle, notes, top + 12, 3, Look.Ink);
        sheet.Write("parallel resonance", notes + 10, top + 15.5, Look.Text);
        sheet.Polygon([new(notes - 4, top + 29), new(notes + 3, top + 24), new(notes + 3, top + 34)], Look.Limit);
        sheet.Write(
            $"do not dwell: within {Figures.Order(nearOrders)} of an injected order", notes + 10, top + 32.5, Look.Text);
        sheet.Line(notes, top + 41, notes, top + 53, Look.InjectedOrderOnShade);
        sheet.Write("injected order", notes + 10, top + 50.5, Look.Text);
    }
}
