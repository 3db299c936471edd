using HarmonicSweep.Cases.Schema;

namespace HarmonicSweep.Cases.Reading;

/// <summary>
/// Doubts about values that are legal but not likely: slips of unit above all. Thresholds are common practice, no published
/// source.
/// </summary>
internal static class Plausibility
{
    /// <summary>Ratings further than this from nominal are doubted.</summary>
    private const double RatedShare = 0.2;

    /// <summary>A rating at low voltage above this, MVA, is more likely kVA.</summary>
    private const double LargestLowVoltageMva = 10;

    /// <summary>A rating at any voltage above this, MVA, is more likely kVA.</summary>
    private const double LargestMva = 400;

    /// <summary>A generator above this, MVA, is more likely kVA.</summary>
    private const double LargestGeneratorMva = 400;

    /// <summary>Power at low voltage above this, kW, is more likely W.</summary>
    private const double LargestLowVoltageKw = 10_000;

    /// <summary>Power at any voltage above this, kW, is more likely W.</summary>
    private const double LargestKw = 200_000;

    private const double LongestCableKm = 60;
    private const double LongestLineKm = 1000;

    public static void RatedAgainstNominal(Row row, string column, double ratedKv, double nominalKv)
    {
        if (Math.Abs(ratedKv - nominalKv) > RatedShare * nominalKv)
        {
            row.Warning(
                Ids.RatedAgainstNominal, column, $"{row.Name}: {column} is {ratedKv.Plain()} kV at a bus of {nominalKv.Plain()} kV, more than 20 percent apart.",
                "check the rated voltage, the bus, and that kV is meant.");
        }
    }

    public static void TransformerRating(Row row, double ratedMva, double lvKv, double impedancePercent)
    {
        if (ratedMva > (lvKv <= 1 ? LargestLowVoltageMva : LargestMva))
        {
            row.Warning(
                Ids.LooksLikeKva, "rated_mva", $"{row.Name}: {ratedMva.Plain()} MVA is large for {lvKv.Plain()} kV; it looks like kVA.",
                $"write {(ratedMva / 1000).Plain()} if {ratedMva.Plain()} kVA is meant.");
        }

        if (impedancePercent is < 2 or > 25)
        {
            row.Warning(Ids.Impedance, "impedance_percent", $"{row.Name}: an impedance of {impedancePercent.Plain()} percent is outside the usual 2 to 25.", "check that it is percent on rated_mva.");
        }
    }

    public static void GeneratorRating(Row row)
    {
        double rated = row.Number("rated_mva");
        if (rated > LargestGeneratorMva)
        {
            row.Warning(
                Ids.LooksLikeKva, "rated_mva", $"{row.Name}: {rated.Plain()} MVA is large for a generator of a plant; it looks like kVA.",
                $"write {(rated / 1000).Plain()} if {rated.Plain()} kVA is meant.");
        }
    }

    public static void XOverR(Row row, string column, double value, double least, double most)
    {
        if (row.Has(column) && (value < least || value > most))
        {
            row.Warning(Ids.XOverR, column, $"{row.Name}: X/R is {value.Plain()}, outside the usual {least.Plain()} to {most.Plain()}.", "check that it is X over R at the fundamental.");
        }
    }

    public static void Length(Row row, bool isCable)
    {
        double length = row.Number("length_km");
        if (length > (isCable ? LongestCableKm : LongestLineKm))
        {
            row.Warning(
                Ids.LooksLikeMetres, "length_km", $"{row.Name}: {length.Plain()} km is long for {(isCable ? "a cable" : "a line")}; it looks like metres.",
                $"write {(length / 1000).Plain()} if {length.Plain()} m is meant.");
        }
    }

    public static void ShortCircuitPower(Row row, double mva)
    {
        if (mva is < 1 or > 200_000)
        {
            row.Warning(Ids.ShortCircuit, row.Has("sc_ka_max") ? "sc_ka_max" : "sc_mva_max", $"{row.Name}: a short-circuit power of {mva.Short()} MVA is outside the usual 1 to 200000.", "check that it is MVA (or kA) and not kVA, A or ohm.");
        }
    }

    public static void Kilowatt(Row row, string column, double kilowatt, double nominalKv)
    {
        if (kilowatt > (nominalKv <= 1 ? LargestLowVoltageKw : LargestKw))
        {
            row.Warning(
                Ids.LooksLikeWatt, column, $"{row.Name}: {kilowatt.Plain()} kW is large at {nominalKv.Plain()} kV; it looks like W.",
                $"write {(kilowatt / 1000).Plain()} if {kilowatt.Plain()} W is meant.");
        }
    }

    public static void Efficiency(Row row)
    {
        double efficiency = row.Number("efficiency_percent");
        if (efficiency <= 1)
        {
            row.Warning(
                Ids.LooksLikeFraction, "efficiency_percent", $"{row.Name}: an efficiency of {efficiency.Plain()} percent; it looks like a fraction.",
                $"write {(efficiency * 100).Plain()}.");
        }
    }

    public static void BankVoltage(Row row, double ratedKv, double nominalKv, double ratedKvar, double detuningPercent)
    {
        if (ratedKv == nominalKv)
        {
            return;
        }

        double delivered = ratedKvar * Math.Pow(nominalKv / ratedKv, 2) / (1 - detuningPercent / 100);
        string kvar = delivered.Short();
        row.Warning(
            Ids.BankVoltage, "rated_kv", $"{row.Name}: {ratedKvar.Plain()} kvar at {ratedKv.Plain()} kV delivers {kvar} kvar at the bus's {nominalKv.Plain()} kV.",
            "nothing needs mending if rated_kvar is that at rated_kv; else convert it.");
    }

    public static void FilterVoltage(Row row, double ratedKv, double nominalKv)
    {
        if (ratedKv == nominalKv)
        {
            return;
        }

        double kvar = row.Number("rated_kvar");
        string atNominal = (kvar * Math.Pow(nominalKv / ratedKv, 2)).Short();
        row.Warning(
            Ids.BankVoltage, "rated_kv", $"{row.Name}: {kvar.Plain()} kvar of capacitors at {ratedKv.Plain()} kV are {atNominal} kvar at the bus's {nominalKv.Plain()} kV.",
            "nothing needs mending if rated_kvar is that of the capacitors at rated_kv; else convert it.");
    }

    public static void BusVoltage(Row row)
    {
        double kv = row.Number("nominal_kv");
        if (kv is >= 100 and <= 1000 && kv is not (110 or 115 or 132 or 138 or 150 or 154 or 161 or 220 or 225 or 230 or 275 or 330 or 345 or 380 or 400 or 420 or 500 or 735 or 750 or 765))
        {
            row.Warning(Ids.LooksLikeVolts, "nominal_kv", $"{row.Name}: {kv.Plain()} kV is no usual transmission voltage; it looks like volts.", $"write {(kv / 1000).Plain()} if {kv.Plain()} V is meant.");
        }
    }
}
