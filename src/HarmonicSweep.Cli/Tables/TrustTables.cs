using HarmonicSweep.Cases;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>Why to trust a result and how far: hand checks, assumed values, cautions.</summary>
internal static class TrustTables
{
    private const string Cautions = """
        Keep in mind
          Capacitors hold charge after isolation: discharge, test, short and earth them by site procedure.
          Switching a bank beside another one causes high inrush; re-close a step only after it has discharged.
          A pass here is for the steady state and the data supplied. "Not judged" is never "pass". It does not replace
          a licensed engineer, the makers' data or local codes, and is no permission to switch.
        """;

    /// <summary>Writes them.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        HandChecks(writer, view);
        Assumed(writer, view);
        if (view.Command is "distortion" or "screen" or "study")
        {
            writer.WriteLine();
            writer.WriteLine(Cautions.ReplaceLineEndings(writer.NewLine));
        }
    }

    /// <summary>
    /// One row a check, in the state where it differs most; elsewhere than in check the worst of each kind, and every one that
    /// differs too much.
    /// </summary>
    private static void HandChecks(TextWriter writer, ReportView view)
    {
        bool all = view.Command == "check";
        var worst = view.All(s => s.HandChecks).GroupBy(c => (c.Row.Name, c.Row.Subject)).Select(g => g.MaxBy(c => c.Row.RelativeDifference)!).ToList();
        var ofKind = worst.GroupBy(c => c.Row.Name).Select(g => g.MaxBy(c => c.Row.RelativeDifference)!).ToHashSet();
        InState<HandCheck>[] shown =
        [
            .. worst.Where(c => all || !c.Row.Agrees || ofKind.Contains(c))
                .OrderBy(c => c.Row.Agrees).ThenByDescending(c => c.Row.RelativeDifference),
        ];
        TextTable.Write(
            writer, all ? "Hand checks, each in the state where it differs most" : "Hand checks, the largest difference of each kind", shown, view.RowLimit,
            new("check", c => c.Row.Name, Left: true),
            new("of", c => c.Row.Subject, Left: true),
            new("by hand", c => Format.Number(c.Row.Hand, 5)),
            new("computed", c => Format.Number(c.Row.Computed, 5)),
            new("unit", c => c.Row.Unit, Left: true),
            new("apart [%]", c => Format.Percent(c.Row.RelativeDifference * 100)),
            new("", c => c.Row.Agrees ? "agrees" : "DIFFERS", Left: true),
            new("state", c => c.State, Left: true),
            new("formula", c => c.Row.Formula, Left: true));
    }

    private static void Assumed(TextWriter writer, ReportView view)
    {
        var groups = view.Case.Assumed.GroupBy(a => (a.Column, a.Value, a.Why))
            .Select(g => (g.Key, Elements: g.Select(a => a.Element).ToArray()))
            .ToArray();
        TextTable.Write(
            writer, "Assumed, because the case leaves it blank", groups, view.RowLimit,
            new("column", g => g.Key.Column, Left: true),
            new("value", g => g.Key.Value, Left: true),
            new("for", g => Format.Some(g.Elements, view.IsStudy ? 4 : 8), Left: true),
            new("why", g => g.Key.Why, Left: true));
    }
}
