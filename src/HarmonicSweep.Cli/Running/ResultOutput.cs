using HarmonicSweep.Cases;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using static System.FormattableString;

namespace HarmonicSweep.Cli;

/// <summary>Hands a result over: to stdout in the format asked for, or to a folder with a summary on stdout.</summary>
internal sealed class ResultOutput(CaseFile caseFile, StudyRequest request, StudyResult result, string command)
{
    /// <summary>Prints the result.</summary>
    public void Print(TextWriter writer, OutputFormat format)
    {
        switch (format)
        {
            case OutputFormat.Json:
                using (var stream = new TextWriterStream(writer))
                {
                    ResultJson.Write(stream, caseFile, result, HsweepCommand.Version);
                }

                writer.Write('\n');
                break;
            case OutputFormat.Csv:
                PrintCsv(writer);
                break;
            default:
                TextReport.Write(writer, View());
                break;
        }
    }

    /// <summary>Writes every file of the result, then its summary and the number of files to stdout.</summary>
    /// <returns>What a reader of the plots must know.</returns>
    public IReadOnlyList<Finding> Store(ResultFolder target, string folder, TextWriter writer, DrawPlots drawPlots, CancellationToken cancellation)
    {
        // the tables and the document are written while the plots are drawn
        Task<IReadOnlyList<Finding>> plots = Task.Run(() => drawPlots(caseFile, request, result, target.StagingFolder, cancellation), CancellationToken.None);
        IReadOnlyList<string> files;
        try
        {
            target.WriteTables(caseFile, result);
            target.WriteText("summary.txt", text => TextReport.Write(text, View()));
            files = target.Commit(caseFile, result, HsweepCommand.Version, () =>
            {
                plots.GetAwaiter().GetResult();
                cancellation.ThrowIfCancellationRequested();
            });
        }
        finally
        {
            // the folder is cleared by whoever opened it: nobody may still be writing there
            Task.WaitAny([plots], CancellationToken.None);
        }

        Headline.Write(writer, View());
        writer.WriteLine();
        IEnumerable<string> kinds = files.GroupBy(f => Path.GetExtension(f).TrimStart('.'), StringComparer.Ordinal)
            .OrderBy(g => g.Key, StringComparer.Ordinal)
            .Select(g => Invariant($"{g.Count()} {g.Key}"));
        writer.WriteLine(Invariant($"Wrote {files.Count} files to {folder} ({string.Join(", ", kinds)}); start with summary.txt."));
        return plots.GetAwaiter().GetResult();
    }

    private ReportView View() => new(caseFile, request, result, command);

    private void PrintCsv(TextWriter writer)
    {
        bool first = true;
        foreach (CsvTable table in ResultCsv.Tables(caseFile, result))
        {
            if (!first)
            {
                writer.Write('\n');
            }

            first = false;
            writer.Write($"# {table.Title}\n");
            table.Write(writer);
        }
    }
}
