using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <content>Couplers, transformers, lines and reactors.</content>
internal sealed partial class ElementBuilder
{
    private Coupler? Coupler(Row row)
    {
        if (!TwoBuses(row))
        {
            return null;
        }

        double a = NominalOf(row, "end_a");
        double b = NominalOf(row, "end_b");
        if (a != b)
        {
            row.Error(
                Ids.CouplerVoltages, "end_b", $"{row.Name}: it couples {a.Plain()} kV to {b.Plain()} kV; expected buses of one nominal_kv.",
                "connect buses of the same voltage, or put a transformer between them.");
        }

        return new Coupler
        {
            Name = row.Name,
            Location = row.Location,
            EndA = row.Text("end_a"),
            EndB = row.Text("end_b"),
            Closed = YesNo.Parse(row.Word("closed", "yes", "default"))!.Value,
        };
    }

    private Line? Line(Row row, bool isCable)
    {
        if (!TwoBuses(row))
        {
            return null;
        }

        double resistance = row.Number("resistance_ohm_km");
        double reactance = row.Number("reactance_ohm_km");
        if (resistance == 0 && reactance == 0)
        {
            row.Error(Ids.Rule, "reactance_ohm_km", $"{row.Name}: resistance and reactance are both 0; expected an impedance.", "give its impedance, or use a coupler.");
            return null;
        }

        double a = NominalOf(row, "end_a");
        double b = NominalOf(row, "end_b");
        if (Math.Max(a, b) > 1.2 * Math.Min(a, b))
        {
            row.Warning(Ids.Sides, "end_b", $"{row.Name}: it runs from {a.Plain()} kV to {b.Plain()} kV.", "check its ends: a line joins buses of one voltage.");
        }

        Plausibility.Length(row, isCable);
        ResistanceLaw? law = ResistanceLawCell.Read(row, isCable ? "cable" : "line", () => BesselOf(row, resistance));
        return law is null ? null : new Line
        {
            Name = row.Name,
            Location = row.Location,
            EndA = row.Text("end_a"),
            EndB = row.Text("end_b"),
            IsCable = isCable,
            LengthKm = row.Number("length_km"),
            ResistanceOhmPerKm = resistance,
            ReactanceOhmPerKm = reactance,
            CapacitanceNanofaradPerKm = row.Number("capacitance_nf_km", 0, "no capacitance given"),
            Circuits = (int)row.Number("circuits", 1, "default"),
            Law = law,
            ConductorMm2 = row.Find("conductor_mm2"),
            AmpacityA = row.Find("ampacity_a"),
        };
    }

    private ResistanceLaw BesselOf(Row row, double resistanceOhmPerKm)
    {
        if (resistanceOhmPerKm > 0)
        {
            // without a fundamental (its own error says so) nothing is built that could be used
            return double.IsNaN(fundamentalHz) ? ResistanceLaw.Constant : ResistanceLaw.Bessel(resistanceOhmPerKm, fundamentalHz);
        }

        row.Error(Ids.Rule, "resistance_ohm_km", $"{row.Name}: the law bessel needs a resistance above 0 ohm/km.", "give the resistance, or choose another law.");
        return ResistanceLaw.Constant;
    }

    private SeriesReactor? Reactor(Row row)
    {
        if (!row.ExactlyOne("x_ohm", "l_mh") || !TwoBuses(row) || ResistanceLawCell.Read(row, "constant") is not { } law)
        {
            return null;
        }

        return new SeriesReactor
        {
            Name = row.Name,
            Location = row.Location,
            EndA = row.Text("end_a"),
            EndB = row.Text("end_b"),
            ReactanceOhm = row.Find("x_ohm") ?? 2 * Math.PI * fundamentalHz * row.Number("l_mh") / 1000,
            QualityFactor = row.Number("q_factor"),
            Law = law,
        };
    }

