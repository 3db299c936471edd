using System.Globalization;
using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Holds a distortion result against the twin, value by value.</summary>
internal sealed class DistortionComparison
{
    private readonly Plant _plant;
    private readonly TwinDistortion _twin;
    private readonly StateResult _result;
    private readonly string _label;
    private readonly double _relative;
    private readonly double _roundings;

    private DistortionComparison(Plant plant, OperatingState state, StateResult result, string label, double relative, double roundings)
    {
        _plant = plant;
        _twin = new DenseTwin(plant, state).Distortion();
        _result = result;
        _label = label;
        _relative = relative;
        _roundings = roundings;
    }

    public static void Check(Plant plant, OperatingState state, StateResult result, string label, double relative, double roundings)
    {
        DistortionComparison comparison = new(plant, state, result, label, relative, roundings);
        comparison.DeadBusesAndDroppedOrders();
        comparison.Voltages();
        comparison.Thd();
        comparison.Currents();
    }

    private static RuleValues Rules(double order, Complex[] parts) => new(
        TwinRules.Phasor(order, parts), TwinRules.Arithmetic(order, parts), TwinRules.Rss(order, parts), TwinRules.Iec(order, parts));

    private static Complex Sum(Complex[] parts) => parts.Aggregate(Complex.Zero, (sum, p) => sum + p);

    private void DeadBusesAndDroppedOrders()
    {
        string[] dead = [.. _plant.Buses.Select(b => b.Name).Where(b => !_twin.Flow.IsLive(b)).Order(StringComparer.Ordinal)];
        Assert.Equal(dead, _result.DeadBuses.Order(StringComparer.Ordinal));
        string[] expected = [.. _twin.Dropped.Select(d => Key(d.Element.Name, d.Order)).Order(StringComparer.Ordinal)];
        string[] actual = [.. _result.DroppedInjections.Where(d => _twin.Flow.IsLive(_plant.FindElement(d.Element)!.Terminals[0]))
            .Select(d => Key(d.Element, d.Order)).Order(StringComparer.Ordinal)];
        Assert.True(expected.SequenceEqual(actual), $"{_label}: dropped {string.Join(' ', actual)}, twin {string.Join(' ', expected)}");
    }

    private void Voltages()
    {
        double[] listed = [.. _result.Voltages.Select(v => v.Order).Distinct().Order()];
        double[] expectedOrders = [.. _twin.Orders.Append(1).Order()];
        Assert.True(expectedOrders.SequenceEqual(listed), $"{_label}: orders {string.Join(' ', listed)}, twin {string.Join(' ', expectedOrders)}");
        Assert.Equal(expectedOrders.Length * _plant.Buses.Count, _result.Voltages.Count);
        foreach (HarmonicVoltage voltage in _result.Voltages)
        {
            double toKv = Math.Sqrt(3) / 1000;
            Complex[] parts = [.. _twin.Volt(voltage.Bus, voltage.Order).Select(v => v * toKv)];
            double noise = _roundings * toKv * _twin.RoundingVolt(voltage.Bus, voltage.Order) + 1e-12 * _plant.Bus(voltage.Bus).NominalKv;
            string where = Key(voltage.Bus, voltage.Order);
            double scale = Math.Max(voltage.Order, 1) * TwinRules.Arithmetic(voltage.Order, parts);
            Close(where, Sum(parts), voltage.Kv, scale, noise);
            double percent = 100 / _plant.Bus(voltage.Bus).NominalKv;
            foreach (SummationRule rule in Enum.GetValues<SummationRule>())
            {
                Close($"{where} {rule}", Rules(voltage.Order, parts)[rule], voltage.KvByRule[rule], scale, noise);
                Close($"{where} {rule} %", percent * voltage.KvByRule[rule], voltage.PercentOfNominal[rule], percent * voltage.KvByRule[rule], 0);
            }
        }
    }

    private void Thd()
    {
        Assert.Equal(4 * _plant.Buses.Count, _result.Distortion.Count);
        foreach (BusDistortion distortion in _result.Distortion)
        {
            double? expected = _twin.ThdPercent(distortion.Bus, (h, parts) => Rules(h, parts)[distortion.Rule]);
            Assert.True(expected.HasValue == distortion.PercentOfFundamental.HasValue, $"{_label}: THD of {distortion.Bus}");
            if (expected is { } thd)
            {
                // contributions of several sources may cancel: the arithmetic sum is the scale of the rounding
                double scale = _twin.ThdPercent(distortion.Bus, (h, parts) => h * TwinRules.Arithmetic(h, parts))!.Value;
                double noise = _twin.Orders.Sum(h => _roundings * _twin.RoundingVolt(distortion.Bus, h)) / _twin.Flow.Volt(distortion.Bus).Magnitude;
                Close($"THD {distortion.Bus} {distortion.Rule}", thd, distortion.PercentOfFundamental!.Value, scale, 100 * noise);
                double nominal = thd * _twin.Flow.Volt(distortion.Bus).Magnitude * Math.Sqrt(3) / 1000 / _plant.Bus(distortion.Bus).NominalKv;
                Close($"THD {distortion.Bus} {distortion.Rule} of nominal", nominal, distortion.PercentOfNominal!.Value, scale, 100 * noise);
            }
        }
    }

    private void Currents()
    {
        Dictionary<string, HarmonicCurrent> listed = _result.Currents.ToDictionary(
            c => Key(c.Element, c.Order) + "@" + c.Bus, StringComparer.Ordinal);
        foreach (double order in _twin.Orders.Prepend(1))
        {
            foreach ((string element, string bus) in _twin.Ends(order))
            {
                string where = Key(element, order) + "@" + bus;
                Complex[] parts = _twin.Ampere(element, bus, order);
                if (!listed.TryGetValue(where, out HarmonicCurrent? current))
                {
                    Assert.True(parts.All(p => p == Complex.Zero), $"{_label}: no current listed for {where}");
                    continue;
                }

                // a branch current is a difference of terms Y V that may cancel: measure rounding against the terms
                double scale = Math.Max(order, 1) * TwinRules.Arithmetic(order, parts);
                double noise = _twin.RoundingAmpere(element, bus, order) * _roundings;
                Close(where, Sum(parts), current.Ampere, scale, noise);
                foreach (SummationRule rule in Enum.GetValues<SummationRule>())
                {
                    Close($"{where} {rule}", Rules(order, parts)[rule], current.AmpereByRule[rule], scale, noise);
                }
            }
        }
    }

    private void Close(string where, Complex expected, Complex actual, double scale, double noise) => Assert.True(
        (actual - expected).Magnitude <= _relative * scale + noise,
        string.Create(CultureInfo.InvariantCulture, $"{_label}, {where}: twin {expected}, study {actual}, bound {_relative * scale + noise:g3}"));

    private static string Key(string name, double order) => string.Create(CultureInfo.InvariantCulture, $"{name} h={order}");
}
