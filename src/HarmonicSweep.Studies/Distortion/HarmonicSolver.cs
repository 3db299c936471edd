using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// Solves the harmonic injections of a state: one right-hand side a source, so that every summation rule can be applied
/// afterwards to voltages and currents alike.
/// </summary>
internal sealed class HarmonicSolver
{
    private readonly PlantInState _plant;
    private readonly HarmonicSource[] _sources;
    private readonly HashSet<double>[] _orders;
    private readonly Circuit _circuit;
    private readonly Dictionary<Sequence, CircuitSolver> _solvers = [];
    private readonly PlantElement[] _givenCurrents;

    public HarmonicSolver(PlantInState plant, PowerFlowSolution powerFlow)
    {
        _plant = plant;
        _sources = HarmonicSources.Of(plant, powerFlow);
        _orders = [.. _sources.Select(s => s.Orders.ToHashSet())];
        _circuit = Circuit.Build(plant, CircuitScope.Harmonic);
        var inCircuit = new HashSet<PlantElement>(_circuit.Shunts.Select(s => s.Element), ReferenceEqualityComparer.Instance);
        _givenCurrents = [.. plant.Plant.Elements.Where(e => e is ShuntElement && plant.IsIn(e) && !inCircuit.Contains(e))];
    }

    /// <summary>Orders other than 1 that some source has and that can be solved, ascending.</summary>
    public IReadOnlyList<double> SourceOrders =>
        [.. _orders.SelectMany(o => o).Where(h => h != 1 && HarmonicOrder.SequenceOf(h) != Sequence.Zero).Distinct().Order()];

    /// <summary>Largest backward error of all solves so far.</summary>
    public double WorstBackwardError => _solvers.Values.Select(s => s.WorstBackwardError).DefaultIfEmpty(0).Max();

    /// <summary>Solves an order other than 1; an order no source has gives zeros.</summary>
    public SolvedOrder Solve(double order)
    {
        Sequence sequence = HarmonicOrder.SequenceOf(order);
        CircuitSolver solver = SolverOf(sequence == Sequence.Zero ? Sequence.Positive : sequence);
        Circuit circuit = solver.Circuit;
        bool silent = sequence == Sequence.Zero || !Array.Exists(_orders, o => o.Contains(order));
        var perUnit = new Complex[_sources.Length][];
        if (!silent && circuit.Pattern.Size > 0)
        {
            solver.Factor(order);
        }

        for (int s = 0; s < _sources.Length; s++)
        {
            perUnit[s] = new Complex[circuit.Pattern.Size];
            if (!silent && _orders[s].Contains(order))
            {
                var injection = new Complex[circuit.Pattern.Size];
                if (Inject(circuit, _sources[s], order, injection))
                {
                    solver.Solve(injection, perUnit[s]);
                }
            }
        }

        return new SolvedOrder(order, BusVoltages(circuit, perUnit), ElementCurrents(circuit, order, perUnit, silent));
    }

    private CircuitSolver SolverOf(Sequence sequence)
    {
        if (!_solvers.TryGetValue(sequence, out CircuitSolver? solver))
        {
            _solvers[sequence] = solver = new CircuitSolver(_circuit.InSequence(sequence));
        }

        return solver;
    }

    /// <summary>Adds a source's injection, MVA per unit; false at an open node.</summary>
    private static bool Inject(Circuit circuit, HarmonicSource source, double order, Complex[] injection)
    {
        int node = circuit.Nodes[source.Element.Bus];
        int row = circuit.RowOf(node);
        if (row < 0)
        {
            return false;
        }

        double kv = circuit.NominalKv(node);
        injection[row] = source switch
        {
            ConverterSource converter => -converter.DrawnAmpere(order) * (Math.Sqrt(3) * kv / 1000),
            BackgroundSource background => background.EmfKv(order) * kv * SupplyAdmittance(circuit, background.Supply, order),
            _ => throw new ArgumentOutOfRangeException(nameof(source), source.GetType().Name, "No injection for this kind of source."),
        };
        return true;
    }

    private static Complex SupplyAdmittance(Circuit circuit, Supply supply, double order) =>
        circuit.Shunts.First(s => ReferenceEquals(s.Element, supply)).Law.Admittance(order);

    private Dictionary<string, Complex[]> BusVoltages(Circuit circuit, Complex[][] perUnit)
    {
        var voltages = new Dictionary<string, Complex[]>(StringComparer.Ordinal);
        foreach (Bus bus in _plant.Plant.Buses)
        {
            voltages[bus.Name] = NodeKv(circuit, circuit.Nodes[bus.Name], perUnit);
        }

        return voltages;
    }

    private static Complex[] NodeKv(Circuit circuit, int node, Complex[][] perUnit)
    {
        int row = circuit.RowOf(node);
        double kv = circuit.NominalKv(node);
        var voltage = new Complex[perUnit.Length];
        for (int s = 0; s < perUnit.Length; s++)
        {
            voltage[s] = row < 0 ? Complex.Zero : perUnit[s][row] * kv;
        }

        return voltage;
    }

    private List<EndCurrent> ElementCurrents(Circuit circuit, double order, Complex[][] perUnit, bool silent)
    {
        var ends = new List<EndCurrent>();
        foreach (CircuitBranch branch in circuit.Branches)
        {
            Complex[] kvA = NodeKv(circuit, branch.NodeA, perUnit);
            Complex[] kvB = NodeKv(circuit, branch.NodeB, perUnit);
            BranchCurrents.Add(ends, branch, order, kvA, kvB);
        }

        foreach (CircuitShunt shunt in circuit.Shunts)
        {
            var emf = new Complex[_sources.Length];
            for (int s = 0; s < emf.Length && !silent; s++)
            {
                if (_sources[s] is BackgroundSource background && ReferenceEquals(background.Supply, shunt.Element))
                {
                    emf[s] = background.EmfKv(order);
                }
            }

            ends.Add(BranchCurrents.Shunt(shunt, order, NodeKv(circuit, shunt.Node, perUnit), emf));
        }

        ends.AddRange(SourceCurrents(circuit, order, silent));
        return ends;
    }

    /// <summary>What converters draw, and the nothing that loads open to harmonics draw.</summary>
    private IEnumerable<EndCurrent> SourceCurrents(Circuit circuit, double order, bool silent)
    {
        foreach (PlantElement element in _givenCurrents)
        {
            var shunt = (ShuntElement)element;
            var ampere = new Complex[_sources.Length];
            for (int s = 0; s < ampere.Length; s++)
            {
                if (!silent && _sources[s] is ConverterSource converter && ReferenceEquals(converter.Converter, element)
                    && circuit.RowOf(shunt.Bus) >= 0)
                {
                    ampere[s] = converter.DrawnAmpere(order);
                }
            }

            yield return BranchCurrents.Given(shunt, ampere);
        }
    }
}
