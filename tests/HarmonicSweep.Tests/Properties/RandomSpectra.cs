using HarmonicSweep.Network;
using HarmonicSweep.Tests.Twin;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Draws spectra: characteristic orders, triplens that must be dropped, and orders between the integers.</summary>
internal static class RandomSpectra
{
    public static Spectrum Converter(RandomDraw draw)
    {
        List<(double, double, double)> lines = [(1, 100, draw.Pick(0, 0, 25.0))];
        lines.AddRange(Lines(draw, [2, 3, 5, 7, 9, 11, 13, 17, 19, 23, 25, 49], [0.37, 2.4, 4.63, 12.5], scale: 25));
        return PlantKit.Spectrum("converter", lines.OrderBy(l => l.Item1));
    }

    public static Spectrum Background(RandomDraw draw)
    {
        List<(double, double, double)> lines = [.. Lines(draw, [3, 5, 7, 11, 13, 53], [3.21], scale: 2)];
        if (draw.Chance(0.4))
        {
            lines.Add((1, 100, draw.Between(-40, 40)));
        }

        return PlantKit.Spectrum("background", lines.OrderBy(l => l.Item1));
    }

    private static IEnumerable<(double, double, double)> Lines(RandomDraw draw, double[] integers, double[] between, double scale)
    {
        foreach (double order in integers)
        {
            if (draw.Chance(0.55))
            {
                yield return (order, scale / order * draw.Between(0.3, 1.2), draw.Between(-180, 180));
            }
        }

        foreach (double order in between)
        {
            if (draw.Chance(0.15))
            {
                yield return (order, scale / 10 * draw.Between(0.2, 1), draw.Between(-180, 180));
            }
        }
    }
}
