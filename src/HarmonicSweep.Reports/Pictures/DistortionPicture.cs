using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>
/// THD of every bus as lying bars, so that long names can be read: states below each other while that fits a page, else the
/// worst state with its name.
/// </summary>
internal static class DistortionPicture
{
    private const double BarHeight = 11;
    private const double RowGap = 7;
    private const double TallestBars = 620;
    private const int MostRows = 34;
    private const double WidestName = 180;
    private const double MostWords = 0.5;

    /// <summary>A limit further beyond the bars than this would flatten them: it is written instead of drawn.</summary>
    private const double FarLimit = 5;

    private static readonly Stroke ThdLimitStroke = new(Look.Limit, 2.4);

    /// <summary>One picture, or several when there are more buses than a page has rows.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        BusThd[] rows = [.. BusThd.All(context)];
        if (rows.All(r => r.Percent.All(p => p is null or 0)))
        {
            yield break;
        }

        BusThd[][] pages = [.. rows.Chunk(MostRows)];
        for (int page = 0; page < pages.Length; page++)
        {
            string part = pages.Length == 1 ? "" : FormattableString.Invariant($", part {page + 1} of {pages.Length}");
            yield return Of(context, pages[page], rows, part);
        }
    }

    private static Picture Of(PictureContext context, BusThd[] rows, BusThd[] all, string part)
    {
        int states = context.Result.States.Count;
        bool beside = states <= Look.Bars.Length && rows.Length * (states * BarHeight + RowGap) <= TallestBars;
        double rowHeight = (beside ? states : 1) * BarHeight + RowGap, top = Picture.HeaderHeight + 6;
        double bottom = top + rows.Length * rowHeight + RowGap, legendTop = bottom + Panel.BottomRoom + 6;
        double largest = all.SelectMany(r => r.Percent).Max(p => p ?? 0);
        double furthest = all.SelectMany(r => r.Limits).Select(l => l.Percent).Where(l => l <= FarLimit * largest).DefaultIfEmpty(0).Max();
        List<LegendEntry> legend = LegendOf(context, rows, beside, furthest);
        double height = legendTop + Legend.Height(legend, Picture.Width - 2 * Picture.Margin) + 6;
        string choices = $"orders 2 to 50, {context.RuleText} · {(beside ? "" : "worst of ")}{context.StatesText(states)}";
        return new Picture("thd", "Voltage distortion (THD) by bus" + part, context.CaseTitle, choices, height, sheet =>
        {
            double left = Picture.Margin + 8 + Math.Min(WidestName, rows.Max(r => Roboto.Width(context.BusText(r.Bus), NameStyle(context, r))));
            double words = rows.SelectMany(r => TextsOf(context, r, beside)).Max(t => Roboto.Width(t, Look.Text with { Bold = true }));
            var area = new Box(left, top, Picture.Width - Picture.Margin, bottom);
            double room = Math.Min(words + 14, MostWords * area.Width); // right of the longest bar, for its words
            LinearScale across = LinearScale.FromZero(Math.Max(largest * area.Width / (area.Width - room), furthest * 1.02), 8);
            var panel = new Panel(area, across, LinearScale.Over(0, 1, 1));
            panel.DrawGrid(sheet, horizontal: false);
            for (int i = 0; i < rows.Length; i++)
            {
                DrawRow(sheet, panel, context, rows[i], top + RowGap + i * rowHeight, beside);
            }

            sheet.Outline(area, Look.Frame);
            panel.DrawAcross(sheet, "THD (% of V₁)");
            Legend.Draw(sheet, legend, Picture.Margin, legendTop, Picture.Width - 2 * Picture.Margin);
        });
    }

    private static TextStyle NameStyle(PictureContext context, BusThd row) =>
        Look.Text with { Anchor = Anchor.End, Bold = row.Bus == context.Settings.PccBus };

    private static void DrawRow(Sheet sheet, Panel panel, PictureContext context, BusThd row, double y, bool beside)
    {
        int bars = beside ? row.Percent.Length : 1;
        double bottom = y + bars * BarHeight;
        TextStyle name = NameStyle(context, row);
        sheet.Write(Roboto.Fit(context.BusText(row.Bus), name, WidestName), panel.Area.Left - 7, (y + bottom) / 2 + 4, name);
        string[] texts = [.. TextsOf(context, row, beside)];
        for (int i = 0; i < bars; i++)
        {
            int? state = beside ? i : row.WorstState;
            double right = panel.Area.Left, barTop = y + i * BarHeight;
            if (state is { } s && row.Percent[s] is { } percent)
            {
                right = panel.X(percent);
                var bar = new Box(panel.Area.Left, barTop + 0.5, right, barTop + BarHeight - 0.5);
                sheet.Fill(bar, Look.Bars[beside ? s : 0]);
                sheet.Outline(bar, Look.Frame with { Width = 0.5 });
            }

            bool exceeded = state is { } judged && row.Exceeded[judged];
            TextStyle style = Look.Text with { Bold = exceeded, Colour = exceeded ? Look.Limit : Look.Ink, Halo = true };
            sheet.Write(Roboto.Fit(texts[i], style, panel.Area.Right - right - 8), right + 5, barTop + BarHeight - 1.7, style);
        }

        foreach (ThdLimit limit in row.Limits.Where(l => l.Percent <= panel.Across.To))
        {
            double x = panel.X(limit.Percent);
            sheet.Line(x, y - 3, x, bottom + 3, ThdLimitStroke);
        }
    }

    private static IEnumerable<string> TextsOf(PictureContext context, BusThd row, bool beside)
    {
        if (beside)
        {
            return row.Percent.Select((p, s) => p is { } v ? Figures.Percent(v) + (row.Exceeded[s] ? " exceeds" : "") : "dead bus, not judged");
        }

        return
        [
            row.WorstState is { } worst
                ? $"{Figures.Percent(row.Percent[worst]!.Value)}{(row.Exceeded[worst] ? " exceeds" : "")} · {context.Result.States[worst].State}"
                : "dead bus, not judged",
        ];
    }

    private static List<LegendEntry> LegendOf(PictureContext context, BusThd[] rows, bool beside, double furthest)
    {
        var entries = new List<LegendEntry>();
        if (beside)
        {
            entries.AddRange(context.Result.States.Select((s, i) => LegendEntry.Patch(s.State, Look.Bars[i])));
        }

        foreach (var judged in rows.SelectMany(r => r.Limits.Select(l => (r.Bus, Limit: l))).GroupBy(j => j.Limit, j => j.Bus))
        {
            string where = judged.Count() == 1 ? judged.First() : FormattableString.Invariant($"{judged.Count()} buses");
            string hidden = judged.Key.Percent > furthest ? ", beyond this axis" : "";
            entries.Add(LegendEntry.Line(
                $"THD limit {Figures.LimitPercent(judged.Key.Percent)} % of {judged.Key.Standard} at {where}{hidden}", ThdLimitStroke));
        }

        return entries;
    }
}
