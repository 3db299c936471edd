using System.Text.Json;
using HarmonicSweep.Cli;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Results;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>Every way a command can end, its exit code and what it says.</summary>
public class ExitCodeTests
{
    private static readonly StudyResult Clean = new() { States = [new StateResult { State = "base" }] };
    private static readonly Finding Bad = new(Severity.Error, "HS012", new SourceLocation("cables.csv", 14, "length_km"), "got -0.12; expected a length > 0 in km.", "remove the minus sign.");

    [Fact]
    public async Task Within_limits_is_0() => Assert.Equal(0, (await Hsweep.Returning(Clean).Run("check", "case")).Code);

    [Fact]
    public async Task Limit_exceeded_is_1() => Assert.Equal(1, (await new Hsweep().Run("distortion", "case")).Code);

    [Fact]
    public async Task Bad_case_is_2_with_every_finding_sorted_and_counted()
    {
        Finding earlier = Bad with { Location = new SourceLocation("buses.csv", 3), Severity = Severity.Warning };
        Hsweep.Outcome outcome = await Hsweep.Refusing(Bad, Bad with { Location = new SourceLocation("cables.csv", 2) }, earlier).Run("check", "case");
        Assert.Equal(2, outcome.Code);
        string[] lines = outcome.Error.TrimEnd('\n').Split('\n');
        Assert.StartsWith("buses.csv(3): warning HS012: ", lines[0], StringComparison.Ordinal);
        Assert.StartsWith("cables.csv(2): error HS012: ", lines[1], StringComparison.Ordinal);
        Assert.Equal("cables.csv(14,length_km): error HS012: got -0.12; expected a length > 0 in km. Fix: remove the minus sign.", lines[2]);
        Assert.Equal("2 errors, 1 warning", lines[3]);
        Assert.Empty(outcome.Out);
    }

    [Fact]
    public async Task Bad_case_as_json_has_its_findings_on_stdout()
    {
        Hsweep.Outcome outcome = await Hsweep.Refusing(Bad).Run("study", "case", "--format", "json");
        Assert.Equal(2, outcome.Code);
        JsonElement root = JsonDocument.Parse(outcome.Out).RootElement;
        Assert.Equal(0, root.GetProperty("states").GetArrayLength());
        Assert.Equal("length_km", root.GetProperty("findings")[0].GetProperty("column").GetString());
        Assert.Contains("cables.csv(14,length_km)", outcome.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task State_that_cannot_be_built_is_2()
    {
        Hsweep.Outcome outcome = await Hsweep.Throwing(new CaseException([Bad, Bad])).Run("check", "case");
        Assert.Equal(2, outcome.Code);
        Assert.Contains("2 errors, 1 warning\n", outcome.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Failed_computation_is_3_and_json_says_so()
    {
        Hsweep.Outcome outcome = await Hsweep.Throwing(new ComputationException(Bad with { Id = "HS301" })).Run("check", "case", "--format", "json");
        Assert.Equal(3, outcome.Code);
        Assert.Contains("error HS301: ", outcome.Error, StringComparison.Ordinal);
        Assert.Contains("HS301", JsonDocument.Parse(outcome.Out).RootElement.GetProperty("findings").GetRawText(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Unexpected_fault_is_3_in_one_line_without_a_stack_trace()
    {
        Hsweep.Outcome outcome = await Hsweep.Throwing(new InvalidOperationException("two\nlines")).Run("check", "case");
        Assert.Equal(3, outcome.Code);
        Assert.Contains("InvalidOperationException: two lines Fix: report this line", outcome.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", outcome.Error, StringComparison.Ordinal);
        Assert.Empty(outcome.Out);
    }

    [Fact]
    public async Task Cancelled_is_130_and_nothing_is_written()
    {
        using var source = new CancellationTokenSource();
        Hsweep hsweep = Hsweep.Doing((_, _, cancellation) =>
        {
            source.Cancel();
            cancellation.ThrowIfCancellationRequested();
            return Clean;
        });
        string folder = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName());
        Hsweep.Outcome outcome = await hsweep.Run(source.Token, "study", "case", "--out", folder);
        Assert.Equal(130, outcome.Code);
        Assert.Equal("Cancelled; nothing was written.\n", outcome.Error);
        Assert.Empty(outcome.Out);
        Assert.False(Directory.Exists(folder));
    }

    [Fact]
    public async Task New_reports_its_folder_or_why_it_was_refused()
    {
        Hsweep.Outcome made = await new Hsweep().Run("new", "plant");
        Assert.Equal(0, made.Code);
        Assert.Contains("hsweep check plant", made.Out, StringComparison.Ordinal);
        Hsweep.Outcome refused = await new Hsweep().Run("new", "taken");
        Assert.Equal(2, refused.Code);
        Assert.Contains("taken is not empty.", refused.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Version_goes_to_stdout()
    {
        Hsweep.Outcome outcome = await new Hsweep().Run("--version");
        Assert.Equal(0, outcome.Code);
        Assert.Matches(@"^hsweep \d+\.\d+\.\d+\s$", outcome.Out);
    }
}
