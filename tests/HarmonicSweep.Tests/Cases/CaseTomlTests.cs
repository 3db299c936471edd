using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>case.toml: slips of notation in plain words, and values.</summary>
public class CaseTomlTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "title missing", p => p.Replace("case.toml", "title = \"Small plant\"\n", ""),
            "case.toml(title): error HS035: title is missing; expected a text in quotes. Fix: add title = ... at the top of case.toml."
        },
        { "frequency missing", p => p.Replace("case.toml", "frequency_hz = 50\n", ""),
            "case.toml(frequency_hz): error HS035: frequency_hz is missing; expected a number above 0 in Hz. Fix: add frequency_hz = ... at the top of case.toml."
        },
        { "empty", p => p.With("case.toml", ""),
            "case.toml(title): error HS035: title is missing; expected a text in quotes. Fix: add title = ... at the top of case.toml.",
            "case.toml(frequency_hz): error HS035: frequency_hz is missing; expected a number above 0 in Hz. Fix: add frequency_hz = ... at the top of case.toml.",
            "case.toml(pcc): note HS101: no PCC is given, so no limit can be judged. Fix: name the bus at the point of common coupling: pcc = \"BUS\" under [limits]."
        },
        { "frequency 0", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 0\n"),
            "case.toml(2,frequency_hz): error HS036: frequency_hz is 0; expected a number above 0 in Hz. Fix: correct the value."
        },
        { "frequency negative", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = -50\n"),
            "case.toml(2,frequency_hz): error HS036: frequency_hz is -50; expected a number above 0 in Hz. Fix: correct the value."
        },
        { "frequency nan", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = nan\n"),
            "case.toml(2,frequency_hz): error HS036: frequency_hz is NaN; expected a number above 0 in Hz. Fix: correct the value."
        },
        { "frequency huge", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 1e308\n"),
            "case.toml(2,frequency_hz): error HS036: frequency_hz is 1E+308; expected a number above 0 in Hz (from 1e-12 to 1e12). Fix: correct the value."
        },
        { "frequency as a text", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = \"50\"\n"),
            "case.toml(2,frequency_hz): error HS034: frequency_hz is a text; expected a number above 0 in Hz. Fix: write digits without quotes."
        },
        { "doubt: frequency", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 3\n"),
            "case.toml(2,frequency_hz): warning HS112: a fundamental of 3 Hz is outside the usual 10 to 1000. Fix: check that it is the frequency of the supply in Hz."
        },
        { "title as a number", p => p.Replace("case.toml", "\"Small plant\"", "7"),
            "case.toml(1,title): error HS034: title is not a text; expected a text in quotes. Fix: write title = \"...\"."
        },
        { "title blank", p => p.Replace("case.toml", "\"Small plant\"", "\" \""),
            "case.toml(1,title): error HS034: title is blank; expected a text in quotes. Fix: write title = \"...\"."
        },
        { "title of two lines", p => p.Replace("case.toml", "\"Small plant\"", "\"Small\\nplant\""),
            "case.toml(1,title): error HS034: title has a line break or a control character in it; expected a text of one line. Fix: write it in one line."
        },
        { "base_mva", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\nbase_mva = -10\n"),
            "case.toml(3,base_mva): error HS036: base_mva is -10; expected a number above 0 in MVA. Fix: correct the value."
        },
        { "unknown key", p => p.Replace("case.toml", "step_hz", "steps_hz"),
            "case.toml(7,steps_hz): error HS033: unknown key 'steps_hz' in [sweep]; known are from_hz, to_hz, step_hz. Fix: did you mean 'step_hz'? Otherwise remove it."
        },
        { "key of another table", p => p.Replace("case.toml", "step_hz = 1", "pcc = \"MAIN\""),
            "case.toml(7,pcc): error HS033: unknown key 'pcc' in [sweep]; known are from_hz, to_hz, step_hz. Fix: move it under [limits]."
        },
        { "key at the top", p => p.Replace("case.toml", "title = ", "pc = \"MAIN\"\ntitle = "),
            "case.toml(1,pc): error HS033: unknown key 'pc'; known are title, frequency_hz, base_mva. Fix: write pcc, if that is meant, and move it under [limits]."
        },
        { "unknown table", p => p.Replace("case.toml", "[sweep]", "[sweeps]"),
            "case.toml(4,sweeps): error HS033: unknown table [sweeps]; known are [sweep], [limits] and [summation]. Fix: did you mean 'sweep'? Otherwise remove it."
        },
        { "double brackets", p => p.Replace("case.toml", "[sweep]", "[[sweep]]"),
            "case.toml(4,sweep): error HS033: [[sweep]] stands in double brackets; expected [sweep]. Fix: write one pair of brackets."
        },
        { "inline table", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\nlimits = { pcc = \"MAIN\" }\n"),
            "case.toml(3,limits): error HS033: unknown key 'limits'; known are title, frequency_hz, base_mva. Fix: write [limits] on a line of its own, and its keys under it."
        },
        { "key twice", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\nfrequency_hz = 60\n"),
            "case.toml(3,frequency_hz): error HS045: frequency_hz is already given in line 2; expected it once. Fix: keep one of them."
        },
        { "to below from", p => p.Replace("case.toml", "to_hz = 2500", "to_hz = 50"),
            "case.toml(6,to_hz): error HS036: to_hz is 50 Hz; expected more than from_hz, 50 Hz. Fix: give a range that rises."
        },
        { "from above the default end", p => p.Replace("case.toml", "from_hz = 50\nto_hz = 2500", "from_hz = 3000"),
            "case.toml(5,from_hz): error HS036: to_hz is 2500 Hz; expected more than from_hz, 3000 Hz. Fix: give a range that rises."
        },
        { "too many points", p => p.Replace("case.toml", "step_hz = 1", "step_hz = 0.0001"),
            "case.toml(7,step_hz): error HS036: from_hz 50 to to_hz 2500 in steps of 0.0001 Hz is more than 1000000 points; expected fewer. Fix: give a larger step_hz; resonances are found between the points all the same."
        },
        { "step 0", p => p.Replace("case.toml", "step_hz = 1", "step_hz = 0"),
            "case.toml(7,step_hz): error HS036: step_hz is 0; expected a number above 0 in Hz. Fix: correct the value."
        },
        { "rule unknown", p => p.Replace("case.toml", "\"phasor\"", "\"phaser\""),
            "case.toml(14,rule): error HS014: rule is 'phaser'; expected one of phasor, arithmetic, rss, iec. Fix: did you mean 'phasor'? Otherwise write one of those words."
        },
        { "standard unknown", p => p.Replace("case.toml", "IEEE 519-2022", "IEEE 519-1992"),
            "case.toml(10,standards): error HS038: limit set 'IEEE 519-1992' is not known; expected IEEE 519-2022. Fix: write standards = [\"IEEE 519-2022\"], or [] to judge nothing."
        },
        { "standards of numbers", p => p.Replace("case.toml", "[\"IEEE 519-2022\"]", "[519]"),
            "case.toml(10,standards): error HS034: standards is not a list of texts; expected the names of limit sets. Fix: write standards = [\"IEEE 519-2022\"]."
        },
        { "no pcc", p => p.Replace("case.toml", "pcc = \"GRID-BUS\"", ""),
            "case.toml(pcc): note HS101: no PCC is given, so no limit can be judged. Fix: name the bus at the point of common coupling: pcc = \"BUS\" under [limits]."
        },
        { "pcc blank", p => p.Replace("case.toml", "\"GRID-BUS\"", "\"\""),
            "case.toml(11,pcc): error HS034: pcc is blank; expected a text in quotes. Fix: write pcc = \"...\", or remove the line."
        },
        { "text without quotes", p => p.Replace("case.toml", "\"GRID-BUS\"", "GRID-BUS"),
            "case.toml(11): error HS032: pcc: 'GRID-BUS' is neither a number nor a text in quotes. Fix: write the text in double quotes: pcc = \"...\"."
        },
        { "text with one quote", p => p.Replace("case.toml", "\"Small plant\"", "\"Small plant"),
            "case.toml(1): error HS032: title: the text \"Small plant is not closed by its quotation mark, or more follows it. Fix: write the text in double quotes: title = \"...\"."
        },
        { "typographic quotes", p => p.Replace("case.toml", "\"Small plant\"", "\u201CSmall plant\u201D"),
            "case.toml(1): error HS032: a typographic quotation mark stands here; expected straight quotes. Fix: write texts in straight double quotes: title = \"Plant\"."
        },
        { "backslash", p => p.Replace("case.toml", "\"Small plant\"", "\"C:\\plant\""),
            "case.toml(1): error HS032: title: a backslash stands in a text in double quotes, where it has a meaning of its own. Fix: double it, or write the text in single quotes."
        },
        { "decimal comma", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50,0\n"),
            "case.toml(2): error HS032: frequency_hz is 50,0, with a comma; expected digits with a decimal point. Fix: write decimals with a point, and no thousands separators."
        },
        { "unit", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50 Hz\n"),
            "case.toml(2): error HS032: frequency_hz is '50 Hz'; expected a number alone. Fix: write digits with a decimal point, without a unit; begin a comment with #."
        },
        { "leading zero", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 050\n"),
            "case.toml(2): error HS032: frequency_hz is 050; expected a number without leading zeros. Fix: remove the zeros."
        },
        { "point without digits", p => p.Replace("case.toml", "step_hz = 1", "step_hz = .5"),
            "case.toml(7): error HS032: step_hz is .5; expected digits on both sides of the decimal point. Fix: write for example 0.5 or 50."
        },
        { "colon", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz: 50\n"),
            "case.toml(2): error HS032: 'frequency_hz: 50' is neither key = value, nor a [table], nor a comment. Fix: write = between key and value; begin a comment with #."
        },
        { "no value", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz =\n"),
            "case.toml(2): error HS032: frequency_hz has no value. Fix: write a value after the =, or put # before the key to leave it out."
        },
        { "two on a line", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50 base_mva = 10\n"),
            "case.toml(2): error HS032: frequency_hz: a second = stands on the line. Fix: write one key = value on a line."
        },
        { "key of two words", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency hz = 50\n"),
            "case.toml(2): error HS032: 'frequency hz' is no key; expected one word of letters, digits and _ before the =. Fix: write key = value on a line of its own."
        },
        { "foreign comment", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50\n// fifty\n; fifty\n"),
            "case.toml(3): error HS032: '// fifty' is neither key = value, nor a [table], nor a comment. Fix: write = between key and value; begin a comment with #.",
            "case.toml(4): error HS032: '; fifty' is neither key = value, nor a [table], nor a comment. Fix: write = between key and value; begin a comment with #."
        },
        { "bracket open", p => p.Replace("case.toml", "[limits]", "[limits"),
            "case.toml(9): error HS032: '[limits' is no table header; expected a name in one pair of brackets. Fix: write [sweep], [limits] or [summation] on a line of its own."
        },
        { "list open", p => p.Replace("case.toml", "[\"IEEE 519-2022\"]", "[\"IEEE 519-2022\""),
            "case.toml(10): error HS032: standards: the list [\"IEEE 519-2022\" is not closed, or a comma between its items is missing. Fix: write standards = [\"...\", \"...\"]."
        },
        { "several slips", p => p.Replace("case.toml", "frequency_hz = 50\n", "frequency_hz = 50 Hz\n").Replace("case.toml", "\"GRID-BUS\"", "GRID-BUS"),
            "case.toml(2): error HS032: frequency_hz is '50 Hz'; expected a number alone. Fix: write digits with a decimal point, without a unit; begin a comment with #.",
            "case.toml(11): error HS032: pcc: 'GRID-BUS' is neither a number nor a text in quotes. Fix: write the text in double quotes: pcc = \"...\"."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
