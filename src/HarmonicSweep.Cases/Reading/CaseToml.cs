using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace HarmonicSweep.Cases.Reading;

/// <summary>case.toml: what is not a table. Read from the syntax tree, so that every complaint has its line and key.</summary>
internal sealed partial class CaseToml
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
}
