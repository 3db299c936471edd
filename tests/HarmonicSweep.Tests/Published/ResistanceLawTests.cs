using System.Numerics;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>Resistance laws against the formulas written out here and against the skin-effect table of a solid round conductor.</summary>
public sealed class ResistanceLawTests
{
    private const double Mu0 = 4e-7 * Math.PI;

    public static TheoryData<double> Orders => [0.2, 1, 2, 2.35, 5, 17.5, 50];

    [Theory]
    [MemberData(nameof(Orders))]
    public void Laws_follow_their_formulas_literally_and_stop_at_the_fundamental(double order)
    {
        double h = Math.Max(order, 1);
        Assert.Equal(1, ResistanceLaw.Constant.Factor(order));
        Assert.Equal(Math.Sqrt(h), ResistanceLaw.SquareRoot.Factor(order), 1e-14);

        // Arrillaga and Watson, Power System Harmonics, 2nd ed.: value from memory
        Assert.Equal(1 + 0.646 * h * h / (192 + 0.518 * h * h), ResistanceLaw.Line.Factor(order), 1e-14);
        Assert.Equal(Math.Max(1, 0.187 + 0.532 * Math.Sqrt(h)), ResistanceLaw.Cable.Factor(order), 1e-14);

        // IEEE C57.110: the eddy part grows with h^2; Funk and Hantel: general form, from memory
        Assert.Equal(0.85 + 0.15 * h * h, ResistanceLaw.Eddy(0.15).Factor(order), 1e-12 * h * h);
        Assert.Equal(0.9 + 0.1 * Math.Pow(h, 1.5), ResistanceLaw.Power(0.9, 0.1, 1.5).Factor(order), 1e-12 * h * h);
    }

    [Fact]
    public void Line_law_is_taken_literally_at_the_fundamental()
    {
        // 1 + 0.646/192.518 = 1.003355...: k(1) is not divided out
        Assert.Equal(1.00336, ResistanceLaw.Line.Factor(1), 5);
    }

    /// <summary>
    /// R/R_dc of a solid round conductor at x = a sqrt(omega mu sigma), exact Bessel values, printed to 5 decimals; they agree with the
    /// handbook table as remembered (1.00519, 1.0782, 1.3181, 2.0430, 3.7992: value from memory). With x = 1 at the fundamental, x = sqrt h.
    /// Tolerance 1e-5: half a printed unit in each of two table values, and their ratio.
    /// </summary>
    [Theory]
    [InlineData(0.5, 1.00033)]
    [InlineData(1, 1.00519)]
    [InlineData(1.5, 1.02582)]
    [InlineData(2, 1.07816)]
    [InlineData(2.5, 1.17538)]
    [InlineData(3, 1.31809)]
    [InlineData(3.5, 1.49202)]
    [InlineData(4, 1.67787)]
    [InlineData(5, 2.04273)]
    [InlineData(6, 2.39359)]
    [InlineData(8, 3.09445)]
    [InlineData(10, 3.79858)]
    public void Bessel_law_follows_the_skin_effect_table(double x, double ratio)
    {
        const double frequencyHz = 50;
        const double directOhmPerMetre = 2 * frequencyHz * Mu0;
        ResistanceLaw law = ResistanceLaw.Bessel(1000 * directOhmPerMetre * 1.00519, frequencyHz);
        Assert.Equal(ratio / 1.00519, law.Factor(x * x), 1e-5 * ratio);
    }

    /// <summary>The same law against the power series of I0 and I1 summed here; 1e-10 leaves room for cancellation of the series at |x| = 10.</summary>
    [Theory]
    [InlineData(0.3)]
    [InlineData(1)]
    [InlineData(7)]
    [InlineData(50)]
    public void Bessel_law_follows_the_power_series(double order)
    {
        const double frequencyHz = 60;
        const double directOhmPerMetre = 0.0754e-3;
        double atFundamental = directOhmPerMetre * Ratio(directOhmPerMetre, frequencyHz);
        ResistanceLaw law = ResistanceLaw.Bessel(1000 * atFundamental, frequencyHz);
        Assert.Equal(directOhmPerMetre * Ratio(directOhmPerMetre, order * frequencyHz) / atFundamental, law.Factor(order), 1e-10);
        Assert.Equal(1, law.Factor(1), 1e-12);
    }

    private static double Ratio(double directOhmPerMetre, double hertz)
    {
        Complex x = Complex.Sqrt(new Complex(0, 2 * hertz * Mu0 / directOhmPerMetre));
        return (x / 2 * Series(x, 0) / Series(x, 1)).Real;
    }

    /// <summary>I_n(x) = sum over k of (x/2)^(2k+n)/(k! (k+n)!).</summary>
    private static Complex Series(Complex x, int n)
    {
        Complex term = n == 0 ? Complex.One : x / 2;
        Complex sum = term;
        for (int k = 1; k < 80; k++)
        {
            term *= x * x / 4 / (k * (k + n));
            sum += term;
        }

        return sum;
    }
}
