using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Studies.Standards;

/// <summary>Judges a solved state against the limit sets the case asks for.</summary>
internal static class LimitJudge
{
    /// <summary>Verdicts of every limit set asked for; what cannot be judged says so and why.</summary>
    public static IReadOnlyList<LimitVerdict> Judge(StudyRequest request, DistortionSolution solution)
    {
        if (!request.Settings.Standards.Contains(Ieee519.Token))
        {
            return [];
        }

        if (request.Settings.PccBus is not { } pcc)
        {
            return
            [
                NotJudged("Table 1", "V_h and THD_V", null, null, "no PCC is given (case.toml, [limits] pcc)"),
                NotJudged("Tables 2 to 4", "I_h and TDD", null, null, "no PCC is given (case.toml, [limits] pcc)"),
            ];
        }

        return [.. Voltage(request, solution, pcc), .. Current(request, solution, pcc), .. Unsolved(solution, pcc)];
    }

    private static IEnumerable<LimitVerdict> Voltage(StudyRequest request, DistortionSolution solution, string pcc)
    {
        if (!solution.PowerFlow.IsLive(pcc))
        {
            return [NotJudged("Table 1", "V_h and THD_V", pcc, null, "the PCC is dead in this state")];
        }

        double kv = request.Plant.Bus(pcc).NominalKv;
        VoltageRow row = Ieee519.VoltageLimits(kv);
        string table = "Table 1, " + row.Class;
        string basis = Invariant($"{kv} kV; percent of nominal voltage; {RuleName(request)}");
        SummationRule rule = request.Settings.Rule;
        var verdicts = new List<LimitVerdict>();
        foreach (SolvedOrder solved in solution.Orders.Where(o => DistortionSolution.CountsInThd(o.Order)))
        {
            double percent = Summation.Of(solved.BusKv[pcc], solved.Order)[rule] / kv * 100;
            verdicts.Add(Verdict(table, basis, "V_h", pcc, solved.Order, percent, row.IndividualPercent));
        }

        verdicts.Add(Verdict(table, basis, "THD_V", pcc, null, solution.HarmonicKv(pcc)[rule] / kv * 100, row.ThdPercent));
        return verdicts;
    }

    private static IEnumerable<LimitVerdict> Current(StudyRequest request, DistortionSolution solution, string pcc)
    {
        double kv = request.Plant.Bus(pcc).NominalKv;
        CurrentTable table = Ieee519.CurrentTableFor(kv);
        var pccCurrent = new PccCurrent(solution.PowerFlow.Circuit, pcc);
        double demandMva = request.Plant.Of<Supply>().Sum(s => s.DemandMva ?? 0);
        double? shortCircuitMva = ShortCircuit.FromSuppliesAtMaximumMva(request.Plant, pcc);
        string? why = shortCircuitMva is null ? "no supply reaches the PCC, so there is no I_SC"
            : demandMva <= 0 ? "I_L is missing: no supply has demand_mva"
            : !pccCurrent.Exists || !solution.PowerFlow.IsLive(pcc) ? "no supply feeds the PCC in this state"
            : null;
        if (why is not null)
        {
            return [NotJudged(table.Name, "I_h and TDD", pcc, null, why)];
        }

        double ratio = shortCircuitMva!.Value / demandMva;
        // the quotient of two given numbers: a ratio meant to lie on a boundary does so in spite of rounding
        CurrentRow row = table.RowFor(ratio * (1 + 1e-9));
        double demandA = demandMva * 1000 / (Math.Sqrt(3) * kv);
        double shortCircuitKa = shortCircuitMva.Value / (Math.Sqrt(3) * kv);
        string basis = Invariant($"I_SC {shortCircuitKa:G5} kA, I_L {demandA:G5} A, I_SC/I_L {ratio:G5}; percent of I_L; {RuleName(request)}");
        string name = $"{table.Name}, {row.Label}";
        SummationRule rule = request.Settings.Rule;
        var verdicts = new List<LimitVerdict>();
        var counted = new List<RuleValues>();
        foreach (SolvedOrder solved in solution.Orders.Where(o => DistortionSolution.CountsInThd(o.Order)))
        {
            RuleValues ampere = Summation.Of(pccCurrent.Delivered(solved), solved.Order);
            counted.Add(ampere);
            verdicts.Add(Verdict(
                name, basis, "I_h", pcc, solved.Order, ampere[rule] / demandA * 100, row.LimitPercent((int)solved.Order)));
        }

        verdicts.Add(Verdict(name, basis, "TDD", pcc, null, Summation.RootSumSquares(counted)[rule] / demandA * 100, row.TddPercent));
        return verdicts;
    }

    /// <summary>Orders that were dropped are not judged, and never a pass.</summary>
    private static IEnumerable<LimitVerdict> Unsolved(DistortionSolution solution, string pcc) =>
        DroppedInjections.Of(solution.PowerFlow.Circuit.Plant, solution.PowerFlow)
            .Select(d => d.Order)
            .Where(DistortionSolution.CountsInThd)
            .Distinct()
            .Order()
            .Select(h => NotJudged("Tables 1 to 4", "V_h and I_h", pcc, h, "a zero-sequence order, not solved"));

    private static LimitVerdict Verdict(
        string table, string basis, string quantity, string bus, double? order, double value, double limit) =>
        new(Ieee519.Edition, table, basis, quantity, bus, order, value, limit, value > limit ? Studies.Verdict.Exceeded : Studies.Verdict.Within, null);

    private static LimitVerdict NotJudged(string table, string quantity, string? bus, double? order, string why) =>
        new(Ieee519.Edition, table, "", quantity, bus, order, null, null, Studies.Verdict.NotJudged, why);

    private static string RuleName(StudyRequest request) => $"{request.Settings.Rule.ToString().ToLowerInvariant()} sum";
}
