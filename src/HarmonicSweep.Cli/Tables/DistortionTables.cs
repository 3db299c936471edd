using HarmonicSweep.Cases.Results;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>THD of every bus; for a command of its own also the harmonics of buses, banks, filters and in-feeds.</summary>
internal static class DistortionTables
{
    /// <summary>Writes them.</summary>
    public static void Write(TextWriter writer, ReportView view)
    {
        ILookup<(string State, string Bus), BusDistortion> byBus = view.All(s => s.Distortion).ToLookup(d => (d.State, d.Row.Bus), d => d.Row);
        double? Thd(InState<BusDistortion> at, SummationRule rule) =>
            byBus[(at.State, at.Row.Bus)].FirstOrDefault(d => d.Rule == rule)?.PercentOfFundamental;
        TextTable.Write(
            writer, $"Total harmonic distortion of voltage, integers 2 to 50, worst first (chosen rule: {view.Rule.Word()})", view.ThdByValue(), view.RowLimit,
            [
                new("state", d => d.State, Left: true),
                new("bus", d => d.Row.Bus, Left: true),
                .. ResultWords.Rules.Select(rule => new TextColumn<InState<BusDistortion>>($"{rule.Word()} [% V_1]", d => Format.Percent(Thd(d, rule)))),
                new("chosen [% nominal]", d => Format.Percent(d.Row.PercentOfNominal)),
                new("", d => d.Row.PercentOfFundamental is null ? "not judged: dead bus" : "", Left: true),
            ]);
        if (view.IsStudy)
        {
            return;
        }

        foreach (StateResult state in view.Result.States)
        {
            Voltages(writer, view, state);
            Currents(writer, view, state);
        }
    }

    private static void Voltages(TextWriter writer, ReportView view, StateResult state)
    {
        Dictionary<(string, double), double> percent = [];
        foreach (HarmonicVoltage v in state.Voltages)
        {
            percent[(v.Bus, v.Order)] = v.PercentOfNominal[view.Rule];
        }

        Matrix(
            writer, $"Bus voltages, percent of nominal, {view.Rule.Word()} sum, state {state.State}",
            state.Voltages.Select(v => v.Order), state.Voltages.Select(v => v.Bus),
            (bus, order) => percent.TryGetValue((bus, order), out double value) ? Format.Percent(value) : Format.Missing);
    }

    private static void Currents(TextWriter writer, ReportView view, StateResult state)
    {
        HarmonicCurrent[] watched =
        [
            .. state.Currents.Where(c => view.Plant.FindElement(c.Element) is CapacitorBank or Filter or Supply or Generator),
        ];
        Dictionary<(string, double), double> ampere = [];
        foreach (HarmonicCurrent c in watched)
        {
            ampere[(c.Element, c.Order)] = c.AmpereByRule[view.Rule];
        }

        Matrix(
            writer, $"Currents of banks, filters and sources, A rms, {view.Rule.Word()} sum, state {state.State}",
            watched.Select(c => c.Order), watched.Select(c => c.Element),
            (element, order) => ampere.TryGetValue((element, order), out double value) ? Format.Number(value) : Format.Missing);
    }

    private static void Matrix(
        TextWriter writer, string title, IEnumerable<double> orders, IEnumerable<string> names, Func<string, double, string> cell) =>
        TextTable.WriteMatrix(
            writer, title, [.. orders.Distinct().Order()],
            new TextColumn<double>("order", Format.GivenOrderOf),
            [.. names.Distinct(StringComparer.Ordinal).Select(name => new TextColumn<double>(name, order => cell(name, order)))]);
}
