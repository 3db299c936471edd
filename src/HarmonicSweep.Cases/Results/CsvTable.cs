using System.Globalization;
using CsvHelper;

namespace HarmonicSweep.Cases.Results;

/// <summary>One field of a CSV table: text, a number in its shortest round-trip form, or blank.</summary>
/// <param name="Text">What is written; null = blank.</param>
internal readonly record struct CsvField(string? Text)
{
    public static implicit operator CsvField(string? text) => new(text);

    public static implicit operator CsvField(int number) => new(number.ToString(CultureInfo.InvariantCulture));

    public static implicit operator CsvField(bool yes) => new(yes ? "yes" : "no");

    /// <summary>A number that is missing or not finite is left blank.</summary>
    public static implicit operator CsvField(double? number) => new(
        number is { } value && double.IsFinite(value) ? value.ToString("R", CultureInfo.InvariantCulture) : null);

    public static implicit operator CsvField(double number) => (double?)number;
}

/// <summary>A part of a result as a table that writes itself as CSV.</summary>
public abstract class CsvTable
{
    /// <summary>Decimal point, comma between fields, line feed at the end of each record.</summary>
    private static readonly CsvWriterOptions Options = new() { NewLine = "\n", Separator = ',' };

    private protected CsvTable(string name, string title)
    {
        Name = name;
        Title = title;
    }

    /// <summary>Name of its file, without extension.</summary>
    public string Name { get; }

    /// <summary>What it lists, for a person.</summary>
    public string Title { get; }

    /// <summary>Whether it has no row.</summary>
    public abstract bool IsEmpty { get; }

    /// <summary>Writes the header and every row.</summary>
    /// <exception cref="IOException">The writer cannot be written.</exception>
    public void Write(TextWriter writer)
    {
        using CsvWriter csv = CsvWriter.Create(writer, Options, leaveOpen: true);
        WriteRecords(csv);
    }

    private protected abstract void WriteRecords(CsvWriter csv);
}

/// <summary>One column: its head, which carries the unit, and its field for a row.</summary>
/// <typeparam name="T">A row.</typeparam>
/// <param name="Head">Name in lower_snake_case with its unit.</param>
/// <param name="Field">The field of a row.</param>
internal sealed record CsvColumn<T>(string Head, Func<T, CsvField> Field);

/// <summary>A table of rows of one kind.</summary>
/// <typeparam name="T">A row.</typeparam>
internal sealed class CsvTable<T>(string name, string title, IEnumerable<T> rows, params IReadOnlyList<CsvColumn<T>> columns)
    : CsvTable(name, title)
{
    public override bool IsEmpty => !rows.Any();

    private protected override void WriteRecords(CsvWriter csv)
    {
        foreach (CsvColumn<T> column in columns)
        {
            csv.WriteField(column.Head);
        }

        csv.EndRecord();
        foreach (T row in rows)
        {
            foreach (CsvColumn<T> column in columns)
            {
                csv.WriteField(column.Field(row).Text);
            }

            csv.EndRecord();
        }
    }
}
