using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Checks every cell of a table against its schema and hands on the rows that are sound.</summary>
internal sealed class TableReader(FindingList findings, List<AssumedValue> assumed, List<SourceEntry> sources)
{
    private readonly Spellings _spellings = new();
    private readonly Dictionary<string, string> _suggestions = new(StringComparer.Ordinal);

    /// <summary>Bus names, known once buses.csv is read; empty before.</summary>
    public HashSet<string> BusNames { get; } = new(StringComparer.Ordinal);

    /// <summary>Every name taken so far, with where.</summary>
    public Dictionary<string, SourceLocation> Names { get; } = new(StringComparer.Ordinal);

    /// <summary>Files that could not be read in full: a name that is not found may stand there, so it is not complained of.</summary>
    public HashSet<string> Incomplete { get; } = new(StringComparer.Ordinal);

    /// <summary>File and first cell of rows that were left out for their errors.</summary>
    public HashSet<(string File, string Name)> LeftOut { get; } = [];

    /// <summary>Reads the rows of a table; a row with an error is left out, but its name is known.</summary>
    public List<Row> Read(Table table, CsvFile csv)
    {
        var rows = new List<Row>();
        HeaderRow? header = csv.Header is null ? null : HeaderRow.Read(table, csv, findings);
        int naming = header?.IndexOf(table.Columns[0].Name) ?? -1;
        if (csv.Incomplete || (csv.Header is not null && naming < 0))
        {
            Incomplete.Add(table.File);
        }

        if (header is null)
        {
            return rows;
        }

        var marks = new DecimalMarks(csv.File, csv.DecimalCommas, findings);
        foreach (CsvRecord record in csv.Records)
        {
            int errors = findings.ErrorCount;
            if (!csv.FitsHeader(record, findings))
            {
                string name = naming >= 0 && naming < record.Cells.Length ? record.Cells[naming] : "";
                LeftOut.Add((table.File, name));
                if (table.Columns[0].Kind == CellKind.Name && name.Length > 0)
                {
                    Names.TryAdd(name, new SourceLocation(csv.File, record.Line));
                }

                continue;
            }

            Row row = ReadRow(table, csv, header.Columns, record, marks);
            if (header.Sound && findings.ErrorCount == errors)
            {
                rows.Add(row);
            }
            else
            {
                LeftOut.Add((table.File, row.Name));
            }
        }

        return rows;
    }

    private Row ReadRow(Table table, CsvFile csv, Column?[] columns, CsvRecord record, DecimalMarks marks)
    {
        var location = new SourceLocation(csv.File, record.Line);
        var text = new Dictionary<string, string>(StringComparer.Ordinal);
        var numbers = new Dictionary<string, double>(StringComparer.Ordinal);
        for (int i = 0; i < columns.Length; i++)
        {
            if (columns[i] is { } column)
            {
                text[column.Name] = record.Cells[i];
            }
        }

        var row = new Row(table, location, text, numbers, findings, assumed) { DecimalCommas = csv.DecimalCommas };
        string called = table.Columns[0].Kind == CellKind.Name && row.Name.Length > 0 ? row.Name.Shown() + ": " : "";
        foreach (Column? column in columns)
        {
            if (column is not null)
            {
                CheckCell(column, row, called, numbers, marks);
            }
        }

        if (row.Has(Table.SourceColumn))
        {
            sources.Add(new SourceEntry(row.Name, row.Text(Table.SourceColumn), location));
        }

        return row;
    }

