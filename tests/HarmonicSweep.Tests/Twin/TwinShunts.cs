using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>
/// Admittance of each shunt at an order, siemens per phase, written from the model text formula by formula.
/// Volts and volt-amperes throughout; kV^2/MVA = V^2/VA, so ohms come out either way.
/// </summary>
internal static class TwinShunts
{
    private static readonly Complex J = Complex.ImaginaryOne;

    /// <summary>Machines and short-circuit impedances: sqrt h, not below order 1.</summary>
    private static double SquareRootLaw(double h) => Math.Sqrt(Math.Max(h, 1));

    public static Complex SupplyImpedance(PlantInState state, Supply supply, double h)
    {
        double kv = state.Plant.Bus(supply.Bus).NominalKv;
        double magnitude = kv * kv / state.ShortCircuitMva(supply);
        double r1 = magnitude / Math.Sqrt(1 + supply.XOverR * supply.XOverR);
        double x1 = r1 * supply.XOverR;
        return r1 + J * h * x1;
    }

    public static Complex Generator(Generator generator, double h)
    {
        double baseOhm = generator.RatedKv * generator.RatedKv / generator.RatedMva;
        return 1 / (baseOhm * (generator.ResistancePu * SquareRootLaw(h) + J * h * generator.ReactancePu));
    }

    public static Complex Motor(Motor motor, double h)
    {
        double ratedMva = motor.Count * motor.RatedKw / 1000 / (motor.EfficiencyPercent / 100 * motor.PowerFactor);
        return LockedRotor(motor.RatedKv, ratedMva, motor.LockedRotorPu, motor.LockedRotorPowerFactor, h);
    }

    /// <summary>Null where the load is open to harmonics.</summary>
    public static Complex? Load(PlantInState state, LinearLoad load, double h)
    {
        double kv = state.Plant.Bus(load.Bus).NominalKv;
        double scale = state.LoadingPercent(load) / 100;
        double p = load.PKw / 1000 * scale;
        double q = load.QKvar / 1000 * scale;
        if (load.Model == LoadModel.None || (p == 0 && q == 0))
        {
            return null;
        }

        double share = load.MotorSharePercent / 100;
        Complex y = Complex.Zero;
        if (share > 0)
        {
            y += LockedRotor(kv, share * Math.Sqrt(p * p + q * q), 6, 0.2, h);
        }

        if (share < 1)
        {
            y += Static(load.Model, kv * kv, (1 - share) * p, (1 - share) * q, h);
        }

        return y;
    }

    public static Complex Bank(PlantInState state, CapacitorBank bank, double h)
    {
        double mvar = bank.RatedKvar / 1000 * state.StepsIn(bank) / bank.Steps;
        double xc = bank.RatedKv * bank.RatedKv / mvar;
        double xl = bank.DetuningPercent / 100 * xc;
        double r = bank.LossWPerKvar / 1000 * xc + (xl > 0 ? xl / bank.ReactorQ!.Value : 0);
        return 1 / (r + J * (h * xl - xc / h));
    }

    public static Complex Filter(Filter filter, double h)
    {
        double xc = filter.RatedKv * filter.RatedKv / (filter.RatedKvar / 1000);
        double tuned = filter.TunedOrder;
        double Damping() => filter.DampingOhm ?? filter.QualityFactor!.Value * xc / tuned;
        Complex capacitor = -J * xc / h;
        switch (filter.Kind)
        {
            case FilterKind.SingleTuned:
                {
                    double xl = xc / (tuned * tuned);
                    return 1 / (xc / (tuned * filter.QualityFactor!.Value) + J * (h * xl - xc / h));
                }

            case FilterKind.HighPass2:
                {
                    double xl = xc / (tuned * tuned);
                    return 1 / (capacitor + 1 / (1 / Damping() + 1 / (J * h * xl)));
                }

            case FilterKind.HighPass3:
                {
                    double xl = xc / (tuned * tuned);
                    return 1 / (capacitor + 1 / (1 / (J * h * xl) + 1 / (Damping() - J * xc / h)));
                }

            case FilterKind.CType:
                {
                    double xl = xc / (tuned * tuned - 1);
                    Complex arm = J * xl * (h - 1 / h);
                    return 1 / (capacitor + arm * Damping() / (arm + Damping()));
                }

            default:
                return 1 / DoubleTuned(filter, xc, h);
        }
    }

