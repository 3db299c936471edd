using System.Numerics;
using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Studies;

/// <summary>
/// Kirchhoff's current law on the reported currents: their sum at every node against the sum of the terms they are made of,
/// y V each. A current of a branch is a difference of such terms and carries their rounding, however small it is itself.
/// </summary>
internal static class CurrentBalance
{
    /// <summary>Beyond this share the run fails.</summary>
    private const double Bound = 1e-8;

    /// <summary>Largest residual over the nodes of a solved order.</summary>
    /// <exception cref="ComputationException">The residual is beyond its bound; the finding names bus and order.</exception>
    public static double Residual(PlantInState plant, NodeMap nodes, SolvedOrder solved)
    {
        var sum = new Complex[nodes.Count];
        double[] terms = new double[nodes.Count];
        foreach (EndCurrent end in solved.Ends)
        {
            Complex ampere = Summation.Phasor(end.Ampere);
            int node = nodes[end.Bus];
            double kv = plant.Plant.Bus(end.Bus).NominalKv;
            sum[node] += ampere * kv;
            terms[node] += end.Terms * kv;
        }

        // a node that hardly carries anything is measured against the busiest one, so that the bound there is 1e-10 of the
        // largest power: what the power flow is held to
        double floor = terms.DefaultIfEmpty(0).Max() * 0.01;
        double worst = 0;
        for (int node = 0; node < nodes.Count; node++)
        {
            double scale = Math.Max(terms[node], floor);
            double residual = scale > 0 ? Complex.Abs(sum[node]) / scale : 0;
            if (!(residual <= Bound))
            {
                throw new ComputationException(new Finding(
                    Severity.Error, "HS303", plant.Plant.Bus(nodes.BusesOf(node)[0]).Location,
                    Invariant($"state {plant.State.Name}: the currents at bus {nodes.BusesOf(node)[0]} do not sum to zero at order {solved.Order}; the residual is {residual:E2} of their magnitudes, expected at most {Bound:E0}."),
                    "this is a fault of the computation, not of the case: report the case folder."));
            }

            worst = Math.Max(worst, residual);
        }

        return worst;
    }
}
