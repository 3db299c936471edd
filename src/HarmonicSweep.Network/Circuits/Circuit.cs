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
    private readonly (int AA, int AB, int BA, int BB, double Scale)[] _branchStamps;

    private Circuit(
        PlantInState plant, NodeMap nodes, Sequence sequence, List<CircuitBranch> branches, List<CircuitShunt> shunts, bool keepOpen)
    {
        Plant = plant;
        Nodes = nodes;
        Sequence = sequence;
        Branches = branches;
        Shunts = shunts;
        _kvOfNode = new double[nodes.Count];
        for (int node = 0; node < nodes.Count; node++)
        {
            _kvOfNode[node] = plant.Plant.Bus(nodes.BusesOf(node)[0]).NominalKv;
        }

        _rowOfNode = RowsOfNodes(nodes.Count, branches, shunts, keepOpen, out int size);
        Pattern = new SparsityPattern(size, branches.Where(b => RowOf(b.NodeA) >= 0).Select(b => (RowOf(b.NodeA), RowOf(b.NodeB))));
        Analysis = SparseAnalysis.Of(Pattern);
        _branchStamps = [.. branches.Select(LocateStamp)];
        NodeOfRow = new int[size];
        for (int node = 0; node < nodes.Count; node++)
        {
            if (_rowOfNode[node] >= 0)
            {
                ((int[])NodeOfRow)[_rowOfNode[node]] = node;
            }
        }
    }

    /// <summary>Plant and state.</summary>
    public PlantInState Plant { get; }

    /// <summary>Buses merged into nodes.</summary>
    public NodeMap Nodes { get; }

    /// <summary>Sequence frame: positive or negative.</summary>
    public Sequence Sequence { get; }

    /// <summary>Elements between two nodes, in plant order.</summary>
    public IReadOnlyList<CircuitBranch> Branches { get; }

    /// <summary>Elements to ground, in plant order.</summary>
    public IReadOnlyList<CircuitShunt> Shunts { get; }

    /// <summary>Pattern of the nodal matrix over the nodes with a path to ground.</summary>
    public SparsityPattern Pattern { get; }

    /// <summary>Analysis of that pattern, shared by all solvers.</summary>
    public SparseAnalysis Analysis { get; }

    /// <summary>Node of each matrix row.</summary>
    public IReadOnlyList<int> NodeOfRow { get; }

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

        return new Circuit(plant, nodes, sequence, branches, shunts, keepOpen: scope == CircuitScope.PowerFlow);
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
            (int aa, int ab, int ba, int bb, double scale) = _branchStamps[i];
            if (aa < 0)
            {
                continue;
            }

            CircuitBranch branch = Branches[i];
            TwoPort y = branch.Law.Admittance(order);
            double kvA = _kvOfNode[branch.NodeA];
            double kvB = _kvOfNode[branch.NodeB];
            values[aa] += y.AA * (kvA * kvA);
            values[ab] += y.AB * scale;
            values[ba] += y.BA * scale;
            values[bb] += y.BB * (kvB * kvB);
        }

        ReadOnlySpan<int> diagonal = Pattern.Diagonal;
        foreach (CircuitShunt shunt in Shunts)
        {
            double kv = _kvOfNode[shunt.Node];
            values[diagonal[_rowOfNode[shunt.Node]]] += shunt.Law.Admittance(order) * (kv * kv);
        }
    }

    private (int AA, int AB, int BA, int BB, double Scale) LocateStamp(CircuitBranch branch)
    {
        int a = RowOf(branch.NodeA);
        int b = RowOf(branch.NodeB);
        return a < 0
            ? (-1, -1, -1, -1, 0)
            : (Pattern.IndexOf(a, a), Pattern.IndexOf(a, b), Pattern.IndexOf(b, a), Pattern.IndexOf(b, b),
                _kvOfNode[branch.NodeA] * _kvOfNode[branch.NodeB]);
    }

    /// <summary>Row of every node that is connected to an element that reaches ground; -1 for the others.</summary>
    private static int[] RowsOfNodes(
        int nodeCount, List<CircuitBranch> branches, List<CircuitShunt> shunts, bool keepOpen, out int size)
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
        size = 0;
        for (int node = 0; node < nodeCount; node++)
        {
            rows[node] = keepOpen || grounded[islands.Find(node)] ? size++ : -1;
        }

        return rows;
    }
}
