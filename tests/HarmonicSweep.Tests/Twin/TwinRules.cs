using System.Numerics;

namespace HarmonicSweep.Tests.Twin;

/// <summary>The four ways to add contributions of several sources.</summary>
internal static class TwinRules
{
    public static double Phasor(double order, Complex[] parts) => parts.Aggregate(Complex.Zero, (sum, p) => sum + p).Magnitude;

    public static double Arithmetic(double order, Complex[] parts) => parts.Sum(p => p.Magnitude);

    public static double Rss(double order, Complex[] parts) => Power(2, parts);

    /// <summary>Exponent 1 below order 5, 1.4 from 5 to 10, 2 above (IEC TR 61000-3-6, from memory).</summary>
    public static double Iec(double order, Complex[] parts) => Power(order < 5 ? 1 : order <= 10 ? 1.4 : 2, parts);

    private static double Power(double exponent, Complex[] parts) =>
        Math.Pow(parts.Sum(p => Math.Pow(p.Magnitude, exponent)), 1 / exponent);
}
