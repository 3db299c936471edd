using System.Text;
using System.Text.Json;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Results;

/// <summary>The JSON document against the contract of its keys; expected values are those typed into <see cref="SampleResult"/>.</summary>
public class ResultJsonTests
{
    [Fact]
    public void Write_has_every_key_of_the_contract()
    {
        JsonElement root = Document();
        AssertKeys(root, "tool", "case", "states", "findings", "assumed");
        AssertKeys(root.GetProperty("tool"), "name", "version");
        AssertKeys(root.GetProperty("case"), "title", "folder", "hash");
        JsonElement state = root.GetProperty("states")[0];
        AssertKeys(
            state, "state", "power_flow", "dead_buses", "dropped_injections", "impedance", "resonances", "voltages", "thd_percent", "currents",
            "worst_backward_error");
        AssertKeys(state.GetProperty("power_flow")[0], "bus", "kv");
        AssertKeys(state.GetProperty("dropped_injections")[0], "element", "order");
        AssertKeys(state.GetProperty("impedance")[0], "sequence", "at", "from", "order", "ohm");
        AssertKeys(state.GetProperty("resonances")[0], "sequence", "bus", "kind", "order", "frequency_hz", "ohm", "quality_factor");
        AssertKeys(state.GetProperty("voltages")[0], "bus", "order", "kv", "kv_by_rule");
        AssertKeys(state.GetProperty("thd_percent")[0], "bus", "rule", "value");
        AssertKeys(state.GetProperty("currents")[0], "element", "bus", "order", "ampere", "ampere_by_rule");
        AssertKeys(root.GetProperty("findings")[0], "severity", "id", "file", "line", "column", "message", "remedy");
        AssertKeys(root.GetProperty("assumed")[0], "element", "column", "value", "why");
    }

    [Fact]
    public void Write_keeps_orders_as_given_and_numbers_to_the_last_bit()
    {
        JsonElement curve = Document().GetProperty("states")[0].GetProperty("impedance")[0];
        Assert.Equal("[7,5,11.3]", curve.GetProperty("order").GetRawText());
        Assert.Equal("0.3333333333333333", curve.GetProperty("ohm")[0][1].GetRawText());
        Assert.Equal(1.0 / 3, curve.GetProperty("ohm")[0][1].GetDouble());
    }

    [Fact]
    public void Write_open_or_not_finite_is_null()
    {
        JsonElement state = Document().GetProperty("states")[0];
        Assert.Equal(JsonValueKind.Null, state.GetProperty("impedance")[0].GetProperty("ohm")[1].ValueKind);
        Assert.Equal(JsonValueKind.Null, state.GetProperty("impedance")[0].GetProperty("ohm")[2].ValueKind);
        Assert.Equal(JsonValueKind.Null, state.GetProperty("thd_percent")[4].GetProperty("value").ValueKind);
        Assert.Equal(JsonValueKind.Null, state.GetProperty("gains")[0].GetProperty("gain")[1].ValueKind);
    }

    [Fact]
    public void Write_uses_the_words_of_the_contract()
    {
        JsonElement state = Document().GetProperty("states")[0];
        Assert.Equal("positive", state.GetProperty("impedance")[0].GetProperty("sequence").GetString());
        Assert.Equal(["parallel", "series"], state.GetProperty("resonances").EnumerateArray().Select(r => r.GetProperty("kind").GetString()));
        Assert.Equal(
            ["phasor", "arithmetic", "rss", "iec", "rss"],
            state.GetProperty("thd_percent").EnumerateArray().Select(d => d.GetProperty("rule").GetString()));
        Assert.Equal(
            ["exceeded", "within", "not_judged"],
            state.GetProperty("limits").EnumerateArray().Select(d => d.GetProperty("verdict").GetString()));
    }

    [Fact]
    public void Write_tells_rules_apart()
    {
        JsonElement voltage = Document().GetProperty("states")[0].GetProperty("voltages")[0];
        Assert.Equal("""{"phasor":0.005,"arithmetic":0.007,"rss":0.006,"iec":0.0065}""", voltage.GetProperty("kv_by_rule").GetRawText());
    }

    [Fact]
    public void Write_findings_name_file_line_and_column_and_null_without_a_file()
    {
        JsonElement findings = Document().GetProperty("findings");
        Assert.Equal("cables.csv", findings[0].GetProperty("file").GetString());
        Assert.Equal(4, findings[0].GetProperty("line").GetInt32());
        Assert.Equal("length_km", findings[0].GetProperty("column").GetString());
        Assert.Equal("warning", findings[0].GetProperty("severity").GetString());
        Assert.Equal(JsonValueKind.Null, findings[1].GetProperty("file").ValueKind);
        Assert.Equal(JsonValueKind.Null, findings[1].GetProperty("line").ValueKind);
    }

    [Fact]
    public void Write_screen_carries_positions_and_map()
    {
        JsonElement screen = Document().GetProperty("screen");
        Assert.True(screen.GetProperty("positions")[1].GetProperty("do_not_dwell").GetBoolean());
        Assert.Equal(JsonValueKind.Null, screen.GetProperty("positions")[0].GetProperty("nearest").ValueKind);
        Assert.Equal("[[[0,0.1],null],[[0.1,0.2],[1,0]]]", screen.GetProperty("maps")[0].GetProperty("ohm").GetRawText());
    }

    [Fact]
    public void Write_is_utf8_without_byte_order_mark_and_keeps_letters_readable()
    {
        using var stream = new MemoryStream();
        Plant plant = SampleResult.Plant;
        ResultJson.Write(stream, SampleResult.Case with { Plant = new Plant("Gießerei", 50, plant.Buses, plant.Elements) }, new StudyResult(), "1.2.3");
        Assert.StartsWith("{\"tool\":{\"name\":\"hsweep\",\"version\":\"1.2.3\"}", Encoding.UTF8.GetString(stream.ToArray()), StringComparison.Ordinal);
        Assert.Contains("Gießerei", Encoding.UTF8.GetString(stream.ToArray()), StringComparison.Ordinal);
    }

    [Fact]
    public void WriteRefusal_has_no_states_and_every_finding()
    {
        using var stream = new MemoryStream();
        ResultJson.WriteRefusal(stream, "cases/bad", SampleResult.Case.Findings, "1.2.3");
        JsonElement root = JsonDocument.Parse(stream.ToArray()).RootElement;
        AssertKeys(root, "tool", "case", "states", "findings", "assumed");
        Assert.Equal(0, root.GetProperty("states").GetArrayLength());
        Assert.Equal(1, root.GetProperty("findings").GetArrayLength());
        Assert.Equal("cases/bad", root.GetProperty("case").GetProperty("folder").GetString());
    }

    private static JsonElement Document()
    {
        using var stream = new MemoryStream();
        ResultJson.Write(stream, SampleResult.Case, SampleResult.Result, "1.2.3");
        return JsonDocument.Parse(stream.ToArray()).RootElement;
    }

    private static void AssertKeys(JsonElement element, params string[] keys)
    {
        foreach (string key in keys)
        {
            Assert.True(element.TryGetProperty(key, out _), $"key {key} is missing in {element.GetRawText()[..Math.Min(80, element.GetRawText().Length)]}");
        }
    }
}
