using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Everything one command computed; a command fills the parts it computes.</summary>
public sealed record StudyResult
{
    /// <summary>One entry a state, in the order asked for.</summary>
    public IReadOnlyList<StateResult> States { get; init; } = [];

    /// <summary>Bank screening; null when not run.</summary>
    public ScreenResult? Screen { get; init; }

    /// <summary>Remarks that arose while computing.</summary>
    public IReadOnlyList<Finding> Findings { get; init; } = [];

    /// <summary>Whether a limit is exceeded or a bank position must not be dwelt on: exit code 1.</summary>
    public bool LimitExceeded =>
        States.Any(s => s.Limits.Any(l => l.Verdict == Verdict.Exceeded)) || Screen is { Positions: var p } && p.Any(x => x.DoNotDwell);
}

/// <summary>What was computed in one state.</summary>
public sealed record StateResult
{
    /// <summary>Name of the state.</summary>
    public required string State { get; init; }

    /// <summary>Fundamental voltage of every live bus.</summary>
    public IReadOnlyList<BusVoltage> PowerFlow { get; init; } = [];

    /// <summary>Why there is no power flow; null when it was solved.</summary>
    public Finding? PowerFlowFailure { get; init; }

    /// <summary>Buses not tied to a source in service.</summary>
    public IReadOnlyList<string> DeadBuses { get; init; } = [];

    /// <summary>Buses without a path to ground in the harmonic network: their impedance is open.</summary>
    public IReadOnlyList<string> OpenBuses { get; init; } = [];

    /// <summary>Closed couplers that close a loop of couplers.</summary>
    public IReadOnlyList<string> LoopCouplers { get; init; } = [];

    /// <summary>Injections that were not solved, and why.</summary>
    public IReadOnlyList<DroppedInjection> DroppedInjections { get; init; } = [];

    /// <summary>Orders above 1 that converters inject in this state and that were solved, ascending.</summary>
    public IReadOnlyList<double> InjectedOrders { get; init; } = [];

    /// <summary>Driving-point and transfer impedance against order.</summary>
    public IReadOnlyList<ImpedanceCurve> Impedance { get; init; } = [];

    /// <summary>Parallel and series resonances.</summary>
    public IReadOnlyList<Resonance> Resonances { get; init; } = [];

    /// <summary>Hand formula beside the computed resonance, one entry a bank in service.</summary>
    public IReadOnlyList<BankResonance> BankResonances { get; init; } = [];

    /// <summary>Voltage gain from the background at the PCC to each bus.</summary>
    public IReadOnlyList<BackgroundGain> Gains { get; init; } = [];

    /// <summary>Harmonic bus voltages, order 1 included.</summary>
    public IReadOnlyList<HarmonicVoltage> Voltages { get; init; } = [];

    /// <summary>Total harmonic distortion per bus and rule.</summary>
    public IReadOnlyList<BusDistortion> Distortion { get; init; } = [];

    /// <summary>Currents into the elements at each of their ends, order 1 included.</summary>
    public IReadOnlyList<HarmonicCurrent> Currents { get; init; } = [];

    /// <summary>Limits judged, or not judged and why.</summary>
    public IReadOnlyList<LimitVerdict> Limits { get; init; } = [];

    /// <summary>Hand formulas beside computed values.</summary>
    public IReadOnlyList<HandCheck> HandChecks { get; init; } = [];

    /// <summary>Largest backward error of all solves in this state.</summary>
    public double WorstBackwardError { get; init; }

    /// <summary>Largest sum of currents at a bus divided by the sum of their magnitudes, over all orders.</summary>
    public double CurrentBalanceResidual { get; init; }
}

/// <summary>Fundamental voltage of a bus.</summary>
/// <param name="Bus">Bus.</param>
/// <param name="Kv">sqrt3 times the phase-to-neutral phasor, kV rms.</param>
public sealed record BusVoltage(string Bus, Complex Kv);

