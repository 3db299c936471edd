using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>Bank screening as CSV tables.</summary>
internal static class CsvScreen
{
    public static IEnumerable<CsvTable> Tables(ScreenResult screen) =>
    [
        Positions(screen),
        new CsvTable<(BankPosition Position, Resonance Resonance)>(
            "screen_resonances", "Parallel resonances at every bank position",
            screen.Positions.SelectMany(p => p.ParallelResonances.Select(r => (p, r))),
            new("state", x => x.Position.State),
            new("bank", x => x.Position.Bank),
            new("bus", x => x.Position.Bus),
            new("order", x => x.Resonance.Order),
            new("frequency_hz", x => x.Resonance.FrequencyHz),
            new("z_ohm", x => x.Resonance.Ohm),
            new("quality_factor", x => x.Resonance.QualityFactor),
            new("nearest_injected_order", x => x.Resonance.NearestInjectedOrder),
            new("distance_orders", x => x.Resonance.Distance)),
        new CsvTable<WorstValue>(
            "screen_worst", "Largest voltage of every bus over all positions (no order: THD, percent of V_1)", screen.Worst,
            new("bus", x => x.Bus),
            new("quantity", x => x.Order is null ? "THD_V" : "V_h"),
            new("order", x => x.Order),
            new("percent", x => x.Percent),
            new("state", x => x.State)),
        new CsvTable<MapPoint>(
            "screen_map", "Impedance at the bus of a bank over its positions",
            screen.Maps.SelectMany(m => Enumerable.Range(0, m.StepsIn.Count)
                .SelectMany(row => Enumerable.Range(0, m.Orders.Count).Select(column => new MapPoint(m, row, column)))),
            new("base_state", x => x.Map.BaseState),
            new("bank", x => x.Map.Bank),
            new("bus", x => x.Map.Bus),
            new("strength", x => x.Map.Strength),
            new("steps_in", x => x.Map.StepsIn[x.Row]),
            new("order", x => x.Map.Orders[x.Column]),
            new("r_ohm", x => x.Map.Ohm[x.Row][x.Column]?.Real),
            new("x_ohm", x => x.Map.Ohm[x.Row][x.Column]?.Imaginary),
            new("z_ohm", x => x.Map.Ohm[x.Row][x.Column]?.Magnitude)),
    ];

    private readonly record struct MapPoint(PositionMap Map, int Row, int Column);

    private static CsvTable<BankPosition> Positions(ScreenResult screen) => new(
        "screen_positions", "Every bank position at every supply strength", screen.Positions,
        new("base_state", x => x.BaseState),
        new("state", x => x.State),
        new("bank", x => x.Bank),
        new("bus", x => x.Bus),
        new("strength", x => x.Strength),
        new("steps_in", x => x.StepsIn),
        new("steps", x => x.Steps),
        new("kvar_in", x => x.KvarIn),
        new("hand_order", x => x.HandOrder),
        new("nearest_resonance_order", x => x.Nearest?.Order),
        new("nearest_injected_order", x => x.Nearest?.NearestInjectedOrder),
        new("distance_orders", x => x.Nearest?.Distance),
        new("resonance_z_ohm", x => x.Nearest?.Ohm),
        new("do_not_dwell", x => x.DoNotDwell),
        new("capacitor_rms_voltage_percent", x => x.Loading?.RmsVoltagePercent),
        new("capacitor_crest_voltage_percent", x => x.Loading?.CrestVoltagePercent),
        new("capacitor_current_percent", x => x.Loading?.CurrentPercent),
        new("capacitor_kvar_percent", x => x.Loading?.KvarPercent),
        new("capacitor_current_a", x => x.Loading?.CurrentA),
        new("overloaded", x => x.Loading is { } loading ? loading.Overloaded : default(CsvField)),
        new("pcc_power_factor", x => x.PccPowerFactor),
        new("pcc_kvar", x => x.PccKvar),
        new("bus_voltage_percent", x => x.BusVoltagePercent),
        new("bus_voltage_without_percent", x => x.BusVoltageWithoutPercent),
        new("thd_percent", x => x.ThdPercent));
}
