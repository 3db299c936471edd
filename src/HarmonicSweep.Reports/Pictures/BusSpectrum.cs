using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>A limit that holds for a run of neighbouring orders.</summary>
internal sealed record SpectrumLimit(string Standard, double Percent, int FirstSlot, int LastSlot);

/// <summary>The harmonic voltages of a bus in every state, under the chosen rule.</summary>
internal sealed class BusSpectrum
{
    private readonly Dictionary<int, string> _letters = [];

    private BusSpectrum(PictureContext context, string bus, double[] orders)
    {
        Bus = bus;
        Orders = orders;
        IReadOnlyList<StateResult> states = context.Result.States;
        States = [.. states.Select(s => s.State)];
        Percent = [.. states.Select(s => PercentIn(s, bus, orders, context.Settings.Rule))];
        Exceeded = [.. states.Select(s => orders.Select(o => Judged(s, bus).Any(l => l.Order == o && l.Verdict == Verdict.Exceeded)).ToArray())];
        Limits = [.. LimitsOf(states, bus, orders)];
        for (int order = 0; order < orders.Length; order++)
        {
            if (WorstState(order) is { } worst && !_letters.ContainsKey(worst))
            {
                _letters.Add(worst, LetterAt(_letters.Count));
            }
        }
    }

    public string Bus { get; }

    /// <summary>Orders above 1, ascending.</summary>
    public IReadOnlyList<double> Orders { get; }

    public IReadOnlyList<string> States { get; }

    /// <summary>Percent of nominal voltage, per state and order; null where there is none.</summary>
    public IReadOnlyList<double?[]> Percent { get; }

    /// <summary>Whether a limit was judged exceeded, per state and order.</summary>
    public IReadOnlyList<bool[]> Exceeded { get; }

    public IReadOnlyList<SpectrumLimit> Limits { get; }

    public double LargestPercent => Percent.SelectMany(p => p).Max(p => p ?? 0);

    /// <summary>States that are the worst of some order, in the order of their letters.</summary>
    public IEnumerable<int> LetteredStates => _letters.Keys;

    public string LetterOf(int state) => _letters[state];

    /// <summary>The state with the largest voltage at an order, the first of equals; null when no state has one.</summary>
    public int? WorstState(int order)
    {
        int? worst = null;
        for (int state = 0; state < States.Count; state++)
        {
            if (Percent[state][order] is { } p && (worst is not { } w || p > Percent[w][order]))
            {
                worst = state;
            }
        }

        return worst;
    }

    /// <summary>The spectrum of a bus; null when it has no voltage above order 1.</summary>
    public static BusSpectrum? Of(PictureContext context, string bus)
    {
        double[] orders =
        [
            .. context.Result.States.SelectMany(s => s.Voltages).Where(v => v.Bus == bus && v.Order != 1).Select(v => v.Order).Distinct().Order(),
        ];
        return orders.Length == 0 ? null : new BusSpectrum(context, bus, orders);
    }

    private static double?[] PercentIn(StateResult state, string bus, double[] orders, SummationRule rule)
    {
        var byOrder = state.Voltages.Where(v => v.Bus == bus).ToDictionary(v => v.Order, v => v.PercentOfNominal[rule]);
        return [.. orders.Select(o => byOrder.TryGetValue(o, out double percent) ? percent : (double?)null)];
    }

    private static IEnumerable<LimitVerdict> Judged(StateResult state, string bus) =>
        state.Limits.Where(l => l.Quantity == "V_h" && l.Bus == bus && l.Order is not null && l.LimitPercent is not null);

    private static IEnumerable<SpectrumLimit> LimitsOf(IReadOnlyList<StateResult> states, string bus, double[] orders)
    {
        foreach (var standard in states.SelectMany(s => Judged(s, bus)).GroupBy(l => l.Standard))
        {
            var strictest = standard.GroupBy(l => l.Order!.Value).ToDictionary(g => g.Key, g => g.Min(l => l.LimitPercent!.Value));
            for (int first = 0; first < orders.Length;)
            {
                int next = first + 1;
                if (strictest.TryGetValue(orders[first], out double percent))
                {
                    while (next < orders.Length && strictest.TryGetValue(orders[next], out double other) && other == percent)
                    {
                        next++;
                    }

                    yield return new SpectrumLimit(standard.Key, percent, first, next - 1);
                }

                first = next;
            }
        }
    }

    private static string LetterAt(int index) =>
        index < 26 ? ((char)('A' + index)).ToString() : FormattableString.Invariant($"{(char)('A' + index % 26)}{index / 26}");
}
