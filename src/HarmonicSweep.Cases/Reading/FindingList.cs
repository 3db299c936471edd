using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Collects everything that is wrong or doubtful, so that the user mends it in one go.</summary>
internal sealed class FindingList
{
    private readonly List<Finding> _findings = [];

    /// <summary>Whether anything stops the case.</summary>
    public bool HasErrors { get; private set; }

    /// <summary>How many errors so far: lets a reader see whether its own row is sound.</summary>
    public int ErrorCount { get; private set; }

    /// <summary>All findings, by file, line and then in the order they were found.</summary>
    public IReadOnlyList<Finding> Sorted() =>
    [
        .. _findings
            .OrderBy(f => f.Location?.File ?? "", StringComparer.Ordinal)
            .ThenBy(f => f.Location?.Line ?? 0),
    ];

    /// <summary>Adds an error.</summary>
    public void Error(string id, SourceLocation? location, string message, string remedy)
    {
        HasErrors = true;
        ErrorCount++;
        Add(Severity.Error, id, location, message, remedy);
    }

    /// <summary>Adds a warning.</summary>
    public void Warning(string id, SourceLocation? location, string message, string remedy) =>
        Add(Severity.Warning, id, location, message, remedy);

    /// <summary>Adds a note.</summary>
    public void Note(string id, SourceLocation? location, string message, string remedy) =>
        Add(Severity.Note, id, location, message, remedy);

    /// <summary>A finding is one line, whatever the cell it quotes holds.</summary>
    private void Add(Severity severity, string id, SourceLocation? location, string message, string remedy) => _findings.Add(
        new Finding(severity, id, location?.Column is { } column ? location.At(OneLine(column)) : location, OneLine(message), OneLine(remedy)));

    private static string OneLine(string text) => text.AsSpan().IndexOfAnyInRange('\0', '\x1F') < 0
        ? text
        : string.Create(text.Length, text, static (span, from) =>
        {
            for (int i = 0; i < span.Length; i++)
            {
                span[i] = char.IsControl(from[i]) ? ' ' : from[i];
            }
        });
}
