using SkiaSharp;

namespace HarmonicSweep.Reports.Drawing;

/// <summary>
/// The embedded font. Pictures never ask the machine for a font: with none installed Skia draws no text and says nothing.
/// </summary>
internal static class Roboto
{
    private static readonly Lazy<SKTypeface> LazyRegular = new(() => Load("Roboto-Regular.ttf"));
    private static readonly Lazy<SKTypeface> LazyBold = new(() => Load("Roboto-Bold.ttf"));

    /// <summary>A font of that size in sheet units; not to be shared between threads.</summary>
    public static SKFont Font(double size, bool bold) => new((bold ? LazyBold : LazyRegular).Value, (float)size)
    {
        Subpixel = true,
        Hinting = SKFontHinting.None,
        Edging = SKFontEdging.Antialias,
    };

    /// <summary>Advance width of a text, sheet units.</summary>
    public static double Width(string text, TextStyle style)
    {
        using SKFont font = Font(style.Size, style.Bold);
        return font.MeasureText(text);
    }

    /// <summary>The text, with its middle replaced by an ellipsis when it is wider than allowed: both ends tell names apart.</summary>
    public static string Fit(string text, TextStyle style, double width)
    {
        if (Width(text, style) <= width)
        {
            return text;
        }

        for (int keep = text.Length - 1; keep > 1; keep--)
        {
            int head = (keep + 1) / 2, tail = keep - head;
            if (char.IsHighSurrogate(text[head - 1]) || char.IsLowSurrogate(text[^tail]))
            {
                continue;
            }

            string shorter = $"{text.AsSpan(0, head).TrimEnd()}…{text.AsSpan(text.Length - tail).TrimStart()}";
            if (Width(shorter, style) <= width)
            {
                return shorter;
            }
        }

        return "…";
    }

    /// <summary>Characters of a text the font cannot draw, each once; a PNG shows a box in their place.</summary>
    public static IEnumerable<string> Missing(string text)
    {
        using SKFont font = Font(Look.TextSize, bold: false);
        foreach (System.Text.Rune rune in text.EnumerateRunes().Distinct())
        {
            if (!font.ContainsGlyph(rune.Value))
            {
                yield return rune.ToString();
            }
        }
    }

    private static SKTypeface Load(string name)
    {
        using Stream stream = typeof(Roboto).Assembly.GetManifestResourceStream(name)
            ?? throw new InvalidOperationException($"The font {name} is not embedded in this build.");
        using SKData data = SKData.Create(stream);
        return SKTypeface.FromData(data) ?? throw new InvalidOperationException($"The embedded font {name} cannot be read.");
    }
}
