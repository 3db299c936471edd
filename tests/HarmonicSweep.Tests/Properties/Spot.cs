using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Properties;

/// <summary>A bus while a random plant grows: how strong it is there and how far its voltage is turned.</summary>
/// <param name="bus">The bus.</param>
/// <param name="clock">Sum of the clock numbers on the way from the root, modulo 12.</param>
internal sealed class Spot(Bus bus, int clock)
{
    public Bus Bus { get; } = bus;

    public int Clock { get; } = clock;

    /// <summary>Rough short-circuit power, MVA; 0 while the bus hangs in the air.</summary>
    public double StrengthMva { get; set; }

    /// <summary>Buses that couplers may join with this one, itself included: at most one of them gets a generator.</summary>
    public List<Spot> Coupled { get; private set; } = [];

    public bool HasGenerator { get; set; }

    /// <summary>Notes that a coupler may join the two.</summary>
    public void CoupleWith(Spot other)
    {
        List<Spot> all = [.. Coupled.Append(this).Union(other.Coupled.Append(other))];
        all.ForEach(s => s.Coupled = all);
    }

    /// <summary>Fed through a branch of so many MVA of short-circuit power from a place of so many.</summary>
    public void Strengthen(double fromMva, double throughMva)
    {
        if (StrengthMva == 0)
        {
            StrengthMva = 1 / (1 / fromMva + 1 / throughMva);
        }
    }
}
