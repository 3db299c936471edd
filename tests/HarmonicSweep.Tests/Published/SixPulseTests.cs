using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// The ideal spectrum I_h = I_1/h of kp +- 1 orders on the plainest networks: 30.015 % to h = 50 for 6 pulses and 14.173 % for 12 (arithmetic of
/// the rule I_1/h, e.g. Sheldrake, Handbook of Electrical Engineering, ch. 15). Tolerance 1e-3 % of the printed value: its last digit.
/// </summary>
public sealed class SixPulseTests
{
    [Theory]
    [InlineData(6, 30.015)]
    [InlineData(12, 14.173)]
    public void Over_a_resistance_the_voltage_has_the_distortion_of_the_current(int pulses, double percent)
    {
        StateResult result = ProductSide.Distortion(Plant(pulses, xOverR: 1e-9));
        double currentPercent = 100 * Math.Sqrt(Harmonics(result).Sum(c => c.Ampere.Magnitude * c.Ampere.Magnitude)) / First(result);
        Assert.Equal(percent, currentPercent, 1e-3);

        // V_h = R I_h with R = 13.8^2/50 ohm: the distortion of V in percent of I_1 R
        double drop = First(result) * 13.8 * 13.8 / 50 / 1000 * Math.Sqrt(3);
        double volts = Thd(result) / 100 * result.Voltages.Single(v => v.Order == 1).Kv.Magnitude;
        Assert.Equal(percent, 100 * volts / drop, 1e-3);
    }

    /// <summary>Over a reactance every order gives the same voltage, X I_1: THD = sqrt(N) X I_1/V_1 with N orders. Tolerance 1e-9: one power flow.</summary>
    [Theory]
    [InlineData(6, 16)]
    [InlineData(12, 8)]
    public void Over_a_reactance_every_order_counts_alike(int pulses, int orders)
    {
        StateResult result = ProductSide.Distortion(Plant(pulses, xOverR: 1e12));
        double ohm = 13.8 * 13.8 / 50;
        double expected = 100 * Math.Sqrt(orders) * ohm * First(result) * Math.Sqrt(3) / 1000 / result.Voltages.Single(v => v.Order == 1).Kv.Magnitude;
        Assert.Equal(expected, Thd(result), 1e-9 * expected);
    }

    private static Plant Plant(int pulses, double xOverR)
    {
        IEnumerable<double> orders = Enumerable.Range(1, 50 / pulses + 1).SelectMany(k => (double[])[k * pulses - 1, k * pulses + 1]).Where(h => h <= 50);
        Spectrum spectrum = PlantKit.Spectrum("ideal", orders.Select(h => (h, 100 / h, 0.0)).Prepend((1, 100, 0)));
        return PlantKit.Plant(
            60, [PlantKit.Bus("B", 13.8)], PlantKit.Supply("S", "B", 50, xOverR), PlantKit.Converter("C", "B", 1000, 0.95, spectrum));
    }

    private static IEnumerable<HarmonicCurrent> Harmonics(StateResult result) => result.Currents.Where(c => c.Element == "C" && c.Order > 1);

    private static double First(StateResult result) => result.Currents.Single(c => c.Element == "C" && c.Order == 1).Ampere.Magnitude;

    private static double Thd(StateResult result) => result.Distortion.Single(d => d.Rule == SummationRule.Phasor).PercentOfFundamental!.Value;
}
