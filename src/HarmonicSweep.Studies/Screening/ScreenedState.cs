using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>What screening keeps of one solved state.</summary>
internal sealed record ScreenedState
{
    /// <summary>Columns of the heat map at most: a fifth of an order up to 50; the resonances themselves are refined apart.</summary>
    private const int MostMapColumns = 246;

    public required ScreenJob Job { get; init; }

    public required string Name { get; init; }

    public required IReadOnlyList<BankPosition> Positions { get; init; }

    /// <summary>Per bus: THD (order null, percent of V_1) and each solved order above 1 (percent of nominal).</summary>
    public required IReadOnlyList<(string Bus, double? Order, double Percent)> BusPercent { get; init; }

    public required IReadOnlyList<double> Injected { get; init; }

    public required IReadOnlyList<double> MapOrders { get; init; }

    public required IReadOnlyList<Complex?> MapOhm { get; init; }

    public required double WorstBackwardError { get; init; }

    /// <summary>Solves one state and looks at the banks moved in it.</summary>
    public static ScreenedState Of(ScreenJob job, StudyRequest request, CancellationToken cancellation)
    {
        var plant = new PlantInState(request.Plant, job.State);
        PowerFlowSolution powerFlow = PowerFlow.Solve(plant);
        DistortionSolution solution = DistortionSolution.Of(powerFlow, [], cancellation);
        IReadOnlyList<double> injected = InjectedOrders.Of(plant, powerFlow);
        Circuit circuit = Circuit.Build(plant, CircuitScope.Harmonic);
        string[] buses = [.. job.Moved.Select(m => m.Bank.Bus).Distinct(StringComparer.Ordinal)];
        IReadOnlyList<Resonance> resonances = ImpedanceStudy.Resonances(circuit, request, buses, injected, cancellation, out double worstResonance);
        double[] mapOrders = request.Combinations ? [] : MapOrdersOf(request);
        return new ScreenedState
        {
            Job = job,
            Name = job.State.Name,
            Positions = [.. job.Moved.Select(m => Position(job, request, solution, resonances, m.Bank, m.Steps))],
            BusPercent = Percentages(request, solution),
            Injected = injected,
            MapOrders = mapOrders,
            MapOhm = Curve(circuit, buses[0], mapOrders, cancellation, out double worstMap),
            WorstBackwardError = Math.Max(solution.WorstBackwardError, Math.Max(worstResonance, worstMap)),
        };
    }

    private static BankPosition Position(
        ScreenJob job, StudyRequest request, DistortionSolution solution, IReadOnlyList<Resonance> resonances,
        CapacitorBank bank, int steps)
    {
        PowerFlowSolution powerFlow = solution.PowerFlow;
        bool live = powerFlow.IsLive(bank.Bus);
        Resonance[] parallel = [.. resonances.Where(r => r.Bus == bank.Bus && r.Kind == ResonanceKind.Parallel)];
        Resonance? nearest = parallel.Where(r => r.Distance is not null).MinBy(r => r.Distance);
        Complex? pcc = PccPower(request, solution);
        return new BankPosition
        {
            BaseState = job.BaseState,
            State = job.State.Name,
            Bank = bank.Name,
            Bus = bank.Bus,
            StepsIn = steps,
            Steps = bank.Steps,
            Strength = job.Strength,
            KvarIn = bank.RatedKvar * steps / bank.Steps,
            HandOrder = BankResonances.HandOrder(powerFlow.Circuit.Plant, bank, steps)?.Order,
            ParallelResonances = parallel,
            Nearest = nearest,
            DoNotDwell = nearest?.Distance <= request.NearOrders,
            Loading = live ? CapacitorDuty.Of(bank, steps, solution, request.Settings.Rule) : null,
            PccPowerFactor = pcc is { } s && Complex.Abs(s) > 0 ? s.Real / Complex.Abs(s) : null,
            PccKvar = pcc?.Imaginary * 1000,
            BusVoltagePercent = live ? Complex.Abs(powerFlow.VoltagePu(bank.Bus)) * 100 : null,
            ThdPercent = solution.Distortion(request.Plant.Bus(bank.Bus)).First(d => d.Rule == request.Settings.Rule).PercentOfFundamental,
        };
    }

    /// <summary>Power the supply side delivers into the PCC at the fundamental, MVA; null without PCC or supply there.</summary>
    private static Complex? PccPower(StudyRequest request, DistortionSolution solution)
    {
        if (request.Settings.PccBus is not { } pcc || !solution.PowerFlow.IsLive(pcc))
        {
            return null;
        }

        var current = new PccCurrent(solution.PowerFlow.Circuit, pcc);
        return current.Exists
            ? solution.PowerFlow.VoltageKv(pcc) * Complex.Conjugate(Summation.Phasor(current.Delivered(solution.At(1)))) * (Math.Sqrt(3) / 1000)
            : null;
    }

    private static List<(string, double?, double)> Percentages(StudyRequest request, DistortionSolution solution)
    {
        SummationRule rule = request.Settings.Rule;
        var values = new List<(string, double?, double)>();
        foreach (Bus bus in request.Plant.Buses.Where(b => solution.PowerFlow.IsLive(b.Name)))
        {
            double fundamental = Complex.Abs(solution.PowerFlow.VoltageKv(bus.Name));
            values.Add((bus.Name, null, solution.HarmonicKv(bus.Name)[rule] / fundamental * 100));
            values.AddRange(solution.Orders
                .Where(o => o.Order != 1)
                .Select(o => (bus.Name, (double?)o.Order, Summation.Of(o.BusKv[bus.Name], o.Order)[rule] / bus.NominalKv * 100)));
        }

        return values;
    }

    private static double[] MapOrdersOf(StudyRequest request)
    {
        SweepRange range = request.Settings.Sweep;
        double fundamental = request.Plant.FrequencyHz;
        int count = (int)Math.Clamp((range.ToHz - range.FromHz) / range.StepHz, 1, MostMapColumns - 1);
        return [.. Enumerable.Range(0, count + 1).Select(i => (range.FromHz + (range.ToHz - range.FromHz) * i / count) / fundamental)];
    }

    private static Complex?[] Curve(Circuit circuit, string bus, double[] orders, CancellationToken cancellation, out double worst)
    {
        var ohm = new Complex?[orders.Length];
        int row = circuit.RowOf(bus);
        worst = 0;
        if (row >= 0)
        {
            worst = Sweep.Run(circuit, orders, 1, cancellation, (solver, index) => ohm[index] = solver.Impedance(row, row));
        }

        return ohm;
    }
}
