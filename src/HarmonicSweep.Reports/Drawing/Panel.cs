namespace HarmonicSweep.Reports.Drawing;

/// <summary>A framed area with a horizontal and a vertical scale.</summary>
internal sealed class Panel(Box area, Scale across, Scale up)
{
    private const double TickLength = 4;
    private const double LabelGap = 4;
    private const double TitleRoom = 22;
    private const double RightRoom = 14;
    private const double LeastLeftRoom = 54; // for the word "injected" above a panel

    /// <summary>Room below a panel for tick labels and the title of the horizontal axis.</summary>
    public const double BottomRoom = 40;

    public Box Area { get; } = area;

    public Scale Across { get; } = across;

    public Scale Up { get; } = up;

    /// <summary>Room left of panels for tick labels and the turned title, the same for panels that stand above each other.</summary>
    public static double LeftRoom(params ReadOnlySpan<Scale> up)
    {
        double widest = 0;
        foreach (Scale scale in up)
        {
            widest = Math.Max(widest, scale.WidestLabel());
        }

        return Math.Max(LeastLeftRoom, Math.Ceiling(6 + TitleRoom + widest + LabelGap + TickLength));
    }

    public double X(double value) => Area.Left + Across.Fraction(value) * Area.Width;

    public double Y(double value) => Area.Bottom - Up.Fraction(value) * Area.Height;

    /// <summary>Grid lines; drawn first, so that everything else lies above them.</summary>
    public void DrawGrid(Sheet sheet, bool vertical = true, bool horizontal = true)
    {
        foreach (bool major in new[] { false, true })
        {
            Stroke stroke = major ? Look.MajorGrid : Look.MinorGrid;
            foreach (Tick tick in Up.Ticks.Where(t => horizontal && t.Label is not null == major))
            {
                sheet.Line(Area.Left, Y(tick.Value), Area.Right, Y(tick.Value), stroke);
            }

            foreach (Tick tick in Across.Ticks.Where(t => vertical && t.Label is not null == major))
            {
                sheet.Line(X(tick.Value), Area.Top, X(tick.Value), Area.Bottom, stroke);
            }
        }
    }

    /// <summary>The frame and the vertical axis: ticks, labels, turned title.</summary>
    public void DrawFrame(Sheet sheet, string upTitle)
    {
        foreach (Tick tick in Up.Ticks.Where(t => t.Label is not null))
        {
            double y = Y(tick.Value);
            sheet.Line(Area.Left - TickLength, y, Area.Left, y, Look.Frame);
            sheet.Write(tick.Label!, Area.Left - TickLength - LabelGap, y + 0.36 * Look.TextSize, Look.Text with { Anchor = Anchor.End });
        }

        sheet.Write(upTitle, TitleRoom - 4, (Area.Top + Area.Bottom) / 2, Look.AxisTitleTurned);
        sheet.Outline(Area, Look.Frame);
    }

    /// <summary>The horizontal axis below the panel: ticks, those labels that have room, title.</summary>
    public void DrawAcross(Sheet sheet, string title)
    {
        double free = double.NegativeInfinity;
        foreach (Tick tick in Across.Ticks)
        {
            double x = X(tick.Value);
            sheet.Line(x, Area.Bottom, x, Area.Bottom + (tick.Label is null ? TickLength / 2 : TickLength), Look.Frame);
            if (tick.Label is null)
            {
                continue;
            }

            double half = Roboto.Width(tick.Label, Look.Text) / 2;
            x = Math.Min(x, Area.Right + RightRoom - half);
            if (x - half > free)
            {
                sheet.Write(tick.Label, x, Area.Bottom + TickLength + 12, Look.Text with { Anchor = Anchor.Middle });
                free = x + half + 4;
            }
        }

        sheet.Write(title, (Area.Left + Area.Right) / 2, Area.Bottom + BottomRoom - 6, Look.AxisTitle);
    }

    /// <summary>A remark in the middle of an empty panel.</summary>
    public void DrawRemark(Sheet sheet, string text) =>
        sheet.Write(text, (Area.Left + Area.Right) / 2, (Area.Top + Area.Bottom) / 2, Look.AxisTitle with { Halo = true, Colour = Look.Faded });
}
