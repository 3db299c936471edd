using HarmonicSweep.Network;

namespace HarmonicSweep.Cli;

/// <summary>Findings on stderr: by file and line, one a line, then their number.</summary>
internal static class Diagnostics
{
    /// <summary>Writes the findings and their number; nothing when there are none.</summary>
    public static void Write(Terminal terminal, IReadOnlyList<Finding> findings)
    {
        if (findings.Count == 0)
        {
            return;
        }

        foreach (Finding finding in Sorted(findings))
        {
            terminal.Error.WriteLine(terminal.ErrorHasColour ? Coloured(finding) : finding.ToString());
        }

        terminal.Error.WriteLine(
            $"{Count(findings, Severity.Error, "error")}, {Count(findings, Severity.Warning, "warning")}");
    }

    /// <summary>By file and line; findings about no file come last.</summary>
    public static IReadOnlyList<Finding> Sorted(IReadOnlyList<Finding> findings) =>
    [
        .. findings.OrderBy(f => f.Location is null)
            .ThenBy(f => f.Location?.File, StringComparer.Ordinal)
            .ThenBy(f => f.Location?.Line),
    ];

    private static string Count(IReadOnlyList<Finding> findings, Severity severity, string word)
    {
        int count = findings.Count(f => f.Severity == severity);
        return string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{count} {word}{(count == 1 ? "" : "s")}");
    }

    /// <summary>Only the severity word carries colour: red, yellow, cyan.</summary>
    private static string Coloured(Finding finding)
    {
        (string word, int colour) = finding.Severity switch
        {
            Severity.Error => ("error", 31),
            Severity.Warning => ("warning", 33),
            _ => ("note", 36),
        };
        string text = finding.ToString();
        string marked = $"{word} {finding.Id}";
        int at = text.IndexOf(marked, StringComparison.Ordinal);
        string start = string.Create(System.Globalization.CultureInfo.InvariantCulture, $"\u001b[{colour}m");
        return $"{text[..at]}{start}{word}\u001b[0m{text[(at + word.Length)..]}";
    }
}
