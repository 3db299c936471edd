using HarmonicSweep.Studies;
using ScottPlot;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>Voltage gain from a background at the PCC to the buses, against order, in the first state that has gains.</summary>
internal static class GainPicture
{
    private const float Height = 340;

    /// <summary>Curves nowhere further apart than this share of their highest point cannot be told apart.</summary>
    private const double SameCurve = 0.02;

    /// <summary>One picture when there are gains.</summary>
    public static IEnumerable<Picture> Plan(PictureContext context)
    {
        StateResult? state = context.Result.States.FirstOrDefault(s => s.Gains.Any(g => g.Orders.Count > 1 && g.Gain.Any(v => v > 0)));
        if (state is not null)
        {
            string title = $"Gain from a background voltage at {context.BusText(state.Gains[0].From)}";
            yield return new Picture("background-gain", title, () => Draw(context, title, state));
        }
    }

    private static Page Draw(PictureContext context, string title, StateResult state)
    {
        BackgroundGain[] drawn = [.. Distinct(context, state.Gains.Where(g => g.Gain.Any(v => v > 0))).Take(Look.Series.Length)];
        double from = drawn[0].Orders[0];
        double to = drawn[0].Orders[^1];
        Plot plot = Look.Empty(72, 20, 46, Axes.InjectedRoom);
        Axes.Orders(plot, from, to, labelled: true);
        double highest = drawn.Max(g => g.Gain.Max() ?? 0);
        plot.Axes.SetLimitsY(0, Math.Max(highest * 1.12, 1.2));
        plot.Axes.Left.Label.Text = "V bus / V background";
        Axes.Injected(plot, state.InjectedOrders, from, to, numbered: true);
        ScottPlot.Plottables.HorizontalLine one = plot.Add.HorizontalLine(1, 1, Look.Ink);
        one.LinePattern = LinePattern.Dashed;
        for (int i = drawn.Length - 1; i >= 0; i--)
        {
            Curves.Add(plot, drawn[i].Orders, drawn[i].Gain, Look.Series[i]);
        }

        var entries = drawn.Select((g, i) => new KeyEntry($"{context.BusText(g.Bus)}:  largest {Largest(g)}", Look.Series[i])).ToList();
        if (drawn.Length < state.Gains.Count)
        {
            entries.Add(new KeyEntry(FormattableString.Invariant($"{drawn.Length} of {state.Gains.Count} buses drawn: the PCC, the banks' and those unlike them; the tables have all")));
        }

        string subtitle = $"{context.CaseTitle} · state {state.State} · 1 = as the utility delivers it · dashed: injected orders";
        return new Page(title, subtitle, [new Panel(plot, Height), Key.Of(entries)]);
    }

    /// <summary>The PCC and the buses of banks first, then the highest gains; a curve that lies on another one is left out.</summary>
    private static List<BackgroundGain> Distinct(PictureContext context, IEnumerable<BackgroundGain> gains)
    {
        var chosen = new List<BackgroundGain>();
        foreach (BackgroundGain gain in gains
            .OrderByDescending(g => g.Bus == context.Settings.PccBus || context.Buses.Contains(g.Bus))
            .ThenByDescending(g => g.Gain.Max()))
        {
            if (!chosen.Exists(c => Coincide(c, gain)))
            {
                chosen.Add(gain);
            }
        }

        return chosen;
    }

    private static bool Coincide(BackgroundGain a, BackgroundGain b)
    {
        double largest = a.Gain.Max() ?? 0;
        for (int i = 0; i < a.Gain.Count; i++)
        {
            if (!(Math.Abs((a.Gain[i] ?? 0) - (b.Gain[i] ?? 0)) <= SameCurve * largest))
            {
                return false;
            }
        }

        return true;
    }

    private static string Largest(BackgroundGain gain)
    {
        double largest = gain.Gain.Max()!.Value;
        int at = gain.Gain.ToList().IndexOf(largest);
        return $"{Figures.Short(largest)} at order {Figures.ComputedOrder(gain.Orders[at])}";
    }
}
