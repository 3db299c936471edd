using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>The parts of the states as CSV tables.</summary>
internal static class CsvStates
{
    public static IEnumerable<CsvTable> Tables(IReadOnlyList<StateResult> states, double frequencyHz) =>
    [
        .. Operation(states),
        .. Impedance(states, frequencyHz),
        .. Distortion(states),
        Limits(states),
        HandChecks(states),
    ];

    /// <summary>A row of a state's list with the name of the state.</summary>
    private readonly record struct In<T>(string State, T Row);

    private static IEnumerable<In<T>> Rows<T>(IReadOnlyList<StateResult> states, Func<StateResult, IEnumerable<T>> list) =>
        states.SelectMany(s => list(s).Select(row => new In<T>(s.State, row)));

    private static CsvTable[] Operation(IReadOnlyList<StateResult> states) =>
    [
        new CsvTable<StateResult>(
            "states", "States and the quality of their solution", states,
            new("state", x => x.State),
            new("live_buses", x => x.PowerFlow.Count),
            new("dead_buses", x => x.DeadBuses.Count),
            new("injected_orders", x => x.InjectedOrders.Count),
            new("worst_backward_error", x => x.WorstBackwardError),
            new("current_balance_residual", x => x.CurrentBalanceResidual)),
        new CsvTable<In<BusVoltage>>(
            "power_flow", "Fundamental bus voltages", Rows(states, s => s.PowerFlow),
            new("state", x => x.State),
            new("bus", x => x.Row.Bus),
            new("voltage_kv", x => x.Row.Kv.Magnitude),
            new("angle_deg", x => x.Row.Kv.Degrees()),
            new("voltage_re_kv", x => x.Row.Kv.Real),
            new("voltage_im_kv", x => x.Row.Kv.Imaginary)),
        new CsvTable<In<string>>(
            "dead_buses", "Buses not tied to a source in service", Rows(states, s => s.DeadBuses),
            new("state", x => x.State), new("bus", x => x.Row)),
        new CsvTable<In<DroppedInjection>>(
            "dropped_injections", "Injections that were left out", Rows(states, s => s.DroppedInjections),
            new("state", x => x.State), new("element", x => x.Row.Element), new("order", x => x.Row.Order), new("why", x => x.Row.Why)),
        new CsvTable<In<double>>(
            "injected_orders", "Orders the converters inject", Rows(states, s => s.InjectedOrders),
            new("state", x => x.State), new("order", x => x.Row)),
    ];

    private static CsvTable[] Impedance(IReadOnlyList<StateResult> states, double frequencyHz) =>
    [
        new CsvTable<In<(ImpedanceCurve Curve, int Point)>>(
            "impedance", "Harmonic impedance",
            Rows(states, s => s.Impedance.SelectMany(c => Enumerable.Range(0, c.Orders.Count).Select(i => (c, i)))),
            new("state", x => x.State),
            new("sequence", x => x.Row.Curve.Sequence.Word()),
            new("at_bus", x => x.Row.Curve.At),
            new("from_bus", x => x.Row.Curve.From),
            new("order", x => x.Row.Curve.Orders[x.Row.Point]),
            new("frequency_hz", x => x.Row.Curve.Orders[x.Row.Point] * frequencyHz),
            new("r_ohm", x => x.Row.Curve.Ohm[x.Row.Point]?.Real),
            new("x_ohm", x => x.Row.Curve.Ohm[x.Row.Point]?.Imaginary),
            new("z_ohm", x => x.Row.Curve.Ohm[x.Row.Point]?.Magnitude),
            new("angle_deg", x => x.Row.Curve.Ohm[x.Row.Point]?.Degrees())),
        new CsvTable<In<Resonance>>(
            "resonances", "Parallel and series resonances", Rows(states, s => s.Resonances),
            new("state", x => x.State),
            new("sequence", x => x.Row.Sequence.Word()),
            new("bus", x => x.Row.Bus),
            new("kind", x => x.Row.Kind.Word()),
            new("order", x => x.Row.Order),
            new("frequency_hz", x => x.Row.FrequencyHz),
            new("z_ohm", x => x.Row.Ohm),
            new("quality_factor", x => x.Row.QualityFactor),
            new("nearest_injected_order", x => x.Row.NearestInjectedOrder),
            new("distance_orders", x => x.Row.Distance)),
        new CsvTable<In<BankResonance>>(
            "bank_resonances", "Hand formula of each bank beside the computed resonance", Rows(states, s => s.BankResonances),
            new("state", x => x.State),
            new("bank", x => x.Row.Bank),
            new("bus", x => x.Row.Bus),
            new("steps_in", x => x.Row.StepsIn),
            new("short_circuit_mva", x => x.Row.ShortCircuitMva),
            new("hand_order", x => x.Row.HandOrder),
            new("computed_order", x => x.Row.ComputedOrder)),
        new CsvTable<In<(BackgroundGain Gain, int Point)>>(
            "background_gain", "Voltage gain from the background at the PCC",
            Rows(states, s => s.Gains.SelectMany(g => Enumerable.Range(0, g.Orders.Count).Select(i => (g, i)))),
            new("state", x => x.State),
            new("from_bus", x => x.Row.Gain.From),
            new("bus", x => x.Row.Gain.Bus),
            new("order", x => x.Row.Gain.Orders[x.Row.Point]),
            new("frequency_hz", x => x.Row.Gain.Orders[x.Row.Point] * frequencyHz),
            new("gain_pu", x => x.Row.Gain.Gain[x.Row.Point])),
    ];

