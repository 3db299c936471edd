using System.Text.Json;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>Bank screening in the JSON document.</summary>
internal static class JsonScreen
{
    public static void Write(Utf8JsonWriter json, ScreenResult screen)
    {
        json.WriteStartObject("screen");
        json.Number("near_orders", screen.NearOrders);
        json.Number("worst_backward_error", screen.WorstBackwardError);
        json.Objects("positions", screen.Positions, Position);
        json.Objects("worst", screen.Worst, static (j, w) =>
        {
            j.WriteString("bus", w.Bus);
            j.Number("order", w.Order);
            j.Number("percent", w.Percent);
            j.WriteString("state", w.State);
        });
        json.Objects("maps", screen.Maps, Map);
        json.WriteEndObject();
    }

    private static void Position(Utf8JsonWriter json, BankPosition position)
    {
        json.WriteString("base_state", position.BaseState);
        json.WriteString("state", position.State);
        json.WriteString("bank", position.Bank);
        json.WriteString("bus", position.Bus);
        json.WriteNumber("steps_in", position.StepsIn);
        json.WriteNumber("steps", position.Steps);
        json.WriteString("strength", position.Strength);
        json.Number("kvar_in", position.KvarIn);
        json.Number("hand_order", position.HandOrder);
        json.Objects("parallel_resonances", position.ParallelResonances, JsonState.Resonance);
        if (position.Nearest is { } nearest)
        {
            json.WriteStartObject("nearest");
            JsonState.Resonance(json, nearest);
            json.WriteEndObject();
        }
        else
        {
            json.WriteNull("nearest");
        }

        json.WriteBoolean("do_not_dwell", position.DoNotDwell);
        if (position.Loading is { } loading)
        {
            json.WriteStartObject("loading");
            json.Number("rms_voltage_percent", loading.RmsVoltagePercent);
            json.Number("crest_voltage_percent", loading.CrestVoltagePercent);
            json.Number("current_percent", loading.CurrentPercent);
            json.Number("kvar_percent", loading.KvarPercent);
            json.Number("current_a", loading.CurrentA);
            json.WriteBoolean("overloaded", loading.Overloaded);
            json.WriteEndObject();
        }
        else
        {
            json.WriteNull("loading");
        }

        json.Number("pcc_power_factor", position.PccPowerFactor);
        json.Number("pcc_kvar", position.PccKvar);
        json.Number("bus_voltage_percent", position.BusVoltagePercent);
        json.Number("bus_voltage_without_percent", position.BusVoltageWithoutPercent);
        json.Number("thd_percent", position.ThdPercent);
    }

    private static void Map(Utf8JsonWriter json, PositionMap map)
    {
        json.WriteString("base_state", map.BaseState);
        json.WriteString("bank", map.Bank);
        json.WriteString("bus", map.Bus);
        json.WriteString("strength", map.Strength);
        json.List("steps_in", map.StepsIn, static (j, s) => j.WriteNumberValue(s));
        json.Numbers("order", map.Orders);
        json.Numbers("injected_orders", map.InjectedOrders);
        json.List("ohm", map.Ohm, static (j, row) =>
        {
            j.WriteStartArray();
            foreach (System.Numerics.Complex? ohm in row)
            {
                j.Value(ohm);
            }

            j.WriteEndArray();
            j.Flush();
        });
    }
}
