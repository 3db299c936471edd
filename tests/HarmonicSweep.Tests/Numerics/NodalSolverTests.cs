using HarmonicSweep.Numerics;
using MathNet.Numerics.LinearAlgebra;
using Xunit;
using Complex = System.Numerics.Complex;

namespace HarmonicSweep.Tests.Numerics;

/// <summary>The sparse solver against the dense LU of a general-purpose library (MathNet.Numerics) and against closed forms.</summary>
public class NodalSolverTests
{
    /// <summary>Both solve well-conditioned systems of up to 60 unknowns: 1e-11 leaves three digits above the rounding expected.</summary>
    private const double Agreement = 1e-11;

    [Fact]
    public void Solve_random_networks_agrees_with_dense_library_lu()
    {
        for (int seed = 1; seed <= 40; seed++)
        {
            NodalSolver solver = RandomNetwork(seed, out Matrix<Complex> dense);
            var right = new Complex[solver.Pattern.Size];
            right[seed % right.Length] = new Complex(1, -0.5);
            var solution = new Complex[right.Length];
            solver.Factor();
            double error = solver.Solve(right, solution);
            Vector<Complex> expected = dense.LU().Solve(Vector<Complex>.Build.Dense(right));
            double scale = expected.AbsoluteMaximum().Magnitude;
            Assert.True(error <= 1e-14, $"seed {seed}: backward error {error}");
            for (int i = 0; i < right.Length; i++)
            {
                Assert.True((solution[i] - expected[i]).Magnitude <= Agreement * scale, $"seed {seed}, row {i}");
            }
        }
    }

    [Fact]
    public void Solve_zero_diagonal_is_served_by_the_pivoting_factorization()
    {
        // x1 = b2/2, x2 = b1/2 by hand: static diagonal pivots meet a zero at once
        var solver = new NodalSolver(SparseAnalysis.Of(new SparsityPattern(2, [(0, 1)])));
        solver.Values[solver.Pattern.IndexOf(0, 1)] = 2;
        solver.Values[solver.Pattern.IndexOf(1, 0)] = 2;
        solver.Factor();
        var solution = new Complex[2];
        double error = solver.Solve([3, 5], solution);
        Assert.Equal(new Complex(2.5, 0), solution[0]);
        Assert.Equal(new Complex(1.5, 0), solution[1]);
        Assert.Equal(1, solver.FallbackCount);
        Assert.Equal(0, error);
    }

    [Fact]
    public void Solve_singular_matrix_throws_and_names_the_row()
    {
        // rows 1 and 2 are joined to each other alone: their block [1 -1; -1 1] has no inverse
        var pattern = new SparsityPattern(3, [(1, 2)]);
        var solver = new NodalSolver(SparseAnalysis.Of(pattern));
        solver.Values[pattern.Diagonal[0]] = 1;
        solver.Values[pattern.Diagonal[1]] = 1;
        solver.Values[pattern.Diagonal[2]] = 1;
        solver.Values[pattern.IndexOf(1, 2)] = -1;
        solver.Values[pattern.IndexOf(2, 1)] = -1;
        solver.Factor();
        SingularMatrixException exception = Assert.Throws<SingularMatrixException>(() => solver.Solve([1, 1, 1], new Complex[3]));
        Assert.Contains(exception.Row, (int[])[1, 2]);
    }

    [Fact]
    public void Factor_and_solve_allocate_nothing()
    {
        NodalSolver solver = RandomNetwork(7, out _);
        var right = new Complex[solver.Pattern.Size];
        right[0] = 1;
        var solution = new Complex[right.Length];
        solver.Factor();
        solver.Solve(right, solution);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++)
        {
            solver.Factor();
            solver.Solve(right, solution);
        }

        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    [Fact]
    public void MinimumDegree_star_eliminates_the_leaves_first_and_adds_no_fill()
    {
        // a star of 9 leaves: any order that leaves the hub for last (or next to last) has no fill; L holds the 9 branches
        SparseAnalysis analysis = SparseAnalysis.Of(new SparsityPattern(10, Enumerable.Range(1, 9).Select(leaf => (0, leaf))));
        Assert.Equal(10 + 2 * 9, analysis.FactorCount);
    }

    private static NodalSolver RandomNetwork(int seed, out Matrix<Complex> dense)
    {
        var random = new Random(seed);
        int size = 2 + random.Next(58);
        var pairs = Enumerable.Range(1, size - 1).Select(i => (i, random.Next(i))).ToList();
        pairs.AddRange(Enumerable.Range(0, size / 4).Select(_ => (random.Next(size), random.Next(size))));
        var pattern = new SparsityPattern(size, pairs);
        var solver = new NodalSolver(SparseAnalysis.Of(pattern));
        dense = Matrix<Complex>.Build.Dense(size, size);
        for (int row = 0; row < size; row++)
        {
            foreach (int column in pattern.Row(row))
            {
                // unsymmetric values on the symmetric pattern, with the diagonal weighty but not dominant
                Complex value = new(random.NextDouble() - 0.5, random.NextDouble() - 0.5);
                value += row == column ? new Complex(0.4, row % 3 == 0 ? 1.5 : -1.5) : 0;
                solver.Values[pattern.IndexOf(row, column)] = value;
                dense[row, column] = value;
            }
        }

        return solver;
    }
}