    private void CheckCell(Column column, Row row, string called, Dictionary<string, double> numbers, DecimalMarks marks)
    {
        string cell = row.Text(column.Name);
        if (cell.Length == 0)
        {
            if (column.Required)
            {
                row.Error(Ids.BlankCell, column.Name, $"{called}{column.Name} is blank; expected {column.Expected}.", "fill the cell in.");
            }

            return;
        }

        if (column.Later)
        {
            row.Error(
                Ids.LaterModel, column.Name, $"{called}{column.Name} is '{cell.Shown()}', but its model is not in this version; expected a blank cell.",
                "leave the cell blank; the results then hold without it.");
            return;
        }

        if (column.IsName && Label.Fault(cell) is { } fault)
        {
            row.Error(Ids.NameCharacters, column.Name, $"{column.Name} '{cell.Shown()}' {fault}; expected {Label.Expected}.", "type the name anew, the same in every table.");
            return;
        }

        switch (column.Kind)
        {
            case CellKind.Name:
                CheckName(column, row, cell);
                break;
            case CellKind.Bus when !BusNames.Contains(cell):
                UnknownBus(column, row, called, cell);
                break;
            case CellKind.Number or CellKind.Whole:
                CheckNumber(column, row, called, cell, numbers, marks);
                break;
            case CellKind.YesNo when YesNo.Parse(cell) is null:
                row.Error(Ids.UnknownWord, column.Name, $"{called}{column.Name} is '{cell.Shown()}'; expected {column.Expected}.", "write yes or no.");
                break;
            case CellKind.Word when !column.Words.Contains(cell.ToLowerInvariant()):
                row.Error(
                    Ids.UnknownWord, column.Name, $"{called}{column.Name} is '{cell.Shown()}'; expected {column.Expected}.",
                    NearestName.Suggest(cell, column.Words, column.Required ? "write one of those words." : "write one of those words, or leave the cell blank for the default."));
                break;
        }
    }

    private void CheckName(Column column, Row row, string cell)
    {
        if (!Names.TryAdd(cell, row.Location))
        {
            row.Error(
                Ids.RepeatedName, column.Name, $"the name '{cell}' is already taken at {Names[cell]}; expected a name that nothing else bears.",
                "rename one of the two; buses and elements share their names.");
        }
        else
        {
            _spellings.Add(cell, row, column.Name);
        }
    }

    private void UnknownBus(Column column, Row row, string called, string cell)
    {
        // without any bus, or with rows of buses.csv lost, that alone is the complaint
        if (BusNames.Count == 0 || Incomplete.Contains(Tables.Buses.File))
        {
            return;
        }

        if (!_suggestions.TryGetValue(cell, out string? remedy))
        {
            _suggestions[cell] = remedy = NearestName.Suggest(cell, BusNames, "add the bus to buses.csv.");
        }

        string found = Names.ContainsKey(cell) ? "is an element" : "is no bus";
        row.Error(Ids.UnknownBus, column.Name, $"{called}{column.Name} '{cell}' {found}; expected {column.Expected}.", remedy);
    }

    private static void CheckNumber(
        Column column, Row row, string called, string cell, Dictionary<string, double> numbers, DecimalMarks marks)
    {
        if (marks.Parse(cell, row.Location.At(column.Name), called, out bool complained) is not { } value)
        {
            if (!complained)
            {
                row.Error(
                    Ids.NotANumber, column.Name, $"{called}{column.Name} is '{cell.Shown()}'; expected {column.Expected}.",
                    "write digits with a decimal point, without units or thousands separators.");
            }

            return;
        }

        bool low = column.Above ? value <= column.Least : value < column.Least;
        bool fraction = column.Kind == CellKind.Whole && value != Math.Floor(value);
        bool size = !NumberSize.Fits(value) || NumberSize.Vanished(cell, value);
        if (low || value > column.Most || fraction || size)
        {
            string sized = size && !low && value <= column.Most ? $" ({NumberSize.Words} in size)" : "";
            row.Error(
                Ids.OutOfRange, column.Name, $"{called}{column.Name} is {cell.Shown()}; expected {column.Expected}{sized}.", RangeRemedy(column, value));
            return;
        }

        // adding 0 turns a minus zero into zero
        numbers[column.Name] = value + 0.0;
    }

    private static string RangeRemedy(Column column, double value) => (column.Most, column.Unit) switch
    {
        (1, "") when value is >= 5 and <= 100 => $"write {(value / 100).Plain()} if {value.Plain()} percent is meant.",
        _ when value < 0 && column.Least >= 0 => "remove the minus sign, or check which column the value belongs to.",
        (_, "") => "correct the value, or check which column it belongs to.",
        _ => "correct the value, or check its unit.",
    };
}

/// <summary>yes, no, true, false, 1 and 0.</summary>
internal static class YesNo
{
    /// <summary>The meaning, or null for any other word.</summary>
    public static bool? Parse(string cell) => cell.ToLowerInvariant() switch
    {
        "yes" or "true" or "1" => true,
        "no" or "false" or "0" => false,
        _ => null,
    };
}
