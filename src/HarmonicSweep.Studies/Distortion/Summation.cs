using System.Numerics;

namespace HarmonicSweep.Studies;

/// <summary>
/// Sums of contributions of several sources: with their angles, by magnitude, by squares, or by the exponents of
/// IEC TR 61000-3-6 (from memory): (sum |V_i|^a)^(1/a), a = 1 below order 5, 1.4 from 5 to 10, 2 above.
/// </summary>
public static class Summation
{
    /// <summary>Exponent of IEC TR 61000-3-6 at an order.</summary>
    public static double IecExponent(double order) => order < 5 ? 1 : order <= 10 ? 1.4 : 2;

    /// <summary>Magnitude of the sum under each rule; zeros for no contribution.</summary>
    public static RuleValues Of(ReadOnlySpan<Complex> contributions, double order)
    {
        Complex phasor = Complex.Zero;
        double arithmetic = 0;
        double squares = 0;
        double powers = 0;
        double exponent = IecExponent(order);
        foreach (Complex contribution in contributions)
        {
            double magnitude = Complex.Abs(contribution);
            phasor += contribution;
            arithmetic += magnitude;
            squares += magnitude * magnitude;
            powers += Math.Pow(magnitude, exponent);
        }

        return new RuleValues(Complex.Abs(phasor), arithmetic, Math.Sqrt(squares), Math.Pow(powers, 1 / exponent));
    }

    /// <summary>Phasor sum.</summary>
    public static Complex Phasor(ReadOnlySpan<Complex> contributions)
    {
        Complex sum = Complex.Zero;
        foreach (Complex contribution in contributions)
        {
            sum += contribution;
        }

        return sum;
    }

    /// <summary>The same value under every rule: the fundamental, which has one source only.</summary>
    public static RuleValues Single(double value) => new(value, value, value, value);

    /// <summary>Root of the sum of squares over orders, rule by rule.</summary>
    public static RuleValues RootSumSquares(IEnumerable<RuleValues> values)
    {
        double phasor = 0;
        double arithmetic = 0;
        double rss = 0;
        double iec = 0;
        foreach (RuleValues v in values)
        {
            phasor += v.Phasor * v.Phasor;
            arithmetic += v.Arithmetic * v.Arithmetic;
            rss += v.Rss * v.Rss;
            iec += v.Iec * v.Iec;
        }

        return new RuleValues(Math.Sqrt(phasor), Math.Sqrt(arithmetic), Math.Sqrt(rss), Math.Sqrt(iec));
    }
}
