namespace HarmonicSweep.Numerics;

/// <summary>
/// Positions of a square matrix whose structure is symmetric (its values need not be), compressed by rows, diagonal always present.
/// Row i holds the columns <c>Columns[RowStart[i]..RowStart[i + 1]]</c>, ascending.
/// </summary>
public sealed class SparsityPattern
{
    private readonly int[] _rowStart;
    private readonly int[] _columns;
    private readonly int[] _diagonal;

    /// <summary>Creates the pattern of a matrix of the given size from the pairs that are coupled.</summary>
    /// <param name="size">Rows and columns, 0 or more.</param>
    /// <param name="pairs">Coupled pairs; either order, repeats allowed.</param>
    /// <exception cref="ArgumentOutOfRangeException">An index lies outside 0 to size - 1.</exception>
    public SparsityPattern(int size, IEnumerable<(int Row, int Column)> pairs)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(size);
        var entries = new List<(int Row, int Column)>();
        for (int i = 0; i < size; i++)
        {
            entries.Add((i, i));
        }

        foreach ((int row, int column) in pairs)
        {
            ArgumentOutOfRangeException.ThrowIfNegative(Math.Min(row, column), nameof(pairs));
            ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(Math.Max(row, column), size, nameof(pairs));
            entries.Add((row, column));
            entries.Add((column, row));
        }

        entries.Sort(static (a, b) => a.Row != b.Row ? a.Row.CompareTo(b.Row) : a.Column.CompareTo(b.Column));
        var columns = new List<int>(entries.Count);
        _rowStart = new int[size + 1];
        _diagonal = new int[size];
        for (int e = 0; e < entries.Count; e++)
        {
            if (e > 0 && entries[e] == entries[e - 1])
            {
                continue;
            }

            (int row, int column) = entries[e];
            if (row == column)
            {
                _diagonal[row] = columns.Count;
            }

            columns.Add(column);
            _rowStart[row + 1] = columns.Count;
        }

        _columns = [.. columns];
    }

    /// <summary>Rows and columns.</summary>
    public int Size => _diagonal.Length;

    /// <summary>Stored positions.</summary>
    public int Count => _columns.Length;

    /// <summary>Start of each row in <see cref="Columns"/>; length Size + 1.</summary>
    public ReadOnlySpan<int> RowStart => _rowStart;

    /// <summary>Column of each stored position.</summary>
    public ReadOnlySpan<int> Columns => _columns;

    /// <summary>Stored position of each diagonal entry.</summary>
    public ReadOnlySpan<int> Diagonal => _diagonal;

    /// <summary>Columns of one row, ascending.</summary>
    public ReadOnlySpan<int> Row(int row) => _columns.AsSpan(_rowStart[row].._rowStart[row + 1]);

    /// <summary>Stored position of an entry.</summary>
    /// <exception cref="ArgumentException">The pattern has no such entry.</exception>
    public int IndexOf(int row, int column)
    {
        int found = Row(row).BinarySearch(column);
        return found >= 0
            ? _rowStart[row] + found
            : throw new ArgumentException(FormattableString.Invariant($"The pattern has no entry at row {row}, column {column}."), nameof(column));
    }
}
