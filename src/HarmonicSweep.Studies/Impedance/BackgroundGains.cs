using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// What the plant does to a background voltage: |V_bus/E|, both per unit of nominal, with the EMF E behind the impedance
/// of every supply in service, which is the voltage that stands at the PCC while the plant is off.
/// </summary>
internal static class BackgroundGains
{
    public static IReadOnlyList<BackgroundGain> Of(
        Circuit circuit, StudyRequest request, IReadOnlyList<string> buses, double[] orders, int threads, CancellationToken cancellation,
        out double worst)
    {
        worst = 0;
        CircuitShunt[] supplies = [.. circuit.Shunts.Where(s => s.Element is Supply)];
        if (supplies.Length == 0)
        {
            return [];
        }

        var gain = new double?[buses.Count][];
        for (int b = 0; b < buses.Count; b++)
        {
            gain[b] = new double?[orders.Length];
        }

        worst = Sweep.Run(circuit, [.. orders.Select(HarmonicOrder.Snap)], threads, cancellation, (solver, index) =>
        {
            var injection = new Complex[circuit.Pattern.Size];
            foreach (CircuitShunt supply in supplies)
            {
                double kv = circuit.NominalKv(supply.Node);
                injection[circuit.RowOf(supply.Node)] += supply.Law.Admittance(HarmonicOrder.Snap(orders[index])) * (kv * kv);
            }

            var voltage = new Complex[injection.Length];
            solver.Solve(injection, voltage);
            for (int b = 0; b < buses.Count; b++)
            {
                int row = circuit.RowOf(buses[b]);
                gain[b][index] = row < 0 ? null : Complex.Abs(voltage[row]);
            }
        });
        string from = request.Settings.PccBus ?? supplies[0].Bus;
        return [.. buses.Select((bus, b) => new BackgroundGain(from, bus, orders, gain[b]))];
    }
}
