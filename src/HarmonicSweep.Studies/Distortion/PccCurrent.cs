using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// What the supply side delivers into the PCC: the supplies at its node and every branch that leads from it to a supply
/// without passing the PCC again.
/// </summary>
internal sealed class PccCurrent
{
    private readonly HashSet<(string Name, string Bus)> _supplyEnds = [];

    public PccCurrent(Circuit powerFlowCircuit, string pccBus)
    {
        Circuit circuit = powerFlowCircuit;
        int pcc = circuit.Nodes[pccBus];
        var beyond = new DisjointSets(circuit.Nodes.Count);
        foreach (CircuitBranch branch in circuit.Branches)
        {
            if (branch.NodeA != pcc && branch.NodeB != pcc)
            {
                beyond.Join(branch.NodeA, branch.NodeB);
            }
        }

        var supplied = new HashSet<int>();
        foreach (CircuitShunt shunt in circuit.Shunts)
        {
            if (shunt.Element is Supply)
            {
                supplied.Add(beyond.Find(shunt.Node));
                if (shunt.Node == pcc)
                {
                    _supplyEnds.Add((shunt.ReportedName, shunt.Bus));
                }
            }
        }

        foreach (CircuitBranch branch in circuit.Branches)
        {
            bool fromA = branch.NodeA == pcc && branch.NodeB != pcc && supplied.Contains(beyond.Find(branch.NodeB));
            bool fromB = branch.NodeB == pcc && branch.NodeA != pcc && supplied.Contains(beyond.Find(branch.NodeA));
            if (fromA || fromB)
            {
                _supplyEnds.Add((branch.Element.Name, fromA ? branch.Element.EndA : branch.Element.EndB));
            }
        }
    }

    /// <summary>Whether any supply side exists in this state.</summary>
    public bool Exists => _supplyEnds.Count > 0;

    /// <summary>Delivered current at a solved order, A, split by source.</summary>
    public Complex[] Delivered(SolvedOrder solved)
    {
        Complex[]? sum = null;
        foreach (EndCurrent end in solved.Ends)
        {
            if (_supplyEnds.Contains((end.Name, end.Bus)))
            {
                sum ??= new Complex[end.Ampere.Length];
                for (int s = 0; s < sum.Length; s++)
                {
                    sum[s] -= end.Ampere[s];
                }
            }
        }

        return sum ?? [];
    }
}
