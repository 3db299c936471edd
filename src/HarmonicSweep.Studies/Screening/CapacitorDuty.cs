using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// Loading of a capacitor bank over all solved orders, the fundamental included: V_h = sqrt3 I_h X_C/h over the capacitors
/// themselves, rms, crest = sqrt2 sum V_h, I rms, kvar = sqrt3 sum V_h I_h, each against its rating.
/// </summary>
internal static class CapacitorDuty
{
    /// <summary>Loading under a summation rule; null when the bank carries no current listed.</summary>
    public static BankLoading? Of(CapacitorBank bank, int stepsIn, DistortionSolution solution, SummationRule rule)
    {
        if (stepsIn == 0)
        {
            return null;
        }

        double reactance = bank.CapacitiveReactanceOhm(stepsIn);
        double kvarIn = bank.RatedKvar * stepsIn / bank.Steps;
        double voltage2 = 0;
        double crest = 0;
        double current2 = 0;
        double kvar = 0;
        foreach (SolvedOrder solved in solution.Orders)
        {
            EndCurrent? end = solved.Ends.FirstOrDefault(e => e.Name == bank.Name);
            double ampere = end is null ? 0 : Summation.Of(end.Ampere, solved.Order)[rule];
            double kv = Math.Sqrt(3) * ampere * reactance / solved.Order / 1000;
            voltage2 += kv * kv;
            crest += kv;
            current2 += ampere * ampere;
            kvar += Math.Sqrt(3) * kv * ampere;
        }

        double ratedAmpere = kvarIn / (Math.Sqrt(3) * bank.RatedKv);
        return current2 == 0 ? null : new BankLoading(
            Math.Sqrt(voltage2) / bank.RatedKv * 100, crest / bank.RatedKv * 100,
            Math.Sqrt(current2) / ratedAmpere * 100, kvar / kvarIn * 100, Math.Sqrt(current2));
    }
}
