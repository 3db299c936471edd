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
        for (int i = 0; i < size; i++)
        {
            neighbours[i] = [.. pattern.Row(i)];
            neighbours[i].Remove(i);
        }

        int[] order = new int[size];
        bool[] eliminated = new bool[size];
        for (int k = 0; k < size; k++)
        {
            int node = Least(neighbours, eliminated);
            eliminated[node] = true;
            order[k] = node;
            foreach (int a in neighbours[node])
            {
                neighbours[a].Remove(node);
                foreach (int b in neighbours[node])
                {
                    if (b != a)
                    {
                        neighbours[a].Add(b);
                    }
                }
            }
        }

        return order;
    }

    private static int Least(HashSet<int>[] neighbours, bool[] eliminated)
    {
        int best = -1;
        for (int i = 0; i < neighbours.Length; i++)
        {
            if (!eliminated[i] && (best < 0 || neighbours[i].Count < neighbours[best].Count))
            {
                best = i;
            }
        }

        return best;
    }
}
