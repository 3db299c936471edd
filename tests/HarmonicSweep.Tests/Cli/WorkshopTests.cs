using HarmonicSweep.Cli;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Results;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>The workshop of the program itself.</summary>
public sealed class WorkshopTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("hsweep-test-").FullName;

    private static StudyRequest Request => new()
    {
        Plant = SampleResult.Plant,
        States = SampleResult.Case.States,
        Settings = SampleResult.Case.Settings,
        Buses = ["any"],
    };

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void DrawPlots_writes_png_and_svg()
    {
        Assert.Empty(Workshop.Real.DrawPlots(SampleResult.Case, Request, SampleResult.Result, _folder, TestContext.Current.CancellationToken));
        string[] png = Directory.GetFiles(_folder, "*.png");
        Assert.NotEmpty(png);
        Assert.Equal(png.Length, Directory.GetFiles(_folder, "*.svg").Length);
    }

    [Fact]
    public void DrawPlots_says_which_letters_a_png_cannot_show()
    {
        var plant = new Network.Plant("Werk \u6C34", 50, SampleResult.Plant.Buses, SampleResult.Plant.Elements);
        var renamed = SampleResult.Result with
        {
            States = [SampleResult.Result.States[0] with { Impedance = [SampleResult.Result.States[0].Impedance[0] with { At = "\u6C34", From = "\u6C34" }] }],
        };
        Network.Finding finding = Assert.Single(
            Workshop.Real.DrawPlots(SampleResult.Case with { Plant = plant }, Request, renamed, _folder, TestContext.Current.CancellationToken));
        Assert.Contains("\u6C34", finding.Message, StringComparison.Ordinal);
    }
}
