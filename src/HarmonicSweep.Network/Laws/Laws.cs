using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// The four admittances of an element between two nodes, siemens per phase:
/// I_a = AA V_a + AB V_b, I_b = BA V_a + BB V_b, currents into the element.
/// </summary>
/// <param name="AA">Self admittance at end A.</param>
/// <param name="AB">From V_b to I_a.</param>
/// <param name="BA">From V_a to I_b.</param>
/// <param name="BB">Self admittance at end B.</param>
public readonly record struct TwoPort(Complex AA, Complex AB, Complex BA, Complex BB)
{
    /// <summary>A series admittance with nothing to ground.</summary>
    public static TwoPort Series(Complex admittance) => new(admittance, -admittance, -admittance, admittance);
}

/// <summary>
/// How the admittance of an element between two nodes follows the order h. Knows nothing of matrices. Immutable.
/// </summary>
public abstract class BranchLaw
{
    /// <summary>Whether it also connects its ends to ground (line capacitance).</summary>
    public virtual bool ReachesGround => false;

    /// <summary>The four admittances at an order above 0, siemens.</summary>
    public abstract TwoPort Admittance(double order);

    /// <summary>
    /// 2 omega W/P of its magnetic field: stored against lost power, X/R for a series R-L. It bounds how sharp a resonance
    /// can be. Infinite when lossless.
    /// </summary>
    public abstract double InductiveQuality(double order);
}

/// <summary>How the admittance of an element from one node to ground follows the order h. Immutable.</summary>
public abstract class ShuntLaw
{
    /// <summary>Admittance at an order above 0, siemens per phase.</summary>
    public abstract Complex Admittance(double order);

    /// <summary>As <see cref="BranchLaw.InductiveQuality"/>; 0 for an element without inductance.</summary>
    public abstract double InductiveQuality(double order);
}

/// <summary>R k(h) + j h X.</summary>
/// <param name="ResistanceOhm">Resistance at the fundamental before the law, ohm.</param>
/// <param name="ReactanceOhm">Reactance at the fundamental, ohm.</param>
/// <param name="Law">k(h).</param>
public readonly record struct SeriesImpedance(double ResistanceOhm, double ReactanceOhm, ResistanceLaw Law)
{
    /// <summary>Impedance at an order, ohm.</summary>
    public Complex At(double order) => new(ResistanceOhm * Law.Factor(order), order * ReactanceOhm);

    /// <summary>h X/(R k(h)); infinite without resistance.</summary>
    public double Quality(double order) => order * ReactanceOhm / (ResistanceOhm * Law.Factor(order));
}

/// <summary>A series impedance from a node to ground: supply, generator, motor.</summary>
public sealed class ImpedanceToGround(SeriesImpedance impedance) : ShuntLaw
{
    /// <inheritdoc/>
    public override Complex Admittance(double order) => 1 / impedance.At(order);

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => impedance.Quality(order);
}

/// <summary>A series impedance between two nodes: a reactor.</summary>
public sealed class SeriesBranch(SeriesImpedance impedance) : BranchLaw
{
    /// <inheritdoc/>
    public override TwoPort Admittance(double order) => TwoPort.Series(1 / impedance.At(order));

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => impedance.Quality(order);
}
