using System.CommandLine;
using HarmonicSweep.Cases;
using HarmonicSweep.Cases.Results;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cli;

/// <summary>One run of a command on a case: read, ask, compute, hand over.</summary>
internal sealed class CaseRun(CaseCommand command, CommandOptions options, ParseResult parsed, Terminal terminal, Workshop workshop)
{
    private readonly string _folder = parsed.GetRequiredValue(options.Case);
    private readonly string? _out = parsed.GetValue(options.Out);
    private readonly OutputFormat _format = parsed.GetValue(options.Format) ?? OutputFormat.Table;

    /// <summary>Runs it.</summary>
    /// <returns>An <see cref="ExitCode"/>.</returns>
    public int Run(CancellationToken cancellation)
    {
        if (_out is not null)
        {
            workshop.WarmPlots();
        }

        (CaseFile? read, IReadOnlyList<Finding> findings) = workshop.ReadCase(_folder);
        if (read is null)
        {
            return Refuse(findings, ExitCode.BadInput);
        }

        var builder = new RequestBuilder(read, options, parsed, command.EveryStateByDefault);
        StudyRequest? request = builder.Build();
        if (_out is not null && OutputFolderRule.Refusal(_out, _folder) is { } refusal)
        {
            builder.Complaints.Add(refusal);
        }

        if (request is null || builder.Complaints.Count > 0)
        {
            return Refuse([.. findings, .. builder.Complaints], ExitCode.BadInput);
        }

        // opened before the computation: a folder that cannot be written must not cost the user a long run
        using ResultFolder? target = _out is null ? null : ResultFolder.Open(_out);
        StudyResult result;
        try
        {
            result = Compute(request, cancellation);
        }
        catch (CaseException refused)
        {
            return Refuse([.. findings, .. refused.Findings], ExitCode.BadInput);
        }
        catch (ComputationException failed)
        {
            return Refuse([.. findings, failed.Finding], ExitCode.ComputationFailed);
        }

        cancellation.ThrowIfCancellationRequested();
        Diagnostics.Write(terminal, [.. read.Findings, .. result.Findings]);
        var output = new ResultOutput(read with { Settings = request.Settings }, request, result, command.Name);
        if (target is null)
        {
            output.Print(terminal.Out, _format);
        }
        else
        {
            Diagnostics.Write(terminal, output.Store(target, _out!, terminal.Out, workshop.DrawPlots, cancellation));
        }

        return result.LimitExceeded ? ExitCode.LimitExceeded : ExitCode.Ok;
    }

    private StudyResult Compute(StudyRequest request, CancellationToken cancellation)
    {
        using ProgressBar? bar = terminal.ErrorIsInteractive ? new ProgressBar(terminal.Error, terminal.Clock, command.Name) : null;
        return command.Run(request, bar, cancellation);
    }

    private int Refuse(IReadOnlyList<Finding> findings, int exitCode)
    {
        Diagnostics.Write(terminal, findings);
        if (_format == OutputFormat.Json)
        {
            using var stream = new TextWriterStream(terminal.Out);
            ResultJson.WriteRefusal(stream, _folder, Diagnostics.Sorted(findings), HsweepCommand.Version);
            terminal.Out.Write('\n');
        }

        return exitCode;
    }
}
