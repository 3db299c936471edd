using HarmonicSweep.Network;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>The generator of random plants itself: what it never draws is never tested.</summary>
public sealed class RandomPlantTests
{
    private static readonly RandomPlant[] _grown = [.. Enumerable.Range(0, 160).Select(RandomPlant.Grow)];

    private static IEnumerable<T> All<T>()
        where T : PlantElement => _grown.SelectMany(g => g.Plant.Of<T>().Where(e => new PlantInState(g.Plant, OperatingState.Base).IsIn(e)));

    [Fact]
    public void Equal_seeds_grow_equal_plants_and_neighbouring_seeds_do_not()
    {
        Assert.Equal(Sizes(RandomPlant.Grow(7)), Sizes(RandomPlant.Grow(7)));
        Assert.NotEqual(Sizes(RandomPlant.Grow(7)), Sizes(RandomPlant.Grow(8)));
    }

    [Fact]
    public void Every_kind_and_model_is_drawn_often()
    {
        Assert.All(Enum.GetValues<LoadModel>(), m => Assert.True(All<LinearLoad>().Count(l => l.Model == m) > 10));
        Assert.All(Enum.GetValues<FilterKind>(), k => Assert.True(All<Filter>().Count(f => f.Kind == k) > 10));
        Assert.All(Enumerable.Range(0, 12), n => Assert.True(All<Transformer>().Count(t => t.Group.Clock == n) > 3));
        int[] counts =
        [
            All<LinearLoad>().Count(l => l.QKvar < 0), All<LinearLoad>().Count(l => l.MotorSharePercent > 0), All<Motor>().Count(),
            All<CapacitorBank>().Count(b => b.DetuningPercent > 0), All<CapacitorBank>().Count(b => b.StepsIn < b.Steps),
            All<CapacitorBank>().Count(b => b.LossWPerKvar > 0), All<Filter>().Count(f => f.DampingOhm is not null), All<Generator>().Count(),
            All<SeriesReactor>().Count(), All<Coupler>().Count(), All<Line>().Count(l => l.Circuits > 1), All<Line>().Count(l => l.CapacitanceNanofaradPerKm == 0),
            All<Line>().Count(l => l.LengthKm > 10), All<Transformer>().Count(t => t.NoLoadLossKw > 0), All<Transformer>().Count(t => t.TapPercent != 0),
            All<Supply>().Count(s => s.Background is not null), All<Converter>().Count(c => c.RatedA is not null), All<Converter>().Count(c => c.PhaseShiftDeg != 0),
            All<Converter>().Count(c => c.Diversity < 1), All<Converter>().Count(c => c.Spectrum.Lines.Any(l => l.Order != Math.Floor(l.Order))),
        ];
        Assert.All(counts, c => Assert.True(c > 10));
    }

    [Fact]
    public void Awkward_topologies_are_drawn()
    {
        int dead = 0;
        int open = 0;
        int generatorsAlone = 0;
        int merged = 0;
        foreach (RandomPlant grown in _grown)
        {
            PlantInState seen = new(grown.Plant, OperatingState.Base);
            TwinPowerFlow flow = TwinPowerFlow.Solve(seen);
            TwinMatrix matrix = new DenseTwin(seen).Matrix(5, -1);
            dead += grown.Plant.Buses.Any(b => !flow.IsLive(b.Name)) ? 1 : 0;
            open += grown.Plant.Buses.Any(b => !matrix.IsGrounded(b.Name)) ? 1 : 0;
            generatorsAlone += grown.Plant.Buses.Any(b => flow.IsLive(b.Name)) && flow.HoldsByGenerator ? 1 : 0;
            merged += matrix.Nodes.Count < grown.Plant.Buses.Count ? 1 : 0;
        }

        Assert.All((int[])[dead, open, generatorsAlone, merged], c => Assert.True(c > 10));
    }

    /// <summary>The other properties pass over plants without a plain fundamental: those must stay few in the ranges of seeds they use.</summary>
    [Theory]
    [InlineData(0, 160)]
    [InlineData(1000, 24)]
    [InlineData(2000, 24)]
    [InlineData(3000, 6)]
    [InlineData(4000, 10)]
    public void Most_plants_have_a_plain_fundamental(int first, int count)
    {
        int plain = Enumerable.Range(first, count).Count(seed => new DenseTwin(RandomPlant.Grow(seed).Plant).PowerFlow().IsPlain);
        Assert.InRange(plain, 0.9 * count, count);
    }

    private static IEnumerable<string> Sizes(RandomPlant grown) => grown.Plant.Elements.Select(e => e.ToString());
}
