using System.Globalization;
using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Resonances of the study against |Z(h)| of the twin on random plants, both ways: none missed, none invented, each refined.</summary>
public sealed class ResonanceTests
{
    private const int Points = 2500;
    private const double Last = 40;

    public static TheoryData<int> Seeds => [.. Enumerable.Range(4000, 10)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Resonances_are_the_extrema_of_the_impedance(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        DenseTwin twin = new(grown.Plant);
        if (!twin.PowerFlow().IsPlain)
        {
            return;
        }

        string bus = grown.Plant.Buses[1].Name;
        StudyRequest request = ProductSide.Request(grown.Plant) with
        {
            Buses = [bus],
            Settings = new StudySettings { Sweep = new SweepRange(grown.Plant.FrequencyHz, Last * grown.Plant.FrequencyHz, grown.Plant.FrequencyHz) },
        };
        IReadOnlyList<Resonance> found = ImpedanceStudy.Run(request, progress: null, CancellationToken.None).States[0].Resonances;
        double LogZ(double h) => Math.Log(twin.Impedance(bus, bus, h)!.Value.Magnitude);
        if (twin.Impedance(bus, bus, 2) is null)
        {
            Assert.Empty(found);
            return;
        }

        foreach (Resonance resonance in found)
        {
            Refined(seed, twin, bus, resonance);
        }

        // every extremum of a fine grid that stands out by 0.02 in ln|Z| on both sides must be listed
        double[] order = [.. Enumerable.Range(0, Points).Select(i => Math.Pow(Last, (i + 0.3) / Points))];
        double[] log = [.. order.Select(LogZ)];
        foreach ((int index, bool peak) in Extrema(log))
        {
            double near = found.Where(r => r.Kind == ResonanceKind.Parallel == peak).Select(r => Math.Abs(r.Order / order[index] - 1)).DefaultIfEmpty(1).Min();
            Assert.True(near < 2 * Math.Log(Last) / Points, string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {bus}: nothing listed at h = {order[index]}, peak {peak}"));
        }
    }

    /// <summary>
    /// At the listed order ln|Z| must lie above (below) its values a little to each side, which brackets the extremum; 3e-6 of the order aside,
    /// since it is promised to 1e-6 and a difference must rise above rounding. Height and quality factor: 1e-6, differences of the twin's own.
    /// </summary>
    private static void Refined(int seed, DenseTwin twin, string bus, Resonance resonance)
    {
        string where = string.Create(CultureInfo.InvariantCulture, $"seed {seed}, {resonance}");
        double h = resonance.Order;
        Complex At(double order) => twin.Impedance(bus, bus, order)!.Value;
        Assert.True(Math.Abs(At(h).Magnitude - resonance.Ohm) <= 1e-9 * resonance.Ohm, where);
        double sign = resonance.Kind == ResonanceKind.Parallel ? 1 : -1;
        double slopeBelow = sign * (Math.Log(At(h).Magnitude) - Math.Log(At(h * (1 - 1e-4)).Magnitude));
        double slopeAbove = sign * (Math.Log(At(h).Magnitude) - Math.Log(At(h * (1 + 1e-4)).Magnitude));
        Assert.True(slopeBelow > 0 && slopeAbove > 0, where);

        // a parabola through the three points has its vertex within 2e-6 of the order (third derivatives included at 1e-4)
        double vertex = 0.5e-4 * (slopeBelow - slopeAbove) / (slopeBelow + slopeAbove);
        Assert.True(Math.Abs(vertex) <= 3e-6, where);
        double turn = (At(h * (1 + 1e-6)) / At(h * (1 - 1e-6))).Phase / (2e-6 * h);
        Assert.Equal(h / 2 * Math.Abs(turn), resonance.QualityFactor, 1e-4 * resonance.QualityFactor + 1e-6);
    }

    private static IEnumerable<(int Index, bool Peak)> Extrema(double[] log)
    {
        List<int> turns = [.. Enumerable.Range(1, log.Length - 2).Where(i => (log[i] - log[i - 1]) * (log[i + 1] - log[i]) < 0)];
        for (int n = 0; n < turns.Count; n++)
        {
            double before = Math.Abs(log[turns[n]] - log[n == 0 ? 0 : turns[n - 1]]);
            double after = Math.Abs(log[turns[n]] - log[n == turns.Count - 1 ? ^1 : turns[n + 1]]);
            if (Math.Min(before, after) > 0.02)
            {
                yield return (turns[n], log[turns[n]] > log[turns[n] - 1]);
            }
        }
    }
}
