using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>An extremum of |Z| found at a matrix row.</summary>
/// <param name="Order">Order.</param>
/// <param name="IsPeak">Maximum (parallel) or minimum (series).</param>
/// <param name="Impedance">Z there, ohm.</param>
/// <param name="QualityFactor">(h/2)|d arg Z/dh| there.</param>
internal sealed record Extremum(double Order, bool IsPeak, Complex Impedance, double QualityFactor);

/// <summary>Finds every parallel and series resonance of the driving-point impedances of some rows of a circuit.</summary>
internal sealed class ResonanceFinder
{
    /// <summary>An interval is halved while the middle of ln Z departs by more than this from the line between its neighbours.</summary>
    private const double Bend = 0.003;

    /// <summary>Halvings at most; a needle of quality factor 1e6 is resolved long before.</summary>
    private const int DeepestHalving = 18;

    /// <summary>An extremum whose ln|Z| differs by less than this from both neighbouring extrema is left out.</summary>
    private const double SmallestStep = 0.01;

    private readonly Circuit _circuit;
    private readonly int[] _rows;
    private readonly CircuitSolver _solver;
    private readonly CancellationToken _cancellation;

    private ResonanceFinder(Circuit circuit, int[] rows, CancellationToken cancellation)
    {
        _circuit = circuit;
        _rows = rows;
        _solver = new CircuitSolver(circuit);
        _cancellation = cancellation;
    }

    /// <summary>Extrema of |Z| of each row inside a range of orders, ascending.</summary>
    /// <param name="circuit">Circuit.</param>
    /// <param name="rows">Matrix rows.</param>
    /// <param name="from">Lowest order.</param>
    /// <param name="to">Highest order.</param>
    /// <param name="cancellation">Cancels between orders.</param>
    /// <param name="worstBackwardError">Largest backward error met.</param>
    public static IReadOnlyList<Extremum>[] Find(
        Circuit circuit, int[] rows, double from, double to, CancellationToken cancellation, out double worstBackwardError)
    {
        var finder = new ResonanceFinder(circuit, rows, cancellation);
        List<Sample> curve = finder.Curve(from, to);
        IReadOnlyList<Extremum>[] found = [.. rows.Select((row, index) => finder.Extrema(curve, row, index))];
        worstBackwardError = finder._solver.WorstBackwardError;
        return found;
    }

    /// <summary>ln Z of every row at one order.</summary>
    private sealed record Sample(double Order, Complex[] LogZ);

    private Sample Evaluate(double order)
    {
        _cancellation.ThrowIfCancellationRequested();
        _solver.Factor(order);
        var logZ = new Complex[_rows.Length];
        for (int i = 0; i < _rows.Length; i++)
        {
            logZ[i] = Complex.Log(_solver.Impedance(_rows[i], _rows[i]));
        }

        return new Sample(order, logZ);
    }

    /// <summary>Samples of the range: the grid of the network, refined where any curve bends.</summary>
    private List<Sample> Curve(double from, double to)
    {
        Sample[] grid = [.. ScanGrid.Orders(_circuit, from, to).Select(Evaluate)];
        var curve = new List<Sample> { grid[0] };
        for (int i = 0; i + 1 < grid.Length; i++)
        {
            bool bends = (i > 0 && Bends(grid[i - 1], grid[i], grid[i + 1]))
                || (i + 2 < grid.Length && Bends(grid[i], grid[i + 1], grid[i + 2]));
            if (bends)
            {
                Halve(curve, grid[i], grid[i + 1], DeepestHalving);
            }

            curve.Add(grid[i + 1]);
        }

        return curve;
    }

    private void Halve(List<Sample> curve, Sample left, Sample right, int depth)
    {
        Sample middle = Evaluate((left.Order + right.Order) / 2);
        bool again = depth > 0 && Bends(left, middle, right);
        if (again)
        {
            Halve(curve, left, middle, depth - 1);
        }

        curve.Add(middle);
        if (again)
        {
            Halve(curve, middle, right, depth - 1);
        }
    }

    private static bool Bends(Sample left, Sample middle, Sample right)
    {
        double share = (middle.Order - left.Order) / (right.Order - left.Order);
        for (int i = 0; i < middle.LogZ.Length; i++)
        {
            Complex line = left.LogZ[i] + (right.LogZ[i] - left.LogZ[i]) * share;
            if (Complex.Abs(middle.LogZ[i] - line) > Bend)
            {
                return true;
            }
        }

        return false;
    }

    private List<Extremum> Extrema(List<Sample> curve, int row, int index)
    {
        var found = new List<Extremum>();
        for (int i = 1; i + 1 < curve.Count; i++)
        {
            double before = curve[i - 1].LogZ[index].Real;
            double here = curve[i].LogZ[index].Real;
            double after = curve[i + 1].LogZ[index].Real;
            // a flat top belongs to its last point, so that it counts once
            if ((here >= before && here > after) || (here <= before && here < after))
            {
                found.Add(Refine(row, curve[i - 1].Order, curve[i].Order, curve[i + 1].Order, here > after));
            }
        }

        return LeaveOutRipples(found);
    }

    private static List<Extremum> LeaveOutRipples(List<Extremum> found)
    {
        double Step(int a, int b) => b < 0 || b >= found.Count
            ? double.NaN
            : Math.Abs(Math.Log(Complex.Abs(found[a].Impedance) / Complex.Abs(found[b].Impedance)));
        return [.. found.Where((_, i) => found.Count == 1 || !(double.MaxNumber(Step(i, i - 1), Step(i, i + 1)) < SmallestStep))];
    }

    private Extremum Refine(int row, double left, double start, double right, bool isPeak)
    {
        double sign = isPeak ? -1 : 1;
        double order = BrentMinimum.Find(h => sign * Math.Log(Complex.Abs(At(row, h))), left, start, right, 1e-8);
        return new Extremum(order, isPeak, At(row, order), order / 2 * Math.Abs(PhaseSlope(row, order)));
    }

    private Complex At(int row, double order)
    {
        _cancellation.ThrowIfCancellationRequested();
        _solver.Factor(order);
        return _solver.Impedance(row, row);
    }

    /// <summary>
    /// d arg Z/dh by the five-point central difference. The spacing is 1e-6 of the order: at a quality factor of 1,000 that is
    /// a thousandth of the width, and the rounding of arg Z, some 1e-15, stays below 1e-8 of the slope.
    /// </summary>
    private double PhaseSlope(int row, double order)
    {
        double spacing = 1e-6 * order;
        double Turn(double steps) => (At(row, order + steps * spacing) / At(row, order - steps * spacing)).Phase;
        return (8 * Turn(1) - Turn(2)) / (12 * spacing);
    }
}
