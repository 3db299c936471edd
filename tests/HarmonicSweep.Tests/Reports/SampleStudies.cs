using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Tests.Reports;

/// <summary>
/// Results for pictures, made without the solver: a supply R + jhX beside a capacitor -jXc/h, whose parallel resonance
/// lies near sqrt(Xc/X) by hand. Only shapes and sizes matter here, not engineering truth.
/// </summary>
internal sealed record SampleStudies
{
    public int Buses { get; init; } = 2;

    public int States { get; init; } = 1;

    public int BankSteps { get; init; } = 6;

    public double FromOrder { get; init; } = 1;

    public double ToOrder { get; init; } = 50;

    public double OrderStep { get; init; } = 0.02;

    public double ResistanceOhm { get; init; } = 0.012;

    public bool Injects { get; init; } = true;

    public bool DeadInLastState { get; init; }

    public bool Open { get; init; }

    public double VoltageScale { get; init; } = 1;

    public double ThdLimit { get; init; } = 5;

    public Func<int, string> BusName { get; init; } = i => FormattableString.Invariant($"LV-{i + 1}");

    public Func<int, string> StateName { get; init; } = i => i == 0 ? "base" : FormattableString.Invariant($"supply min, BANK-1 {i}/6");

    public double[] Injected { get; init; } = [5, 7, 11, 13, 17, 19, 23, 25, 29, 31, 35, 37, 41, 43, 47, 49];

    public StudySettings Settings { get; init; } = new() { Sweep = new SweepRange(50, 2500, 1), PccBus = "LV-1" };

    /// <summary>Reactance of the supply in a state, ohm.</summary>
    public static double SupplyOhm(int state) => 0.08 * (1 + 0.17 * state);

    /// <summary>Reactance of the bank of a bus at order 1, ohm.</summary>
    public static double BankOhm(int bus, double stepsIn = 3) => 12 / (1 + 0.2 * bus) / stepsIn;

    /// <summary>Impedance of supply and bank side by side, ohm.</summary>
    public Complex Ohm(double order, double supplyOhm, double bankOhm)
    {
        Complex supply = new(ResistanceOhm * Math.Sqrt(order), order * supplyOhm);
        Complex bank = new(0.001, -bankOhm / order), filter = new(0.004, 0.6 * order - 0.6 * 125.0 / order);
        return 1 / (1 / supply + 1 / bank + 1 / filter);
    }

    public StudyResult Build() => new()
    {
        States = [.. Enumerable.Range(0, States).Select(StateOf)],
        Screen = BankSteps > 0 ? ScreenOf() : null,
    };

    public double[] Orders() => [.. Enumerable.Range(0, (int)Math.Round((ToOrder - FromOrder) / OrderStep) + 1).Select(i => FromOrder + i * OrderStep)];

    private StateResult StateOf(int state)
    {
        var buses = Enumerable.Range(0, Buses).ToList();
        string? dead = DeadInLastState && state == States - 1 ? BusName(Buses - 1) : null;
        var live = buses.Where(b => BusName(b) != dead).ToList();
        double[] orders = Orders();
        double[] injected = Injects ? Injected : [];
        var voltages = live.SelectMany(b => injected.Select(h => VoltageOf(b, state, h))).ToList();
        return new StateResult
        {
            State = StateName(state),
            DeadBuses = dead is null ? [] : [dead],
            InjectedOrders = injected,
            Impedance = [.. live.Select(b => new ImpedanceCurve(
                Sequence.Positive, BusName(b), BusName(b), orders,
                [.. orders.Select(h => Open || (h > 20 && h < 21) ? (Complex?)null : Ohm(h, SupplyOhm(state), BankOhm(b)))]))],
            Resonances = Open ? [] : [.. live.SelectMany(b => Peaks(BusName(b), h => Ohm(h, SupplyOhm(state), BankOhm(b)).Magnitude))],
            Gains = [.. live.Select(b => new BackgroundGain(
                BusName(0), BusName(b), orders,
                [.. orders.Select(h => Open ? (double?)null : (Ohm(h, SupplyOhm(state), BankOhm(b)) / new Complex(ResistanceOhm, h * SupplyOhm(state))).Magnitude)]))],
            Voltages = voltages,
            Distortion = [.. buses.SelectMany(b => Enum.GetValues<SummationRule>().Select(r =>
            {
                double thd = Math.Sqrt(voltages.Where(v => v.Bus == BusName(b)).Sum(v => v.PercentOfNominal[r] * v.PercentOfNominal[r]));
                return new BusDistortion(BusName(b), r, BusName(b) == dead ? null : thd, BusName(b) == dead ? null : thd);
            }))],
            Limits = [.. LimitsOf(voltages)],
        };
    }

