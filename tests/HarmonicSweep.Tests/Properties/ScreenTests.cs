using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>
/// A position of the screening is nothing but a state: what it lists must equal what the twin finds with the bank set to that step and the
/// supply to that strength. Tolerance 1e-8: power flow, then sums over orders.
/// </summary>
public sealed class ScreenTests
{
    private static readonly Spectrum _six = PlantKit.Spectrum("six", (1, 100, 0), (5, 19, 20), (7, 13, -50), (11, 8, 0), (13, 6, 90));

    private static readonly Plant _plant = PlantKit.Plant(
        60, [PlantKit.Bus("H", 13.8), PlantKit.Bus("L", 0.48)], PlantKit.Supply("S", "H", 200) with { ShortCircuitMvaMin = 90 },
        PlantKit.Transformer("T", "H", "L", 2, 13.8, 0.48, 5.75, 7, "Dyn1"),
        PlantKit.Bank("K", "L", 600, 0.5) with { Steps = 3, StepsIn = 2, LossWPerKvar = 0.5 },
        PlantKit.Bank("D", "L", 150, 0.525) with { DetuningPercent = 7, ReactorQ = 30 },
        PlantKit.Load("P", "L", 500, 350), PlantKit.Converter("C", "L", 600, 0.93, _six));

    private static readonly ScreenResult _screen = ScreenStudy.Run(
        ProductSide.Request(_plant) with
        {
            Settings = new StudySettings { Sweep = new SweepRange(60, 1800, 20), PccBus = "H" },
            Buses = [],
        },
        progress: null, CancellationToken.None).Screen!;

    [Fact]
    public void Every_step_of_every_bank_is_visited_at_both_strengths()
    {
        var expected = from bank in (string[])["K", "D"]
                       from strength in (string[])["max", "min"]
                       from steps in Enumerable.Range(0, bank == "K" ? 4 : 2)
                       select (bank, strength, steps);
        Assert.Equal(expected.Order(), _screen.Positions.Select(p => (p.Bank, p.Strength, p.StepsIn)).Order());
    }

    [Fact]
    public void Distortion_and_voltage_of_a_position_are_those_of_its_state()
    {
        Assert.All(_screen.Positions, position =>
        {
            TwinDistortion twin = new DenseTwin(_plant, State(position)).Distortion();
            double thd = twin.ThdPercent("L", TwinRules.Phasor)!.Value;
            Assert.Equal(thd, position.ThdPercent!.Value, 1e-8 * thd);
            Assert.Equal(PercentOfNominal(twin.Flow), position.BusVoltagePercent!.Value, 1e-7);
            TwinPowerFlow without = TwinPowerFlow.Solve(new PlantInState(_plant, State(position).With("out", new ServiceSetting(position.Bank, In: false))));
            Assert.Equal(PercentOfNominal(without), position.BusVoltageWithoutPercent!.Value, 1e-7);
        });
    }

    [Fact]
    public void Power_factor_and_kvar_at_the_coupling_point_are_those_the_supply_delivers()
    {
        Assert.All(_screen.Positions, position =>
        {
            TwinPowerFlow flow = TwinPowerFlow.Solve(new PlantInState(_plant, State(position)));
            Complex delivered = -3 * flow.Volt("H") * Complex.Conjugate(flow.SupplyAmpere(_plant.Of<Supply>().Single()));
            Assert.Equal(delivered.Imaginary / 1000, position.PccKvar!.Value, 1e-8 * delivered.Magnitude / 1000);
            Assert.Equal(delivered.Real / delivered.Magnitude, position.PccPowerFactor!.Value, 1e-8);
        });
    }

