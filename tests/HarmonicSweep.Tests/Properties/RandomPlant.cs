using HarmonicSweep.Network;
using HarmonicSweep.Tests.Twin;

namespace HarmonicSweep.Tests.Properties;

/// <summary>
/// Grows a plant from a seed: one to three islands (a supplied one, sometimes one on generators alone, sometimes a dead
/// one), three voltage levels, every kind of element, loops, couplers in loops, odd clock groups, long cables.
/// Sizes follow the strength of the place, so that the fundamental can be solved; whatever is awkward beyond that is wanted.
/// </summary>
internal sealed class RandomPlant
{
    private static readonly double[] _levelsKv = [33, 10, 0.69];
    private readonly RandomDraw _draw;
    private readonly List<Spot> _spots = [];
    private readonly List<PlantElement> _elements = [];
    private readonly RandomShunts _shunts;

    private RandomPlant(int seed)
    {
        Seed = seed;
        _draw = new RandomDraw(seed);
        _shunts = new RandomShunts(_draw, _elements);
    }

    /// <summary>Seed, to be named by every message of a failing test.</summary>
    public int Seed { get; }

    /// <summary>The plant.</summary>
    public Plant Plant { get; private set; } = null!;

    /// <summary>The plant as drawn and two states of it.</summary>
    public IReadOnlyList<OperatingState> States { get; private set; } = [];

    /// <summary>Grows the plant of a seed; equal seeds give equal plants.</summary>
    public static RandomPlant Grow(int seed)
    {
        RandomPlant grown = new(seed);
        grown.GrowIsland(grown._draw.Integer(2, 8), supplied: true);
        if (grown._draw.Chance(0.35))
        {
            grown.GrowIsland(grown._draw.Integer(1, 4), supplied: false);
        }

        if (grown._draw.Chance(0.35))
        {
            grown.GrowDeadIsland(grown._draw.Integer(1, 3));
        }

        double frequencyHz = grown._draw.Chance(0.7) ? 50 : grown._draw.Chance(0.7) ? 60 : 16.7;
        grown.Plant = new Plant(
            string.Create(System.Globalization.CultureInfo.InvariantCulture, $"random {seed}"), frequencyHz,
            grown._spots.Select(s => s.Bus), grown._elements);
        grown.States = [OperatingState.Base, RandomState.Draw("one", grown._draw, grown.Plant), RandomState.Draw("two", grown._draw, grown.Plant)];
        return grown;
    }

    private string Name(string kind) => RandomShunts.Name(kind, _elements.Count);

    private void GrowIsland(int buses, bool supplied)
    {
        int first = _spots.Count;
        double kv = supplied ? _draw.Pick(_levelsKv[0], _levelsKv[1]) : _draw.Pick(_levelsKv[1], _levelsKv[2]);
        Spot root = AddSpot(kv, clock: 0, strengthMva: 0);
        double angleDeg = 0;
        if (supplied)
        {
            Supply supply = _shunts.Supply(root.Bus);
            root.StrengthMva = Math.Min(supply.ShortCircuitMvaMin, supply.ShortCircuitMvaMax);
            angleDeg = supply.AngleDeg;
            _elements.Add(supply);
        }
        else
        {
            Generator generator = _shunts.Generator(root.Bus, _draw.Between(1, 8));
            root.StrengthMva = generator.RatedMva / generator.ReactancePu;
            root.HasGenerator = true;
            _elements.Add(generator);
        }

        while (_spots.Count < first + buses)
        {
            Extend(_draw.Pick(_spots.Skip(first).ToArray()));
        }

        List<Spot> island = [.. _spots.Skip(first)];
        AddChords(island);
        foreach (Spot spot in island)
        {
            _shunts.Furnish(spot);
        }

        if (supplied && _draw.Chance(0.3))
        {
            // a second in-feed on the other side: its EMF in step with the clock of its bus
            Spot spot = _draw.Pick(island.ToArray());
            _elements.Add(_shunts.Supply(spot.Bus) with { Name = Name("supply"), AngleDeg = angleDeg - 30 * spot.Clock + _draw.Between(-2, 2) });
        }
    }

    private void GrowDeadIsland(int buses)
    {
        int first = _spots.Count;
        AddSpot(_draw.Pick(_levelsKv), clock: 0, strengthMva: 5);
        while (_spots.Count < first + buses)
        {
            Extend(_draw.Pick(_spots.Skip(first).ToArray()));
        }

        if (_draw.Chance(0.6))
        {
            foreach (Spot spot in _spots.Skip(first))
            {
                _shunts.FurnishDead(spot);
            }
        }
    }

    private Spot AddSpot(double kv, int clock, double strengthMva)
    {
        Spot spot = new(PlantKit.Bus(RandomShunts.Name("bus", _spots.Count), kv), clock) { StrengthMva = strengthMva };
        _spots.Add(spot);
        return spot;
    }

