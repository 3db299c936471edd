using System.Numerics;
using HarmonicSweep.Numerics;
using static System.FormattableString;

namespace HarmonicSweep.Network;

/// <summary>
/// Solves the nodal equations of a circuit, order after order. Owns its scratch memory: one thread, one solver.
/// Right-hand sides and solutions are per unit over the matrix rows, as <see cref="Circuit"/> says.
/// </summary>
public sealed class CircuitSolver
{
    private readonly NodalSolver _solver;
    private readonly Complex[] _unit;
    private readonly Complex[] _column;
    private double _order;

    /// <summary>Creates a solver over a circuit.</summary>
    public CircuitSolver(Circuit circuit)
    {
        Circuit = circuit;
        _solver = new NodalSolver(circuit.Analysis);
        _unit = new Complex[circuit.Pattern.Size];
        _column = new Complex[circuit.Pattern.Size];
    }

    /// <summary>The circuit.</summary>
    public Circuit Circuit { get; }

    /// <summary>Largest backward error of all solves so far.</summary>
    public double WorstBackwardError { get; private set; }

    /// <summary>Stamps and factors the nodal matrix at an order.</summary>
    public void Factor(double order)
    {
        _order = order;
        Circuit.Stamp(order, _solver.Values);
        _solver.Factor();
    }

    /// <summary>Solves for the voltages, per unit, that a vector of injected currents gives.</summary>
    /// <exception cref="ComputationException">The matrix is singular at this order: a lossless resonance exactly on it.</exception>
    public void Solve(ReadOnlySpan<Complex> injection, Span<Complex> voltage)
    {
        try
        {
            WorstBackwardError = Math.Max(WorstBackwardError, _solver.Solve(injection, voltage));
        }
        catch (SingularMatrixException exception)
        {
            double hertz = _order * Circuit.Plant.Plant.FrequencyHz;
            throw new ComputationException(new Finding(
                Severity.Error, "HS301", null,
                Invariant($"state {Circuit.Plant.State.Name}: the network cannot be solved at order {_order} ({hertz} Hz) near bus {Circuit.NameOfRow(exception.Row)}; the nodal matrix is singular there."),
                "a resonance without losses lies exactly on this order: give the elements there their resistance or quality factor."));
        }
    }

    /// <summary>Impedance between two rows at the present order, ohm: voltage at <paramref name="atRow"/> per ampere injected at <paramref name="fromRow"/>.</summary>
    public Complex Impedance(int atRow, int fromRow)
    {
        Column(fromRow, _column);
        return Ohm(_column[atRow], atRow, fromRow);
    }

    /// <summary>Voltages per unit of current injected at a row: a column of the inverse.</summary>
    public void Column(int fromRow, Span<Complex> voltage)
    {
        Array.Clear(_unit);
        _unit[fromRow] = 1;
        Solve(_unit, voltage);
    }

    /// <summary>A per-unit entry of the inverse as ohm.</summary>
    public Complex Ohm(Complex perUnit, int atRow, int fromRow) =>
        perUnit * (Circuit.NominalKv(Circuit.NodeOfRow[atRow]) * Circuit.NominalKv(Circuit.NodeOfRow[fromRow]));
}
