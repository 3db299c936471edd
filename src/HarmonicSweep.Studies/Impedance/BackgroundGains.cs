using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>
/// What the plant does to a background voltage: |V_bus/E|, both per unit of nominal, with the EMF E behind the impedance
/// of every supply in service, which is the voltage that stands at the PCC while the plant is off. Every bus, unless some
/// are asked for; the injected orders are points of the curve whatever its spacing.
/// </summary>
internal static class BackgroundGains
{
    public static IReadOnlyList<BackgroundGain> Of(
        Circuit circuit, StudyRequest request, double[] scanned, IReadOnlyList<double> injected, int threads, CancellationToken cancellation,
        out double worst)
    {
        worst = 0;
        IReadOnlyList<string> buses = request.Buses.Count > 0 ? request.Buses : [.. request.Plant.Buses.Select(b => b.Name)];
        double[] orders = request.Orders.Count > 0
            ? scanned
            : [.. scanned.Concat(injected.Where(h => h >= scanned[0] && h <= scanned[^1])).Distinct().Order()];
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
