namespace HarmonicSweep.Reports.Drawing;

/// <summary>One entry of a legend.</summary>
/// <param name="Name">What it stands for; may be shortened in its middle.</param>
/// <param name="Sample">Draws a sample into a box.</param>
/// <param name="Details">Further words; as many as have room are shown.</param>
internal sealed record LegendEntry(string Name, Action<Sheet, Box>? Sample, params string[] Details)
{
    /// <summary>Width the sample needs; all samples of a legend get the widest.</summary>
    public double SampleWidth { get; init; } = 38;

    /// <summary>A line with the mark of its series.</summary>
    public static LegendEntry Line(string name, SeriesLook look, params string[] details) => new(name, (sheet, box) =>
    {
        double y = (box.Top + box.Bottom) / 2;
        sheet.Line(box.Left, y, box.Right, y, look.Stroke(Look.CurveWidth));
        sheet.Mark(look.Mark, (box.Left + box.Right) / 2, y, 3, look.Colour);
    }, details);

    /// <summary>A line without a mark.</summary>
    public static LegendEntry Line(string name, Stroke stroke) => new(name, (sheet, box) =>
        sheet.Line(box.Left, (box.Top + box.Bottom) / 2, box.Right, (box.Top + box.Bottom) / 2, stroke));

    /// <summary>A filled patch.</summary>
    public static LegendEntry Patch(string name, Colour colour) => new(name, (sheet, box) =>
    {
        double middle = (box.Left + box.Right) / 2;
        var patch = new Box(middle - 7, box.Top + 3, middle + 7, box.Bottom - 2);
        sheet.Fill(patch, colour);
        sheet.Outline(patch, Look.Frame with { Width = 0.6 });
    })
    {
        SampleWidth = 14,
    };

    /// <summary>A letter.</summary>
    public static LegendEntry Key(string name, string key) => new(name, (sheet, box) =>
        sheet.Write(key, (box.Left + box.Right) / 2, box.Bottom - 4, Look.Text with { Bold = true, Anchor = Anchor.Middle }))
    {
        SampleWidth = 14,
    };
}

/// <summary>A legend below the panels: in columns, or one row an entry when there are details.</summary>
internal static class Legend
{
    private const double RowHeight = 16;
    private const double Gap = 7;
    private const double ColumnGap = 18;
    private const double DetailGap = 14;
    private const double WidestBesideDetails = 250;

    /// <summary>Height the entries need.</summary>
    public static double Height(IReadOnlyList<LegendEntry> entries, double width) =>
        entries.Count == 0 ? 0 : Rows(entries, width) * RowHeight + 8;

    /// <summary>Draws the entries below y.</summary>
    public static void Draw(Sheet sheet, IReadOnlyList<LegendEntry> entries, double left, double top, double width)
    {
        if (entries.Count == 0)
        {
            return;
        }

        int rows = Rows(entries, width);
        double columnWidth = ColumnWidth(entries, width), sample = entries.Max(e => e.SampleWidth);
        double names = WidestNameDrawn(entries, width - sample - Gap);
        for (int i = 0; i < entries.Count; i++)
        {
            double x = left + i / rows * columnWidth, y = top + i % rows * RowHeight;
            double text = x + sample + Gap, baseline = y + RowHeight - 4;
            entries[i].Sample?.Invoke(sheet, new Box(x, y, x + sample, y + RowHeight));
            sheet.Write(Roboto.Fit(entries[i].Name, Look.Text, names), text, baseline, Look.Text);
            WriteDetails(sheet, entries[i].Details, text + names + DetailGap, left + width, baseline);
        }
    }

    private static void WriteDetails(Sheet sheet, string[] details, double x, double right, double baseline)
    {
        foreach (string detail in details)
        {
            double width = Roboto.Width(detail, Look.Note);
            if (x + width > right)
            {
                break;
            }

            sheet.Write(detail, x, baseline, Look.Note);
            x += width + DetailGap;
        }
    }

    /// <summary>Width kept for names: as wide as the widest, unless the details need the room.</summary>
    private static double WidestNameDrawn(IReadOnlyList<LegendEntry> entries, double room)
    {
        double widest = entries.Max(e => Roboto.Width(e.Name, Look.Text)) + 0.5;
        double details = entries.Max(e => e.Details.Sum(d => Roboto.Width(d, Look.Note) + DetailGap));
        return Math.Min(Math.Min(widest, room), Math.Max(WidestBesideDetails, room - details));
    }

    private static double ColumnWidth(IReadOnlyList<LegendEntry> entries, double width)
    {
        double sample = entries.Max(e => e.SampleWidth);
        return entries.Any(e => e.Details.Length > 0)
            ? width
            : Math.Min(width, sample + Gap + ColumnGap + WidestNameDrawn(entries, width - sample - Gap));
    }

    private static int Rows(IReadOnlyList<LegendEntry> entries, double width)
    {
        int columns = Math.Max(1, (int)((width + ColumnGap) / ColumnWidth(entries, width)));
        return (entries.Count + columns - 1) / columns;
    }
}
