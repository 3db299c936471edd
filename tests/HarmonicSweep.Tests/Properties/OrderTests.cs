using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>An order within 1e-9 of an integer is that integer, and comes back as it was given.</summary>
public sealed class OrderTests
{
    private static readonly Bus[] _buses = [PlantKit.Bus("B", 10)];

    [Fact]
    public void Order_a_hair_off_an_integer_is_solved_as_the_integer_and_listed_as_given()
    {
        Plant plant = PlantKit.Plant(50, _buses, PlantKit.Supply("S", "B", 100), PlantKit.Bank("K", "B", 500, 10));
        double[] asked = [7 + 5e-10, 7, 5 - 4e-10, 5];
        StudyResult result = ImpedanceStudy.Run(ProductSide.Request(plant) with { Orders = asked }, progress: null, CancellationToken.None);
        ImpedanceCurve curve = Assert.Single(result.States[0].Impedance);
        Assert.Equal(asked, curve.Orders);
        Assert.Equal(curve.Ohm[1], curve.Ohm[0]);
        Assert.Equal(curve.Ohm[3], curve.Ohm[2]);
    }

    [Fact]
    public void Two_converters_a_hair_apart_meet_in_one_order()
    {
        Converter one = PlantKit.Converter("one", "B", 500, 0.9, PlantKit.Spectrum("exact", (1, 100, 0), (5, 20, 0)));
        Converter other = PlantKit.Converter("other", "B", 500, 0.9, PlantKit.Spectrum("hair", (1, 100, 0), (5 + 5e-10, 20, 0)));
        StateResult result = ProductSide.Distortion(PlantKit.Plant(50, _buses, PlantKit.Supply("S", "B", 100), one, other));
        HarmonicVoltage fifth = Assert.Single(result.Voltages, v => v.Order != 1);
        Assert.Equal(5, fifth.Order, 1e-9);

        // equal sources in phase: the phasor sum is the arithmetic one
        Assert.Equal(fifth.KvByRule.Arithmetic, fifth.KvByRule.Phasor, 1e-12);
        Assert.Equal(fifth.KvByRule.Arithmetic / Math.Sqrt(2), fifth.KvByRule.Rss, 1e-12);
    }

    [Fact]
    public void Triplen_injections_are_dropped_and_named()
    {
        Converter converter = PlantKit.Converter("C", "B", 500, 0.9, PlantKit.Spectrum("triplen", (1, 100, 0), (3, 60, 0), (5, 20, 0), (9, 10, 0)));
        StateResult result = ProductSide.Distortion(PlantKit.Plant(50, _buses, PlantKit.Supply("S", "B", 100), converter));
        Assert.Equal([("C", 3.0), ("C", 9.0)], result.DroppedInjections.Select(d => (d.Element, d.Order)));
        Assert.All(result.Voltages.Where(v => v.Order is 3 or 9), v => Assert.Equal(Complex.Zero, v.Kv));
    }
}
