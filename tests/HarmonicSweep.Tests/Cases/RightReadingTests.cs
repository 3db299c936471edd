using System.Text;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>The same plant written in every way that spreadsheets and editors write it is the same plant.</summary>
public class RightReadingTests
{
    private static readonly Dictionary<string, Func<byte[], byte[]>> Writings = new(StringComparer.Ordinal)
    {
        ["byte-order mark"] = b => [0xEF, 0xBB, 0xBF, .. b],
        ["CRLF"] = b => Text(b, t => t.Replace("\n", "\r\n", StringComparison.Ordinal)),
        ["lone CR"] = b => Text(b, t => t.Replace('\n', '\r')),
        ["UTF-16 little end first"] = b => [0xFF, 0xFE, .. Encoding.Unicode.GetBytes(Encoding.UTF8.GetString(b))],
        ["UTF-16 big end first"] = b => [0xFE, 0xFF, .. Encoding.BigEndianUnicode.GetBytes(Encoding.UTF8.GetString(b))],
        ["line end at the end"] = b => Text(b, t => t + "\n"),
        ["comments and blank lines"] = b => Text(b, t => "# first\n\n" + t.Replace("\n", "\n# 5\" between, with a \"comma\n\n", StringComparison.Ordinal) + "\n#last"),
    };

    private static readonly Dictionary<string, Func<string, string>> Tables = new(StringComparer.Ordinal)
    {
        ["semicolons and decimal commas"] = t => t.Replace(',', ';').Replace('.', ','),
        ["semicolons and decimal points"] = t => t.Replace(',', ';'),
        ["tabs and decimal commas"] = t => t.Replace(',', '\t').Replace('.', ','),
        ["every cell in quotes"] = t => string.Join('\n', t.Split('\n').Select(l => '"' + l.Replace(",", "\",\"", StringComparison.Ordinal) + '"')),
        ["blanks around cells"] = t => t.Replace(",", " , ", StringComparison.Ordinal),
        ["no-break spaces around cells"] = t => t.Replace(",", "\u00A0,\u00A0", StringComparison.Ordinal),
        ["trailing separators"] = t => t.Replace("\n", ",,\n", StringComparison.Ordinal) + ",,",
        ["blank columns between"] = t => t.Replace(",", ",,", StringComparison.Ordinal),
        ["rows of separators"] = t => t.Replace("\n", "\n,,,\n", StringComparison.Ordinal),
        ["header in capitals"] = t => t.IndexOf('\n', StringComparison.Ordinal) is var end ? t[..end].ToUpperInvariant() + t[end..] : t,
        ["quoted comment lines"] = t => "\"# remark, with a comma; and more\",,,\n" + t,
        ["columns the other way round"] = t => string.Join('\n', t.Split('\n').Select(l => string.Join(',', l.Split(',').Reverse()))),
    };

    public static TheoryData<string> WritingNames => [.. Writings.Keys];

    public static TheoryData<string> TableNames => [.. Tables.Keys];

    [Theory]
    [MemberData(nameof(WritingNames))]
    public void Every_file_written_otherwise_reads_the_same(string name) => SameAsGood(
        PlantText.Good.Files.Aggregate(PlantText.Good, (plant, file) => plant.With(file, Writings[name](Encoding.UTF8.GetBytes(plant[file])))));

    [Theory]
    [MemberData(nameof(TableNames))]
    public void Every_table_written_otherwise_reads_the_same(string name) => SameAsGood(
        PlantText.Good.Files.Where(f => f.EndsWith(".csv", StringComparison.Ordinal)).Aggregate(PlantText.Good, (plant, file) => plant.With(file, Tables[name](plant[file]))));

    [Fact]
    public void Names_keep_every_script_and_a_comma_in_quotes()
    {
        CaseFile read = PlantText.Good
            .With("buses.csv", "bus,nominal_kv\nGRID-BUS,33\nMAIN,11\nMAIN-B,11\nLV,0.4\n\"Stra\u00DFe 4, S\u00FCd\",0.4\n\u5909\u96FB\u6240,0.4\n\uD83D\uDD0C 7,0.4\n\"5\"\" line\",0.4\n12,0.4")
            .Append("loads.csv", "\"a \"\"quoted\"\" name, with comma\",\"Stra\u00DFe 4, S\u00FCd\",20,0.9,,,,\nlight,12,3,0.9,,,,\n\"# 2 fan\",12,3,0.9,,,,").ReadSound();
        Assert.Equal(["GRID-BUS", "MAIN", "MAIN-B", "LV", "Stra\u00DFe 4, S\u00FCd", "\u5909\u96FB\u6240", "\uD83D\uDD0C 7", "5\" line", "12"], read.Plant.Buses.Select(b => b.Name));
        Assert.Equal("Stra\u00DFe 4, S\u00FCd", Assert.IsType<LinearLoad>(read.Plant.FindElement("a \"quoted\" name, with comma")).Bus);
        Assert.Equal("12", Assert.IsType<LinearLoad>(read.Plant.FindElement("light")).Bus);
        Assert.Equal("12", Assert.IsType<LinearLoad>(read.Plant.FindElement("# 2 fan")).Bus);
    }

