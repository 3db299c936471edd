using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Tests.Properties;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// Exact equivalent pi of a long line. Inputs: Gonen, Electric Power Transmission System Engineering, Example 4.7 (60 Hz, 150 mi,
/// 0.1858 ohm/mi, 2.60 mH/mi, 0.012 uF/mi, R held constant); results are own hyperbolic arithmetic, six digits. Per-mile values
/// stand in the per-kilometre columns, with 150 for the length. Tolerance 1e-5: the printed digits.
/// The textbook's own shunt conductance examples (Bird 44.10) have no counterpart: the line model has no conductance.
/// </summary>
public sealed class LongLineTests
{
    [Theory]
    [InlineData(1, 147.169, 79.4483, 3.42141e-4, 89.9086, 0.950559, 0.5606)]
    [InlineData(5, 465.832, 88.9295, 2.16656e-3, 89.3708, 0.0312045, 106.398)]
    [InlineData(7, 373.558, 90.5020, 4.27780e-3, 88.6372, 0.598307, 177.701)]
    [InlineData(11, 152.819, -95.4382, 1.27308e-2, -84.2735, 0.945528, -179.407)]
    public void Line_of_150_miles_is_its_hyperbolic_pi(
        double h, double seriesOhm, double seriesDeg, double shuntSiemens, double shuntDeg, double cosh, double coshDeg)
    {
        Line line = PlantKit.Line("L", "X", "Y", 150, 0.1858, 2 * Math.PI * 60 * 2.60e-3, 12) with { IsCable = false };
        Plant plant = PlantKit.Plant(
            60, [PlantKit.Bus("A", 230), PlantKit.Bus("X", 230), PlantKit.Bus("Y", 230)], PlantKit.Supply("S", "A", 5000), line);

        // an open line stands on its own capacitance: Z_XX = A/C and Z_YX = 1/C of V_X = A V_Y + B I, I_X = C V_Y + D I
        Dictionary<string, IReadOnlyList<Complex?>> column = ProductSide.Column(plant, null, "X", Sequence.Positive, h);
        Complex c = 1 / column["Y"][0]!.Value;
        Complex a = column["X"][0]!.Value * c;
        Complex b = (a * a - 1) / c;
        Near(cosh, coshDeg, a);
        Near(seriesOhm, seriesDeg, b);
        Near(shuntSiemens, shuntDeg, (a - 1) / b);
        if (h == 1)
        {
            // C = sinh/Zc, the same arithmetic
            Near(6.67358e-4, 90.1818, c);
        }
    }

    private static void Near(double magnitude, double degrees, Complex actual) => Assert.InRange(
        (actual - Complex.FromPolarCoordinates(magnitude, degrees * Math.PI / 180)).Magnitude, 0, 1e-5 * magnitude);
}
