namespace HarmonicSweep.Network;

/// <summary>How a linear load is seen by harmonics; the formulas stand in <c>LoadLaw</c>.</summary>
public enum LoadModel
{
    /// <summary>Resistance parallel to inductance.</summary>
    Parallel,

    /// <summary>Resistance in series with inductance.</summary>
    Series,

    /// <summary>The parallel model times 0.1 h + 0.9.</summary>
    Growing,

    /// <summary>The model of CIGRE WG 36-05.</summary>
    Cigre,

    /// <summary>Open to harmonics.</summary>
    None,
}

/// <summary>A linear load, three-phase power at nominal bus voltage.</summary>
public sealed record LinearLoad : ShuntElement
{
    /// <summary>Active power, kW.</summary>
    public required double PKw { get; init; }

    /// <summary>Reactive power, kvar; negative = capacitive.</summary>
    public required double QKvar { get; init; }

    /// <summary>How harmonics see it.</summary>
    public LoadModel Model { get; init; }

    /// <summary>Share of P and Q that is a lumped motor to harmonics, percent.</summary>
    public double MotorSharePercent { get; init; }
}

/// <summary>An induction motor or a lumped group of equal ones.</summary>
public sealed record Motor : ShuntElement
{
    /// <summary>Rated shaft power of one motor, kW.</summary>
    public required double RatedKw { get; init; }

    /// <summary>Rated line-to-line voltage, kV.</summary>
    public required double RatedKv { get; init; }

    /// <summary>Efficiency at rated power, percent.</summary>
    public required double EfficiencyPercent { get; init; }

    /// <summary>Power factor at rated power, above 0 to 1.</summary>
    public required double PowerFactor { get; init; }

    /// <summary>Loading as drawn, percent of rated power.</summary>
    public double LoadingPercent { get; init; } = 100;

    /// <summary>Locked-rotor current, per unit of rated current.</summary>
    public double LockedRotorPu { get; init; } = 6;

    /// <summary>Locked-rotor power factor.</summary>
    public double LockedRotorPowerFactor { get; init; } = 0.2;

    /// <summary>Number of equal motors.</summary>
    public int Count { get; init; } = 1;

    /// <summary>Rated apparent power of the group, MVA.</summary>
    public double RatedMva => Count * RatedKw / 1000 / (EfficiencyPercent / 100 * PowerFactor);
}