    /// <summary>Drawn at h = 1, volt-amperes of three phases.</summary>
    public static Complex ConstantPower(PlantInState state, ShuntElement element)
    {
        double scale = state.LoadingPercent(element) / 100;
        switch (element)
        {
            case LinearLoad load:
                return 1000 * scale * new Complex(load.PKw, load.QKvar);
            case Motor motor:
                {
                    double s = motor.Count * motor.RatedKw / (motor.EfficiencyPercent / 100 * motor.PowerFactor);
                    return 1000 * scale * AtPowerFactor(s, motor.PowerFactor);
                }

            case Converter converter:
                {
                    double kv = state.Plant.Bus(converter.Bus).NominalKv;
                    double s = converter.RatedKw is { } kw ? kw / converter.PowerFactor : Math.Sqrt(3) * kv * converter.RatedA!.Value;
                    return 1000 * scale * AtPowerFactor(s, converter.PowerFactor);
                }

            default:
                throw new ArgumentException($"{element.Name} draws no constant power.", nameof(element));
        }
    }

    private static Complex AtPowerFactor(double apparent, double powerFactor) =>
        new(apparent * powerFactor, apparent * Math.Sqrt(1 - powerFactor * powerFactor));

    private static Complex LockedRotor(double ratedKv, double ratedMva, double lockedRotorPu, double lockedRotorPf, double h)
    {
        double magnitude = ratedKv * ratedKv / ratedMva / lockedRotorPu;
        double r = magnitude * lockedRotorPf;
        double x = Math.Sqrt(magnitude * magnitude - r * r);
        return 1 / (r * SquareRootLaw(h) + J * h * x);
    }

    private static Complex Static(LoadModel model, double v2, double p, double q, double h)
    {
        // the reactive part of a capacitive load is a capacitor: its reactance falls with h
        double reactanceGrowth = q >= 0 ? h : 1 / h;
        Complex parallel = p / v2 - J * q / (reactanceGrowth * v2);
        switch (model)
        {
            case LoadModel.Parallel:
                return parallel;
            case LoadModel.Growing:
                return (0.1 * h + 0.9) * parallel;
            case LoadModel.Series:
                {
                    Complex atFundamental = v2 / new Complex(p, -q);
                    return 1 / new Complex(atFundamental.Real, atFundamental.Imaginary * reactanceGrowth);
                }

            case LoadModel.Cigre:
                {
                    double r = v2 / p;
                    double xs = 0.073 * r;
                    double xp = r / (6.7 * q / p - 0.74);
                    return 1 / (r + J * h * xs) + 1 / (J * h * xp);
                }

            default:
                throw new ArgumentOutOfRangeException(nameof(model));
        }
    }

    private static Complex DoubleTuned(Filter filter, double xc, double h)
    {
        double a2 = filter.TunedOrder * filter.TunedOrder;
        double b2 = filter.SecondOrder!.Value * filter.SecondOrder.Value;
        double d2 = (b2 - a2) * (b2 - a2);
        double xl1 = 2 * xc / (a2 + b2);
        double xl2 = xc * d2 / (2 * a2 * b2 * (a2 + b2));
        double xc2 = xc * d2 / ((a2 + b2) * (a2 + b2));
        double Resistance(double xl) => filter.QualityFactor is { } quality ? filter.TunedOrder * xl / quality : 0;
        Complex y = 1 / (Resistance(xl2) + J * h * xl2) + 1 / (-J * xc2 / h);
        if (filter.DampingOhm is { } damping)
        {
            y += 1 / damping;
        }

        return -J * xc / h + Resistance(xl1) + J * h * xl1 + 1 / y;
    }
}
