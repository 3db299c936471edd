using System.Text;
using ScottPlot;
using SkiaSharp;

namespace HarmonicSweep.Reports;

/// <summary>A plot on a page: it takes the whole width.</summary>
/// <param name="Plot">The plot.</param>
/// <param name="Height">Height, pixels.</param>
internal sealed record Panel(Plot Plot, float Height);

/// <summary>
/// A picture: a title, a subtitle and plots below each other, laid out once and rendered as PNG and SVG. 800 pixels of width
/// are meant to be 16 cm on paper.
/// </summary>
internal sealed class Page(string title, string subtitle, IReadOnlyList<Panel> panels)
{
    public const float Width = 800;

    private const float HeaderHeight = 54;
    private const float Margin = 14;
    private const float PixelsPerUnit = 1.5f;

    private float Height => HeaderHeight + panels.Sum(p => p.Height) + 4;

    /// <summary>The picture as a PNG file of 1200 pixels width, 190 dots an inch at 16 cm.</summary>
    public byte[] ToPng()
    {
        var info = new SKImageInfo(
            (int)(Width * PixelsPerUnit), (int)MathF.Ceiling(MathF.Ceiling(Height) * PixelsPerUnit), SKColorType.Rgba8888, SKAlphaType.Opaque);
        using SKSurface surface = SKSurface.Create(info) ?? throw new InvalidOperationException("There is no memory for the bitmap of a picture.");
        surface.Canvas.Scale(PixelsPerUnit);
        Draw(surface.Canvas);
        using SKPixmap pixels = surface.PeekPixels();
        // fast compression: half the time for a tenth more bytes
        using SKData data = pixels.Encode(new SKPngEncoderOptions(SKPngEncoderFilterFlags.Sub, 3))
            ?? throw new InvalidOperationException("The picture could not be encoded.");
        return data.ToArray();
    }

    /// <summary>The picture as an SVG file with a view box; texts stay text, with fonts to fall back on.</summary>
    public byte[] ToSvg()
    {
        using var stream = new MemoryStream();
        var bounds = new SKRect(0, 0, Width, MathF.Ceiling(Height));
        using (SKCanvas canvas = SKSvgCanvas.Create(bounds, stream))
        {
            Draw(canvas);
        }

        string size = FormattableString.Invariant($"width=\"{bounds.Width}\" height=\"{bounds.Height}\"");
        string box = FormattableString.Invariant($"viewBox=\"0 0 {bounds.Width} {bounds.Height}\" {size}");
        string text = Encoding.UTF8.GetString(stream.GetBuffer(), 0, (int)stream.Length)
            .Replace(size, box, StringComparison.Ordinal)
            .Replace($"font-family=\"{EmbeddedFonts.Name}\"", $"font-family=\"{EmbeddedFonts.Name}, Arial, sans-serif\"", StringComparison.Ordinal);
        return Encoding.UTF8.GetBytes(Renumbered(text));
    }

    /// <summary>
    /// The drawing library numbers clip paths over the whole process, so the same picture would differ from run to run: they
    /// are numbered anew in the order they appear.
    /// </summary>
    private static string Renumbered(string svg)
    {
        const string Prefix = "cl_";
        var numbers = new Dictionary<string, int>(StringComparer.Ordinal);
        var text = new StringBuilder(svg.Length);
        int from = 0;
        for (int at = svg.IndexOf(Prefix, StringComparison.Ordinal); at >= 0; at = svg.IndexOf(Prefix, from, StringComparison.Ordinal))
        {
            int end = at + Prefix.Length;
            while (end < svg.Length && char.IsAsciiHexDigitLower(svg[end]))
            {
                end++;
            }

            string id = svg[at..end];
            numbers.TryAdd(id, numbers.Count);
            text.Append(svg, from, at - from).Append(Prefix).Append(numbers[id]);
            from = end;
        }

        return text.Append(svg, from, svg.Length - from).ToString();
    }

    private void Draw(SKCanvas canvas)
    {
        canvas.Clear(SKColors.White);
        using var paint = Paint.NewDisposablePaint();
        Write(canvas, paint, title, 25, 17, bold: true, Look.Ink);
        Write(canvas, paint, subtitle, 45, Look.TextSize, bold: false, Look.Muted);
        float top = HeaderHeight;
        foreach (Panel panel in panels)
        {
            panel.Plot.Render(canvas, new PixelRect(0, Width, top + panel.Height, top));
            top += panel.Height;
        }
    }

    private static void Write(SKCanvas canvas, Paint paint, string text, float y, float size, bool bold, Color colour)
    {
        var label = new LabelStyle
        {
            Text = EmbeddedFonts.Fit(text, size, Width - 2 * Margin),
            FontSize = size,
            Bold = bold,
            ForeColor = colour,
            Alignment = Alignment.LowerLeft,
        };
        label.Render(canvas, new Pixel(Margin, y), paint);
    }
}
