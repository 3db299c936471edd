using System.Numerics;
using System.Xml.Linq;
using HarmonicSweep.Network;
using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Reports.Pictures;
using HarmonicSweep.Studies;
using SkiaSharp;
using Xunit;

namespace HarmonicSweep.Tests.Reports;

/// <summary>That pictures say what they should, in letters that are really there.</summary>
public sealed class PlotTextTests
{
    [Fact]
    public void Text_leaves_ink_on_a_png()
    {
        // with no usable font Skia draws nothing and reports nothing, hence the look at the pixels
        using var blank = new PngSheet(80, 20);
        using var regular = new PngSheet(80, 20);
        using var bold = new PngSheet(80, 20);
        regular.Write("Order 7 Ω", 4, 15, Look.Text);
        bold.Write("Order 7 Ω", 4, 15, Look.Text with { Bold = true });

        Assert.Equal(0, InkOf(blank.ToBytes()));
        Assert.InRange(InkOf(regular.ToBytes()), 300, 1600); // of 6400 pixels: thin strokes, not boxes or a black bar
        Assert.True(InkOf(bold.ToBytes()) > 1.1 * InkOf(regular.ToBytes()), "bold must use the bold font");
    }

    [Fact]
    public void A_picture_carries_its_title_in_pixels()
    {
        var sample = new SampleStudies { States = 2 };
        foreach (Picture picture in PictureBook.Plan("Case", sample.Build(), sample.Settings))
        {
            using SKBitmap bitmap = SKBitmap.Decode(picture.ToPng());
            int ink = 0;
            for (int y = 20; y < 50; y++) // the title stands at 10 to 25 units
            {
                for (int x = 32; x < 400; x++)
                {
                    ink += bitmap.GetPixel(x, y).Red < 128 ? 1 : 0;
                }
            }

            Assert.InRange(ink, 800, 6000);
        }
    }

    [Fact]
    public void Font_has_every_sign_the_pictures_use() =>
        Assert.Empty(Roboto.Missing("|Z| (Ω) Angle (°) −90 % V₁ · … – µ ÄÖÜäöüß éèçñøåžł αβγ Жя ⁰¹²³⁴⁵⁶⁷⁸⁹⁻"));

    [Fact]
    public void Missing_characters_are_told()
    {
        var sample = new SampleStudies { Buses = 1, BusName = _ => "電気室 LV" };

        Assert.Equal(["電", "気", "室"], PictureBook.MissingCharacters("Case", sample.Build()));
        Assert.Empty(PictureBook.MissingCharacters("Case", new SampleStudies().Build()));
    }

    [Fact]
    public void Impedance_names_axes_states_orders_and_resonances()
    {
        // a supply of 0.08 Ω beside 3.92 Ω of capacitor: h = sqrt(3.92/0.08) = 7 by hand; Z there = X^2 h^2/R = 0.3136/0.02 Ω
        StudyResult result = Tank(supplyOhm: 0.08, bankOhm: 3.92, peakOrder: 7, peakOhm: 0.08 * 0.08 * 49 / 0.02);

        string[] texts = TextsOf(PlanOne(result, "impedance"));

        Assert.Contains("Driving-point impedance at Werk Süd", texts);
        Assert.Contains("|Z| (Ω)", texts);
        Assert.Contains("Angle (°)", texts);
        Assert.Contains("Order h (frequency / fundamental)", texts);
        Assert.Contains("Netz schwach", texts);
        Assert.Contains("h 7.00", texts);
        Assert.Contains("15.7 Ω", texts);
        Assert.Contains("7.00: 15.7 Ω", texts);
        Assert.All(new[] { "5", "7", "11", "13" }, order => Assert.Contains(order, texts));
        Assert.All(new[] { "−90", "0", "90", "0.1", "1", "10" }, tick => Assert.Contains(tick, texts));
    }

