using System.Numerics;
using HarmonicSweep.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// Starting voltages: the network with every demand as a constant admittance at nominal voltage. They carry the phase
/// shifts of the transformers, which a flat start would have to find.
/// </summary>
internal sealed class PowerFlowStart(Circuit circuit, PowerFlowNodes nodes, Complex[] admittance, Complex[] norton)
{
    public Complex[] Voltages()
    {
        SparsityPattern pattern = circuit.Pattern;
        var solver = new NodalSolver(circuit.Analysis);
        Span<Complex> values = solver.Values;
        admittance.CopyTo(values);
        var right = (Complex[])norton.Clone();
        for (int row = 0; row < pattern.Size; row++)
        {
            values[pattern.Diagonal[row]] += nodes.SpecifiedMva[row] is var s && s.Real < 0 ? -Complex.Conjugate(s) : 0;
            if (nodes.Kind[row] is NodeKind.Dead or NodeKind.Reference)
            {
                Fix(values, right, row, nodes.Kind[row] == NodeKind.Dead ? 0 : nodes.HeldPu[row]);
            }
        }

        var voltage = new Complex[pattern.Size];
        solver.Factor();
        solver.Solve(right, voltage);
        for (int row = 0; row < pattern.Size; row++)
        {
            if (nodes.Kind[row] == NodeKind.HeldVoltage)
            {
                voltage[row] = Complex.FromPolarCoordinates(nodes.HeldPu[row], voltage[row].Phase);
            }
        }

        return voltage;
    }

    /// <summary>Replaces a row by V = given.</summary>
    private void Fix(Span<Complex> values, Complex[] right, int row, Complex given)
    {
        SparsityPattern pattern = circuit.Pattern;
        for (int p = pattern.RowStart[row]; p < pattern.RowStart[row + 1]; p++)
        {
            values[p] = pattern.Columns[p] == row ? 1 : 0;
        }

        right[row] = given;
    }
}
