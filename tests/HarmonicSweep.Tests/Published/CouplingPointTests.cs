using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// What is judged at the point of common coupling, worked by hand on one bus: I_SC = S_sc/(sqrt3 V), I_L = demand/(sqrt3 V),
/// TDD = sqrt(sum I_h^2)/I_L of IEEE 519 (definitions: Kusko and Thompson, p. 17), voltages in percent of nominal.
/// Tolerance 1e-9: one power flow.
/// </summary>
public sealed class CouplingPointTests
{
    private static readonly Supply _supply = PlantKit.Supply("S", "B", 100, 0.75) with { DemandMva = 2 };

    private static StateResult Judged(params PlantElement[] elements)
    {
        StudyRequest request = ProductSide.Request(PlantKit.Plant(60, [PlantKit.Bus("B", 10)], elements));
        request = request with { Settings = request.Settings with { PccBus = "B", Standards = ["ieee519-2022"] } };
        return DistortionStudy.Run(request, progress: null, CancellationToken.None).States[0];
    }

    [Fact]
    public void Current_of_a_converter_alone_is_judged_by_the_row_of_its_ratio()
    {
        // 100 MVA over 2 MVA: ratio 50, on the boundary, so the row 50 to 100: 10 % below order 11, 4.5 % to 17, TDD 12 %
        StateResult result = Judged(
            _supply, PlantKit.Converter("C", "B", 1900, 0.95, PlantKit.Spectrum("six", (1, 100, 0), (5, 20, 0), (7, 14.3, 0), (11, 3, 0), (13.5, 50, 0))));
        double first = result.Currents.Single(c => c.Element == "C" && c.Order == 1).Ampere.Magnitude;
        double demand = 2000 / (Math.Sqrt(3) * 10);
        double tdd = 100 * first * Math.Sqrt(0.2 * 0.2 + 0.143 * 0.143 + 0.03 * 0.03) / demand;
        Expect(result, "TDD", null, tdd, 12, Verdict.Exceeded);
        Expect(result, "I_h", 5, 100 * 0.2 * first / demand, 10, Verdict.Exceeded);
        Expect(result, "I_h", 11, 100 * 0.03 * first / demand, 4.5, Verdict.Within);

        // 1 ohm at order 1: R 0.8, X 0.6; V_5 in percent of nominal phase voltage, limits of 1 to 69 kV
        double fifth = 100 * 0.2 * first * new Complex(0.8, 3).Magnitude * Math.Sqrt(3) / 10_000;
        Expect(result, "V_h", 5, fifth, 3, Verdict.Within);
    }

    [Fact]
    public void Without_demand_nothing_is_passed()
    {
        StateResult result = Judged(_supply with { DemandMva = null }, PlantKit.Converter("C", "B", 1900, 0.95, PlantKit.Spectrum("six", (1, 100, 0), (5, 20, 0))));
        LimitVerdict[] currents = [.. result.Limits.Where(l => !l.Quantity.Contains('V', StringComparison.Ordinal))];
        Assert.Contains("TDD", string.Join(' ', currents.Select(l => l.Quantity)), StringComparison.Ordinal);
        Assert.All(currents, l => Assert.Equal((Verdict.NotJudged, null), (l.Verdict, l.ValuePercent)));
        Assert.All(currents, l => Assert.False(string.IsNullOrWhiteSpace(l.Why)));
    }

    /// <summary>I_SC comes from the supplies alone at their maximum, whatever the state: neither a weak grid nor a generator moves the row (ratio 50, TDD 12 %).</summary>
    [Fact]
    public void Row_of_the_current_table_does_not_follow_the_state()
    {
        Generator generator = new() { Name = "G", Location = PlantKit.Here, Bus = "B", RatedMva = 40, RatedKv = 10, PMw = 0.5, ReactancePu = 0.2 };
        Plant plant = PlantKit.Plant(
            60, [PlantKit.Bus("B", 10)], _supply with { ShortCircuitMvaMin = 40 }, generator,
            PlantKit.Converter("C", "B", 1900, 0.95, PlantKit.Spectrum("six", (1, 100, 0), (5, 20, 0))));
        StudyRequest request = ProductSide.Request(plant, new OperatingState("weak", [new ShortCircuitSetting("S", ShortCircuitLevel.Min)]));
        request = request with { Settings = request.Settings with { PccBus = "B", Standards = ["ieee519-2022"] } };
        foreach (StateResult result in DistortionStudy.Run(request, progress: null, CancellationToken.None).States)
        {
            Assert.Equal(12, Assert.Single(result.Limits, l => l.Quantity == "TDD").LimitPercent);
        }
    }

    /// <summary>Voltage divider: with an EMF behind the supply and a bank on the bus, V/E = Z_C/(Z_S + Z_C).</summary>
    [Fact]
    public void Gain_from_background_to_a_bank_is_the_voltage_divider()
    {
        StudyRequest request = ProductSide.Request(PlantKit.Plant(60, [PlantKit.Bus("B", 10)], _supply, PlantKit.Bank("K", "B", 2000, 10)));
        request = request with { Settings = request.Settings with { PccBus = "B" }, Orders = [1, 5, 7.5] };
        BackgroundGain gain = Assert.Single(ImpedanceStudy.Run(request, progress: null, CancellationToken.None).States[0].Gains, g => g.Bus == "B");
        for (int n = 0; n < 3; n++)
        {
            Complex capacitor = new(0, -50 / gain.Orders[n]);
            Complex divider = capacitor / (capacitor + new Complex(0.8, 0.6 * gain.Orders[n]));
            Assert.Equal(divider.Magnitude, gain.Gain[n]!.Value, 1e-10 * divider.Magnitude);
        }
    }

    private static void Expect(StateResult result, string quantity, double? order, double value, double limit, Verdict verdict)
    {
        LimitVerdict judged = Assert.Single(result.Limits, l => l.Quantity == quantity && l.Order == order);
        Assert.Equal(value, judged.ValuePercent!.Value, 1e-9 * value);
        Assert.Equal(limit, judged.LimitPercent);
        Assert.Equal(verdict, judged.Verdict);
    }
}
