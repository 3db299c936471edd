using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>
/// Help and tables against approved texts in Expectations. They were read and approved by a person; to approve a
/// change, set the environment variable HSWEEP_APPROVE=1, run, and read the difference before committing it.
/// </summary>
public class SnapshotTests
{
    [Theory]
    [InlineData("help.txt", "--help")]
    [InlineData("help-impedance.txt", "impedance", "--help")]
    [InlineData("help-study.txt", "study", "--help")]
    [InlineData("table-check.txt", "check", "case")]
    [InlineData("table-impedance.txt", "impedance", "case")]
    [InlineData("table-impedance-orders.txt", "impedance", "case", "--orders", "7,5,11.3")]
    [InlineData("table-distortion.txt", "distortion", "case")]
    [InlineData("table-screen.txt", "screen", "case")]
    [InlineData("table-study.txt", "study", "case")]
    public async Task Text_is_as_approved(string name, params string[] args)
    {
        string actual = (await new Hsweep().Run(args)).Out.ReplaceLineEndings("\n");
        string path = Path.Combine(Folder(), name);
        if (Environment.GetEnvironmentVariable("HSWEEP_APPROVE") == "1")
        {
            await File.WriteAllTextAsync(path, actual, TestContext.Current.CancellationToken);
        }

        Assert.Equal(await File.ReadAllTextAsync(path, TestContext.Current.CancellationToken), actual);
    }

    /// <summary>The source folder, so that an approved text lands where it is kept.</summary>
    private static string Folder([System.Runtime.CompilerServices.CallerFilePath] string here = "") =>
        Path.Combine(Path.GetDirectoryName(here)!, "Expectations");
}
