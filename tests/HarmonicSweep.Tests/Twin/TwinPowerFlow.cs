using System.Numerics;
using HarmonicSweep.Network;
using MathNet.Numerics.LinearAlgebra.Double;

namespace HarmonicSweep.Tests.Twin;

/// <summary>
/// Newton's method with a dense Jacobian in rectangular coordinates, all islands at once, on volts and volt-amperes.
/// Unknowns are real and imaginary part of every live node; a generator that holds an island replaces both its
/// equations by V = given, one beside a supply replaces the reactive balance by |V| = given. Loads and machines are
/// raised in steps from the network without load, so that the solution is the one a plant would come to.
/// </summary>
internal sealed class TwinPowerFlow
{
    private const int LoadSteps = 20;

    private readonly PlantInState _state;
    private readonly TwinNodes _nodes;
    private readonly Complex[,] _y;
    private readonly Complex[] _norton;
    private readonly Complex[] _draw;
    private readonly bool[] _live;
    private readonly Dictionary<int, Generator> _holds = [];
    private readonly Dictionary<int, Generator> _regulates = [];
    private readonly Complex[] _v;
    private double _loadShare = 1;

    private TwinPowerFlow(PlantInState state, TwinNodes nodes)
    {
        _state = state;
        _nodes = nodes;
        Parts = TwinPart.PowerFlow(state);
        _y = new Complex[nodes.Count, nodes.Count];
        foreach (TwinPart part in Parts)
        {
            for (int i = 0; i < part.Buses.Count; i++)
            {
                for (int k = 0; k < part.Buses.Count; k++)
                {
                    _y[nodes.Of(part.Buses[i]), nodes.Of(part.Buses[k])] += part.Y[i, k];
                }
            }
        }

        _norton = new Complex[nodes.Count];
        _draw = new Complex[nodes.Count];
        _live = new bool[nodes.Count];
        _v = new Complex[nodes.Count];
        AssignSources();
        foreach (ShuntElement element in state.Plant.Of<ShuntElement>().Where(e => e is LinearLoad or Motor or Converter && state.IsIn(e)))
        {
            _draw[nodes.Of(element.Bus)] += TwinShunts.ConstantPower(state, element);
        }
    }

    /// <summary>Admittances of the network at h = 1.</summary>
    public List<TwinPart> Parts { get; }

    /// <summary>Largest power mismatch over the largest power drawn, at the solution.</summary>
    public double Mismatch { get; private set; }

    /// <summary>False when Newton's method did not settle.</summary>
    public bool Converged { get; private set; }

    /// <summary>Whether some island lives on its generators alone, the largest holding its bus.</summary>
    public bool HoldsByGenerator => _holds.Count > 0;

    /// <summary>
    /// Converged with every live voltage between 70 and 115 % of nominal. Outside, near collapse or a resonance at the
    /// fundamental, several solutions lie close together and two programs may rightly settle on different ones.
    /// </summary>
    public bool IsPlain => Converged && _state.Plant.Buses.All(b => !IsLive(b.Name)
        || Volt(b.Name).Magnitude / PhaseVolt(b.Name) is > 0.7 and < 1.15);

    /// <summary>Solves; look at <see cref="Converged"/> before using the voltages.</summary>
    public static TwinPowerFlow Solve(PlantInState state)
    {
        TwinPowerFlow flow = new(state, new TwinNodes(state));
        flow.Start();
        for (int step = 1; step <= LoadSteps; step++)
        {
            flow._loadShare = (double)step / LoadSteps;
            flow.Converged = false;
            flow.Iterate();
        }

        return flow;
    }

    /// <summary>Whether the bus is tied to a source in service.</summary>
    public bool IsLive(string bus) => _live[_nodes.Of(bus)];

    /// <summary>Phase-to-neutral voltage, volts; 0 on a dead bus.</summary>
    public Complex Volt(string bus) => _v[_nodes.Of(bus)];

    /// <summary>Current into a load, motor or converter, amperes; 0 on a dead bus.</summary>
    public Complex DrawnAmpere(ShuntElement element) => IsLive(element.Bus)
        ? Complex.Conjugate(TwinShunts.ConstantPower(_state, element) / (3 * Volt(element.Bus)))
        : Complex.Zero;

    /// <summary>Current into the supply's impedance from its bus, amperes (an EMF stands behind it).</summary>
    public Complex SupplyAmpere(Supply supply) =>
        (Volt(supply.Bus) - Emf(supply)) / TwinShunts.SupplyImpedance(_state, supply, 1);

    /// <summary>Current into the only generator of its node, amperes: what the node's balance leaves.</summary>
    public Complex GeneratorAmpere(Generator generator)
    {
        int node = _nodes.Of(generator.Bus);
        if (_state.Plant.Of<Generator>().Count(g => _state.IsIn(g) && _nodes.Of(g.Bus) == node) != 1)
        {
            throw new NotSupportedException("The model text does not share reactive power between generators of one node.");
        }

        return _live[node] ? -(NodeCurrent(node) + Complex.Conjugate(_draw[node] / (3 * _v[node]))) : Complex.Zero;
    }

    private Complex Emf(Supply supply) => Complex.FromPolarCoordinates(
        supply.VoltagePu * PhaseVolt(supply.Bus), supply.AngleDeg * Math.PI / 180);

    private double PhaseVolt(string bus) => _state.Plant.Bus(bus).NominalKv * 1000 / Math.Sqrt(3);

