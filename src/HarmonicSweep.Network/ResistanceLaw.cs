using System.Numerics;
using MathNet.Numerics;
using MathNet.Numerics.RootFinding;

namespace HarmonicSweep.Network;

/// <summary>
/// How a resistance grows with frequency: R(h) = R1 k(h), taken literally (no division by k(1)), in the power flow as well.
/// </summary>
public abstract record ResistanceLaw
{
    /// <summary>k(h) = 1.</summary>
    public static ResistanceLaw Constant { get; } = new ConstantLaw();

    /// <summary>k(h) = sqrt(h), h not below 1: common practice for machines and short-circuit impedances.</summary>
    public static ResistanceLaw SquareRoot { get; } = new SquareRootLaw();

    /// <summary>
    /// k(h) = 1 + 0.646 h^2/(192 + 0.518 h^2), h not below 1: overhead lines, Arrillaga and Watson,
    /// Power System Harmonics, 2nd ed. (from memory). k(1) = 1.00336.
    /// </summary>
    public static ResistanceLaw Line { get; } = new LineLaw();

    /// <summary>
    /// k(h) = max(1, 0.187 + 0.532 sqrt(h)): cables, the same work (from memory; printed for h of 2.35 and above,
    /// the maximum keeps it continuous).
    /// </summary>
    public static ResistanceLaw Cable { get; } = new CableLaw();

    /// <summary>k(h) = (1 - e) + e h^2, h not below 1: winding eddy loss grows with h^2, IEEE C57.110.</summary>
    /// <param name="eddyLossPu">e, share of the winding loss at the fundamental, 0 to 1.</param>
    public static ResistanceLaw Eddy(double eddyLossPu) => new EddyLaw(eddyLossPu);

    /// <summary>k(h) = a + b h^c, h not below 1: general form for transformers, Funk and Hantel (from memory).</summary>
    public static ResistanceLaw Power(double a, double b, double c) => new PowerLaw(a, b, c);

    /// <summary>
    /// Skin effect of a solid round conductor (textbook): R(h)/R_dc = Re((x/2) I0(x)/I1(x)),
    /// x = sqrt(j 2 h f1 mu0/R_dc'), with R_dc' in ohm per metre such that R at h = 1 is the given resistance.
    /// </summary>
    /// <param name="resistanceOhmPerKm">Resistance at the fundamental, ohm per kilometre, above 0.</param>
    /// <param name="fundamentalHz">Fundamental frequency, hertz.</param>
    public static ResistanceLaw Bessel(double resistanceOhmPerKm, double fundamentalHz) =>
        BesselLaw.Create(resistanceOhmPerKm, fundamentalHz);

    /// <summary>k(h), dimensionless, for an order above 0.</summary>
    public abstract double Factor(double order);

    private sealed record ConstantLaw : ResistanceLaw
    {
        public override double Factor(double order) => 1;
    }

    private sealed record SquareRootLaw : ResistanceLaw
    {
        public override double Factor(double order) => Math.Sqrt(Math.Max(order, 1));
    }

    private sealed record LineLaw : ResistanceLaw
    {
        public override double Factor(double order)
        {
            double h2 = Math.Max(order, 1) * Math.Max(order, 1);
            return 1 + 0.646 * h2 / (192 + 0.518 * h2);
        }
    }

    private sealed record CableLaw : ResistanceLaw
    {
        public override double Factor(double order) => Math.Max(1, 0.187 + 0.532 * Math.Sqrt(Math.Max(order, 1)));
    }

    private sealed record EddyLaw(double EddyLossPu) : ResistanceLaw
    {
        public override double Factor(double order)
        {
            double h = Math.Max(order, 1);
            return 1 - EddyLossPu + EddyLossPu * h * h;
        }
    }

    private sealed record PowerLaw(double A, double B, double C) : ResistanceLaw
    {
        public override double Factor(double order) => A + B * Math.Pow(Math.Max(order, 1), C);
    }

    private sealed record BesselLaw(double DirectCurrentOhmPerMetre, double AtFundamental, double FundamentalHz) : ResistanceLaw
    {
        private const double Mu0 = 4e-7 * Math.PI;

        public static BesselLaw Create(double resistanceOhmPerKm, double fundamentalHz)
        {
            double target = resistanceOhmPerKm / 1000;
            // skin effect only raises R, so R_dc lies at or below R(1); R(h=1) rises with R_dc
            double lower = target;
            while (lower * Ratio(lower, 1, fundamentalHz) > target)
            {
                lower /= 2;
            }

            double dc = lower == target
                ? target
                : Brent.FindRoot(r => r * Ratio(r, 1, fundamentalHz) / target - 1, lower, target, 1e-15, 200);
            return new BesselLaw(dc, target, fundamentalHz);
        }

        public override double Factor(double order) =>
            DirectCurrentOhmPerMetre * Ratio(DirectCurrentOhmPerMetre, order, FundamentalHz) / AtFundamental;

        private static double Ratio(double directCurrentOhmPerMetre, double order, double fundamentalHz)
        {
            Complex x = Complex.Sqrt(new Complex(0, 2 * order * fundamentalHz * Mu0 / directCurrentOhmPerMetre));
            // the scaled pair: the factor exp(-|Re x|) cancels and nothing overflows
            return (x / 2 * SpecialFunctions.BesselIScaled(0, x) / SpecialFunctions.BesselIScaled(1, x)).Real;
        }
    }
}
