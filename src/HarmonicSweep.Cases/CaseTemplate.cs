using System.Text;
using HarmonicSweep.Cases.Reading;
using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases;

/// <summary>Writes the tables of a new case: headed, with what each column means in comment lines.</summary>
public static class CaseTemplate
{
    /// <summary>Writes case.toml and every table into a folder, which is made if need be.</summary>
    /// <returns>Null when written; a finding when the folder already holds a case or cannot be written. Then nothing is written.</returns>
    public static Finding? Write(string folder)
    {
        if (string.IsNullOrWhiteSpace(folder) || folder.Contains('\0'))
        {
            return new Finding(Severity.Error, Ids.FolderInUse, null, "the name of the folder is blank or has a zero character in it.", "give the path of a new or empty folder.");
        }

        var files = new Dictionary<string, string>(StringComparer.Ordinal) { ["case.toml"] = CaseToml(TitleOf(folder)) };
        foreach (Table table in Tables.All.Where(t => !t.Later))
        {
            files[table.File] = TableText(table);
        }

        if (files.Keys.FirstOrDefault(f => Path.Exists(Path.Combine(folder, f))) is { } taken)
        {
            return new Finding(
                Severity.Error, Ids.FolderInUse, null, $"'{folder}' already holds {taken}; nothing was written.", "give a new or empty folder.");
        }

        try
        {
            WholeFiles.Write(folder, files.ToDictionary(f => f.Key, f => Encoding.UTF8.GetBytes(f.Value)));
            return null;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            return new Finding(Severity.Error, Ids.FolderInUse, null, $"'{folder}' cannot be written: {exception.Message}", "give a folder that can be written.");
        }
    }

    /// <summary>Name of the folder, as far as it can stand in a title.</summary>
    private static string TitleOf(string folder)
    {
        string name = Path.GetFileName(Path.TrimEndingDirectorySeparator(Path.GetFullPath(folder)));
        string title = new([.. name.Where(c => !char.IsControl(c) && c is not ('"' or '\\'))]);
        return string.IsNullOrWhiteSpace(title) ? "New case" : title;
    }

    private static string CaseToml(string title) => $"""
        # What is not a table. The tables beside this file start with # lines that say what their columns mean.
        title = "{title}"
        frequency_hz = 50

        [sweep]
        # from_hz = 50        # default: the fundamental
        # to_hz = 2500        # default: order 50
        # step_hz = 1         # spacing of listed and plotted points; resonances never depend on it

        [limits]
        standards = ["IEEE 519-2022"]
        # pcc = "BUS"         # bus at the point of common coupling; without it no limit is judged

        [summation]
        rule = "phasor"       # phasor, arithmetic, rss or iec

        """.ReplaceLineEndings("\n");

    private static string TableText(Table table)
    {
        var text = new StringBuilder();
        text.Append("# A row is ").Append(table.Row).Append(". Blank cells take the documented default; * marks required columns.\n");
        foreach (Column column in table.Columns.Where(c => !c.Later))
        {
            string mark = column.Required ? "*" : " ";
            string comment = column.Comment.Length > 0 && column.Comment != column.Expected ? "; " + column.Comment : "";
            text.Append("# ").Append(mark).Append(' ').Append(column.Name).Append(": ").Append(column.Expected).Append(comment).Append('\n');
        }

        string example = table.Example;
        text.Append("#   source: where the row's values come from (nameplate, drawing, measured, assumed); may be left out\n");
        text.Append("# for example: ").Append(example).Append(",nameplate\n");
        text.AppendJoin(',', table.Columns.Where(c => !c.Later).Select(c => c.Name)).Append(",source\n");
        return text.ToString();
    }
}
