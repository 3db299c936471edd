using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <content>Supplies and generators.</content>
internal sealed partial class ElementBuilder
{
    private const string MachineLaw = "common practice for machines";

    private Supply? Supply(Row row)
    {
        double nominal = NominalOf(row);
        double? most = ShortCircuit(row, "sc_mva_max", "sc_ka_max", nominal, required: true);
        double? least = ShortCircuit(row, "sc_mva_min", "sc_ka_min", nominal, required: false);
        if (most is not { } maximum)
        {
            return null;
        }

        if (least is null)
        {
            row.Assume("sc_mva_min", maximum.Plain(), "no minimum given: the lowest resonances of a weak grid are not seen");
        }
        else if (least > maximum)
        {
            row.Error(Ids.Rule, row.Has("sc_ka_min") ? "sc_ka_min" : "sc_mva_min", $"{row.Name}: the smallest short-circuit power, {least.Value.Short()} MVA, exceeds the largest, {maximum.Short()} MVA.", "exchange them.");
        }

        row.Assume("resistance_law", "constant", "the resistance of a supply is held constant");
        double xOverR = row.Number("x_over_r", 10, "no X/R given");
        Plausibility.XOverR(row, "x_over_r", xOverR, 1, 50);
        Plausibility.ShortCircuitPower(row, maximum);
        Spectrum? background = null;
        if (row.Has("background_spectrum") && !spectra.TryGetValue(row.Text("background_spectrum"), out background))
        {
            UnknownSpectrum(row, "background_spectrum");
        }

        return new Supply
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            VoltagePu = row.Number("voltage_pu", 1, "default"),
            AngleDeg = row.Number("angle_deg", 0, "default"),
            ShortCircuitMvaMax = maximum,
            ShortCircuitMvaMin = least ?? maximum,
            XOverR = xOverR,
            Background = background,
            DemandMva = row.Find("demand_mva"),
        };
    }

    private static double? ShortCircuit(Row row, string mva, string ka, double nominalKv, bool required)
    {
        if (row.Has(mva) && row.Has(ka))
        {
            row.Error(Ids.ExactlyOne, ka, $"{row.Name}: both {mva} and {ka} are given; expected one of them.", "leave one of them blank.");
            return null;
        }

        if (required && !row.Has(mva) && !row.Has(ka))
        {
            row.Error(
                Ids.ExactlyOne, mva,
                $"{row.Name}: neither {mva} nor {ka} is given; without an impedance it is an ideal voltage source, which has no admittance to enter.",
                "give the short-circuit power in MVA or the short-circuit current in kA.");
            return null;
        }

        return row.Find(mva) ?? (row.Find(ka) is { } current ? Math.Sqrt(3) * nominalKv * current : null);
    }

    private Generator Generator(Row row)
    {
        string grounding = row.Text("grounding").ToLowerInvariant();
        if (grounding is not ("" or "open"))
        {
            row.Error(
                Ids.LaterModel, "grounding", $"{row.Name}: grounding is '{row.Text("grounding")}', but its model is not in this version; expected open or a blank cell.",
                "leave the cell blank or write open; positive and negative sequence do not depend on it.");
        }

        double direct = row.Number("xd2_pu");
        if (row.Has("x2_pu") && row.Has("xq2_pu"))
        {
            row.Note(Ids.NoEffect, "xq2_pu", $"{row.Name}: xq2_pu has no effect where x2_pu is given.", "nothing needs mending; x2_pu is what harmonics see.");
        }

        row.Assume("resistance_law", "sqrt", MachineLaw);
        Plausibility.GeneratorRating(row);
        double quadrature = row.Has("x2_pu") ? direct : row.Number("xq2_pu", direct, "xq2_pu = xd2_pu");
        return new Generator
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            RatedMva = row.Number("rated_mva"),
            RatedKv = RatedKv(row),
            PMw = row.Number("p_mw", 0, "default"),
            VoltagePu = row.Number("voltage_pu", 1, "default"),
            ReactancePu = row.Find("x2_pu") ?? (direct + quadrature) / 2,
            ResistancePu = row.Number("ra_pu", 0, "no armature resistance given"),
        };
    }
}
