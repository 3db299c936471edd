using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// A linear load seen by harmonics: its motor share as a lumped motor (6 pu locked-rotor current, power factor 0.2), the
/// rest by its model. A capacitive reactive part is a capacitor.
/// </summary>
/// <remarks>
/// parallel and series: IEEE Task Force on harmonics modeling 1996 (from memory); growing: Arrillaga et al. (from memory);
/// cigre: CIGRE WG 36-05, 1981 (from memory).
/// </remarks>
public sealed class LoadLaw : ShuntLaw
{
    private readonly LoadModel _model;
    private readonly double _activeMw;
    private readonly double _reactiveMvar;
    private readonly double _kv2;
    private readonly ImpedanceToGround? _motor;

    /// <summary>Creates the law of a load at nominal bus voltage, kV, and a loading, percent.</summary>
    public LoadLaw(LinearLoad load, double nominalKv, double loadingPercent)
    {
        double scale = loadingPercent / 100 / 1000;
        double share = load.MotorSharePercent / 100;
        _model = load.Model;
        _kv2 = nominalKv * nominalKv;
        _activeMw = load.PKw * scale * (1 - share);
        _reactiveMvar = load.QKvar * scale * (1 - share);
        double motorMva = share * scale * Math.Sqrt(load.PKw * load.PKw + load.QKvar * load.QKvar);
        if (motorMva > 0 && _model != LoadModel.None)
        {
            _motor = MotorLaw.Create(_kv2 / motorMva, lockedRotorPu: 6, lockedRotorPowerFactor: 0.2);
        }
    }

    /// <inheritdoc/>
    public override Complex Admittance(double order) =>
        Static(order) + (_motor?.Admittance(order) ?? Complex.Zero);

    /// <inheritdoc/>
    public override double InductiveQuality(double order)
    {
        Complex admittance = Static(order);
        double quality = admittance.Imaginary < 0 ? -admittance.Imaginary / admittance.Real : 0;
        return Math.Max(quality, _motor?.InductiveQuality(order) ?? 0);
    }

    private Complex Static(double order) => _model switch
    {
        _ when _activeMw == 0 && _reactiveMvar == 0 => Complex.Zero,
        LoadModel.Parallel => Parallel(order),
        LoadModel.Growing => (0.1 * order + 0.9) * Parallel(order),
        LoadModel.Series => 1 / SeriesImpedance(order),
        LoadModel.Cigre => 1 / Cigre(order),
        _ => Complex.Zero,
    };

    private Complex Parallel(double order) => new(
        _activeMw / _kv2,
        _reactiveMvar >= 0 ? -_reactiveMvar / (order * _kv2) : -_reactiveMvar * order / _kv2);

    private Complex SeriesImpedance(double order)
    {
        Complex z = _kv2 / new Complex(_activeMw, -_reactiveMvar);
        return new Complex(z.Real, z.Imaginary >= 0 ? order * z.Imaginary : z.Imaginary / order);
    }

    private Complex Cigre(double order)
    {
        double r = _kv2 / _activeMw;
        double parallel = r / (6.7 * _reactiveMvar / _activeMw - 0.74);
        var series = new Complex(r, order * 0.073 * r);
        var coil = new Complex(0, order * parallel);
        return series * coil / (series + coil);
    }
}

/// <summary>Induction motor by its locked rotor: Z(h) = R_LR sqrt(h) + j h X_LR (common practice).</summary>
public static class MotorLaw
{
    /// <summary>Creates the law of a motor or a group.</summary>
    public static ImpedanceToGround Create(Motor motor) =>
        Create(motor.RatedKv * motor.RatedKv / motor.RatedMva, motor.LockedRotorPu, motor.LockedRotorPowerFactor);

    /// <summary>Creates the law from V_rated^2/S_rated, ohm, and the locked-rotor data.</summary>
    public static ImpedanceToGround Create(double baseOhm, double lockedRotorPu, double lockedRotorPowerFactor)
    {
        double z = baseOhm / lockedRotorPu;
        double r = z * lockedRotorPowerFactor;
        return new ImpedanceToGround(new SeriesImpedance(r, Math.Sqrt(z * z - r * r), ResistanceLaw.SquareRoot));
    }
}
