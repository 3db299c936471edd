namespace HarmonicSweep.Network;

/// <summary>Disjoint sets with path halving (Tarjan and van Leeuwen 1984).</summary>
public sealed class DisjointSets
{
    private readonly int[] _parent;

    /// <summary>Creates sets of one item each.</summary>
    public DisjointSets(int count)
    {
        _parent = new int[count];
        for (int i = 0; i < count; i++)
        {
            _parent[i] = i;
        }
    }

    /// <summary>The item that stands for the set of an item.</summary>
    public int Find(int item)
    {
        while (_parent[item] != item)
        {
            _parent[item] = _parent[_parent[item]];
            item = _parent[item];
        }

        return item;
    }

    /// <summary>Makes two sets one.</summary>
    public void Join(int a, int b)
    {
        int rootA = Find(a);
        int rootB = Find(b);
        _parent[Math.Max(rootA, rootB)] = Math.Min(rootA, rootB);
    }
}
