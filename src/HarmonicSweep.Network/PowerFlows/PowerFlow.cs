using System.Numerics;
using HarmonicSweep.Numerics;
using static System.FormattableString;

namespace HarmonicSweep.Network;

/// <summary>
/// Power flow at the fundamental by Newton's method in polar coordinates (Tinney and Hart 1967). Loads, motors and
/// converters draw constant power; a supply is an EMF behind its impedance; a generator holds its voltage, and in an
/// island without supply the largest one is the reference.
/// </summary>
public sealed class PowerFlow
{
    /// <summary>Mismatch accepted, share of the largest power.</summary>
    private const double AcceptedMismatch = 1e-10;

    /// <summary>Mismatch aimed at: harmonics inherit the error, and the last step of Newton's method is cheap.</summary>
    private const double WantedMismatch = 1e-14;

    /// <summary>
    /// Rounding of a node's power, share of the sum |V_i||Y_ik||V_k| it is made of: what no iteration removes, and the only
    /// scale where nothing draws power.
    /// </summary>
    private const double Rounding = 2e-15;

    private const int MostIterations = 60;
    private const int MostHalvings = 12;

    private readonly Circuit _circuit;
    private readonly PowerFlowNodes _nodes;
    private readonly Complex[] _admittance;
    private readonly Complex[] _norton;
    private readonly Complex[] _current;
    private readonly PowerFlowJacobian _jacobian;
    private readonly double _largestPower;
    private double _largestTerms;
    private Complex[] _voltage;

    private PowerFlow(Circuit circuit)
    {
        _circuit = circuit;
        _nodes = new PowerFlowNodes(circuit);
        int size = circuit.Pattern.Size;
        _admittance = new Complex[circuit.Pattern.Count];
        circuit.Stamp(1, _admittance);
        _norton = new Complex[size];
        foreach (CircuitShunt shunt in circuit.Shunts)
        {
            if (shunt.Element is Supply supply)
            {
                double kv = circuit.NominalKv(shunt.Node);
                _norton[shunt.Node] += PowerFlowSolution.SupplyEmfKv(supply, kv) * kv * shunt.Law.Admittance(1);
            }
        }

        _current = new Complex[size];
        _voltage = new Complex[size];
        _jacobian = new PowerFlowJacobian(circuit.Pattern, _nodes, _admittance);
        _largestPower = _nodes.LargestMva;
    }

    /// <summary>Solves the power flow of a plant in a state.</summary>
    /// <exception cref="ComputationException">No convergence; the finding names the worst bus and the largest load there.</exception>
    /// <exception cref="CaseException">Two generators at one node hold unlike voltages.</exception>
    public static PowerFlowSolution Solve(PlantInState plant) =>
        new PowerFlow(Circuit.Build(plant, CircuitScope.PowerFlow)).Solve();

    private PowerFlowSolution Solve()
    {
        try
        {
            _voltage = new PowerFlowStart(_circuit, _nodes, _admittance, _norton).Voltages();
        }
        catch (SingularMatrixException exception)
        {
            throw new ComputationException(new Finding(
                Severity.Error, "HS304", _circuit.Plant.Plant.Bus(_circuit.Nodes.BusesOf(exception.Row)[0]).Location,
                $"state {_circuit.Plant.State.Name}: the network cannot be solved at the fundamental near bus {_circuit.NameOfRow(exception.Row)}; its nodal matrix is singular.",
                "a resonance without losses lies exactly on the fundamental: check the reactances there."));
        }

        Complex[] mismatch = Mismatch(_voltage);
        double error = Largest(mismatch);
        int iteration = 0;
        while (error > WantedMismatch * _largestPower && iteration < MostIterations)
        {
            iteration++;
            double before = error;
            if (!TryStep(ref mismatch, ref error) || (before <= Accepted && error > before / 4))
            {
                break;
            }
        }

        if (!(error <= Accepted))
        {
            throw Diverged(mismatch);
        }

        return new PowerFlowSolution(_circuit, _voltage, _nodes.Live, GeneratorPowers(), error, iteration);
    }

    private double Accepted => Math.Max(AcceptedMismatch * _largestPower, Rounding * _largestTerms);

