using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Visits the orders of a scan with a factored circuit, in contiguous blocks over threads.</summary>
internal static class Sweep
{
    /// <summary>Orders a thread takes at a time: enough to pay for its solver, few enough to share evenly.</summary>
    private const int BlockLength = 256;

    /// <summary>
    /// Factors the circuit at every order and calls <paramref name="visit"/> with the solver and the index of the order.
    /// The visitor writes only what belongs to its index.
    /// </summary>
    /// <returns>Largest backward error of all solves.</returns>
    public static double Run(
        Circuit circuit, IReadOnlyList<double> orders, int threads, CancellationToken cancellation, Action<CircuitSolver, int> visit)
    {
        if (circuit.Pattern.Size == 0)
        {
            return 0;
        }

        int length = threads <= 1 ? Math.Max(orders.Count, 1) : BlockLength;
        int[] starts = [.. Enumerable.Range(0, (orders.Count + length - 1) / length).Select(b => b * length)];
        double[] worst = Parallelism.Map(starts, threads, null, cancellation, start =>
        {
            var solver = new CircuitSolver(circuit);
            for (int i = start; i < Math.Min(start + length, orders.Count); i++)
            {
                if ((i & 63) == 0)
                {
                    cancellation.ThrowIfCancellationRequested();
                }

                solver.Factor(orders[i]);
                visit(solver, i);
            }

            return solver.WorstBackwardError;
        });
        return worst.DefaultIfEmpty(0).Max();
    }
}
