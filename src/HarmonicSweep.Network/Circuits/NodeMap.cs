namespace HarmonicSweep.Network;

/// <summary>
/// Buses merged into nodes by closed couplers. Ideal couplers are not large conductances: the buses they join are one node.
/// A loop of couplers merges nothing twice and needs no special care.
/// </summary>
public sealed class NodeMap
{
    private readonly Dictionary<string, int> _nodeByBus = new(StringComparer.Ordinal);
    private readonly List<List<string>> _buses = [];
    private readonly List<string> _loopCouplers = [];

    /// <summary>Merges the buses of a plant in a state; nodes are numbered by their first bus in table order.</summary>
    public NodeMap(PlantInState plant)
    {
        var sets = new DisjointSets(plant.Plant.Buses.Count);
        var index = new Dictionary<string, int>(StringComparer.Ordinal);
        for (int i = 0; i < plant.Plant.Buses.Count; i++)
        {
            index[plant.Plant.Buses[i].Name] = i;
        }

        foreach (Coupler coupler in plant.Plant.Of<Coupler>())
        {
            if (!plant.IsIn(coupler))
            {
                continue;
            }

            if (sets.Find(index[coupler.EndA]) == sets.Find(index[coupler.EndB]))
            {
                _loopCouplers.Add(coupler.Name);
            }

            sets.Join(index[coupler.EndA], index[coupler.EndB]);
        }

        var nodeByRoot = new Dictionary<int, int>();
        for (int i = 0; i < plant.Plant.Buses.Count; i++)
        {
            int root = sets.Find(i);
            if (!nodeByRoot.TryGetValue(root, out int node))
            {
                node = _buses.Count;
                nodeByRoot[root] = node;
                _buses.Add([]);
            }

            _buses[node].Add(plant.Plant.Buses[i].Name);
            _nodeByBus[plant.Plant.Buses[i].Name] = node;
        }
    }

    /// <summary>Number of nodes.</summary>
    public int Count => _buses.Count;

    /// <summary>Closed couplers whose ends other couplers already join: they change nothing, and the current in such a loop is not determined.</summary>
    public IReadOnlyList<string> LoopCouplers => _loopCouplers;

    /// <summary>Node of a bus.</summary>
    public int this[string bus] => _nodeByBus[bus];

    /// <summary>Buses merged into a node, in table order.</summary>
    public IReadOnlyList<string> BusesOf(int node) => _buses[node];
}
