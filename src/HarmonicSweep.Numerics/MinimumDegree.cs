namespace HarmonicSweep.Numerics;

/// <summary>
/// Fill-reducing elimination order by minimum degree (Tinney and Walker 1967, scheme 2): the node with the fewest
/// neighbours is eliminated next and its neighbours are joined. Ties go to the smaller index, so the order is repeatable.
/// </summary>
public static class MinimumDegree
{
    /// <summary>Returns the elimination order: entry k is the row eliminated as the k-th; length pattern.Size.</summary>
    public static int[] Order(SparsityPattern pattern)
    {
        int size = pattern.Size;
        var neighbours = new HashSet<int>[size];
        var queue = new SortedSet<(int Degree, int Node)>();
        for (int i = 0; i < size; i++)
        {
            neighbours[i] = [.. pattern.Row(i)];
            neighbours[i].Remove(i);
            queue.Add((neighbours[i].Count, i));
        }

        int[] order = new int[size];
        for (int k = 0; k < size; k++)
        {
            (int degree, int node) = queue.Min;
            queue.Remove((degree, node));
            order[k] = node;
            foreach (int a in neighbours[node])
            {
                queue.Remove((neighbours[a].Count, a));
                neighbours[a].Remove(node);
                neighbours[a].UnionWith(neighbours[node]);
                neighbours[a].Remove(a);
                queue.Add((neighbours[a].Count, a));
            }

            neighbours[node].Clear();
        }

        return order;
    }
}
