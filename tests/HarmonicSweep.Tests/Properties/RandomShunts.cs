using HarmonicSweep.Network;
using HarmonicSweep.Tests.Twin;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Draws the equipment of a random plant that stands at one bus, and its lines.</summary>
internal sealed class RandomShunts(RandomDraw draw, List<PlantElement> elements)
{
    public static string Name(string kind, int number) =>
        string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{kind}-{number + 1}");

    public Supply Supply(Bus bus)
    {
        double mva = draw.Between(100, 1500) * Math.Min(1, bus.NominalKv / 10);
        return PlantKit.Supply(Name("supply", elements.Count), bus.Name, mva, draw.Between(2, 25)) with
        {
            ShortCircuitMvaMin = mva * draw.Between(0.5, 1),
            VoltagePu = draw.Between(0.97, 1.04),
            AngleDeg = draw.Between(-10, 10),
            Background = draw.Chance(0.5) ? RandomSpectra.Background(draw) : null,
        };
    }

    public Generator Generator(Bus bus, double mva) => new()
    {
        Name = Name("generator", elements.Count),
        Location = PlantKit.Here,
        Bus = bus.Name,
        RatedMva = mva,
        RatedKv = bus.NominalKv * draw.Pick(1, 1.05),
        PMw = mva * draw.Between(0, 0.6),
        VoltagePu = draw.Between(0.98, 1.03),
        ReactancePu = draw.Between(0.12, 0.3),
        ResistancePu = draw.Pick(0, 0.005, 0.02),
    };

    public Line Line(string name, Bus a, Bus b, double ohm)
    {
        bool cable = draw.Chance(0.6);
        double reactance = cable ? draw.Between(0.07, 0.13) : draw.Between(0.3, 0.42);
        double resistance = reactance * draw.Between(0.2, 2);
        int circuits = draw.Pick(1, 1, 2, 3);
        double km = Math.Min(ohm * circuits / Math.Sqrt(reactance * reactance + resistance * resistance), 60);
        ResistanceLaw law = draw.Pick(
            ResistanceLaw.Cable, ResistanceLaw.Line, ResistanceLaw.Constant, ResistanceLaw.Bessel(resistance, 50), ResistanceLaw.SquareRoot);
        double capacitance = draw.Chance(0.2) ? 0 : cable ? draw.Between(150, 500) : draw.Between(8, 12);
        return PlantKit.Line(name, a.Name, b.Name, km, resistance, reactance, capacitance, law) with { Circuits = circuits, IsCable = cable };
    }

    /// <summary>Loads, machines, banks, filters and converters that the bus can bear.</summary>
    public void Furnish(Spot spot)
    {
        double mva = spot.StrengthMva * 0.02;
        if (draw.Chance(0.5))
        {
            elements.Add(Load(spot.Bus, mva * draw.Between(0.2, 1)));
        }

        if (draw.Chance(0.3))
        {
            elements.Add(Motor(spot.Bus, mva * draw.Between(0.2, 1)));
        }

        if (draw.Chance(0.4))
        {
            elements.Add(Bank(spot.Bus, mva * draw.Between(0.2, 1.5)));
        }

        if (draw.Chance(0.3))
        {
            elements.Add(Filter(spot.Bus, mva * draw.Between(0.2, 1)));
        }

        if (draw.Chance(0.45))
        {
            elements.Add(Converter(spot.Bus, mva * draw.Between(0.2, 1)));
        }

        if (!spot.Coupled.Append(spot).Any(s => s.HasGenerator) && draw.Chance(0.12))
        {
            spot.HasGenerator = true;
            elements.Add(Generator(spot.Bus, mva * draw.Between(0.5, 2)));
        }
    }

    /// <summary>Equipment on a bus without a source: some of it gives a path to ground.</summary>
    public void FurnishDead(Spot spot)
    {
        if (draw.Chance(0.5))
        {
            elements.Add(Load(spot.Bus, 0.2));
        }

        if (draw.Chance(0.3))
        {
            elements.Add(Bank(spot.Bus, 0.1));
        }

        if (draw.Chance(0.4))
        {
            elements.Add(Converter(spot.Bus, 0.2));
        }
    }

