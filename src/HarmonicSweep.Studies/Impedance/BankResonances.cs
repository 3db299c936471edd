using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>The hand formula of a bank, h = 1/sqrt(p + V^2/(X_C S_sc)); sqrt(S_sc/Q) without reactor (textbook).</summary>
internal static class BankResonances
{
    /// <summary>One entry a bank in service, beside the nearest parallel resonance computed at its bus.</summary>
    public static IReadOnlyList<BankResonance> Of(PlantInState plant, IReadOnlyList<Resonance> resonances)
    {
        var found = new List<BankResonance>();
        foreach (CapacitorBank bank in plant.Plant.Of<CapacitorBank>())
        {
            int steps = plant.StepsIn(bank);
            if (HandOrder(plant, bank, steps) is not { } hand)
            {
                continue;
            }

            double? nearest = resonances
                .Where(r => r.Bus == bank.Bus && r.Kind == ResonanceKind.Parallel)
                .OrderBy(r => Math.Abs(r.Order - hand.Order))
                .Select(r => (double?)r.Order)
                .FirstOrDefault();
            found.Add(new BankResonance(bank.Name, bank.Bus, steps, hand.ShortCircuitMva, hand.Order, nearest));
        }

        return found;
    }

    /// <summary>Order by the hand formula and the S_sc it uses; null with no step in or no source behind the bus.</summary>
    public static (double Order, double ShortCircuitMva)? HandOrder(PlantInState plant, CapacitorBank bank, int steps)
    {
        if (steps == 0 || ShortCircuit.FromSourcesMva(plant, bank.Bus) is not { } mva)
        {
            return null;
        }

        double kv = plant.Plant.Bus(bank.Bus).NominalKv;
        double share = kv * kv / (bank.CapacitiveReactanceOhm(steps) * mva);
        return (1 / Math.Sqrt(bank.DetuningPercent / 100 + share), mva);
    }
}