    /// <summary>
    /// Duty over all solved orders: V_h = sqrt3 I_h X_C/h over the capacitors themselves, rms and crest of it, I rms, kvar = sqrt3 sum V_h I_h,
    /// against the rating of the steps in (IEEE 18 continuous limits 110, 120, 135, 135 %, as reprinted in "Capacitor application issues").
    /// </summary>
    [Fact]
    public void Loading_of_the_bank_follows_from_its_currents()
    {
        Assert.All(_screen.Positions.Where(p => p.StepsIn > 0), position =>
        {
            CapacitorBank bank = _plant.Of<CapacitorBank>().Single(b => b.Name == position.Bank);
            TwinDistortion twin = new DenseTwin(_plant, State(position)).Distortion();
            double mvar = bank.RatedKvar / 1000 * position.StepsIn / bank.Steps;
            double xc = bank.RatedKv * bank.RatedKv / mvar;
            (double Ampere, double Kv)[] orders = [.. twin.Orders.Prepend(1).Select(h =>
            {
                double ampere = TwinRules.Phasor(h, twin.Ampere(bank.Name, "L", h));
                return (ampere, Math.Sqrt(3) * ampere * xc / h / 1000);
            })];
            double ratedAmpere = 1000 * mvar / (Math.Sqrt(3) * bank.RatedKv);
            BankLoading loading = position.Loading!;
            double rms = Math.Sqrt(orders.Sum(o => o.Ampere * o.Ampere));
            Assert.Equal(rms, loading.CurrentA, 1e-8 * rms);
            Assert.Equal(100 * rms / ratedAmpere, loading.CurrentPercent, 1e-6);
            Assert.Equal(100 * Math.Sqrt(orders.Sum(o => o.Kv * o.Kv)) / bank.RatedKv, loading.RmsVoltagePercent, 1e-6);
            Assert.Equal(100 * orders.Sum(o => o.Kv) / bank.RatedKv, loading.CrestVoltagePercent, 1e-6);
            Assert.Equal(100 * Math.Sqrt(3) * orders.Sum(o => o.Kv * o.Ampere) / 1000 / mvar, loading.KvarPercent, 1e-6);
            Assert.Equal(
                loading.RmsVoltagePercent > 110 || loading.CrestVoltagePercent > 120 || loading.CurrentPercent > 135 || loading.KvarPercent > 135,
                loading.Overloaded);
        });
    }

    [Fact]
    public void Position_is_flagged_exactly_when_a_parallel_resonance_lies_near_an_injected_order()
    {
        double[] injected = [5, 7, 11, 13];
        Assert.All(_screen.Positions, position =>
        {
            bool near = position.ParallelResonances.Any(r => injected.Any(h => Math.Abs(r.Order - h) < _screen.NearOrders));
            Assert.Equal(near, position.DoNotDwell);
        });
        Assert.Contains(_screen.Positions, p => p.DoNotDwell);
        Assert.Contains(_screen.Positions, p => !p.DoNotDwell);
    }

    [Fact]
    public void Hand_formula_of_a_position_uses_its_strength_and_its_steps()
    {
        Assert.All(_screen.Positions.Where(p => p.StepsIn > 0), position =>
        {
            CapacitorBank bank = _plant.Of<CapacitorBank>().Single(b => b.Name == position.Bank);
            double mva = position.Strength == "min" ? 90 : 200;

            // S_sc at L: supply (X/R 10) and transformer (X/R 7) in series, magnitudes of the complex sum on 0.48 kV
            Complex series = 0.48 * 0.48 / mva * new Complex(1, 10) / Math.Sqrt(101) + 0.0575 * 0.48 * 0.48 / 2 * new Complex(1, 7) / Math.Sqrt(50);
            double shortCircuit = 0.48 * 0.48 / series.Magnitude;
            double xc = bank.RatedKv * bank.RatedKv / (bank.RatedKvar / 1000 * position.StepsIn / bank.Steps);
            double expected = 1 / Math.Sqrt(bank.DetuningPercent / 100 + 0.48 * 0.48 / (xc * shortCircuit));
            Assert.Equal(expected, position.HandOrder!.Value, 1e-9 * expected);
        });
    }

    private static double PercentOfNominal(TwinPowerFlow flow) => 100 * flow.Volt("L").Magnitude * Math.Sqrt(3) / 480;

    private static OperatingState State(BankPosition position) => new(
        "position",
        [
            new StepsSetting(position.Bank, position.StepsIn),
            new ShortCircuitSetting("S", position.Strength == "min" ? ShortCircuitLevel.Min : ShortCircuitLevel.Max),
        ]);
}
