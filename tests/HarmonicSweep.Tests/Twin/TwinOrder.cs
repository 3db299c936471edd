namespace HarmonicSweep.Tests.Twin;

/// <summary>Orders and their sequence, from the conventions of the model alone.</summary>
internal static class TwinOrder
{
    /// <summary>An order within 1e-9 of an integer is that integer.</summary>
    public static double Snap(double order)
    {
        double nearest = Math.Round(order);
        return Math.Abs(order - nearest) <= 1e-9 ? nearest : order;
    }

    /// <summary>+1 positive, -1 negative, 0 zero sequence: h mod 3 = 1, 2, 0; a non-integer order is positive.</summary>
    public static int SequenceSign(double order)
    {
        double h = Snap(order);
        if (h != Math.Floor(h))
        {
            return 1;
        }

        return (int)(h % 3) switch { 1 => 1, 2 => -1, _ => 0 };
    }
}
