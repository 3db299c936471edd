using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <content>Supplies, generators, loads, motors, banks, filters and converters.</content>
internal sealed partial class ElementBuilder
{
    private const string MachineLaw = "common practice for machines";
    private const string CoilLaw = "the resistance of its coil is held constant";

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

    private LinearLoad? Load(Row row)
    {
        if (!row.ExactlyOne("power_factor", "q_kvar"))
        {
            return null;
        }

        double active = row.Number("p_kw");
        double reactive = row.Find("q_kvar") ?? active * Math.Sqrt(1 - Math.Pow(row.Number("power_factor"), 2)) / row.Number("power_factor");
        LoadModel model = row.Word("model", "parallel", "default load model: near a resonance it decides the height") switch
        {
            "series" => LoadModel.Series,
            "growing" => LoadModel.Growing,
            "cigre" => LoadModel.Cigre,
            "none" => LoadModel.None,
            _ => LoadModel.Parallel,
        };
        if (model == LoadModel.Cigre && (active <= 0 || reactive <= 0.74 / 6.7 * active))
        {
            row.Error(
                Ids.Rule, "model", $"{row.Name}: the model cigre needs P above 0 and Q/P above 0.1104 (0.74/6.7); P is {active.Plain()} kW, Q is {reactive.Short()} kvar.",
                "use the model parallel, or check the power factor.");
        }

        Plausibility.Kilowatt(row, "p_kw", active, NominalOf(row));
        return new LinearLoad
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            PKw = active,
            QKvar = reactive,
            Model = model,
            MotorSharePercent = row.Number("motor_share_percent", 0, "no motor share given"),
        };
    }

    private Motor Motor(Row row)
    {
        Plausibility.Efficiency(row);
        row.Assume("resistance_law", "sqrt", MachineLaw);
        Plausibility.Kilowatt(row, "rated_kw", row.Number("rated_kw"), NominalOf(row));
        return new Motor
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            RatedKw = row.Number("rated_kw"),
            RatedKv = RatedKv(row),
            EfficiencyPercent = row.Number("efficiency_percent"),
            PowerFactor = row.Number("power_factor"),
            LoadingPercent = row.Number("loading_percent", 100, "default"),
            LockedRotorPu = row.Number("locked_rotor_pu", 6, "usual value"),
            LockedRotorPowerFactor = row.Number("locked_rotor_pf", 0.2, "usual value"),
            Count = (int)row.Number("count", 1, "default"),
        };
    }

    private CapacitorBank Bank(Row row)
    {
        double nominal = NominalOf(row);
        double rated = row.Number("rated_kv", nominal, NominalKv);
        int steps = (int)row.Number("steps", 1, "default");
        int stepsIn = (int)row.Number("steps_in", steps, "all steps");
        if (stepsIn > steps)
        {
            row.Error(Ids.OutOfRange, "steps_in", $"{row.Name}: steps_in is {((double)stepsIn).Plain()}; expected a whole number from 0 to {((double)steps).Plain()}, its steps.", "correct steps_in or steps.");
        }

        double detuning = row.Find("detuning_percent") ?? 0;
        if (detuning > 0 && !row.Has("reactor_q"))
        {
            row.Error(Ids.Rule, "reactor_q", $"{row.Name}: it has detuning_percent {detuning.Plain()} but no reactor_q; expected a number above 0.", "give X/R of the reactor at the fundamental (maker's sheet).");
        }

        if (row.Has("reactor_q") && !row.Has("detuning_percent"))
        {
            row.Warning(Ids.NoEffect, "reactor_q", $"{row.Name}: reactor_q has no effect without detuning_percent: the bank is taken without a reactor.", "give detuning_percent, or leave reactor_q blank.");
        }

        if (detuning > 0)
        {
            row.Assume("resistance_law", "constant", CoilLaw);
        }

        double loss = row.Number("loss_w_per_kvar", 0, "no loss given");
        Plausibility.BankVoltage(row, rated, nominal, row.Number("rated_kvar"), detuning);
        return new CapacitorBank
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            RatedKvar = row.Number("rated_kvar"),
            RatedKv = rated,
            Steps = steps,
            StepsIn = stepsIn,
            Connection = ConnectionOf(row),
            DetuningPercent = detuning,
            ReactorQ = row.Find("reactor_q"),
            LossWPerKvar = loss,
            TolerancePercent = row.Find("tolerance_percent"),
        };
    }

    private Filter Filter(Row row)
    {
        FilterKind kind = row.Text("kind").ToLowerInvariant() switch
        {
            "single_tuned" => FilterKind.SingleTuned,
            "high_pass_2" => FilterKind.HighPass2,
            "high_pass_3" => FilterKind.HighPass3,
            "c_type" => FilterKind.CType,
            _ => FilterKind.DoubleTuned,
        };
        double tuned = row.Number("tuned_order");
        bool hasCoilResistance = kind is FilterKind.SingleTuned or FilterKind.DoubleTuned;
        if (hasCoilResistance && !row.Has("q_factor"))
        {
            row.Error(Ids.Rule, "q_factor", $"{row.Name}: a {row.Text("kind")} filter needs q_factor; expected a number above 0.", "give the quality factor of its coil.");
        }
        else if (!hasCoilResistance && !row.Has("q_factor") && !row.Has("damping_ohm"))
        {
            row.Error(Ids.Rule, "q_factor", $"{row.Name}: neither q_factor nor damping_ohm is given; expected one of them.", "give the damping resistance or the quality factor.");
        }

        if (kind == FilterKind.SingleTuned && row.Has("damping_ohm"))
        {
            row.Error(Ids.Rule, "damping_ohm", $"{row.Name}: a single_tuned filter has no damping resistor; expected a blank cell.", "leave damping_ohm blank, or choose a damped kind.");
        }

        if (!hasCoilResistance && row.Has("q_factor") && row.Has("damping_ohm"))
        {
            row.Note(Ids.NoEffect, "q_factor", $"{row.Name}: q_factor has no effect where damping_ohm is given.", "nothing needs mending; damping_ohm is the damping resistor.");
        }

        if (kind == FilterKind.CType && tuned <= 1)
        {
            row.Error(Ids.OutOfRange, "tuned_order", $"{row.Name}: tuned_order is {tuned.Plain()}; expected a number above 1 for a c_type filter.", "correct the order.");
        }

        double? second = row.Find("second_order");
        if (kind == FilterKind.DoubleTuned ? !(second > tuned) : second is not null)
        {
            row.Error(
                Ids.Rule, "second_order",
                kind == FilterKind.DoubleTuned ? $"{row.Name}: second_order is {(second is { } order ? order.Plain() : "blank")}; expected a number above its tuned_order, {tuned.Plain()}, for a double_tuned filter."
                    : $"{row.Name}: second_order is for double_tuned filters only; expected a blank cell.",
                kind == FilterKind.DoubleTuned ? "give the upper of its two orders." : "leave it blank.");
        }

        double nominal = NominalOf(row);
        double rated = row.Number("rated_kv", nominal, NominalKv);
        Plausibility.FilterVoltage(row, rated, nominal);
        row.Assume("resistance_law", "constant", CoilLaw);
        return new Filter
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            Kind = kind,
            RatedKvar = row.Number("rated_kvar"),
            RatedKv = rated,
            TunedOrder = tuned,
            SecondOrder = second,
            QualityFactor = row.Find("q_factor"),
            DampingOhm = row.Find("damping_ohm"),
            Connection = ConnectionOf(row),
        };
    }

    private Converter? Converter(Row row)
    {
        bool rated = row.ExactlyOne("rated_kw", "rated_a");
        Spectrum? spectrum = null;
        if (!row.Has("spectrum"))
        {
            row.Error(Ids.BlankCell, "spectrum", $"{row.Name}: spectrum is blank; expected the name of a spectrum of spectra.csv.", "give the maker's spectrum, or a measured one.");
        }
        else if (!spectra.TryGetValue(row.Text("spectrum"), out spectrum))
        {
            UnknownSpectrum(row, "spectrum");
        }
        else
        {
            CheckFundamental(row, spectrum);
        }

        if (!rated || spectrum is null)
        {
            return null;
        }

        if (row.Find("rated_kw") is { } kilowatt)
        {
            Plausibility.Kilowatt(row, "rated_kw", kilowatt, NominalOf(row));
        }

        return new Converter
        {
            Name = row.Name,
            Location = row.Location,
            Bus = row.Text("bus"),
            RatedKw = row.Find("rated_kw"),
            RatedA = row.Find("rated_a"),
            PowerFactor = row.Number("power_factor"),
            Spectrum = spectrum,
            PhaseShiftDeg = row.Number("phase_shift_deg", 0, "no transformer of its own"),
            LoadingPercent = row.Number("loading_percent", 100, "default"),
            Diversity = row.Number("diversity", 1, "default"),
        };
    }

    private void CheckFundamental(Row row, Spectrum spectrum)
    {
        double? percent = spectrum.Lines.Where(l => l.Order == 1).Select(l => (double?)l.Percent).FirstOrDefault();
        if ((percent is { } given && Math.Abs(given - 100) <= 1e-9) || tables.LeftOut.Contains((Tables.Spectra.File, spectrum.Name)))
        {
            return;
        }

        string found = percent is null ? "has no line of order 1" : $"has {percent.Value.Plain()} percent at order 1";
        row.Error(
            Ids.NoFundamental, "spectrum", $"{row.Name}: its spectrum {spectrum.Name} ({spectrum.Location}) {found}; expected 100 percent of the fundamental current.",
            $"add the line {spectrum.Name},1,100,0 to spectra.csv, and give the others in percent of it.");
    }

    private void UnknownSpectrum(Row row, string column)
    {
        if (tables.Incomplete.Contains(Tables.Spectra.File) || tables.LeftOut.Contains((Tables.Spectra.File, row.Text(column))))
        {
            // it may stand in lines that could not be read, whose own errors say so
            return;
        }

        row.Error(
            Ids.UnknownSpectrum, column, $"{row.Name}: {column} '{row.Text(column).Shown()}' is not in spectra.csv; expected the name of a spectrum of spectra.csv.",
            NearestName.Suggest(row.Text(column), spectra.Keys, "add its lines to spectra.csv."));
    }
}
