using System.Text;
using System.Xml.Linq;
using HarmonicSweep.Network;
using HarmonicSweep.Reports;
using HarmonicSweep.Reports.Pictures;
using HarmonicSweep.Studies;
using SkiaSharp;
using Xunit;

namespace HarmonicSweep.Tests.Reports;

/// <summary>That pictures say what they should, in letters that are really there, inside the sheet.</summary>
public sealed class PlotTextTests
{
    /// <summary>With no usable font the drawing library draws no text and reports nothing, hence the look at the pixels.</summary>
    [Fact]
    public void Every_picture_carries_its_title_in_pixels()
    {
        var sample = new SampleStudies { States = 2 };
        foreach (Picture picture in PlanOf(sample))
        {
            using SKBitmap bitmap = SKBitmap.Decode(picture.ToPng());
            int ink = 0;
            for (int y = 12; y < 46; y++)
            {
                for (int x = 21; x < 450; x++)
                {
                    ink += bitmap.GetPixel(x, y).Red < 128 ? 1 : 0;
                }
            }

            // thin strokes of some thirty letters, not boxes or a black bar
            Assert.InRange(ink, 450, 5000);
        }
    }

    [Fact]
    public void Font_has_every_sign_the_pictures_use() =>
        Assert.Empty(EmbeddedFonts.Missing("|Z| (Ω) Angle (°) −90 % V₁ · … – µ ÄÖÜäöüß éèçñøåžł αβγ Жя ⁰¹²³⁴⁵⁶⁷⁸⁹⁻"));

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
        // the numbers are the sample's own peaks; that a peak stands where its order says is a test of its own
        var sample = new SampleStudies { States = 2, Buses = 1 };
        Resonance peak = sample.Build().States[0].Resonances.Where(r => r.Kind == ResonanceKind.Parallel).MaxBy(r => r.Ohm)!;

        string text = TextOf(PlanOf(sample), "impedance-lv-1");

