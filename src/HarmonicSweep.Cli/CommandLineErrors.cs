using System.CommandLine;
using System.CommandLine.Parsing;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cli;

/// <summary>What is wrong with a command line, each with the nearest valid word.</summary>
internal static class CommandLineErrors
{
    /// <summary>Writes every error to stderr.</summary>
    /// <returns><see cref="ExitCode.BadInput"/>.</returns>
    public static int Report(ParseResult parsed, Terminal terminal)
    {
        Command command = parsed.CommandResult.Command;
        string path = command is RootCommand ? "hsweep" : $"hsweep {command.Name}";
        string help = $"see {path} --help.";
        Finding Error(string message) => new(Severity.Error, "HS900", null, message, help);

        var findings = new List<Finding>();
        foreach (string word in parsed.UnmatchedTokens)
        {
            findings.Add(Error($"{path} does not know '{word}'.{NearestWord.Hint(word, Known(command, word))}"));
        }

        foreach (ParseError error in parsed.Errors)
        {
            bool said = parsed.UnmatchedTokens.Any(word => error.Message.Contains($"'{word}'", StringComparison.Ordinal));
            bool noCommand = command is RootCommand && error.SymbolResult is CommandResult;
            if (!said && !(noCommand && findings.Count > 0))
            {
                findings.Add(Error(noCommand ? $"a command is missing: {string.Join(", ", Known(command, ""))}." : error.Message));
            }
        }

        Diagnostics.Write(terminal, findings);
        return ExitCode.BadInput;
    }

    /// <summary>Options for a word that looks like one, else the commands.</summary>
    private static IEnumerable<string> Known(Command command, string word) => word.StartsWith('-')
        ? command.Options.Where(o => !o.Hidden).Select(o => o.Name)
        : command.Subcommands.Select(c => c.Name);
}
