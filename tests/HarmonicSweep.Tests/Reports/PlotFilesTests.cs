using System.Buffers.Binary;
using System.Xml.Linq;
using HarmonicSweep.Reports.Pictures;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Reports;

/// <summary>The files a plan leaves in a folder.</summary>
public sealed class PlotFilesTests : IDisposable
{
    private static readonly byte[] PngSignature = [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A]; // ISO/IEC 15948, 5.2

    private readonly string _folder = Directory.CreateTempSubdirectory("hsweep-pictures-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Plan_has_a_picture_for_everything_computed() => Assert.Equal(
        ["impedance-lv-1", "impedance-lv-2", "voltage-spectrum-lv-1", "voltage-spectrum-lv-2", "thd", "positions-bank-1-base", "background-gain"],
        PlanOf(new SampleStudies { Buses = 2, States = 2 }).Select(p => p.FileName));

    [Fact]
    public void Plan_keeps_to_the_buses_asked_for() => Assert.Equal(
        ["impedance-lv-2", "voltage-spectrum-lv-2", "thd", "positions-bank-1-base", "background-gain"],
        PlanOf(new SampleStudies { Buses = 3 }, "LV-2").Select(p => p.FileName));

    [Fact]
    public void Plan_of_an_empty_result_is_empty() =>
        Assert.Empty(PictureBook.Plan("Empty", new StudyResult(), new SampleStudies().Settings, []));

    [Fact]
    public void Plan_without_injections_has_no_bars() => Assert.Equal(
        ["impedance-lv-1", "positions-bank-1-base", "background-gain"],
        PlanOf(new SampleStudies { Buses = 1, Injects = false }).Select(p => p.FileName));

    [Fact]
    public void File_names_are_plain_and_differ_even_when_bus_names_reduce_to_the_same()
    {
        string[] buses = ["Süd/1", "süd 1", "SÜD:1", "電気室"];
        string[] names = [.. PlanOf(new SampleStudies { Buses = 4, BusName = i => buses[i] }).Select(p => p.FileName)];

        Assert.Equal(names.Length, names.Distinct(StringComparer.OrdinalIgnoreCase).Count());
        Assert.All(names, n => Assert.Matches("^[a-z0-9]+(-[a-z0-9]+)*$", n));
        Assert.Equal(["impedance-s-d-1", "impedance-s-d-1-2", "impedance-s-d-1-3", "impedance"], names[..4]);
    }

    [Fact]
    public void Write_leaves_a_png_and_an_svg_of_each_picture_and_nothing_else()
    {
        IReadOnlyList<Picture> plan = PlanOf(new SampleStudies { States = 2 });

        IReadOnlyList<string> written = PictureBook.Write(plan, _folder, threads: 2, TestContext.Current.CancellationToken);

        Assert.Equal(plan.SelectMany(p => new[] { p.FileName + ".png", p.FileName + ".svg" }).Order(), Directory.GetFiles(_folder).Select(Path.GetFileName).Order());
        Assert.Equal(written.Order(), Directory.GetFiles(_folder).Order());
        foreach (Picture picture in plan)
        {
            byte[] png = File.ReadAllBytes(Path.Combine(_folder, picture.FileName + ".png"));
            Assert.Equal(PngSignature, png[..8]);
            XElement svg = XDocument.Load(Path.Combine(_folder, picture.FileName + ".svg")).Root!;
            double[] box = [.. svg.Attribute("viewBox")!.Value.Split(' ').Select(v => double.Parse(v, System.Globalization.CultureInfo.InvariantCulture))];
            // IHDR holds width and height at bytes 16 and 20; a picture has three pixels for two units
            Assert.Equal([0, 0], box[..2]);
            Assert.Equal(1.5 * box[2], BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(16)));
            Assert.Equal(Math.Ceiling(1.5 * box[3]), BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(20)));
        }
    }

    [Fact]
    public void Bytes_depend_neither_on_the_run_nor_on_the_threads()
    {
        var sample = new SampleStudies { Buses = 2, States = 3 };
        IReadOnlyList<string> alone = PictureBook.Write(PlanOf(sample), Path.Combine(_folder, "one"), threads: 1, TestContext.Current.CancellationToken);
        IReadOnlyList<string> together = PictureBook.Write(PlanOf(sample), Path.Combine(_folder, "four"), threads: 4, TestContext.Current.CancellationToken);

        Assert.Equal(alone.Count, together.Count);
        for (int i = 0; i < alone.Count; i++)
        {
            Assert.Equal(File.ReadAllBytes(alone[i]), File.ReadAllBytes(together[i]));
        }
    }

    [Fact]
    public void A_cancelled_write_leaves_the_folder_as_it_was()
    {
        IReadOnlyList<Picture> plan = PlanOf(new SampleStudies());
        string earlier = Path.Combine(_folder, plan[0].FileName + ".png");
        File.WriteAllText(earlier, "an earlier picture");

        Assert.ThrowsAny<OperationCanceledException>(() => PictureBook.Write(plan, _folder, 2, new CancellationToken(canceled: true)));

        Assert.Equal([earlier], Directory.GetFiles(_folder));
        Assert.Equal("an earlier picture", File.ReadAllText(earlier));
    }

    [Fact]
    public void A_write_that_fails_half_way_leaves_no_unfinished_files()
    {
        IReadOnlyList<Picture> plan = PlanOf(new SampleStudies());
        // a folder stands where the last file should be written first
        Directory.CreateDirectory(Path.Combine(_folder, plan[^1].FileName + ".svg.unfinished"));

        Exception? e = Record.Exception(() => PictureBook.Write(plan, _folder, 1, TestContext.Current.CancellationToken));

        Assert.True(e is IOException or UnauthorizedAccessException, $"{e}");
        Assert.Empty(Directory.GetFiles(_folder));
    }

    private static IReadOnlyList<Picture> PlanOf(SampleStudies sample, params string[] buses) =>
        PictureBook.Plan("Case", sample.Build(), sample.Settings, buses);
}
