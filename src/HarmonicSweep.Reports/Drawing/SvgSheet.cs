using System.Globalization;
using System.Text;

namespace HarmonicSweep.Reports.Drawing;

/// <summary>
/// Writes SVG as text. Texts keep their words (searchable, readable aloud) and carry their width, so a viewer without the
/// font fits another one into the same room instead of overlapping its neighbours.
/// </summary>
internal sealed class SvgSheet : Sheet
{
    private const string FontFamily = "Roboto, Arial, 'Liberation Sans', sans-serif";
    private const int ShortestFittedText = 5;
    private readonly StringBuilder _svg = new(16384);

    /// <summary>A white sheet.</summary>
    /// <param name="width">Width, units.</param>
    /// <param name="height">Height, units.</param>
    /// <param name="title">Title for people who have the picture read to them.</param>
    public SvgSheet(double width, double height, string title)
    {
        _svg.Append(CultureInfo.InvariantCulture, $"<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"{width}\" height=\"{height}\" ")
            .Append(CultureInfo.InvariantCulture, $"viewBox=\"0 0 {width} {height}\" role=\"img\" font-family=\"{FontFamily}\" fill=\"none\">\n<title>");
        AppendText(title);
        _svg.Append("</title>\n");
        Fill(new Box(0, 0, width, height), Look.Paper);
    }

    public override void Fill(ReadOnlySpan<Box> boxes, Colour colour)
    {
        if (boxes.IsEmpty)
        {
            return;
        }

        _svg.Append("<path shape-rendering=\"crispEdges\" d=\"");
        foreach (Box box in boxes)
        {
            _svg.Append('M');
            AppendSpot(new Spot(box.Left, box.Top));
            _svg.Append('H');
            AppendNumber(box.Right);
            _svg.Append('V');
            AppendNumber(box.Bottom);
            _svg.Append('H');
            AppendNumber(box.Left);
            _svg.Append('z');
        }

        _svg.Append('"');
        AppendPaint("fill", colour);
        _svg.Append("/>\n");
    }

    public override void Polyline(ReadOnlySpan<Spot> spots, Stroke stroke)
    {
        _svg.Append("<path d=\"");
        AppendPath(spots);
        _svg.Append('"');
        AppendStroke(stroke);
        _svg.Append("/>\n");
    }

    public override void Polygon(ReadOnlySpan<Spot> spots, Colour fill, Stroke? edge = null)
    {
        _svg.Append("<path d=\"");
        AppendPath(spots);
        _svg.Append("z\"");
        AppendPaint("fill", fill);
        if (edge is not null)
        {
            AppendStroke(edge);
        }

        _svg.Append("/>\n");
    }

    public override void Write(string text, double x, double y, TextStyle style)
    {
        _svg.Append("<text");
        if (style.Turned)
        {
            _svg.Append(" transform=\"translate(");
            AppendSpot(new Spot(x, y));
            _svg.Append(") rotate(-90)\"");
        }
        else
        {
            _svg.Append(" x=\"");
            AppendNumber(x);
            _svg.Append("\" y=\"");
            AppendNumber(y);
            _svg.Append('"');
        }

        _svg.Append(" font-size=\"");
        AppendNumber(style.Size);
        _svg.Append('"');
        if (style.Bold)
        {
            _svg.Append(" font-weight=\"700\"");
        }

        if (style.Anchor != Anchor.Start)
        {
            _svg.Append(style.Anchor == Anchor.Middle ? " text-anchor=\"middle\"" : " text-anchor=\"end\"");
        }

        AppendPaint("fill", style.Colour);
        if (style.Halo)
        {
            _svg.Append(" paint-order=\"stroke\" stroke=\"#ffffff\" stroke-width=\"3\" stroke-linejoin=\"round\"");
        }

        if (text.Length >= ShortestFittedText)
        {
            _svg.Append(" textLength=\"");
            AppendNumber(Roboto.Width(text, style));
            _svg.Append("\" lengthAdjust=\"spacingAndGlyphs\"");
        }

        _svg.Append('>');
        AppendText(text);
        _svg.Append("</text>\n");
    }

    /// <summary>The finished document. Call once, last.</summary>
    public string ToDocument() => _svg.Append("</svg>\n").ToString();

    private void AppendPath(ReadOnlySpan<Spot> spots)
    {
        for (int i = 0; i < spots.Length; i++)
        {
            _svg.Append(i == 0 ? 'M' : i == 1 ? 'L' : ' ');
            AppendSpot(spots[i]);
        }
    }

    private void AppendStroke(Stroke stroke)
    {
        AppendPaint("stroke", stroke.Colour);
        _svg.Append(" stroke-width=\"");
        AppendNumber(stroke.Width);
        _svg.Append("\" stroke-linejoin=\"round\"");
        if (stroke.Dash.Length > 0)
        {
            _svg.Append(" stroke-dasharray=\"");
            for (int i = 0; i < stroke.Dash.Length; i++)
            {
                _svg.Append(i == 0 ? "" : " ");
                AppendNumber(stroke.Dash[i]);
            }

            _svg.Append('"');
        }
    }

    private void AppendPaint(string property, Colour colour)
    {
        _svg.Append(CultureInfo.InvariantCulture, $" {property}=\"#{colour.Red:x2}{colour.Green:x2}{colour.Blue:x2}\"");
        if (colour.Alpha < 255)
        {
            _svg.Append(CultureInfo.InvariantCulture, $" {property}-opacity=\"{colour.Alpha / 255.0:0.###}\"");
        }
    }

    private void AppendSpot(Spot spot)
    {
        AppendNumber(spot.X);
        _svg.Append(' ');
        AppendNumber(spot.Y);
    }

    /// <summary>One decimal, which is 0.0025 cm on paper. By hand: most of a file is numbers, and this is the fast way.</summary>
    private void AppendNumber(double value)
    {
        long tenths = (long)Math.Round(value * 10);
        if (tenths < 0)
        {
            _svg.Append('-');
            tenths = -tenths;
        }

        _svg.Append(tenths / 10);
        if (tenths % 10 != 0)
        {
            _svg.Append('.').Append((char)('0' + tenths % 10));
        }
    }

    private void AppendText(string text)
    {
        foreach (char c in text)
        {
            _ = c switch
            {
                '<' => _svg.Append("&lt;"),
                '>' => _svg.Append("&gt;"),
                '&' => _svg.Append("&amp;"),
                < ' ' => _svg.Append(' '), // XML 1.0 knows no control characters
                _ => _svg.Append(c),
            };
        }
    }
}
