using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Which orders converters inject in a state.</summary>
internal static class InjectedOrders
{
    /// <summary>
    /// Orders other than 1 that live, loaded converters inject outside the zero sequence, ascending; without a power flow every
    /// loaded converter counts as live.
    /// </summary>
    public static IReadOnlyList<double> Of(PlantInState plant, PowerFlowSolution? powerFlow) =>
    [
        .. plant.Plant.Of<Converter>()
            .Where(c => plant.IsIn(c) && plant.LoadingPercent(c) > 0 && (powerFlow?.IsLive(c.Bus) ?? true))
            .SelectMany(c => c.Spectrum.Lines)
            .Where(l => l.Percent != 0)
            .Select(l => HarmonicOrder.Snap(l.Order))
            .Where(h => h != 1 && HarmonicOrder.SequenceOf(h) != Sequence.Zero)
            .Distinct()
            .Order(),
    ];

    /// <summary>The order of an ascending list nearest to a given one; null when the list is empty.</summary>
    public static double? Nearest(IReadOnlyList<double> orders, double order) =>
        orders.Count == 0 ? null : orders.MinBy(h => Math.Abs(h - order));
}
