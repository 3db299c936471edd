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
        Complex series = _circuits / (z * _lengthKm * SinhOver(x));
        Complex halfShunt = _circuits * y * (_lengthKm / 2) * TanhOver(x / 2);
        return new TwoPort(series + halfShunt, -series, -series, series + halfShunt);
    }

    /// <inheritdoc/>
    public override double InductiveQuality(double order) => _perKm.Quality(order);

    /// <summary>sinh(x)/x; by its series where x is small, since the quotient would lose digits.</summary>
    private static Complex SinhOver(Complex x)
    {
        if (Complex.Abs(x) < 0.02)
        {
            Complex x2 = x * x;
            return 1 + x2 / 6 * (1 + x2 / 20 * (1 + x2 / 42));
        }

        return Complex.Sinh(x) / x;
    }

    /// <summary>tanh(x)/x; by its series where x is small.</summary>
    private static Complex TanhOver(Complex x)
    {
        if (Complex.Abs(x) < 0.02)
        {
            Complex x2 = x * x;
            return 1 - x2 / 3 * (1 - x2 * 2 / 5 * (1 - x2 * 17 / 42));
        }

        return Complex.Tanh(x) / x;
    }
}
