using HarmonicSweep.Cases;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Studies;
using Xunit;

namespace HarmonicSweep.Tests.Results;

/// <summary>CSV tables; expected values are those typed into <see cref="SampleResult"/>.</summary>
public class ResultCsvTests
{
    [Fact]
    public void Tables_lists_every_part_that_has_a_row()
    {
        string[] names = [.. ResultCsv.Tables(SampleResult.Case, SampleResult.Result).Select(t => t.Name)];
        Assert.Equal(
            [
                "states", "power_flow", "dead_buses", "dropped_injections", "injected_orders", "impedance", "resonances", "bank_resonances",
                "background_gain", "voltages", "distortion", "currents", "limits", "hand_checks", "screen_positions", "screen_resonances",
                "screen_worst", "screen_map", "findings", "assumed", "sources",
            ],
            names);
    }

    [Fact]
    public void Tables_leaves_empty_parts_out()
    {
        var result = new StudyResult { States = [new StateResult { State = "base" }] };
        CaseFile bare = SampleResult.Case with { Assumed = [], Sources = [], Findings = [] };
        Assert.Equal(["states"], ResultCsv.Tables(bare, result).Select(t => t.Name));
    }

    [Fact]
    public void Heads_are_lower_snake_case_and_unique()
    {
        foreach (CsvTable table in ResultCsv.Tables(SampleResult.Case, SampleResult.Result))
        {
            string[] heads = Text(table).Split('\n')[0].Split(',');
            Assert.Equal(heads.Distinct(StringComparer.Ordinal), heads);
            Assert.All(heads, h => Assert.Matches("^[a-z][a-z0-9_]*$", h));
        }
    }

    [Fact]
    public void Impedance_table_carries_units_and_leaves_open_points_blank()
    {
        string[] lines = Text("impedance").Split('\n');
        Assert.Equal("state,sequence,at_bus,from_bus,order,frequency_hz,r_ohm,x_ohm,z_ohm,angle_deg", lines[0]);
        Assert.StartsWith("base,positive,LV-1,LV-1,7,350,0.1,0.3333333333333333,0.348010216963", lines[1], StringComparison.Ordinal);
        Assert.Equal("base,positive,LV-1,LV-1,5,250,,,,", lines[2]);
        Assert.Equal("base,positive,LV-1,LV-1,11.3,565,,1,,", lines[3]);
        Assert.Equal("", Assert.Single(lines[4..]));
    }

    [Fact]
    public void Distortion_table_leaves_a_dead_bus_blank() =>
        Assert.EndsWith("base,SPARE,rss,,\n", Text("distortion"), StringComparison.Ordinal);

    [Fact]
    public void Text_with_separators_is_quoted()
    {
        string text = Text("screen_positions");
        Assert.Contains("\nbase,\"base, supply max, BANK 6/6\",BANK,LV-1,max,6,6,300,7.06,7.05,7,", text, StringComparison.Ordinal);
        Assert.Contains(",yes,104,118,141,112,610,yes,", text, StringComparison.Ordinal);
    }

    private static string Text(string name) =>
        Text(ResultCsv.Tables(SampleResult.Case, SampleResult.Result).Single(t => t.Name == name));

    private static string Text(CsvTable table)
    {
        using var writer = new StringWriter();
        table.Write(writer);
        return writer.ToString();
    }
}
