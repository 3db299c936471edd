using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Collects the states of a study and what must be said about them all.</summary>
internal static class StudyResults
{
    /// <summary>Runs every state on the threads asked for.</summary>
    public static StudyResult Of(
        StudyRequest request, IProgress<double>? progress, CancellationToken cancellation, Func<OperatingState, StateResult> run)
    {
        StateResult[] states = Parallelism.Map(request.States, request.Threads, progress, cancellation, run);
        RequireLiveBus(states);
        return new StudyResult { States = states, Findings = StateFindings.Of(request, states) };
    }

    private static void RequireLiveBus(StateResult[] states)
    {
        if (states.Length > 0 && states.All(s => s.PowerFlow.Count == 0 && s.PowerFlowFailure is null))
        {
            throw new CaseException([new Finding(
                Severity.Error, "HS203", null,
                $"no bus is live in {(states.Length == 1 ? "state " + states[0].State : "any of the states")}: no supply or generator is in service.",
                "put a supply or a generator in service in states.csv, or add one to supplies.csv or generators.csv.")]);
        }
    }
}

/// <summary>What is known of a state once its power flow is solved.</summary>
internal static class StateResults
{
    /// <summary>Fundamental voltages, dead and open buses, injected orders and hand checks.</summary>
    public static StateResult Start(PlantInState plant, PowerFlowSolution powerFlow)
    {
        Circuit circuit = Circuit.Build(plant, CircuitScope.Harmonic);
        return new StateResult
        {
            State = plant.State.Name,
            PowerFlow =
            [
                .. plant.Plant.Buses.Where(b => powerFlow.IsLive(b.Name)).Select(b => new BusVoltage(b.Name, powerFlow.VoltageKv(b.Name))),
            ],
            DeadBuses = powerFlow.DeadBuses,
            OpenBuses = [.. plant.Plant.Buses.Select(b => b.Name).Where(b => circuit.RowOf(b) < 0)],
            LoopCouplers = circuit.Nodes.LoopCouplers,
            InjectedOrders = InjectedOrders.Of(plant, powerFlow),
            DroppedInjections = DroppedInjections.Of(plant, powerFlow),
            HandChecks = HandChecks.Of(plant, powerFlow),
        };
    }
}
