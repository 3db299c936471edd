using System.Numerics;
using HarmonicSweep.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// Newton's linear step. Unknowns per node: change of angle and of ln|V|; equations: active and reactive power. With
/// I = Y V - J: dS_i/d(angle_k) = j S_i (k = i) - j V_i conj(Y_ik V_k), dS_i/d(ln|V_k|) = S_i (k = i) + V_i conj(Y_ik V_k).
/// </summary>
internal sealed class PowerFlowJacobian(SparsityPattern pattern, PowerFlowNodes nodes, Complex[] admittance)
{
    /// <summary>Returns per row (change of ln|V|) + j (change of angle).</summary>
    public Complex[] Step(Complex[] voltage, Complex[] current, Complex[] mismatch)
    {
        int size = pattern.Size;
        var pairs = new List<(int, int)>();
        for (int i = 0; i < size; i++)
        {
            foreach (int k in pattern.Row(i))
            {
                pairs.Add((2 * i, 2 * k));
                pairs.Add((2 * i, 2 * k + 1));
                pairs.Add((2 * i + 1, 2 * k + 1));
            }
        }

        var wide = new SparsityPattern(2 * size, pairs);
        var values = new Complex[wide.Count];
        var right = new Complex[2 * size];
        for (int i = 0; i < size; i++)
        {
            bool power = nodes.Kind[i] is NodeKind.ConstantPower or NodeKind.HeldVoltage;
            bool reactive = nodes.Kind[i] == NodeKind.ConstantPower;
            right[2 * i] = mismatch[i].Real;
            right[2 * i + 1] = mismatch[i].Imaginary;
            for (int p = pattern.RowStart[i]; p < pattern.RowStart[i + 1]; p++)
            {
                int k = pattern.Columns[p];
                Complex mutual = voltage[i] * Complex.Conjugate(admittance[p] * voltage[k]);
                Complex self = k == i ? voltage[i] * Complex.Conjugate(current[i]) : Complex.Zero;
                Complex byAngle = Complex.ImaginaryOne * (self - mutual);
                Complex byMagnitude = self + mutual;
                // a held quantity keeps its unknown at zero
                values[wide.IndexOf(2 * i, 2 * k)] = power ? byAngle.Real : k == i ? 1 : 0;
                values[wide.IndexOf(2 * i, 2 * k + 1)] = power ? byMagnitude.Real : 0;
                values[wide.IndexOf(2 * i + 1, 2 * k)] = reactive ? byAngle.Imaginary : 0;
                values[wide.IndexOf(2 * i + 1, 2 * k + 1)] = reactive ? byMagnitude.Imaginary : k == i ? 1 : 0;
            }
        }

        var solution = new Complex[2 * size];
        PivotingLu.Factor(wide, values).Solve(right, solution);
        var step = new Complex[size];
        for (int i = 0; i < size; i++)
        {
            step[i] = new Complex(solution[2 * i + 1].Real, solution[2 * i].Real);
        }

        return step;
    }
}
