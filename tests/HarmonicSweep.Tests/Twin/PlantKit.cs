using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>Short ways to write a plant in a test; every omitted value is the default of the model text.</summary>
internal static class PlantKit
{
    public static SourceLocation Here { get; } = new("test.csv", 1);

    public static Plant Plant(double frequencyHz, IEnumerable<Bus> buses, params IEnumerable<PlantElement> elements) =>
        new("test", frequencyHz, buses, elements);

    public static Bus Bus(string name, double kv) => new(name, kv, Here);

    /// <summary>A supply of one strength.</summary>
    /// <param name="mva">Maximum = minimum short-circuit power, MVA.</param>
    public static Supply Supply(string name, string bus, double mva, double xOverR = 10) => new()
    {
        Name = name,
        Location = Here,
        Bus = bus,
        ShortCircuitMvaMax = mva,
        ShortCircuitMvaMin = mva,
        XOverR = xOverR,
    };

    public static CapacitorBank Bank(string name, string bus, double kvar, double kv) => new()
    {
        Name = name,
        Location = Here,
        Bus = bus,
        RatedKvar = kvar,
        RatedKv = kv,
        StepsIn = 1,
    };

    public static Transformer Transformer(
        string name, string hv, string lv, double mva, double hvKv, double lvKv, double impedancePercent, double xOverR = 10, string group = "Yy0")
    {
        if (!VectorGroup.TryParse(group, out VectorGroup parsed))
        {
            throw new ArgumentException($"'{group}' is no vector group.", nameof(group));
        }

        return new()
        {
            Name = name,
            Location = Here,
            EndA = hv,
            EndB = lv,
            RatedMva = mva,
            HvKv = hvKv,
            LvKv = lvKv,
            ImpedancePercent = impedancePercent,
            ResistancePercent = impedancePercent / Math.Sqrt(1 + xOverR * xOverR),
            Group = parsed,
        };
    }

    public static Line Line(string name, string a, string b, double km, double r, double x, double nanofarad, ResistanceLaw? law = null) => new()
    {
        Name = name,
        Location = Here,
        EndA = a,
        EndB = b,
        IsCable = true,
        LengthKm = km,
        ResistanceOhmPerKm = r,
        ReactanceOhmPerKm = x,
        CapacitanceNanofaradPerKm = nanofarad,
        Law = law ?? ResistanceLaw.Constant,
    };

    public static SeriesReactor Reactor(string name, string a, string b, double ohm, double quality) => new()
    {
        Name = name,
        Location = Here,
        EndA = a,
        EndB = b,
        ReactanceOhm = ohm,
        QualityFactor = quality,
    };

    public static LinearLoad Load(string name, string bus, double kw, double kvar, LoadModel model = LoadModel.Parallel) => new()
    {
        Name = name,
        Location = Here,
        Bus = bus,
        PKw = kw,
        QKvar = kvar,
        Model = model,
    };

    public static Filter Filter(string name, string bus, FilterKind kind, double kvar, double kv, double tuned, double? quality) => new()
    {
        Name = name,
        Location = Here,
        Bus = bus,
        Kind = kind,
        RatedKvar = kvar,
        RatedKv = kv,
        TunedOrder = tuned,
        QualityFactor = quality,
    };

    public static Coupler Coupler(string name, string a, string b, bool closed = true) => new()
    {
        Name = name,
        Location = Here,
        EndA = a,
        EndB = b,
        Closed = closed,
    };

    public static Spectrum Spectrum(string name, params IEnumerable<(double Order, double Percent, double AngleDeg)> lines) =>
        new(name, [.. lines.Select(l => new SpectrumLine(l.Order, l.Percent, l.AngleDeg))], Here);

    public static Converter Converter(string name, string bus, double kw, double powerFactor, Spectrum spectrum) => new()
    {
        Name = name,
        Location = Here,
        Bus = bus,
        RatedKw = kw,
        PowerFactor = powerFactor,
        Spectrum = spectrum,
    };
}
