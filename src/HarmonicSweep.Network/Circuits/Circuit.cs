using System.Numerics;
using HarmonicSweep.Numerics;

namespace HarmonicSweep.Network;

/// <summary>Which elements make up a circuit.</summary>
public enum CircuitScope
{
    /// <summary>Z(h): sources shorted, loads and motors by their models.</summary>
    Harmonic,

    /// <summary>The power-flow network: loads, motors and generators are powers, not admittances.</summary>
    PowerFlow,

    /// <summary>Supplies and generators through series impedances alone.</summary>
    ShortCircuit,

    /// <summary>Supplies through series impedances alone.</summary>
    SupplyShortCircuit,
}

/// <summary>An element between two nodes with its law.</summary>
/// <param name="Element">Element of the plant.</param>
/// <param name="NodeA">Node of end A.</param>
/// <param name="NodeB">Node of end B.</param>
/// <param name="Law">Admittances against order.</param>
public sealed record CircuitBranch(BranchElement Element, int NodeA, int NodeB, BranchLaw Law);

/// <summary>An element (or the no-load branch of one) from a node to ground with its law.</summary>
/// <param name="Element">Element of the plant.</param>
/// <param name="ReportedName">Name under which its current is reported.</param>
/// <param name="Bus">Bus it stands at.</param>
/// <param name="Node">Node of that bus.</param>
/// <param name="Law">Admittance against order.</param>
public sealed record CircuitShunt(PlantElement Element, string ReportedName, string Bus, int Node, ShuntLaw Law);

/// <summary>
/// A plant in a state seen in a sequence frame: nodes, sparsity pattern and laws. Immutable; safe to share between threads.
/// </summary>
/// <remarks>
/// The matrix is in per unit so that voltage levels weigh alike: voltage in units of the nominal voltage of the node,
/// admittance y_ij = Y_ij kV_i kV_j in MVA, current in MVA (three-phase, at nominal voltage). A node without a path to ground
/// has no row: it is open. The power-flow scope keeps a row for every node, since generators there are no admittances.
/// </remarks>
public sealed class Circuit
{
    private readonly int[] _rowOfNode;
    private readonly double[] _kvOfNode;
    private readonly int[] _nodeOfRow;
    private readonly CircuitBranch[] _branches;
    private readonly CircuitShunt[] _shunts;
    private readonly BranchStamp[] _branchStamps;
    private readonly ShuntStamp[] _shuntStamps;

    private Circuit(PlantInState plant, NodeMap nodes, Sequence sequence, CircuitBranch[] branches, CircuitShunt[] shunts, bool keepOpen)
    {
        Plant = plant;
        Nodes = nodes;
        Sequence = sequence;
        _branches = branches;
        _shunts = shunts;
        _kvOfNode = new double[nodes.Count];
        for (int node = 0; node < nodes.Count; node++)
        {
            _kvOfNode[node] = plant.Plant.Bus(nodes.BusesOf(node)[0]).NominalKv;
        }

        _rowOfNode = RowsOfNodes(nodes.Count, branches, shunts, keepOpen, out _nodeOfRow);
        Pattern = new SparsityPattern(
            _nodeOfRow.Length, branches.Where(b => RowOf(b.NodeA) >= 0).Select(b => (RowOf(b.NodeA), RowOf(b.NodeB))));
        Analysis = SparseAnalysis.Of(Pattern);
        _branchStamps = [.. branches.Select(LocateStamp)];
        _shuntStamps = [.. shunts.Select(LocateStamp)];
    }

    /// <summary>The same circuit with the laws of another sequence: nodes, pattern and analysis are shared.</summary>
    private Circuit(Circuit other, Sequence sequence, CircuitBranch[] branches)
    {
        Plant = other.Plant;
        Nodes = other.Nodes;
        Sequence = sequence;
        Pattern = other.Pattern;
        Analysis = other.Analysis;
        _branches = branches;
        _shunts = other._shunts;
        _kvOfNode = other._kvOfNode;
        _rowOfNode = other._rowOfNode;
        _nodeOfRow = other._nodeOfRow;
        _branchStamps = other._branchStamps;
        _shuntStamps = other._shuntStamps;
    }

    /// <summary>Plant and state.</summary>
    public PlantInState Plant { get; }

    /// <summary>Buses merged into nodes.</summary>
    public NodeMap Nodes { get; }

    /// <summary>Sequence frame: positive or negative.</summary>
    public Sequence Sequence { get; }

    /// <summary>Elements between two nodes, in plant order.</summary>
    public IReadOnlyList<CircuitBranch> Branches => _branches;

    /// <summary>Elements to ground, in plant order.</summary>
    public IReadOnlyList<CircuitShunt> Shunts => _shunts;

    /// <summary>Pattern of the nodal matrix over the nodes with a path to ground.</summary>
    public SparsityPattern Pattern { get; }

    /// <summary>Analysis of that pattern, shared by all solvers.</summary>
    public SparseAnalysis Analysis { get; }

    /// <summary>Node of each matrix row.</summary>
    public IReadOnlyList<int> NodeOfRow => _nodeOfRow;

