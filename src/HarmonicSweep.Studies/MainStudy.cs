using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>The main job: check, impedance, distortion and screening of every state asked for, in one run.</summary>
public static class MainStudy
{
    /// <summary>Share of the progress given to the states; the screening takes the rest.</summary>
    private const double StatesShare = 0.4;

    /// <summary>Runs the main job.</summary>
    /// <exception cref="ComputationException">A power flow diverges, a matrix is singular or currents do not balance.</exception>
    /// <exception cref="CaseException">A state cannot be built.</exception>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public static StudyResult Run(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation)
    {
        int inner = request.States.Count >= request.Threads ? 1 : request.Threads;
        StudyResult states = StudyResults.Of(request, Share(progress, 0, StatesShare), cancellation, state =>
        {
            var plant = new PlantInState(request.Plant, state);
            PowerFlowSolution powerFlow = PowerFlow.Solve(plant);
            StateResult result = CheckStudy.AddTo(StateResults.Start(plant, powerFlow), powerFlow);
            result = ImpedanceStudy.AddTo(result, request, plant, inner, cancellation);
            return DistortionStudy.AddTo(result, request, powerFlow, cancellation);
        });
        return states with { Screen = ScreenStudy.Screen(request, Share(progress, StatesShare, 1), cancellation) };
    }

    private static ScaledProgress? Share(IProgress<double>? progress, double from, double to) =>
        progress is null ? null : new ScaledProgress(progress, from, to);

    private sealed class ScaledProgress(IProgress<double> inner, double from, double to) : IProgress<double>
    {
        public void Report(double value) => inner.Report(from + value * (to - from));
    }
}
