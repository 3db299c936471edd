using System.Globalization;
using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>Driving-point and transfer impedances of the study against the dense twin on random plants, both sequences, all pairs of buses.</summary>
public sealed class TwinAgreementTests
{
    private static readonly double[] _orders = [0.4, 1, 2, 3, 4.7, 5, 6.999, 7, 11.3, 25, 49];

    public static TheoryData<int> Batches => [.. Enumerable.Range(0, 8)];

    [Theory]
    [MemberData(nameof(Batches))]
    public void Impedance_of_random_plants_agrees_with_the_twin(int batch)
    {
        foreach (RandomPlant grown in Plants(batch, 6))
        {
            // the study solves the power flow of a state before it scans, and gives up where that has no solution
            foreach (OperatingState state in grown.States.Where(s => TwinPowerFlow.Solve(new PlantInState(grown.Plant, s)).IsPlain))
            {
                foreach (Sequence sequence in (Sequence[])[Sequence.Positive, Sequence.Negative])
                {
                    CompareImpedance(grown, state, sequence);
                }
            }
        }
    }

    private static void CompareImpedance(RandomPlant grown, OperatingState state, Sequence sequence)
    {
        DenseTwin twin = new(grown.Plant, state);
        TwinMatrix[] matrices = [.. _orders.Select(h => twin.Matrix(h, sequence == Sequence.Positive ? 1 : -1))];
        foreach (Bus from in grown.Plant.Buses)
        {
            Dictionary<string, IReadOnlyList<Complex?>> column = ProductSide.Column(grown.Plant, state, from.Name, sequence, _orders);
            foreach (Bus at in grown.Plant.Buses)
            {
                for (int i = 0; i < _orders.Length; i++)
                {
                    string label = string.Create(CultureInfo.InvariantCulture, $"seed {grown.Seed}, state {state.Name}, {sequence}, h = {_orders[i]}");
                    ImpedanceComparison.Check(matrices[i], at.Name, from.Name, column[at.Name][i], label);
                }
            }
        }
    }

    private static IEnumerable<RandomPlant> Plants(int batch, int count) =>
        Enumerable.Range(batch * count, count).Select(RandomPlant.Grow);
}
