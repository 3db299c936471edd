using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>What a study is asked: the plant, its states and the choices of the command line.</summary>
public sealed record StudyRequest
{
    /// <summary>What is installed.</summary>
    public required Plant Plant { get; init; }

    /// <summary>States to run, in the order asked for.</summary>
    public required IReadOnlyList<OperatingState> States { get; init; }

    /// <summary>Sweep range, limits, PCC and summation rule, command-line choices already applied.</summary>
    public required StudySettings Settings { get; init; }

    /// <summary>Buses asked for; empty = the default of the command.</summary>
    public IReadOnlyList<string> Buses { get; init; } = [];

    /// <summary>Bus of injection for transfer impedances; null = driving points.</summary>
    public string? InjectedAt { get; init; }

    /// <summary>Orders asked for, exactly as given; empty = the scan range (impedance) or every injected order (distortion).</summary>
    public IReadOnlyList<double> Orders { get; init; } = [];

    /// <summary>Sequence network of impedance scans.</summary>
    public Sequence Sequence { get; init; } = Sequence.Positive;

    /// <summary>Screening: move all banks together instead of one at a time.</summary>
    public bool Combinations { get; init; }

    /// <summary>Screening: distance in orders below which a resonance counts as near an injected order.</summary>
    public double NearOrders { get; init; } = 0.3;

    /// <summary>Threads; results do not depend on it, to the last bit.</summary>
    public int Threads { get; init; } = 1;
}
