using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using MathNet.Numerics.LinearAlgebra;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// Resonance mode analysis (Xu, Huang, Cui, Wang 2005, from memory): Y = T diag(lambda) T^-1. Whatever the paper's numbers, for every bus
/// Z_bb = sum over modes of T_bm (T^-1)_mb/lambda_m, and the participation factors T_bm (T^-1)_mb of a mode sum to 1 over the buses.
/// The eigenvalues are those of the twin's nodal matrix, Z_bb comes from the study; identity, 1e-10 on a well-conditioned network.
/// </summary>
public sealed class ModalIdentityTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(4.9)]
    [InlineData(7)]
    [InlineData(13)]
    public void Sum_over_modes_is_the_driving_point_impedance(double h)
    {
        Plant plant = PlantKit.Plant(
            50, [PlantKit.Bus("A", 10), PlantKit.Bus("B", 10), PlantKit.Bus("C", 10)], PlantKit.Supply("S", "A", 150, 8),
            PlantKit.Line("AB", "A", "B", 2, 0.2, 0.12, 300), PlantKit.Reactor("BC", "B", "C", 0.4, 40), PlantKit.Line("CA", "A", "C", 3, 0.3, 0.1, 250),
            PlantKit.Bank("K", "B", 3000, 10), PlantKit.Bank("D", "C", 2000, 11) with { DetuningPercent = 7, ReactorQ = 40 },
            PlantKit.Load("L", "C", 2000, 900, LoadModel.Series));
        TwinMatrix matrix = new DenseTwin(plant).Matrix(h, 1);
        var modes = matrix.Y.Evd(Symmetricity.Asymmetric);
        Matrix<Complex> right = modes.EigenVectors;
        Matrix<Complex> left = right.Inverse();
        for (int m = 0; m < 3; m++)
        {
            Complex participation = Enumerable.Range(0, 3).Aggregate(Complex.Zero, (sum, b) => sum + right[b, m] * left[m, b]);
            Assert.InRange((participation - 1).Magnitude, 0, 1e-10);
        }

        foreach (Bus bus in plant.Buses)
        {
            int b = matrix.Nodes.Of(bus.Name);
            Complex modal = Enumerable.Range(0, 3).Aggregate(Complex.Zero, (sum, m) => sum + right[b, m] * left[m, b] / modes.EigenValues[m]);
            Complex direct = ProductSide.Impedance(plant, bus.Name, h)!.Value;
            Assert.InRange((modal - direct).Magnitude, 0, 1e-10 * direct.Magnitude);
        }
    }
}
