using System.Numerics;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Tests.Results;

/// <summary>A small hand-made case and a result that fills every part, with values chosen to be easy to find again.</summary>
internal static class SampleResult
{
    public static Plant Plant { get; } = new(
        "Sample, \"quoted\"", 50,
        [
            new Bus("PCC", 11, At("buses.csv", 2)),
            new Bus("LV-1", 0.4, At("buses.csv", 3)),
        ],
        [
            new Supply { Name = "GRID", Location = At("supplies.csv", 2), Bus = "PCC", ShortCircuitMvaMax = 250, ShortCircuitMvaMin = 125, XOverR = 10 },
            new LinearLoad { Name = "LOAD", Location = At("loads.csv", 2), Bus = "LV-1", PKw = 100, QKvar = 50 },
            new CapacitorBank { Name = "BANK", Location = At("capacitors.csv", 2), Bus = "LV-1", RatedKvar = 300, RatedKv = 0.4, Steps = 6, StepsIn = 6 },
        ]);

    public static CaseFile Case { get; } = new()
    {
        Plant = Plant,
        States = [OperatingState.Base, new OperatingState("weak grid", [new ShortCircuitSetting("GRID", ShortCircuitLevel.Min)])],
        Settings = new StudySettings { Sweep = new SweepRange(50, 2500, 1), PccBus = "PCC", Standards = ["sample_set"], Rule = SummationRule.Rss },
        Assumed = [new AssumedValue("GRID", "x_over_r", "10", "common practice, no published source")],
        Sources = [new SourceEntry("BANK", "nameplate", At("capacitors.csv", 2))],
        Findings = [new Finding(Severity.Warning, "HS050", new SourceLocation("cables.csv", 4, "length_km"), "long cable.", "check it.")],
        Folder = "cases/sample",
        Hash = "00ff",
    };

    public static StudyResult Result { get; } = new()
    {
        States = [Base],
        Screen = Screen,
        Findings = [new Finding(Severity.Note, "HS210", null, "one bus is dead.", "close a coupler.")],
    };

    /// <summary>The parts that one command computes.</summary>
    public static StudyResult Of(string command)
    {
        StateResult start = Base with
        {
            Impedance = [],
            Resonances = [],
            BankResonances = [],
            Gains = [],
            Voltages = [],
            Distortion = [],
            Currents = [],
            Limits = [],
            HandChecks = [],
        };
        StateResult state = command switch
        {
            "check" => start with { HandChecks = Base.HandChecks },
            "impedance" => start with { Impedance = Base.Impedance, Resonances = Base.Resonances, BankResonances = Base.BankResonances, Gains = Base.Gains },
            "distortion" => start with { Voltages = Base.Voltages, Distortion = Base.Distortion, Currents = Base.Currents, Limits = Base.Limits },
            "screen" => start with { HandChecks = Base.HandChecks },
            _ => Base,
        };
        return new StudyResult { States = [state], Screen = command is "screen" or "study" ? Screen : null, Findings = Result.Findings };
    }

