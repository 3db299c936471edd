using CsvHelper;
using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Cases.Reading;

/// <summary>A record of a table: its physical line and its cells.</summary>
/// <param name="Line">Line on which it begins, counted from 1.</param>
/// <param name="Cells">Cells, trimmed.</param>
internal sealed record CsvRecord(int Line, string[] Cells);

/// <summary>
/// A CSV table as text cells. The one place that knows the CSV library: the separator is set here from the header line
/// (the library would guess), comments and line numbers are switched on, malformed quotes are findings.
/// </summary>
internal sealed class CsvFile
{
    private CsvFile(string file, CsvRecord? header, IReadOnlyList<CsvRecord> records, bool decimalCommas, bool incomplete)
    {
        File = file;
        Header = header;
        Records = records;
        DecimalCommas = decimalCommas;
        Incomplete = incomplete;
    }

    /// <summary>File name.</summary>
    public string File { get; }

    /// <summary>Header; null in an empty file and where the header itself is malformed.</summary>
    public CsvRecord? Header { get; }

    /// <summary>Records under the header; blank rows left out.</summary>
    public IReadOnlyList<CsvRecord> Records { get; }

    /// <summary>Whether the separator leaves the comma free to be a decimal mark.</summary>
    public bool DecimalCommas { get; }

    /// <summary>Whether rows were lost to malformed quotes: what they hold is not known.</summary>
    public bool Incomplete { get; }

    /// <summary>Reads a table; malformed quoting is a finding and the record is left out.</summary>
    public static CsvFile Read(string file, string text, FindingList findings)
    {
        char separator = SeparatorOf(text);
        var malformed = new List<int>();
        var options = new CsvReaderOptions
        {
            Separator = separator,
            DetectSeparatorHint = false,
            HasHeader = false,
            CommentPrefix = '#',
            TrimWhitespace = true,
            TrimInsideQuotes = true,
            TrackLineNumbers = true,
            MalformedData = CsvMalformedDataHandling.Skip,
            OnMalformedRecord = record => malformed.Add((int)record.LineNumber),
        };
        var records = new List<CsvRecord>();
        using (var reader = CsvReader.FromText(text, options))
        {
            try
            {
                while (reader.Read())
                {
                    Take(reader, records);
                }
            }
            catch (Exception exception) when (exception is CsvFormatException or CsvValidationException)
            {
                malformed.Add((int)reader.LineNumber);
            }
        }

        int lines = 1 + text.AsSpan().TrimEnd().Count('\n');
        int lastRecord = records.Count > 0 ? records[^1].Line : 0;
        foreach (int line in malformed)
        {
            string lost = line > lastRecord && line == malformed[^1] && lines > line ? "; what follows it in the file was not read" : "";
            findings.Error(
                Ids.Malformed, new SourceLocation(file, line),
                $"a quotation mark stands inside a cell or has no partner{lost}; expected a pair of quotes around the whole cell.",
                "close the quote, or remove it; a quote that belongs to the text is doubled, with quotes around the cell: \"5\"\" pipe\".");
        }

        bool headerLost = malformed.Count > 0 && (records.Count == 0 || malformed[0] < records[0].Line);
        RowsTakenForComments(file, text, separator, findings);
        return headerLost
            ? new CsvFile(file, null, [], separator != ',', true)
            : new CsvFile(file, records.FirstOrDefault(), [.. records.Skip(1)], separator != ',', malformed.Count > 0);
    }

    /// <summary>Whether a record has the cells of the header; a finding when not. Blank cells beyond the header do no harm.</summary>
    public bool FitsHeader(CsvRecord record, FindingList findings)
    {
        int columns = Header!.Cells.Length;
        if (record.Cells.Length >= columns && record.Cells.AsSpan(columns).IndexOfAnyExcept("") < 0)
        {
            return true;
        }

        string hint = (record.Cells.Length > columns, DecimalCommas) switch
        {
            (false, _) => "",
            (_, true) => "; put a text that holds the separator in double quotes",
            _ => "; write decimals with a point, and a text with a comma in it in double quotes",
        };
        findings.Error(
            Ids.CellCount, new SourceLocation(File, record.Line),
            Invariant($"the row has {record.Cells.Length} cells; expected {columns}, as in the header."),
            $"give every column its cell (blank between two separators){hint}.");
        return false;
    }

    private static void Take(CsvReader reader, List<CsvRecord> records)
    {
        string[] cells = new string[reader.FieldCount];
        for (int i = 0; i < cells.Length; i++)
        {
            // the library trims blanks and tabs, not the blanks that spreadsheets of some languages write
            cells[i] = reader.GetString(i).Trim();
        }

        // a spreadsheet puts quotes round a comment line that has the separator in it
        bool comment = cells.Length > 0 && cells[0].StartsWith("# ", StringComparison.Ordinal);
        if (!comment && cells.AsSpan().IndexOfAnyExcept("") >= 0)
        {
            records.Add(new CsvRecord((int)reader.LineNumber, cells));
        }
    }

    /// <summary>A row of a thing called "#1 ..." would pass as a comment: doubted, so that it is not lost in silence.</summary>
    private static void RowsTakenForComments(string file, string text, char separator, FindingList findings)
    {
        int line = 0;
        int separators = -1;
        foreach (ReadOnlySpan<char> content in text.AsSpan().EnumerateLines())
        {
            line++;
            if (separators < 0)
            {
                separators = content.IsWhiteSpace() || content.StartsWith("#") ? -1 : content.Count(separator);
            }
            else if (content.Length > 1 && content[0] == '#' && char.IsAsciiDigit(content[1]) && separators > 0 && content.Count(separator) == separators)
            {
                findings.Warning(
                    Ids.RowOrComment, new SourceLocation(file, line), "the line begins with #, so it is a comment, but it has the cells of a row.",
                    "put the name in double quotes if it is a row; write a blank after the # if it is a comment.");
            }
        }
    }

    /// <summary>The separator of the first line that is neither blank nor a comment: whichever of ; tab and comma is most frequent.</summary>
    private static char SeparatorOf(string text)
    {
        foreach (ReadOnlySpan<char> line in text.AsSpan().EnumerateLines())
        {
            if (line.IsWhiteSpace() || line.TrimStart(" \t\"").StartsWith("#"))
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
