using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>Fundamental voltages of every bus in every state.</summary>
internal static class OperationTables
{
    /// <summary>Writes them for the command that is about them; elsewhere they stand in the files.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        if (view.Command != "check")
        {
            return;
        }

        Dictionary<(string State, string Bus), double> kv = [];
        foreach (InState<BusVoltage> v in view.All(s => s.PowerFlow))
        {
            kv[(v.State, v.Row.Bus)] = v.Row.Kv.Magnitude;
        }

        string Percent(string state, Bus bus) =>
            kv.TryGetValue((state, bus.Name), out double value) ? Format.Percent(value / bus.NominalKv * 100) : "dead";
        TextTable.WriteMatrix(
            writer, "Fundamental voltage, percent of nominal", view.Plant.Buses, new TextColumn<Bus>("bus", b => b.Name, Left: true),
            [
                new TextColumn<Bus>("nominal [kV]", b => Format.Number(b.NominalKv)),
                .. view.Result.States.Select(s => new TextColumn<Bus>(s.State, b => Percent(s.State, b))),
            ]);
        foreach (IGrouping<string, StateResult> same in view.Result.States.GroupBy(
            s => Format.Some([.. s.InjectedOrders.Select(Format.GivenOrderOf)], 20), StringComparer.Ordinal))
        {
            string[] states = [.. same.Select(s => s.State)];
            writer.WriteLine($"  injected orders: {(same.Key.Length == 0 ? "none" : same.Key)} ({Format.Some(states, 6)})");
        }
    }
}
