using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// Short-circuit impedance on the low-voltage side of an ideal ratio a = (hv/lv)(1 + tap/100) with the phase shift of the
/// vector group: I_h = y/a^2 V_h - (y/a) e^(+j th) V_l; I_l = -(y/a) e^(-j th) V_h + y V_l; th = 30 n degrees, reversed in
/// negative sequence (textbook).
/// </summary>
public sealed class TransformerLaw : BranchLaw
{
    private readonly SeriesImpedance _impedance;
    private readonly double _inverseRatio;
    private readonly Complex _shiftOverRatio;

    /// <summary>Creates the law of a transformer at a tap, percent.</summary>
    public TransformerLaw(Transformer transformer, double tapPercent, Sequence sequence)
    {
        _impedance = new SeriesImpedance(transformer.ResistanceOhm, transformer.ReactanceOhm, transformer.Law);
        _inverseRatio = 1 / (transformer.HvKv / transformer.LvKv * (1 + tapPercent / 100));
        double degrees = 30 * transformer.Group.Clock * (sequence == Sequence.Negative ? -1 : 1);
        _shiftOverRatio = Angle.Phasor(degrees) * _inverseRatio;
    }

    /// <inheritdoc/>
    public override TwoPort Admittance(double order)
    {
        Complex y = 1 / _impedance.At(order);
        return new TwoPort(
            y * (_inverseRatio * _inverseRatio), -y * _shiftOverRatio, -y * Complex.Conjugate(_shiftOverRatio), y);
    }

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => _impedance.Quality(order);
}

/// <summary>
/// No-load branch at the high-voltage bus: G = P0/hv_kv^2, B = -sqrt(S0^2 - P0^2)/(h hv_kv^2) (textbook).
/// </summary>
public sealed class NoLoadLaw : ShuntLaw
{
    private readonly double _conductance;
    private readonly double _susceptance;

    /// <summary>Creates the law of a transformer's no-load branch.</summary>
    public NoLoadLaw(Transformer transformer)
    {
        double lossMw = transformer.NoLoadLossKw / 1000;
        double apparentMva = transformer.NoLoadCurrentPercent / 100 * transformer.RatedMva;
        double kv2 = transformer.HvKv * transformer.HvKv;
        _conductance = lossMw / kv2;
        _susceptance = Math.Sqrt(Math.Max(apparentMva * apparentMva - lossMw * lossMw, 0)) / kv2;
    }

    /// <inheritdoc/>
    public override Complex Admittance(double order) => new(_conductance, -_susceptance / order);

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => _susceptance / order / _conductance;
}
