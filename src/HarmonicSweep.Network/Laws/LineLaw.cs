using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>
/// Exact equivalent pi of a line with distributed parameters (textbook, telegrapher's equations):
/// Zs = Zc sinh(g l), Yp/2 = tanh(g l/2)/Zc, Zc = sqrt(z'/y'), g = sqrt(z' y'); z' = r' k(h) + j h x', y' = j h w1 c'.
/// Without capacitance Zs = z' l. Circuits in parallel multiply every admittance.
/// </summary>
public sealed class LineLaw : BranchLaw
{
    private readonly SeriesImpedance _perKm;
    private readonly double _susceptancePerKm;
    private readonly double _lengthKm;
    private readonly int _circuits;

    /// <summary>Creates the law of a cable or line at a fundamental frequency in hertz.</summary>
    public LineLaw(Line line, double fundamentalHz)
    {
        _perKm = new SeriesImpedance(line.ResistanceOhmPerKm, line.ReactanceOhmPerKm, line.Law);
        _susceptancePerKm = 2 * Math.PI * fundamentalHz * line.CapacitanceNanofaradPerKm * 1e-9;
        _lengthKm = line.LengthKm;
        _circuits = line.Circuits;
    }

    /// <inheritdoc/>
    public override bool ReachesGround => _susceptancePerKm > 0;

    /// <inheritdoc/>
    public override TwoPort Admittance(double order)
    {
        Complex z = _perKm.At(order);
        if (_susceptancePerKm == 0)
        {
            return TwoPort.Series(_circuits / (z * _lengthKm));
        }

        var y = new Complex(0, order * _susceptancePerKm);
        // sinh(x)/x and tanh(x/2)/(x/2) are even in x: the branch of the square root does not matter
        Complex x = Complex.Sqrt(z * y) * _lengthKm;
        (Complex sinh, Complex tanh) = Ratios(x);
        Complex series = _circuits / (z * _lengthKm * sinh);
        Complex halfShunt = _circuits * (_lengthKm / 2) * y * tanh;
        return new TwoPort(series + halfShunt, -series, -series, series + halfShunt);
    }

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => _perKm.Quality(order);

    /// <summary>
    /// sinh(x)/x and tanh(x/2)/(x/2), from one exponential; by their series where x is small, since the quotients would lose
    /// digits there.
    /// </summary>
    private static (Complex SinhOverX, Complex TanhOverHalfX) Ratios(Complex x)
    {
        Complex x2 = x * x;
        if (x2.Real * x2.Real + x2.Imaginary * x2.Imaginary < 1e-6)
        {
            // the terms left out are below 1e-15 for |x| < 0.032
            Complex half2 = x2 / 4;
            return (
                1 + x2 / 6 * (1 + x2 / 20 * (1 + x2 / 42)),
                1 - half2 / 3 * (1 - half2 * (2.0 / 5) * (1 - half2 * (17.0 / 42))));
        }

        Complex exponential = Complex.Exp(x);
        return ((exponential - 1 / exponential) / (2 * x), (exponential - 1) * 2 / ((exponential + 1) * x));
    }
}