    private void Extend(Spot from)
    {
        double kv = from.Bus.NominalKv;
        double[] lower = [.. _levelsKv.Where(l => l < kv)];
        double[] higher = [.. _levelsKv.Where(l => l > kv)];
        double choice = _draw.Between(0, 1);
        if (choice < 0.45 && lower.Length > 0)
        {
            int clock = _draw.Integer(0, 11);
            Spot to = AddSpot(_draw.Pick(lower), (from.Clock + clock) % 12, 0);
            AddTransformer(from, to, clock);
        }
        else if (choice < 0.52 && higher.Length > 0)
        {
            int clock = _draw.Integer(0, 11);
            Spot to = AddSpot(_draw.Pick(higher), (from.Clock + 12 - clock) % 12, 0);
            AddTransformer(to, from, clock);
        }
        else
        {
            AddLevelBranch(from, AddSpot(kv, from.Clock, 0));
        }
    }

    /// <summary>Loops: level branches and parallel transformers, only where the clocks agree.</summary>
    private void AddChords(List<Spot> island)
    {
        int wanted = _draw.Integer(0, 3);
        for (int i = 0; i < wanted && island.Count > 1; i++)
        {
            Spot a = _draw.Pick(island.ToArray());
            Spot b = _draw.Pick(island.ToArray());
            if (ReferenceEquals(a, b))
            {
                continue;
            }

            if (a.Bus.NominalKv == b.Bus.NominalKv)
            {
                if (a.Clock == b.Clock)
                {
                    AddLevelBranch(a, b);
                }
            }
            else
            {
                (Spot high, Spot low) = a.Bus.NominalKv > b.Bus.NominalKv ? (a, b) : (b, a);
                AddTransformer(high, low, (low.Clock - high.Clock + 12) % 12);
            }
        }
    }

    private void AddTransformer(Spot high, Spot low, int clock)
    {
        Spot strong = high.StrengthMva > 0 ? high : low;
        Spot weak = ReferenceEquals(strong, high) ? low : high;
        double mva = strong.StrengthMva * _draw.Between(0.02, 0.2);
        double percent = _draw.Between(4, 12);
        Winding[] windings = clock % 2 == 1
            ? _draw.Pick<Winding[]>([Winding.Delta, Winding.WyeNeutral], [Winding.Delta, Winding.Wye], [Winding.WyeNeutral, Winding.Delta])
            : _draw.Pick<Winding[]>([Winding.WyeNeutral, Winding.WyeNeutral], [Winding.Wye, Winding.Wye], [Winding.Delta, Winding.Delta]);
        double xOverR = _draw.Between(3, 30);
        bool hasNoLoad = _draw.Chance(0.4);
        double noLoadPercent = _draw.Between(0.2, 1.5);
        _elements.Add(new Transformer
        {
            Name = Name("transformer"),
            Location = PlantKit.Here,
            EndA = high.Bus.Name,
            EndB = low.Bus.Name,
            RatedMva = mva,
            HvKv = high.Bus.NominalKv * _draw.Pick(1, 1, 1.03),
            LvKv = low.Bus.NominalKv * _draw.Pick(1, 1, 1.05),
            ImpedancePercent = percent,
            ResistancePercent = percent / Math.Sqrt(1 + xOverR * xOverR),
            Group = new VectorGroup(windings[0], windings[1], clock),
            TapPercent = _draw.Pick(0, 0, -2.5, 5, 1.25),
            Law = _draw.Pick(ResistanceLaw.Constant, ResistanceLaw.SquareRoot, ResistanceLaw.Eddy(0.1), ResistanceLaw.Power(0.9, 0.1, 1.4)),
            NoLoadCurrentPercent = hasNoLoad ? noLoadPercent : 0,
            NoLoadLossKw = hasNoLoad && _draw.Chance(0.7) ? mva * 1000 * noLoadPercent / 100 * _draw.Between(0.1, 0.9) : 0,
        });
        weak.Strengthen(strong.StrengthMva, mva / (percent / 100));
    }

    private void AddLevelBranch(Spot a, Spot b)
    {
        Spot strong = a.StrengthMva > 0 ? a : b;
        Spot weak = ReferenceEquals(strong, a) ? b : a;
        double kv = a.Bus.NominalKv;

        // an impedance that costs 3 to 50 % of the strength of the place it starts from
        double ohm = kv * kv / strong.StrengthMva * _draw.Between(0.03, 0.5);
        double choice = _draw.Between(0, 1);
        if (choice < 0.2)
        {
            _elements.Add(PlantKit.Coupler(Name("coupler"), a.Bus.Name, b.Bus.Name, closed: _draw.Chance(0.85)));
            a.CoupleWith(b);
            weak.Strengthen(strong.StrengthMva, double.PositiveInfinity);
            return;
        }

        if (choice < 0.4)
        {
            _elements.Add(PlantKit.Reactor(Name("reactor"), a.Bus.Name, b.Bus.Name, ohm, _draw.Between(10, 120)) with
            {
                Law = _draw.Pick(ResistanceLaw.Constant, ResistanceLaw.SquareRoot),
            });
        }
        else
        {
            _elements.Add(_shunts.Line(Name("line"), a.Bus, b.Bus, ohm));
        }

        weak.Strengthen(strong.StrengthMva, kv * kv / ohm);
    }
}
