using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>Rows of a position map that fit one panel, each with its name and the position it shows (null when not listed).</summary>
internal sealed record MapSection(PositionMap Map, BankPosition?[] Positions, string[] Names)
{
    /// <summary>The supply strength in words.</summary>
    public string StrengthText => Map.Strength switch
    {
        "max" => "maximum",
        "min" => "minimum",
        _ => Map.Strength + " MVA",
    };

    /// <summary>The map cut into sections of at most that many rows.</summary>
    public static IEnumerable<MapSection> Of(ScreenResult screen, PositionMap map, int mostRows)
    {
        BankPosition?[] positions = PositionsOf(screen, map);
        for (int first = 0; first < map.StepsIn.Count; first += mostRows)
        {
            int[] steps = [.. map.StepsIn.Skip(first).Take(mostRows)];
            BankPosition?[] rows = positions[first..(first + steps.Length)];
            yield return new MapSection(
                map with { StepsIn = steps, Ohm = [.. map.Ohm.Skip(first).Take(mostRows)] }, rows, [.. steps.Select((s, row) => NameOf(s, rows[row]))]);
        }
    }

    /// <summary>The screened position of every row: by place when the lists match, else by the number of steps.</summary>
    private static BankPosition?[] PositionsOf(ScreenResult screen, PositionMap map)
    {
        BankPosition[] positions =
        [
            .. screen.Positions.Where(p => p.BaseState == map.BaseState && p.Bank == map.Bank && p.Strength == map.Strength),
        ];
        bool matches = positions.Select(p => p.StepsIn).SequenceEqual(map.StepsIn);
        return [.. map.StepsIn.Select((steps, row) => matches ? positions[row] : Array.Find(positions, p => p.StepsIn == steps))];
    }

    private static string NameOf(int stepsIn, BankPosition? position) => position is null
        ? FormattableString.Invariant($"{stepsIn}")
        : FormattableString.Invariant($"{stepsIn} of {position.Steps} · {position.KvarIn:0} kvar");
}
