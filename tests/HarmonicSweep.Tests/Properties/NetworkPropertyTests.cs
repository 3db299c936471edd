using System.Globalization;
using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>
/// What holds for every linear passive network, whatever its model: reciprocity, passivity, independence of the order in which
/// buses and elements are written. On random plants; the bound is that of the twin tests (1e-10 and the rounding of the stamps).
/// </summary>
public sealed class NetworkPropertyTests
{
    private static readonly double[] _orders = [1, 2.6, 5, 7, 13, 37];

    public static TheoryData<int> Seeds => [.. Enumerable.Range(1000, 24)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Transfer_impedance_one_way_in_positive_equals_the_other_way_in_negative_sequence(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        DenseTwin twin = new(grown.Plant);
        TwinMatrix[] scale = [.. _orders.Select(h => twin.Matrix(h, 1))];
        string[] buses = [.. grown.Plant.Buses.Select(b => b.Name)];
        var positive = buses.ToDictionary(b => b, b => ProductSide.Column(grown.Plant, null, b, Sequence.Positive, _orders));
        var negative = buses.ToDictionary(b => b, b => ProductSide.Column(grown.Plant, null, b, Sequence.Negative, _orders));
        foreach (string i in buses)
        {
            foreach (string k in buses)
            {
                for (int n = 0; n < _orders.Length; n++)
                {
                    Complex? one = positive[k][i][n];
                    Complex? other = negative[i][k][n];
                    string where = string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {i} from {k}, h = {_orders[n]}: {one} and {other}");
                    Assert.True(one.HasValue == other.HasValue, where);
                    if (one is { } z)
                    {
                        double bound = 1e-10 * z.Magnitude + 64 * scale[n].RoundingOhm(i, k);
                        Assert.True((z - other!.Value).Magnitude <= bound, where);
                    }
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Driving_point_resistance_is_never_negative(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        StudyResult result = ImpedanceStudy.Run(
            ProductSide.Request(grown.Plant) with { Orders = _orders }, progress: null, CancellationToken.None);
        DenseTwin twin = new(grown.Plant);
        foreach (ImpedanceCurve curve in result.States[0].Impedance)
        {
            for (int n = 0; n < _orders.Length; n++)
            {
                if (curve.Ohm[n] is { } z)
                {
                    // an isolated lossless part has R = 0 exactly: rounding of the stamps alone may show
                    double rounding = 64 * twin.Matrix(_orders[n], 1).RoundingOhm(curve.At, curve.At);
                    Assert.True(z.Real >= -rounding, string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {curve.At}, h = {_orders[n]}: {z}"));
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Order_of_buses_and_elements_changes_nothing(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        DenseTwin twin = new(grown.Plant);
        if (!twin.PowerFlow().IsPlain)
        {
            return;
        }

        Plant turned = new(grown.Plant.Title, grown.Plant.FrequencyHz, grown.Plant.Buses.Reverse(), grown.Plant.Elements.Reverse());
        StateResult one = ProductSide.Distortion(grown.Plant);
        StateResult other = ProductSide.Distortion(turned);
        Assert.Equal(one.Voltages.Count, other.Voltages.Count);
        Dictionary<(string, double), HarmonicVoltage> listed = other.Voltages.ToDictionary(v => (v.Bus, v.Order));
        foreach (HarmonicVoltage voltage in one.Voltages)
        {
            HarmonicVoltage same = listed[(voltage.Bus, voltage.Order)];
            double bound = 1e-10 * Math.Max(1, voltage.Order) * voltage.KvByRule.Arithmetic + 1e-11 * grown.Plant.Bus(voltage.Bus).NominalKv;
            Assert.True(
                (voltage.Kv - same.Kv).Magnitude <= bound,
                string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {voltage.Bus}, h = {voltage.Order}: {voltage.Kv} and {same.Kv}"));
        }
    }

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Voltages_of_several_sources_add_up_from_those_of_each_alone(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        if (!new DenseTwin(grown.Plant).PowerFlow().IsPlain)
        {
            return;
        }

        StateResult together = ProductSide.Distortion(grown.Plant);
        var sum = new Dictionary<(string, double), Complex>();
        foreach (PlantElement source in grown.Plant.Elements.Where(e => e is Converter or Supply { Background: not null }))
        {
            foreach (HarmonicVoltage voltage in ProductSide.Distortion(Alone(grown.Plant, source)).Voltages.Where(v => v.Order != 1))
            {
                sum[(voltage.Bus, voltage.Order)] = sum.GetValueOrDefault((voltage.Bus, voltage.Order)) + voltage.Kv;
            }
        }

        foreach (HarmonicVoltage voltage in together.Voltages.Where(v => v.Order != 1))
        {
            // the arithmetic sum is the scale: contributions may cancel
            Complex added = sum[(voltage.Bus, voltage.Order)];
            Assert.True(
                (voltage.Kv - added).Magnitude <= 1e-10 * Math.Max(1, voltage.Order) * voltage.KvByRule.Arithmetic + 1e-12,
                string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {voltage.Bus}, h = {voltage.Order}: {voltage.Kv}, sum {added}"));
        }
    }

    /// <summary>The same plant with one harmonic source left: the others keep their fundamental power.</summary>
    private static Plant Alone(Plant plant, PlantElement source) => new(
        plant.Title, plant.FrequencyHz, plant.Buses, plant.Elements.Select(e => ReferenceEquals(e, source) ? e : Silent(e)));

    private static PlantElement Silent(PlantElement element) => element switch
    {
        Converter converter => converter with
        {
            Spectrum = converter.Spectrum with { Lines = [.. converter.Spectrum.Lines.Where(l => l.Order == 1)] },
        },
        Supply supply => supply with { Background = null },
        _ => element,
    };
}
