namespace HarmonicSweep.Network;

/// <summary>What differs from the plant as drawn.</summary>
/// <param name="Name">Name of the state; <c>base</c> is the plant as drawn.</param>
/// <param name="Settings">Its settings; what is not named stays as drawn.</param>
public sealed record OperatingState(string Name, IReadOnlyList<StateSetting> Settings)
{
    /// <summary>Name of the plant as drawn.</summary>
    public const string BaseName = "base";

    /// <summary>The plant as drawn.</summary>
    public static OperatingState Base { get; } = new(BaseName, []);

    /// <summary>This state with further settings; a later setting of the same kind on the same element wins.</summary>
    public OperatingState With(string name, params IEnumerable<StateSetting> settings) => new(name, [.. Settings, .. settings]);
}

/// <summary>One setting of an operating state.</summary>
/// <param name="Element">Name of the element it acts on.</param>
public abstract record StateSetting(string Element);

/// <summary>In or out of service (a coupler: in = closed).</summary>
/// <param name="Element">Name of the element.</param>
/// <param name="In">True = in service.</param>
public sealed record ServiceSetting(string Element, bool In) : StateSetting(Element);

/// <summary>Steps of a capacitor bank in service.</summary>
/// <param name="Element">Name of the bank.</param>
/// <param name="Steps">0 to the number of steps of the bank.</param>
public sealed record StepsSetting(string Element, int Steps) : StateSetting(Element);

/// <summary>Short-circuit level of a supply.</summary>
/// <param name="Element">Name of the supply.</param>
/// <param name="Level">Which level.</param>
public sealed record ShortCircuitSetting(string Element, ShortCircuitLevel Level) : StateSetting(Element);

/// <summary>Tap of a transformer.</summary>
/// <param name="Element">Name of the transformer.</param>
/// <param name="Percent">Tap, percent of the ratio.</param>
public sealed record TapSetting(string Element, double Percent) : StateSetting(Element);

/// <summary>Loading of a load, motor or converter; replaces its own loading.</summary>
/// <param name="Element">Name of the element.</param>
/// <param name="Percent">Loading, percent.</param>
public sealed record LoadingSetting(string Element, double Percent) : StateSetting(Element);

/// <summary>A short-circuit level: the given minimum or maximum, or a number of MVA.</summary>
/// <param name="Mva">Short-circuit power, MVA; null for the given minimum or maximum.</param>
/// <param name="Minimum">Without a number: true = minimum, false = maximum.</param>
public readonly record struct ShortCircuitLevel(double? Mva, bool Minimum)
{
    /// <summary>The given maximum.</summary>
    public static ShortCircuitLevel Max => new(null, false);

    /// <summary>The given minimum.</summary>
    public static ShortCircuitLevel Min => new(null, true);

    /// <summary>As written in states.csv: min, max or the number of MVA.</summary>
    public override string ToString() => Mva is { } mva
        ? mva.ToString(System.Globalization.CultureInfo.InvariantCulture)
        : Minimum ? "min" : "max";
}