/// <summary>An injection that was left out.</summary>
/// <param name="Element">Converter or supply.</param>
/// <param name="Order">Order.</param>
/// <param name="Why">Reason, one clause.</param>
public sealed record DroppedInjection(string Element, double Order, string Why);

/// <summary>Impedance against order.</summary>
/// <param name="Sequence">Sequence network.</param>
/// <param name="At">Bus where the voltage is seen.</param>
/// <param name="From">Bus where the current is injected; the same as <paramref name="At"/> for a driving point.</param>
/// <param name="Orders">Orders, ascending, or exactly as asked for.</param>
/// <param name="Ohm">Impedance per phase, ohm; null where open (no path to ground).</param>
public sealed record ImpedanceCurve(
    Sequence Sequence, string At, string From, IReadOnlyList<double> Orders, IReadOnlyList<Complex?> Ohm);

/// <summary>Kind of a resonance.</summary>
public enum ResonanceKind
{
    /// <summary>Local maximum of |Z|.</summary>
    Parallel,

    /// <summary>Local minimum of |Z|.</summary>
    Series,
}

/// <summary>A resonance of the driving-point impedance at a bus.</summary>
/// <param name="Sequence">Sequence network.</param>
/// <param name="Bus">Bus.</param>
/// <param name="Kind">Peak or valley.</param>
/// <param name="Order">Order, refined to 1e-6 of itself.</param>
/// <param name="FrequencyHz">Frequency, hertz.</param>
/// <param name="Ohm">|Z| there, ohm.</param>
/// <param name="QualityFactor">(h/2)|d arg Z/dh| there.</param>
/// <param name="NearestInjectedOrder">Nearest order the plant injects in this state; null when it injects none.</param>
public sealed record Resonance(
    Sequence Sequence, string Bus, ResonanceKind Kind, double Order, double FrequencyHz, double Ohm, double QualityFactor,
    double? NearestInjectedOrder)
{
    /// <summary>Distance to the nearest injected order, in orders; null when none is injected.</summary>
    public double? Distance => NearestInjectedOrder is { } near ? Math.Abs(Order - near) : null;
}

/// <summary>Hand formula of a bank, h = 1/sqrt(p + V^2/(X_C S_sc)), beside the nearest computed parallel resonance at its bus.</summary>
/// <param name="Bank">Bank.</param>
/// <param name="Bus">Its bus.</param>
/// <param name="StepsIn">Steps in service.</param>
/// <param name="ShortCircuitMva">S_sc at its bus from supplies and generators alone, MVA.</param>
/// <param name="HandOrder">Order by the hand formula.</param>
/// <param name="ComputedOrder">Nearest computed parallel resonance; null when there is none in range.</param>
public sealed record BankResonance(
    string Bank, string Bus, int StepsIn, double ShortCircuitMva, double HandOrder, double? ComputedOrder);

/// <summary>|V_bus/V_background| with the background EMF behind every supply at the PCC.</summary>
/// <param name="From">PCC.</param>
/// <param name="Bus">Bus.</param>
/// <param name="Orders">Orders, ascending.</param>
/// <param name="Gain">Per-unit voltage at the bus over per-unit EMF; null where open.</param>
public sealed record BackgroundGain(string From, string Bus, IReadOnlyList<double> Orders, IReadOnlyList<double?> Gain);

/// <summary>One value under each summation rule.</summary>
/// <param name="Phasor">Magnitude of the phasor sum.</param>
/// <param name="Arithmetic">Sum of magnitudes.</param>
/// <param name="Rss">Root of the sum of squares.</param>
/// <param name="Iec">By the exponents of IEC TR 61000-3-6.</param>
public readonly record struct RuleValues(double Phasor, double Arithmetic, double Rss, double Iec)
{
    /// <summary>The value under one rule.</summary>
    public double this[SummationRule rule] => rule switch
    {
        SummationRule.Phasor => Phasor,
        SummationRule.Arithmetic => Arithmetic,
        SummationRule.Rss => Rss,
        _ => Iec,
    };

    /// <summary>Every value times a factor.</summary>
    public RuleValues Times(double factor) => new(Phasor * factor, Arithmetic * factor, Rss * factor, Iec * factor);
}

