using System.Numerics;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Twin;

/// <summary>
/// The twin itself against closed forms worked by hand from the model text: a twin that is wrong proves nothing.
/// Tolerance 1e-12 of the value: a handful of operations on each side.
/// </summary>
public sealed class TwinClosedFormTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(5)]
    [InlineData(6.3)]
    public void Supply_and_bank_are_an_inductance_and_a_capacitance_in_parallel(double h)
    {
        // 10 kV, 100 MVA: |Z| = 1 ohm, X/R 3/4 gives R = 0.8, X = 0.6; 2 Mvar at 10 kV: X_C = 50 ohm
        Plant plant = PlantKit.Plant(
            50, [PlantKit.Bus("B", 10)], PlantKit.Supply("S", "B", 100, 0.75), PlantKit.Bank("C", "B", 2000, 10));
        Complex series = new(0.8, 0.6 * h);
        Complex capacitor = new(0, -50 / h);
        Near(series * capacitor / (series + capacitor), new DenseTwin(plant).Impedance("B", "B", h));
    }

    [Fact]
    public void Transformer_refers_the_supply_by_the_square_of_its_ratio_and_tap()
    {
        // 20/0.4 kV at +5 %: a = 52.5; supply 20^2/200 = 2 ohm, all reactive, so 2/52.5^2 on the LV side
        Plant plant = PlantKit.Plant(
            50, [PlantKit.Bus("H", 20), PlantKit.Bus("L", 0.4)], PlantKit.Supply("S", "H", 200, 1e9),
            PlantKit.Transformer("T", "H", "L", 1, 20, 0.4, 6, 0.75) with { TapPercent = 5 });
        double baseOhm = 0.4 * 0.4 / 1;
        Complex expected = new(0.06 * 0.8 * baseOhm, 3 * (0.06 * 0.6 * baseOhm + 2 / (52.5 * 52.5)));
        Near(expected, new DenseTwin(plant).Impedance("L", "L", 3), 1e-8); // X/R 1e9 leaves R = 1e-9 X of the supply
    }

    [Theory]
    [InlineData("Dyn11", 1, 30)]
    [InlineData("Dyn11", -1, -30)]
    [InlineData("Yd1", 1, -30)]
    [InlineData("Yy6", 1, 180)]
    public void Clock_turns_the_transfer_impedance_one_way_in_positive_and_the_other_in_negative_sequence(
        string group, int sequence, double lvLeadsDeg)
    {
        // the LV side lags by 30 n degrees: with current injected at HV the LV voltage stands at -30 n
        Plant plant = PlantKit.Plant(
            50, [PlantKit.Bus("H", 20), PlantKit.Bus("L", 0.4)], PlantKit.Supply("S", "H", 200, 1e9),
            PlantKit.Transformer("T", "H", "L", 1, 20, 0.4, 6, 10, group));
        Complex driving = new DenseTwin(plant).Impedance("H", "H", 1, sequence)!.Value;
        Complex transfer = new DenseTwin(plant).Impedance("L", "H", 1, sequence)!.Value;
        Near(driving / 50 * Complex.FromPolarCoordinates(1, lvLeadsDeg * Math.PI / 180), transfer);
    }

    [Fact]
    public void Motor_group_is_its_locked_rotor_impedance()
    {
        // 4 x 180 kW at 0.9 x 0.8: 1 MVA; 0.4^2/1/5 = 0.032 ohm at pf 0.6: R 0.0192, X 0.0256
        Motor motor = new()
        {
            Name = "M",
            Location = PlantKit.Here,
            Bus = "B",
            RatedKw = 180,
            Count = 4,
            RatedKv = 0.4,
            EfficiencyPercent = 90,
            PowerFactor = 0.8,
            LockedRotorPu = 5,
            LockedRotorPowerFactor = 0.6,
        };
        Plant plant = PlantKit.Plant(50, [PlantKit.Bus("B", 0.4)], motor);
        Near(new Complex(0.0192 * 3, 0.0256 * 9), new DenseTwin(plant).Impedance("B", "B", 9));
    }

    [Fact]
    public void Motor_share_splits_a_load_into_rotor_and_rest()
    {
        // 3 + j4 MVA at 10 kV, half of it motor: 2.5 MVA, 100/2.5/6 = 6.6667 ohm at pf 0.2; the rest 1.5 + j2 MVA in parallel form
        LinearLoad load = PlantKit.Load("L", "B", 3000, 4000) with { MotorSharePercent = 50 };
        Complex rotor = 100 / 2.5 / 6 * new Complex(0.2 * Math.Sqrt(5), 5 * Math.Sqrt(1 - 0.04));
        Complex expected = 1 / (1 / rotor + 1.5 / 100 - Complex.ImaginaryOne * 2 / (5 * 100));
        Near(expected, new DenseTwin(PlantKit.Plant(50, [PlantKit.Bus("B", 10)], load)).Impedance("B", "B", 5));
    }

    [Fact]
    public void Cigre_load_is_its_two_branches()
    {
        // P 1, Q 0.5 at 10 kV: R = 100, Xs = 7.3, Xp = 100/(3.35 - 0.74)
        Complex a = new(100, 7 * 7.3);
        Complex b = new(0, 7 * 100 / 2.61);
        Plant plant = PlantKit.Plant(50, [PlantKit.Bus("B", 10)], PlantKit.Load("L", "B", 1000, 500, LoadModel.Cigre));
        Near(a * b / (a + b), new DenseTwin(plant).Impedance("B", "B", 7));
    }

    [Theory]
    [InlineData(3)]
    [InlineData(5)]
    public void Double_tuned_filter_is_two_equal_arms_in_one(double h)
    {
        // lossless: the arms 2 X_C with X_L = 2 X_C/a^2 and 2 X_C/b^2 in parallel
        Filter filter = PlantKit.Filter("F", "B", FilterKind.DoubleTuned, 1000, 10, 4.7, 1e12) with { SecondOrder = 6.8 };
        double xc = 100;
        double Arm(double tuned) => h * 2 * xc / (tuned * tuned) - 2 * xc / h;
        Complex expected = 1 / (1 / new Complex(0, Arm(4.7)) + 1 / new Complex(0, Arm(6.8)));
        Near(expected, new DenseTwin(PlantKit.Plant(50, [PlantKit.Bus("B", 10)], filter)).Impedance("B", "B", h), 1e-9);
    }

    [Fact]
    public void C_type_filter_is_a_plain_capacitor_at_the_fundamental_and_follows_its_circuit_above()
    {
        Filter filter = PlantKit.Filter("F", "B", FilterKind.CType, 1000, 10, 3, null) with { DampingOhm = 80 };
        DenseTwin twin = new(PlantKit.Plant(50, [PlantKit.Bus("B", 10)], filter));
        Near(new Complex(0, -100), twin.Impedance("B", "B", 1));

        // X_L = X_C2 = 100/8; at h = 3 coil and auxiliary capacitor leave 12.5 (3 - 1/3) = 100/3 ohm beside 80
        Complex arm = new(0, 100.0 / 3);
        Near(new Complex(0, -100.0 / 3) + arm * 80 / (arm + 80), twin.Impedance("B", "B", 3));
    }

    [Fact]
    public void Coupler_makes_one_node_of_two_buses()
    {
        Bus[] buses = [PlantKit.Bus("A", 10), PlantKit.Bus("B", 10)];
        PlantElement[] elements = [PlantKit.Supply("S", "A", 100), PlantKit.Bank("C", "B", 500, 10), PlantKit.Coupler("Q", "A", "B")];
        DenseTwin closed = new(PlantKit.Plant(50, buses, elements));
        DenseTwin open = new(PlantKit.Plant(50, buses, elements), new OperatingState("open", [new ServiceSetting("Q", In: false)]));
        Assert.Equal(closed.Impedance("A", "A", 5), closed.Impedance("B", "A", 5));
        Near(new Complex(0, -40), open.Impedance("B", "B", 5));
        Assert.Equal(Complex.Zero, open.Impedance("A", "B", 5));
    }

    [Fact]
    public void Bus_without_a_path_to_ground_has_no_impedance()
    {
        DenseTwin twin = new(PlantKit.Plant(
            50, [PlantKit.Bus("A", 10), PlantKit.Bus("B", 10), PlantKit.Bus("C", 10)], PlantKit.Supply("S", "A", 100), PlantKit.Reactor("X", "B", "C", 1, 30)));
        Assert.Null(twin.Impedance("B", "B", 5));
        Assert.Null(twin.Impedance("A", "B", 5));
        Assert.NotNull(twin.Impedance("A", "A", 5));
    }

    [Fact]
    public void Power_flow_of_one_line_meets_the_quadratic_of_two_buses()
    {
        // E behind X, load P + jQ: V^4 + (2 Q X - E^2) V^2 + X^2 S^2 = 0, line-to-line kV, ohm and MVA
        Plant plant = PlantKit.Plant(50, [PlantKit.Bus("B", 10)], PlantKit.Supply("S", "B", 50, 1e12), PlantKit.Load("L", "B", 6000, 3000));
        double b = 2 * 3 * 2 - 100;
        double v2 = (-b + Math.Sqrt(b * b - 4 * 4 * 45)) / 2;
        TwinPowerFlow flow = new DenseTwin(plant).PowerFlow();
        Assert.Equal(Math.Sqrt(v2), flow.Volt("B").Magnitude * Math.Sqrt(3) / 1000, 1e-11);
        Assert.InRange(flow.Mismatch, 0, 1e-12);
    }

    [Fact]
    public void Converter_current_takes_angle_diversity_and_phase_shift_from_the_fundamental()
    {
        Spectrum spectrum = PlantKit.Spectrum("six", (1, 100, 20), (5, 18, -70), (7, 11, 0));
        Converter converter = PlantKit.Converter("C", "B", 900, 0.9, spectrum) with { PhaseShiftDeg = 30, Diversity = 0.5, LoadingPercent = 80 };
        Complex drawn = Complex.FromPolarCoordinates(100, -25 * Math.PI / 180);

        // order 5, negative sequence: -70 + 5 (-25 - 20) - (5 + 1) 30 = -475 degrees, drawn; the bus gets the opposite
        Complex expected = -Complex.FromPolarCoordinates(0.18 * 100 * 0.5, -475 * Math.PI / 180);
        Near(expected, TwinDistortion.ConverterInjection(converter, spectrum.Lines[1], drawn));

        // order 7, positive: 7 (-45) - 6 x 30 = -495
        Near(-Complex.FromPolarCoordinates(5.5, -495 * Math.PI / 180), TwinDistortion.ConverterInjection(converter, spectrum.Lines[2], drawn));
    }

    [Fact]
    public void Rules_of_three_and_four_give_the_textbook_sums()
    {
        // 3 and 4 add to 7 (h = 3), 5.7658 (h = 5), 5 (h = 11): IEC TR 61000-3-6 exponents, own arithmetic
        Complex[] parts = [3, new Complex(0, 4)];
        Assert.Equal(7, TwinRules.Iec(3, parts), 12);
        Assert.Equal(5.7658, TwinRules.Iec(5, parts), 4);
        Assert.Equal(5.7658, TwinRules.Iec(10, parts), 4);
        Assert.Equal(5, TwinRules.Iec(10.5, parts), 12);
        Assert.Equal(5, TwinRules.Phasor(7, parts), 12);
        Assert.Equal(7, TwinRules.Arithmetic(7, parts), 12);
        Assert.Equal(5, TwinRules.Rss(7, parts), 12);
    }

    private static void Near(Complex expected, Complex? actual, double relative = 1e-12)
    {
        Assert.NotNull(actual);
        Assert.InRange((actual.Value - expected).Magnitude, 0, relative * expected.Magnitude);
    }
}
