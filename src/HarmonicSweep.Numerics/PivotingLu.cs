using System.Numerics;

namespace HarmonicSweep.Numerics;

/// <summary>
/// Sparse LU with partial pivoting by rows, column after column (left-looking, Gilbert and Peierls 1988, without their
/// symbolic depth-first search: the columns met are visited in order, which is simpler and here fast enough, since
/// this is the rare fallback and the solver of the power flow's Jacobian).
/// </summary>
public sealed class PivotingLu
{
    /// <summary>A diagonal entry at least this share of the largest candidate is kept as the pivot, to save fill.</summary>
    private const double Threshold = 0.1;

    private readonly List<(int Row, Complex Value)>[] _lower;
    private readonly List<(int Pivot, Complex Value)>[] _upper;
    private readonly Complex[] _pivot;
    private readonly int[] _pivotRow;

    private PivotingLu(int size)
    {
        _lower = new List<(int, Complex)>[size];
        _upper = new List<(int, Complex)>[size];
        _pivot = new Complex[size];
        _pivotRow = new int[size];
    }

    /// <summary>Row whose pivot is the smallest against its column: the one to name when the matrix is near singular.</summary>
    public int WeakestRow { get; private set; }

    /// <summary>Factors a matrix given by its pattern and the values at its positions.</summary>
    /// <exception cref="SingularMatrixException">A column has no nonzero, finite pivot.</exception>
    public static PivotingLu Factor(SparsityPattern pattern, ReadOnlySpan<Complex> values)
    {
        int size = pattern.Size;
        // the pattern is symmetric: the rows of column j are the columns of row j
        var columns = new List<(int Row, Complex Value)>[size];
        for (int j = 0; j < size; j++)
        {
            columns[j] = [];
            foreach (int row in pattern.Row(j))
            {
                columns[j].Add((row, values[pattern.IndexOf(row, j)]));
            }
        }

        var lu = new PivotingLu(size);
        lu.Eliminate(columns);
        return lu;
    }

    /// <summary>Solves for one right-hand side.</summary>
    /// <param name="rightHandSide">b, length Size.</param>
    /// <param name="solution">x, length Size.</param>
    public void Solve(ReadOnlySpan<Complex> rightHandSide, Span<Complex> solution)
    {
        int size = _pivot.Length;
        Complex[] work = rightHandSide.ToArray();
        for (int k = 0; k < size; k++)
        {
            Complex value = work[_pivotRow[k]];
            foreach ((int row, Complex multiplier) in _lower[k])
            {
                work[row] -= multiplier * value;
            }
        }

        for (int k = size - 1; k >= 0; k--)
        {
            Complex value = work[_pivotRow[k]] / _pivot[k];
            solution[k] = value;
            foreach ((int pivot, Complex entry) in _upper[k])
            {
                work[_pivotRow[pivot]] -= entry * value;
            }
        }
    }

    private void Eliminate(List<(int Row, Complex Value)>[] columns)
    {
        int size = columns.Length;
        var column = new Complex[size];
        int[] rank = new int[size];
        Array.Fill(rank, -1);
        double weakest = double.PositiveInfinity;
        for (int k = 0; k < size; k++)
        {
            Array.Clear(column);
            double largestBefore = 0;
            foreach ((int row, Complex value) in columns[k])
            {
                column[row] = value;
                largestBefore = Math.Max(largestBefore, Complex.Abs(value));
            }

            _upper[k] = [];
            for (int j = 0; j < k; j++)
            {
                Complex value = column[_pivotRow[j]];
                if (value == Complex.Zero)
                {
                    continue;
                }

                _upper[k].Add((j, value));
                foreach ((int row, Complex multiplier) in _lower[j])
                {
                    column[row] -= multiplier * value;
                }
            }

            int best = -1;
            double largest = 0;
            for (int row = 0; row < size; row++)
            {
                double magnitude = Complex.Abs(column[row]);
                if (rank[row] < 0 && magnitude > largest)
                {
                    largest = magnitude;
                    best = row;
                }
            }

            if (best < 0 || !double.IsFinite(largest))
            {
                throw new SingularMatrixException(k);
            }

            if (rank[k] < 0 && Complex.Abs(column[k]) >= Threshold * largest)
            {
                best = k;
            }

            double strength = Complex.Abs(column[best]) / largestBefore;
            if (strength < weakest)
            {
                weakest = strength;
                WeakestRow = k;
            }

            rank[best] = k;
            _pivotRow[k] = best;
            _pivot[k] = column[best];
            _lower[k] = [];
            for (int row = 0; row < size; row++)
            {
                if (rank[row] < 0 && column[row] != Complex.Zero)
                {
                    _lower[k].Add((row, column[row] / column[best]));
                }
            }
        }
    }
}