    [Fact]
    public void Impedance_curve_reaches_a_resonance_between_scanned_points()
    {
        StudyResult result = Tank(0.08, 3.92, 7, 15.68);
        RecordingSheet sheet = RecordingSheet.Of(PlanOne(result, "impedance"));

        Spot[] curve = sheet.Lines.Where(l => l.Stroke.Colour == Look.Series[0].Colour).Select(l => l.Spots).OrderBy(s => s.Min(p => p.Y)).First();
        Spot top = curve.MinBy(p => p.Y);
        // two injected orders with known places give the scale across
        double five = MiddleOf(sheet, "5"), thirteen = MiddleOf(sheet, "13");
        double order = 5 + (top.X - five) / (thirteen - five) * 8;
        Assert.Equal(7, order, 0.01); // the scan has points at 6.9 and 7.15 only; a unit of the sheet is 0.04 orders here
    }

    [Fact]
    public void Open_impedance_is_said_in_words()
    {
        var sample = new SampleStudies { Buses = 1, Open = true, Injects = false, BankSteps = 0 };

        Assert.Contains("open: no path to ground at any order", TextsOf(PictureBook.Plan("Case", sample.Build(), sample.Settings)[0]));
    }

    [Fact]
    public void Dead_bus_is_said_and_never_drawn_as_zero()
    {
        var sample = new SampleStudies { Buses = 2, States = 2, DeadInLastState = true };
        IReadOnlyList<Picture> plan = PictureBook.Plan("Case", sample.Build(), sample.Settings);

        Assert.Contains("dead bus, not judged", TextsOf(plan.Single(p => p.FileName == "thd")));
        Assert.Contains("bus dead or not scanned in this state", TextsOf(plan.Single(p => p.FileName == "impedance-lv-2")));
        RecordingSheet thd = RecordingSheet.Of(plan.Single(p => p.FileName == "thd"));
        Assert.Equal(3, thd.Fills.Count(f => f.Box.Height == 10)); // 2 buses x 2 states less the dead one
    }

    [Fact]
    public void Spectrum_draws_bars_and_limit_to_one_scale_and_flags_what_exceeds()
    {
        StudyResult result = Spectrum(("5", 5, 4.5), ("7", 7, 1.5));
        Picture picture = PlanOne(result, "voltage-spectrum");
        RecordingSheet sheet = RecordingSheet.Of(picture);

        Box[] bars = [.. sheet.Fills.Where(f => f.Colour == Look.Bars[0] && f.Box.Height > 20).Select(f => f.Box).OrderBy(b => b.Left)];
        double limit = sheet.Lines.First(l => l.Stroke == Look.LimitLine).Spots[0].Y, zero = bars[0].Bottom;
        Assert.Equal(2, bars.Length);
        Assert.Equal(4.5 / 3.0, bars[0].Height / (zero - limit), 1e-9);
        Assert.Equal(1.5 / 3.0, bars[1].Height / (zero - limit), 1e-9);
        Assert.Contains("Voltage (% of nominal)", TextsOf(picture));
        Assert.Contains("limit of one order, IEEE 519-2022: 3 %", TextsOf(picture));
        Assert.Contains("limit exceeded", TextsOf(picture));
        Assert.Equal(2, sheet.Polygons.Count(p => p.Fill == Look.Limit)); // over one bar, and in the legend
    }

    [Fact]
    public void Thd_of_many_states_names_the_worst()
    {
        var sample = new SampleStudies { Buses = 2, States = 9 };
        StudyResult result = sample.Build();
        string worst = result.States.MaxBy(s => s.Distortion.Single(d => d.Bus == "LV-1" && d.Rule == SummationRule.Phasor).PercentOfFundamental)!.State;
        string[] texts = TextsOf(PictureBook.Plan("Case", result, sample.Settings).Single(p => p.FileName == "thd"));

        Assert.Contains(texts, t => t.EndsWith(worst, StringComparison.Ordinal));
        Assert.Contains("THD (% of V₁)", texts);
        Assert.Contains(texts, t => t.StartsWith("THD limit 5 % of IEEE 519-2022 at LV-1", StringComparison.Ordinal));
    }

