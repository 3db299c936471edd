using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// Screening of banks: every step of every bank at every supply strength; where each position resonates, how the bank is
/// loaded there, what it does for power factor and voltage, and the worst distortion of every bus with the state that gave it.
/// </summary>
public static class ScreenStudy
{
    /// <summary>Runs the screening from every state asked for.</summary>
    /// <exception cref="ComputationException">A power flow diverges or a matrix is singular.</exception>
    /// <exception cref="CaseException">A state cannot be built.</exception>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public static StudyResult Run(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation)
    {
        StudyResult check = CheckStudy.Run(request, null, cancellation);
        return check with { Screen = Screen(request, progress, cancellation) };
    }

    /// <summary>The screening itself.</summary>
    internal static ScreenResult Screen(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation)
    {
        IReadOnlyList<ScreenJob> jobs = ScreenJobs.Of(request);
        ScreenedState[] screened = Parallelism.Map(
            jobs, request.Threads, progress, cancellation, job => ScreenedState.Of(job, request, cancellation));
        BankPosition[] positions = [.. screened.SelectMany(s => s.Positions)];
        return new ScreenResult
        {
            NearOrders = request.NearOrders,
            Positions = [.. positions.Select(p => p with { BusVoltageWithoutPercent = Without(positions, p) })],
            Worst = Worst(request, screened),
            Maps = request.Combinations ? [] : Maps(screened),
            WorstBackwardError = screened.Select(s => s.WorstBackwardError).DefaultIfEmpty(0).Max(),
        };
    }

    /// <summary>Voltage of the bank's bus with the bank out, all else equal.</summary>
    private static double? Without(BankPosition[] positions, BankPosition position) => positions
        .FirstOrDefault(p => p.StepsIn == 0 && p.Bank == position.Bank && p.Strength == position.Strength && p.BaseState == position.BaseState)
        ?.BusVoltagePercent;

    private static List<WorstValue> Worst(StudyRequest request, ScreenedState[] screened)
    {
        var worst = new List<WorstValue>();
        foreach (Bus bus in request.Plant.Buses.Where(b => request.Buses.Count == 0 || request.Buses.Contains(b.Name)))
        {
            IEnumerable<(double? Order, double Percent, string State)> values = screened.SelectMany(
                s => s.BusPercent.Where(v => v.Bus == bus.Name).Select(v => (v.Order, v.Percent, s.Name)));
            // THD first, then the orders upwards
            worst.AddRange(values
                .GroupBy(v => v.Order ?? 0)
                .OrderBy(g => g.Key)
                .Select(g => g.MaxBy(v => v.Percent))
                .Select(v => new WorstValue(bus.Name, v.Order, v.Percent, v.State)));
        }

        return worst;
    }

    private static PositionMap[] Maps(ScreenedState[] screened) =>
    [
        .. screened
            .GroupBy(s => (s.Job.BaseState, s.Job.Moved[0].Bank.Name, s.Job.Strength))
            .Select(g => new PositionMap(
                g.Key.BaseState, g.Key.Name, g.First().Job.Moved[0].Bank.Bus, g.Key.Strength,
                [.. g.Select(s => s.Job.Moved[0].Steps)], g.First().MapOrders, [.. g.Select(s => s.MapOhm)],
                [.. g.SelectMany(s => s.Injected).Distinct().Order()])),
    ];
}
