using System.Numerics;
using static System.FormattableString;

namespace HarmonicSweep.Network;

/// <summary>What the power flow specifies at a node.</summary>
internal enum NodeKind
{
    /// <summary>Active and reactive power.</summary>
    ConstantPower,

    /// <summary>Active power and voltage magnitude: a generator.</summary>
    HeldVoltage,

    /// <summary>Voltage: the reference machine of an island without supply.</summary>
    Reference,

    /// <summary>Nothing: not tied to a source in service.</summary>
    Dead,
}

/// <summary>Kinds, specified powers and held voltages of the nodes of a power flow; a row of its circuit is a node.</summary>
internal sealed class PowerFlowNodes
{
    private readonly Circuit _circuit;
    private readonly List<Generator>[] _generators;
    private readonly Generator?[] _reference;

    public PowerFlowNodes(Circuit circuit)
    {
        _circuit = circuit;
        int count = circuit.Nodes.Count;
        Kind = new NodeKind[count];
        Live = new bool[count];
        SpecifiedMva = new Complex[count];
        HeldPu = new double[count];
        _generators = new List<Generator>[count];
        _reference = new Generator?[count];
        for (int node = 0; node < count; node++)
        {
            _generators[node] = [];
        }

        ReadElements();
        ClassifyIslands();
    }

    /// <summary>Kind of each node.</summary>
    public NodeKind[] Kind { get; }

    /// <summary>Whether each node is tied to a source in service.</summary>
    public bool[] Live { get; }

    /// <summary>Specified injection of each node, MVA: generation less demand.</summary>
    public Complex[] SpecifiedMva { get; }

    /// <summary>Voltage held at each generator node, per unit.</summary>
    public double[] HeldPu { get; }

    /// <summary>Largest power of the case, MVA: the scale of the mismatch.</summary>
    public double LargestMva { get; private set; }

    /// <summary>Generators in service at a node.</summary>
    public IReadOnlyList<Generator> GeneratorsAt(int node) => _generators[node];

    /// <summary>Machine at a node that takes the active power left over; null at a node that is no reference.</summary>
    public Generator? Reference(int node) => _reference[node];

    /// <summary>Whether the machine is the reference of its island, so that its p_mw is not used.</summary>
    public bool IsReferenceMachine(Generator generator) =>
        ReferenceEquals(_reference[_circuit.Nodes[generator.Bus]], generator);

    /// <summary>The element that draws the largest power at a node; null when none does.</summary>
    public PlantElement? LargestLoadAt(int node) => _circuit.Plant.Plant.Elements
        .OfType<ShuntElement>()
        .Where(e => _circuit.Plant.IsIn(e) && _circuit.Nodes[e.Bus] == node && Demand.Of(e, _circuit.Plant) != Complex.Zero)
        .MaxBy(e => Complex.Abs(Demand.Of(e, _circuit.Plant)));

    private void ReadElements()
    {
        foreach (PlantElement element in _circuit.Plant.Plant.Elements)
        {
            if (element is not ShuntElement shunt || !_circuit.Plant.IsIn(element))
            {
                continue;
            }

            int node = _circuit.Nodes[shunt.Bus];
            Complex demand = Demand.Of(element, _circuit.Plant);
            SpecifiedMva[node] -= demand;
            LargestMva = Math.Max(LargestMva, Complex.Abs(demand));
            if (element is Generator generator)
            {
                AddGenerator(generator, node);
            }
        }
    }

    private void AddGenerator(Generator generator, int node)
    {
        if (_generators[node] is [var first, ..] && first.VoltagePu != generator.VoltagePu)
        {
            throw new CaseException([new Finding(
                Severity.Error, "HS202", generator.Location.At("voltage_pu"),
                Invariant($"state {_circuit.Plant.State.Name}: generators {first.Name} and {generator.Name} hold one node at {first.VoltagePu} and {generator.VoltagePu} pu; expected the same voltage_pu."),
                "give both the same voltage_pu, or open the coupler between them.")]);
        }

        _generators[node].Add(generator);
        HeldPu[node] = generator.VoltagePu;
        LargestMva = Math.Max(LargestMva, Math.Abs(generator.PMw));
    }

    private void ClassifyIslands()
    {
        var islands = new DisjointSets(_circuit.Nodes.Count);
        foreach (CircuitBranch branch in _circuit.Branches)
        {
            islands.Join(branch.NodeA, branch.NodeB);
        }

        var supplied = new HashSet<int>(_circuit.Shunts.Where(s => s.Element is Supply).Select(s => islands.Find(s.Node)));
        var largest = new Dictionary<int, Generator>();
        foreach (Generator generator in _generators.SelectMany(g => g))
        {
            int island = islands.Find(_circuit.Nodes[generator.Bus]);
            if (!largest.TryGetValue(island, out Generator? sofar) || Precedes(generator, sofar))
            {
                largest[island] = generator;
            }
        }

        foreach ((int island, Generator generator) in largest)
        {
            if (!supplied.Contains(island))
            {
                _reference[_circuit.Nodes[generator.Bus]] = generator;
            }
        }

        for (int node = 0; node < Kind.Length; node++)
        {
            int island = islands.Find(node);
            Live[node] = supplied.Contains(island) || largest.ContainsKey(island);
            Kind[node] = !Live[node] ? NodeKind.Dead
                : _reference[node] is not null ? NodeKind.Reference
                : _generators[node].Count > 0 ? NodeKind.HeldVoltage
                : NodeKind.ConstantPower;
            foreach (Generator generator in _generators[node])
            {
                if (!ReferenceEquals(generator, _reference[node]))
                {
                    SpecifiedMva[node] += generator.PMw;
                }
            }
        }
    }

    /// <summary>Larger rating first; of equals the one that stands first in the table.</summary>
    private static bool Precedes(Generator candidate, Generator sofar) => candidate.RatedMva > sofar.RatedMva
        || (candidate.RatedMva == sofar.RatedMva && candidate.Location.Line < sofar.Location.Line);
}
