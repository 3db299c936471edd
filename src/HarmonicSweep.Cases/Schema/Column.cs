namespace HarmonicSweep.Cases.Schema;

/// <summary>What a cell holds.</summary>
internal enum CellKind
{
    /// <summary>Free text.</summary>
    Text,

    /// <summary>The unique name of the row.</summary>
    Name,

    /// <summary>Name of a bus.</summary>
    Bus,

    /// <summary>A number.</summary>
    Number,

    /// <summary>A whole number.</summary>
    Whole,

    /// <summary>yes, no, true, false, 1 or 0.</summary>
    YesNo,

    /// <summary>One of a list of words.</summary>
    Word,
}

/// <summary>A column of a table: what the reader checks, what its messages say, and what the template prints.</summary>
internal sealed record Column
{
    /// <summary>Header.</summary>
    public required string Name { get; init; }

    /// <summary>What its cells hold.</summary>
    public required CellKind Kind { get; init; }

    /// <summary>Whether a cell may not be blank.</summary>
    public bool Required { get; init; }

    /// <summary>Unit; empty for a plain number or text.</summary>
    public string Unit { get; init; } = "";

    /// <summary>Smallest value.</summary>
    public double Least { get; init; } = double.NegativeInfinity;

    /// <summary>Whether the smallest value itself is excluded.</summary>
    public bool Above { get; init; }

    /// <summary>Largest value, included.</summary>
    public double Most { get; init; } = double.PositiveInfinity;

    /// <summary>Legal words.</summary>
    public IReadOnlyList<string> Words { get; init; } = [];

    /// <summary>What the template says about it, one clause.</summary>
    public string Comment { get; init; } = "";

    /// <summary>Whether its model comes with a later version: a cell that is not blank is refused.</summary>
    public bool Later { get; init; }

    /// <summary>Whether its cells name something, so that they may hold visible characters only.</summary>
    public bool IsName => Kind is CellKind.Name or CellKind.Bus || (Kind == CellKind.Text && Required);

    /// <summary>What is expected, for messages: <c>a number above 0 in km</c>.</summary>
    public string Expected => Kind switch
    {
        CellKind.Number or CellKind.Whole => (Kind == CellKind.Whole ? "a whole number" : "a number") + Range + (Unit.Length > 0 ? $" in {Unit}" : ""),
        CellKind.YesNo => "yes, no, true, false, 1 or 0",
        CellKind.Word => "one of " + string.Join(", ", Words),
        CellKind.Bus => "the name of a bus of buses.csv",
        CellKind.Name => "a name that nothing else bears",
        _ => Required ? Comment : "a text",
    };

    private string Range => (double.IsFinite(Least), double.IsFinite(Most)) switch
    {
        (true, true) => Above ? $" above {Least.Plain()} up to {Most.Plain()}" : $" from {Least.Plain()} to {Most.Plain()}",
        (true, false) => Above ? $" above {Least.Plain()}" : $" of at least {Least.Plain()}",
        (false, true) => $" of at most {Most.Plain()}",
        _ => "",
    };

    /// <summary>The unique name of the row.</summary>
    public static Column Naming(string name = "name") => new() { Name = name, Kind = CellKind.Name, Required = true };

    /// <summary>A bus, required.</summary>
    public static Column AtBus(string name, string comment = "") => new() { Name = name, Kind = CellKind.Bus, Required = true, Comment = comment };

    /// <summary>A number above 0.</summary>
    public static Column Positive(string name, string unit, string comment = "", bool required = false) =>
        new() { Name = name, Kind = CellKind.Number, Unit = unit, Least = 0, Above = true, Comment = comment, Required = required };

    /// <summary>A number of at least 0.</summary>
    public static Column NotNegative(string name, string unit, string comment = "", bool required = false) =>
        new() { Name = name, Kind = CellKind.Number, Unit = unit, Least = 0, Comment = comment, Required = required };

    /// <summary>A number in a closed range.</summary>
    public static Column Between(string name, string unit, double least, double most, string comment = "", bool required = false, bool above = false) =>
        new() { Name = name, Kind = CellKind.Number, Unit = unit, Least = least, Most = most, Above = above, Comment = comment, Required = required };

    /// <summary>Any finite number.</summary>
    public static Column Any(string name, string unit, string comment = "", bool required = false) =>
        new() { Name = name, Kind = CellKind.Number, Unit = unit, Comment = comment, Required = required };

    /// <summary>A whole number of at least <paramref name="least"/>.</summary>
    public static Column Count(string name, int least, string comment = "") =>
        new() { Name = name, Kind = CellKind.Whole, Least = least, Most = 100_000, Comment = comment };

    /// <summary>One of a list of words.</summary>
    public static Column OneOf(string name, string comment, bool required, params string[] words) =>
        new() { Name = name, Kind = CellKind.Word, Words = words, Comment = comment, Required = required };

    /// <summary>Free text.</summary>
    public static Column Free(string name, string comment = "", bool required = false) =>
        new() { Name = name, Kind = CellKind.Text, Comment = comment, Required = required };

    /// <summary>A column whose model comes with a later version.</summary>
    public static Column Coming(string name) => new() { Name = name, Kind = CellKind.Text, Later = true };
}

/// <summary>A table of the case folder.</summary>
/// <param name="File">File name.</param>
/// <param name="Row">What a row is.</param>
/// <param name="Columns">Its columns; <c>source</c> may stand in any table.</param>
internal sealed record Table(string File, string Row, params Column[] Columns)
{
    /// <summary>Name of the column that any table may have.</summary>
    public const string SourceColumn = "source";

    /// <summary>An example row for the template.</summary>
    public string Example { get; init; } = "";

    /// <summary>Whether its model comes with a later version: a row is refused.</summary>
    public bool Later { get; init; }

    /// <summary>The column of that name, or null.</summary>
    public Column? Find(string name) => Array.Find(Columns, c => c.Name == name);
}

/// <summary>Numbers as a person writes them.</summary>
internal static class PlainNumber
{
    /// <summary>Shortest text that reads back as the same number, invariant culture.</summary>
    public static string Plain(this double value) => value.ToString(System.Globalization.CultureInfo.InvariantCulture);

    /// <summary>A computed number, rounded for reading.</summary>
    public static string Short(this double value) => value.ToString(
        Math.Abs(value) switch { >= 1000 => "0", >= 1 => "0.##", _ => "G4" }, System.Globalization.CultureInfo.InvariantCulture);
}
