using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// Capacitor bank: Z = R_loss + X_L/q + j(h X_L - X_C/h), X_L = p X_C, R_loss = loss X_C (textbook), X_C of the steps in service.
/// </summary>
public sealed class BankLaw : ShuntLaw
{
    private readonly double _capacitiveOhm;
    private readonly double _coilOhm;
    private readonly double _resistanceOhm;

    /// <summary>Creates the law of a bank with so many steps in, 1 or more.</summary>
    public BankLaw(CapacitorBank bank, int stepsIn)
    {
        _capacitiveOhm = bank.CapacitiveReactanceOhm(stepsIn);
        _coilOhm = bank.DetuningPercent / 100 * _capacitiveOhm;
        _resistanceOhm = bank.LossWPerKvar / 1000 * _capacitiveOhm + (_coilOhm > 0 ? _coilOhm / bank.ReactorQ!.Value : 0);
    }

    /// <inheritdoc/>
    public override Complex Admittance(double order) =>
        1 / new Complex(_resistanceOhm, order * _coilOhm - _capacitiveOhm / order);

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => _coilOhm > 0 ? order * _coilOhm / _resistanceOhm : 0;
}

/// <summary>Passive filters; the circuits and formulas are the textbook ones, stated beside each kind.</summary>
public sealed class FilterLaw : ShuntLaw
{
    private readonly Filter _filter;
    private readonly double _capacitiveOhm;
    private readonly double _coilOhm;
    private readonly double _dampingOhm;

    /// <summary>Creates the law of a filter.</summary>
    public FilterLaw(Filter filter)
    {
        _filter = filter;
        _capacitiveOhm = filter.CapacitiveReactanceOhm;
        double tuned2 = filter.TunedOrder * filter.TunedOrder;
        _coilOhm = _capacitiveOhm / (filter.Kind == FilterKind.CType ? tuned2 - 1 : tuned2);
        _dampingOhm = filter.DampingOhm ?? (filter.QualityFactor ?? 0) * _capacitiveOhm / filter.TunedOrder;
    }

    /// <inheritdoc/>
    public override Complex Admittance(double order) => 1 / Impedance(order);

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => _filter.Kind switch
    {
        FilterKind.SingleTuned => order * _coilOhm / SeriesResistanceOhm,
        FilterKind.DoubleTuned => order / _filter.TunedOrder * (_filter.QualityFactor ?? double.PositiveInfinity),
        _ => _dampingOhm / (order * _coilOhm),
    };

    /// <summary>R of the coil of a single-tuned filter: X_C/(h_t Q).</summary>
    private double SeriesResistanceOhm => _capacitiveOhm / (_filter.TunedOrder * _filter.QualityFactor!.Value);

    private Complex Impedance(double order)
    {
        var capacitor = new Complex(0, -_capacitiveOhm / order);
        var coil = new Complex(0, order * _coilOhm);
        return _filter.Kind switch
        {
            // X_C/(h_t Q) + j(h X_L - X_C/h), X_L = X_C/h_t^2
            FilterKind.SingleTuned => SeriesResistanceOhm + coil + capacitor,
            // -j X_C/h + R_d parallel to j h X_L
            FilterKind.HighPass2 => capacitor + Parallel(_dampingOhm, coil),
            // -j X_C/h + j h X_L parallel to (R_d - j X_C/h)
            FilterKind.HighPass3 => capacitor + Parallel(coil, _dampingOhm + capacitor),
            // -j X_C/h + A parallel to R_d, A = j X_L (h - 1/h), X_L = X_C2 = X_C/(h_t^2 - 1)
            FilterKind.CType => capacitor + Parallel(new Complex(0, _coilOhm * (order - 1 / order)), _dampingOhm),
            _ => DoubleTuned(order, capacitor),
        };
    }

    /// <summary>
    /// Two equal arms at orders a and b in one circuit: X_L1 = 2 X_C/(a^2+b^2), X_L2 = X_C (b^2-a^2)^2/(2 a^2 b^2 (a^2+b^2)),
    /// X_C2 = X_C (b^2-a^2)^2/(a^2+b^2)^2, R_i = a X_Li/Q in series with each coil, the damping resistor across the parallel part.
    /// </summary>
    private Complex DoubleTuned(double order, Complex capacitor)
    {
        double a2 = _filter.TunedOrder * _filter.TunedOrder;
        double b2 = _filter.SecondOrder!.Value * _filter.SecondOrder.Value;
        double difference2 = (b2 - a2) * (b2 - a2);
        double first = 2 * _capacitiveOhm / (a2 + b2);
        double second = _capacitiveOhm * difference2 / (2 * a2 * b2 * (a2 + b2));
        double parallelCapacitor = _capacitiveOhm * difference2 / ((a2 + b2) * (a2 + b2));
        double perReactance = _filter.QualityFactor is { } q ? _filter.TunedOrder / q : 0;
        Complex tank = Parallel(
            new Complex(perReactance * second, order * second), new Complex(0, -parallelCapacitor / order));
        return capacitor + new Complex(perReactance * first, order * first)
            + (_filter.DampingOhm is { } damping ? Parallel(tank, damping) : tank);
    }

    /// <summary>ab/(a+b), written so that a = 0 gives 0.</summary>
    private static Complex Parallel(Complex a, Complex b) => a * b / (a + b);
}
