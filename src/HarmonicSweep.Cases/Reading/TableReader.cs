using System.Globalization;
using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Checks every cell of a table against its schema and hands on the rows that are sound.</summary>
internal sealed class TableReader(FindingList findings, List<AssumedValue> assumed, List<SourceEntry> sources)
{
    /// <summary>Bus names, known once buses.csv is read; empty before.</summary>
    public HashSet<string> BusNames { get; } = new(StringComparer.Ordinal);

    /// <summary>Every name taken so far, with where.</summary>
    public Dictionary<string, SourceLocation> Names { get; } = new(StringComparer.Ordinal);

    /// <summary>Reads the rows of a table; a row with an error is left out, but its name is known.</summary>
    public List<Row> Read(Table table, CsvFile csv)
    {
        var rows = new List<Row>();
        if (csv.Header is null || ReadHeader(table, csv) is not { } columns)
        {
            return rows;
        }

        var marks = new DecimalMarks(csv.File, csv.DecimalCommas, findings);
        foreach (CsvRecord record in csv.WellFormed(findings))
        {
            int errors = findings.ErrorCount;
            Row row = ReadRow(table, csv, columns, record, marks);
            if (findings.ErrorCount == errors)
            {
                rows.Add(row);
            }
        }

        return rows;
    }

    /// <summary>Column of each header cell; null when the header itself is wrong beyond reading the rows.</summary>
    private Column?[]? ReadHeader(Table table, CsvFile csv)
    {
        string[] header = [.. csv.Header!.Cells.Select(c => c.ToLowerInvariant())];
        var place = new SourceLocation(csv.File, csv.Header.Line);
        var known = table.Columns.Select(c => c.Name).Append(Table.SourceColumn).ToList();
        int errors = findings.ErrorCount;
        var columns = new Column?[header.Length];
        var seen = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < header.Length; i++)
        {
            if (header[i].Length == 0)
            {
                if (csv.Records.Any(r => r.Cells.Length > i && r.Cells[i].Length > 0))
                {
                    findings.Error(Ids.UnknownColumn, place, $"column {(i + 1).ToString(CultureInfo.InvariantCulture)} has cells but no header.", "name the column, or clear it.");
                }

                continue;
            }

            if (!seen.Add(header[i]))
            {
                findings.Error(Ids.RepeatedColumn, place.At(header[i]), $"column {header[i]} stands twice in the header.", "keep one of them.");
            }

            columns[i] = header[i] == Table.SourceColumn ? new Column { Name = Table.SourceColumn, Kind = CellKind.Text } : table.Find(header[i]);
            if (columns[i] is null)
            {
                findings.Error(
                    Ids.UnknownColumn, place.At(header[i]), $"unknown column '{csv.Header.Cells[i]}'; known are {string.Join(", ", known)}.",
                    NearestName.Suggest(header[i], known, "remove the column (remarks may stand in a column named source or in # lines)."));
            }
        }

        foreach (Column column in table.Columns.Where(c => c.Required && !seen.Contains(c.Name)))
        {
            findings.Error(
                Ids.MissingColumn, place.At(column.Name), $"required column {column.Name} is missing; expected {column.Expected} in every row.",
                "add the column to the header and fill it in.");
        }

        return findings.ErrorCount > errors && Array.TrueForAll(columns, c => c is null) ? null : columns;
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

        var row = new Row(table, location, text, numbers, findings, assumed);
        string called = table.Columns[0].Kind == CellKind.Name && row.Name.Length > 0 ? row.Name : "the row";
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
                row.Error(Ids.BlankCell, column.Name, $"{called}: {column.Name} is blank; expected {column.Expected}.", "fill the cell in.");
            }

            return;
        }

        if (column.Later)
        {
            row.Error(
                Ids.LaterModel, column.Name, $"{called}: {column.Name} is '{cell}', but its model is not in this version.",
                "leave the cell blank; the results then hold without it.");
            return;
        }

        switch (column.Kind)
        {
            case CellKind.Name:
                CheckName(column, row, cell);
                break;
            case CellKind.Bus when !BusNames.Contains(cell):
                row.Error(
                    Ids.UnknownBus, column.Name, $"{called}: {column.Name} '{cell}' is no bus; expected {column.Expected}.",
                    NearestName.Suggest(cell, BusNames, "add the bus to buses.csv."));
                break;
            case CellKind.Number or CellKind.Whole:
                CheckNumber(column, row, called, cell, numbers, marks);
                break;
            case CellKind.YesNo when YesNo.Parse(cell) is null:
                row.Error(Ids.UnknownWord, column.Name, $"{called}: {column.Name} is '{cell}'; expected {column.Expected}.", "write yes or no.");
                break;
            case CellKind.Word when !column.Words.Contains(cell.ToLowerInvariant()):
                row.Error(
                    Ids.UnknownWord, column.Name, $"{called}: {column.Name} is '{cell}'; expected {column.Expected}.",
                    NearestName.Suggest(cell, column.Words, "write one of those words, or leave the cell blank for the default."));
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
    }

    private static void CheckNumber(
        Column column, Row row, string called, string cell, Dictionary<string, double> numbers, DecimalMarks marks)
    {
        if (marks.Parse(cell, row.Location.At(column.Name), out bool complained) is not { } value)
        {
            if (!complained)
            {
                row.Error(
                    Ids.NotANumber, column.Name, $"{called}: {column.Name} is '{cell}'; expected {column.Expected}.",
                    "write digits with a decimal point, without units or thousands separators.");
            }

            return;
        }

        bool low = column.Above ? value <= column.Least : value < column.Least;
        if (low || value > column.Most || (column.Kind == CellKind.Whole && value != Math.Floor(value)))
        {
            row.Error(
                Ids.OutOfRange, column.Name, $"{called}: {column.Name} is {cell}; expected {column.Expected}.", RangeRemedy(column, value));
            return;
        }

        numbers[column.Name] = value;
    }

    private static string RangeRemedy(Column column, double value) => (column.Most, column.Unit) switch
    {
        (1, "") when value is > 1 and <= 100 => $"write {(value / 100).Plain()} if {value.Plain()} percent is meant.",
        _ when value < 0 && column.Least >= 0 => "remove the minus sign, or check which column the value belongs to.",
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
