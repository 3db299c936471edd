using System.Globalization;
using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>A row whose cells were checked against its table: typed access for whoever builds the element.</summary>
internal sealed class Row
{
    private readonly Table _table;
    private readonly Dictionary<string, string> _text;
    private readonly Dictionary<string, double> _numbers;
    private readonly List<AssumedValue> _assumed;

    public Row(
        Table table, SourceLocation location, Dictionary<string, string> text, Dictionary<string, double> numbers,
        FindingList findings, List<AssumedValue> assumed)
    {
        _table = table;
        Location = location;
        _text = text;
        _numbers = numbers;
        Findings = findings;
        _assumed = assumed;
    }

    /// <summary>File and line.</summary>
    public SourceLocation Location { get; }

    /// <summary>Whether a comma in its numbers is a decimal mark.</summary>
    public bool DecimalCommas { get; init; }

    /// <summary>Where complaints go.</summary>
    public FindingList Findings { get; }

    /// <summary>Name of the row: its first column.</summary>
    public string Name => Text(_table.Columns[0].Name);

    /// <summary>Buses the row names.</summary>
    public IEnumerable<string> BusNames => _table.Columns.Where(c => c.Kind == CellKind.Bus).Select(c => Text(c.Name));

    /// <summary>Text of a cell; empty when blank or absent.</summary>
    public string Text(string column) => _text.GetValueOrDefault(column, "");

    /// <summary>Whether the cell has something in it.</summary>
    public bool Has(string column) => Text(column).Length > 0;

    /// <summary>Whether its table may have such a column.</summary>
    public bool HasColumn(string column) => _table.Find(column) is not null;

    /// <summary>Number of a cell that is required.</summary>
    public double Number(string column) => _numbers[column];

    /// <summary>Number of a cell, null when blank.</summary>
    public double? Find(string column) => _numbers.TryGetValue(column, out double value) ? value : null;

    /// <summary>Number of a cell, or the default, which is then listed as assumed.</summary>
    public double Number(string column, double otherwise, string why)
    {
        if (Find(column) is { } given)
        {
            return given;
        }

        Assume(column, otherwise.ToString(CultureInfo.InvariantCulture), why);
        return otherwise;
    }

    /// <summary>Word of a cell, or the default, which is then listed as assumed.</summary>
    public string Word(string column, string otherwise, string why)
    {
        if (Has(column))
        {
            return Text(column).ToLowerInvariant();
        }

        Assume(column, otherwise, why);
        return otherwise;
    }

    /// <summary>Lists a default as assumed, with the unit of its column.</summary>
    public void Assume(string column, string value, string why)
    {
        string unit = _table.Find(column)?.Unit ?? "";
        _assumed.Add(new AssumedValue(Name, column, unit.Length > 0 ? $"{value} {unit}" : value, why));
    }

    /// <summary>Adds an error at a column of this row.</summary>
    public void Error(string id, string column, string message, string remedy) =>
        Findings.Error(id, Location.At(column), message, remedy);

    /// <summary>Adds a warning at a column of this row.</summary>
    public void Warning(string id, string column, string message, string remedy) =>
        Findings.Warning(id, Location.At(column), message, remedy);

    /// <summary>Adds a note at a column of this row.</summary>
    public void Note(string id, string column, string message, string remedy) =>
        Findings.Note(id, Location.At(column), message, remedy);

    /// <summary>Whether exactly one of two columns is filled; a finding when not.</summary>
    public bool ExactlyOne(string first, string second)
    {
        if (Has(first) == Has(second))
        {
            string found = Has(first) ? "both are given" : "neither is given";
            Error(Ids.ExactlyOne, first, $"{Name}: expected exactly one of {first} and {second}; {found}.", Has(first) ? "leave one of them blank." : "fill one of them in.");
            return false;
        }

        return true;
    }
}
