using System.Globalization;
using System.Numerics;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// CIGRE WG 36-05, 1981 (from memory): R = V^2/P in series with 0.073 h R, beside h R/(6.7 Q/P - 0.74). At Q/P = 0.74/6.7 = 0.11045
/// (power factor 0.99396) the second branch opens and below it would turn capacitive: the model has no answer there.
/// </summary>
public sealed class CigreLoadTests
{
    [Theory]
    [InlineData(110.44, false)]
    [InlineData(110.46, true)]
    [InlineData(-50, false)]
    public void Reading_refuses_the_model_where_its_parallel_branch_would_not_be_inductive(double kvarPerMegawatt, bool accepted)
    {
        string folder = Path.Combine(Path.GetTempPath(), "cigre-" + Guid.NewGuid().ToString("N"));
        Directory.CreateDirectory(folder);
        try
        {
            File.WriteAllText(Path.Combine(folder, "case.toml"), "title = \"guard\"\nfrequency_hz = 50\n");
            File.WriteAllText(Path.Combine(folder, "buses.csv"), "bus,nominal_kv\nB,10\n");
            File.WriteAllText(Path.Combine(folder, "supplies.csv"), "name,bus,sc_mva_max\nS,B,100\n");
            File.WriteAllText(Path.Combine(folder, "loads.csv"), string.Create(
                CultureInfo.InvariantCulture, $"name,bus,p_kw,q_kvar,model\nL,B,1000,{kvarPerMegawatt},cigre\n"));
            CaseReadResult read = CaseReader.Read(folder);
            Assert.Equal(accepted, read.Case is not null);
            if (!accepted)
            {
                Finding finding = Assert.Single(read.Findings, f => f.Severity == Severity.Error);
                Assert.Equal(("loads.csv", 2, "model"), (finding.Location!.File, finding.Location.Line, finding.Location.Column));
            }
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    /// <summary>Just above the guard the parallel branch is all but open: R + j 0.073 h R remains. Q/P - 0.74/6.7 = 1e-9 leaves 1e-8 R of susceptance.</summary>
    [Fact]
    public void At_the_guard_the_parallel_branch_vanishes()
    {
        Plant plant = PlantKit.Plant(
            50, [PlantKit.Bus("S", 10), PlantKit.Bus("B", 10)], PlantKit.Supply("supply", "S", 100),
            PlantKit.Load("L", "B", 1000, 1000 * (0.74 / 6.7 + 1e-9), LoadModel.Cigre));
        Complex z = ProductSide.Impedance(plant, "B", 5)!.Value;
        Assert.InRange((z - new Complex(100, 36.5)).Magnitude, 0, 1e-6 * 106);
    }
}
