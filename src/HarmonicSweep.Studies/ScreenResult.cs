using System.Numerics;

namespace HarmonicSweep.Studies;

/// <summary>Every position of every bank at every supply strength.</summary>
public sealed record ScreenResult
{
    /// <summary>Distance in orders below which a parallel resonance counts as near an injected order.</summary>
    public required double NearOrders { get; init; }

    /// <summary>One entry a bank position and supply strength.</summary>
    public required IReadOnlyList<BankPosition> Positions { get; init; }

    /// <summary>Largest voltage per bus and order over all positions, with the state that gave it.</summary>
    public required IReadOnlyList<WorstValue> Worst { get; init; }

    /// <summary>|Z| at a bank's bus over its positions: the data of the heat map.</summary>
    public required IReadOnlyList<PositionMap> Maps { get; init; }

    /// <summary>Largest backward error of all solves of the screening.</summary>
    public double WorstBackwardError { get; init; }
}

/// <summary>One bank at one position and one supply strength.</summary>
public sealed record BankPosition
{
    /// <summary>State it starts from.</summary>
    public required string BaseState { get; init; }

    /// <summary>Full name of the state solved, for example <c>base, supply min, BANK-1 3/4</c>.</summary>
    public required string State { get; init; }

    /// <summary>Bank that moves; several joined by " + " under combinations.</summary>
    public required string Bank { get; init; }

    /// <summary>Its bus.</summary>
    public required string Bus { get; init; }

    /// <summary>Steps in service.</summary>
    public required int StepsIn { get; init; }

    /// <summary>Steps of the bank.</summary>
    public required int Steps { get; init; }

    /// <summary>Supply strength: <c>max</c>, <c>min</c> or a number of MVA.</summary>
    public required string Strength { get; init; }

    /// <summary>Capacitor kvar in service at rated voltage.</summary>
    public required double KvarIn { get; init; }

    /// <summary>Hand formula; null with no step in.</summary>
    public double? HandOrder { get; init; }

    /// <summary>Parallel resonances at its bus.</summary>
    public IReadOnlyList<Resonance> ParallelResonances { get; init; } = [];

    /// <summary>The parallel resonance nearest to an injected order; null when there is none.</summary>
    public Resonance? Nearest { get; init; }

    /// <summary>A parallel resonance lies near an injected order: do not dwell on this position.</summary>
    public bool DoNotDwell { get; init; }

    /// <summary>Loading of the bank itself; null with no step in or on a dead bus.</summary>
    public BankLoading? Loading { get; init; }

    /// <summary>Power factor at the PCC at the fundamental (P/S); null without PCC or supply there.</summary>
    public double? PccPowerFactor { get; init; }

    /// <summary>Reactive power the supply side delivers into the PCC at the fundamental, kvar; null likewise.</summary>
    public double? PccKvar { get; init; }

    /// <summary>Fundamental voltage of the bank's bus with the bank at this position, percent of nominal; null when dead.</summary>
    public double? BusVoltagePercent { get; init; }

    /// <summary>The same with the bank out; null when dead.</summary>
    public double? BusVoltageWithoutPercent { get; init; }

    /// <summary>THD of the bank's bus, percent of V_1, under the chosen rule; null when dead.</summary>
    public double? ThdPercent { get; init; }
}

/// <summary>Capacitor duty against its rating: IEEE 18-2002/2012 continuous limits 110 % rms, 120 % crest, 135 % current, 135 % kvar.</summary>
/// <param name="RmsVoltagePercent">rms voltage over the capacitors, percent of rated.</param>
/// <param name="CrestVoltagePercent">Crest voltage, percent of rated crest.</param>
/// <param name="CurrentPercent">rms current, percent of rated.</param>
/// <param name="KvarPercent">Reactive power, percent of rated.</param>
/// <param name="CurrentA">rms current, A.</param>
public sealed record BankLoading(
    double RmsVoltagePercent, double CrestVoltagePercent, double CurrentPercent, double KvarPercent, double CurrentA)
{
    /// <summary>Whether one of the four continuous limits is exceeded.</summary>
    public bool Overloaded => RmsVoltagePercent > 110 || CrestVoltagePercent > 120 || CurrentPercent > 135 || KvarPercent > 135;
}

/// <summary>Largest harmonic voltage of a bus at an order.</summary>
/// <param name="Bus">Bus.</param>
/// <param name="Order">Order; null for THD (percent of V_1).</param>
/// <param name="Percent">Percent of nominal voltage, under the chosen rule.</param>
/// <param name="State">State that gave it.</param>
public sealed record WorstValue(string Bus, double? Order, double Percent, string State);

/// <summary>|Z| at a bank's bus over positions and orders, at one supply strength.</summary>
/// <param name="BaseState">State it starts from.</param>
/// <param name="Bank">Bank.</param>
/// <param name="Bus">Its bus.</param>
/// <param name="Strength">Supply strength.</param>
/// <param name="StepsIn">Steps in service, one entry a row.</param>
/// <param name="Orders">Orders, one entry a column.</param>
/// <param name="Ohm">|Z| per row and column, ohm; null where open.</param>
/// <param name="InjectedOrders">Orders the plant injects.</param>
public sealed record PositionMap(
    string BaseState, string Bank, string Bus, string Strength, IReadOnlyList<int> StepsIn, IReadOnlyList<double> Orders,
    IReadOnlyList<IReadOnlyList<Complex?>> Ohm, IReadOnlyList<double> InjectedOrders);
