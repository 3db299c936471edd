using System.Numerics;

namespace HarmonicSweep.Numerics;

/// <summary>
/// Sparse LU on a symmetric pattern with static diagonal pivots, iterative refinement, and a threshold-pivoting LU for
/// the matrix that static pivots do not serve. Allocates nothing per matrix unless that fallback is needed.
/// </summary>
public sealed class NodalSolver : INodalSolver
{
    /// <summary>Above this backward error the pivoting factorization takes over.</summary>
    public const double AcceptedBackwardError = 1e-10;

    /// <summary>Above this backward error the solution is refined.</summary>
    private const double RefinedAbove = 1e-15;

    private const int MostRefinements = 3;

    private readonly SparseAnalysis _analysis;
    private readonly Complex[] _values;
    private readonly Complex[] _factors;
    private readonly Complex[] _work;
    private readonly Complex[] _residual;
    private readonly Complex[] _correction;
    private double _norm;
    private PivotingLu? _fallback;

    /// <summary>Creates a solver over an analysed pattern.</summary>
    public NodalSolver(SparseAnalysis analysis)
    {
        _analysis = analysis;
        _values = new Complex[analysis.Pattern.Count];
        _factors = new Complex[analysis.FactorCount];
        _work = new Complex[analysis.Pattern.Size];
        _residual = new Complex[analysis.Pattern.Size];
        _correction = new Complex[analysis.Pattern.Size];
    }

    /// <inheritdoc/>
    public SparsityPattern Pattern => _analysis.Pattern;

    /// <inheritdoc/>
    public Span<Complex> Values => _values;

    /// <summary>How many matrices needed the pivoting factorization so far.</summary>
    public int FallbackCount { get; private set; }

    /// <inheritdoc/>
    public void Factor()
    {
        _fallback = null;
        _norm = InfinityNorm();
        Array.Clear(_factors);
        ReadOnlySpan<int> scatter = _analysis.Scatter;
        for (int p = 0; p < scatter.Length; p++)
        {
            _factors[scatter[p]] = _values[p];
        }

        int size = Pattern.Size;
        Span<Complex> lower = _factors.AsSpan(size, _analysis.RowIndex.Length);
        Span<Complex> upper = _factors.AsSpan(size + lower.Length);
        ReadOnlySpan<int> updates = _analysis.Updates;
        int u = 0;
        for (int k = 0; k < size; k++)
        {
            int start = _analysis.ColumnStart[k];
            int end = _analysis.ColumnStart[k + 1];
            Complex inverse = 1 / _factors[k];
            _factors[k] = inverse;
            for (int i = start; i < end; i++)
            {
                Complex multiplier = lower[i] * inverse;
                lower[i] = multiplier;
                for (int j = start; j < end; j++)
                {
                    _factors[updates[u++]] -= multiplier * upper[j];
                }
            }
        }
    }

    /// <inheritdoc/>
    public double Solve(ReadOnlySpan<Complex> rightHandSide, Span<Complex> solution)
    {
        if (_fallback is null)
        {
            SolveStatic(rightHandSide, solution);
            double error = Refine(rightHandSide, solution);
            if (error <= AcceptedBackwardError)
            {
                return error;
            }

            // static pivots lost the digits (or met a zero): a NaN counts as such
            _fallback = PivotingLu.Factor(Pattern, _values);
            FallbackCount++;
        }

        _fallback.Solve(rightHandSide, solution);
        double fallbackError = Refine(rightHandSide, solution);
        return fallbackError <= AcceptedBackwardError ? fallbackError : throw new SingularMatrixException(_fallback.WeakestRow);
    }

    private double Refine(ReadOnlySpan<Complex> rightHandSide, Span<Complex> solution)
    {
        double error = Residual(rightHandSide, solution);
        for (int round = 0; round < MostRefinements && error > RefinedAbove; round++)
        {
            if (_fallback is null)
            {
                SolveStatic(_residual, _correction);
            }
            else
            {
                _fallback.Solve(_residual, _correction);
            }

            for (int i = 0; i < solution.Length; i++)
            {
                _correction[i] += solution[i];
            }

            double refined = Residual(rightHandSide, _correction);
            if (!(refined < error))
            {
                break;
            }

            _correction.CopyTo(solution);
            error = refined;
        }

        return error;
    }

    private void SolveStatic(ReadOnlySpan<Complex> rightHandSide, Span<Complex> solution)
    {
        int size = Pattern.Size;
        ReadOnlySpan<int> order = _analysis.Order;
        ReadOnlySpan<int> columnStart = _analysis.ColumnStart;
        ReadOnlySpan<int> rowIndex = _analysis.RowIndex;
        ReadOnlySpan<Complex> lower = _factors.AsSpan(size, rowIndex.Length);
        ReadOnlySpan<Complex> upper = _factors.AsSpan(size + rowIndex.Length);
        Span<Complex> work = _work;
        for (int k = 0; k < size; k++)
        {
            work[k] = rightHandSide[order[k]];
        }

        for (int k = 0; k < size; k++)
        {
            Complex value = work[k];
            for (int p = columnStart[k]; p < columnStart[k + 1]; p++)
            {
                work[rowIndex[p]] -= lower[p] * value;
            }
        }

        for (int k = size - 1; k >= 0; k--)
        {
            Complex sum = work[k];
            for (int p = columnStart[k]; p < columnStart[k + 1]; p++)
            {
                sum -= upper[p] * work[rowIndex[p]];
            }

            work[k] = sum * _factors[k];
            solution[order[k]] = work[k];
        }
    }

    /// <summary>Leaves b - A x in the residual and returns the backward error; NaN when anything is not finite.</summary>
    private double Residual(ReadOnlySpan<Complex> rightHandSide, ReadOnlySpan<Complex> solution)
    {
        ReadOnlySpan<int> rowStart = Pattern.RowStart;
        ReadOnlySpan<int> columns = Pattern.Columns;
        double worst = 0;
        double largestSolution = 0;
        double largestRight = 0;
        bool finite = true;
        for (int row = 0; row < Pattern.Size; row++)
        {
            Complex sum = rightHandSide[row];
            for (int p = rowStart[row]; p < rowStart[row + 1]; p++)
            {
                sum -= _values[p] * solution[columns[p]];
            }

            _residual[row] = sum;
            finite &= Complex.IsFinite(sum);
            worst = Math.Max(worst, SquareOf(sum));
            largestSolution = Math.Max(largestSolution, SquareOf(solution[row]));
            largestRight = Math.Max(largestRight, SquareOf(rightHandSide[row]));
        }

        double scale = _norm * Math.Sqrt(largestSolution) + Math.Sqrt(largestRight);
        return !finite ? double.NaN : scale > 0 ? Math.Sqrt(worst) / scale : 0;
    }

    /// <summary>|z|^2: comparing squares spares a root an entry.</summary>
    private static double SquareOf(Complex z) => z.Real * z.Real + z.Imaginary * z.Imaginary;

    private double InfinityNorm()
    {
        ReadOnlySpan<int> rowStart = Pattern.RowStart;
        double norm = 0;
        for (int row = 0; row < Pattern.Size; row++)
        {
            double sum = 0;
            for (int p = rowStart[row]; p < rowStart[row + 1]; p++)
            {
                sum += Complex.Abs(_values[p]);
            }

            norm = Math.Max(norm, sum);
        }

        return norm;
    }
}
