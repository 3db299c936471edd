using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <content>Loads, motors and converters.</content>
internal sealed partial class ElementBuilder
{
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
