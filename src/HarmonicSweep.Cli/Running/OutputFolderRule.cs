using HarmonicSweep.Network;

namespace HarmonicSweep.Cli;

/// <summary>Where results may go: never into a case folder, whose tables they would spoil.</summary>
internal static class OutputFolderRule
{
    /// <summary>Why the folder is refused; null when it may be used.</summary>
    public static Finding? Refusal(string outFolder, string caseFolder)
    {
        if (File.Exists(outFolder))
        {
            return Refused($"--out '{outFolder}' is a file; expected a folder.");
        }

        if (Real(outFolder) == Real(caseFolder))
        {
            return Refused($"--out '{outFolder}' is the case folder itself; its tables would be mixed with results.");
        }

        return File.Exists(Path.Combine(outFolder, "case.toml"))
            ? Refused($"--out '{outFolder}' holds a case.toml; results would spoil that case.")
            : null;
    }

    private static Finding Refused(string message) =>
        new(Severity.Error, "HS905", null, message, "choose a folder of its own for the results, for example --out results.");

    /// <summary>The path with '.', '..' and links resolved, the last link included.</summary>
    private static string Real(string path)
    {
        string full = Path.TrimEndingDirectorySeparator(Path.GetFullPath(path));
        string? parent = Path.GetDirectoryName(full);
        if (parent is null)
        {
            return full;
        }

        string here = Path.Combine(Real(parent), Path.GetFileName(full));
        return Directory.Exists(here) && Directory.ResolveLinkTarget(here, returnFinalTarget: true) is { } target
            ? Path.TrimEndingDirectorySeparator(target.FullName)
            : here;
    }
}