        string[] expected =
        [
            "Driving-point impedance at LV-1 (PCC)", "|Z| (Ω)", "Angle (°)", "Order h (frequency / fundamental)",
            "base:", "supply min, BANK-1 1/6:", Figures.ComputedOrder(peak.Order), $"{Figures.Short(peak.Ohm)} Ω", "dashed: injected orders",
        ];
        Assert.All(expected, word => Assert.Contains(word, text, StringComparison.Ordinal));
    }

    [Fact]
    public void Spectrum_names_the_limit_and_the_worst_state()
    {
        string text = TextOf(PlanOf(new SampleStudies { States = 3 }), "voltage-spectrum-lv-1");

        Assert.Contains("V_h (% of nominal voltage)", text, StringComparison.Ordinal);
        Assert.Contains("limit of each order, IEEE 519-2022: 3 %", text, StringComparison.Ordinal);
        Assert.Contains("worst of all states: A = ", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Distortion_says_what_a_dead_bus_is_and_what_exceeds()
    {
        string text = TextOf(PlanOf(new SampleStudies { States = 1, Buses = 2, DeadInLastState = true, VoltageScale = 40 }), "thd");

        Assert.Contains("dead bus, not judged", text, StringComparison.Ordinal);
        Assert.Contains("exceeds", text, StringComparison.Ordinal);
        Assert.Contains("THD (% of V₁)", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Positions_name_steps_kvar_strength_and_what_to_avoid()
    {
        string text = TextOf(PlanOf(new SampleStudies()), "positions-bank-1-base");

        Assert.All(new[] { "3 of 6 · 150 kvar", "supply strength: max", "supply strength: min", "avoid: " }, word => Assert.Contains(word, text, StringComparison.Ordinal));
    }

    [Fact]
    public void An_open_impedance_is_said_in_words() =>
        Assert.Contains("open: no path to ground at any order", TextOf(PlanOf(new SampleStudies { Open = true, Buses = 1 }), "impedance-lv-1"), StringComparison.Ordinal);

    /// <summary>Many states, long Unicode names, one order, tiny and huge values: every text stays on the sheet.</summary>
    [Fact]
    public void No_text_leaves_the_sheet()
    {
        SampleStudies[] samples =
        [
            new() { Buses = 2, States = 3 },
            new() { Buses = 28, States = 11, BusName = i => FormattableString.Invariant($"Schaltanlage Süd-Öst Ω Nr. {i + 1} with a very long name that goes on and on") },
            new() { States = 2, StateName = i => FormattableString.Invariant($"state {i} {new string('w', 90)}") },
            new() { FromOrder = 5, ToOrder = 5, Buses = 1 },
            new() { ResistanceOhm = 1e-6, VoltageScale = 1e-6 },
            new() { VoltageScale = 1e4, BankSteps = 40 },
        ];
        foreach (Picture picture in samples.SelectMany(s => PlanOf(s)))
        {
            XElement svg = XDocument.Parse(Encoding.UTF8.GetString(picture.ToSvg())).Root!;
            double height = double.Parse(svg.Attribute("height")!.Value, System.Globalization.CultureInfo.InvariantCulture);
            foreach (XElement text in svg.Descendants().Where(e => e.Name.LocalName == "text"))
            {
                (double x, double y) = PlaceOf(text);
                Assert.True(x is >= -1 and <= Page.Width + 1 && y >= -1 && y <= height + 1, $"{picture.FileName}: '{text.Value}' at {x}, {y}");
            }
        }
    }

    /// <summary>A needle of one point among 20,000 must not get lost.</summary>
    [Fact]
    public void Thinning_keeps_first_last_and_extreme_points()
    {
        var ys = Enumerable.Range(0, 20_000).Select(i => Math.Sin(i / 300.0)).ToList();
        ys[12_345] = 9;
        ys[777] = -7;

        int[] kept = Curves.Thin(ys);

        Assert.True(kept.Length <= 1200);
        Assert.All(new[] { 0, 777, 12_345, ys.Count - 1 }, index => Assert.Contains(index, kept));
    }

    private static IReadOnlyList<Picture> PlanOf(SampleStudies sample) => PictureBook.Plan("Case", sample.Build(), sample.Settings, []);

    private static string TextOf(IReadOnlyList<Picture> plan, string fileName) => string.Join(
        '\n',
        XDocument.Parse(Encoding.UTF8.GetString(plan.First(p => p.FileName == fileName).ToSvg()))
            .Descendants().Where(e => e.Name.LocalName == "text").Select(e => e.Value));

    /// <summary>First letter of a text in sheet units; rotated texts are placed by their transform.</summary>
    private static (double X, double Y) PlaceOf(XElement text)
    {
        double Number(string name) => double.Parse(
            (text.Attribute(name)?.Value ?? "0").Split([',', ' '], StringSplitOptions.RemoveEmptyEntries)[0], System.Globalization.CultureInfo.InvariantCulture);
        double[] m = Matrix(text.AncestorsAndSelf().Select(e => e.Attribute("transform")?.Value).FirstOrDefault(t => t is not null));
        double x = Number("x");
        double y = Number("y");
        return (m[0] * x + m[2] * y + m[4], m[1] * x + m[3] * y + m[5]);
    }

    private static double[] Matrix(string? transform)
    {
        if (transform is null)
        {
            return [1, 0, 0, 1, 0, 0];
        }

        string inside = transform[(transform.IndexOf('(') + 1)..transform.IndexOf(')')];
        double[] v = [.. inside.Split([',', ' '], StringSplitOptions.RemoveEmptyEntries).Select(t => double.Parse(t, System.Globalization.CultureInfo.InvariantCulture))];
        return transform.StartsWith("translate", StringComparison.Ordinal) ? [1, 0, 0, 1, v[0], v.Length > 1 ? v[1] : 0]
            : transform.StartsWith("matrix", StringComparison.Ordinal) ? v
            : transform.StartsWith("scale", StringComparison.Ordinal) ? [v[0], 0, 0, v.Length > 1 ? v[1] : v[0], 0, 0]
            : throw new InvalidOperationException($"The test does not know the transform '{transform}'.");
    }
}
