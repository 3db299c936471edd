using System.Numerics;
using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Studies;

/// <summary>
/// Z at order 1 by hand: V^2/S_sc of the one supply, and along radial paths the sum of the impedances of supply,
/// transformers, cables and reactors, each brought to the voltage of the bus.
/// </summary>
internal static class RadialPaths
{
    /// <summary>One check for the supply and one for each bus at the end of a radial path.</summary>
    public static IEnumerable<HandCheck> Checks(PlantInState plant, double tolerance)
    {
        Supply[] supplies = [.. plant.Plant.Of<Supply>().Where(plant.IsIn)];
        if (supplies.Length != 1)
        {
            return []; // several in-feeds in parallel: no single path to add up
        }

        Supply supply = supplies[0];
        Circuit circuit = Circuit.Build(plant, CircuitScope.SupplyShortCircuit);
        var solver = new CircuitSolver(circuit);
        solver.Factor(1);
        double Computed(int node) => Complex.Abs(solver.Impedance(circuit.RowOf(node), circuit.RowOf(node)));

        double kv = plant.Plant.Bus(supply.Bus).NominalKv;
        double mva = plant.ShortCircuitMva(supply);
        double x = supply.XOverR;
        Complex source = new Complex(1, x) / Math.Sqrt(1 + x * x) * (kv * kv / mva);
        int start = circuit.Nodes[supply.Bus];
        var checks = new List<HandCheck>
        {
            new("Z at order 1, supply alone", supply.Bus, Invariant($"V^2/S_sc = {kv:G5}^2/{mva:G5}"), kv * kv / mva, Computed(start), "ohm", tolerance),
        };
        foreach ((int node, _, Complex sum, int elements) in Walk(plant, circuit, start, source))
        {
            checks.Add(new HandCheck(
                "Z at order 1, radial path", circuit.Nodes.BusesOf(node)[0],
                Invariant($"supply + {elements} series {(elements == 1 ? "element" : "elements")}, at the bus's voltage"),
                Complex.Abs(sum), Computed(node), "ohm", tolerance));
        }

        return checks;
    }

    /// <summary>A node reached, the branch it was reached by (-1 at the start), the sum of impedances and the elements so far.</summary>
    private sealed record Place(int Node, int Came, Complex Sum, int Elements);

    /// <summary>Nodes whose only path to the start is a chain of single branches, with the sum of impedances along it.</summary>
    private static List<Place> Walk(PlantInState plant, Circuit circuit, int start, Complex source)
    {
        var reached = new List<Place>();
        var queue = new Queue<Place>([new Place(start, -1, source, 0)]);
        while (queue.TryDequeue(out Place? at))
        {
            for (int i = 0; i < circuit.Branches.Count; i++)
            {
                CircuitBranch branch = circuit.Branches[i];
                bool leaves = branch.NodeA == at.Node || branch.NodeB == at.Node;
                if (i == at.Came || !leaves || branch.NodeA == branch.NodeB || !IsBridge(circuit, i))
                {
                    continue;
                }

                bool down = branch.NodeA == at.Node;
                int next = down ? branch.NodeB : branch.NodeA;
                Complex sum = Through(plant, branch.Element, down, at.Sum);
                var place = new Place(next, i, sum, at.Elements + 1);
                reached.Add(place);
                queue.Enqueue(place);
            }
        }

        return reached;
    }

    /// <summary>Whether the network falls apart without the branch.</summary>
    private static bool IsBridge(Circuit circuit, int index)
    {
        var sets = new DisjointSets(circuit.Nodes.Count);
        for (int i = 0; i < circuit.Branches.Count; i++)
        {
            if (i != index)
            {
                sets.Join(circuit.Branches[i].NodeA, circuit.Branches[i].NodeB);
            }
        }

        return sets.Find(circuit.Branches[index].NodeA) != sets.Find(circuit.Branches[index].NodeB);
    }

    /// <summary>The impedance seen beyond an element, from its nameplate and the impedance before it.</summary>
    private static Complex Through(PlantInState plant, BranchElement element, bool down, Complex before)
    {
        switch (element)
        {
            case Line line:
                return before + new Complex(line.ResistanceOhmPerKm * line.Law.Factor(1), line.ReactanceOhmPerKm) * (line.LengthKm / line.Circuits);
            case SeriesReactor reactor:
                return before + new Complex(reactor.ReactanceOhm / reactor.QualityFactor * reactor.Law.Factor(1), reactor.ReactanceOhm);
            case Transformer transformer:
                double ratio = transformer.HvKv / transformer.LvKv * (1 + plant.TapPercent(transformer) / 100);
                double lowOhm = transformer.LvKv * transformer.LvKv / transformer.RatedMva / 100;
                double percentX = Math.Sqrt(Math.Pow(transformer.ImpedancePercent, 2) - Math.Pow(transformer.ResistancePercent, 2));
                Complex own = new Complex(transformer.ResistancePercent * transformer.Law.Factor(1), percentX) * lowOhm;
                return down ? before / (ratio * ratio) + own : (before + own) * (ratio * ratio);
            default:
                throw new ArgumentOutOfRangeException(nameof(element), element.GetType().Name, "No series impedance for this kind of element.");
        }
    }
}
