using System.Globalization;
using System.Numerics;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Every folder in cases/ against the twin, in every state: power flow, impedances, voltages, currents, THD. Bounds as for random plants.</summary>
public sealed class CaseFolderTests
{
    private static readonly double[] _orders = [0.5, 1, 2, 3, 5, 7, 9.5, 11, 13, 25, 49];

    public static TheoryData<string> Folders =>
        [.. Directory.GetDirectories(CasesFolder()).Where(d => File.Exists(Path.Combine(d, "case.toml"))).Select(d => Path.GetFileName(d)!).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Folders))]
    public void Studies_of_a_case_agree_with_the_twin_in_every_state(string folder)
    {
        CaseReadResult read = CaseReader.Read(Path.Combine(CasesFolder(), folder));
        Assert.True(read.Case is not null, string.Join(Environment.NewLine, read.Findings));
        Plant plant = read.Case.Plant;
        foreach (OperatingState state in read.Case.States)
        {
            string label = $"{folder}, state {state.Name}";
            DistortionComparison.Check(plant, state, ProductSide.Distortion(plant, state), label, 1e-10, 64);
            DenseTwin twin = new(plant, state);
            TwinMatrix[] matrices = [.. _orders.Select(h => twin.Matrix(h, 1))];
            foreach (Bus from in plant.Buses)
            {
                Dictionary<string, IReadOnlyList<Complex?>> column = ProductSide.Column(plant, state, from.Name, Sequence.Positive, _orders);
                foreach (Bus at in plant.Buses)
                {
                    for (int n = 0; n < _orders.Length; n++)
                    {
                        ImpedanceComparison.Check(
                            matrices[n], at.Name, from.Name, column[at.Name][n], string.Create(CultureInfo.InvariantCulture, $"{label}, h = {_orders[n]}"));
                    }
                }
            }
        }
    }

    /// <summary>The nearest folder upwards that holds the solution, and its cases.</summary>
    private static string CasesFolder()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "HarmonicSweep.sln")))
        {
            folder = folder.Parent;
        }

        return Path.Combine(folder?.FullName ?? throw new DirectoryNotFoundException("The tests run outside the source tree."), "cases");
    }
}
