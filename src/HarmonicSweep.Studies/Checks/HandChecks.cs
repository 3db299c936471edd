using System.Numerics;
using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Studies;

/// <summary>What a senior engineer works out in the margin before trusting a run, beside what the network gives.</summary>
internal static class HandChecks
{
    /// <summary>Relative difference allowed where formula and network should be the same number.</summary>
    private const double Exact = 1e-6;

    /// <summary>Relative difference allowed to the bank formulas, which leave losses out.</summary>
    private const double WithoutLosses = 0.005;

    /// <summary>Relative difference allowed to the resonance formula, which leaves loads and line capacitance out.</summary>
    private const double WithoutLoads = 0.10;

    /// <summary>Every check that holds in a state and needs no scan.</summary>
    public static IReadOnlyList<HandCheck> Of(PlantInState plant, PowerFlowSolution powerFlow) =>
    [
        .. RadialPaths.Checks(plant, Exact),
        .. plant.Plant.Of<CapacitorBank>().Where(plant.IsIn).SelectMany(b => BankChecks(plant, powerFlow, b)),
        .. plant.Plant.Of<Filter>().Where(f => plant.IsIn(f) && f.Kind == FilterKind.SingleTuned).Select(TuningCheck),
    ];

    /// <summary>The resonance formula, where one bank stands alone: others share their resonances with it.</summary>
    public static IEnumerable<HandCheck> OfResonances(PlantInState plant, IReadOnlyList<BankResonance> bankResonances)
    {
        int capacitive = plant.Plant.Elements.Count(e => e is CapacitorBank or Filter && plant.IsIn(e));
        return bankResonances
            .Where(b => capacitive == 1 && b.ComputedOrder is not null)
            .Select(b => new HandCheck(
                "parallel resonance", b.Bank, Invariant($"1/sqrt(p + V^2/(X_C S_sc)), S_sc {b.ShortCircuitMva:G5} MVA"),
                b.HandOrder, b.ComputedOrder!.Value, "", WithoutLoads));
    }

    private static IEnumerable<HandCheck> BankChecks(PlantInState plant, PowerFlowSolution powerFlow, CapacitorBank bank)
    {
        int steps = plant.StepsIn(bank);
        double p = bank.DetuningPercent / 100;
        var law = new BankLaw(bank, steps);
        if (powerFlow.IsLive(bank.Bus))
        {
            Complex kv = powerFlow.VoltageKv(bank.Bus);
            double hand = Complex.Abs(kv) * 1000 / (Math.Sqrt(3) * bank.CapacitiveReactanceOhm(steps) * (1 - p));
            double computed = Complex.Abs(law.Admittance(1) * kv) * 1000 / Math.Sqrt(3);
            yield return new HandCheck(
                "bank current at order 1", bank.Name, "V_1/(sqrt3 X_C (1-p)), X_C = rated_kv^2/Q_in", hand, computed, "A", WithoutLosses);
        }

        if (p > 0)
        {
            double hand = 1 / Math.Sqrt(p);
            double computed = BrentMinimum.Find(h => 1 / Complex.Abs(law.Admittance(h)), hand / 2, hand, hand * 2, 1e-8);
            yield return new HandCheck("tuning order", bank.Name, "1/sqrt(p)", hand, computed, "", WithoutLosses);
        }
    }

    private static HandCheck TuningCheck(Filter filter)
    {
        var law = new FilterLaw(filter);
        double computed = BrentMinimum.Find(
            h => 1 / Complex.Abs(law.Admittance(h)), filter.TunedOrder / 2, filter.TunedOrder, filter.TunedOrder * 2, 1e-8);
        return new HandCheck("tuning order", filter.Name, "tuned_order", filter.TunedOrder, computed, "", WithoutLosses);
    }
}
