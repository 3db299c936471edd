using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Studies.Standards;

namespace HarmonicSweep.Cases.Reading;

/// <content>What the keys mean: ranges, defaults, limit sets.</content>
internal sealed partial class CaseToml
{
    private void Interpret()
    {
        int errors = _findings.ErrorCount;
        Title = Text("title") ?? "";
        if (Title.Any(char.IsControl))
        {
            Error(Ids.KeyType, "title", "title has a line break or a control character in it; expected a text of one line.", "write it in one line.");
        }

        if (!_values.ContainsKey("title"))
        {
            Missing("title", "a text in quotes");
        }

        if (Number("frequency_hz", "Hz") is { } frequency)
        {
            FrequencyHz = frequency;
            if (frequency is < 10 or > 1000)
            {
                _findings.Warning(
                    Ids.Frequency, new SourceLocation(File, _values["frequency_hz"].Line, "frequency_hz"), $"a fundamental of {frequency.Plain()} Hz is outside the usual 10 to 1000.",
                    "check that it is the frequency of the supply in Hz.");
            }
        }
        else if (!_values.ContainsKey("frequency_hz"))
        {
            Missing("frequency_hz", "a number above 0 in Hz");
        }

        Number("base_mva", "MVA");
        SweepRange? sweep = Sweep();
        SummationRule rule = Rule();
        string[] standards = Standards();
        string? pcc = PccBus = Text("limits.pcc");
        if (pcc is null && !_values.ContainsKey("limits.pcc"))
        {
            _findings.Note(
                Ids.NoPcc, new SourceLocation(File, 0, "pcc"), "no PCC is given, so no limit can be judged.",
                "name the bus at the point of common coupling: pcc = \"BUS\" under [limits].");
        }

        if (_findings.ErrorCount == errors && sweep is not null)
        {
            Settings = new StudySettings { Sweep = sweep, PccBus = pcc, Standards = standards, Rule = rule };
        }
    }

    private SweepRange? Sweep()
    {
        if (double.IsNaN(FrequencyHz))
        {
            return null;
        }

        double from = Default("sweep.from_hz", FrequencyHz, "the fundamental");
        double to = Default("sweep.to_hz", 50 * FrequencyHz, "order 50");
        double step = Default("sweep.step_hz", 1, "spacing of listed and plotted points");
        if (to <= from)
        {
            Error(Ids.KeyRange, _values.ContainsKey("sweep.to_hz") ? "sweep.to_hz" : "sweep.from_hz", $"to_hz is {to.Plain()} Hz; expected more than from_hz, {from.Plain()} Hz.", "give a range that rises.");
        }
        else if ((to - from) / step > 1_000_000)
        {
            Error(
                Ids.KeyRange, "sweep.step_hz",
                $"from_hz {from.Plain()} to to_hz {to.Plain()} in steps of {step.Plain()} Hz is more than 1000000 points; expected fewer.", "give a larger step_hz; resonances are found between the points all the same.");
        }

        return new SweepRange(from, to, step);
    }

    private SummationRule Rule()
    {
        string? text = Text("summation.rule");
        if (text is null)
        {
            _assumed.Add(new AssumedValue("case", "rule", "phasor", "default sum over sources: their angles are known"));
            return SummationRule.Phasor;
        }

        string[] words = ["phasor", "arithmetic", "rss", "iec"];
        int index = Array.IndexOf(words, text.ToLowerInvariant());
        if (index < 0)
        {
            Error(Ids.UnknownWord, "summation.rule", $"rule is '{text.Shown()}'; expected one of {string.Join(", ", words)}.", NearestName.Suggest(text, words, "write one of those words."));
            return SummationRule.Phasor;
        }

        return (SummationRule)index;
    }

    private string[] Standards()
    {
        if (!_values.TryGetValue("limits.standards", out var given))
        {
            _assumed.Add(new AssumedValue("case", "standards", Ieee519.Edition, "default limit set"));
            return [Ieee519.Token];
        }

        string[]? names = given.Value as string[] ?? (given.Value is string one ? [one] : null);
        if (names is null)
        {
            Error(Ids.KeyType, "limits.standards", "standards is not a list of texts; expected the names of limit sets.", $"write standards = [\"{Ieee519.Edition}\"].");
            return [];
        }

        var tokens = new List<string>();
        foreach (string name in names)
        {
            string bare = new([.. name.ToLowerInvariant().Where(char.IsLetterOrDigit)]);
            if (bare is "ieee5192022" or "ieeestd5192022")
            {
                tokens.Add(Ieee519.Token);
            }
            else if (bare is "ieee519" or "ieeestd519")
            {
                tokens.Add(Ieee519.Token);
                _assumed.Add(new AssumedValue("case", "standards", Ieee519.Edition, "no edition was given"));
            }
            else
            {
                Error(Ids.UnknownStandard, "limits.standards", $"limit set '{name.Shown()}' is not known; expected {Ieee519.Edition}.", $"write standards = [\"{Ieee519.Edition}\"], or [] to judge nothing.");
            }
        }

        return [.. tokens.Distinct()];
    }

    private double Default(string key, double otherwise, string why)
    {
        if (Number(key, "Hz") is { } given)
        {
            return given;
        }

        _assumed.Add(new AssumedValue("case", Bare(key), otherwise.Plain() + " Hz", why));
        return otherwise;
    }

    private double? Number(string key, string unit)
    {
        if (!_values.TryGetValue(key, out var value))
        {
            return null;
        }

        if (value.Value is not double number)
        {
            Error(
                Ids.KeyType, key, $"{Bare(key)} is {(value.Value is string ? "a text" : "not a number")}; expected a number above 0 in {unit}.", "write digits without quotes.");
            return null;
        }

        if (!(number > 0) || !NumberSize.Fits(number))
        {
            string size = number > 0 ? $" ({NumberSize.Words})" : "";
            Error(Ids.KeyRange, key, $"{Bare(key)} is {number.Plain()}; expected a number above 0 in {unit}{size}.", "correct the value.");
            return null;
        }

        return number;
    }

    private string? Text(string key)
    {
        if (!_values.TryGetValue(key, out var value))
        {
            return null;
        }

        if (value.Value is string text && text.Trim().Length > 0)
        {
            return text;
        }

        string found = value.Value is string ? "is blank" : "is not a text";
        Error(Ids.KeyType, key, $"{Bare(key)} {found}; expected a text in quotes.", $"write {Bare(key)} = \"...\"{(key == "limits.pcc" ? ", or remove the line" : "")}.");
        return null;
    }

    private void Missing(string key, string expected) => _findings.Error(
        Ids.MissingKey, new SourceLocation(File, 0, key), $"{key} is missing; expected {expected}.", $"add {key} = ... at the top of {File}.");

    private void Error(string id, string key, string message, string remedy) => _findings.Error(
        id, new SourceLocation(File, _values.TryGetValue(key, out var v) ? v.Line : 0, Bare(key)), message, remedy);

    private static string Bare(string key) => key[(key.IndexOf('.') + 1)..];
}
