using System.Numerics;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Complex;
using RealVector = MathNet.Numerics.LinearAlgebra.Vector<double>;

namespace HarmonicSweep.Tests.Twin;

/// <summary>
/// The nodal matrix of a set of parts, dense, and its inverse over the nodes that have a path to ground.
/// Beside it the sum of the magnitudes of all stamps: the scale against which rounding must be measured.
/// </summary>
internal sealed class TwinMatrix
{
    /// <summary>Spacing of doubles at 1.</summary>
    public const double MachineEpsilon = 2.220446049250313e-16;

    private readonly List<int> _groundedNodes;
    private readonly Matrix<Complex> _inverse;
    private readonly Lazy<Matrix<double>> _rounding;

    public TwinMatrix(TwinNodes nodes, IReadOnlyList<TwinPart> parts)
    {
        Nodes = nodes;
        Y = new DenseMatrix(nodes.Count);
        Scale = new MathNet.Numerics.LinearAlgebra.Double.DenseMatrix(nodes.Count);
        foreach (TwinPart part in parts)
        {
            for (int i = 0; i < part.Buses.Count; i++)
            {
                for (int k = 0; k < part.Buses.Count; k++)
                {
                    int row = nodes.Of(part.Buses[i]);
                    int column = nodes.Of(part.Buses[k]);
                    Y[row, column] += part.Y[i, k];
                    Scale[row, column] += part.Y[i, k].Magnitude;
                }
            }
        }

        int[] island = nodes.Islands(parts);
        HashSet<int> grounded = [.. parts.Where(p => p.TiesToGround).SelectMany(p => p.Buses).Select(b => island[nodes.Of(b)])];
        _groundedNodes = [.. Enumerable.Range(0, nodes.Count).Where(n => grounded.Contains(island[n]))];
        _inverse = Invert();
        _rounding = new Lazy<Matrix<double>>(() => MachineEpsilon * Magnitudes(_inverse) * GroundedScale() * Magnitudes(_inverse));
    }

    /// <summary>Node numbering.</summary>
    public TwinNodes Nodes { get; }

    /// <summary>Nodal admittance matrix, siemens.</summary>
    public Matrix<Complex> Y { get; }

    /// <summary>Sum of stamp magnitudes, siemens.</summary>
    public Matrix<double> Scale { get; }

    /// <summary>Whether the bus has a path to ground.</summary>
    public bool IsGrounded(string bus) => _groundedNodes.Contains(Nodes.Of(bus));

    /// <summary>Voltage at one bus per ampere injected at another, ohm; null with either end open.</summary>
    public Complex? Impedance(string at, string from)
    {
        int i = _groundedNodes.IndexOf(Nodes.Of(at));
        int k = _groundedNodes.IndexOf(Nodes.Of(from));
        return i < 0 || k < 0 ? null : _inverse[i, k];
    }

    /// <summary>Node voltages for node injections; 0 where there is no path to ground.</summary>
    public Complex[] Solve(Complex[] injections)
    {
        var voltages = new Complex[Nodes.Count];
        for (int i = 0; i < _groundedNodes.Count; i++)
        {
            for (int k = 0; k < _groundedNodes.Count; k++)
            {
                voltages[_groundedNodes[i]] += _inverse[i, k] * injections[_groundedNodes[k]];
            }
        }

        return voltages;
    }

    /// <summary>
    /// How far Z may move when every stamp is off by one rounding: |Z| |Y| |Z| eps, entry by entry
    /// (first-order perturbation theory; dZ = -Z dY Z).
    /// </summary>
    public double RoundingOhm(string at, string from) =>
        _rounding.Value[_groundedNodes.IndexOf(Nodes.Of(at)), _groundedNodes.IndexOf(Nodes.Of(from))];

    /// <summary>How far each node voltage may move when every stamp is off by one rounding: |Z| |Y| |V| eps.</summary>
    public double[] RoundingVolt(Complex[] voltages)
    {
        RealVector magnitude = RealVector.Build.Dense(_groundedNodes.Count, i => voltages[_groundedNodes[i]].Magnitude);
        RealVector move = MachineEpsilon * (Magnitudes(_inverse) * (GroundedScale() * magnitude));
        var bound = new double[Nodes.Count];
        for (int i = 0; i < _groundedNodes.Count; i++)
        {
            bound[_groundedNodes[i]] = move[i];
        }

        return bound;
    }

    private static Matrix<double> Magnitudes(Matrix<Complex> matrix) =>
        Matrix<double>.Build.Dense(matrix.RowCount, matrix.ColumnCount, (i, k) => matrix[i, k].Magnitude);

    private Matrix<double> GroundedScale() => Matrix<double>.Build.Dense(
        _groundedNodes.Count, _groundedNodes.Count, (i, k) => Scale[_groundedNodes[i], _groundedNodes[k]]);

    private Matrix<Complex> Invert()
    {
        int n = _groundedNodes.Count;
        if (n == 0)
        {
            return Y;
        }

        Matrix<Complex> y = DenseMatrix.Create(n, n, (i, k) => Y[_groundedNodes[i], _groundedNodes[k]]);
        Matrix<Complex> z = y.LU().Inverse();
        for (int step = 0; step < 2; step++)
        {
            // Newton's step for an inverse removes what the factorisation lost
            z += z * (DenseMatrix.CreateIdentity(n) - y * z);
        }

        return z;
    }
}
