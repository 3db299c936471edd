using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Cases.Reading;

/// <summary>The header of a table, matched with its columns.</summary>
/// <param name="Columns">Column of each header cell; null where there is none.</param>
/// <param name="Sound">Whether nothing is wrong with it. Under a header that is wrong cells are checked, but nothing is built.</param>
internal sealed record HeaderRow(Column?[] Columns, bool Sound)
{
    private static readonly Column _source = new() { Name = Table.SourceColumn, Kind = CellKind.Text };

    /// <summary>Position of the column of that name; -1 when there is none.</summary>
    public int IndexOf(string name) => Array.FindIndex(Columns, c => c?.Name == name);

    /// <summary>Matches the header; null when it has no column of the table, so that it is no header at all.</summary>
    public static HeaderRow? Read(Table table, CsvFile csv, FindingList findings)
    {
        string[] names = [.. csv.Header!.Cells.Select(c => c.ToLowerInvariant())];
        var place = new SourceLocation(csv.File, csv.Header.Line);
        List<string> known = [.. table.Columns.Select(c => c.Name), Table.SourceColumn];
        if (!names.Any(known.Contains))
        {
            findings.Error(
                Ids.MissingColumn, place, $"no column of {csv.File} stands in its first line; expected a header with {string.Join(", ", known)}.",
                $"write the header line; required are {string.Join(", ", table.Columns.Where(c => c.Required).Select(c => c.Name))}.");
            return null;
        }

        int errors = findings.ErrorCount;
        var columns = new Column?[names.Length];
        var seen = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < names.Length; i++)
        {
            if (names[i].Length == 0)
            {
                Unnamed(csv, i, place, findings);
            }
            else if (!seen.Add(names[i]))
            {
                findings.Error(Ids.RepeatedColumn, place.At(names[i].Shown()), $"column {names[i].Shown()} stands twice in the header.", "keep one of them.");
            }
            else
            {
                columns[i] = names[i] == Table.SourceColumn ? _source : table.Find(names[i]);
                if (columns[i] is null)
                {
                    findings.Error(
                        Ids.UnknownColumn, place.At(names[i].Shown()), $"unknown column '{csv.Header.Cells[i].Shown()}'; known are {string.Join(", ", known)}.",
                        NearestName.Suggest(names[i], known, "remove the column (remarks may stand in a column named source or in # lines)."));
                }
            }
        }

        foreach (Column column in table.Columns.Where(c => c.Required && !seen.Contains(c.Name)))
        {
            findings.Error(
                Ids.MissingColumn, place.At(column.Name), $"column {column.Name} is missing; expected {column.Expected} in every row.",
                "add the column to the header and fill it in.");
        }

        return new HeaderRow(columns, findings.ErrorCount == errors);
    }

    private static void Unnamed(CsvFile csv, int index, SourceLocation place, FindingList findings)
    {
        if (csv.Records.Any(r => r.Cells.Length > index && r.Cells[index].Length > 0))
        {
            findings.Error(Ids.UnknownColumn, place, Invariant($"column {index + 1} has cells but no header."), "name the column, or clear it.");
        }
    }
}
