using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Generators in the power flow beyond what the twin tells: two on one node. Tolerance 1e-8: the power flow stops at 1e-10 of the largest power.</summary>
public sealed class GeneratorTests
{
    private static readonly Bus[] _buses = [PlantKit.Bus("A", 10), PlantKit.Bus("B", 10)];

    [Fact]
    public void Two_machines_on_one_node_beside_a_supply_deliver_their_own_power_at_the_common_voltage()
    {
        PlantElement[] rest = [PlantKit.Supply("S", "A", 100), PlantKit.Reactor("X", "A", "B", 1, 20), PlantKit.Load("L", "B", 5000, 2000)];
        StateResult two = ProductSide.Distortion(PlantKit.Plant(50, _buses, [.. rest, Machine("G1", 4, 1.5), Machine("G2", 6, 2)]));
        StateResult one = ProductSide.Distortion(PlantKit.Plant(50, _buses, [.. rest, Machine("G", 10, 3.5)]));
        Assert.InRange((Kv(two, "A") - Kv(one, "A")).Magnitude, 0, 1e-8);
        Assert.Equal(10.1, Kv(two, "B").Magnitude, 1e-8);
        Assert.Equal(1.5, Delivered(two, "G1").Real, 1e-7);
        Assert.Equal(2, Delivered(two, "G2").Real, 1e-7);
        Assert.Equal(Delivered(one, "G").Imaginary, Delivered(two, "G1").Imaginary + Delivered(two, "G2").Imaginary, 1e-7);
    }

    [Fact]
    public void Without_a_supply_the_largest_holds_its_bus_at_angle_zero_and_covers_the_rest()
    {
        // 5 MW drawn, 2 MW given by the smaller one; the p_mw of the larger is unused
        StateResult result = ProductSide.Distortion(PlantKit.Plant(50, _buses, PlantKit.Load("L", "B", 5000, 2000), Machine("G1", 4, 2), Machine("G2", 6, 0.1)));
        Assert.InRange((Kv(result, "B") - 10.1).Magnitude, 0, 1e-9);
        Assert.Equal(2, Delivered(result, "G1").Real, 1e-7);
        Assert.Equal(3, Delivered(result, "G2").Real, 1e-7);
        Assert.Equal(2, Delivered(result, "G1").Imaginary + Delivered(result, "G2").Imaginary, 1e-7);
        Assert.Equal(["A"], result.DeadBuses);
    }

    [Fact]
    public void Of_equal_machines_the_first_holds()
    {
        PlantElement[] elements =
        [
            PlantKit.Load("L", "A", 3000, 1000), PlantKit.Reactor("X", "A", "B", 1, 20), Machine("G1", 5, 1) with { Bus = "A", VoltagePu = 1.02 }, Machine("G2", 5, 1),
        ];
        StateResult result = ProductSide.Distortion(PlantKit.Plant(50, _buses, elements));
        Assert.InRange((Kv(result, "A") - 10.2).Magnitude, 0, 1e-9);
        Assert.Equal(1, Delivered(result, "G2").Real, 1e-7);
        Assert.Equal(10.1, Kv(result, "B").Magnitude, 1e-8);
    }

    private static Generator Machine(string name, double mva, double mw) => new()
    {
        Name = name,
        Location = PlantKit.Here,
        Bus = "B",
        RatedMva = mva,
        RatedKv = 10,
        PMw = mw,
        VoltagePu = 1.01,
        ReactancePu = 0.2,
    };

    private static Complex Kv(StateResult result, string bus) => result.Voltages.Single(v => v.Bus == bus && v.Order == 1).Kv;

    private static Complex Delivered(StateResult result, string generator)
    {
        HarmonicCurrent current = result.Currents.Single(c => c.Element == generator && c.Order == 1);
        return -Math.Sqrt(3) * Kv(result, current.Bus) * Complex.Conjugate(current.Ampere) / 1000;
    }
}