/// <summary>Voltage of a bus at an order.</summary>
/// <param name="Bus">Bus.</param>
/// <param name="Order">Order.</param>
/// <param name="Kv">Phasor sum, sqrt3 times phase-to-neutral, kV rms.</param>
/// <param name="KvByRule">Magnitude under each rule, kV.</param>
/// <param name="PercentOfNominal">Magnitude under each rule, percent of the nominal voltage.</param>
public sealed record HarmonicVoltage(string Bus, double Order, Complex Kv, RuleValues KvByRule, RuleValues PercentOfNominal);

/// <summary>Total harmonic distortion of voltage at a bus, integers 2 to 50.</summary>
/// <param name="Bus">Bus.</param>
/// <param name="Rule">Summation rule.</param>
/// <param name="PercentOfFundamental">THD, percent of V_1; null = not judged (dead bus).</param>
/// <param name="PercentOfNominal">The same harmonics, percent of nominal voltage; null = not judged.</param>
public sealed record BusDistortion(string Bus, SummationRule Rule, double? PercentOfFundamental, double? PercentOfNominal);

/// <summary>Current into an element at one of its ends.</summary>
/// <param name="Element">Element.</param>
/// <param name="Bus">Bus of that end.</param>
/// <param name="Order">Order.</param>
/// <param name="Ampere">Phasor sum, A rms.</param>
/// <param name="AmpereByRule">Magnitude under each rule, A.</param>
public sealed record HarmonicCurrent(string Element, string Bus, double Order, Complex Ampere, RuleValues AmpereByRule);

/// <summary>Outcome of a limit.</summary>
public enum Verdict
{
    /// <summary>Within the limit.</summary>
    Within,

    /// <summary>Above the limit.</summary>
    Exceeded,

    /// <summary>An input is missing; never to be read as a pass.</summary>
    NotJudged,
}

/// <summary>One limit and its verdict.</summary>
/// <param name="Standard">Standard with edition, for example <c>IEEE 519-2022</c>.</param>
/// <param name="Table">Table of the standard and its row, for example <c>Table 2, 20 &lt; I_SC/I_L &lt; 50</c>.</param>
/// <param name="Basis">What chose the row and what the percent is of: voltage class, I_SC, I_L and their ratio.</param>
/// <param name="Quantity"><c>V_h</c>, <c>THD_V</c>, <c>I_h</c> or <c>TDD</c>.</param>
/// <param name="Bus">Bus judged; null when the PCC is missing.</param>
/// <param name="Order">Order; null for THD and TDD.</param>
/// <param name="ValuePercent">Value, percent; null when not judged.</param>
/// <param name="LimitPercent">Limit, percent; null when not judged.</param>
/// <param name="Verdict">Outcome.</param>
/// <param name="Why">Why it was not judged; null otherwise.</param>
public sealed record LimitVerdict(
    string Standard, string Table, string Basis, string Quantity, string? Bus, double? Order,
    double? ValuePercent, double? LimitPercent, Verdict Verdict, string? Why);

/// <summary>A hand formula beside the computed value.</summary>
/// <param name="Name">What is checked, for example <c>Z at order 1, supply alone</c>.</param>
/// <param name="Subject">Element or bus.</param>
/// <param name="Formula">Formula as a person writes it.</param>
/// <param name="Hand">By the formula.</param>
/// <param name="Computed">By the network.</param>
/// <param name="Unit">Unit of both.</param>
/// <param name="Tolerance">Relative difference beyond which the check warns.</param>
public sealed record HandCheck(
    string Name, string Subject, string Formula, double Hand, double Computed, string Unit, double Tolerance)
{
    /// <summary>|computed - hand| over |hand|.</summary>
    public double RelativeDifference => Math.Abs(Computed - Hand) / Math.Max(Math.Abs(Hand), double.Epsilon);

    /// <summary>Whether the two agree within the tolerance.</summary>
    public bool Agrees => RelativeDifference <= Tolerance;
}
