namespace HarmonicSweep.Network;

/// <summary>Sequence whose network is seen.</summary>
public enum Sequence
{
    /// <summary>Positive sequence: orders 3k+1 and non-integers.</summary>
    Positive,

    /// <summary>Negative sequence: orders 3k+2.</summary>
    Negative,

    /// <summary>Zero sequence: orders 3k.</summary>
    Zero,
}

/// <summary>Orders: which integer one is, and its sequence in a balanced system.</summary>
public static class HarmonicOrder
{
    /// <summary>An order this close to an integer is that integer.</summary>
    public const double IntegerTolerance = 1e-9;

    /// <summary>The order, made exactly an integer when it is one within <see cref="IntegerTolerance"/>.</summary>
    public static double Snap(double order) =>
        Math.Abs(order - Math.Round(order)) <= IntegerTolerance ? Math.Round(order) : order;

    /// <summary>Whether the order is an integer within <see cref="IntegerTolerance"/>.</summary>
    public static bool IsInteger(double order) => Snap(order) == Math.Round(order);

    /// <summary>h mod 3 = 1 positive, 2 negative, 0 zero; a non-integer order is positive.</summary>
    public static Sequence SequenceOf(double order) => !IsInteger(order)
        ? Sequence.Positive
        : (int)(Math.Round(order) % 3) switch
        {
            1 => Sequence.Positive,
            2 => Sequence.Negative,
            _ => Sequence.Zero,
        };
}
