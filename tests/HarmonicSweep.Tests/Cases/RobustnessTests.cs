using System.Diagnostics;
using System.Text;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>What a file system can put in the place of a table, and sizes no plant has.</summary>
public class RobustnessTests(ITestOutputHelper output)
{
    [Fact]
    public void Missing_folder_is_told()
    {
        Assert.Equal(
            ["error HS001: there is no folder '/no/such/folder'. Fix: check the path, or make a case with: hsweep new FOLDER"],
            CaseReader.Read("/no/such/folder").Findings.Select(f => f.ToString()));
        Assert.Equal("HS001", Assert.Single(CaseReader.Read("").Findings).Id);
        Assert.Equal("HS001", Assert.Single(CaseReader.Read("a\0b").Findings).Id);
    }

    [Fact]
    public void File_for_a_folder_is_told()
    {
        using var folder = new TempFolder();
        File.WriteAllText(folder["case.toml"], "");
        Finding finding = Assert.Single(CaseReader.Read(folder["case.toml"]).Findings);
        Assert.Equal("give the folder that holds case.toml, not a file.", finding.Remedy);
    }

    [Fact]
    public void Folder_named_as_a_table_is_told_and_nothing_else() => Assert.Equal(
        ["buses.csv: error HS046: buses.csv is a folder; expected a file. Fix: rename the folder, and write the table as a file."],
        ReadWith(PlantText.Good.Without("buses.csv"), path => Directory.CreateDirectory(Path.Combine(path, "buses.csv"))));

    [Fact]
    public void Folder_named_as_case_toml_is_told_and_nothing_else() => Assert.Equal(
        ["case.toml: error HS046: case.toml is a folder; expected a file. Fix: rename the folder, and write the table as a file."],
        ReadWith(PlantText.Good.Without("case.toml"), path => Directory.CreateDirectory(Path.Combine(path, "case.toml"))));

    [Fact]
    public void Other_folders_are_left_alone() => Assert.Empty(ReadWith(PlantText.Good, path => Directory.CreateDirectory(Path.Combine(path, "old.csv"))));

    [Theory]
    [InlineData("loads.csv")]
    [InlineData("nowhere")]
    public void Link_in_a_circle_or_to_nothing_is_told(string target)
    {
        string line = Assert.Single(ReadWith(PlantText.Good.Without("loads.csv"), path => File.CreateSymbolicLink(Path.Combine(path, "loads.csv"), target)));
        Assert.StartsWith("loads.csv: error HS046: loads.csv cannot be read: ", line, StringComparison.Ordinal);
        Assert.EndsWith(" Fix: close the program that holds it, mend its permissions, or mend the link that leads nowhere.", line, StringComparison.Ordinal);
    }

    [Fact]
    public void Table_without_permission_is_told()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows() || Environment.IsPrivilegedProcess, "who may read everything sees no permissions");
        string line = Assert.Single(ReadWith(PlantText.Good, path =>
        {
            if (!OperatingSystem.IsWindows())
            {
                File.SetUnixFileMode(Path.Combine(path, "loads.csv"), UnixFileMode.None);
            }
        }));
        Assert.StartsWith("loads.csv: error HS046: ", line, StringComparison.Ordinal);
    }

    /// <summary>A linear scan reads 100,000 rows in well under a second; 10 s is what a loaded machine may take before it smells of n^2.</summary>
    [Theory]
    [InlineData("LV", 0)]
    [InlineData("NOWHERE", 100_000)]
    public void Hundred_thousand_rows_take_no_time(string bus, int errors)
    {
        var table = new StringBuilder("name,bus,p_kw,power_factor,q_kvar,model,motor_share_percent,connection\n");
        for (int i = 0; i < 100_000; i++)
        {
            table.Append("LOAD-").Append(i).Append(',').Append(bus).Append(",3.5,0.9,,parallel,0,delta\n");
        }

        PlantText plant = PlantText.Good.With("loads.csv", table.ToString());
        var clock = Stopwatch.StartNew();
        CaseReadResult read = plant.Read();
        output.WriteLine($"{clock.ElapsedMilliseconds} ms");
        Assert.Equal(errors, read.Findings.Count);
        Assert.Equal(errors == 0 ? 100_000 : 0, read.Case?.Plant.Of<LinearLoad>().Count() ?? 0);
        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(10), $"took {clock.Elapsed}");
    }

    [Fact]
    public void States_by_the_ten_thousand_take_no_time()
    {
        var table = new StringBuilder("state,element,setting\n");
        for (int i = 0; i < 20_000; i++)
        {
            table.Append("state ").Append(i).Append(",BANK,steps=2\n");
        }

        var clock = Stopwatch.StartNew();
        Assert.Equal(20_001, PlantText.Good.With("states.csv", table.ToString()).ReadSound().States.Count);
        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(10), $"took {clock.Elapsed}");
    }

    /// <summary>The cases that come with the tool are read without an error, and a warm reading is a matter of milliseconds.</summary>
    [Fact]
    public void Cases_of_the_repository_are_sound_and_quickly_read()
    {
        string[] folders = Directory.GetDirectories(Path.Combine(Path.GetDirectoryName(Here())!, "..", "..", "..", "cases"));
        Assert.NotEmpty(folders);
        foreach (string folder in folders)
        {
            CaseReadResult read = CaseReader.Read(folder);
            Assert.True(read.Case is not null, string.Join("\n", read.Findings));
        }

        var clock = Stopwatch.StartNew();
        for (int i = 0; i < 20; i++)
        {
            CaseReader.Read(folders.Single(f => f.EndsWith("demo-plant", StringComparison.Ordinal)));
        }

        output.WriteLine($"{clock.Elapsed.TotalMilliseconds / 20:0.00} ms");
        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(2), $"twenty readings took {clock.Elapsed}");
    }

    private static string Here([System.Runtime.CompilerServices.CallerFilePath] string here = "") => here;

    private static string[] ReadWith(PlantText plant, Action<string> prepare)
    {
        using var folder = new TempFolder();
        plant.WriteTo(folder.Path);
        prepare(folder.Path);
        return [.. CaseReader.Read(folder.Path).Findings.Select(f => f.ToString())];
    }
}
