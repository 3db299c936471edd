using ScottPlot;

namespace HarmonicSweep.Reports;

/// <summary>An entry of the key under a picture.</summary>
/// <param name="Text">What it says.</param>
/// <param name="Series">Line and mark; null for a filled patch or plain text.</param>
/// <param name="Fill">Fill of a patch; null for a line or plain text.</param>
internal sealed record KeyEntry(string Text, SeriesLook? Series = null, Color? Fill = null);

/// <summary>The key under a picture: one entry a line, so that long names of states fit.</summary>
internal static class Key
{
    private const float LineHeight = 19;
    private const float SymbolRoom = 70;

    /// <summary>A panel with the key.</summary>
    public static Panel Of(IReadOnlyList<KeyEntry> entries)
    {
        EmbeddedFonts.Use();
        Plot plot = Look.Empty(0, 0, 0, 0);
        plot.HideAxesAndGrid();
        plot.DataBackground.Color = Colors.Transparent;
        foreach (KeyEntry entry in entries)
        {
            plot.Legend.ManualItems.Add(Item(entry));
        }

        plot.ShowLegend(Alignment.UpperLeft, Orientation.Vertical);
        plot.Legend.OutlineWidth = 0;
        plot.Legend.ShadowColor = Colors.Transparent;
        plot.Legend.BackgroundColor = Colors.Transparent;
        plot.Legend.FontSize = Look.TextSize;
        plot.Legend.FontColor = Look.Ink;
        plot.Legend.SymbolWidth = 44;
        plot.Legend.InterItemPadding = new PixelPadding(0, 0, 2, 2);
        plot.Legend.Padding = new PixelPadding(2, 0, 0, 0);
        plot.Legend.Margin = new PixelPadding(12, 0, 0, 2);
        return new Panel(plot, entries.Count * LineHeight + 10);
    }

    private static LegendItem Item(KeyEntry entry)
    {
        var item = new LegendItem { LabelText = EmbeddedFonts.Fit(entry.Text, Look.TextSize, Page.Width - SymbolRoom - 20) };
        if (entry.Series is { } series)
        {
            item.LineColor = series.Colour;
            item.LineWidth = Look.CurveWidth;
            item.LinePattern = series.Dash;
            item.MarkerShape = series.Mark;
            item.MarkerSize = 7;
            item.MarkerFillColor = series.Colour;
            item.MarkerLineColor = series.Colour;
        }

        if (entry.Fill is { } fill)
        {
            item.FillColor = fill;
            item.OutlineColor = Look.Ink;
            item.OutlineWidth = 0.5f;
        }

        return item;
    }
}
