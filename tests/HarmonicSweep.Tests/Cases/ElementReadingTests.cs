using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>What the cells become: conversions of unit, splits, laws and states, each against a value worked out by hand.</summary>
public class ElementReadingTests
{
    /// <summary>S = sqrt3 V I: sqrt3 * 33 kV * 10 kA = 571.576766... MVA.</summary>
    [Fact]
    public void Short_circuit_current_becomes_power_at_nominal_voltage()
    {
        Supply supply = One<Supply>(PlantText.Good.Replace("supplies.csv", "500,,300,,", ",10,,4,"));
        Assert.Equal(571.5767664977295, supply.ShortCircuitMvaMax, 1e-10);
        Assert.Equal(571.5767664977295 * 0.4, supply.ShortCircuitMvaMin, 1e-10);
    }

    [Fact]
    public void Supply_without_a_minimum_keeps_its_maximum() =>
        Assert.Equal(500, One<Supply>(PlantText.Good.Replace("supplies.csv", "500,,300,,", "500,,,,")).ShortCircuitMvaMin);

    /// <summary>X = 2 pi 50 Hz * 2 mH = 0.2 pi ohm.</summary>
    [Fact]
    public void Inductance_becomes_reactance_at_the_fundamental() =>
        Assert.Equal(0.2 * Math.PI, One<SeriesReactor>(PlantText.Good.Replace("reactors.csv", "0.2,,40", ",2,40")).ReactanceOhm, 1e-15);

    [Theory]
    [InlineData("0.15,0.17,", 0.16)]
    [InlineData("0.15,,", 0.15)]
    [InlineData("0.15,0.17,0.2", 0.2)]
    [InlineData("0.15,,0.2", 0.2)]
    public void Generator_reactance_is_the_mean_or_x2(string cells, double expected) =>
        Assert.Equal(expected, One<Generator>(PlantText.Good.Replace("generators.csv", "0.15,0.17,", cells)).ReactancePu, 1e-15);

    /// <summary>12 kW of 1 MVA are 1.2 percent; 10 percent at X/R 15 is 10/sqrt(226) percent of resistance.</summary>
    [Fact]
    public void Transformer_resistance_comes_of_loss_or_ratio()
    {
        Transformer[] read = [.. PlantText.Good.ReadSound().Plant.Of<Transformer>()];
        Assert.Equal(10 / Math.Sqrt(226), read[0].ResistancePercent, 1e-14);
        Assert.Equal(1.2, read[1].ResistancePercent, 1e-14);
        Transformer blank = PlantText.Good.Replace("transformers.csv", "10,15,,Dyn11", "10,,,Dyn11").ReadSound().Plant.Of<Transformer>().First();
        Assert.Equal(10 / Math.Sqrt(101), blank.ResistancePercent, 1e-14);
    }

    /// <summary>cos 0.8 is sin 0.6: 400 kW draw 300 kvar.</summary>
    [Theory]
    [InlineData("400,0.8,", 300)]
    [InlineData("400,1,", 0)]
    [InlineData("400,,-50", -50)]
    [InlineData("0,0.8,", 0)]
    public void Reactive_power_of_a_load(string cells, double expected) =>
        Assert.Equal(expected, One<LinearLoad>(PlantText.Good.Replace("loads.csv", "350,0.92,", cells)).QKvar, 1e-10);

    [Theory]
    [InlineData("constant", "Constant")]
    [InlineData("SQRT", "SquareRoot")]
    [InlineData("line", "Line")]
    [InlineData("cable", "Cable")]
    public void Laws_without_numbers(string cell, string expected)
    {
        ResistanceLaw law = expected switch
        {
            "Constant" => ResistanceLaw.Constant,
            "SquareRoot" => ResistanceLaw.SquareRoot,
            "Line" => ResistanceLaw.Line,
            _ => ResistanceLaw.Cable,
        };
        Assert.Equal(law, One<SeriesReactor>(PlantText.Good.Replace("reactors.csv", "constant", cell)).Law);
    }

    [Theory]
    [InlineData("name,end_a,end_b,x_ohm,q_factor,resistance_law\nR1,MAIN,MAIN-B,0.2,40,power:0.9;0.1;1.5")]
    [InlineData("name;end_a;end_b;x_ohm;q_factor;resistance_law\nR1;MAIN;MAIN-B;0,2;40;\"power:0.9;0.1;1.5\"")]
    [InlineData("name;end_a;end_b;x_ohm;q_factor;resistance_law\nR1;MAIN;MAIN-B;0,2;40;\"power: 0,9; 0,1; 1,5\"")]
    [InlineData("name\tend_a\tend_b\tx_ohm\tq_factor\tresistance_law\nR1\tMAIN\tMAIN-B\t0,2\t40\tpower:0.9;0.1;1.5")]
    public void Power_law_in_every_kind_of_table(string table)
    {
        SeriesReactor reactor = One<SeriesReactor>(PlantText.Good.With("reactors.csv", table));
        Assert.Equal(ResistanceLaw.Power(0.9, 0.1, 1.5), reactor.Law);
        Assert.Equal(0.2, reactor.ReactanceOhm);
    }

