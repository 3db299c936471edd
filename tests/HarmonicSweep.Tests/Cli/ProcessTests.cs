using System.Diagnostics;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>The program as a process of its own.</summary>
public class ProcessTests
{
    [Fact]
    public async Task Help_loads_no_library_it_does_not_need()
    {
        (int code, string output, string error) = await Start("--help");
        Assert.Equal(0, code);
        Assert.StartsWith("Description:", output, StringComparison.Ordinal);
        string[] loaded = [.. error.Split('\n').Where(l => l.StartsWith("loaded ", StringComparison.Ordinal)).Select(l => l["loaded ".Length..].TrimEnd())];
        Assert.Contains("System.CommandLine", loaded);
        Assert.DoesNotContain(loaded, name => name is "SkiaSharp" or "MathNet.Numerics" or "Tomlyn" or "CsvHelper" or "HarmonicSweep.Reports" or "HarmonicSweep.Numerics");
    }

    [Fact]
    public async Task Exit_code_and_streams_reach_the_caller()
    {
        (int code, string output, string error) = await Start("chekc");
        Assert.Equal(2, code);
        Assert.Empty(output);
        Assert.StartsWith("error HS900: hsweep does not know 'chekc'. Did you mean 'check'?", error, StringComparison.Ordinal);
    }

    private static async Task<(int Code, string Out, string Error)> Start(params string[] args)
    {
        string folder = AppContext.BaseDirectory;
        var start = new ProcessStartInfo(Environment.ProcessPath is { } host && Path.GetFileNameWithoutExtension(host) == "dotnet" ? host : "dotnet")
        {
            UseShellExecute = false,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        start.ArgumentList.Add(Path.Combine(folder, "hsweep.dll"));
        foreach (string arg in args)
        {
            start.ArgumentList.Add(arg);
        }

        start.Environment["DOTNET_STARTUP_HOOKS"] = typeof(ProcessTests).Assembly.Location;
        using Process process = Process.Start(start)!;
        Task<string> output = process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        Task<string> error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        return (process.ExitCode, await output, await error);
    }
}
