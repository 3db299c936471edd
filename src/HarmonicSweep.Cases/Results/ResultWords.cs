using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>The words results use for enumerated values, in files and on the command line alike.</summary>
public static class ResultWords
{
    /// <summary>Every summation rule, in the order in which results list them.</summary>
    public static IReadOnlyList<SummationRule> Rules { get; } = Enum.GetValues<SummationRule>();

    /// <summary><c>positive</c>, <c>negative</c> or <c>zero</c>.</summary>
    public static string Word(this Sequence sequence) => sequence switch
    {
        Sequence.Positive => "positive",
        Sequence.Negative => "negative",
        _ => "zero",
    };

    /// <summary><c>phasor</c>, <c>arithmetic</c>, <c>rss</c> or <c>iec</c>.</summary>
    public static string Word(this SummationRule rule) => rule switch
    {
        SummationRule.Phasor => "phasor",
        SummationRule.Arithmetic => "arithmetic",
        SummationRule.Rss => "rss",
        _ => "iec",
    };

    /// <summary><c>parallel</c> or <c>series</c>.</summary>
    public static string Word(this ResonanceKind kind) => kind == ResonanceKind.Parallel ? "parallel" : "series";

    /// <summary><c>within</c>, <c>exceeded</c> or <c>not_judged</c>.</summary>
    public static string Word(this Verdict verdict) => verdict switch
    {
        Verdict.Within => "within",
        Verdict.Exceeded => "exceeded",
        _ => "not_judged",
    };

    /// <summary><c>error</c>, <c>warning</c> or <c>note</c>.</summary>
    public static string Word(this Severity severity) => severity switch
    {
        Severity.Error => "error",
        Severity.Warning => "warning",
        _ => "note",
    };
}