    private Transformer? Transformer(Row row)
    {
        if (!TwoBuses(row, "hv_side", "lv_side"))
        {
            return null;
        }

        double hv = RatedKv(row, "hv_kv", "hv_side");
        double lv = RatedKv(row, "lv_kv", "lv_side");
        if (hv < lv)
        {
            row.Warning(Ids.Sides, "hv_side", $"{row.Name}: its high-voltage side has {hv.Plain()} kV and its low-voltage side {lv.Plain()} kV.", "exchange hv_side and lv_side, and their rated voltages.");
        }

        double rated = row.Number("rated_mva");
        double impedance = row.Number("impedance_percent");
        double? eddy = row.Find("eddy_loss_pu");
        double? resistance = ResistancePercent(row, rated, impedance);
        ResistanceLaw? law = ResistanceLawCell.Read(row, "constant", eddyLossPu: eddy);
        VectorGroup? group = Group(row);
        CheckNoLoad(row, rated);
        Plausibility.TransformerRating(row, rated, lv, impedance);
        return resistance is null || law is null || group is null ? null : new Transformer
        {
            Name = row.Name,
            Location = row.Location,
            EndA = row.Text("hv_side"),
            EndB = row.Text("lv_side"),
            RatedMva = rated,
            HvKv = hv,
            LvKv = lv,
            ImpedancePercent = impedance,
            ResistancePercent = resistance.Value,
            Group = group.Value,
            TapPercent = row.Number("tap_percent", 0, "middle tap"),
            Law = law,
            EddyLossPu = eddy,
            NoLoadLossKw = row.Number("no_load_loss_kw", 0, "no no-load loss given"),
            NoLoadCurrentPercent = row.Number("no_load_current_percent", 0, "no no-load current given"),
        };
    }

    private static double? ResistancePercent(Row row, double ratedMva, double impedancePercent)
    {
        if (row.Has("x_over_r") && row.Has("load_loss_kw"))
        {
            row.Error(Ids.ExactlyOne, "load_loss_kw", $"{row.Name}: both x_over_r and load_loss_kw are given; expected one of them.", "leave one of them blank.");
            return null;
        }

        if (row.Find("load_loss_kw") is { } loss)
        {
            double percent = loss / 1000 / ratedMva * 100;
            if (percent <= impedancePercent)
            {
                return percent;
            }

            row.Error(
                Ids.Rule, "load_loss_kw", FormattableString.Invariant($"{row.Name}: a load loss of {loss} kW is {percent:G4} percent of its rating, more than its impedance of {impedancePercent} percent."),
                "check the unit of load_loss_kw and rated_mva.");
            return null;
        }

        double xOverR = row.Number("x_over_r", 10, "neither x_over_r nor load_loss_kw given");
        Plausibility.XOverR(row, "x_over_r", xOverR, 1, 60);
        return impedancePercent / Math.Sqrt(1 + xOverR * xOverR);
    }

    private static VectorGroup? Group(Row row)
    {
        string text = row.Has("vector_group") ? row.Text("vector_group") : "Yy0";
        if (!row.Has("vector_group"))
        {
            row.Assume("vector_group", text, "no vector group given, so no phase shift");
        }

        if (VectorGroup.TryParse(text, out VectorGroup group))
        {
            return group;
        }

        row.Error(
            Ids.Rule, "vector_group",
            $"{row.Name}: '{text}' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy.",
            "write for example Dyn11 or YNd5.");
        return null;
    }

    private static void CheckNoLoad(Row row, double ratedMva)
    {
        if (row.Find("no_load_loss_kw") is { } loss && row.Find("no_load_current_percent") is { } current
            && current / 100 * ratedMva < loss / 1000)
        {
            row.Error(
                Ids.Rule, "no_load_current_percent",
                $"{row.Name}: a no-load current of {current.Plain()} percent is {(current * 10 * ratedMva).Plain()} kVA, less than the no-load loss of {loss.Plain()} kW.",
                "check both: the loss is part of the no-load power.");
        }
    }
}
