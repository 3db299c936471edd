using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Reports.Pictures;

namespace HarmonicSweep.Tests.Reports;

/// <summary>Remembers what a picture draws instead of drawing it.</summary>
internal sealed class RecordingSheet : Sheet
{
    public List<(string Text, Box Box, TextStyle Style)> Texts { get; } = [];

    public List<(Spot[] Spots, Stroke Stroke)> Lines { get; } = [];

    public List<(Box Box, Colour Colour)> Fills { get; } = [];

    public List<(Spot[] Spots, Colour Fill)> Polygons { get; } = [];

    public static RecordingSheet Of(Picture picture)
    {
        var sheet = new RecordingSheet();
        picture.DrawOn(sheet);
        return sheet;
    }

    public override void Fill(ReadOnlySpan<Box> boxes, Colour colour)
    {
        foreach (Box box in boxes)
        {
            Fills.Add((box, colour));
        }
    }

    public override void Polyline(ReadOnlySpan<Spot> spots, Stroke stroke) => Lines.Add((spots.ToArray(), stroke));

    public override void Polygon(ReadOnlySpan<Spot> spots, Colour fill, Stroke? edge = null) => Polygons.Add((spots.ToArray(), fill));

    /// <summary>The box runs from the height of capitals (0.71 of the size in this font) to its descenders (0.21).</summary>
    public override void Write(string text, double x, double y, TextStyle style)
    {
        double width = Roboto.Width(text, style), up = 0.71 * style.Size, down = 0.21 * style.Size;
        double back = style.Anchor switch { Anchor.Start => 0, Anchor.Middle => width / 2, _ => width };
        Box box = style.Turned
            ? new Box(x - up, y + back - width, x + down, y + back)
            : new Box(x - back, y - up, x - back + width, y + down);
        Texts.Add((text, box, style));
    }
}
