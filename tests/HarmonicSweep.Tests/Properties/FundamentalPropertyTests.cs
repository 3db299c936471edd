using System.Globalization;
using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>What ties the fundamental to the harmonic network, and the books that must balance.</summary>
public sealed class FundamentalPropertyTests
{
    public static TheoryData<int> Seeds => [.. Enumerable.Range(2000, 24)];

    /// <summary>
    /// In plants of supplies, branches, banks and filters only, the power-flow network is the network of Z(1): the voltages of
    /// the power flow are the superposition of the supplies' Norton currents E/Z1 through Z(1). Tolerance 1e-9 of nominal.
    /// </summary>
    [Theory]
    [MemberData(nameof(Seeds))]
    public void Z_at_order_one_is_the_power_flow_network_of_a_plant_without_loads_and_machines(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        Plant plant = new(
            grown.Plant.Title, grown.Plant.FrequencyHz, grown.Plant.Buses,
            grown.Plant.Elements.Where(e => e is not (LinearLoad or Motor or Generator or Converter)));
        PlantInState seen = new(plant, OperatingState.Base);
        StateResult check = CheckStudy.Run(ProductSide.Request(plant), progress: null, CancellationToken.None).States[0];
        var superposed = plant.Buses.ToDictionary(b => b.Name, _ => Complex.Zero);
        foreach (Supply supply in plant.Of<Supply>())
        {
            double nominal = plant.Bus(supply.Bus).NominalKv;
            Complex emf = Complex.FromPolarCoordinates(supply.VoltagePu * nominal, supply.AngleDeg * Math.PI / 180);
            Complex norton = emf / TwinShunts.SupplyImpedance(seen, supply, 1);
            foreach ((string at, IReadOnlyList<Complex?> ohm) in ProductSide.Column(plant, null, supply.Bus, Sequence.Positive, 1))
            {
                superposed[at] += norton * (ohm[0] ?? Complex.Zero);
            }
        }

        Assert.NotEmpty(check.PowerFlow);
        foreach (BusVoltage voltage in check.PowerFlow)
        {
            Assert.True(
                (voltage.Kv - superposed[voltage.Bus]).Magnitude <= 1e-9 * plant.Bus(voltage.Bus).NominalKv,
                string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {voltage.Bus}: {voltage.Kv} and {superposed[voltage.Bus]}"));
        }
    }

    /// <summary>
    /// Tellegen: at h = 1 the powers into all elements, summed over all their ends, are zero. Bound 1e-9 of the sum of magnitudes:
    /// the power flow stops at 1e-10 of the largest power at every bus.
    /// </summary>
    [Theory]
    [MemberData(nameof(Seeds))]
    public void Powers_into_all_elements_sum_to_zero(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        if (!new DenseTwin(grown.Plant).PowerFlow().IsPlain)
        {
            return;
        }

        StateResult result = ProductSide.Distortion(grown.Plant);
        Dictionary<string, Complex> kv = result.Voltages.Where(v => v.Order == 1).ToDictionary(v => v.Bus, v => v.Kv, StringComparer.Ordinal);
        Complex sum = Complex.Zero;
        double magnitudes = 0;
        foreach (HarmonicCurrent current in result.Currents.Where(c => c.Order == 1))
        {
            Complex mva = Math.Sqrt(3) * kv[current.Bus] * Complex.Conjugate(current.Ampere) / 1000;
            sum += mva;
            magnitudes += mva.Magnitude;
        }

        Assert.True(magnitudes > 0 && sum.Magnitude <= 1e-9 * magnitudes, string.Create(CultureInfo.InvariantCulture, $"seed {seed}: {sum} MVA of {magnitudes}"));
    }

    /// <summary>The study states its own worst backward error; 1e-12 leaves room for a few roundings a row, no more.</summary>
    [Theory]
    [MemberData(nameof(Seeds))]
    public void Backward_error_stays_near_machine_precision(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        StudyResult impedance = ImpedanceStudy.Run(
            ProductSide.Request(grown.Plant) with { Orders = [1, 2.6, 5, 49] }, progress: null, CancellationToken.None);
        Assert.InRange(impedance.States[0].WorstBackwardError, 0, 1e-12);
        if (new DenseTwin(grown.Plant).PowerFlow().IsPlain)
        {
            Assert.InRange(ProductSide.Distortion(grown.Plant).WorstBackwardError, 0, 1e-12);
        }
    }
}
