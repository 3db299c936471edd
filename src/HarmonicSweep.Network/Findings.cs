namespace HarmonicSweep.Network;

/// <summary>Where a value was read: file name inside the case folder, line and column or key name.</summary>
/// <param name="File">File name inside the case folder, for example <c>cables.csv</c>.</param>
/// <param name="Line">Physical line, counted from 1; 0 when the finding is about the whole file.</param>
/// <param name="Column">Name of the column or key; null when the finding is about the whole row.</param>
public sealed record SourceLocation(string File, int Line, string? Column = null)
{
    /// <summary>The same place, naming another column or key.</summary>
    public SourceLocation At(string? column) => this with { Column = column };

    /// <summary><c>file(line,column)</c>, without the parts that are not known.</summary>
    public override string ToString() => (Line, Column) switch
    {
        (0, null) => File,
        (0, _) => $"{File}({Column})",
        (_, null) => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{File}({Line})"),
        _ => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{File}({Line},{Column})"),
    };
}

/// <summary>How much a <see cref="Finding"/> matters.</summary>
public enum Severity
{
    /// <summary>The case cannot be computed as it stands.</summary>
    Error,

    /// <summary>Computed, but the reader of the results must know.</summary>
    Warning,

    /// <summary>Worth knowing; nothing is wrong.</summary>
    Note,
}

/// <summary>One complaint or remark about the case: what, where, and how to mend it.</summary>
/// <param name="Severity">How much it matters.</param>
/// <param name="Id">Stable identifier, <c>HS</c> and three digits.</param>
/// <param name="Location">Where; null when no file is to blame.</param>
/// <param name="Message">What was found and what was expected, with unit and range.</param>
/// <param name="Remedy">How to mend it.</param>
public sealed record Finding(Severity Severity, string Id, SourceLocation? Location, string Message, string Remedy)
{
    /// <summary>One line: <c>file(line,column): error HS012: message. Fix: remedy.</c></summary>
    public override string ToString()
    {
        string place = Location is null ? "" : Location + ": ";
        string word = Severity switch { Severity.Error => "error", Severity.Warning => "warning", _ => "note" };
        return $"{place}{word} {Id}: {Message} Fix: {Remedy}";
    }
}

/// <summary>The case is wrong in a way that only shows when a state is built; carries every finding.</summary>
public sealed class CaseException : Exception
{
    /// <summary>Creates the exception from its findings (at least one).</summary>
    public CaseException(IReadOnlyList<Finding> findings)
        : base(string.Join(Environment.NewLine, findings)) => Findings = findings;

    /// <summary>What is wrong.</summary>
    public IReadOnlyList<Finding> Findings { get; }
}

/// <summary>The computation failed: divergence, a singular matrix or a residual beyond its bound.</summary>
public sealed class ComputationException : Exception
{
    /// <summary>Creates the exception from the finding that names bus, state and frequency.</summary>
    public ComputationException(Finding finding)
        : base(finding.ToString()) => Finding = finding;

    /// <summary>What failed, where.</summary>
    public Finding Finding { get; }
}
