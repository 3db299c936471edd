using System.Globalization;
using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>
/// The distortion study against the twin on random plants: voltages, currents into every element at both ends, sums by the
/// four rules, THD, dead buses, dropped orders. Bound as for impedances (1e-10 and the rounding of the stamps), times h:
/// the power flow is solved to 1e-10 of the largest power, and harmonic angles carry h times the angle of I_1.
/// </summary>
public sealed class TwinDistortionTests
{
    private const double Relative = 1e-10;
    private const double Roundings = 64;

    public static TheoryData<int> Batches => [.. Enumerable.Range(0, 8)];

    [Theory]
    [MemberData(nameof(Batches))]
    public void Distortion_of_random_plants_agrees_with_the_twin(int batch)
    {
        int compared = 0;
        for (int seed = 14 * batch; seed < 14 * (batch + 1); seed++)
        {
            RandomPlant grown = RandomPlant.Grow(seed);
            foreach (OperatingState state in grown.States)
            {
                if (TwinPowerFlow.Solve(new PlantInState(grown.Plant, state)).IsPlain)
                {
                    compared++;
                    string label = string.Create(CultureInfo.InvariantCulture, $"seed {seed}, state {state.Name}");
                    DistortionComparison.Check(grown.Plant, state, ProductSide.Distortion(grown.Plant, state), label, Relative, Roundings);
                }
            }
        }

        // of 42 plant-states; the others have no plain solution at the fundamental
        Assert.InRange(compared, 36, 42);
    }
}