    private static StateResult Base => new()
    {
        State = "base",
        PowerFlow = [new BusVoltage("PCC", new Complex(11, -0.25)), new BusVoltage("LV-1", new Complex(0.39, -0.01))],
        DeadBuses = ["SPARE"],
        DroppedInjections = [new DroppedInjection("DRIVE", 9, "no path to ground")],
        InjectedOrders = [5, 7, 11.3],
        Impedance =
        [
            new ImpedanceCurve(Sequence.Positive, "LV-1", "LV-1", [7, 5, 11.3], [new Complex(0.1, 1.0 / 3), null, new Complex(double.NaN, 1)]),
        ],
        Resonances =
        [
            new Resonance(Sequence.Positive, "LV-1", ResonanceKind.Parallel, 6.9, 345, 0.75, 12.5, 7),
            new Resonance(Sequence.Positive, "LV-1", ResonanceKind.Series, 4.2, 210, 0.01, 30, null),
        ],
        BankResonances = [new BankResonance("BANK", "LV-1", 6, 14.3, 6.9041, 6.9), new BankResonance("BANK-2", "LV-1", 1, 14.3, 16.9, null)],
        Gains = [new BackgroundGain("PCC", "LV-1", [5, 7], [1.5, null])],
        Voltages =
        [
            new HarmonicVoltage("LV-1", 5, new Complex(0.003, 0.004), new RuleValues(0.005, 0.007, 0.006, 0.0065), new RuleValues(1.25, 1.75, 1.5, 1.625)),
        ],
        Distortion =
        [
            new BusDistortion("LV-1", SummationRule.Phasor, 1.28, 1.25),
            new BusDistortion("LV-1", SummationRule.Arithmetic, 1.79, 1.75),
            new BusDistortion("LV-1", SummationRule.Rss, 1.53, 1.5),
            new BusDistortion("LV-1", SummationRule.Iec, 1.66, 1.625),
            new BusDistortion("SPARE", SummationRule.Rss, null, null),
        ],
        Currents = [new HarmonicCurrent("BANK", "LV-1", 5, new Complex(-30, 40), new RuleValues(50, 70, 60, 65))],
        Limits =
        [
            new LimitVerdict("Sample rules 2026", "Table 1", "voltage class 1 kV", "V_h", "LV-1", 5, 6.5, 5, Verdict.Exceeded, null),
            new LimitVerdict("Sample rules 2026", "Table 1", "voltage class 1 kV", "THD_V", "LV-1", null, 6.6, 8, Verdict.Within, null),
            new LimitVerdict("Sample rules 2026", "Table 2", "", "TDD", null, null, null, null, Verdict.NotJudged, "demand_mva is missing"),
        ],
        HandChecks = [new HandCheck("Z at order 1", "PCC", "V^2/S_sc", 0.484, 0.4841, "ohm", 0.01), new HandCheck("bank current", "BANK", "Q/(sqrt3 V)", 433, 500, "A", 0.01)],
        WorstBackwardError = 1.5e-16,
        CurrentBalanceResidual = 2e-13,
    };

    private static ScreenResult Screen
    {
        get
        {
            var near = new Resonance(Sequence.Positive, "LV-1", ResonanceKind.Parallel, 7.05, 352.5, 0.8, 11, 7);
            return new ScreenResult
            {
                NearOrders = 0.3,
                Positions =
                [
                    new BankPosition
                    {
                        BaseState = "base", State = "base, supply max, BANK 0/6", Bank = "BANK", Bus = "LV-1", StepsIn = 0, Steps = 6, Strength = "max", KvarIn = 0,
                        BusVoltagePercent = 97, BusVoltageWithoutPercent = 97, ThdPercent = 1.1, PccPowerFactor = 0.82, PccKvar = 75,
                    },
                    new BankPosition
                    {
                        BaseState = "base", State = "base, supply max, BANK 6/6", Bank = "BANK", Bus = "LV-1", StepsIn = 6, Steps = 6, Strength = "max", KvarIn = 300,
                        HandOrder = 7.06, ParallelResonances = [near], Nearest = near, DoNotDwell = true,
                        Loading = new BankLoading(104, 118, 141, 112, 610), BusVoltagePercent = 101.5, BusVoltageWithoutPercent = 97, ThdPercent = 9.8,
                    },
                ],
                Worst = [new WorstValue("LV-1", null, 9.8, "base, supply max, BANK 6/6"), new WorstValue("LV-1", 7, 9.1, "base, supply max, BANK 6/6")],
                Maps = [new PositionMap("base", "BANK", "LV-1", "max", [0, 6], [5, 7], [[new Complex(0, 0.1), null], [new Complex(0.1, 0.2), Complex.One]], [5, 7])],
            };
        }
    }

    private static SourceLocation At(string file, int line) => new(file, line);
}
