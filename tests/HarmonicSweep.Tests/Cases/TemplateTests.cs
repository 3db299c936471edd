using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>The templates of a new case: they read back, their example rows are sound, and nothing is overwritten.</summary>
public class TemplateTests
{
    [Fact]
    public void Untouched_template_lacks_only_buses_and_a_pcc()
    {
        using var folder = new TempFolder();
        Assert.Null(CaseTemplate.Write(folder["plant/"]));
        CaseReadResult read = CaseReader.Read(folder["plant"]);
        Assert.Null(read.Case);
        Assert.Equal(
            [
                "buses.csv: error HS039: the plant has no bus; expected at least one. Fix: list the buses in buses.csv: name and nominal_kv.",
                "case.toml(pcc): note HS101: no PCC is given, so no limit can be judged. Fix: name the bus at the point of common coupling: pcc = \"BUS\" under [limits].",
            ],
            read.Findings.Select(f => f.ToString()));
    }

    [Fact]
    public void Example_rows_of_every_table_make_a_case()
    {
        using var folder = new TempFolder();
        Assert.Null(CaseTemplate.Write(folder["plant"]));
        int examples = 0;
        foreach (string path in Directory.GetFiles(folder["plant"], "*.csv"))
        {
            const string Mark = "# for example: ";
            string example = Assert.Single(File.ReadAllLines(path), l => l.StartsWith(Mark, StringComparison.Ordinal));
            File.AppendAllText(path, example[Mark.Length..] + "\n");
            examples++;
        }

        // what the examples name besides each other
        File.AppendAllText(folder["plant/buses.csv"], "MAIN-A,11,,\nMAIN-B,11,,\nGRID-BUS,33,,\nLV,0.4,,\nPUMPS,11,,\nWELL,11,,\nDRIVES,11,,\n");
        File.AppendAllText(folder["plant/spectra.csv"], "six pulse,1,100,0,\n");
        CaseReadResult read = CaseReader.Read(folder["plant"]);
        Assert.True(read.Case is not null, string.Join("\n", read.Findings));
        Assert.Equal(15, examples);
        Assert.Equal(12, read.Case.Plant.Elements.Count);
        Assert.Equal(examples, read.Case.Sources.Count(s => s.Source == "nameplate"));
        Assert.DoesNotContain(read.Findings, f => f.Severity == Severity.Warning && f.Id != "HS106");
    }

    [Theory]
    [InlineData("Werk S\u00FCd \"2\"")]
    [InlineData("back\\slash")]
    [InlineData("two\nlines")]
    [InlineData("\"")]
    public void Any_name_of_a_folder_gives_a_title(string name)
    {
        using var folder = new TempFolder();
        Assert.Null(CaseTemplate.Write(folder[name]));
        Assert.DoesNotContain(CaseReader.Read(folder[name]).Findings, f => f.Location?.File == "case.toml" && f.Severity == Severity.Error);
    }

    [Fact]
    public void Occupied_folder_is_refused_and_nothing_is_written()
    {
        using var folder = new TempFolder();
        File.WriteAllText(folder["loads.csv"], "mine");
        Finding? refused = CaseTemplate.Write(folder.Path);
        Assert.Equal($"error HS043: '{folder.Path}' already holds loads.csv; nothing was written. Fix: give a new or empty folder.", refused?.ToString());
        Assert.Equal([folder["loads.csv"]], Directory.GetFileSystemEntries(folder.Path));
        Assert.Equal("mine", File.ReadAllText(folder["loads.csv"]));
    }

    [Fact]
    public void Folder_in_the_way_of_a_table_is_refused_and_nothing_is_written()
    {
        using var folder = new TempFolder();
        Directory.CreateDirectory(folder["states.csv"]);
        Assert.Contains("already holds states.csv", CaseTemplate.Write(folder.Path)?.ToString(), StringComparison.Ordinal);
        Assert.Single(Directory.GetFileSystemEntries(folder.Path));
    }

    [Fact]
    public void File_in_place_of_the_folder_is_refused()
    {
        using var folder = new TempFolder();
        File.WriteAllText(folder["plant"], "mine");
        Assert.Equal("HS043", CaseTemplate.Write(folder["plant"])?.Id);
        Assert.Equal("mine", File.ReadAllText(folder["plant"]));
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("a\0b")]
    public void Path_that_is_none_is_refused(string path) => Assert.Equal("HS043", CaseTemplate.Write(path)?.Id);

    [Fact]
    public void Set_of_files_is_written_whole_or_not_at_all()
    {
        using var folder = new TempFolder();
        Directory.CreateDirectory(folder["b.csv"]);
        Assert.Throws<IOException>(() => WholeFiles.Write(folder.Path, new Dictionary<string, byte[]> { ["a.csv"] = [1], ["b.csv"] = [2] }));
        Assert.Equal([folder["b.csv"]], Directory.GetFileSystemEntries(folder.Path));
    }
}