    private LinearLoad Load(Bus bus, double mva)
    {
        double angle = draw.Between(0.2, 0.8);
        LoadModel model = draw.Pick(LoadModel.Parallel, LoadModel.Series, LoadModel.Growing, LoadModel.Cigre, LoadModel.None);
        double kvar = mva * 1000 * Math.Sin(angle);
        return PlantKit.Load(Name("load", elements.Count), bus.Name, mva * 1000 * Math.Cos(angle), kvar, model) with
        {
            QKvar = model != LoadModel.Cigre && draw.Chance(0.15) ? -kvar / 4 : kvar,
            MotorSharePercent = draw.Chance(0.3) ? draw.Pick(20, 60, 100) : 0,
        };
    }

    private Motor Motor(Bus bus, double mva)
    {
        int count = draw.Pick(1, 1, 4);
        double efficiency = draw.Between(88, 97);
        double powerFactor = draw.Between(0.75, 0.93);
        return new Motor
        {
            Name = Name("motor", elements.Count),
            Location = PlantKit.Here,
            Bus = bus.Name,
            Count = count,
            RatedKv = bus.NominalKv * draw.Pick(1, 0.95),
            RatedKw = mva * 1000 / count * efficiency / 100 * powerFactor,
            EfficiencyPercent = efficiency,
            PowerFactor = powerFactor,
            LoadingPercent = draw.Pick(100, 70, 0),
            LockedRotorPu = draw.Between(4.5, 7.5),
            LockedRotorPowerFactor = draw.Between(0.1, 0.4),
        };
    }

    private CapacitorBank Bank(Bus bus, double mvar)
    {
        int steps = draw.Integer(1, 6);
        double detuning = draw.Chance(0.5) ? draw.Pick(5.67, 7, 14) : 0;
        return PlantKit.Bank(Name("bank", elements.Count), bus.Name, mvar * 1000, bus.NominalKv * draw.Pick(1, 1.1, 1.2)) with
        {
            Steps = steps,
            StepsIn = draw.Integer(0, steps),
            DetuningPercent = detuning,
            ReactorQ = detuning > 0 ? draw.Between(20, 80) : null,
            LossWPerKvar = draw.Pick(0, 0.2, 2),
            Connection = draw.Pick(Connection.Delta, Connection.Wye, Connection.WyeGrounded),
        };
    }

    private Filter Filter(Bus bus, double mvar)
    {
        FilterKind kind = draw.Pick(Enum.GetValues<FilterKind>());
        double tuned = draw.Pick(2.9, 4.85, 6.8, 10.7);
        double quality = kind is FilterKind.SingleTuned or FilterKind.DoubleTuned ? draw.Between(20, 100) : draw.Between(0.8, 8);
        double kv = bus.NominalKv * draw.Pick(1, 1.1);
        double kvar = mvar * 1000;

        // damping_ohm in place of a quality factor, on the kinds that have a damping resistor
        bool ohms = kind != FilterKind.SingleTuned && draw.Chance(0.4);
        double damping = kv * kv * 1000 / kvar * draw.Between(0.3, 3);
        return PlantKit.Filter(Name("filter", elements.Count), bus.Name, kind, kvar, kv, tuned, ohms && kind != FilterKind.DoubleTuned ? null : quality) with
        {
            SecondOrder = kind == FilterKind.DoubleTuned ? tuned + draw.Between(1.5, 6) : null,
            DampingOhm = ohms ? damping : null,
        };
    }

    private Converter Converter(Bus bus, double mva)
    {
        double powerFactor = draw.Between(0.75, 1);
        bool amperes = draw.Chance(0.4);
        return PlantKit.Converter(Name("converter", elements.Count), bus.Name, mva * 1000 * powerFactor, powerFactor, RandomSpectra.Converter(draw)) with
        {
            RatedKw = amperes ? null : mva * 1000 * powerFactor,
            RatedA = amperes ? mva * 1000 / (Math.Sqrt(3) * bus.NominalKv) : null,
            PhaseShiftDeg = draw.Pick(0, 0, 30, -15, 7.5),
            LoadingPercent = draw.Pick(100, 100, 60),
            Diversity = draw.Pick(1, 1, 0.8),
        };
    }
}