    /// <summary>One Newton step, halved while it makes the mismatch larger; false when no step improves.</summary>
    private bool TryStep(ref Complex[] mismatch, ref double error)
    {
        Complex[] step;
        try
        {
            step = _jacobian.Step(_voltage, _current, mismatch);
        }
        catch (SingularMatrixException)
        {
            return false; // at the nose of the voltage curve: the caller reports the divergence with its bus
        }

        double scale = 1;
        for (int halving = 0; halving < MostHalvings; halving++, scale /= 2)
        {
            var trial = new Complex[_voltage.Length];
            for (int i = 0; i < trial.Length; i++)
            {
                // step = (change of ln|V|) + j (change of angle)
                trial[i] = _voltage[i] * Complex.Exp(scale * step[i]);
            }

            Complex[] trialMismatch = Mismatch(trial);
            double trialError = Largest(trialMismatch);
            if (trialError < error)
            {
                _voltage = trial;
                mismatch = trialMismatch;
                error = trialError;
                return true;
            }
        }

        Mismatch(_voltage); // the currents of the voltages kept
        return false;
    }

    /// <summary>Specified minus computed power per row, MVA; leaves the node currents of these voltages behind.</summary>
    private Complex[] Mismatch(Complex[] voltage)
    {
        SparsityPattern pattern = _circuit.Pattern;
        var mismatch = new Complex[pattern.Size];
        _largestTerms = 0;
        for (int row = 0; row < pattern.Size; row++)
        {
            Complex sum = -_norton[row];
            double terms = Complex.Abs(_norton[row]);
            for (int p = pattern.RowStart[row]; p < pattern.RowStart[row + 1]; p++)
            {
                Complex term = _admittance[p] * voltage[pattern.Columns[p]];
                sum += term;
                terms += Complex.Abs(term);
            }

            _current[row] = sum;
            _largestTerms = Math.Max(_largestTerms, terms * Complex.Abs(voltage[row]));
            Complex difference = _nodes.SpecifiedMva[row] - voltage[row] * Complex.Conjugate(sum);
            mismatch[row] = _nodes.Kind[row] switch
            {
                NodeKind.ConstantPower => difference,
                NodeKind.HeldVoltage => difference.Real,
                _ => Complex.Zero,
            };
        }

        return mismatch;
    }

    private static double Largest(Complex[] mismatch)
    {
        double largest = 0;
        foreach (Complex value in mismatch)
        {
            double magnitude = Math.Max(Math.Abs(value.Real), Math.Abs(value.Imaginary));
            largest = magnitude > largest || double.IsNaN(magnitude) ? magnitude : largest;
        }

        return largest;
    }

    private Dictionary<string, Complex> GeneratorPowers()
    {
        var powers = new Dictionary<string, Complex>(StringComparer.Ordinal);
        for (int node = 0; node < _nodes.Live.Length; node++)
        {
            IReadOnlyList<Generator> here = _nodes.GeneratorsAt(node);
            if (here.Count == 0 || !_nodes.Live[node])
            {
                continue;
            }

            // what the network takes beyond the specified power: reactive by rating, the active rest to the reference machine
            Complex rest = _voltage[node] * Complex.Conjugate(_current[node]) - _nodes.SpecifiedMva[node];
            double rating = here.Sum(g => g.RatedMva);
            foreach (Generator generator in here)
            {
                bool reference = ReferenceEquals(generator, _nodes.Reference(node));
                double active = (reference ? rest.Real : 0) + (_nodes.IsReferenceMachine(generator) ? 0 : generator.PMw);
                powers[generator.Name] = new Complex(active, rest.Imaginary * generator.RatedMva / rating);
            }
        }

        return powers;
    }

    private ComputationException Diverged(Complex[] mismatch)
    {
        int worst = 0;
        for (int row = 1; row < mismatch.Length; row++)
        {
            if (!(Complex.Abs(mismatch[row]) <= Complex.Abs(mismatch[worst])))
            {
                worst = row;
            }
        }

        PlantElement? load = _nodes.LargestLoadAt(worst);
        string there = load is null ? "" : Invariant($" The largest load there is {load.Name}, {Complex.Abs(Demand.Of(load, _circuit.Plant)):G4} MVA.");
        return new ComputationException(new Finding(
            Severity.Error, "HS302", load?.Location,
            Invariant($"state {_circuit.Plant.State.Name}: the power flow does not converge; the worst mismatch, {Complex.Abs(mismatch[worst]):G4} MVA, is at bus {_circuit.NameOfRow(worst)}.{there}"),
            "check that load against the short-circuit power and the transformers that feed it (kW given as MW, an impedance on the wrong rating)."));
    }
}
