namespace HarmonicSweep.Studies;

/// <summary>How contributions of several sources are added.</summary>
public enum SummationRule
{
    /// <summary>With their angles.</summary>
    Phasor,

    /// <summary>Sum of magnitudes.</summary>
    Arithmetic,

    /// <summary>Root of the sum of squares.</summary>
    Rss,

    /// <summary>Exponent 1 below order 5, 1.4 from 5 to 10, 2 above: IEC TR 61000-3-6 (from memory).</summary>
    Iec,
}

/// <summary>Range and spacing of the listed and plotted points of a scan. Resonances never depend on the spacing.</summary>
/// <param name="FromHz">First frequency, hertz.</param>
/// <param name="ToHz">Last frequency, hertz.</param>
/// <param name="StepHz">Spacing, hertz.</param>
public sealed record SweepRange(double FromHz, double ToHz, double StepHz);

/// <summary>What the case file says beside the plant.</summary>
public sealed record StudySettings
{
    /// <summary>Range of the scan.</summary>
    public required SweepRange Sweep { get; init; }

    /// <summary>Point of common coupling; null when not given.</summary>
    public string? PccBus { get; init; }

    /// <summary>Tokens of the limit sets to judge by.</summary>
    public IReadOnlyList<string> Standards { get; init; } = [];

    /// <summary>Rule whose values are judged and listed first.</summary>
    public SummationRule Rule { get; init; } = SummationRule.Phasor;
}
