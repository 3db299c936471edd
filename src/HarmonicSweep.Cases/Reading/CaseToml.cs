using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Studies.Standards;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace HarmonicSweep.Cases.Reading;

/// <summary>case.toml: what is not a table. Read from the syntax tree, so that every complaint has its line and key.</summary>
internal sealed class CaseToml
{
    private const string File = "case.toml";

    private static readonly Dictionary<string, string[]> _keys = new(StringComparer.Ordinal)
    {
        [""] = ["title", "frequency_hz", "base_mva"],
        ["sweep"] = ["from_hz", "to_hz", "step_hz"],
        ["limits"] = ["standards", "pcc"],
        ["summation"] = ["rule"],
    };

    private readonly FindingList _findings;
    private readonly List<AssumedValue> _assumed;
    private readonly Dictionary<string, (object Value, int Line)> _values = new(StringComparer.Ordinal);

    private CaseToml(FindingList findings, List<AssumedValue> assumed)
    {
        _findings = findings;
        _assumed = assumed;
    }

    /// <summary>Stands for a file that could not be read.</summary>
    public static CaseToml Nothing => new(new FindingList(), []);

    /// <summary>Title of the case.</summary>
    public string Title { get; private set; } = "";

    /// <summary>Fundamental frequency, hertz.</summary>
    public double FrequencyHz { get; private set; } = double.NaN;

    /// <summary>Settings of the studies; null after an error in them.</summary>
    public StudySettings? Settings { get; private set; }

    /// <summary>Bus of the PCC; null when it was not named.</summary>
    public string? PccBus { get; private set; }

    /// <summary>Where the PCC was named; null when it was not.</summary>
    public SourceLocation? PccLocation => _values.TryGetValue("limits.pcc", out var pcc) ? new SourceLocation(File, pcc.Line, "pcc") : null;

    /// <summary>Reads the text of case.toml.</summary>
    public static CaseToml Read(string text, FindingList findings, List<AssumedValue> assumed)
    {
        var toml = new CaseToml(findings, assumed);
        text = text.Replace("\r\n", "\n", StringComparison.Ordinal).Replace('\r', '\n');

        // without the library's own check of repeated keys: Collect makes it, with both lines
        DocumentSyntax document = SyntaxParser.Parse(text, File, false);
        if (document.HasErrors)
        {
            string[] lines = text.Split('\n');
            foreach (int line in FaultyLines(lines, document))
            {
                (string message, string remedy) = TomlSlip.Explain(lines[line]);
                findings.Error(Ids.TomlSyntax, new SourceLocation(File, line + 1), message, remedy);
            }

            return toml;
        }

        toml.Collect("", document.KeyValues);
        foreach (TableSyntaxBase table in document.Tables)
        {
            string name = Join(table.Name);
            int line = table.Span.Start.Line + 1;
            if (name.Length == 0 || !_keys.ContainsKey(name))
            {
                findings.Error(
                    Ids.UnknownKey, new SourceLocation(File, line, name.Shown()), $"unknown table [{name.Shown()}]; known are [sweep], [limits] and [summation].",
                    NearestName.Suggest(name, ["sweep", "limits", "summation"], "remove it."));
                continue;
            }

            if (table is TableArraySyntax)
            {
                findings.Error(Ids.UnknownKey, new SourceLocation(File, line, name), $"[[{name}]] stands in double brackets; expected [{name}].", "write one pair of brackets.");
            }

            toml.Collect(name, table.Items);
        }

        toml.Interpret();
        return toml;
    }

    /// <summary>
    /// Lines to blame. One slip makes the parser stumble over sound lines after it, and one that leaves a bracket open is noticed
    /// in the next line only; so a line is blamed when it is wrong on its own.
    /// </summary>
    private static List<int> FaultyLines(string[] lines, DocumentSyntax document)
    {
        List<int> noticed = [.. document.Diagnostics.Select(d => Math.Min(d.Span.Start.Line, lines.Length - 1)).Distinct().Order()];
        List<int> candidates = [.. Enumerable.Range(0, noticed[0]).Where(l => lines[l].Trim().Length > 0).TakeLast(1), .. noticed];
        List<int> faulty = [.. candidates.Where(l => SyntaxParser.Parse(lines[l], File, false).HasErrors)];
        return faulty.Count > 0 ? faulty : [noticed[0]];
    }

