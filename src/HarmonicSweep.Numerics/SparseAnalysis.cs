namespace HarmonicSweep.Numerics;

/// <summary>
/// Everything about a sparse factorization that depends on the pattern alone, done once and shared by all solvers:
/// elimination order, positions of the factors, and the program of updates. Immutable and safe to share between threads.
/// </summary>
/// <remarks>
/// The factors are L (unit lower triangular, by columns) and U (by rows) with pivots on the diagonal; their structures
/// mirror each other because the pattern is symmetric. The factor array holds the pivots, then L, then U.
/// </remarks>
public sealed class SparseAnalysis
{
    private SparseAnalysis(
        SparsityPattern pattern, int[] order, int[] columnStart, int[] rowIndex, int[] scatter, int[] updates)
    {
        Pattern = pattern;
        Order = order;
        ColumnStart = columnStart;
        RowIndex = rowIndex;
        Scatter = scatter;
        Updates = updates;
    }

    /// <summary>Pattern analysed.</summary>
    public SparsityPattern Pattern { get; }

    /// <summary>Entries of the factors: pivots, L and U.</summary>
    public int FactorCount => Pattern.Size + 2 * RowIndex.Length;

    /// <summary>Row of the matrix eliminated as the k-th.</summary>
    internal int[] Order { get; }

    /// <summary>Start of each factor column in <see cref="RowIndex"/>; length Size + 1.</summary>
    internal int[] ColumnStart { get; }

    /// <summary>Row (in elimination order) of each entry of L below the diagonal, by columns, ascending.</summary>
    internal int[] RowIndex { get; }

    /// <summary>Position in the factor array of each stored entry of the matrix.</summary>
    internal int[] Scatter { get; }

    /// <summary>For each pivot k, each i, each j in column k: position in the factor array of entry (i, j).</summary>
    internal int[] Updates { get; }

    /// <summary>Analyses a pattern.</summary>
    public static SparseAnalysis Of(SparsityPattern pattern)
    {
        int size = pattern.Size;
        int[] order = MinimumDegree.Order(pattern);
        int[] rank = new int[size];
        for (int k = 0; k < size; k++)
        {
            rank[order[k]] = k;
        }

        int[][] below = FillBelow(pattern, order, rank);
        int[] columnStart = new int[size + 1];
        for (int k = 0; k < size; k++)
        {
            columnStart[k + 1] = columnStart[k] + below[k].Length;
        }

        int fill = columnStart[size];
        int Position(int i, int j) => i == j
            ? i
            : size + (i > j ? 0 : fill) + columnStart[Math.Min(i, j)] + Array.BinarySearch(below[Math.Min(i, j)], Math.Max(i, j));

        int[] scatter = new int[pattern.Count];
        for (int row = 0; row < size; row++)
        {
            for (int p = pattern.RowStart[row]; p < pattern.RowStart[row + 1]; p++)
            {
                scatter[p] = Position(rank[row], rank[pattern.Columns[p]]);
            }
        }

        var updates = new List<int>();
        foreach (int[] column in below)
        {
            foreach (int i in column)
            {
                foreach (int j in column)
                {
                    updates.Add(Position(i, j));
                }
            }
        }

        return new SparseAnalysis(pattern, order, columnStart, [.. below.SelectMany(c => c)], scatter, [.. updates]);
    }

    /// <summary>
    /// Rows below the diagonal of each factor column: those of the matrix joined with those of the columns whose first
    /// row below the diagonal is this one (its children in the elimination tree).
    /// </summary>
    private static int[][] FillBelow(SparsityPattern pattern, int[] order, int[] rank)
    {
        int size = pattern.Size;
        int[][] below = new int[size][];
        var children = new List<int>?[size];
        int[] seen = new int[size];
        Array.Fill(seen, -1);
        var rows = new List<int>();
        for (int k = 0; k < size; k++)
        {
            rows.Clear();
            seen[k] = k;
            foreach (int column in pattern.Row(order[k]))
            {
                Add(rank[column]);
            }

            foreach (int child in children[k] ?? [])
            {
                foreach (int row in below[child])
                {
                    Add(row);
                }
            }

            rows.Sort();
            below[k] = [.. rows];
            if (below[k].Length > 0)
            {
                (children[below[k][0]] ??= []).Add(k);
            }

            void Add(int row)
            {
                if (row > k && seen[row] != k)
                {
                    seen[row] = k;
                    rows.Add(row);
                }
            }
        }

        return below;
    }
}
