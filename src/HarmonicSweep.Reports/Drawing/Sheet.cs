namespace HarmonicSweep.Reports.Drawing;

/// <summary>
/// A sheet to draw on. A picture is described once, by calls to these few members, and comes out as PNG or SVG depending
/// on the sheet. Lengths in sheet units, origin at the upper left, y downwards.
/// </summary>
internal abstract class Sheet
{
    /// <summary>Fills rectangles with one colour.</summary>
    public abstract void Fill(ReadOnlySpan<Box> boxes, Colour colour);

    /// <summary>An open line through the spots.</summary>
    public abstract void Polyline(ReadOnlySpan<Spot> spots, Stroke stroke);

    /// <summary>A closed shape, filled and, with an edge, outlined.</summary>
    public abstract void Polygon(ReadOnlySpan<Spot> spots, Colour fill, Stroke? edge = null);

    /// <summary>A line of text; y is its baseline.</summary>
    public abstract void Write(string text, double x, double y, TextStyle style);

    public void Fill(Box box, Colour colour) => Fill([box], colour);

    public void Line(double x1, double y1, double x2, double y2, Stroke stroke) =>
        Polyline([new Spot(x1, y1), new Spot(x2, y2)], stroke);

    public void Outline(Box box, Stroke stroke) => Polyline(
        [
            new Spot(box.Left, box.Top), new Spot(box.Right, box.Top), new Spot(box.Right, box.Bottom),
            new Spot(box.Left, box.Bottom), new Spot(box.Left, box.Top),
            new Spot(Math.Min(box.Left + 1, box.Right), box.Top), // runs over the corner, so that it is closed
        ],
        stroke);

    /// <summary>A mark of a series: white inside, so that a curve below stays visible.</summary>
    public void Mark(MarkShape shape, double x, double y, double radius, Colour colour)
    {
        var edge = new Stroke(colour, 1.3);
        double r = radius;
        switch (shape)
        {
            case MarkShape.Circle:
                var round = new Spot[24];
                for (int i = 0; i < round.Length; i++)
                {
                    (double sin, double cos) = Math.SinCos(2 * Math.PI * i / round.Length);
                    round[i] = new Spot(x + r * cos, y + r * sin);
                }

                Polygon(round, Look.Paper, edge);
                break;
            case MarkShape.Square:
                double s = 0.85 * r;
                Polygon([new(x - s, y - s), new(x + s, y - s), new(x + s, y + s), new(x - s, y + s)], Look.Paper, edge);
                break;
            case MarkShape.Triangle:
                Polygon([new(x, y - 1.2 * r), new(x + 1.1 * r, y + 0.8 * r), new(x - 1.1 * r, y + 0.8 * r)], Look.Paper, edge);
                break;
            case MarkShape.TriangleDown:
                Polygon([new(x, y + 1.2 * r), new(x + 1.1 * r, y - 0.8 * r), new(x - 1.1 * r, y - 0.8 * r)], Look.Paper, edge);
                break;
            case MarkShape.Diamond:
                Polygon([new(x, y - 1.3 * r), new(x + 1.1 * r, y), new(x, y + 1.3 * r), new(x - 1.1 * r, y)], Look.Paper, edge);
                break;
            case MarkShape.Cross:
                Line(x - r, y - r, x + r, y + r, edge);
                Line(x - r, y + r, x + r, y - r, edge);
                break;
            case MarkShape.Plus:
                Line(x - 1.2 * r, y, x + 1.2 * r, y, edge);
                Line(x, y - 1.2 * r, x, y + 1.2 * r, edge);
                break;
            default:
                Line(x, y - 1.4 * r, x, y + 1.4 * r, new Stroke(colour, 2));
                break;
        }
    }
}