    [Fact]
    public void Laws_with_numbers_of_other_columns()
    {
        CaseFile read = PlantText.Good.Replace("cables.csv", "1,cable,", "1,bessel,").ReadSound();
        Assert.Equal(ResistanceLaw.Eddy(0.1), read.Plant.Of<Transformer>().Last().Law);
        Assert.Equal(ResistanceLaw.Bessel(0.164, 50).Factor(13), read.Plant.Of<Line>().First(l => l.IsCable).Law.Factor(13), 1e-12);
    }

    [Theory]
    [InlineData(1e-9)]
    [InlineData(1e9)]
    public void Bessel_law_of_any_resistance_is_finite(double ohmPerKm) => Assert.True(double.IsFinite(
        One<Line>(PlantText.Good.Without("lines.csv").Replace("cables.csv", "0.164,0.105,370,1,cable", FormattableString.Invariant($"{ohmPerKm},0.105,370,1,bessel"))).Law.Factor(50)));

    [Fact]
    public void Spectrum_lines_ascend_whatever_their_order_and_near_integers_snap()
    {
        Spectrum read = One<Converter>(PlantText.Good.With("spectra.csv", "spectrum,order,percent\nvoltage,5,1\nsix pulse,7.0000000001,9\nsix pulse,2.5,1\nsix pulse,1,100\nsix pulse,5,20")).Spectrum;
        Assert.Equal([1, 2.5, 5, 7], read.Lines.Select(l => l.Order));
        Assert.Equal([100, 1, 20, 9], read.Lines.Select(l => l.Percent));
    }

    [Fact]
    public void States_of_every_kind_in_the_order_of_their_first_rows()
    {
        CaseFile read = PlantText.Good.With("states.csv", """
            state,element,setting
            all out,BANK,out
            weak,GRID,SC = min
            all out,BC,in
            weak,T1,tap=-2.5
            weak,LIGHTS,loading=0
            weak,PUMPS,loading=300
            weak,DRIVE,loading=62.5
            weak,BANK,steps=0
            strong,GRID,sc=max
            strong,BANK,steps=6
            number,GRID,sc=412.5
            """).ReadSound();
        Assert.Equal(["base", "all out", "weak", "strong", "number"], read.States.Select(s => s.Name));
        Assert.Empty(read.States[0].Settings);
        Assert.Equal([new ServiceSetting("BANK", false), new ServiceSetting("BC", true)], read.States[1].Settings);
        Assert.Equal(
            [
                new ShortCircuitSetting("GRID", ShortCircuitLevel.Min), new TapSetting("T1", -2.5), new LoadingSetting("LIGHTS", 0),
                new LoadingSetting("PUMPS", 300), new LoadingSetting("DRIVE", 62.5), new StepsSetting("BANK", 0),
            ],
            read.States[2].Settings);
        Assert.Equal([new ShortCircuitSetting("GRID", ShortCircuitLevel.Max), new StepsSetting("BANK", 6)], read.States[3].Settings);
        Assert.Equal([new ShortCircuitSetting("GRID", new ShortCircuitLevel(412.5, false))], read.States[4].Settings);
    }

    [Fact]
    public void Setting_with_a_decimal_comma_in_a_semicolon_table() => Assert.Equal(
        [new TapSetting("T1", -2.5)],
        PlantText.Good.With("states.csv", "state;element;setting\nlow;T1;tap=-2,5").ReadSound().States[1].Settings);

    [Fact]
    public void Source_column_of_any_table_is_carried()
    {
        CaseFile read = PlantText.Good
            .With("buses.csv", "bus,nominal_kv,source\nGRID-BUS,33,drawing\nMAIN,11,\nMAIN-B,11,\nLV,0.4,measured")
            .With("reactors.csv", "source,name,end_a,end_b,x_ohm,q_factor\nnameplate,R1,MAIN,MAIN-B,0.2,40").ReadSound();
        Assert.Equal(
            [
                new SourceEntry("GRID-BUS", "drawing", new SourceLocation("buses.csv", 2)),
                new SourceEntry("LV", "measured", new SourceLocation("buses.csv", 5)),
                new SourceEntry("R1", "nameplate", new SourceLocation("reactors.csv", 2)),
            ],
            read.Sources);
    }

    private static T One<T>(PlantText plant)
        where T : PlantElement => plant.ReadSound().Plant.Of<T>().Single();
}
