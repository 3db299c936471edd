using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using MathNet.Numerics.LinearAlgebra.Complex;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>
/// Facts every power engineer uses: common practice, no published source. The nodal matrix is taken as the inverse of the
/// impedances that the study lists, so that it is the network as solved that is judged.
/// </summary>
public sealed class TradeFactTests
{
    private static readonly Bus[] _buses = [PlantKit.Bus("A", 10), PlantKit.Bus("B", 10), PlantKit.Bus("C", 10)];

    /// <summary>
    /// Without ratios and shifts: symmetric, each diagonal the sum of the admittances that end there, each off-diagonal minus the
    /// sum of those between the two. Tolerance 1e-12 of the largest entry: one inversion of a well-conditioned 3 x 3 matrix.
    /// </summary>
    [Theory]
    [InlineData(1)]
    [InlineData(5)]
    [InlineData(11.5)]
    public void Nodal_matrix_holds_sums_of_admittances(double h)
    {
        Plant plant = PlantKit.Plant(
            50, _buses, PlantKit.Supply("S", "A", 100, 0.75), PlantKit.Reactor("AB1", "A", "B", 0.5, 20), PlantKit.Reactor("AB2", "A", "B", 0.8, 40),
            PlantKit.Reactor("BC", "B", "C", 1.2, 30), PlantKit.Bank("K", "C", 1000, 10), PlantKit.Load("L", "B", 900, 300));
        Complex supply = 1 / new Complex(0.8, 0.6 * h);
        Complex ab = 1 / new Complex(0.5 / 20, 0.5 * h) + 1 / new Complex(0.8 / 40, 0.8 * h);
        Complex bc = 1 / new Complex(1.2 / 30, 1.2 * h);
        Complex bank = new(0, h / 100);
        Complex load = new(0.009, -0.003 / h);
        Complex[,] expected = { { supply + ab, -ab, 0 }, { -ab, ab + bc + load, -bc }, { 0, -bc, bc + bank } };

        DenseMatrix z = new(3);
        for (int k = 0; k < 3; k++)
        {
            Dictionary<string, IReadOnlyList<Complex?>> column = ProductSide.Column(plant, null, _buses[k].Name, Sequence.Positive, h);
            for (int i = 0; i < 3; i++)
            {
                z[i, k] = column[_buses[i].Name][0]!.Value;
            }
        }

        MathNet.Numerics.LinearAlgebra.Matrix<Complex> y = z.Inverse();
        double largest = expected.Cast<Complex>().Max(c => c.Magnitude);
        for (int i = 0; i < 3; i++)
        {
            for (int k = 0; k < 3; k++)
            {
                Assert.InRange((y[i, k] - expected[i, k]).Magnitude, 0, 1e-12 * largest);
                Assert.InRange((y[i, k] - y[k, i]).Magnitude, 0, 1e-12 * largest);
            }
        }
    }

    /// <summary>
    /// A source behind an impedance and its Norton equivalent give the same voltages: once a background EMF behind the supply,
    /// once a small converter at the same bus that injects E/Z. Tolerance 1e-9: the converter's spectrum is set from a solved I_1.
    /// </summary>
    [Fact]
    public void Source_behind_an_impedance_equals_its_norton_current()
    {
        const double h = 7;
        Supply quiet = PlantKit.Supply("S", "A", 100, 0.75);
        PlantElement[] rest =
            [PlantKit.Reactor("AB", "A", "B", 0.5, 20), PlantKit.Bank("K", "B", 1000, 10), PlantKit.Load("L", "B", 900, 300)];
        Supply loud = quiet with { Background = PlantKit.Spectrum("background", (h, 2, 40)) };
        Converter probe = PlantKit.Converter("P", "A", 1, 0.9, PlantKit.Spectrum("silent", (1, 100, 0), (h, 1, 0)));

        Complex first = Current(ProductSide.Distortion(PlantKit.Plant(50, _buses, [quiet, .. rest, probe])), "P", 1);
        Complex emf = Complex.FromPolarCoordinates(0.02 * 10_000 / Math.Sqrt(3), 40 * Math.PI / 180);
        Complex drawn = -emf / new Complex(0.8, 0.6 * h);
        Converter norton = probe with
        {
            Spectrum = PlantKit.Spectrum(
                "norton", (1, 100, 0), (h, 100 * drawn.Magnitude / first.Magnitude, (drawn.Phase - h * first.Phase) * 180 / Math.PI)),
        };

        StateResult thevenin = ProductSide.Distortion(PlantKit.Plant(50, _buses, [loud, .. rest, probe with { Spectrum = PlantKit.Spectrum("none", (1, 100, 0)) }]));
        StateResult equivalent = ProductSide.Distortion(PlantKit.Plant(50, _buses, [quiet, .. rest, norton]));
        foreach (string bus in (string[])["A", "B"])
        {
            Complex expected = Voltage(thevenin, bus, h);
            Assert.True(expected.Magnitude > 1e-3);
            Assert.InRange((Voltage(equivalent, bus, h) - expected).Magnitude, 0, 1e-9 * expected.Magnitude);
        }
    }

