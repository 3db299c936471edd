using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Studies;

/// <summary>One state to solve while screening, and the banks looked at in it.</summary>
/// <param name="BaseState">State it starts from.</param>
/// <param name="Strength">Label of the supply strength.</param>
/// <param name="State">Full state.</param>
/// <param name="Moved">Banks that were moved, with their steps.</param>
internal sealed record ScreenJob(
    string BaseState, string Strength, OperatingState State, IReadOnlyList<(CapacitorBank Bank, int Steps)> Moved);

/// <summary>Every step of every bank at every supply strength, one bank at a time or all together.</summary>
internal static class ScreenJobs
{
    private const int MostPositions = 5000;

    /// <summary>The jobs of all states asked for; a state that repeats another once bank and supply are set is left out.</summary>
    /// <exception cref="CaseException">All combinations are more than can be listed.</exception>
    public static IReadOnlyList<ScreenJob> Of(StudyRequest request)
    {
        var jobs = new List<ScreenJob>();
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (OperatingState state in request.States)
        {
            foreach ((string strength, StateSetting[] settings) in Strengths(request, state))
            {
                foreach (IReadOnlyList<(CapacitorBank Bank, int Steps)> moved in Positions(request))
                {
                    ScreenJob job = Job(state, strength, settings, moved);
                    if (seen.Add(Key(job)))
                    {
                        jobs.Add(job);
                    }
                }
            }
        }

        return jobs;
    }

    private static ScreenJob Job(
        OperatingState state, string strength, StateSetting[] settings, IReadOnlyList<(CapacitorBank Bank, int Steps)> moved)
    {
        string banks = string.Join(", ", moved.Select(m => Invariant($"{m.Bank.Name} {m.Steps}/{m.Bank.Steps}")));
        string supply = strength.Length == 0 ? "" : $", supply {strength}";
        OperatingState full = state.With($"{state.Name}{supply}, {banks}", settings.Concat(moved.SelectMany(m => (StateSetting[])
            [new ServiceSetting(m.Bank.Name, true), new StepsSetting(m.Bank.Name, m.Steps)])));
        return new ScreenJob(state.Name, strength, full, moved);
    }

    /// <summary>What the state sets in the end, and which bank is looked at.</summary>
    private static string Key(ScreenJob job)
    {
        var last = new SortedDictionary<string, string>(StringComparer.Ordinal);
        foreach (StateSetting setting in job.State.Settings)
        {
            last[setting.Element + "\n" + setting.GetType().Name] = setting.ToString();
        }

        return string.Join("\n", last.Values) + "\n" + string.Join("\n", job.Moved.Select(m => m.Bank.Name));
    }

    /// <summary>
    /// Supply strengths given: all at maximum, all at minimum where it differs, and each number of MVA a state names.
    /// One unnamed strength where no supply is in service.
    /// </summary>
    private static IEnumerable<(string Label, StateSetting[] Settings)> Strengths(StudyRequest request, OperatingState state)
    {
        var plant = new PlantInState(request.Plant, state);
        Supply[] supplies = [.. request.Plant.Of<Supply>().Where(plant.IsIn)];
        if (supplies.Length == 0)
        {
            yield return ("", []);
            yield break;
        }

        yield return ("max", [.. supplies.Select(s => new ShortCircuitSetting(s.Name, ShortCircuitLevel.Max))]);
        if (supplies.Any(s => s.ShortCircuitMvaMin < s.ShortCircuitMvaMax))
        {
            yield return ("min", [.. supplies.Select(s => new ShortCircuitSetting(s.Name, ShortCircuitLevel.Min))]);
        }

        IEnumerable<ShortCircuitSetting> numbers = request.States
            .SelectMany(s => s.Settings)
            .OfType<ShortCircuitSetting>()
            .Where(s => s.Level.Mva is not null && Array.Exists(supplies, x => x.Name == s.Element))
            .Distinct();
        foreach (ShortCircuitSetting number in numbers)
        {
            string label = supplies.Length == 1 ? $"{number.Level} MVA" : $"{number.Element} {number.Level} MVA";
            yield return (label, [number]);
        }
    }

    private static IEnumerable<IReadOnlyList<(CapacitorBank Bank, int Steps)>> Positions(StudyRequest request)
    {
        CapacitorBank[] banks = [.. request.Plant.Of<CapacitorBank>()];
        if (!request.Combinations)
        {
            return banks.SelectMany(b => Enumerable.Range(0, b.Steps + 1).Select(k => (IReadOnlyList<(CapacitorBank, int)>)[(b, k)]));
        }

        double count = banks.Aggregate(1.0, (product, b) => product * (b.Steps + 1));
        if (count > MostPositions)
        {
            throw new CaseException([new Finding(
                Severity.Error, "HS204", new SourceLocation("capacitors.csv", 0, "steps"),
                Invariant($"all combinations of bank steps are {count:G6} positions; expected at most {MostPositions}."),
                "leave out --combinations, which moves one bank at a time.")]);
        }

        IEnumerable<IReadOnlyList<(CapacitorBank, int)>> tuples = [[]];
        foreach (CapacitorBank bank in banks)
        {
            tuples = [.. tuples.SelectMany(t => Enumerable.Range(0, bank.Steps + 1).Select(k => (IReadOnlyList<(CapacitorBank, int)>)[.. t, (bank, k)]))];
        }

        return banks.Length == 0 ? [] : tuples;
    }
}
