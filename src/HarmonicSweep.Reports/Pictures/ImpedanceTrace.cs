using System.Numerics;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>A point of a trace; null = open.</summary>
internal readonly record struct TracePoint(double Order, double? Ohm, double? Degrees);

/// <summary>The impedance of one state, ready to draw: the resonances are points of it, whatever the spacing of the scan.</summary>
internal sealed record ImpedanceTrace(
    string State, ImpedanceCurve Curve, IReadOnlyList<TracePoint> Points, IReadOnlyList<Resonance> Peaks, IReadOnlyList<double> InjectedOrders)
{
    /// <summary>No path to ground at any order.</summary>
    public bool IsOpen => Points.All(p => p.Ohm is null);

    /// <summary>Largest parallel resonance, or largest |Z| without one, ohm.</summary>
    public double Highest => Peaks.Count > 0 ? Peaks.Max(p => p.Ohm) : Points.Max(p => p.Ohm ?? 0);

    public static ImpedanceTrace Of(StateResult state, ImpedanceCurve curve)
    {
        double first = curve.Orders.Min(), last = curve.Orders.Max();
        Resonance[] resonances = curve.At != curve.From ? [] :
        [
            .. state.Resonances.Where(r => r.Sequence == curve.Sequence && r.Bus == curve.At && r.Order >= first && r.Order <= last)
                .OrderBy(r => r.Order),
        ];
        TracePoint[] scanned = [.. curve.Orders.Zip(curve.Ohm, PointOf).OrderBy(p => p.Order)];
        var orders = curve.Orders.ToHashSet();
        IEnumerable<TracePoint> refined = resonances.Where(r => !orders.Contains(r.Order))
            .Select(r => new TracePoint(r.Order, r.Ohm, DegreesAt(scanned, r.Order)));
        return new ImpedanceTrace(
            state.State,
            curve with { Orders = [.. scanned.Select(p => p.Order)], Ohm = [.. curve.Orders.Zip(curve.Ohm).OrderBy(p => p.First).Select(p => p.Second)] },
            [.. scanned.Concat(scanned.Length > 1 ? refined : []).OrderBy(p => p.Order)],
            [.. resonances.Where(r => r.Kind == ResonanceKind.Parallel)],
            state.InjectedOrders);
    }

    private static TracePoint PointOf(double order, Complex? ohm) => ohm is { } z
        ? new TracePoint(order, z.Magnitude, z.Phase * 180 / Math.PI)
        : new TracePoint(order, null, null);

    /// <summary>Angle between the scanned neighbours; a resonance is given by magnitude alone.</summary>
    private static double? DegreesAt(TracePoint[] scanned, double order)
    {
        int after = Array.FindIndex(scanned, p => p.Order > order);
        if (after <= 0 || scanned[after - 1] is not { Degrees: { } from } before || scanned[after].Degrees is not { } to)
        {
            return null;
        }

        return from + (to - from) * (order - before.Order) / (scanned[after].Order - before.Order);
    }
}