    /// <summary>
    /// An impedance in series with a current source changes no voltage but that behind it: volts per ampere of the converter at A are
    /// the same with the converter on A and behind a reactor. Tolerance 1e-9, the power flow standing between.
    /// </summary>
    [Fact]
    public void Impedance_in_series_with_a_current_source_changes_no_voltage()
    {
        const double h = 11;
        Spectrum spectrum = PlantKit.Spectrum("six", (1, 100, 0), (h, 9, 30));
        PlantElement[] rest = [PlantKit.Supply("S", "A", 100), PlantKit.Bank("K", "A", 800, 10), PlantKit.Reactor("AC", "A", "C", 2, 25)];
        StateResult direct = ProductSide.Distortion(PlantKit.Plant(50, _buses, [.. rest, PlantKit.Converter("P", "A", 1000, 0.9, spectrum)]));
        StateResult behind = ProductSide.Distortion(PlantKit.Plant(50, _buses, [.. rest, PlantKit.Converter("P", "C", 1000, 0.9, spectrum)]));
        Complex one = Voltage(direct, "A", h) / Current(direct, "P", h);
        Complex other = Voltage(behind, "A", h) / Current(behind, "P", h);
        Assert.InRange((one - other).Magnitude, 0, 1e-9 * one.Magnitude);
        Assert.True((Voltage(behind, "C", h) - Voltage(behind, "A", h)).Magnitude > 1e-3);
    }

    /// <summary>Impedances do not depend on the unit a plant is written in: scaling kV by s and MVA by s^2 leaves every ohm. Exact but for rounding, 1e-12.</summary>
    [Theory]
    [InlineData(0.04)]
    [InlineData(13)]
    public void Ohms_stay_when_kilovolts_and_megavolt_amperes_scale_together(double s)
    {
        Plant Scaled(double by) => PlantKit.Plant(
            60, [PlantKit.Bus("A", 10 * by), PlantKit.Bus("B", 0.4 * by)], PlantKit.Supply("S", "A", 80 * by * by),
            PlantKit.Transformer("T", "A", "B", 1.6 * by * by, 10 * by, 0.4 * by, 6, group: "Dyn5"), PlantKit.Bank("K", "B", 300 * by * by, 0.44 * by),
            PlantKit.Load("L", "B", 500 * by * by, 200 * by * by));
        foreach (double h in (double[])[1, 5, 7.5])
        {
            Complex one = ProductSide.Impedance(Scaled(1), "B", h)!.Value;
            Complex other = ProductSide.Impedance(Scaled(s), "B", h)!.Value;
            Assert.InRange((one - other).Magnitude, 0, 1e-12 * one.Magnitude);
        }
    }

    private static Complex Voltage(StateResult result, string bus, double order) => result.Voltages.Single(v => v.Bus == bus && v.Order == order).Kv;

    private static Complex Current(StateResult result, string element, double order) =>
        result.Currents.Single(c => c.Element == element && c.Order == order).Ampere;

    /// <summary>
    /// A source without impedance has no admittance to enter: it is refused by name and never solved as a large number.
    /// </summary>
    [Theory]
    [InlineData(double.PositiveInfinity)]
    [InlineData(0)]
    public void Bare_ideal_voltage_source_cannot_be_entered_by_inspection_and_is_reported(double shortCircuitMva)
    {
        Plant plant = PlantKit.Plant(50, [PlantKit.Bus("GRID", 20)], PlantKit.Supply("IDEAL", "GRID", shortCircuitMva));

        CaseException refused = Assert.Throws<CaseException>(
            () => Circuit.Build(new PlantInState(plant, OperatingState.Base), CircuitScope.Harmonic));

        Finding finding = Assert.Single(refused.Findings);
        Assert.Equal("HS201", finding.Id);
        Assert.Contains("IDEAL has no impedance: an ideal voltage source has no admittance", finding.Message, StringComparison.Ordinal);
    }
}
