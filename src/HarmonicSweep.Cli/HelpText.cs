using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace HarmonicSweep.Cli;

/// <summary>Help as the parser writes it, at a fixed width, followed by what it cannot know.</summary>
internal static class HelpText
{
    private const string RootEnd = """
        First steps:
          hsweep new my-plant             write the tables of a new case
          hsweep check my-plant           find what is wrong or missing in it
          hsweep study my-plant --out results

        Exit codes:
          0    computed, within limits
          1    computed, a limit is exceeded or a bank position must not be dwelt on
          2    bad input: command line, case or output folder
          3    the computation failed
          130  cancelled

        """;

    private const int Width = 100;

    /// <summary>Appends an example to the help of a command.</summary>
    public static void Extend(Command command, string example)
    {
        var option = new HelpOption();
        option.Action = new EndedHelp(option.Action!, $"Example:\n  {example}\n");
        command.Add(option);
    }

    /// <summary>Appends first steps and exit codes to the help of the program.</summary>
    public static void ExtendRoot(RootCommand root)
    {
        HelpOption option = root.Options.OfType<HelpOption>().Single();
        option.Action = new EndedHelp(option.Action!, RootEnd);
    }

    private sealed class EndedHelp : SynchronousCommandLineAction
    {
        private readonly SynchronousCommandLineAction _help;
        private readonly string _end;

        public EndedHelp(CommandLineAction help, string end)
        {
            _help = (SynchronousCommandLineAction)help;
            _end = end;
            if (help is HelpAction text)
            {
                text.MaxWidth = Width;
            }
        }

        public override bool ClearsParseErrors => true;

        public override int Invoke(ParseResult parseResult)
        {
            _help.Invoke(parseResult);
            TextWriter output = parseResult.InvocationConfiguration.Output;
            output.WriteLine(_end.ReplaceLineEndings().TrimEnd());
            return ExitCode.Ok;
        }
    }
}
