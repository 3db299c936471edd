namespace HarmonicSweep.Network;

/// <summary>How a three-phase shunt is connected; it matters to the zero sequence only.</summary>
public enum Connection
{
    /// <summary>Delta.</summary>
    Delta,

    /// <summary>Wye, neutral isolated.</summary>
    Wye,

    /// <summary>Wye, neutral earthed.</summary>
    WyeGrounded,
}

/// <summary>A capacitor bank, plain or behind detuning reactors, switched in equal steps.</summary>
public sealed record CapacitorBank : ShuntElement
{
    /// <summary>Rated reactive power of the capacitors of the whole bank with all steps in, kvar at <see cref="RatedKv"/>.</summary>
    public required double RatedKvar { get; init; }

    /// <summary>Rated line-to-line voltage of the capacitors, kV.</summary>
    public required double RatedKv { get; init; }

    /// <summary>Number of equal steps, 1 or more.</summary>
    public int Steps { get; init; } = 1;

    /// <summary>Steps in service as drawn, 0 to <see cref="Steps"/>.</summary>
    public required int StepsIn { get; init; }

    /// <summary>Connection.</summary>
    public Connection Connection { get; init; }

    /// <summary>Detuning factor p = X_L/X_C at the fundamental, percent; 0 = no reactor.</summary>
    public double DetuningPercent { get; init; }

    /// <summary>X/R of the detuning reactor at the fundamental; null without reactor.</summary>
    public double? ReactorQ { get; init; }

    /// <summary>Loss of the capacitors, W per kvar.</summary>
    public double LossWPerKvar { get; init; }

    /// <summary>Capacitance tolerance, percent; null when not given.</summary>
    public double? TolerancePercent { get; init; }

    /// <summary>X_C at the fundamental with so many steps in, ohm per phase (wye equivalent): rated_kv^2/Q_in.</summary>
    /// <param name="stepsIn">Steps in service, 1 or more.</param>
    public double CapacitiveReactanceOhm(int stepsIn) => RatedKv * RatedKv * 1000 / (RatedKvar * stepsIn / Steps);
}

/// <summary>Kinds of passive shunt filters.</summary>
public enum FilterKind
{
    /// <summary>Capacitor, coil and its resistance in series.</summary>
    SingleTuned,

    /// <summary>Second-order damped.</summary>
    HighPass2,

    /// <summary>Third-order damped.</summary>
    HighPass3,

    /// <summary>C-type: no fundamental current through the resistor.</summary>
    CType,

    /// <summary>Two tuned orders in one branch.</summary>
    DoubleTuned,
}

/// <summary>A passive shunt filter.</summary>
public sealed record Filter : ShuntElement
{
    /// <summary>Circuit of the filter.</summary>
    public required FilterKind Kind { get; init; }

    /// <summary>Rated reactive power of its capacitors, kvar at <see cref="RatedKv"/>.</summary>
    public required double RatedKvar { get; init; }

    /// <summary>Rated line-to-line voltage of its capacitors, kV.</summary>
    public required double RatedKv { get; init; }

    /// <summary>Tuned order (the lower one of a double-tuned filter).</summary>
    public required double TunedOrder { get; init; }

    /// <summary>Upper tuned order of a double-tuned filter; null otherwise.</summary>
    public double? SecondOrder { get; init; }

    /// <summary>Quality factor; null when <see cref="DampingOhm"/> replaces it.</summary>
    public double? QualityFactor { get; init; }

    /// <summary>Damping resistance, ohm; null when not given.</summary>
    public double? DampingOhm { get; init; }

    /// <summary>Connection.</summary>
    public Connection Connection { get; init; }

    /// <summary>X_C of its capacitors at the fundamental, ohm per phase (wye equivalent).</summary>
    public double CapacitiveReactanceOhm => RatedKv * RatedKv * 1000 / RatedKvar;
}
