using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// Orders at which resonances are looked for, chosen from the network and not from the listed spacing.
/// </summary>
/// <remarks>
/// At a resonance of a lumped passive network the magnetic and electric energies are equal, so its quality factor is at
/// most that of the least lossy inductive element. A half-power width is h/Q: the grid is no coarser than two of them, so
/// that a resonance bends the curve of some three neighbours, and <see cref="ResonanceFinder"/> refines it there.
/// </remarks>
internal static class ScanGrid
{
    /// <summary>Quality factors beyond this do not narrow the grid further; the refinement by curvature takes over.</summary>
    private const double LargestQuality = 1000;

    /// <summary>Never coarser than this share of the order, nor than <see cref="WidestSpacing"/>.</summary>
    private const double SmallestQuality = 10;

    private const double WidestSpacing = 0.2;

    /// <summary>Half-power widths between two orders.</summary>
    private const double Widths = 2;

    /// <summary>Ascending orders from <paramref name="from"/> to <paramref name="to"/>, both included.</summary>
    public static double[] Orders(Circuit circuit, double from, double to)
    {
        var orders = new List<double>();
        double order = from;
        while (order < to)
        {
            orders.Add(order);
            double quality = Math.Clamp(LargestInductiveQuality(circuit, order), SmallestQuality, LargestQuality);
            order += Math.Min(Widths * order / quality, WidestSpacing);
        }

        orders.Add(to);
        return [.. orders];
    }

    private static double LargestInductiveQuality(Circuit circuit, double order)
    {
        double largest = 0;
        foreach (CircuitBranch branch in circuit.Branches)
        {
            largest = Math.Max(largest, branch.Law.InductiveQuality(order));
        }

        foreach (CircuitShunt shunt in circuit.Shunts)
        {
            largest = Math.Max(largest, shunt.Law.InductiveQuality(order));
        }

        // NaN: an element without loss and without inductance at once, which bounds nothing
        return double.IsNaN(largest) ? LargestQuality : largest;
    }
}
