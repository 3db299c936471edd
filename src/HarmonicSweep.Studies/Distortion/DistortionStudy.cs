using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Harmonic voltages, currents and distortion of every state, judged against the limit sets asked for.</summary>
public static class DistortionStudy
{
    /// <summary>Highest order that counts in THD and TDD.</summary>
    public const int HighestOrder = 50;

    /// <summary>Runs the study in every state asked for.</summary>
    /// <exception cref="ComputationException">A power flow diverges, a matrix is singular or currents do not balance.</exception>
    /// <exception cref="CaseException">A state cannot be built.</exception>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public static StudyResult Run(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation) =>
        StudyResults.Of(request, progress, cancellation, state =>
        {
            var plant = new PlantInState(request.Plant, state);
            PowerFlowSolution powerFlow = PowerFlow.Solve(plant);
            return AddTo(StateResults.Start(plant, powerFlow), request, powerFlow, cancellation);
        });

    /// <summary>Adds voltages, currents, distortion and limits to what is known of a state.</summary>
    internal static StateResult AddTo(
        StateResult result, StudyRequest request, PowerFlowSolution powerFlow, CancellationToken cancellation)
    {
        DistortionSolution solution = DistortionSolution.Of(powerFlow, request.Orders, cancellation);
        double[] listed = request.Orders.Count > 0 ? [.. request.Orders] : [.. solution.Orders.Select(o => o.Order)];
        var asked = new HashSet<string>(
            request.Buses.Count > 0 ? request.Buses : request.Plant.Buses.Select(b => b.Name), StringComparer.Ordinal);
        var voltages = new List<HarmonicVoltage>();
        var currents = new List<HarmonicCurrent>();
        foreach (double order in listed)
        {
            SolvedOrder solved = solution.At(HarmonicOrder.Snap(order));
            voltages.AddRange(request.Plant.Buses.Where(b => asked.Contains(b.Name)).Select(b => solution.Voltage(solved, b, order)));
            currents.AddRange(solved.Ends
                .Where(e => request.Buses.Count == 0 || asked.Contains(e.Bus))
                .Select(e => new HarmonicCurrent(e.Name, e.Bus, order, Summation.Phasor(e.Ampere), Summation.Of(e.Ampere, order))));
        }

        return result with
        {
            Voltages = voltages,
            Currents = currents,
            Distortion = [.. request.Plant.Buses.Where(b => asked.Contains(b.Name)).SelectMany(solution.Distortion)],
            Limits = Standards.LimitJudge.Judge(request, solution),
            WorstBackwardError = Math.Max(result.WorstBackwardError, solution.WorstBackwardError),
            CurrentBalanceResidual = solution.CurrentBalanceResidual,
        };
    }
}

/// <summary>Every solved order of one state.</summary>
internal sealed class DistortionSolution
{
    private readonly Dictionary<double, SolvedOrder> _byOrder;

    private DistortionSolution(PowerFlowSolution powerFlow, Dictionary<double, SolvedOrder> byOrder, double backwardError, double residual)
    {
        PowerFlow = powerFlow;
        _byOrder = byOrder;
        Orders = [.. byOrder.Values.OrderBy(o => o.Order)];
        WorstBackwardError = backwardError;
        CurrentBalanceResidual = residual;
    }

    /// <summary>Fundamental.</summary>
    public PowerFlowSolution PowerFlow { get; }

    /// <summary>Solved orders, 1 included, ascending.</summary>
    public IReadOnlyList<SolvedOrder> Orders { get; }

    /// <summary>Largest backward error.</summary>
    public double WorstBackwardError { get; }

    /// <summary>Largest current-balance residual.</summary>
    public double CurrentBalanceResidual { get; }

    /// <summary>Solves every order some source has, and any further orders asked for.</summary>
    public static DistortionSolution Of(PowerFlowSolution powerFlow, IReadOnlyList<double> further, CancellationToken cancellation)
    {
        PlantInState plant = powerFlow.Circuit.Plant;
        var solver = new HarmonicSolver(plant, powerFlow);
        var byOrder = new Dictionary<double, SolvedOrder>();
        double residual = 0;
        foreach (double order in (double[])[1, .. solver.SourceOrders, .. further.Select(HarmonicOrder.Snap)])
        {
            cancellation.ThrowIfCancellationRequested();
            if (!byOrder.ContainsKey(order))
            {
                SolvedOrder solved = order == 1 ? BranchCurrents.Fundamental(powerFlow) : solver.Solve(order);
                byOrder[order] = solved;
                residual = Math.Max(residual, CurrentBalance.Residual(plant, powerFlow.Circuit.Nodes, solved));
            }
        }

        return new DistortionSolution(powerFlow, byOrder, solver.WorstBackwardError, residual);
    }

    /// <summary>A solved order.</summary>
    public SolvedOrder At(double order) => _byOrder[order];

    /// <summary>Voltage of a bus at a solved order, listed under the order as it was asked for.</summary>
    public HarmonicVoltage Voltage(SolvedOrder solved, Bus bus, double listedOrder)
    {
        Complex[] parts = solved.BusKv[bus.Name];
        RuleValues kv = Summation.Of(parts, solved.Order);
        return new HarmonicVoltage(bus.Name, listedOrder, Summation.Phasor(parts), kv, kv.Times(100 / bus.NominalKv));
    }

    /// <summary>Harmonic voltage of a bus, integers 2 to 50, kV under each rule.</summary>
    public RuleValues HarmonicKv(string bus) => Summation.RootSumSquares(
        Orders.Where(o => CountsInThd(o.Order)).Select(o => Summation.Of(o.BusKv[bus], o.Order)));

    /// <summary>THD of a bus under the four rules; not judged where the bus is dead.</summary>
    public IEnumerable<BusDistortion> Distortion(Bus bus)
    {
        RuleValues harmonic = HarmonicKv(bus.Name);
        double fundamental = Complex.Abs(PowerFlow.VoltageKv(bus.Name));
        bool live = PowerFlow.IsLive(bus.Name);
        foreach (SummationRule rule in Enum.GetValues<SummationRule>())
        {
            yield return new BusDistortion(
                bus.Name, rule, live ? harmonic[rule] / fundamental * 100 : null, live ? harmonic[rule] / bus.NominalKv * 100 : null);
        }
    }

    /// <summary>Integers from 2 to 50.</summary>
    public static bool CountsInThd(double order) =>
        order is >= 2 and <= DistortionStudy.HighestOrder && HarmonicOrder.IsInteger(order);
}