    [Fact]
    public void Locations_count_physical_lines()
    {
        CaseFile read = PlantText.Good.With("loads.csv", "# one\r\n\r\nname,bus,p_kw,q_kvar,source\r\n\"A\",LV,1,0,\"two\r\nlines\"\r\n# six\r\nB,LV,1,-0,\r\n").ReadSound();
        Assert.Equal(new SourceLocation("loads.csv", 4), read.Plant.FindElement("A")!.Location);
        LinearLoad b = Assert.IsType<LinearLoad>(read.Plant.FindElement("B"));
        Assert.Equal(7, b.Location.Line);
        Assert.False(double.IsNegative(b.QKvar), "a minus zero must be read as zero");
    }

    [Fact]
    public void Settings_of_case_toml_are_read()
    {
        CaseFile read = PlantText.Good.With("case.toml", """
            title = 'Plant "A"'   # a comment
            frequency_hz = 16.7
            limits.pcc = "MAIN"
            limits.standards = []
            [sweep]
            from_hz = 1_0.0
            to_hz = 2e3
            step_hz = 0.5
            [summation]
            rule = "IEC"
            """).ReadSound();
        Assert.Equal("Plant \"A\"", read.Plant.Title);
        Assert.Equal(16.7, read.Plant.FrequencyHz);
        Assert.Equal((10, 2000, 0.5), (read.Settings.Sweep.FromHz, read.Settings.Sweep.ToHz, read.Settings.Sweep.StepHz));
        Assert.Equal(("MAIN", SummationRule.Iec), (read.Settings.PccBus, read.Settings.Rule));
        Assert.Empty(read.Settings.Standards);
    }

    [Fact]
    public void Hash_changes_with_any_byte_of_the_case_and_with_nothing_else()
    {
        string hash = PlantText.Good.ReadSound().Hash;
        Assert.Equal(hash, PlantText.Good.With("notes.txt", "hello").ReadSound().Hash);
        Assert.NotEqual(hash, PlantText.Good.Append("buses.csv", "# remark").ReadSound().Hash);
    }

    private static byte[] Text(byte[] bytes, Func<string, string> change) => Encoding.UTF8.GetBytes(change(Encoding.UTF8.GetString(bytes)));

    /// <summary>Elements equal but for the lines they stand in: every number, name and law.</summary>
    private static void SameAsGood(PlantText plant)
    {
        CaseFile expected = PlantText.Good.ReadSound();
        CaseFile read = plant.ReadSound();
        Assert.Empty(read.Findings);
        Assert.Equal(expected.Plant.Title, read.Plant.Title);
        Assert.Equal(expected.Plant.Buses.Select(b => (b.Name, b.NominalKv, b.Note)), read.Plant.Buses.Select(b => (b.Name, b.NominalKv, b.Note)));
        Assert.Equal(expected.Plant.Elements.Select(Placeless), read.Plant.Elements.Select(Placeless));
        Assert.Equal(expected.States.Select(s => (s.Name, string.Join(' ', s.Settings))), read.States.Select(s => (s.Name, string.Join(' ', s.Settings))));
        Assert.Equal(expected.Assumed, read.Assumed);
    }

    /// <summary>The element as text without its line, its spectrum line by line.</summary>
    private static string Placeless(PlantElement element) => element switch
    {
        Converter converter => Nowhere(converter) + Lines(converter.Spectrum),
        Supply supply => Nowhere(supply) + Lines(supply.Background!),
        _ => Nowhere(element),
    };

    private static string Nowhere(PlantElement element)
    {
        string text = (element with { Location = new SourceLocation("", 0) }).ToString();
        int spectrum = text.IndexOf("= Spectrum {", StringComparison.Ordinal);
        return spectrum < 0 ? text : text[..spectrum] + text[(text.IndexOf('}', spectrum) + 1)..];
    }

    private static string Lines(Spectrum spectrum) => spectrum.Name + string.Join(' ', spectrum.Lines);
}
