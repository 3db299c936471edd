using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Short ways to ask the studies.</summary>
internal static class ProductSide
{
    /// <summary>Positive-sequence fundamental and up, both integer and non-integer orders.</summary>
    public static StudyRequest Request(Plant plant, OperatingState? state = null, int threads = 1) => new()
    {
        Plant = plant,
        // base beside the state: a case without a live bus in any state is refused, a dead state is not
        States = state is null || state.Name == OperatingState.BaseName ? [OperatingState.Base] : [OperatingState.Base, state],

        // resonances are sought over the sweep range: kept to a sliver where a test does not ask for them
        Settings = new StudySettings { Sweep = new SweepRange(plant.FrequencyHz, 1.01 * plant.FrequencyHz, plant.FrequencyHz) },
        Buses = [.. plant.Buses.Select(b => b.Name)],
        Threads = threads,
    };

    /// <summary>Impedances seen at every bus for a current injected at one bus, keyed by bus, one entry an order.</summary>
    public static Dictionary<string, IReadOnlyList<Complex?>> Column(
        Plant plant, OperatingState? state, string from, Sequence sequence, params double[] orders)
    {
        StudyRequest request = Request(plant, state) with { InjectedAt = from, Sequence = sequence, Orders = orders };
        StudyResult result = ImpedanceStudy.Run(request, progress: null, CancellationToken.None);
        return result.States[^1].Impedance.Where(c => c.From == from).ToDictionary(c => c.At, c => c.Ohm, StringComparer.Ordinal);
    }

    /// <summary>Driving-point impedance at one bus and order, ohm; null where open.</summary>
    public static Complex? Impedance(Plant plant, string bus, double order, Sequence sequence = Sequence.Positive, OperatingState? state = null) =>
        Column(plant, state, bus, sequence, order)[bus][0];

    public static StateResult Distortion(Plant plant, OperatingState? state = null, int threads = 1) =>
        DistortionStudy.Run(Request(plant, state, threads), progress: null, CancellationToken.None).States[^1];
}