    private static CsvTable[] Distortion(IReadOnlyList<StateResult> states) =>
    [
        new CsvTable<In<HarmonicVoltage>>(
            "voltages", "Harmonic bus voltages", Rows(states, s => s.Voltages),
            [
                new("state", x => x.State),
                new("bus", x => x.Row.Bus),
                new("order", x => x.Row.Order),
                new("voltage_re_kv", x => x.Row.Kv.Real),
                new("voltage_im_kv", x => x.Row.Kv.Imaginary),
                .. ByRule<In<HarmonicVoltage>>("kv", x => x.Row.KvByRule),
                .. ByRule<In<HarmonicVoltage>>("percent_of_nominal", x => x.Row.PercentOfNominal),
            ]),
        new CsvTable<In<BusDistortion>>(
            "distortion", "Total harmonic distortion of voltage", Rows(states, s => s.Distortion),
            new("state", x => x.State),
            new("bus", x => x.Row.Bus),
            new("rule", x => x.Row.Rule.Word()),
            new("thd_percent_of_fundamental", x => x.Row.PercentOfFundamental),
            new("thd_percent_of_nominal", x => x.Row.PercentOfNominal)),
        new CsvTable<In<HarmonicCurrent>>(
            "currents", "Harmonic currents into the elements", Rows(states, s => s.Currents),
            [
                new("state", x => x.State),
                new("element", x => x.Row.Element),
                new("bus", x => x.Row.Bus),
                new("order", x => x.Row.Order),
                new("current_re_a", x => x.Row.Ampere.Real),
                new("current_im_a", x => x.Row.Ampere.Imaginary),
                .. ByRule<In<HarmonicCurrent>>("a", x => x.Row.AmpereByRule),
            ]),
    ];

    private static IEnumerable<CsvColumn<T>> ByRule<T>(string unit, Func<T, RuleValues> values) =>
        ResultWords.Rules.Select(rule => new CsvColumn<T>($"{rule.Word()}_{unit}", x => values(x)[rule]));

    private static CsvTable<In<LimitVerdict>> Limits(IReadOnlyList<StateResult> states) => new(
        "limits", "Limits judged", Rows(states, s => s.Limits),
        new("state", x => x.State),
        new("standard", x => x.Row.Standard),
        new("table", x => x.Row.Table),
        new("quantity", x => x.Row.Quantity),
        new("bus", x => x.Row.Bus),
        new("order", x => x.Row.Order),
        new("value_percent", x => x.Row.ValuePercent),
        new("limit_percent", x => x.Row.LimitPercent),
        new("verdict", x => x.Row.Verdict.Word()),
        new("why", x => x.Row.Why),
        new("basis", x => x.Row.Basis));

    private static CsvTable<In<HandCheck>> HandChecks(IReadOnlyList<StateResult> states) => new(
        "hand_checks", "Hand formulas beside computed values", Rows(states, s => s.HandChecks),
        new("state", x => x.State),
        new("name", x => x.Row.Name),
        new("subject", x => x.Row.Subject),
        new("formula", x => x.Row.Formula),
        new("hand", x => x.Row.Hand),
        new("computed", x => x.Row.Computed),
        new("unit", x => x.Row.Unit),
        new("relative_difference", x => x.Row.RelativeDifference),
        new("relative_tolerance", x => x.Row.Tolerance),
        new("agrees", x => x.Row.Agrees));
}