    [Fact]
    public void Position_map_flags_the_rows_not_to_dwell_on()
    {
        var sample = new SampleStudies { Buses = 1 };
        StudyResult result = sample.Build();
        string[] texts = TextsOf(PictureBook.Plan("Case", result, sample.Settings).Single(p => p.FileName == "positions-bank-1-base"));

        BankPosition[] flagged = [.. result.Screen!.Positions.Where(p => p.DoNotDwell)];
        Assert.NotEmpty(flagged);
        Assert.Equal(flagged.Length, texts.Count(t => t.StartsWith("avoid:", StringComparison.Ordinal)));
        Assert.Contains("do not dwell: within 0.3 of an injected order", texts);
        Assert.Contains("Supply strength: maximum", texts);
        Assert.Contains("Supply strength: minimum", texts);
        Assert.Contains("3 of 6 · 150 kvar", texts);
        Assert.Contains("|Z| (Ω)", texts);
    }

    [Fact]
    public void Positions_beyond_a_page_go_on_in_further_pictures()
    {
        var sample = new SampleStudies { Buses = 1, BankSteps = 49, OrderStep = 0.5 };
        Picture[] pages = [.. PictureBook.Plan("Case", sample.Build(), sample.Settings).Where(p => p.FileName.StartsWith("positions", StringComparison.Ordinal))];

        string[] rows = [.. pages.SelectMany(TextsOf).Where(t => t.Contains(" of 49 · ", StringComparison.Ordinal))];
        Assert.Equal(100, rows.Length); // 0 to 49 steps at two strengths
        Assert.Equal(50, rows.Distinct(StringComparer.Ordinal).Count());
        Assert.All(pages, p => Assert.InRange(p.Height, 100, 960)); // 24 cm, the height of a printed page
    }

    private static double MiddleOf(RecordingSheet sheet, string injected)
    {
        Box box = sheet.Texts.Single(t => t.Text == injected && t.Style == Look.InjectedLabel).Box;
        return (box.Left + box.Right) / 2;
    }

    private static int InkOf(byte[] png)
    {
        using SKBitmap bitmap = SKBitmap.Decode(png);
        return bitmap.Pixels.Count(p => p.Red < 200);
    }

    private static string[] TextsOf(Picture picture) =>
        [.. XDocument.Parse(picture.ToSvg()).Descendants().Where(e => e.Name.LocalName == "text").Select(e => e.Value)];

    private static Picture PlanOne(StudyResult result, string start) =>
        PictureBook.Plan("Case", result, new SampleStudies().Settings).Single(p => p.FileName.StartsWith(start, StringComparison.Ordinal));

    /// <summary>R + jhX with R = 0.02 Ω beside a capacitor, scanned so coarsely that the peak lies between points.</summary>
    private static StudyResult Tank(double supplyOhm, double bankOhm, double peakOrder, double peakOhm)
    {
        double[] orders = [.. Enumerable.Range(0, 80).Select(i => 0.9 + 0.25 * i)];
        Complex?[] ohm =
        [
            .. orders.Select(h => (Complex?)(1 / (1 / new Complex(0.02, h * supplyOhm) + 1 / new Complex(0, -bankOhm / h)))),
        ];
        return new StudyResult
        {
            States =
            [
                new StateResult
                {
                    State = "Netz schwach",
                    InjectedOrders = [5, 7, 11, 13],
                    Impedance = [new ImpedanceCurve(Sequence.Positive, "Werk Süd", "Werk Süd", orders, ohm)],
                    Resonances = [new Resonance(Sequence.Positive, "Werk Süd", ResonanceKind.Parallel, peakOrder, 50 * peakOrder, peakOhm, 28, 7)],
                },
            ],
        };
    }

    private static StudyResult Spectrum(params (string Name, double Order, double Percent)[] bars) => new()
    {
        States =
        [
            new StateResult
            {
                State = "base",
                Voltages =
                [
                    new HarmonicVoltage("LV-1", 1, 0.4, new RuleValues(0.4, 0.4, 0.4, 0.4), new RuleValues(100, 100, 100, 100)),
                    .. bars.Select(b => new HarmonicVoltage(
                        "LV-1", b.Order, b.Percent * 0.004, default, new RuleValues(b.Percent, 9 * b.Percent, 9 * b.Percent, 9 * b.Percent))),
                ],
                Limits =
                [
                    .. bars.Select(b => new LimitVerdict(
                        "IEEE 519-2022", "Table 1", "", "V_h", "LV-1", b.Order, b.Percent, 3, b.Percent > 3 ? Verdict.Exceeded : Verdict.Within, null)),
                ],
            },
        ],
    };
}