    private void AssignSources()
    {
        int[] island = _nodes.Islands(Parts);
        List<Supply> supplies = [.. _state.Plant.Of<Supply>().Where(_state.IsIn)];
        List<Generator> generators = [.. _state.Plant.Of<Generator>().Where(_state.IsIn)];
        foreach (Supply supply in supplies)
        {
            _norton[_nodes.Of(supply.Bus)] += Emf(supply) / TwinShunts.SupplyImpedance(_state, supply, 1);
        }

        foreach (int number in island.Distinct())
        {
            bool supplied = supplies.Exists(s => island[_nodes.Of(s.Bus)] == number);
            List<Generator> here = [.. generators.Where(g => island[_nodes.Of(g.Bus)] == number)];
            Generator? holder = supplied ? null : here.MaxBy(g => g.RatedMva);
            foreach (Generator generator in here)
            {
                int node = _nodes.Of(generator.Bus);
                (ReferenceEquals(generator, holder) ? _holds : _regulates)[node] = generator;
            }

            for (int n = 0; n < _nodes.Count; n++)
            {
                _live[n] |= island[n] == number && (supplied || here.Count > 0);
            }
        }
    }

    /// <summary>Starts from the network without loads, so that phase shifts and ratios are there already.</summary>
    private void Start()
    {
        int[] live = [.. Enumerable.Range(0, _nodes.Count).Where(n => _live[n])];
        if (live.Length == 0)
        {
            return;
        }

        var y = new MathNet.Numerics.LinearAlgebra.Complex.DenseMatrix(live.Length);
        var current = new MathNet.Numerics.LinearAlgebra.Complex.DenseVector(live.Length);
        for (int i = 0; i < live.Length; i++)
        {
            bool held = _holds.TryGetValue(live[i], out Generator? holder);
            current[i] = held ? holder!.VoltagePu * PhaseVolt(holder.Bus) : _norton[live[i]];
            for (int k = 0; k < live.Length; k++)
            {
                y[i, k] = held ? (i == k ? 1 : 0) : _y[live[i], live[k]];
            }
        }

        MathNet.Numerics.LinearAlgebra.Vector<Complex> start = y.LU().Solve(current);
        for (int i = 0; i < live.Length; i++)
        {
            _v[live[i]] = _regulates.TryGetValue(live[i], out Generator? generator)
                ? start[i] / start[i].Magnitude * generator.VoltagePu * PhaseVolt(generator.Bus)
                : start[i];
        }
    }

    private void Iterate()
    {
        int[] live = [.. Enumerable.Range(0, _nodes.Count).Where(n => _live[n])];
        if (live.Length == 0)
        {
            Converged = true;
            return;
        }

        double largest = Math.Max(1, _draw.Max(s => s.Magnitude));
        double step = double.PositiveInfinity;
        for (int iteration = 0; iteration < 60; iteration++)
        {
            double[] residual = [.. live.SelectMany(Residual)];
            Mismatch = residual.Max(Math.Abs) / largest;

            // past convergence two more steps only shake the last digits: stop when they no longer shrink
            if (step < 1e-12)
            {
                Converged = true;
                return;
            }

            DenseMatrix jacobian = Jacobian(live);
            MathNet.Numerics.LinearAlgebra.Vector<double> change = jacobian.LU().Solve(DenseVector.OfArray(residual));
            if (change.Any(double.IsNaN))
            {
                return;
            }

            step = 0;
            for (int i = 0; i < live.Length; i++)
            {
                Complex d = new(change[2 * i], change[2 * i + 1]);
                step = Math.Max(step, d.Magnitude / Math.Max(_v[live[i]].Magnitude, double.Epsilon));
                _v[live[i]] -= d;
            }
        }
    }

    private Complex NodeCurrent(int node)
    {
        Complex sum = -_norton[node];
        for (int k = 0; k < _nodes.Count; k++)
        {
            sum += _y[node, k] * _v[k];
        }

        return sum;
    }

    /// <summary>Power leaving the node into network and loads; equations of a generator where one stands.</summary>
    private double[] Residual(int node)
    {
        if (_holds.TryGetValue(node, out Generator? holder))
        {
            Complex difference = _v[node] - holder.VoltagePu * PhaseVolt(holder.Bus);
            return [difference.Real, difference.Imaginary];
        }

        Complex leaving = 3 * _v[node] * Complex.Conjugate(NodeCurrent(node)) + _loadShare * _draw[node];
        if (_regulates.TryGetValue(node, out Generator? generator))
        {
            double target = generator.VoltagePu * PhaseVolt(generator.Bus);
            return [leaving.Real - _loadShare * 1e6 * generator.PMw, _v[node].Magnitude * _v[node].Magnitude - target * target];
        }

        return [leaving.Real, leaving.Imaginary];
    }

    private DenseMatrix Jacobian(int[] live)
    {
        var jacobian = new DenseMatrix(2 * live.Length);
        for (int i = 0; i < live.Length; i++)
        {
            int node = live[i];
            Complex current = Complex.Conjugate(NodeCurrent(node));
            for (int k = 0; k < live.Length; k++)
            {
                for (int part = 0; part < 2; part++)
                {
                    Complex unit = part == 0 ? Complex.One : Complex.ImaginaryOne;
                    Complex own = i == k ? unit : Complex.Zero;
                    Complex power = 3 * (own * current + _v[node] * Complex.Conjugate(_y[node, live[k]] * unit));
                    int column = 2 * k + part;
                    if (_holds.ContainsKey(node))
                    {
                        jacobian[2 * i, column] = own.Real;
                        jacobian[2 * i + 1, column] = own.Imaginary;
                    }
                    else
                    {
                        jacobian[2 * i, column] = power.Real;
                        jacobian[2 * i + 1, column] = _regulates.ContainsKey(node)
                            ? 2 * (_v[node].Real * own.Real + _v[node].Imaginary * own.Imaginary)
                            : power.Imaginary;
                    }
                }
            }
        }

        return jacobian;
    }
}
