using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases;

/// <summary>A case folder, read and validated.</summary>
public sealed record CaseFile
{
    /// <summary>What is installed.</summary>
    public required Plant Plant { get; init; }

    /// <summary>States in the order of their table, <c>base</c> first.</summary>
    public required IReadOnlyList<OperatingState> States { get; init; }

    /// <summary>Sweep, limits and summation.</summary>
    public required StudySettings Settings { get; init; }

    /// <summary>Every default that was used.</summary>
    public required IReadOnlyList<AssumedValue> Assumed { get; init; }

    /// <summary>Every entry of a source column.</summary>
    public required IReadOnlyList<SourceEntry> Sources { get; init; }

    /// <summary>Warnings and notes of reading (a case with errors is not returned).</summary>
    public required IReadOnlyList<Finding> Findings { get; init; }

    /// <summary>Folder as given.</summary>
    public required string Folder { get; init; }

    /// <summary>SHA-256 over the names and bytes of the files read, lower-case hexadecimal.</summary>
    public required string Hash { get; init; }
}

/// <summary>A default that was used because a cell was blank.</summary>
/// <param name="Element">Element, bus or <c>case</c>.</param>
/// <param name="Column">Column or key.</param>
/// <param name="Value">Value used, with unit.</param>
/// <param name="Why">Where the default comes from.</param>
public sealed record AssumedValue(string Element, string Column, string Value, string Why);

/// <summary>An entry of a source column.</summary>
/// <param name="Element">Element or bus of the row.</param>
/// <param name="Source">What the source column says.</param>
/// <param name="Location">Row.</param>
public sealed record SourceEntry(string Element, string Source, SourceLocation Location);
