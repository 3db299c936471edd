using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>Nodes of a plant in a state: closed couplers make one node of their two buses.</summary>
internal sealed class TwinNodes
{
    private readonly Dictionary<string, int> _nodeOfBus = new(StringComparer.Ordinal);

    public TwinNodes(PlantInState state)
    {
        List<(string A, string B)> couplers =
            [.. state.Plant.Of<Coupler>().Where(state.IsIn).Select(c => (c.EndA, c.EndB))];
        int[] label = Label([.. state.Plant.Buses.Select(b => b.Name)], couplers);
        List<int> labels = [.. label.Distinct()];
        for (int i = 0; i < label.Length; i++)
        {
            _nodeOfBus[state.Plant.Buses[i].Name] = labels.IndexOf(label[i]);
        }

        Count = labels.Count;
    }

    /// <summary>Number of nodes.</summary>
    public int Count { get; }

    /// <summary>Node of a bus.</summary>
    public int Of(string bus) => _nodeOfBus[bus];

    /// <summary>Island number of every node, two nodes in one island where a chain of branches joins them.</summary>
    public int[] Islands(IEnumerable<TwinPart> parts)
    {
        List<(int A, int B)> joins = [.. parts.Where(p => p.Buses.Count == 2).Select(p => (Of(p.Buses[0]), Of(p.Buses[1])))];
        return Label([.. Enumerable.Range(0, Count)], joins);
    }

    /// <summary>Repeats "both ends take the lower label" until nothing changes.</summary>
    private static int[] Label<T>(List<T> items, List<(T A, T B)> joins)
        where T : notnull
    {
        int[] label = [.. Enumerable.Range(0, items.Count)];
        bool changed = true;
        while (changed)
        {
            changed = false;
            foreach ((T a, T b) in joins)
            {
                int i = items.IndexOf(a);
                int k = items.IndexOf(b);
                int lower = Math.Min(label[i], label[k]);
                changed |= label[i] != lower || label[k] != lower;
                label[i] = label[k] = lower;
            }
        }

        return label;
    }
}
