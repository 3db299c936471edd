namespace HarmonicSweep.Reports.Drawing;

/// <summary>An opaque or translucent colour.</summary>
internal readonly record struct Colour(byte Red, byte Green, byte Blue, byte Alpha = 255)
{
    public static Colour Of(int rgb, byte alpha = 255) => new((byte)(rgb >> 16), (byte)(rgb >> 8), (byte)rgb, alpha);
}

/// <summary>How a line is drawn; an empty dash is a full line. Lengths in sheet units.</summary>
internal sealed record Stroke(Colour Colour, double Width, params float[] Dash);

/// <summary>Where a text sits relative to its spot.</summary>
internal enum Anchor
{
    Start,
    Middle,
    End,
}

/// <summary>How a text is drawn. A halo is a white rim that keeps it readable over curves; turned = reading upwards.</summary>
internal sealed record TextStyle(
    double Size, Colour Colour, bool Bold = false, Anchor Anchor = Anchor.Start, bool Halo = false, bool Turned = false);

/// <summary>Shapes of a mark.</summary>
internal enum MarkShape
{
    Circle,
    Square,
    Triangle,
    Diamond,
    TriangleDown,
    Cross,
    Plus,
    Bar,
}

/// <summary>Colour, dash and mark of one series: any one of the three tells it from its neighbours.</summary>
internal sealed record SeriesLook(Colour Colour, float[] Dash, MarkShape Mark)
{
    public Stroke Stroke(double width) => new(Colour, width, Dash);
}

/// <summary>
/// The look of every picture. A sheet is 640 units wide and meant to be printed 16 cm wide, so one unit is 0.71 point
/// and the smallest text (10 units) prints at 7 point.
/// </summary>
internal static class Look
{
    public const double SmallSize = 10;
    public const double TextSize = 11;
    public const double AxisSize = 12;
    public const double TitleSize = 15;

    public const double CurveWidth = 1.6;

    public static readonly Colour Ink = Colour.Of(0x1A1F24);
    public static readonly Colour Faded = Colour.Of(0x5C6670);
    public static readonly Colour Paper = Colour.Of(0xFFFFFF);
    public static readonly Colour Limit = Colour.Of(0xB00020);
    public static readonly Colour Span = Colour.Of(0xD5DAE0);

    public static readonly Stroke Frame = new(Colour.Of(0x3C444C), 1);
    public static readonly Stroke MajorGrid = new(Colour.Of(0xD3D8DD), 0.8);
    public static readonly Stroke MinorGrid = new(Colour.Of(0xECEFF1), 0.8);
    public static readonly Stroke InjectedOrder = new(Colour.Of(0x8A6D3B), 0.8, 1.5f, 2);
    public static readonly Stroke InjectedOrderOnShade = new(Ink, 1, 1.5f, 2);
    public static readonly Stroke LimitLine = new(Limit, 1.6, 6, 3);

    public static readonly TextStyle Title = new(TitleSize, Ink, Bold: true);
    public static readonly TextStyle LongTitle = Title with { Size = 12 };
    public static readonly TextStyle Subtitle = new(TextSize, Faded);
    public static readonly TextStyle AxisTitle = new(AxisSize, Ink, Anchor: Anchor.Middle);
    public static readonly TextStyle AxisTitleTurned = AxisTitle with { Turned = true };
    public static readonly TextStyle Text = new(TextSize, Ink);
    public static readonly TextStyle Small = new(SmallSize, Ink);
    public static readonly TextStyle Note = new(SmallSize, Faded);
    public static readonly TextStyle InjectedLabel = new(SmallSize, Colour.Of(0x6B5227), Anchor: Anchor.Middle);

    /// <summary>
    /// Hues chosen so that any two stay at least 18 CIE 1976 units apart for normal, red-, green- and blue-blind eyes (a
    /// test holds them to it), each with a dash and a mark of its own so that a grey print can be read too.
    /// </summary>
    public static readonly SeriesLook[] Series =
    [
        new(Colour.Of(0x0B4EA2), [], MarkShape.Circle),
        new(Colour.Of(0xDB7907), [8, 3], MarkShape.Square),
        new(Colour.Of(0x007852), [8, 2.5f, 1.8f, 2.5f], MarkShape.Triangle),
        new(Colour.Of(0xC56AB4), [2.2f, 2.2f], MarkShape.Diamond),
        new(Colour.Of(0x4592F8), [14, 3.5f], MarkShape.TriangleDown),
        new(Colour.Of(0x785400), [4.5f, 2], MarkShape.Cross),
        new(Colour.Of(0x2B2F33), [9, 2, 1.8f, 2, 1.8f, 2], MarkShape.Plus),
        new(Colour.Of(0xFF4D82), [5, 2, 1.5f, 2], MarkShape.Bar),
    ];

    /// <summary>Fills of bars side by side: their lightness differs, and they stand in the order of the legend.</summary>
    public static readonly Colour[] Bars =
    [
        Colour.Of(0x0B4EA2), Colour.Of(0xF3A64B), Colour.Of(0x007852), Colour.Of(0xA9D8F2),
    ];

    private static readonly Colour[] HeatStops =
    [
        Colour.Of(0xFBF8EF), Colour.Of(0xF8DC9B), Colour.Of(0xF0A455), Colour.Of(0xD3603F), Colour.Of(0x9B2A5B),
        Colour.Of(0x551A5E), Colour.Of(0x1B0B2E),
    ];

    /// <summary>Shade of a heat map, 0 = light to 1 = dark; lightness falls all the way, so it survives a grey print.</summary>
    public static Colour Heat(double fraction)
    {
        double place = Math.Clamp(fraction, 0, 1) * (HeatStops.Length - 1);
        int below = Math.Min((int)place, HeatStops.Length - 2);
        Colour a = HeatStops[below], b = HeatStops[below + 1];
        double t = place - below;
        return new Colour(Mix(a.Red, b.Red), Mix(a.Green, b.Green), Mix(a.Blue, b.Blue));

        byte Mix(byte from, byte to) => (byte)Math.Round(from + (to - from) * t);
    }
}
