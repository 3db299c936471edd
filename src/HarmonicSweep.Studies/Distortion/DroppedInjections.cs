using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Injections that are left out rather than solved in the wrong network.</summary>
internal static class DroppedInjections
{
    /// <summary>Zero-sequence orders of every live converter and supply background, in plant order.</summary>
    public static IReadOnlyList<DroppedInjection> Of(PlantInState plant, PowerFlowSolution powerFlow)
    {
        var dropped = new List<DroppedInjection>();
        foreach (PlantElement element in plant.Plant.Elements)
        {
            Spectrum? spectrum = element switch
            {
                Converter converter when plant.LoadingPercent(converter) > 0 && powerFlow.IsLive(converter.Bus) => converter.Spectrum,
                Supply supply => supply.Background,
                _ => null,
            };
            if (spectrum is null || !plant.IsIn(element))
            {
                continue;
            }

            dropped.AddRange(spectrum.Lines
                .Where(l => l.Percent != 0 && HarmonicOrder.SequenceOf(l.Order) == Sequence.Zero)
                .Select(l => new DroppedInjection(
                    element.Name, HarmonicOrder.Snap(l.Order), "a zero-sequence order; this version solves the positive and the negative sequence")));
        }

        return dropped;
    }
}
