using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <content>Capacitor banks and filters.</content>
internal sealed partial class ElementBuilder
{
    private const string CoilLaw = "the resistance of its coil is held constant";

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
}
