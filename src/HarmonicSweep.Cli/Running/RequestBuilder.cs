using System.CommandLine;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using static System.FormattableString;

namespace HarmonicSweep.Cli;

/// <summary>Turns a case and the choices of the command line into a request; collects every complaint about the choices.</summary>
internal sealed class RequestBuilder(CaseFile caseFile, CommandOptions options, ParseResult parsed, bool everyStateByDefault)
{
    /// <summary>Points of one curve beyond which a spacing is taken for a slip of the pen.</summary>
    private const double MostPoints = 1e6;

    private const string All = "all";

    /// <summary>What is wrong with the choices.</summary>
    public List<Finding> Complaints { get; } = [];

    /// <summary>The request; null when a choice is wrong.</summary>
    public StudyRequest? Build()
    {
        IReadOnlyList<OperatingState> states = States();
        string[] buses = [.. (parsed.GetValue(options.Buses) ?? []).Distinct(StringComparer.Ordinal)];
        string? injectedAt = parsed.GetValue(options.InjectedAt);
        foreach (string bus in injectedAt is null ? buses : buses.Append(injectedAt))
        {
            CheckBus(bus);
        }

        SweepRange sweep = Sweep();
        return Complaints.Count > 0 ? null : new StudyRequest
        {
            Plant = caseFile.Plant,
            States = states,
            Settings = caseFile.Settings with
            {
                Sweep = sweep,
                Rule = parsed.GetValue(options.Rule) ?? caseFile.Settings.Rule,
            },
            Buses = buses,
            InjectedAt = injectedAt,
            Orders = parsed.GetValue(options.Orders) ?? [],
            Sequence = parsed.GetValue(options.Sequence) ?? Sequence.Positive,
            Combinations = parsed.GetValue(options.Combinations),
            NearOrders = parsed.GetValue(options.Near) ?? 0.3,
            Threads = parsed.GetValue(options.Threads) ?? Environment.ProcessorCount,
        };
    }

    private IReadOnlyList<OperatingState> States()
    {
        string[] asked = [.. (parsed.GetValue(options.States) ?? []).Distinct(StringComparer.Ordinal)];
        if (asked.Length == 0)
        {
            asked = [everyStateByDefault ? All : OperatingState.BaseName];
        }

        if (asked.Contains(All, StringComparer.Ordinal))
        {
            return caseFile.States;
        }

        var found = new List<OperatingState>();
        foreach (string name in asked)
        {
            if (caseFile.States.FirstOrDefault(s => s.Name == name) is { } state)
            {
                found.Add(state);
            }
            else
            {
                string[] known = [All, .. caseFile.States.Select(s => s.Name)];
                Complain("HS903", $"--state names no state of this case: '{name}'.{NearestWord.Hint(name, known)}", "use " + Listed(known));
            }
        }

        return found;
    }

    private void CheckBus(string bus)
    {
        if (caseFile.Plant.FindBus(bus) is null)
        {
            string[] known = [.. caseFile.Plant.Buses.Select(b => b.Name)];
            Complain("HS902", $"no bus of this case is named '{bus}'.{NearestWord.Hint(bus, known)}", "use " + Listed(known));
        }
    }

    private SweepRange Sweep()
    {
        SweepRange given = caseFile.Settings.Sweep;
        var sweep = new SweepRange(
            parsed.GetValue(options.FromHz) ?? given.FromHz,
            parsed.GetValue(options.ToHz) ?? given.ToHz,
            parsed.GetValue(options.StepHz) ?? given.StepHz);
        if (sweep.FromHz >= sweep.ToHz)
        {
            Complain(
                "HS904", Invariant($"the scan runs from {sweep.FromHz} Hz to {sweep.ToHz} Hz; expected the first frequency below the last."),
                "change --from-hz or --to-hz, or [sweep] in case.toml.");
        }
        else if ((sweep.ToHz - sweep.FromHz) / sweep.StepHz > MostPoints)
        {
            Complain(
                "HS904", Invariant($"a spacing of {sweep.StepHz} Hz makes more than {MostPoints:F0} points a curve."),
                "widen --step-hz; resonances are refined whatever the spacing.");
        }

        return sweep;
    }

    private void Complain(string id, string message, string remedy) =>
        Complaints.Add(new Finding(Severity.Error, id, null, message, remedy));

    /// <summary>All of a short list, the start of a long one.</summary>
    private static string Listed(IReadOnlyList<string> names) => names.Count <= 12
        ? string.Join(", ", names) + "."
        : Invariant($"{string.Join(", ", names.Take(10))} or one of {names.Count - 10} more.");
}
