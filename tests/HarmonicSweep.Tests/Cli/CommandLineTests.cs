using HarmonicSweep.Cli;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>What the words of a command line turn into, and what is said about wrong ones.</summary>
public class CommandLineTests
{
    [Theory]
    [InlineData("check")]
    [InlineData("impedance")]
    [InlineData("distortion")]
    [InlineData("screen")]
    [InlineData("study")]
    public async Task Each_command_runs_its_own_study(string command)
    {
        var hsweep = new Hsweep();
        await hsweep.Run(command, "case");
        Assert.Equal([command], hsweep.Asked.Select(a => a.Study));
    }

    [Theory]
    [InlineData("impedance", "base")]
    [InlineData("study", "base,weak grid")]
    public async Task State_default_is_base_and_for_study_every_state(string command, string expected)
    {
        StudyRequest request = await Request(command, "case");
        Assert.Equal(expected, string.Join(',', request.States.Select(s => s.Name)));
    }

    [Theory]
    [InlineData("base,weak grid", "--state", "all")]
    [InlineData("weak grid", "--state", "weak grid")]
    [InlineData("weak grid,base", "--state", "weak grid", "--state", "base", "--state", "base")]
    public async Task State_is_repeatable_in_the_order_given(string expected, params string[] options)
    {
        StudyRequest request = await Request(["check", "case", .. options]);
        Assert.Equal(expected, string.Join(',', request.States.Select(s => s.Name)));
    }

    [Fact]
    public async Task Impedance_options_reach_the_request()
    {
        StudyRequest request = await Request(
            "impedance", "case", "--bus", "LV-1", "--bus", "PCC", "--injected-at", "PCC", "--orders", "11.3,5,7", "--sequence", "negative",
            "--from-hz", "100", "--to-hz", "1e3", "--step-hz", "0.5", "--threads", "3");
        Assert.Equal(["LV-1", "PCC"], request.Buses);
        Assert.Equal("PCC", request.InjectedAt);
        Assert.Equal([11.3, 5, 7], request.Orders);
        Assert.Equal(Sequence.Negative, request.Sequence);
        Assert.Equal(new SweepRange(100, 1000, 0.5), request.Settings.Sweep);
        Assert.Equal(3, request.Threads);
    }

    [Fact]
    public async Task Options_left_out_keep_what_the_case_says()
    {
        StudyRequest request = await Request("study", "case");
        Assert.Equal(new SweepRange(50, 2500, 1), request.Settings.Sweep);
        Assert.Equal(SummationRule.Rss, request.Settings.Rule);
        Assert.Equal(0.3, request.NearOrders);
        Assert.False(request.Combinations);
        Assert.Empty(request.Orders);
        Assert.Equal(Sequence.Positive, request.Sequence);
        Assert.Equal(Environment.ProcessorCount, request.Threads);
    }

    [Theory]
    [InlineData("screen")]
    [InlineData("study")]
    public async Task Screening_options_reach_the_request(string command)
    {
        StudyRequest request = await Request(command, "case", "--combinations", "--near", "0.5", "--rule", "IEC");
        Assert.True(request.Combinations);
        Assert.Equal(0.5, request.NearOrders);
        Assert.Equal(SummationRule.Iec, request.Settings.Rule);
    }

    [Theory]
    [InlineData("Did you mean 'impedance'?", "impedence", "case")]
    [InlineData("Did you mean 'study'?", "sutdy", "case")]
    [InlineData("Did you mean '--state'?", "check", "case", "--sate", "all")]
    [InlineData("Did you mean '--orders'?", "impedance", "case", "--order", "5")]
    [InlineData("Did you mean 'arithmetic'?", "distortion", "case", "--rule", "arithmetik")]
    [InlineData("Did you mean 'json'?", "check", "case", "--format", "jsn")]
    [InlineData("Did you mean 'LV-1'?", "impedance", "case", "--bus", "LV1")]
    [InlineData("Did you mean 'PCC'?", "impedance", "case", "--injected-at", "PPC")]
    [InlineData("Did you mean 'weak grid'?", "check", "case", "--state", "weak-grid")]
    [InlineData("--sequence got 'zero'; expected positive, negative.", "impedance", "case", "--sequence", "zero")]
    [InlineData("--orders got 'x'; expected orders above 0", "impedance", "case", "--orders", "5,x")]
    [InlineData("--orders got '-5'; expected orders above 0", "impedance", "case", "--orders", "-5")]
    [InlineData("--orders got 'NaN'", "impedance", "case", "--orders", "NaN")]
    [InlineData("--step-hz got '0'; expected a spacing above 0 Hz", "impedance", "case", "--step-hz", "0")]
    [InlineData("--step-hz got '0,5'", "impedance", "case", "--step-hz", "0,5")]
    [InlineData("--threads got '0'; expected a whole number of 1 or more.", "check", "case", "--threads", "0")]
    [InlineData("expected the first frequency below the last", "impedance", "case", "--from-hz", "900", "--to-hz", "800")]
    [InlineData("makes more than 1000000 points", "impedance", "case", "--step-hz", "1e-4")]
    [InlineData("a command is missing: new, check, impedance, distortion, screen, study.")]
    [InlineData("Required argument 'CASE' missing for command: 'check'.", "check")]
    [InlineData("hsweep check does not know 'second'", "check", "case", "second")]
    [InlineData("hsweep check does not know '--orders'", "check", "case", "--orders", "5")]
    public async Task A_wrong_word_exits_2_and_names_the_nearest(string expected, params string[] args)
    {
        Hsweep.Outcome outcome = await new Hsweep().Run(args);
        Assert.Equal(ExitCode.BadInput, outcome.Code);
        Assert.Contains(expected, outcome.Error, StringComparison.Ordinal);
        Assert.Contains(" Fix: ", outcome.Error, StringComparison.Ordinal);
        Assert.Empty(outcome.Out);
    }

    [Fact]
    public async Task Several_wrong_choices_are_named_at_once()
    {
        Hsweep.Outcome outcome = await new Hsweep().Run("impedance", "case", "--bus", "A", "--bus", "B", "--state", "C");
        Assert.Contains("3 errors, 1 warning\n", outcome.Error, StringComparison.Ordinal);
    }

    private static async Task<StudyRequest> Request(params string[] args)
    {
        var hsweep = new Hsweep();
        await hsweep.Run(args);
        return Assert.Single(hsweep.Asked).Request;
    }
}