    /// <summary>Builds the circuit of a plant in a state.</summary>
    /// <param name="plant">Plant and state.</param>
    /// <param name="scope">Which elements.</param>
    /// <param name="sequence">Positive or negative.</param>
    /// <exception cref="ArgumentOutOfRangeException">The sequence is zero.</exception>
    /// <exception cref="CaseException">A source has no impedance.</exception>
    public static Circuit Build(PlantInState plant, CircuitScope scope, Sequence sequence = Sequence.Positive)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(sequence, Sequence.Zero);
        var nodes = new NodeMap(plant);
        var laws = new LawBook(plant, scope, sequence);
        var branches = new List<CircuitBranch>();
        var shunts = new List<CircuitShunt>();
        foreach (PlantElement element in plant.Plant.Elements)
        {
            if (!plant.IsIn(element))
            {
                continue;
            }

            if (element is BranchElement branch && laws.BranchLawOf(branch) is { } law)
            {
                branches.Add(new CircuitBranch(branch, nodes[branch.EndA], nodes[branch.EndB], law));
            }

            if (laws.ShuntLawOf(element) is { } shunt)
            {
                string bus = element.Terminals[0];
                string name = element is Transformer transformer ? transformer.NoLoadName : element.Name;
                shunts.Add(new CircuitShunt(element, name, bus, nodes[bus], shunt));
            }
        }

        return new Circuit(plant, nodes, sequence, [.. branches], [.. shunts], keepOpen: scope == CircuitScope.PowerFlow);
    }

    /// <summary>
    /// The same circuit in the other sequence. Positive and negative sequence differ in the phase shift of transformers alone.
    /// </summary>
    /// <exception cref="ArgumentOutOfRangeException">The sequence is zero.</exception>
    public Circuit InSequence(Sequence sequence)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(sequence, Sequence.Zero);
        return sequence == Sequence ? this : new Circuit(this, sequence, [.. _branches.Select(b => b.Element is Transformer transformer
            ? b with { Law = new TransformerLaw(transformer, Plant.TapPercent(transformer), sequence) }
            : b)]);
    }

    /// <summary>Matrix row of a node; -1 when the node is open.</summary>
    public int RowOf(int node) => _rowOfNode[node];

    /// <summary>Matrix row of a bus; -1 when it is open.</summary>
    public int RowOf(string bus) => _rowOfNode[Nodes[bus]];

    /// <summary>Nominal voltage of a node, kV.</summary>
    public double NominalKv(int node) => _kvOfNode[node];

    /// <summary>A row's buses as one name for messages, for example <c>BUS A = BUS B</c>.</summary>
    public string NameOfRow(int row) => string.Join(" = ", Nodes.BusesOf(NodeOfRow[row]));

    /// <summary>Writes the nodal matrix at an order, per unit, into the values of the pattern.</summary>
    public void Stamp(double order, Span<Complex> values)
    {
        values.Clear();
        for (int i = 0; i < _branchStamps.Length; i++)
        {
            ref readonly BranchStamp stamp = ref _branchStamps[i];
            if (stamp.AA < 0)
            {
                continue;
            }

            TwoPort y = _branches[i].Law.Admittance(order);
            values[stamp.AA] += y.AA * stamp.ScaleAA;
            values[stamp.AB] += y.AB * stamp.ScaleAB;
            values[stamp.BA] += y.BA * stamp.ScaleAB;
            values[stamp.BB] += y.BB * stamp.ScaleBB;
        }

        for (int i = 0; i < _shuntStamps.Length; i++)
        {
            values[_shuntStamps[i].Diagonal] += _shunts[i].Law.Admittance(order) * _shuntStamps[i].Scale;
        }
    }

    private BranchStamp LocateStamp(CircuitBranch branch)
    {
        int a = RowOf(branch.NodeA);
        int b = RowOf(branch.NodeB);
        double kvA = _kvOfNode[branch.NodeA];
        double kvB = _kvOfNode[branch.NodeB];
        return a < 0
            ? new BranchStamp(-1, -1, -1, -1, 0, 0, 0)
            : new BranchStamp(
                Pattern.IndexOf(a, a), Pattern.IndexOf(a, b), Pattern.IndexOf(b, a), Pattern.IndexOf(b, b), kvA * kvA, kvA * kvB, kvB * kvB);
    }

    private ShuntStamp LocateStamp(CircuitShunt shunt) =>
        new(Pattern.Diagonal[RowOf(shunt.Node)], _kvOfNode[shunt.Node] * _kvOfNode[shunt.Node]);

    /// <summary>Row of every node that is connected to an element that reaches ground; -1 for the others.</summary>
    private static int[] RowsOfNodes(
        int nodeCount, CircuitBranch[] branches, CircuitShunt[] shunts, bool keepOpen, out int[] nodeOfRow)
    {
        var islands = new DisjointSets(nodeCount);
        foreach (CircuitBranch branch in branches)
        {
            islands.Join(branch.NodeA, branch.NodeB);
        }

        bool[] grounded = new bool[nodeCount];
        foreach (CircuitShunt shunt in shunts)
        {
            grounded[islands.Find(shunt.Node)] = true;
        }

        foreach (CircuitBranch branch in branches)
        {
            grounded[islands.Find(branch.NodeA)] |= branch.Law.ReachesGround;
        }

        int[] rows = new int[nodeCount];
        var nodes = new List<int>(nodeCount);
        for (int node = 0; node < nodeCount; node++)
        {
            rows[node] = -1;
            if (keepOpen || grounded[islands.Find(node)])
            {
                rows[node] = nodes.Count;
                nodes.Add(node);
            }
        }

        nodeOfRow = [.. nodes];
        return rows;
    }

    /// <summary>Where a branch goes in the values of the pattern, and what turns siemens into per unit there; AA = -1 for an open branch.</summary>
    private readonly record struct BranchStamp(int AA, int AB, int BA, int BB, double ScaleAA, double ScaleAB, double ScaleBB);

    /// <summary>Where a shunt goes, and what turns siemens into per unit there.</summary>
    private readonly record struct ShuntStamp(int Diagonal, double Scale);
}
