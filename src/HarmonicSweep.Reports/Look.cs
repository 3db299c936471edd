using ScottPlot;

namespace HarmonicSweep.Reports;

/// <summary>A series: colour, dash and mark, so that colour is never the only difference.</summary>
/// <param name="Colour">Colour.</param>
/// <param name="Dash">Dash pattern.</param>
/// <param name="Mark">Mark of its peaks.</param>
internal sealed record SeriesLook(Color Colour, LinePattern Dash, MarkerShape Mark);

/// <summary>The look all pictures share.</summary>
internal static class Look
{
    public const float TextSize = 12;
    public const float SmallSize = 10.5f;
    public const float CurveWidth = 1.8f;

    public static readonly Color Ink = Color.FromHex("#1E2327");
    public static readonly Color Muted = Color.FromHex("#5B656D");
    public static readonly Color InjectedOrder = Color.FromHex("#7A5A2C");
    public static readonly Color Limit = Color.FromHex("#B00020");

    /// <summary>
    /// Hues that stay apart for normal, red-, green- and blue-blind eyes, each with a dash and a mark of its own so that a grey
    /// print can be read too.
    /// </summary>
    public static readonly SeriesLook[] Series =
    [
        new(Color.FromHex("#0B4EA2"), LinePattern.Solid, MarkerShape.FilledCircle),
        new(Color.FromHex("#DB7907"), new LinePattern([8, 3], 0, "long"), MarkerShape.FilledSquare),
        new(Color.FromHex("#007852"), new LinePattern([8, 2.5f, 1.8f, 2.5f], 0, "dash dot"), MarkerShape.FilledTriangleUp),
        new(Color.FromHex("#C56AB4"), new LinePattern([2.2f, 2.2f], 0, "dots"), MarkerShape.FilledDiamond),
        new(Color.FromHex("#4592F8"), new LinePattern([14, 3.5f], 0, "longer"), MarkerShape.FilledTriangleDown),
        new(Color.FromHex("#785400"), new LinePattern([4.5f, 2], 0, "short"), MarkerShape.Eks),
        new(Color.FromHex("#2B2F33"), new LinePattern([9, 2, 1.8f, 2, 1.8f, 2], 0, "dash dot dot"), MarkerShape.Cross),
        new(Color.FromHex("#FF4D82"), new LinePattern([5, 2, 1.5f, 2], 0, "short dot"), MarkerShape.VerticalBar),
    ];

    private static readonly Color[] HeatStops =
    [
        Color.FromHex("#FBF8EF"), Color.FromHex("#F8DC9B"), Color.FromHex("#F0A455"), Color.FromHex("#D3603F"), Color.FromHex("#9B2A5B"),
        Color.FromHex("#551A5E"), Color.FromHex("#1B0B2E"),
    ];

    /// <summary>Light to dark, so that it survives a grey print.</summary>
    public static IColormap Heat { get; } = new ScottPlot.Colormaps.CustomInterpolated(HeatStops);

    /// <summary>An empty plot in the common look with fixed room around its data for labels.</summary>
    public static Plot Empty(float left, float right, float bottom, float top)
    {
        EmbeddedFonts.Use();
        var plot = new Plot();
        plot.FigureBackground.Color = Colors.White;
        // several plots share a canvas
        plot.RenderManager.ClearCanvasBeforeEachRender = false;
        plot.DataBackground.Color = Colors.White;
        plot.Layout.Fixed(new PixelPadding(left, right, bottom, top));
        plot.HideLegend();
        foreach (IAxis axis in plot.Axes.GetAxes())
        {
            axis.FrameLineStyle.Width = 1;
            axis.FrameLineStyle.Color = Ink;
            axis.TickLabelStyle.FontSize = TextSize;
            axis.TickLabelStyle.ForeColor = Ink;
            axis.Label.FontSize = TextSize + 1;
            axis.Label.Bold = false;
            axis.Label.ForeColor = Ink;
            axis.MajorTickStyle.Length = 5;
            axis.MinorTickStyle.Length = 3;
        }

        plot.Axes.Right.MajorTickStyle.Length = 0;
        plot.Axes.Right.MinorTickStyle.Length = 0;
        plot.Axes.Top.MajorTickStyle.Length = 0;
        plot.Axes.Top.MinorTickStyle.Length = 0;
        plot.Grid.MajorLineColor = Colors.Black.WithAlpha(0.16);
        plot.Grid.MinorLineColor = Colors.Black.WithAlpha(0.06);
        plot.Grid.MajorLineWidth = 1;
        plot.Grid.MinorLineWidth = 1;
        return plot;
    }
}
