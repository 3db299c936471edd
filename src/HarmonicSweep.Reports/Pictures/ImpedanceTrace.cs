using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>The impedance of one state, ready to draw: the resonances are points of it, whatever the spacing of the scan.</summary>
internal sealed class ImpedanceTrace
{
    private ImpedanceTrace(StateResult state, double[] orders, double?[] ohm, double?[] degrees, Resonance[] peaks)
    {
        State = state.State;
        InjectedOrders = state.InjectedOrders;
        Orders = orders;
        Ohm = ohm;
        Degrees = degrees;
        Peaks = peaks;
        double largest = 0;
        foreach (double? z in ohm)
        {
            largest = Math.Max(largest, z ?? 0);
            IsOpen &= z is null;
        }

        Highest = peaks.Length > 0 ? peaks.Max(p => p.Ohm) : largest;
    }

    public string State { get; }

    /// <summary>Orders, ascending.</summary>
    public double[] Orders { get; }

    /// <summary>|Z| at every order; null = open.</summary>
    public double?[] Ohm { get; }

    /// <summary>Angle at every order, degrees; null = open.</summary>
    public double?[] Degrees { get; }

    /// <summary>Parallel resonances, ascending.</summary>
    public Resonance[] Peaks { get; }

    public IReadOnlyList<double> InjectedOrders { get; }

    /// <summary>No path to ground at any order.</summary>
    public bool IsOpen { get; } = true;

    /// <summary>Largest parallel resonance, or largest |Z| without one, ohm.</summary>
    public double Highest { get; }

    public static ImpedanceTrace Of(StateResult state, ImpedanceCurve curve)
    {
        double first = curve.Orders.Min(), last = curve.Orders.Max();
        Resonance[] resonances = curve.At != curve.From ? [] :
        [
            .. state.Resonances.Where(r => r.Sequence == curve.Sequence && r.Bus == curve.At && r.Order >= first && r.Order <= last)
                .OrderBy(r => r.Order),
        ];
        int scanned = curve.Orders.Count, count = scanned + (scanned > 1 ? resonances.Length : 0);
        var orders = new double[count];
        var ohm = new double?[count];
        var degrees = new double?[count];
        var place = new int[count];
        for (int i = 0; i < count; i++)
        {
            orders[i] = i < scanned ? curve.Orders[i] : resonances[i - scanned].Order;
            place[i] = i;
        }

        Array.Sort(orders, place);
        for (int i = 0; i < count; i++)
        {
            if (place[i] >= scanned)
            {
                ohm[i] = resonances[place[i] - scanned].Ohm;
            }
            else if (curve.Ohm[place[i]] is { } z)
            {
                ohm[i] = z.Magnitude;
                degrees[i] = z.Phase * 180 / Math.PI;
            }
        }

        for (int i = 1; i < count - 1; i++)
        {
            // a resonance is given by magnitude alone; its angle lies between those of its neighbours
            if (place[i] >= scanned && degrees[i - 1] is { } before && degrees[i + 1] is { } after)
            {
                double span = orders[i + 1] - orders[i - 1];
                degrees[i] = span > 0 ? before + (after - before) * (orders[i] - orders[i - 1]) / span : before;
            }
        }

        return new ImpedanceTrace(state, orders, ohm, degrees, [.. resonances.Where(r => r.Kind == ResonanceKind.Parallel)]);
    }
}
