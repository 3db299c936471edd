using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>What every picture is planned from.</summary>
/// <param name="CaseTitle">Title of the case.</param>
/// <param name="Result">What was computed.</param>
/// <param name="Settings">PCC, summation rule.</param>
/// <param name="Buses">Buses asked for; empty = the PCC and every bus with a bank or filter.</param>
internal sealed record PictureContext(string CaseTitle, StudyResult Result, StudySettings Settings, IReadOnlyCollection<string> Buses)
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
    public string StatesText => Result.States.Count == 1
        ? $"state {Result.States[0].State}"
        : FormattableString.Invariant($"{Result.States.Count} states");

    /// <summary>Whether a bus gets an impedance picture of its own: pictures cost time, and the tables have every bus.</summary>
    public bool WantsImpedance(string bus) => Buses.Count == 0 || Buses.Contains(bus);
}
