namespace HarmonicSweep.Cli;

/// <summary>Where a command writes: results to <paramref name="Out"/>, diagnostics and progress to <paramref name="Error"/>.</summary>
/// <param name="Out">Results only.</param>
/// <param name="Error">Findings, hints, progress.</param>
internal sealed record Terminal(TextWriter Out, TextWriter Error)
{
    /// <summary>A person watches <see cref="Error"/>: a progress bar makes sense.</summary>
    public bool ErrorIsInteractive { get; init; }

    /// <summary>Severity words on <see cref="Error"/> are coloured.</summary>
    public bool ErrorHasColour { get; init; }

    /// <summary>Clock of the progress bar.</summary>
    public TimeProvider Clock { get; init; } = TimeProvider.System;

    /// <summary>The streams of this process; NO_COLOR, a dumb terminal or a redirection turn colour off.</summary>
    public static Terminal OfProcess(TextWriter output, TextWriter error)
    {
        bool interactive = !Console.IsErrorRedirected && Environment.GetEnvironmentVariable("TERM") != "dumb";
        return new Terminal(output, error)
        {
            ErrorIsInteractive = interactive,
            ErrorHasColour = interactive && string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR")),
        };
    }
}
