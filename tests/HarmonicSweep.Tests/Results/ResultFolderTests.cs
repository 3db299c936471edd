using System.Text.Json;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Results;

/// <summary>Files of a result arrive whole or not at all, and never mix two runs.</summary>
public sealed class ResultFolderTests : IDisposable
{
    private readonly string _folder = Path.Combine(Directory.CreateTempSubdirectory("hsweep-test-").FullName, "out");

    public void Dispose() => Directory.Delete(Path.GetDirectoryName(_folder)!, recursive: true);

    [Fact]
    public void Commit_moves_every_file_and_leaves_nothing_else()
    {
        IReadOnlyList<string> files = Write(SampleResult.Result);
        Assert.Contains("result.json", files);
        Assert.Contains("limits.csv", files);
        Assert.Equal(files, Directory.EnumerateFileSystemEntries(_folder).Select(f => Path.GetFileName(f)!).Order(StringComparer.Ordinal));
        JsonElement root = JsonDocument.Parse(File.ReadAllText(Path.Combine(_folder, "result.json"))).RootElement;
        Assert.Equal(files.Count - 1, root.GetProperty("files").GetArrayLength());
    }

    [Fact]
    public void Commit_keeps_sub_folders()
    {
        using (ResultFolder folder = ResultFolder.Open(_folder))
        {
            Directory.CreateDirectory(Path.Combine(folder.StagingFolder, "plots"));
            File.WriteAllText(Path.Combine(folder.StagingFolder, "plots", "a.svg"), "<svg/>");
            Assert.Equal(["plots/a.svg", "result.json"], folder.Commit(SampleResult.Case, new StudyResult(), "1.2.3"));
        }

        Assert.True(File.Exists(Path.Combine(_folder, "plots", "a.svg")));
    }

    [Fact]
    public void Commit_removes_files_of_an_earlier_run_only()
    {
        Write(SampleResult.Result);
        File.WriteAllText(Path.Combine(_folder, "notes.txt"), "mine");
        IReadOnlyList<string> files = Write(new StudyResult { States = [new StateResult { State = "base" }] });
        Assert.DoesNotContain("limits.csv", files);
        Assert.False(File.Exists(Path.Combine(_folder, "limits.csv")));
        Assert.Equal("mine", File.ReadAllText(Path.Combine(_folder, "notes.txt")));
    }

    [Fact]
    public void Commit_does_not_follow_a_forged_list_out_of_the_folder()
    {
        string outside = Path.Combine(Path.GetDirectoryName(_folder)!, "outside.txt");
        File.WriteAllText(outside, "keep");
        Directory.CreateDirectory(_folder);
        File.WriteAllText(Path.Combine(_folder, "result.json"), """{ "files": ["../outside.txt"] }""");
        Write(SampleResult.Result);
        Assert.True(File.Exists(outside));
    }

    [Theory]
    [InlineData("not json")]
    [InlineData("[1]")]
    [InlineData("{\"files\": 3}")]
    public void Commit_overwrites_a_foreign_document(string content)
    {
        Directory.CreateDirectory(_folder);
        File.WriteAllText(Path.Combine(_folder, "result.json"), content);
        Assert.Contains("result.json", Write(SampleResult.Result));
    }

    [Fact]
    public void Dispose_without_commit_leaves_no_trace()
    {
        using (ResultFolder folder = ResultFolder.Open(_folder))
        {
            folder.WriteTables(SampleResult.Case, SampleResult.Result);
        }

        Assert.False(Directory.Exists(_folder));
    }

    [Fact]
    public void Dispose_without_commit_keeps_a_folder_that_was_there()
    {
        Directory.CreateDirectory(_folder);
        ResultFolder.Open(_folder).Dispose();
        Assert.Empty(Directory.EnumerateFileSystemEntries(_folder));
        Assert.True(Directory.Exists(_folder));
    }

    [Fact]
    public void Open_a_path_below_a_file_is_refused()
    {
        File.WriteAllText(_folder, "a file");
        Assert.ThrowsAny<IOException>(() => ResultFolder.Open(Path.Combine(_folder, "below")));
    }

    private IReadOnlyList<string> Write(StudyResult result)
    {
        using ResultFolder folder = ResultFolder.Open(_folder);
        folder.WriteTables(SampleResult.Case, result);
        return folder.Commit(SampleResult.Case, result, "1.2.3");
    }
}
