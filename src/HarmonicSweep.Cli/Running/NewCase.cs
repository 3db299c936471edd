using HarmonicSweep.Network;

namespace HarmonicSweep.Cli;

/// <summary>The command <c>hsweep new</c>.</summary>
internal static class NewCase
{
    /// <summary>Writes the tables of a new case.</summary>
    public static int Run(string folder, Terminal terminal, Workshop workshop)
    {
        if (workshop.NewCase(folder) is { } refused)
        {
            Diagnostics.Write(terminal, [refused]);
            return refused.Severity == Severity.Error ? ExitCode.BadInput : ExitCode.Ok;
        }

        terminal.Out.WriteLine($"Wrote the tables of a new case to {folder}.");
        terminal.Out.WriteLine($"Next: fill them in, then run hsweep check {folder}");
        return ExitCode.Ok;
    }
}
