using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace HarmonicSweep.Cli;

/// <summary>The command <c>hsweep</c>: a thin shell over the readers, the studies and the writers.</summary>
public static class HsweepCommand
{
    /// <summary>Version of the program.</summary>
    public static string Version { get; } = typeof(HsweepCommand).Assembly.GetName().Version!.ToString(3);

    /// <summary>Runs one command line, writing to the given writers without colour or progress bar.</summary>
    /// <param name="args">The words after <c>hsweep</c>.</param>
    /// <param name="output">Receives results only.</param>
    /// <param name="error">Receives findings and hints.</param>
    /// <param name="cancellation">Cancels the run: exit code 130.</param>
    /// <returns>An <see cref="ExitCode"/>.</returns>
    public static Task<int> InvokeAsync(
        IReadOnlyList<string> args, TextWriter output, TextWriter error, CancellationToken cancellation = default) =>
        InvokeAsync(args, new Terminal(output, error), Workshop.Real, cancellation);

    /// <summary>Runs one command line.</summary>
    internal static Task<int> InvokeAsync(
        IReadOnlyList<string> args, Terminal terminal, Workshop workshop, CancellationToken cancellation) => Guard.Run(terminal, async () =>
    {
        ParseResult parsed = Build(terminal, workshop).Parse(args);
        return parsed.Action is ParseErrorAction
            ? CommandLineErrors.Report(parsed, terminal)
            : await parsed.InvokeAsync(
                new InvocationConfiguration { Output = terminal.Out, Error = terminal.Error, EnableDefaultExceptionHandler = false },
                cancellation);
    });

    private static RootCommand Build(Terminal terminal, Workshop workshop)
    {
        var options = new CommandOptions();
        var root = new RootCommand("Harmonic-frequency sweeps of industrial power systems: resonances, distortion, limits, capacitor banks.")
        {
            HelpName = "hsweep",
        };
        var create = new Command("new", "Write headed, commented tables of a new case to fill in.") { options.NewFolder };
        create.SetAction(parsed => NewCase.Run(parsed.GetRequiredValue(options.NewFolder), terminal, workshop));
        HelpText.Extend(create, "hsweep new my-plant");
        root.Add(create);
        foreach (CaseCommand description in CaseCommand.All(workshop, options))
        {
            var command = new Command(description.Name, description.Summary) { options.Case };
            foreach (Option option in description.Options)
            {
                command.Add(option);
            }

            // off the calling thread, so that Ctrl-C is answered while a study computes
            command.SetAction((parsed, cancel) => Task.Run(
                () => new CaseRun(description, options, parsed, terminal, workshop).Run(cancel), CancellationToken.None));
            HelpText.Extend(command, description.Example);
            root.Add(command);
        }

        root.Options.OfType<VersionOption>().Single().Action = new VersionAction();
        HelpText.ExtendRoot(root);
        return root;
    }

    private sealed class VersionAction : SynchronousCommandLineAction
    {
        public override int Invoke(ParseResult parseResult)
        {
            parseResult.InvocationConfiguration.Output.WriteLine($"hsweep {Version}");
            return ExitCode.Ok;
        }
    }
}
