using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>What every picture is planned from.</summary>
/// <param name="CaseTitle">Title of the case.</param>
/// <param name="Result">What was computed.</param>
/// <param name="Settings">PCC, summation rule.</param>
internal sealed record PictureContext(string CaseTitle, StudyResult Result, StudySettings Settings)
{
    /// <summary>The summation rule in words.</summary>
    public string RuleText => Settings.Rule switch
    {
        SummationRule.Phasor => "sources added with their angles",
        SummationRule.Arithmetic => "sources added by magnitude",
        SummationRule.Rss => "sources added root-sum-square",
        _ => "sources added by IEC exponents",
    };

    /// <summary>The bus, marked when it is the PCC.</summary>
    public string BusText(string bus) => bus == Settings.PccBus ? $"{bus} (PCC)" : bus;

    /// <summary>The only state's name, or how many there are.</summary>
    public string StatesText(int count) => count == 1
        ? $"state {Result.States[0].State}"
        : FormattableString.Invariant($"{count} states");
}
