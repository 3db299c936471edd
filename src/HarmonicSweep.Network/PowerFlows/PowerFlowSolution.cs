using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>Fundamental voltages of a plant in a state, and the powers that hold them.</summary>
public sealed class PowerFlowSolution
{
    private readonly Complex[] _voltagePu;
    private readonly bool[] _live;
    private readonly Dictionary<string, Complex> _generatorMva;

    internal PowerFlowSolution(
        Circuit circuit, Complex[] voltagePu, bool[] live, Dictionary<string, Complex> generatorMva, double mismatchMva, int iterations)
    {
        Circuit = circuit;
        _voltagePu = voltagePu;
        _live = live;
        _generatorMva = generatorMva;
        MismatchMva = mismatchMva;
        Iterations = iterations;
    }

    /// <summary>Circuit solved (power-flow scope).</summary>
    public Circuit Circuit { get; }

    /// <summary>Largest power mismatch left, MVA.</summary>
    public double MismatchMva { get; }

    /// <summary>Newton iterations taken.</summary>
    public int Iterations { get; }

    /// <summary>Buses not tied to a source in service, in table order.</summary>
    public IReadOnlyList<string> DeadBuses =>
        [.. Circuit.Plant.Plant.Buses.Where(b => !IsLive(b.Name)).Select(b => b.Name)];

    /// <summary>Whether the bus is tied to a source in service.</summary>
    public bool IsLive(string bus) => _live[Circuit.Nodes[bus]];

    /// <summary>Voltage per unit of the bus's nominal voltage; zero when dead.</summary>
    public Complex VoltagePu(string bus) => _voltagePu[Circuit.Nodes[bus]];

    /// <summary>sqrt3 times the phase-to-neutral voltage, kV; zero when dead.</summary>
    public Complex VoltageKv(string bus) => VoltagePu(bus) * Circuit.NominalKv(Circuit.Nodes[bus]);

    /// <summary>Fundamental current drawn by a load, motor or converter, A; zero on a dead bus.</summary>
    public Complex DrawnAmpere(ShuntElement element) => IsLive(element.Bus)
        ? Complex.Conjugate(Demand.Of(element, Circuit.Plant) / VoltageKv(element.Bus)) * (1000 / Math.Sqrt(3))
        : Complex.Zero;

    /// <summary>Power a generator delivers, MVA; zero when dead or out.</summary>
    public Complex GeneratorMva(Generator generator) => _generatorMva.GetValueOrDefault(generator.Name);

    /// <summary>EMF behind a supply's impedance, kV line-to-line.</summary>
    public static Complex SupplyEmfKv(Supply supply, double nominalKv) =>
        supply.VoltagePu * nominalKv * Angle.Phasor(supply.AngleDeg);
}
