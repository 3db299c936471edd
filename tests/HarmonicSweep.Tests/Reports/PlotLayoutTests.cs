using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Reports.Pictures;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Reports;

/// <summary>That no label leaves its sheet or lies on another, for plants of every awkward shape.</summary>
public sealed class PlotLayoutTests
{
    private const double Width = 640;

    public static TheoryData<string> Shapes => ["plain", "many", "long names", "eight states", "no injections", "open", "one frequency", "decades", "all orders", "tiny", "huge"];

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Labels_stay_on_the_sheet_and_off_each_other(string shape)
    {
        foreach (Picture picture in PlanOf(shape))
        {
            var texts = RecordingSheet.Of(picture).Texts;
            foreach ((string text, Box box, _) in texts)
            {
                Assert.True(
                    box.Left >= 0 && box.Right <= Width && box.Top >= 0 && box.Bottom <= picture.Height,
                    $"{shape}, {picture.FileName}: '{text}' leaves the sheet at {box}");
            }

            for (int i = 0; i < texts.Count; i++)
            {
                for (int j = 0; j < i; j++)
                {
                    Assert.False(
                        texts[i].Box.Overlaps(texts[j].Box),
                        $"{shape}, {picture.FileName}: '{texts[i].Text}' at {texts[i].Box} lies on '{texts[j].Text}' at {texts[j].Box}");
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Shapes))]
    public void Everything_is_drawn_at_a_finite_place_within_the_sheet(string shape)
    {
        foreach (Picture picture in PlanOf(shape))
        {
            RecordingSheet sheet = RecordingSheet.Of(picture);
            IEnumerable<Spot> spots = sheet.Lines.SelectMany(l => l.Spots).Concat(sheet.Polygons.SelectMany(p => p.Spots))
                .Concat(sheet.Fills.SelectMany(f => new[] { new Spot(f.Box.Left, f.Box.Top), new Spot(f.Box.Right, f.Box.Bottom) }));
            Assert.All(spots, s => Assert.True(s.X is >= 0 and <= Width && s.Y >= 0 && s.Y <= picture.Height, $"{shape}, {picture.FileName}: {s}"));
        }
    }

    [Fact]
    public void Overlap_is_seen_by_this_check()
    {
        var sheet = new RecordingSheet();
        sheet.Write("Order 11", 100, 100, Look.Text);
        sheet.Write("Order 13", 130, 104, Look.Text);
        sheet.Write("Order 17", 100, 113, Look.Text);

        Assert.True(sheet.Texts[0].Box.Overlaps(sheet.Texts[1].Box));
        Assert.False(sheet.Texts[0].Box.Overlaps(sheet.Texts[2].Box));
    }

    private static IReadOnlyList<Picture> PlanOf(string shape)
    {
        static string Long(int i) => FormattableString.Invariant($"Hauptverteilung Süd Straße {i + 1} – Ωmega 690 V Sammelschiene µ{i}");
        SampleStudies sample = shape switch
        {
            "plain" => new SampleStudies { Buses = 3, States = 3 },
            "many" => new SampleStudies { Buses = 28, States = 11, OrderStep = 0.25, BankSteps = 12, DeadInLastState = true },
            "long names" => new SampleStudies
            {
                Buses = 12, States = 3, OrderStep = 0.25, BusName = Long, DeadInLastState = true,
                StateName = i => FormattableString.Invariant($"Notbetrieb Generator {i}, supply min, BANK-{i} 3/6, Kuppelschalter offen, Zustand nach Umbau"),
                Settings = new SampleStudies().Settings with { PccBus = Long(0) },
            },
            "eight states" => new SampleStudies { Buses = 1, States = 8, ResistanceOhm = 0.003, VoltageScale = 6 },
            "no injections" => new SampleStudies { Injects = false, States = 2 },
            "open" => new SampleStudies { Open = true, States = 2 },
            "one frequency" => new SampleStudies { FromOrder = 5, ToOrder = 5, States = 2 },
            "decades" => new SampleStudies { ResistanceOhm = 1e-9, OrderStep = 0.001, States = 2 },
            "all orders" => new SampleStudies { Injected = [.. Enumerable.Range(2, 49)], States = 2 },
            "tiny" => new SampleStudies { VoltageScale = 1e-7, States = 6 },
            _ => new SampleStudies { VoltageScale = 3e4, States = 6 },
        };
        return PictureBook.Plan("Papierfabrik Nord: Erweiterung der Antriebe, Variante B mit zweiter Einspeisung und Notstromaggregat", sample.Build(), sample.Settings);
    }
}
