namespace HarmonicSweep.Network;

/// <summary>An ideal switch or bus coupler; closed, it merges its two buses into one node.</summary>
public sealed record Coupler : BranchElement
{
    /// <summary>As drawn: closed or open.</summary>
    public bool Closed { get; init; } = true;
}

/// <summary>A cable or an overhead line, per-kilometre data at the fundamental.</summary>
public sealed record Line : BranchElement
{
    /// <summary>True when it comes from the cable table, false for an overhead line.</summary>
    public required bool IsCable { get; init; }

    /// <summary>Length, km, above 0.</summary>
    public required double LengthKm { get; init; }

    /// <summary>Positive-sequence resistance of one circuit at the fundamental, ohm/km.</summary>
    public required double ResistanceOhmPerKm { get; init; }

    /// <summary>Positive-sequence reactance of one circuit at the fundamental, ohm/km.</summary>
    public required double ReactanceOhmPerKm { get; init; }

    /// <summary>Positive-sequence capacitance of one circuit, nF/km.</summary>
    public double CapacitanceNanofaradPerKm { get; init; }

    /// <summary>Identical circuits in parallel, 1 or more.</summary>
    public int Circuits { get; init; } = 1;

    /// <summary>How the resistance grows with frequency.</summary>
    public required ResistanceLaw Law { get; init; }

    /// <summary>Conductor cross-section, mm^2; null when not given.</summary>
    public double? ConductorMm2 { get; init; }

    /// <summary>Ampacity of all circuits as given, A; null when not given.</summary>
    public double? AmpacityA { get; init; }
}

/// <summary>A series reactor between two buses.</summary>
public sealed record SeriesReactor : BranchElement
{
    /// <summary>Reactance at the fundamental, ohm.</summary>
    public required double ReactanceOhm { get; init; }

    /// <summary>X/R at the fundamental, above 0.</summary>
    public required double QualityFactor { get; init; }

    /// <summary>How the resistance grows with frequency.</summary>
    public ResistanceLaw Law { get; init; } = ResistanceLaw.Constant;
}

/// <summary>A two-winding transformer, nameplate data; end A is the high-voltage side.</summary>
public sealed record Transformer : BranchElement
{
    /// <summary>Rated power, MVA.</summary>
    public required double RatedMva { get; init; }

    /// <summary>Rated line-to-line voltage of the high-voltage winding, kV.</summary>
    public required double HvKv { get; init; }

    /// <summary>Rated line-to-line voltage of the low-voltage winding, kV.</summary>
    public required double LvKv { get; init; }

    /// <summary>Short-circuit impedance, percent on its own rating.</summary>
    public required double ImpedancePercent { get; init; }

    /// <summary>Resistive part of the impedance at the fundamental, percent on its own rating.</summary>
    public required double ResistancePercent { get; init; }

    /// <summary>Winding connections and clock number.</summary>
    public required VectorGroup Group { get; init; }

    /// <summary>Tap on the high-voltage side, percent of the ratio.</summary>
    public double TapPercent { get; init; }

    /// <summary>How the resistance grows with frequency.</summary>
    public ResistanceLaw Law { get; init; } = ResistanceLaw.Constant;

    /// <summary>No-load loss, kW; 0 when not given.</summary>
    public double NoLoadLossKw { get; init; }

    /// <summary>No-load current, percent of rated current; 0 when not given.</summary>
    public double NoLoadCurrentPercent { get; init; }

    /// <summary>Winding eddy loss as a share of the load loss; null when not given.</summary>
    public double? EddyLossPu { get; init; }

    /// <summary>Resistance at the fundamental on the low-voltage side, ohm per phase.</summary>
    public double ResistanceOhm => ResistancePercent / 100 * LvKv * LvKv / RatedMva;

    /// <summary>Reactance at the fundamental on the low-voltage side, ohm per phase.</summary>
    public double ReactanceOhm =>
        Math.Sqrt(ImpedancePercent * ImpedancePercent - ResistancePercent * ResistancePercent) / 100 * LvKv * LvKv / RatedMva;

    /// <summary>True when no-load loss or no-load current is given, so that a magnetising branch exists.</summary>
    public bool HasNoLoadBranch => NoLoadLossKw > 0 || NoLoadCurrentPercent > 0;

    /// <summary>Name under which the no-load branch is reported.</summary>
    public string NoLoadName => Name + " (no load)";
}

/// <summary>Connection of a winding.</summary>
public enum Winding
{
    /// <summary>Delta.</summary>
    Delta,

    /// <summary>Wye, neutral not brought out.</summary>
    Wye,

    /// <summary>Wye, neutral brought out.</summary>
    WyeNeutral,
}

/// <summary>Winding connections and clock number, for example Dyn11. Even clock with Yy and Dd, odd with Yd and Dy.</summary>
/// <param name="High">High-voltage winding.</param>
/// <param name="Low">Low-voltage winding.</param>
/// <param name="Clock">Clock number n: the low-voltage side lags by 30 n degrees in positive sequence.</param>
public readonly record struct VectorGroup(Winding High, Winding Low, int Clock)
{
    /// <summary>Reads <c>(D|Y|YN)(d|y|yn)(0..12)</c>; false when the text is no vector group or its clock is of the wrong parity.</summary>
    public static bool TryParse(string text, out VectorGroup group)
    {
        group = default;
        int digits = text.Length;
        while (digits > 0 && char.IsAsciiDigit(text[digits - 1]))
        {
            digits--;
        }

        if (digits == text.Length || text.Length - digits > 2)
        {
            return false;
        }

        int clock = int.Parse(text.AsSpan(digits), System.Globalization.CultureInfo.InvariantCulture);
        string letters = text[..digits];
        int split = letters.StartsWith("YN", StringComparison.Ordinal) ? 2 : 1;
        if (letters.Length <= split || clock > 12
            || Read(letters[..split], upper: true) is not { } high || Read(letters[split..], upper: false) is not { } low)
        {
            return false;
        }

        bool unlike = (high == Winding.Delta) != (low == Winding.Delta);
        group = new VectorGroup(high, low, clock);
        return unlike == (clock % 2 == 1);
    }

    /// <summary>The usual short name, for example <c>Dyn11</c>.</summary>
    public override string ToString() => string.Create(
        System.Globalization.CultureInfo.InvariantCulture,
        $"{High switch { Winding.Delta => "D", Winding.Wye => "Y", _ => "YN" }}{Low switch { Winding.Delta => "d", Winding.Wye => "y", _ => "yn" }}{Clock}");

    private static Winding? Read(string letters, bool upper) => (upper ? letters : letters switch { "d" => "D", "y" => "Y", "yn" => "YN", _ => "" }) switch
    {
        "D" => Winding.Delta,
        "Y" => Winding.Wye,
        "YN" => Winding.WyeNeutral,
        _ => null,
    };
}
