using System.Numerics;
using HarmonicSweep.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// Newton's linear step. Unknowns per node: change of angle and of ln|V|; equations: active and reactive power. With
/// I = Y V - J: dS_i/d(angle_k) = j S_i (k = i) - j V_i conj(Y_ik V_k), dS_i/d(ln|V_k|) = S_i (k = i) + V_i conj(Y_ik V_k).
/// </summary>
internal sealed class PowerFlowJacobian
{
    private readonly SparsityPattern _pattern;
    private readonly PowerFlowNodes _nodes;
    private readonly Complex[] _admittance;
    private readonly NodalSolver _solver;
    private readonly (int AngleActive, int MagnitudeActive, int AngleReactive, int MagnitudeReactive)[] _positions;
    private readonly Complex[] _right;
    private readonly Complex[] _solution;

    public PowerFlowJacobian(SparsityPattern pattern, PowerFlowNodes nodes, Complex[] admittance)
    {
        _pattern = pattern;
        _nodes = nodes;
        _admittance = admittance;
        var pairs = new List<(int, int)>();
        for (int i = 0; i < pattern.Size; i++)
        {
            foreach (int k in pattern.Row(i))
            {
                pairs.Add((2 * i, 2 * k));
                pairs.Add((2 * i, 2 * k + 1));
                pairs.Add((2 * i + 1, 2 * k + 1));
            }
        }

        var wide = new SparsityPattern(2 * pattern.Size, pairs);
        _solver = new NodalSolver(SparseAnalysis.Of(wide));
        _positions = new (int, int, int, int)[pattern.Count];
        for (int i = 0; i < pattern.Size; i++)
        {
            for (int p = pattern.RowStart[i]; p < pattern.RowStart[i + 1]; p++)
            {
                int k = pattern.Columns[p];
                _positions[p] = (
                    wide.IndexOf(2 * i, 2 * k), wide.IndexOf(2 * i, 2 * k + 1), wide.IndexOf(2 * i + 1, 2 * k), wide.IndexOf(2 * i + 1, 2 * k + 1));
            }
        }

        _right = new Complex[2 * pattern.Size];
        _solution = new Complex[2 * pattern.Size];
    }

    /// <summary>Returns per row (change of ln|V|) + j (change of angle).</summary>
    /// <exception cref="SingularMatrixException">The voltages are at the nose of the curve.</exception>
    public Complex[] Step(Complex[] voltage, Complex[] current, Complex[] mismatch)
    {
        Span<Complex> values = _solver.Values;
        for (int i = 0; i < _pattern.Size; i++)
        {
            bool power = _nodes.Kind[i] is NodeKind.ConstantPower or NodeKind.HeldVoltage;
            bool reactive = _nodes.Kind[i] == NodeKind.ConstantPower;
            _right[2 * i] = mismatch[i].Real;
            _right[2 * i + 1] = mismatch[i].Imaginary;
            for (int p = _pattern.RowStart[i]; p < _pattern.RowStart[i + 1]; p++)
            {
                int k = _pattern.Columns[p];
                Complex mutual = voltage[i] * Complex.Conjugate(_admittance[p] * voltage[k]);
                Complex self = k == i ? voltage[i] * Complex.Conjugate(current[i]) : Complex.Zero;
                Complex byAngle = Complex.ImaginaryOne * (self - mutual);
                Complex byMagnitude = self + mutual;
                // a held quantity keeps its unknown at zero
                values[_positions[p].AngleActive] = power ? byAngle.Real : k == i ? 1 : 0;
                values[_positions[p].MagnitudeActive] = power ? byMagnitude.Real : 0;
                values[_positions[p].AngleReactive] = reactive ? byAngle.Imaginary : 0;
                values[_positions[p].MagnitudeReactive] = reactive ? byMagnitude.Imaginary : k == i ? 1 : 0;
            }
        }

        _solver.Factor();
        _solver.Solve(_right, _solution);
        var step = new Complex[_pattern.Size];
        for (int i = 0; i < step.Length; i++)
        {
            step[i] = new Complex(_solution[2 * i + 1].Real, _solution[2 * i].Real);
        }

        return step;
    }
}
