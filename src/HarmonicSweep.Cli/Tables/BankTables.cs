using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>Bank screening: every position, and the worst voltage of every bus over them.</summary>
internal static class BankTables
{
    /// <summary>Writes them.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        if (view.Result.Screen is not { } screen)
        {
            return;
        }

        // a command of its own shows the step map in the order of the steps; the main job only what must be avoided
        IReadOnlyList<BankPosition> shown = view.IsStudy ? view.BadPositions() : screen.Positions;
        TextTable.Write(
            writer, view.IsStudy ? "Bank positions not to dwell on, or beyond what the capacitors may carry" : "Bank positions",
            shown, view.IsStudy ? view.RowLimit : int.MaxValue,
            [
                new("position", p => p.State, Left: true),
                new("kvar in", p => Format.Number(p.KvarIn)),
                new("by hand", p => Format.Number(p.HandOrder)),
                new("resonance", p => Format.Number(p.Nearest?.Order)),
                new("injected", p => Format.GivenOrder(p.Nearest?.NearestInjectedOrder)),
                new("THD [%]", p => Format.Percent(p.ThdPercent)),
                new("U [%]", p => Format.Number(p.Loading?.RmsVoltagePercent)),
                new("crest [%]", p => Format.Number(p.Loading?.CrestVoltagePercent)),
                new("I [%]", p => Format.Number(p.Loading?.CurrentPercent)),
                new("kvar [%]", p => Format.Number(p.Loading?.KvarPercent)),
                .. view.IsStudy ? [] : Operation(),
                new("", Mark, Left: true),
            ]);
        if (shown.Count > 0)
        {
            writer.WriteLine("  by hand, resonance, injected: orders. U, crest, I, kvar: of the capacitors, percent of rated; IEEE 18 permits 110, 120, 135, 135.");
        }

        if (view.IsStudy)
        {
            return;
        }

        Worst(writer, screen);
    }

    /// <summary>One row a bus: its largest THD and its largest harmonic, each with the position that gives it.</summary>
    private static void Worst(TextWriter writer, ScreenResult screen)
    {
        (string Bus, WorstValue? Thd, WorstValue? Harmonic)[] buses =
        [
            .. screen.Worst.GroupBy(w => w.Bus, StringComparer.Ordinal)
                .Select(g => (g.Key, g.FirstOrDefault(w => w.Order is null), g.Where(w => w.Order is not null).MaxBy(w => w.Percent)))
                .OrderByDescending(b => b.Item2?.Percent ?? 0),
        ];
        TextTable.Write(
            writer, "Largest distortion of every bus over all positions", buses, int.MaxValue,
            new("bus", b => b.Bus, Left: true),
            new("THD [% V_1]", b => Format.Percent(b.Thd?.Percent)),
            new("at position", b => b.Thd?.State ?? Format.Missing, Left: true),
            new("order", b => Format.GivenOrder(b.Harmonic?.Order)),
            new("V_h [% nominal]", b => Format.Percent(b.Harmonic?.Percent)),
            new("at position", b => b.Harmonic?.State ?? Format.Missing, Left: true));
    }

    /// <summary>What the position does for the plant at the fundamental: the reason to switch it at all.</summary>
    private static TextColumn<BankPosition>[] Operation() =>
    [
        new("PF at PCC", p => Format.Number(p.PccPowerFactor, 3)),
        new("bus V [%]", p => Format.Number(p.BusVoltagePercent)),
    ];

    private static string Mark(BankPosition position) => (position.DoNotDwell, position.Loading is { Overloaded: true }) switch
    {
        (true, true) => "DO NOT DWELL, OVERLOAD",
        (true, false) => "DO NOT DWELL",
        (false, true) => "OVERLOAD",
        _ => "",
    };
}
