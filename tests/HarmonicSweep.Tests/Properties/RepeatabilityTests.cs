using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>The number of threads changes no bit of a result.</summary>
public sealed class RepeatabilityTests
{
    public static TheoryData<int> Seeds => [.. Enumerable.Range(3000, 6)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Impedances_and_resonances_have_the_same_bits_on_any_number_of_threads(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        StateResult[] results = [.. ((int[])[1, 2, 5]).Select(threads => ImpedanceStudy.Run(
            Request(grown, threads), progress: null, CancellationToken.None).States[0])];
        foreach (StateResult other in results.Skip(1))
        {
            Assert.Equal(results[0].Impedance.SelectMany(c => c.Ohm).Select(Bits), other.Impedance.SelectMany(c => c.Ohm).Select(Bits));
            Assert.Equal(results[0].Resonances, other.Resonances);
        }
    }

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Distortion_has_the_same_bits_on_any_number_of_threads(int seed)
    {
        RandomPlant grown = RandomPlant.Grow(seed);
        StudyRequest request = Request(grown, 1) with
        {
            States = [.. grown.States.Where(s => TwinPowerFlow.Solve(new PlantInState(grown.Plant, s)).IsPlain)],
        };
        StudyResult one = DistortionStudy.Run(request, progress: null, CancellationToken.None);
        StudyResult three = DistortionStudy.Run(request with { Threads = 3 }, progress: null, CancellationToken.None);
        Assert.NotEmpty(one.States);
        Assert.Equal(one.States.SelectMany(s => s.Voltages), three.States.SelectMany(s => s.Voltages));
        Assert.Equal(one.States.SelectMany(s => s.Currents), three.States.SelectMany(s => s.Currents));
        Assert.Equal(one.States.SelectMany(s => s.Distortion), three.States.SelectMany(s => s.Distortion));
    }

    private static StudyRequest Request(RandomPlant grown, int threads) => ProductSide.Request(grown.Plant, threads: threads) with
    {
        Settings = new StudySettings { Sweep = new SweepRange(grown.Plant.FrequencyHz, 20 * grown.Plant.FrequencyHz, grown.Plant.FrequencyHz / 4) },
    };

    private static (long Real, long Imaginary)? Bits(Complex? z) =>
        z is { } value ? (BitConverter.DoubleToInt64Bits(value.Real), BitConverter.DoubleToInt64Bits(value.Imaginary)) : null;
}
