using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>
/// A second, slow and obvious program for the same model: dense matrices in plain siemens, one order at a time.
/// Written from the model text alone, so that an error on either side shows as a difference.
/// </summary>
internal sealed class DenseTwin
{
    private readonly PlantInState _state;

    public DenseTwin(PlantInState state) => _state = state;

    public DenseTwin(Plant plant, OperatingState? state = null)
        : this(new PlantInState(plant, state ?? OperatingState.Base))
    {
    }

    /// <summary>Nodal matrix of Z(h); sequence +1 or -1.</summary>
    public TwinMatrix Matrix(double order, int sequence)
    {
        double h = TwinOrder.Snap(order);
        return new TwinMatrix(new TwinNodes(_state), TwinPart.Harmonic(_state, h, sequence));
    }

    /// <summary>Driving-point or transfer impedance, ohm per phase; null where open.</summary>
    public Complex? Impedance(string at, string from, double order, int sequence = 1) => Matrix(order, sequence).Impedance(at, from);

    /// <summary>Power flow at h = 1.</summary>
    public TwinPowerFlow PowerFlow() => TwinPowerFlow.Solve(_state);

    /// <summary>Harmonic voltages and currents.</summary>
    public TwinDistortion Distortion() => new(_state);
}
