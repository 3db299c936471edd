using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>case.toml: slips of notation in plain words, and values.</summary>
public class CaseTomlTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "title missing", p => p.Replace("case.toml", "title = \"Small plant\"\n", "") },
        { "frequency missing", p => p.Replace("case.toml", "frequency_hz = 50\n", "") },
        { "empty", p => p.With("case.toml", "") },
        { "frequency 0", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 0\n") },
        { "frequency negative", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = -50\n") },
        { "frequency nan", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = nan\n") },
        { "frequency huge", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 1e308\n") },
        { "frequency as a text", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = \"50\"\n") },
        { "doubt: frequency", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 3\n") },
        { "title as a number", p => p.Replace("case.toml", "\"Small plant\"", "7") },
        { "title blank", p => p.Replace("case.toml", "\"Small plant\"", "\" \"") },
        { "title of two lines", p => p.Replace("case.toml", "\"Small plant\"", "\"Small\\nplant\"") },
        { "base_mva", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\nbase_mva = -10\n") },
        { "unknown key", p => p.Replace("case.toml", "step_hz", "steps_hz") },
        { "key of another table", p => p.Replace("case.toml", "step_hz = 1", "pcc = \"MAIN\"") },
        { "key at the top", p => p.Replace("case.toml", "title = ", "pc = \"MAIN\"\ntitle = ") },
        { "unknown table", p => p.Replace("case.toml", "[sweep]", "[sweeps]") },
        { "double brackets", p => p.Replace("case.toml", "[sweep]", "[[sweep]]") },
        { "inline table", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\nlimits = { pcc = \"MAIN\" }\n") },
        { "key twice", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\nfrequency_hz = 60\n") },
        { "to below from", p => p.Replace("case.toml", "to_hz = 2500", "to_hz = 50") },
        { "from above the default end", p => p.Replace("case.toml", "from_hz = 50\nto_hz = 2500", "from_hz = 3000") },
        { "too many points", p => p.Replace("case.toml", "step_hz = 1", "step_hz = 0.0001") },
        { "step 0", p => p.Replace("case.toml", "step_hz = 1", "step_hz = 0") },
        { "rule unknown", p => p.Replace("case.toml", "\"phasor\"", "\"phaser\"") },
        { "standard unknown", p => p.Replace("case.toml", "IEEE 519-2022", "IEEE 519-1992") },
        { "standards of numbers", p => p.Replace("case.toml", "[\"IEEE 519-2022\"]", "[519]") },
        { "no pcc", p => p.Replace("case.toml", "pcc = \"GRID-BUS\"", "") },
        { "pcc blank", p => p.Replace("case.toml", "\"GRID-BUS\"", "\"\"") },
        { "text without quotes", p => p.Replace("case.toml", "\"GRID-BUS\"", "GRID-BUS") },
        { "text with one quote", p => p.Replace("case.toml", "\"Small plant\"", "\"Small plant") },
        { "typographic quotes", p => p.Replace("case.toml", "\"Small plant\"", "\u201CSmall plant\u201D") },
        { "backslash", p => p.Replace("case.toml", "\"Small plant\"", "\"C:\\plant\"") },
        { "decimal comma", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50,0\n") },
        { "unit", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50 Hz\n") },
        { "leading zero", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 050\n") },
        { "point without digits", p => p.Replace("case.toml", "step_hz = 1", "step_hz = .5") },
        { "colon", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz: 50\n") },
        { "no value", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz =\n") },
        { "two on a line", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50 base_mva = 10\n") },
        { "key of two words", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency hz = 50\n") },
        { "foreign comment", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\n// fifty\n; fifty\n") },
        { "bracket open", p => p.Replace("case.toml", "[limits]", "[limits") },
        { "list open", p => p.Replace("case.toml", "[\"IEEE 519-2022\"]", "[\"IEEE 519-2022\"") },
        { "several slips", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50 Hz\n").Replace("case.toml", "\"GRID-BUS\"", "GRID-BUS") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
