using ScottPlot;
using SkiaSharp;

namespace HarmonicSweep.Reports;

/// <summary>
/// The embedded font. Pictures never ask the machine for one: with none installed the plotting library draws no text and
/// says nothing.
/// </summary>
internal sealed class EmbeddedFonts : IFontResolver
{
    /// <summary>Name of the font in pictures.</summary>
    public const string Name = "Roboto";

    private static readonly Lazy<SKTypeface> LazyRegular = new(() => Load("Roboto-Regular.ttf"));
    private static readonly Lazy<SKTypeface> LazyBold = new(() => Load("Roboto-Bold.ttf"));
    private static readonly Lazy<bool> LazyInstalled = new(Install);

    /// <summary>Makes the plotting library use the embedded font; does nothing the second time.</summary>
    public static void Use() => _ = LazyInstalled.Value;

    /// <summary>Characters of a text the font cannot draw, each once; a PNG shows a box in their place.</summary>
    public static IEnumerable<string> Missing(string text)
    {
        using var font = new SKFont(LazyRegular.Value);
        foreach (System.Text.Rune rune in text.EnumerateRunes().Distinct())
        {
            if (!font.ContainsGlyph(rune.Value))
            {
                yield return rune.ToString();
            }
        }
    }

    /// <summary>Width of a text in pixels of a picture.</summary>
    public static float Width(string text, float size, bool bold = false)
    {
        using var font = new SKFont((bold ? LazyBold : LazyRegular).Value, size);
        return font.MeasureText(text);
    }

    /// <summary>The text, its middle replaced by an ellipsis when it is wider than allowed: both ends tell names apart.</summary>
    public static string Fit(string text, float size, float width)
    {
        string shown = text;
        for (int keep = text.Length - 1; keep > 1 && Width(shown, size) > width; keep--)
        {
            int head = (keep + 1) / 2;
            int tail = text.Length - (keep - head);
            if (!char.IsHighSurrogate(text[head - 1]) && (tail >= text.Length || !char.IsLowSurrogate(text[tail])))
            {
                shown = $"{text.AsSpan(0, head).TrimEnd()}…{text.AsSpan(tail).TrimStart()}";
            }
        }

        return shown;
    }

    /// <inheritdoc/>
    public SKTypeface? CreateTypeface(string fontName, FontWeight weight, FontSlant slant, FontSpacing spacing) =>
        (weight >= FontWeight.SemiBold ? LazyBold : LazyRegular).Value;

    /// <inheritdoc/>
    public SKTypeface? CreateTypeface(string fontName, bool bold, bool italic) => (bold ? LazyBold : LazyRegular).Value;

    private static bool Install()
    {
        ScottPlot.Fonts.FontResolvers.Insert(0, new EmbeddedFonts());
        ScottPlot.Fonts.Default = Name;
        ScottPlot.Fonts.Sans = Name;
        return true;
    }

    private static SKTypeface Load(string file)
    {
        using Stream stream = typeof(EmbeddedFonts).Assembly.GetManifestResourceStream(file)
            ?? throw new InvalidOperationException($"The font {file} is not embedded in this build.");
        using SKData data = SKData.Create(stream);
        return SKTypeface.FromData(data) ?? throw new InvalidOperationException($"The embedded font {file} cannot be read.");
    }
}
