namespace HarmonicSweep.Cases.Reading;

/// <summary>
/// The sizes a quantity of a plant can have in its unit. The bound is wide beyond any plant, and narrow enough that squares and
/// products of such numbers neither overflow nor vanish.
/// </summary>
internal static class NumberSize
{
    /// <summary>The bound, for messages.</summary>
    public const string Words = "from 1e-12 to 1e12";

    /// <summary>Whether the number is 0 or of such a size.</summary>
    public static bool Fits(double value) => value == 0 || Math.Abs(value) is >= 1e-12 and <= 1e12;

    /// <summary>Whether a number too small to be held was read as 0, as 1e-400 is.</summary>
    public static bool Vanished(string cell, double value)
    {
        int exponent = cell.IndexOfAny(['e', 'E']);
        return value == 0 && cell.AsSpan(0, exponent < 0 ? cell.Length : exponent).IndexOfAnyInRange('1', '9') >= 0;
    }
}
