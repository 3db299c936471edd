using CsvHelper;
using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Cases.Reading;

/// <summary>A record of a table: its physical line and its cells.</summary>
/// <param name="Line">Line, counted from 1.</param>
/// <param name="Cells">Cells, trimmed.</param>
internal sealed record CsvRecord(int Line, string[] Cells);

/// <summary>
/// A CSV table as text cells. The one place that knows the CSV library: the separator is set here from the header line
/// (the library would guess), comments and line numbers are switched on, malformed quotes are findings.
/// </summary>
internal sealed class CsvFile
{
    private CsvFile(string file, CsvRecord? header, IReadOnlyList<CsvRecord> records, bool decimalCommas)
    {
        File = file;
        Header = header;
        Records = records;
        DecimalCommas = decimalCommas;
    }

    /// <summary>File name.</summary>
    public string File { get; }

    /// <summary>Header; null in an empty file.</summary>
    public CsvRecord? Header { get; }

    /// <summary>Records under the header; blank rows left out.</summary>
    public IReadOnlyList<CsvRecord> Records { get; }

    /// <summary>Whether the separator leaves the comma free to be a decimal mark.</summary>
    public bool DecimalCommas { get; }

    /// <summary>Reads a table; malformed quoting is a finding and the record is left out.</summary>
    public static CsvFile Read(string file, string text, FindingList findings)
    {
        char separator = SeparatorOf(text);
        var options = new CsvReaderOptions
        {
            Separator = separator,
            HasHeader = false,
            CommentPrefix = '#',
            TrimWhitespace = true,
            TrimInsideQuotes = true,
            TrackLineNumbers = true,
            MalformedData = CsvMalformedDataHandling.Skip,
            OnMalformedRecord = record => findings.Error(
                Ids.Malformed, new SourceLocation(file, (int)record.LineNumber), "a quotation mark has no partner; expected quotes in pairs around a cell.",
                "close the quote, or double a quote that belongs to the text (\"\")."),
        };
        var records = new List<CsvRecord>();
        using (var reader = CsvReader.FromText(text, options))
        {
            while (reader.Read())
            {
                string[] cells = new string[reader.FieldCount];
                for (int i = 0; i < cells.Length; i++)
                {
                    cells[i] = reader.GetString(i);
                }

                if (!Array.TrueForAll(cells, string.IsNullOrWhiteSpace))
                {
                    records.Add(new CsvRecord((int)reader.LineNumber, cells));
                }
            }
        }

        return new CsvFile(file, records.FirstOrDefault(), [.. records.Skip(1)], separator != ',');
    }

    /// <summary>Records whose number of cells is that of the header; the others are findings. Blank cells beyond the header do no harm.</summary>
    public IEnumerable<CsvRecord> WellFormed(FindingList findings)
    {
        int columns = Header!.Cells.Length;
        foreach (CsvRecord record in Records)
        {
            if (record.Cells.Length < columns || record.Cells.Skip(columns).Any(c => c.Length > 0))
            {
                string hint = record.Cells.Length > columns && !DecimalCommas
                    ? "; write decimals with a point, and a text with a comma in it in double quotes"
                    : "";
                findings.Error(
                    Ids.CellCount, new SourceLocation(File, record.Line),
                    Invariant($"the row has {record.Cells.Length} cells; expected {columns}, as in the header."),
                    $"give every column its cell (blank between two separators){hint}.");
                continue;
            }

            yield return record;
        }
    }

    /// <summary>The separator of the first line that is neither blank nor a comment: whichever of ; tab and comma is most frequent.</summary>
    private static char SeparatorOf(string text)
    {
        foreach (ReadOnlySpan<char> line in text.AsSpan().EnumerateLines())
        {
            if (line.IsWhiteSpace() || line.TrimStart().StartsWith("#"))
            {
                continue;
            }

            int commas = line.Count(',');
            int semicolons = line.Count(';');
            int tabs = line.Count('\t');
            return semicolons > commas && semicolons >= tabs ? ';' : tabs > commas ? '\t' : ',';
        }

        return ',';
    }
}
