using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// h_r = sqrt(S_sc/Q_c) on worked examples, through the impedance study. The resistances are made negligible (X/R 1e5), since the rule
/// knows none: at X/R 1e5 the peak moves by less than 1e-9. Tolerance 1e-4 against own arithmetic on the printed inputs.
/// </summary>
public sealed class ResonanceRuleTests
{
    private const double HighXOverR = 1e5;

    /// <summary>1500 kVA at 5.5 %, utility 48,000 kVA, 350 kvar: 17,391 kVA, "right on the 7th", 7.0491 (aeusp.com, resonance example).</summary>
    [Fact]
    public void Transformer_of_1500_kVA_with_350_kvar_resonates_at_the_7th()
    {
        Plant plant = PlantKit.Plant(
            60, [PlantKit.Bus("H", 12.47), PlantKit.Bus("L", 0.48)], PlantKit.Supply("S", "H", 48, HighXOverR),
            PlantKit.Transformer("T", "H", "L", 1.5, 12.47, 0.48, 5.5, HighXOverR, "Dyn1"), PlantKit.Bank("K", "L", 350, 0.48));
        StateResult result = Scan(plant, "L", 3, 12);
        Assert.Equal(7.0491, Peak(result).Order, 1e-4);

        BankResonance hand = Assert.Single(result.BankResonances);
        Assert.Equal(17.3913, hand.ShortCircuitMva, 1e-4);
        Assert.Equal(7.0491, hand.HandOrder, 1e-4);
        Assert.Equal(Peak(result).Order, hand.ComputedOrder);
    }

    /// <summary>125 MVA and 5 Mvar: 5.0, a published exercise; X_L/X_C = 1/15: sqrt 15 = 3.873, between 3 and 5 (aeusp.com).</summary>
    [Theory]
    [InlineData(125, 5, 5.0)]
    [InlineData(150, 10, 3.872983)]
    public void Supply_and_bank_resonate_at_the_root_of_their_ratio(double mva, double mvar, double order)
    {
        Plant plant = PlantKit.Plant(60, [PlantKit.Bus("B", 13.8)], PlantKit.Supply("S", "B", mva, HighXOverR), PlantKit.Bank("K", "B", 1000 * mvar, 13.8));
        Assert.Equal(order, Peak(Scan(plant, "B", 2, 10)).Order, 1e-4);
    }

    /// <summary>
    /// Series resonance seen from the supply side through a transformer with a bank and a resistive load behind it:
    /// h_s = sqrt(S_T/(Z_T Q_c) - (S_L/Q_c)^2), form from memory (Arrillaga), derived again: where the imaginary part passes zero.
    /// 1500 kVA, 6 %, 350 kvar: 8.4515 without load, 8.3299 with 500 kW.
    /// </summary>
    [Theory]
    [InlineData(0, 8.4515)]
    [InlineData(500, 8.3299)]
    public void Transformer_with_a_bank_behind_it_absorbs_at_the_series_order(double kw, double order)
    {
        List<PlantElement> elements =
        [
            PlantKit.Supply("S", "elsewhere", 100), PlantKit.Transformer("T", "H", "L", 1.5, 12.47, 0.48, 6, HighXOverR, "Dyn1"),
            PlantKit.Bank("K", "L", 350, 0.48),
        ];
        if (kw > 0)
        {
            elements.Add(PlantKit.Load("R", "L", kw, 0));
        }

        Plant plant = PlantKit.Plant(60, [PlantKit.Bus("elsewhere", 12.47), PlantKit.Bus("H", 12.47), PlantKit.Bus("L", 0.48)], elements);
        double Reactance(double h) => ProductSide.Impedance(plant, "H", h)!.Value.Imaginary;
        Assert.True(Reactance(order - 1e-3) < 0, "capacitive below");
        Assert.True(Reactance(order + 1e-3) > 0, "inductive above");
    }

    private static StateResult Scan(Plant plant, string bus, double from, double to)
    {
        StudyRequest request = ProductSide.Request(plant) with
        {
            Buses = [bus],
            Settings = new StudySettings { Sweep = new SweepRange(from * plant.FrequencyHz, to * plant.FrequencyHz, 5) },
        };
        return ImpedanceStudy.Run(request, progress: null, CancellationToken.None).States[0];
    }

    private static Resonance Peak(StateResult result) => Assert.Single(result.Resonances, r => r.Kind == ResonanceKind.Parallel);
}
