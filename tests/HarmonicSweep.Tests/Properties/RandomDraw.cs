namespace HarmonicSweep.Tests.Properties;

/// <summary>Seeded draws. The generator is our own (splitmix64), so that a seed means the same plant on every runtime.</summary>
internal sealed class RandomDraw(int seed)
{
    // mixed once, or neighbouring seeds would be one stream shifted by a draw
    private ulong _state = Mix(unchecked((ulong)seed * 0xD1342543DE82EF95UL + 0x2545F4914F6CDD1DUL));

    /// <summary>Uniform in [from, to).</summary>
    public double Between(double from, double to) => from + (to - from) * (Next() >> 11) * (1.0 / (1UL << 53));

    /// <summary>Uniform integer from..to, both included.</summary>
    public int Integer(int from, int to) => from + (int)(Next() % (ulong)(to - from + 1));

    /// <summary>True with the probability.</summary>
    public bool Chance(double probability) => Between(0, 1) < probability;

    /// <summary>One of the choices.</summary>
    public T Pick<T>(params T[] choices) => choices[Integer(0, choices.Length - 1)];

    private ulong Next()
    {
        _state = unchecked(_state + 0x9E3779B97F4A7C15UL);
        return Mix(_state);
    }

    private static ulong Mix(ulong z)
    {
        z = unchecked((z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL);
        z = unchecked((z ^ (z >> 27)) * 0x94D049BB133111EBUL);
        return z ^ (z >> 31);
    }
}
