using System.Numerics;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>Resonances, the hand formula of every bank, and impedances at whole or asked-for orders.</summary>
internal static class ImpedanceTables
{
    /// <summary>Columns of injected orders in the table of gains.</summary>
    private const int OrdersOfGain = 4;

    /// <summary>Writes them.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        Resonances(writer, view);
        Banks(writer, view);
        Gains(writer, view);
        if (view.IsStudy)
        {
            return;
        }

        if (view.Request.Orders.Count > 0)
        {
            ExactOrders(writer, view);
        }
        else
        {
            WholeOrders(writer, view);
        }
    }

    private static void Resonances(TextWriter writer, ReportView view)
    {
        IReadOnlyList<InState<Resonance>> rows = view.ResonancesByDistance(view.IsStudy ? ResonanceKind.Parallel : null);
        TextTable.Write(
            writer, view.IsStudy ? "Parallel resonances, nearest to an injected order first" : "Resonances, parallel first, nearest to an injected order first",
            rows, view.RowLimit,
            new("state", r => r.State, Left: true),
            new("bus", r => r.Row.Bus, Left: true),
            new("sequence", r => r.Row.Sequence.Word(), Left: true),
            new("kind", r => r.Row.Kind.Word(), Left: true),
            new("order", r => Format.Number(r.Row.Order)),
            new("f [Hz]", r => Format.Number(r.Row.FrequencyHz)),
            new("|Z| [ohm]", r => Format.Number(r.Row.Ohm)),
            new("Q", r => Format.Number(r.Row.QualityFactor, 3)),
            new("injected", r => Format.GivenOrder(r.Row.NearestInjectedOrder)),
            new("apart", r => Format.Number(r.Row.Distance, 2)));
        if (rows.Count > 0 && LoadModels(view.Plant) is { Length: > 0 } models)
        {
            writer.WriteLine($"  Near a resonance the load model decides the height (loads here: {models}); try another before trusting a peak.");
        }
    }

    /// <summary>Gains, the largest first, at their largest and at the first injected orders.</summary>
    private static void Gains(TextWriter writer, ReportView view)
    {
        InState<BackgroundGain>[] rows = [.. view.All(s => s.Gains).Where(g => g.Row.Gain.Any(v => v is not null)).OrderByDescending(g => g.Row.Gain.Max())];
        double[] orders = [.. view.Result.States.SelectMany(s => s.InjectedOrders).Distinct().Order().Take(OrdersOfGain)];
        TextTable.Write(
            writer, $"Gain from a background voltage at {rows.FirstOrDefault()?.Row.From}, largest first: V bus/V background, 1 = as the utility delivers it",
            rows, view.IsStudy ? view.RowLimit : view.Plant.Buses.Count,
            [
                new("state", g => g.State, Left: true),
                new("bus", g => g.Row.Bus, Left: true),
                new("largest", g => Format.Number(g.Row.Gain.Max(), 3)),
                new("at order", g => Format.Number(OrderOfLargest(g.Row))),
                .. orders.Select(h => new TextColumn<InState<BackgroundGain>>($"h = {Format.GivenOrder(h)}", g => Format.Number(GainAt(g.Row, h), 3))),
            ]);
    }

    private static double OrderOfLargest(BackgroundGain gain) => gain.Orders[gain.Gain.ToList().IndexOf(gain.Gain.Max())];

    private static double? GainAt(BackgroundGain gain, double order)
    {
        int at = gain.Orders.ToList().IndexOf(order);
        return at < 0 ? null : gain.Gain[at];
    }

    private static string LoadModels(Plant plant) => string.Join(
        ", ", plant.Of<LinearLoad>().GroupBy(l => l.Model).Select(g => $"{Format.Count(g.Count())} {ModelWord(g.Key)}"));

    private static string ModelWord(LoadModel model) => model switch
    {
        LoadModel.Parallel => "parallel",
        LoadModel.Series => "series",
        LoadModel.Growing => "growing",
        LoadModel.Cigre => "cigre",
        _ => "none",
    };

    private static void Banks(TextWriter writer, ReportView view) => TextTable.Write(
        writer, "Banks: h = 1/sqrt(p + V^2/(X_C S_sc)) by hand, beside the nearest computed parallel resonance",
        view.All(s => s.BankResonances), view.RowLimit,
        new("state", b => b.State, Left: true),
        new("bank", b => b.Row.Bank, Left: true),
        new("bus", b => b.Row.Bus, Left: true),
        new("steps in", b => Format.Count(b.Row.StepsIn)),
        new("S_sc [MVA]", b => Format.Number(b.Row.ShortCircuitMva)),
        new("by hand", b => Format.Number(b.Row.HandOrder)),
        new("computed", b => Format.Number(b.Row.ComputedOrder)));

    private static void ExactOrders(TextWriter writer, ReportView view) => TextTable.Write(
        writer, "Harmonic impedance per phase",
        view.All(s => s.Impedance.SelectMany(c => Enumerable.Range(0, c.Orders.Count).Select(i => (Curve: c, Point: i)))), int.MaxValue,
        new("state", z => z.State, Left: true),
        new("at bus", z => z.Row.Curve.At, Left: true),
        new("from bus", z => z.Row.Curve.From, Left: true),
        new("sequence", z => z.Row.Curve.Sequence.Word(), Left: true),
        new("order", z => Format.GivenOrder(z.Row.Curve.Orders[z.Row.Point])),
        new("R [ohm]", z => Format.Number(z.Row.Curve.Ohm[z.Row.Point]?.Real, 5)),
        new("X [ohm]", z => Format.Number(z.Row.Curve.Ohm[z.Row.Point]?.Imaginary, 5)),
        new("|Z| [ohm]", z => Format.Number(z.Row.Curve.Ohm[z.Row.Point]?.Magnitude, 5)),
        new("angle [deg]", z => Format.Number(z.Row.Curve.Ohm[z.Row.Point]?.Degrees())));

    private static void WholeOrders(TextWriter writer, ReportView view)
    {
        foreach (StateResult state in view.Result.States)
        {
            foreach (IGrouping<Sequence, ImpedanceCurve> curves in state.Impedance.GroupBy(c => c.Sequence))
            {
                double[] orders = [.. curves.SelectMany(c => c.Orders).Where(HarmonicOrder.IsInteger).Distinct().Order()];
                TextTable.WriteMatrix(
                    writer, $"|Z| [ohm] at whole orders, {curves.Key.Word()} sequence, state {state.State} (the full curve: --format csv or --out)",
                    orders, new TextColumn<double>("order", Format.GivenOrderOf),
                    [.. curves.Select(c => new TextColumn<double>(Name(c), order => Format.Number(At(c, order)?.Magnitude)))]);
            }
        }
    }

    private static string Name(ImpedanceCurve curve) => curve.At == curve.From ? curve.At : $"{curve.At} from {curve.From}";

    private static Complex? At(ImpedanceCurve curve, double order)
    {
        for (int i = 0; i < curve.Orders.Count; i++)
        {
            if (curve.Orders[i] == order)
            {
                return curve.Ohm[i];
            }
        }

        return null;
    }
}
