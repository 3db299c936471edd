using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Builds every state, solves its power flow and prints the hand formulas beside the network's values.</summary>
public static class CheckStudy
{
    /// <summary>Runs the check in every state asked for.</summary>
    /// <exception cref="ComputationException">A power flow diverges; the finding names the worst bus and the largest load there.</exception>
    /// <exception cref="CaseException">A state cannot be built.</exception>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public static StudyResult Run(StudyRequest request, IProgress<double>? progress, CancellationToken cancellation) =>
        StudyResults.Of(request, progress, cancellation, state =>
        {
            var plant = new PlantInState(request.Plant, state);
            PowerFlowSolution powerFlow = PowerFlow.Solve(plant);
            return AddTo(StateResults.Start(plant, powerFlow), powerFlow);
        });

    /// <summary>Adds the fundamental's current balance to what is known of a state.</summary>
    internal static StateResult AddTo(StateResult result, PowerFlowSolution powerFlow)
    {
        PlantInState plant = powerFlow.Circuit.Plant;
        SolvedOrder fundamental = BranchCurrents.Fundamental(powerFlow);
        return result with
        {
            CurrentBalanceResidual = Math.Max(
                result.CurrentBalanceResidual, CurrentBalance.Residual(plant, powerFlow.Circuit.Nodes, fundamental)),
        };
    }
}
