using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>A THD limit of a bus.</summary>
internal sealed record ThdLimit(string Standard, double Percent);

/// <summary>THD of a bus in every state, percent of V_1 under the chosen rule; null = not judged.</summary>
internal sealed record BusThd(string Bus, double?[] Percent, bool[] Exceeded, IReadOnlyList<ThdLimit> Limits)
{
    /// <summary>The state with the largest THD, the first of equals; null when the bus is dead in all.</summary>
    public int? WorstState
    {
        get
        {
            double? largest = Percent.Max();
            return largest is null ? null : Array.IndexOf(Percent, largest);
        }
    }

    /// <summary>Every bus, in the order of the result.</summary>
    public static IEnumerable<BusThd> All(PictureContext context)
    {
        IReadOnlyList<StateResult> states = context.Result.States;
        var values = states.Select(s => s.Distortion.Where(d => d.Rule == context.Settings.Rule)
            .GroupBy(d => d.Bus).ToDictionary(g => g.Key, g => g.First().PercentOfFundamental)).ToList();
        foreach (string bus in values.SelectMany(v => v.Keys).Distinct())
        {
            LimitVerdict[][] judged =
            [
                .. states.Select(s => s.Limits.Where(l => l.Quantity == "THD_V" && l.Bus == bus && l.LimitPercent is not null).ToArray()),
            ];
            yield return new BusThd(
                bus,
                [.. values.Select(v => v.GetValueOrDefault(bus))],
                [.. judged.Select(j => j.Any(l => l.Verdict == Verdict.Exceeded))],
                [.. judged.SelectMany(j => j).Select(l => new ThdLimit(l.Standard, l.LimitPercent!.Value)).Distinct()]);
        }
    }
}
