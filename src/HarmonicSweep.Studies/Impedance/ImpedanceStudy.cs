using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Harmonic frequency scan: driving-point and transfer impedance, resonances, background gain.</summary>
public static class ImpedanceStudy
{
    /// <summary>Runs the scan in every state asked for.</summary>
    /// <remarks>Z(h) does not depend on the power flow: a state whose power flow diverges is scanned all the same, with a warning.</remarks>
    /// <exception cref="ComputationException">A matrix is singular.</exception>
    /// <exception cref="CaseException">A state cannot be built.</exception>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public static StudyResult Run(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation)
    {
        int inner = request.States.Count >= request.Threads ? 1 : request.Threads;
        return StudyResults.Of(request, progress, cancellation, state =>
        {
            var plant = new PlantInState(request.Plant, state);
            return AddTo(Start(plant), request, plant, inner, cancellation);
        });
    }

    private static StateResult Start(PlantInState plant)
    {
        try
        {
            return StateResults.Start(plant, PowerFlow.Solve(plant));
        }
        catch (ComputationException exception)
        {
            return new StateResult
            {
                State = plant.State.Name,
                InjectedOrders = InjectedOrders.Of(plant, null),
                PowerFlowFailure = exception.Finding,
            };
        }
    }

    /// <summary>Adds curves, resonances, hand formulas of banks and background gains to what is known of a state.</summary>
    internal static StateResult AddTo(
        StateResult result, StudyRequest request, PlantInState plant, int threads, CancellationToken cancellation)
    {
        IReadOnlyList<string> buses = WatchedBuses.Of(request);
        Circuit circuit = Circuit.Build(plant, CircuitScope.Harmonic, request.Sequence);
        double[] orders = ScanOrders(request);
        IReadOnlyList<ImpedanceCurve> curves = Curves(circuit, request, buses, orders, threads, cancellation, out double worstCurve);
        IReadOnlyList<Resonance> resonances = Resonances(
            circuit, request, buses, result.InjectedOrders, cancellation, out double worstResonance);
        IReadOnlyList<BackgroundGain> gains = BackgroundGains.Of(
            circuit, request, orders, result.InjectedOrders, threads, cancellation, out double worstGain);
        IReadOnlyList<BankResonance> banks = BankResonances.Of(plant, resonances);
        return result with
        {
            Impedance = curves,
            Resonances = resonances,
            BankResonances = banks,
            HandChecks = [.. result.HandChecks, .. HandChecks.OfResonances(plant, banks)],
            Gains = gains,
            WorstBackwardError = new[] { result.WorstBackwardError, worstCurve, worstResonance, worstGain }.Max(),
        };
    }

    /// <summary>Orders listed: exactly those asked for, else the scan range.</summary>
    internal static double[] ScanOrders(StudyRequest request)
    {
        if (request.Orders.Count > 0)
        {
            return [.. request.Orders];
        }

        SweepRange range = request.Settings.Sweep;
        double fundamental = request.Plant.FrequencyHz;
        int count = (int)Math.Floor((range.ToHz - range.FromHz) / range.StepHz * (1 + 1e-12)) + 1;
        var orders = new List<double>(count + 1);
        for (int i = 0; i < count; i++)
        {
            orders.Add(HarmonicOrder.Snap((range.FromHz + i * range.StepHz) / fundamental));
        }

        double last = HarmonicOrder.Snap(range.ToHz / fundamental);
        if (orders[^1] < last - HarmonicOrder.IntegerTolerance)
        {
            orders.Add(last);
        }

        return [.. orders];
    }

    private static ImpedanceCurve[] Curves(
        Circuit circuit, StudyRequest request, IReadOnlyList<string> buses, double[] orders, int threads,
        CancellationToken cancellation, out double worst)
    {
        var ohm = new Complex?[buses.Count][];
        for (int b = 0; b < buses.Count; b++)
        {
            ohm[b] = new Complex?[orders.Length];
        }

        int from = request.InjectedAt is { } injected ? circuit.RowOf(injected) : -1;
        double[] snapped = [.. orders.Select(HarmonicOrder.Snap)];
        worst = Sweep.Run(circuit, snapped, threads, cancellation, (solver, index) =>
        {
            if (request.InjectedAt is null)
            {
                for (int b = 0; b < buses.Count; b++)
                {
                    int row = circuit.RowOf(buses[b]);
                    ohm[b][index] = row < 0 ? null : solver.Impedance(row, row);
                }

                return;
            }

            if (from < 0)
            {
                return; // injected at an open bus: every transfer impedance stays open
            }

            var column = new Complex[circuit.Pattern.Size];
            solver.Column(from, column);
            for (int b = 0; b < buses.Count; b++)
            {
                int row = circuit.RowOf(buses[b]);
                ohm[b][index] = row < 0 ? null : solver.Ohm(column[row], row, from);
            }
        });
        return [.. buses.Select((bus, b) => new ImpedanceCurve(request.Sequence, bus, request.InjectedAt ?? bus, orders, ohm[b]))];
    }

    /// <summary>Resonances of the driving points of the buses inside the range of the scan.</summary>
    internal static IReadOnlyList<Resonance> Resonances(
        Circuit circuit, StudyRequest request, IReadOnlyList<string> buses, IReadOnlyList<double> injected,
        CancellationToken cancellation, out double worst)
    {
        string[] seen = [.. buses.Where(b => circuit.RowOf(b) >= 0)];
        worst = 0;
        if (seen.Length == 0)
        {
            return [];
        }

        double fundamental = request.Plant.FrequencyHz;
        SweepRange range = request.Settings.Sweep;
        IReadOnlyList<Extremum>[] extrema = ResonanceFinder.Find(
            circuit, [.. seen.Select(circuit.RowOf)], range.FromHz / fundamental, range.ToHz / fundamental, cancellation, out worst);
        return
        [
            .. seen.SelectMany((bus, b) => extrema[b].Select(e => new Resonance(
                circuit.Sequence, bus, e.IsPeak ? ResonanceKind.Parallel : ResonanceKind.Series, e.Order, e.Order * fundamental,
                Complex.Abs(e.Impedance), e.QualityFactor, InjectedOrders.Nearest(injected, e.Order)))),
        ];
    }
}
