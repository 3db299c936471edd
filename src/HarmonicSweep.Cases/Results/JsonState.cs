using System.Text.Json;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>One state of the JSON contract. Every list is present, empty where a command does not compute it.</summary>
internal static class JsonState
{
    public static void Write(Utf8JsonWriter json, StateResult state)
    {
        json.WriteString("state", state.State);
        WriteOperation(json, state);
        WriteImpedance(json, state);
        WriteDistortion(json, state);
        json.Objects("limits", state.Limits, Limit);
        json.Objects("hand_checks", state.HandChecks, HandCheck);
        json.Number("worst_backward_error", state.WorstBackwardError);
        json.Number("current_balance_residual", state.CurrentBalanceResidual);
        json.Flush();
    }

    private static void WriteOperation(Utf8JsonWriter json, StateResult state)
    {
        json.Objects("power_flow", state.PowerFlow, static (j, v) =>
        {
            j.WriteString("bus", v.Bus);
            j.Phasor("kv", v.Kv);
        });
        json.Words("dead_buses", state.DeadBuses);
        json.Objects("dropped_injections", state.DroppedInjections, static (j, d) =>
        {
            j.WriteString("element", d.Element);
            j.Number("order", d.Order);
            j.WriteString("why", d.Why);
        });
        json.Numbers("injected_orders", state.InjectedOrders);
    }

    private static void WriteImpedance(Utf8JsonWriter json, StateResult state)
    {
        json.Objects("impedance", state.Impedance, static (j, curve) =>
        {
            j.WriteString("sequence", curve.Sequence.Word());
            j.WriteString("at", curve.At);
            j.WriteString("from", curve.From);
            j.Numbers("order", curve.Orders);
            j.List("ohm", curve.Ohm, static (k, ohm) => k.Value(ohm));
            j.Flush();
        });
        json.Objects("resonances", state.Resonances, Resonance);
        json.Objects("bank_resonances", state.BankResonances, static (j, b) =>
        {
            j.WriteString("bank", b.Bank);
            j.WriteString("bus", b.Bus);
            j.WriteNumber("steps_in", b.StepsIn);
            j.Number("short_circuit_mva", b.ShortCircuitMva);
            j.Number("hand_order", b.HandOrder);
            j.Number("computed_order", b.ComputedOrder);
        });
        json.Objects("gains", state.Gains, static (j, g) =>
        {
            j.WriteString("from", g.From);
            j.WriteString("bus", g.Bus);
            j.Numbers("order", g.Orders);
            j.List("gain", g.Gain, static (k, gain) => k.Value(gain));
            j.Flush();
        });
    }

    private static void WriteDistortion(Utf8JsonWriter json, StateResult state)
    {
        json.Objects("voltages", state.Voltages, static (j, v) =>
        {
            j.WriteString("bus", v.Bus);
            j.Number("order", v.Order);
            j.Phasor("kv", v.Kv);
            j.ByRule("kv_by_rule", v.KvByRule);
            j.ByRule("percent_of_nominal", v.PercentOfNominal);
        });
        json.Objects("thd_percent", state.Distortion, static (j, d) =>
        {
            j.WriteString("bus", d.Bus);
            j.WriteString("rule", d.Rule.Word());
            j.Number("value", d.PercentOfFundamental);
            j.Number("percent_of_nominal", d.PercentOfNominal);
        });
        json.Objects("currents", state.Currents, static (j, c) =>
        {
            j.WriteString("element", c.Element);
            j.WriteString("bus", c.Bus);
            j.Number("order", c.Order);
            j.Phasor("ampere", c.Ampere);
            j.ByRule("ampere_by_rule", c.AmpereByRule);
        });
    }

    /// <summary>The properties of a resonance.</summary>
    public static void Resonance(Utf8JsonWriter json, Resonance resonance)
    {
        json.WriteString("sequence", resonance.Sequence.Word());
        json.WriteString("bus", resonance.Bus);
        json.WriteString("kind", resonance.Kind.Word());
        json.Number("order", resonance.Order);
        json.Number("frequency_hz", resonance.FrequencyHz);
        json.Number("ohm", resonance.Ohm);
        json.Number("quality_factor", resonance.QualityFactor);
        json.Number("nearest_injected_order", resonance.NearestInjectedOrder);
        json.Number("distance_orders", resonance.Distance);
    }

    private static void Limit(Utf8JsonWriter json, LimitVerdict limit)
    {
        json.WriteString("standard", limit.Standard);
        json.WriteString("table", limit.Table);
        json.WriteString("basis", limit.Basis);
        json.WriteString("quantity", limit.Quantity);
        json.WriteString("bus", limit.Bus);
        json.Number("order", limit.Order);
        json.Number("value_percent", limit.ValuePercent);
        json.Number("limit_percent", limit.LimitPercent);
        json.WriteString("verdict", limit.Verdict.Word());
        json.WriteString("why", limit.Why);
    }

    private static void HandCheck(Utf8JsonWriter json, HandCheck check)
    {
        json.WriteString("name", check.Name);
        json.WriteString("subject", check.Subject);
        json.WriteString("formula", check.Formula);
        json.Number("hand", check.Hand);
        json.Number("computed", check.Computed);
        json.WriteString("unit", check.Unit);
        json.Number("tolerance", check.Tolerance);
        json.WriteBoolean("agrees", check.Agrees);
    }
}