    private static string Join(KeySyntax? key) => key?.ToString().Trim().Trim('"') ?? "";

    private void Collect(string table, SyntaxList<KeyValueSyntax> pairs)
    {
        foreach (KeyValueSyntax pair in pairs)
        {
            string key = Join(pair.Key);
            int line = pair.Span.Start.Line + 1;
            string full = table.Length == 0 ? key : $"{table}.{key}";
            string owner = full.Contains('.') ? full[..full.IndexOf('.')] : "";
            string name = full.Contains('.') ? full[(full.IndexOf('.') + 1)..] : full;
            if (!_keys.TryGetValue(owner, out string[]? known) || !known.Contains(name))
            {
                string[] candidates = known ?? [.. _keys.SelectMany(k => k.Value)];
                string remedy = _keys.ContainsKey(name) ? $"write [{name}] on a line of its own, and its keys under it." : NearestName.Of(name, candidates) is null ? Elsewhere(name) : NearestName.Suggest(name, candidates, "remove it.");
                _findings.Error(
                    Ids.UnknownKey, new SourceLocation(File, line, key.Shown()), $"unknown key '{key.Shown()}'{(owner.Length > 0 && table.Length > 0 ? $" in [{owner}]" : "")}; known are {string.Join(", ", candidates)}.",
                    remedy);
                continue;
            }

            if (_values.TryGetValue(full, out var earlier))
            {
                _findings.Error(Ids.RepeatedKey, new SourceLocation(File, line, name), FormattableString.Invariant($"{name} is already given in line {earlier.Line}; expected it once."), "keep one of them.");
                continue;
            }

            // a value of a kind that no key takes is kept as it is: who asks for it says what it expects
            _values[full] = (ValueOf(pair.Value) ?? new object(), line);
        }
    }

    private static string Elsewhere(string name)
    {
        string? meant = NearestName.Of(name, _keys.SelectMany(k => k.Value));
        string home = _keys.FirstOrDefault(k => k.Value.Contains(meant)).Key ?? "";
        string place = home.Length == 0 ? "to the top of the file, before the first [table]" : $"under [{home}]";
        return meant is null ? "remove it." : meant == name ? $"move it {place}." : $"write {meant}, if that is meant, and move it {place}.";
    }

    private static object? ValueOf(ValueSyntax? value) => value switch
    {
        StringValueSyntax text => text.Value ?? "",
        IntegerValueSyntax whole => (double)whole.Value,
        FloatValueSyntax real => real.Value,
        BooleanValueSyntax yes => yes.Value,
        ArraySyntax array => array.Items.Select(i => ValueOf(i.Value)).ToArray() is var items && Array.TrueForAll(items, i => i is string)
            ? items.Cast<string>().ToArray()
            : null,
        _ => null,
    };

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
                    Ids.Frequency, new SourceLocation(File, _values["frequency_hz"].Line, "frequency_hz"), $"a fundamental of {Schema.PlainNumber.Plain(frequency)} Hz is outside the usual 10 to 1000.",
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
            Error(Ids.KeyRange, _values.ContainsKey("sweep.to_hz") ? "sweep.to_hz" : "sweep.from_hz", $"to_hz is {Schema.PlainNumber.Plain(to)} Hz; expected more than from_hz, {Schema.PlainNumber.Plain(from)} Hz.", "give a range that rises.");
        }
        else if ((to - from) / step > 1_000_000)
        {
            Error(
                Ids.KeyRange, "sweep.step_hz",
                $"from_hz {Schema.PlainNumber.Plain(from)} to to_hz {Schema.PlainNumber.Plain(to)} in steps of {Schema.PlainNumber.Plain(step)} Hz is more than 1000000 points; expected fewer.", "give a larger step_hz; resonances are found between the points all the same.");
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

        _assumed.Add(new AssumedValue("case", Bare(key), Schema.PlainNumber.Plain(otherwise) + " Hz", why));
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
            Error(Ids.KeyRange, key, $"{Bare(key)} is {Schema.PlainNumber.Plain(number)}; expected a number above 0 in {unit}{size}.", "correct the value.");
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