    private HarmonicVoltage VoltageOf(int bus, int state, double order)
    {
        double percent = VoltageScale * Ohm(order, SupplyOhm(state), BankOhm(bus)).Magnitude * 3 / order * (1 + 0.1 * bus);
        var values = new RuleValues(percent, 1.3 * percent, 1.05 * percent, 1.1 * percent);
        return new HarmonicVoltage(BusName(bus), order, percent * 0.004, values, values);
    }

    private IEnumerable<LimitVerdict> LimitsOf(List<HarmonicVoltage> voltages)
    {
        string pcc = BusName(0);
        foreach (HarmonicVoltage v in voltages.Where(v => v.Bus == pcc))
        {
            double percent = v.PercentOfNominal.Phasor;
            yield return new LimitVerdict("IEEE 519-2022", "Table 1", "V <= 1 kV", "V_h", pcc, v.Order, percent, 3, percent > 3 ? Verdict.Exceeded : Verdict.Within, null);
        }

        double thd = Math.Sqrt(voltages.Where(v => v.Bus == pcc).Sum(v => Math.Pow(v.PercentOfNominal.Phasor, 2)));
        yield return new LimitVerdict("IEEE 519-2022", "Table 1", "V <= 1 kV", "THD_V", pcc, null, thd, ThdLimit, thd > ThdLimit ? Verdict.Exceeded : Verdict.Within, null);
    }

    /// <summary>Peaks of a fine grid; good to the spacing of the grid, which is all a picture needs.</summary>
    private IEnumerable<Resonance> Peaks(string bus, Func<double, double> ohm)
    {
        const double step = 0.005;
        for (double h = FromOrder + step; h < ToOrder - step; h += step)
        {
            double z = ohm(h);
            if ((z > ohm(h - step) && z > ohm(h + step)) || (z < ohm(h - step) && z < ohm(h + step)))
            {
                double? near = Injects ? Injected.MinBy(o => Math.Abs(o - h)) : null;
                yield return new Resonance(Sequence.Positive, bus, z > ohm(h - step) ? ResonanceKind.Parallel : ResonanceKind.Series, h, 50 * h, z, 20, near);
            }
        }
    }

    private ScreenResult ScreenOf()
    {
        var positions = new List<BankPosition>();
        var maps = new List<PositionMap>();
        double[] orders = Orders();
        foreach ((string strength, double supply) in new[] { ("max", 0.08), ("min", 0.13) })
        {
            var rows = new List<IReadOnlyList<Complex?>>();
            for (int steps = 0; steps <= BankSteps; steps++)
            {
                double bank = steps == 0 ? 1e9 : 24.0 / steps;
                rows.Add([.. orders.Select(h => Open ? (Complex?)null : Ohm(h, supply, bank))]);
                Resonance[] parallel = [.. Peaks(BusName(0), h => Ohm(h, supply, bank).Magnitude).Where(r => r.Kind == ResonanceKind.Parallel)];
                Resonance? nearest = Injects ? parallel.MinBy(r => r.Distance) : null;
                positions.Add(new BankPosition
                {
                    BaseState = "base",
                    State = FormattableString.Invariant($"base, supply {strength}, BANK-1 {steps}/{BankSteps}"),
                    Bank = "BANK-1",
                    Bus = BusName(0),
                    StepsIn = steps,
                    Steps = BankSteps,
                    Strength = strength,
                    KvarIn = 50 * steps,
                    ParallelResonances = parallel,
                    Nearest = nearest,
                    DoNotDwell = nearest?.Distance < 0.3,
                });
            }

            maps.Add(new PositionMap("base", "BANK-1", BusName(0), strength, [.. Enumerable.Range(0, BankSteps + 1)], orders, rows, Injects ? Injected : []));
        }

        return new ScreenResult { NearOrders = 0.3, Positions = positions, Worst = [], Maps = maps };
    }
}
