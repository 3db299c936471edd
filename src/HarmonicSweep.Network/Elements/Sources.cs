namespace HarmonicSweep.Network;

/// <summary>A utility in-feed: an EMF behind its short-circuit impedance.</summary>
public sealed record Supply : ShuntElement
{
    /// <summary>Magnitude of the EMF, per unit of the nominal bus voltage.</summary>
    public double VoltagePu { get; init; } = 1;

    /// <summary>Angle of the EMF, degrees.</summary>
    public double AngleDeg { get; init; }

    /// <summary>Largest three-phase short-circuit power, MVA at nominal bus voltage.</summary>
    public required double ShortCircuitMvaMax { get; init; }

    /// <summary>Smallest three-phase short-circuit power, MVA at nominal bus voltage.</summary>
    public required double ShortCircuitMvaMin { get; init; }

    /// <summary>X/R of the short-circuit impedance at the fundamental.</summary>
    public double XOverR { get; init; } = 10;

    /// <summary>Background harmonic voltage, percent of nominal; null when not given.</summary>
    public Spectrum? Background { get; init; }

    /// <summary>Maximum demand at this in-feed, MVA: the base of I_L; null when not given.</summary>
    public double? DemandMva { get; init; }
}

/// <summary>A synchronous machine, per unit on its own rating.</summary>
public sealed record Generator : ShuntElement
{
    /// <summary>Rated power, MVA.</summary>
    public required double RatedMva { get; init; }

    /// <summary>Rated line-to-line voltage, kV.</summary>
    public required double RatedKv { get; init; }

    /// <summary>Active power delivered, MW.</summary>
    public double PMw { get; init; }

    /// <summary>Voltage held at its bus, per unit of the bus's nominal voltage.</summary>
    public double VoltagePu { get; init; } = 1;

    /// <summary>Reactance seen by harmonics at the fundamental, per unit: x2_pu where given, else (xd2_pu + xq2_pu)/2.</summary>
    public required double ReactancePu { get; init; }

    /// <summary>Armature resistance, per unit.</summary>
    public double ResistancePu { get; init; }
}

/// <summary>A harmonic spectrum as listed in a table.</summary>
/// <param name="Name">Name of the spectrum.</param>
/// <param name="Lines">Its lines, ascending in order.</param>
/// <param name="Location">Where its first line was read.</param>
public sealed record Spectrum(string Name, IReadOnlyList<SpectrumLine> Lines, SourceLocation Location);

/// <summary>One line of a spectrum.</summary>
/// <param name="Order">Order h, any real number above 0.</param>
/// <param name="Percent">Magnitude, percent of the fundamental (converter) or of nominal voltage (background).</param>
/// <param name="AngleDeg">Angle, degrees.</param>
public sealed record SpectrumLine(double Order, double Percent, double AngleDeg);

/// <summary>A harmonic-producing load: constant power at the fundamental, a current source at every other order.</summary>
public sealed record Converter : ShuntElement
{
    /// <summary>Rated active power, kW; null when <see cref="RatedA"/> is given.</summary>
    public double? RatedKw { get; init; }

    /// <summary>Rated line current, A; null when <see cref="RatedKw"/> is given.</summary>
    public double? RatedA { get; init; }

    /// <summary>Displacement power factor, lagging, above 0 to 1.</summary>
    public required double PowerFactor { get; init; }

    /// <summary>Current spectrum; its order-1 line reads 100.</summary>
    public required Spectrum Spectrum { get; init; }

    /// <summary>Phase shift of the converter's own transformer, degrees.</summary>
    public double PhaseShiftDeg { get; init; }

    /// <summary>Loading as drawn, percent.</summary>
    public double LoadingPercent { get; init; } = 100;

    /// <summary>Factor on every order but the first, 0 to 1.</summary>
    public double Diversity { get; init; } = 1;
}
