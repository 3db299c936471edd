using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>Short-circuit powers at the fundamental through series impedances alone.</summary>
internal static class ShortCircuit
{
    /// <summary>S_sc at a bus from supplies and generators in the state, MVA; null when no source reaches it.</summary>
    public static double? FromSourcesMva(PlantInState plant, string bus) => Mva(plant, CircuitScope.ShortCircuit, bus);

    /// <summary>
    /// S_sc at a bus from the supplies alone at their maximum, with the plant as drawn and every supply in, MVA; null when
    /// none reaches it. This is the short-circuit power of I_SC, whatever the state.
    /// </summary>
    public static double? FromSuppliesAtMaximumMva(Plant plant, string bus)
    {
        OperatingState maximum = OperatingState.Base.With(
            OperatingState.BaseName, plant.Of<Supply>().Select(s => new ShortCircuitSetting(s.Name, ShortCircuitLevel.Max)));
        return Mva(new PlantInState(plant, maximum), CircuitScope.SupplyShortCircuit, bus);
    }

    /// <summary>Driving-point impedance at the fundamental in a scope, ohm; null when open.</summary>
    public static Complex? ImpedanceOhm(PlantInState plant, CircuitScope scope, string bus)
    {
        Circuit circuit = Circuit.Build(plant, scope);
        int row = circuit.RowOf(bus);
        if (row < 0)
        {
            return null;
        }

        var solver = new CircuitSolver(circuit);
        solver.Factor(1);
        return solver.Impedance(row, row);
    }

    private static double? Mva(PlantInState plant, CircuitScope scope, string bus)
    {
        double kv = plant.Plant.Bus(bus).NominalKv;
        return ImpedanceOhm(plant, scope, bus) is { } z ? kv * kv / Complex.Abs(z) : null;
    }
}
