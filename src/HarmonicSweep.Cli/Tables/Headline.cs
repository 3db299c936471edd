using HarmonicSweep.Cases.Results;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>The few lines that matter: limits, bank positions, distortion, resonance, trust.</summary>
internal static class Headline
{
    /// <summary>Writes one block a subject the result has something to say about.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        string[] states = [.. view.Result.States.Select(s => s.State)];
        writer.WriteLine(view.Plant.Title);
        writer.WriteLine(
            $"  {Format.GivenOrder(view.Plant.FrequencyHz)} Hz, {Format.Count(view.Plant.Buses.Count)} buses, "
            + $"{Format.Count(view.Plant.Elements.Count, "element")}; {(states.Length == 1 ? "state" : Format.Count(states.Length) + " states:")} {Format.Some(states, 6)}");
        Limits(writer, view);
        Banks(writer, view);
        Distortion(writer, view);
        Resonance(writer, view);
        Trust(writer, view);
    }

    private static void Line(TextWriter writer, string subject, string text) => writer.WriteLine($"  {subject,-12}{text}");

    private static void Limits(TextWriter writer, ReportView view)
    {
        IReadOnlyList<InState<LimitVerdict>> limits = view.LimitsByUse();
        if (limits.Count == 0)
        {
            return;
        }

        string[] buses = [.. limits.Select(l => l.Row.Bus).OfType<string>().Distinct(StringComparer.Ordinal)];
        int Count(Verdict verdict) => limits.Count(l => l.Row.Verdict == verdict);
        Line(
            writer, "Limits",
            $"{Format.Count(Count(Verdict.Exceeded))} exceeded, {Format.Count(Count(Verdict.Within))} within, {Format.Count(Count(Verdict.NotJudged))} not judged"
            + (buses.Length > 0 ? $"; they hold at {Format.Some(buses, 3)} only" : ""));
        InState<LimitVerdict> first = limits[0];
        if (ReportView.UsePercent(first.Row) is { } use)
        {
            string order = first.Row.Order is { } h ? $" order {Format.GivenOrder(h)}" : "";
            Line(
                writer, "",
                $"{(first.Row.Verdict == Verdict.Exceeded ? "worst" : "smallest margin")}: {first.Row.Quantity}{order} at {first.Row.Bus}, "
                + $"{Format.Percent(first.Row.ValuePercent)} % against {Format.Percent(first.Row.LimitPercent)} % "
                + $"({Format.Number(use, 3)} % of the limit), state {first.State}; {first.Row.Standard}");
        }
    }

    private static void Banks(TextWriter writer, ReportView view)
    {
        if (view.Result.Screen is not { Positions.Count: > 0 } screen)
        {
            return;
        }

        IReadOnlyList<BankPosition> bad = view.DoNotDwell();
        Line(
            writer, "Banks",
            $"{Format.Count(bad.Count)} of {Format.Count(screen.Positions.Count)} positions not to dwell on "
            + $"(parallel resonance within {Format.Number(screen.NearOrders, 2)} of an injected order)");
        foreach (BankPosition position in bad.Take(4))
        {
            Line(writer, "", $"{position.State}: {Near(position.Nearest)}");
        }

        if (bad.Count > 4)
        {
            Line(writer, "", $"and {Format.Count(bad.Count - 4)} more");
        }

        IReadOnlyList<BankPosition> overloaded = view.Overloaded();
        if (overloaded.Count > 0)
        {
            Line(
                writer, "",
                $"{Format.Count(overloaded.Count, "position")} beyond what the capacitors may carry, worst {overloaded[0].State}: "
                + $"{Format.Number(overloaded[0].Loading!.CurrentPercent)} % of rated current");
        }
    }

    private static void Distortion(TextWriter writer, ReportView view)
    {
        IReadOnlyList<InState<BusDistortion>> thd = view.ThdByValue();
        if (thd.Count > 0 && thd[0].Row.PercentOfFundamental is { } worst)
        {
            int dead = thd.Count(d => d.Row.PercentOfFundamental is null);
            string not = dead > 0 ? $"; {Format.Count(dead, "value")} not judged (dead bus)" : "";
            Line(
                writer, "Distortion",
                $"highest THD {Format.Percent(worst)} % of V_1 at {thd[0].Row.Bus}, state {thd[0].State} ({view.Rule.Word()} sum){not}");
        }
    }

    private static void Resonance(TextWriter writer, ReportView view)
    {
        IReadOnlyList<InState<Resonance>> parallel = view.ResonancesByDistance(ResonanceKind.Parallel);
        if (parallel.Count > 0)
        {
            InState<Resonance> first = parallel[0];
            Line(writer, "Resonance", $"{(first.Row.Distance is null ? "lowest" : "nearest")} parallel: {Near(first.Row)} at {first.Row.Bus}, state {first.State}");
        }
    }

    private static void Trust(TextWriter writer, ReportView view)
    {
        HandCheck[] checks = [.. view.Result.States.SelectMany(s => s.HandChecks)];
        var parts = new List<string>();
        if (checks.Length > 0)
        {
            parts.Add($"{Format.Count(checks.Count(c => c.Agrees))} of {Format.Count(checks.Length)} hand checks agree");
        }

        parts.Add($"{Format.Count(view.Case.Assumed.Count, "value")} assumed");
        double backwardError = view.Result.States.Select(s => s.WorstBackwardError).Append(view.Result.Screen?.WorstBackwardError ?? 0).Max();
        if (backwardError > 0)
        {
            parts.Add($"worst backward error {Format.Number(backwardError, 2)}");
        }

        Line(writer, "Trust", string.Join(", ", parts));
    }

    private static string Near(Resonance? resonance) => resonance switch
    {
        null => "no resonance",
        { NearestInjectedOrder: { } order } =>
            $"order {Format.Number(resonance.Order)}, {Format.Number(resonance.Distance, 2)} from injected {Format.GivenOrder(order)}",
        _ => $"order {Format.Number(resonance.Order)}, {Format.Number(resonance.FrequencyHz)} Hz",
    };
}
