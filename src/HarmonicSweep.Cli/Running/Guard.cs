using HarmonicSweep.Network;

namespace HarmonicSweep.Cli;

/// <summary>Turns whatever ends a command into its exit code and one clear message; no stack trace leaves it.</summary>
internal static class Guard
{
    /// <summary>Runs a command and flushes stdout.</summary>
    public static async Task<int> Run(Terminal terminal, Func<Task<int>> command)
    {
        try
        {
            int code = await command();
            terminal.Out.Flush();
            return code;
        }
        catch (OperationCanceledException)
        {
            terminal.Error.WriteLine("Cancelled; nothing was written.");
            return ExitCode.Cancelled;
        }
        catch (CaseException refused)
        {
            Diagnostics.Write(terminal, refused.Findings);
            return ExitCode.BadInput;
        }
        catch (ComputationException failed)
        {
            Diagnostics.Write(terminal, [failed.Finding]);
            return ExitCode.ComputationFailed;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            Diagnostics.Write(terminal, [new Finding(
                Severity.Error, "HS906", null, $"a file cannot be read or written: {OneLine(e.Message)}",
                "free disk space, close programs that hold the file, or choose another folder with --out.")]);
            return ExitCode.BadInput;
        }
        catch (Exception e)
        {
            Diagnostics.Write(terminal, [new Finding(
                Severity.Error, "HS999", null, $"hsweep {HsweepCommand.Version} met a fault of its own: {e.GetType().Name}: {OneLine(e.Message)}",
                "report this line with the command line and the case folder.")]);
            return ExitCode.ComputationFailed;
        }
    }

    private static string OneLine(string text) => text.ReplaceLineEndings(" ");
}
