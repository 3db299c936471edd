using System.Numerics;
using BenchmarkDotNet.Attributes;
using HarmonicSweep.Numerics;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace HarmonicSweep.Benchmarks;

/// <summary>
/// One order of a sweep on a seeded radial network with chords: factor, solve and backward error, sparse against the dense LU
/// of a general-purpose library. Read the ratio; the machine is noisy.
/// </summary>
public class NodalSolve
{
    private const int Seed = 20261201;

    private NodalSolver _sparse = null!;
    private Complex[] _right = null!;
    private Complex[] _solution = null!;
    private Matrix<Complex> _dense = null!;

    [Params(14, 100, 300)]
    public int Buses { get; set; }

    [GlobalSetup]
    public void SetUp()
    {
        var random = new Random(Seed);
        var pairs = new List<(int Row, int Column)>();
        for (int bus = 1; bus < Buses; bus++)
        {
            pairs.Add((bus, random.Next(Math.Max(0, bus - 6), bus)));
        }

        for (int chord = 0; chord < Buses / 25; chord++)
        {
            int bus = random.Next(8, Buses);
            pairs.Add((bus, bus - 7));
        }

        var pattern = new SparsityPattern(Buses, pairs);
        _sparse = new NodalSolver(SparseAnalysis.Of(pattern));
        foreach ((int row, int column) in pairs)
        {
            Complex y = 1 / new Complex(0.01 + 0.02 * random.NextDouble(), 0.05 + random.NextDouble());
            _sparse.Values[pattern.IndexOf(row, column)] -= y;
            _sparse.Values[pattern.IndexOf(column, row)] -= y;
            _sparse.Values[pattern.Diagonal[row]] += y;
            _sparse.Values[pattern.Diagonal[column]] += y;
        }

        for (int bus = 0; bus < Buses; bus++)
        {
            _sparse.Values[pattern.Diagonal[bus]] += new Complex(0.01, bus % 5 == 0 ? 0.2 : -0.02);
        }

        _dense = Matrix<Complex>.Build.Dense(Buses, Buses);
        for (int row = 0; row < Buses; row++)
        {
            foreach (int column in pattern.Row(row))
            {
                _dense[row, column] = _sparse.Values[pattern.IndexOf(row, column)];
            }
        }

        _right = new Complex[Buses];
        _right[Buses / 2] = 1;
        _solution = new Complex[Buses];
        MathNet.Numerics.Control.UseSingleThread();
    }

    [Benchmark(Baseline = true)]
    public double Sparse()
    {
        _sparse.Factor();
        return _sparse.Solve(_right, _solution);
    }

    [Benchmark]
    public Complex Dense() => _dense.LU().Solve(MathNet.Numerics.LinearAlgebra.Vector<Complex>.Build.Dense(_right))[0];
}
