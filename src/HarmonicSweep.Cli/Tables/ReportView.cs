using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>What a text report shows: a result, what was asked, and how much of it fits a reader.</summary>
internal sealed record ReportView(CaseFile Case, StudyRequest Request, StudyResult Result, string Command)
{
    /// <summary>The main job shows the worst of everything; a command of its own shows its part in full.</summary>
    public bool IsStudy => Command == "study";

    /// <summary>Rows of a ranked table.</summary>
    public int RowLimit => IsStudy ? 12 : 40;

    /// <summary>What is installed.</summary>
    public Plant Plant => Case.Plant;

    /// <summary>Rule under which values are judged and shown.</summary>
    public SummationRule Rule => Request.Settings.Rule;

    /// <summary>Every row of a list of all states, with the name of its state.</summary>
    public IReadOnlyList<InState<T>> All<T>(Func<StateResult, IEnumerable<T>> list) =>
        [.. Result.States.SelectMany(s => list(s).Select(row => new InState<T>(s.State, row)))];

    /// <summary>Parallel resonances, the nearest to an injected order first; those without one follow in ascending order.</summary>
    public IReadOnlyList<InState<Resonance>> ResonancesByDistance(ResonanceKind? kind = null) =>
    [
        .. All(s => s.Resonances).Where(r => kind is null || r.Row.Kind == kind)
            .OrderBy(r => r.Row.Kind).ThenBy(r => r.Row.Distance ?? double.MaxValue).ThenBy(r => r.Row.Order),
    ];

    /// <summary>Limits by how much of them is used, exceeded ones first; those not judged come last.</summary>
    public IReadOnlyList<InState<LimitVerdict>> LimitsByUse() =>
    [
        .. All(s => s.Limits).OrderBy(l => l.Row.Verdict == Verdict.NotJudged)
            .ThenByDescending(l => l.Row.Verdict == Verdict.Exceeded).ThenByDescending(l => UsePercent(l.Row) ?? 0),
    ];

    /// <summary>Value as a share of its limit, percent; null when not judged.</summary>
    public static double? UsePercent(LimitVerdict limit) =>
        limit is { ValuePercent: { } value, LimitPercent: { } most } ? value / most * 100 : null;

    /// <summary>THD of every bus under the chosen rule, the largest first; buses not judged come last.</summary>
    public IReadOnlyList<InState<BusDistortion>> ThdByValue() =>
    [
        .. All(s => s.Distortion.Where(d => d.Rule == Rule)).OrderByDescending(d => d.Row.PercentOfFundamental ?? -1),
    ];

    /// <summary>Positions that overload the capacitors, the largest current first.</summary>
    public IReadOnlyList<BankPosition> Overloaded() =>
    [
        .. (Result.Screen?.Positions ?? []).Where(p => p.Loading is { Overloaded: true }).OrderByDescending(p => p.Loading!.CurrentPercent),
    ];

    /// <summary>Positions to avoid: those that overload the capacitors, then those not to dwell on.</summary>
    public IReadOnlyList<BankPosition> BadPositions() => [.. Overloaded().Union(DoNotDwell())];

    /// <summary>Positions that must not be dwelt on, the nearest to an injected order first.</summary>
    public IReadOnlyList<BankPosition> DoNotDwell() =>
    [
        .. (Result.Screen?.Positions ?? []).Where(p => p.DoNotDwell).OrderBy(p => p.Nearest?.Distance ?? double.MaxValue),
    ];
}

/// <summary>A row of a state. A class: generic code over structures would be compiled anew at every start.</summary>
/// <typeparam name="T">The row.</typeparam>
/// <param name="State">Name of the state.</param>
/// <param name="Row">The row.</param>
internal sealed record InState<T>(string State, T Row);
