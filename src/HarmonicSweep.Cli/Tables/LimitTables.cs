using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>Limits: the exceeded and the tightest first, what was not judged apart, with the reason.</summary>
internal static class LimitTables
{
    /// <summary>Writes them.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        IReadOnlyList<InState<LimitVerdict>> all = view.LimitsByUse();
        TextTable.Write(
            writer, "Limits, by share used", [.. all.Where(l => l.Row.Verdict != Verdict.NotJudged)], view.RowLimit,
            new("state", l => l.State, Left: true),
            new("bus", l => l.Row.Bus ?? Format.Missing, Left: true),
            new("quantity", l => l.Row.Quantity, Left: true),
            new("order", l => Format.GivenOrder(l.Row.Order)),
            new("value [%]", l => Format.Percent(l.Row.ValuePercent)),
            new("limit [%]", l => Format.Percent(l.Row.LimitPercent)),
            new("used [%]", l => Format.Number(ReportView.UsePercent(l.Row), 3)),
            new("verdict", l => l.Row.Verdict == Verdict.Exceeded ? "EXCEEDED" : "within", Left: true),
            new("source", l => $"{l.Row.Standard}, {l.Row.Table}", Left: true));
        foreach (string basis in all.Select(l => l.Row.Basis).Where(b => b.Length > 0).Distinct(StringComparer.Ordinal).Take(view.RowLimit))
        {
            writer.WriteLine($"  basis: {basis}");
        }

        var open = all.Where(l => l.Row.Verdict == Verdict.NotJudged)
            .GroupBy(l => (l.Row.Standard, l.Row.Table, l.Row.Bus, l.Row.Why))
            .Select(g => (Key: g.Key, States: g.Select(l => l.State).Distinct(StringComparer.Ordinal).ToArray(), Count: g.Count()))
            .ToArray();
        TextTable.Write(
            writer, "Not judged (never a pass)", open, view.RowLimit,
            new("limits", o => Format.Count(o.Count)),
            new("bus", o => o.Key.Bus ?? Format.Missing, Left: true),
            new("source", o => $"{o.Key.Standard}, {o.Key.Table}", Left: true),
            new("states", o => Format.Some(o.States, 3), Left: true),
            new("why", o => o.Key.Why ?? Format.Missing, Left: true));
    }
}
