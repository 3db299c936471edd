using System.Text.Json;
using HarmonicSweep.Cli;
using HarmonicSweep.Network;
using HarmonicSweep.Tests.Results;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>Results on stdout alone, diagnostics on stderr alone, files in their folder.</summary>
public sealed class OutputTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("hsweep-test-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Theory]
    [InlineData("table")]
    [InlineData("csv")]
    [InlineData("json")]
    public async Task Findings_go_to_stderr_only(string format)
    {
        Hsweep.Outcome outcome = await new Hsweep().Run("study", "case", "--format", format);
        Assert.StartsWith("cables.csv(4,length_km): warning HS050: long cable. Fix: check it.\n", outcome.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("warning HS050", outcome.Out, StringComparison.Ordinal);
        Assert.DoesNotContain('\u001b', outcome.Out + outcome.Error);
    }

    [Fact]
    public async Task Json_is_one_document_and_nothing_else()
    {
        Hsweep.Outcome outcome = await new Hsweep().Run("study", "case", "--format", "json", "--rule", "iec");
        JsonElement root = JsonDocument.Parse(outcome.Out).RootElement;
        Assert.Equal("iec", root.GetProperty("case").GetProperty("rule").GetString());
        Assert.Equal(SampleResult.Plant.Title, root.GetProperty("case").GetProperty("title").GetString());
    }

    [Fact]
    public async Task Csv_tables_have_titles_and_a_blank_line_between()
    {
        Hsweep.Outcome outcome = await new Hsweep().Run("study", "case", "--format", "csv");
        string[] tables = outcome.Out.Split("\n\n");
        Assert.Equal(21, tables.Length);
        Assert.All(tables, t => Assert.Matches("^# [A-Z].*\n[a-z_,]+\n", t));
    }

    [Fact]
    public async Task Out_writes_files_and_a_short_summary()
    {
        string target = Path.Combine(_folder, "results");
        Hsweep.Outcome outcome = await new Hsweep().Run("study", "case", "--out", target, "--format", "json");
        Assert.Equal(ExitCode.LimitExceeded, outcome.Code);
        string[] files = [.. Directory.GetFiles(target).Select(f => Path.GetFileName(f)!)];
        Assert.Contains("result.json", files);
        Assert.Contains("summary.txt", files);
        Assert.Contains("screen_positions.csv", files);
        Assert.Contains("sample.svg", files);
        Assert.Contains($"Wrote {files.Length} files to {target}", outcome.Out, StringComparison.Ordinal);
        Assert.True(outcome.Out.Split('\n').Length < 25, outcome.Out);
    }

    [Theory]
    [InlineData(".")]
    [InlineData("sub/..")]
    [InlineData("link")]
    public async Task Out_equal_to_the_case_folder_is_refused(string path)
    {
        string caseFolder = Path.Combine(_folder, "case");
        Directory.CreateDirectory(Path.Combine(caseFolder, "sub"));
        Directory.CreateSymbolicLink(Path.Combine(caseFolder, "link"), caseFolder);
        var hsweep = new Hsweep();
        Hsweep.Outcome outcome = await hsweep.Run("check", caseFolder, "--out", Path.Combine(caseFolder, path));
        Assert.Equal(ExitCode.BadInput, outcome.Code);
        Assert.Contains("is the case folder itself", outcome.Error, StringComparison.Ordinal);
        Assert.Empty(hsweep.Asked);
    }

    [Fact]
    public async Task Out_in_another_case_folder_is_refused()
    {
        File.WriteAllText(Path.Combine(_folder, "case.toml"), "");
        Hsweep.Outcome outcome = await new Hsweep().Run("check", "case", "--out", _folder);
        Assert.Equal(ExitCode.BadInput, outcome.Code);
        Assert.Contains("holds a case.toml", outcome.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Out_that_cannot_be_created_is_2_before_anything_is_computed()
    {
        string file = Path.Combine(_folder, "file");
        File.WriteAllText(file, "");
        foreach (string target in (string[])[file, Path.Combine(file, "below")])
        {
            var hsweep = new Hsweep();
            Hsweep.Outcome outcome = await hsweep.Run("check", "case", "--out", target);
            Assert.Equal(ExitCode.BadInput, outcome.Code);
            Assert.Contains(" Fix: ", outcome.Error, StringComparison.Ordinal);
            Assert.Empty(hsweep.Asked);
        }
    }

    [Fact]
    public async Task A_full_disk_is_2_with_a_remedy()
    {
        using var error = new StringWriter();
        using var full = new FullDisk();
        int code = await HsweepCommand.InvokeAsync(["--version"], full, error, TestContext.Current.CancellationToken);
        Assert.Equal(ExitCode.BadInput, code);
        Assert.Contains("free disk space", error.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Colour_marks_the_severity_word_only()
    {
        using var error = new StringWriter { NewLine = "\n" };
        var terminal = new Terminal(TextWriter.Null, error) { ErrorHasColour = true };
        Diagnostics.Write(terminal, [new Finding(Severity.Error, "HS001", new SourceLocation("error.csv", 1), "error.", "mend it.")]);
        Assert.Equal("error.csv(1): \u001b[31merror\u001b[0m HS001: error. Fix: mend it.\n1 error, 0 warnings\n", error.ToString());
    }

    [Fact]
    public void Bytes_split_within_a_letter_arrive_whole()
    {
        using var writer = new StringWriter();
        using var stream = new TextWriterStream(writer);
        foreach (byte b in "größer Ω"u8.ToArray())
        {
            stream.Write([b]);
        }

        Assert.Equal("größer Ω", writer.ToString());
    }

    private sealed class FullDisk : StringWriter
    {
        public override void Write(char value) => throw new IOException("No space left on device");

        public override void Write(string? value) => throw new IOException("No space left on device");

        public override void WriteLine(string? value) => throw new IOException("No space left on device");

        public override void Flush() => throw new IOException("No space left on device");
    }
}
