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

        TextTable.Write(
            writer, "Largest voltages over all positions", [.. screen.Worst.OrderBy(w => w.Order is not null).ThenByDescending(w => w.Percent)], view.RowLimit,
            new("bus", w => w.Bus, Left: true),
            new("quantity", w => w.Order is null ? "THD_V" : "V_h", Left: true),
            new("order", w => Format.GivenOrder(w.Order)),
            new("value [%]", w => Format.Percent(w.Percent)),
            new("at position", w => w.State, Left: true));
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
