using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// R-L-C circuits on non-sinusoidal voltages: Bird, Electrical Circuit Theory and Technology, chapter 36, problem texts 36.11 and 36.13
/// to 36.15; answers are own arithmetic by the book's method, to six digits. The circuit is put together from plant elements as one phase
/// of a wye, the study gives Z(h), the current is V_h/Z(h). Tolerance 1e-4: the digits of the answers.
/// </summary>
public sealed class SeriesCircuitTests
{
    /// <summary>36.11: 25 + 100 sin wt + 40 sin(3wt + 30) + 20 sin(5wt + 15) V, w = 1e4, on 5 ohm and 500 uH. The impedance of a supply, X/R 1, is that pair.</summary>
    [Fact]
    public void Resistance_and_inductance()
    {
        Plant plant = PlantKit.Plant(1e4 / (2 * Math.PI), [PlantKit.Bus("B", 1)], PlantKit.Supply("S", "B", 1 / (5 * Math.Sqrt(2)), 1));
        Complex first = 100 / At(plant, "B", 1);
        Complex third = Complex.FromPolarCoordinates(40, Math.PI / 6) / At(plant, "B", 3);
        Complex fifth = Complex.FromPolarCoordinates(20, Math.PI / 12) / At(plant, "B", 5);
        Near(14.1421, -45, first);
        Near(2.52982, -41.565, third);
        Near(0.784465, -63.690, fifth);

        // the direct part, 25 V on 5 ohm, is no matter of the network
        double squares = 25 + (Squared(first) + Squared(third) + Squared(fifth)) / 2;
        Assert.Equal(11.3361, Math.Sqrt(squares), 1e-4 * 11.3);
        Assert.Equal(642.54, 5 * squares, 1e-4 * 642);
    }

    /// <summary>36.13: 300 sin 314t + 120 sin(942t + 0.698) V on 560 ohm in series with 2000 ohm beside 2.123 uF.</summary>
    [Fact]
    public void Resistor_before_a_resistor_beside_a_capacitor()
    {
        double mvar = 314 * 2.123e-6;
        Plant plant = PlantKit.Plant(
            314 / (2 * Math.PI), [PlantKit.Bus("S", 1), PlantKit.Bus("A", 1), PlantKit.Bus("B", 1)], PlantKit.Supply("supply", "S", 10),
            PlantKit.Line("R", "A", "B", 1, 560, 0, 0), PlantKit.Load("L", "B", 0.5, 0), PlantKit.Bank("K", "B", 1000 * mvar, 1));
        Complex z1 = At(plant, "A", 1);
        Complex z3 = At(plant, "A", 3);
        Near(1600.06, -36.869, z1);
        Near(825.049, -34.779, z3);
        Complex first = 300 / z1;
        Complex third = Complex.FromPolarCoordinates(120, 0.698) / z3;
        Assert.Equal(0.187493, first.Magnitude, 1e-4 * 0.1875);
        Assert.Equal(0.145446, third.Magnitude, 1e-4 * 0.1454);
        Assert.Equal(77.57, 100 * third.Magnitude / first.Magnitude, 1e-4 * 77.6);
        Assert.Equal(29.667, (Squared(first) * z1.Real + Squared(third) * z3.Real) / 2, 1e-4 * 29.7);
    }

    /// <summary>36.14: 400 V and 10 V at the third, crest, on 2 ohm, 0.5 H and 0.2 uF in resonance at the third. A single-tuned filter at order 3.</summary>
    [Fact]
    public void Resonance_at_the_third()
    {
        double fundamental = 1 / (3 * Math.Sqrt(0.5 * 0.2e-6) * 2 * Math.PI);
        Assert.Equal(167.764, fundamental, 1e-3);
        double xc = 1 / (2 * Math.PI * fundamental * 0.2e-6);
        Plant plant = PlantKit.Plant(
            fundamental, [PlantKit.Bus("S", 1), PlantKit.Bus("B", 1)], PlantKit.Supply("supply", "S", 10),
            PlantKit.Filter("F", "B", FilterKind.SingleTuned, 1000 / xc, 1, 3, xc / (3 * 2)));
        Assert.Equal(0.094868, 400 / At(plant, "B", 1).Magnitude, 1e-4 * 0.0949);
        Assert.Equal(5.000, 10 / At(plant, "B", 3).Magnitude, 1e-4 * 5);
    }

    /// <summary>36.15: 800 V crest at 50 Hz with 1.5 % at the order of resonance, on 5 ohm, 0.369 H and 0.122 uF. A bank behind its reactor.</summary>
    [Fact]
    public void Resonance_at_an_order_to_be_found()
    {
        double xc = 1 / (2 * Math.PI * 50 * 0.122e-6);
        double xl = 2 * Math.PI * 50 * 0.369;
        Plant plant = PlantKit.Plant(
            50, [PlantKit.Bus("S", 1), PlantKit.Bus("B", 1)], PlantKit.Supply("supply", "S", 10),
            PlantKit.Bank("K", "B", 1000 / xc, 1) with { DetuningPercent = 100 * xl / xc, ReactorQ = xl / 5 });
        StudyRequest request = ProductSide.Request(plant) with { Buses = ["B"], Settings = new StudySettings { Sweep = new SweepRange(50, 1000, 10) } };
        Resonance resonance = Assert.Single(ImpedanceStudy.Run(request, progress: null, CancellationToken.None).States[0].Resonances);
        Assert.Equal(ResonanceKind.Series, resonance.Kind);
        Assert.Equal(15.0023, resonance.Order, 1e-4);
        double current = 0.015 * 800 / resonance.Ohm;
        Assert.Equal(2.400, current, 1e-4 * 2.4);
        Assert.Equal(4174.6, current * xc / 15, 1e-4 * 4174);
        Assert.Equal(0.030799, 800 / At(plant, "B", 1).Magnitude, 1e-4 * 0.0308);
    }

    private static Complex At(Plant plant, string bus, double order) => ProductSide.Impedance(plant, bus, order)!.Value;

    private static double Squared(Complex value) => value.Magnitude * value.Magnitude;

    private static void Near(double magnitude, double degrees, Complex actual) => Assert.InRange(
        (actual - Complex.FromPolarCoordinates(magnitude, degrees * Math.PI / 180)).Magnitude, 0, 1e-4 * magnitude);
}
