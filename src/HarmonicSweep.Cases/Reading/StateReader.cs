using System.Globalization;
using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Reads states.csv into operating states.</summary>
internal static class StateReader
{
    private static readonly string[] _settings = ["in", "out", "steps=2", "sc=min", "sc=max", "sc=250", "tap=-2.5", "loading=60"];

    /// <summary>The states in the order of their first row, base first.</summary>
    /// <param name="rows">Rows of states.csv.</param>
    /// <param name="elements">Elements that were built.</param>
    /// <param name="tables">Knows every name of the case, those of rows with errors included, so that one mistake is not reported twice.</param>
    public static List<OperatingState> Read(
        IReadOnlyList<Row> rows, IReadOnlyDictionary<string, PlantElement> elements, TableReader tables)
    {
        var states = new List<OperatingState> { OperatingState.Base };
        var spellings = new Spellings();
        foreach (IGrouping<string, Row> group in rows.GroupBy(r => r.Text("state")))
        {
            Row first = group.First();
            if (group.Key.Equals(OperatingState.BaseName, StringComparison.OrdinalIgnoreCase) || group.Key.Equals("all", StringComparison.OrdinalIgnoreCase))
            {
                first.Error(Ids.ReservedState, "state", $"'{group.Key}' is a reserved name: base is the plant as drawn, all means every state.", "give the state another name.");
                continue;
            }

            spellings.Add(group.Key, first, "state");
            var settings = new List<(StateSetting Setting, Row Row)>();
            foreach (Row row in group)
            {
                if (Setting(row, elements, tables) is not { } setting)
                {
                    continue;
                }

                if (settings.Any(s => s.Setting.Element == setting.Element && s.Setting.GetType() == setting.GetType()))
                {
                    row.Error(Ids.RepeatedSetting, "setting", $"state {group.Key} sets {setting.Element} twice in the same way.", "keep one of the rows.");
                    continue;
                }

                settings.Add((setting, row));
            }

            DoubtSettingsOfWhatIsOut(group.Key, settings);

            states.Add(new OperatingState(group.Key, [.. settings.Select(s => s.Setting)]));
        }

        return states;
    }

    private static void DoubtSettingsOfWhatIsOut(string state, List<(StateSetting Setting, Row Row)> settings)
    {
        HashSet<string> outOfService = [.. settings.Where(s => s.Setting is ServiceSetting { In: false }).Select(s => s.Setting.Element)];
        foreach ((StateSetting setting, Row row) in settings.Where(s => s.Setting is not ServiceSetting && outOfService.Contains(s.Setting.Element)))
        {
            row.Warning(
                Ids.NoEffect, "setting", $"'{row.Text("setting").Shown()}' has no effect: state {state} takes {setting.Element} out.",
                "keep one of the two rows.");
        }
    }

    private static StateSetting? Setting(
        Row row, IReadOnlyDictionary<string, PlantElement> elements, TableReader tables)
    {
        string name = row.Text("element");
        if (!elements.TryGetValue(name, out PlantElement? element))
        {
            if (tables.BusNames.Contains(name))
            {
                row.Error(Ids.UnknownElement, "element", $"'{name}' is a bus; expected an element (a bus goes out with what connects it).", "name the coupler, transformer or line that connects it.");
            }
            else if (!tables.Names.ContainsKey(name) && tables.Incomplete.Count == 0)
            {
                row.Error(
                    Ids.UnknownElement, "element", $"'{name}' is no element; expected the name of an element of the plant.",
                    NearestName.Suggest(name, tables.Names.Keys.Where(n => !tables.BusNames.Contains(n)), "add it to its table, or correct the name."));
            }
        }

        string text = row.Text("setting").ToLowerInvariant().Replace(" ", "", StringComparison.Ordinal);
        if (text is "in" or "out")
        {
            return new ServiceSetting(name, text == "in");
        }

        int equals = text.IndexOf('=');
        string key = equals < 0 ? text : text[..equals];
        string value = equals < 0 ? "" : text[(equals + 1)..];
        double? number = double.TryParse(row.DecimalCommas ? value.Replace(',', '.') : value, NumberStyles.Float, CultureInfo.InvariantCulture, out double n)
            && NumberSize.Fits(n) && !NumberSize.Vanished(value, n) ? n : null;
        if (element is null && key is ("steps" or "sc" or "tap" or "loading"))
        {
            return null;
        }

        switch (key, element)
        {
            case ("steps", CapacitorBank bank):
                return number is { } steps && steps == Math.Floor(steps) && steps >= 0 && steps <= bank.Steps
                    ? new StepsSetting(name, (int)steps)
                    : OutOfRange(row, $"a whole number from 0 to {((double)bank.Steps).Plain()}, the steps of {name}");
            case ("sc", Supply):
                return value is "min" or "max" ? new ShortCircuitSetting(name, value == "min" ? ShortCircuitLevel.Min : ShortCircuitLevel.Max)
                    : number > 0 ? new ShortCircuitSetting(name, new ShortCircuitLevel(number, false))
                    : OutOfRange(row, "min, max or a number above 0 in MVA");
            case ("tap", Transformer):
                return number is { } tap && Math.Abs(tap) <= 30 ? new TapSetting(name, tap) : OutOfRange(row, "a number from -30 to 30 in percent");
            case ("loading", LinearLoad or Motor or Converter):
                return number is >= 0 and <= 300 ? new LoadingSetting(name, number.Value) : OutOfRange(row, "a number from 0 to 300 in percent");
            case ("steps" or "sc" or "tap" or "loading", _):
                row.Error(
                    Ids.SettingKind, "setting", $"'{row.Text("setting").Shown()}' does not apply to {name}; expected {Legal(element)}.", "correct the setting or the element.");
                return null;
            default:
                row.Error(
                    Ids.UnknownSetting, "setting", $"setting '{row.Text("setting").Shown()}' is not known; expected {Legal(element)}.",
                    NearestName.Suggest(key, ["in", "out", "steps=", "sc=", "tap=", "loading="], $"write for example {string.Join(", ", _settings)}."));
                return null;
        }
    }

    private static string Legal(PlantElement? element) => "in, out" + element switch
    {
        null => ", steps=NUMBER, sc=MVA, tap=PERCENT or loading=PERCENT",
        CapacitorBank => " or steps=NUMBER",
        Supply => ", sc=min, sc=max or sc=MVA",
        Transformer => " or tap=PERCENT",
        LinearLoad or Motor or Converter => " or loading=PERCENT",
        _ => "",
    };

    private static StateSetting? OutOfRange(Row row, string expected)
    {
        row.Error(Ids.OutOfRange, "setting", $"setting is '{row.Text("setting").Shown()}'; expected {expected}.", "correct the number.");
        return null;
    }
}
