namespace HarmonicSweep.Cli;

/// <summary>One column of a text table.</summary>
/// <typeparam name="T">A row.</typeparam>
/// <param name="Head">Head with its unit.</param>
/// <param name="Cell">Text of a row.</param>
/// <param name="Left">Words stand left, numbers right.</param>
internal sealed record TextColumn<T>(string Head, Func<T, string> Cell, bool Left = false);

/// <summary>Aligned tables under a title.</summary>
internal static class TextTable
{
    private const string Gap = "  ";
    private const int PageWidth = 110;

    /// <summary>Writes a titled table; rows beyond the limit are counted, not shown. Nothing when there is no row.</summary>
    public static void Write<T>(
        TextWriter writer, string title, IReadOnlyList<T> rows, int limit, params IReadOnlyList<TextColumn<T>> columns)
    {
        if (rows.Count == 0)
        {
            return;
        }

        Title(writer, title);
        T[] shown = [.. rows.Take(limit)];
        string[][] cells = [.. columns.Select(c => (string[])[c.Head, .. shown.Select(c.Cell)])];
        WriteLines(writer, cells, [.. columns.Select(c => c.Left)]);
        if (rows.Count > shown.Length)
        {
            writer.WriteLine($"... {Format.Count(rows.Count - shown.Length, "more row")} in the CSV tables (--out, --format csv).");
        }
    }

    /// <summary>Writes a matrix: one key column, then as many columns as fit the page, continued below.</summary>
    public static void WriteMatrix<T>(
        TextWriter writer, string title, IReadOnlyList<T> rows, TextColumn<T> key, IReadOnlyList<TextColumn<T>> columns)
    {
        if (rows.Count == 0 || columns.Count == 0)
        {
            return;
        }

        Title(writer, title);
        string[] keys = [key.Head, .. rows.Select(key.Cell)];
        int start = 0;
        while (start < columns.Count)
        {
            var block = new List<string[]> { keys };
            int width = keys.Max(k => k.Length);
            for (; start < columns.Count; start++)
            {
                string[] cells = [columns[start].Head, .. rows.Select(columns[start].Cell)];
                width += Gap.Length + cells.Max(c => c.Length);
                if (width > PageWidth && block.Count > 1)
                {
                    break;
                }

                block.Add(cells);
            }

            WriteLines(writer, [.. block], [key.Left, .. block.Skip(1).Select(_ => false)]);
            if (start < columns.Count)
            {
                writer.WriteLine();
            }
        }
    }

    /// <summary>A blank line, then the title in capitals.</summary>
    public static void Title(TextWriter writer, string title)
    {
        writer.WriteLine();
        writer.WriteLine(title);
    }

    private static void WriteLines(TextWriter writer, string[][] columns, bool[] left)
    {
        int[] widths = [.. columns.Select(c => c.Max(cell => cell.Length))];
        for (int row = 0; row < columns[0].Length; row++)
        {
            IEnumerable<string> cells = columns.Select(
                (c, i) => left[i] ? c[row].PadRight(widths[i]) : c[row].PadLeft(widths[i]));
            writer.WriteLine("  " + string.Join(Gap, cells).TrimEnd());
        }
    }
}
