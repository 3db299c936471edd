namespace HarmonicSweep.Network;

/// <summary>Impedances behind sources, seen by harmonics with the source shorted.</summary>
public static class SourceLaw
{
    /// <summary>|Z1| = V^2/S_sc split by X/R: Z(h) = R1 + j h X1 (textbook).</summary>
    /// <param name="supply">Supply.</param>
    /// <param name="nominalKv">Nominal voltage of its bus, kV.</param>
    /// <param name="shortCircuitMva">Short-circuit power of the state, MVA, above 0 and finite.</param>
    /// <exception cref="CaseException">
    /// The short-circuit power is not finite: an ideal voltage source has no admittance to enter by inspection.
    /// </exception>
    public static ImpedanceToGround Of(Supply supply, double nominalKv, double shortCircuitMva)
    {
        if (!double.IsFinite(shortCircuitMva) || shortCircuitMva <= 0)
        {
            throw new CaseException([new Finding(
                Severity.Error, "HS201", supply.Location.At("sc_mva_max"),
                $"supply {supply.Name} has no impedance: an ideal voltage source has no admittance that could be entered into the nodal matrix.",
                "give the short-circuit power of the in-feed in MVA (or kA), above 0 and finite.")]);
        }

        double z = nominalKv * nominalKv / shortCircuitMva;
        double r = z / Math.Sqrt(1 + supply.XOverR * supply.XOverR);
        return new ImpedanceToGround(new SeriesImpedance(r, r * supply.XOverR, ResistanceLaw.Constant));
    }

    /// <summary>Synchronous machine on its own rating: Z(h) = R sqrt(h) + j h X (common practice).</summary>
    public static ImpedanceToGround Of(Generator generator)
    {
        double baseOhm = generator.RatedKv * generator.RatedKv / generator.RatedMva;
        return new ImpedanceToGround(new SeriesImpedance(
            generator.ResistancePu * baseOhm, generator.ReactancePu * baseOhm, ResistanceLaw.SquareRoot));
    }
}
