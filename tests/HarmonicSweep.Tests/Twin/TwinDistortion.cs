using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>What one source injects at one order: a converter's current, or the Norton current of a supply's background.</summary>
/// <param name="Element">The converter or supply.</param>
/// <param name="Order">Order, snapped.</param>
/// <param name="Ampere">Current INTO the bus.</param>
internal sealed record TwinInjection(ShuntElement Element, double Order, Complex Ampere);

/// <summary>Harmonic voltages and currents of a plant in a state, one phasor a source.</summary>
internal sealed class TwinDistortion
{
    /// <summary>Relative floor of a fundamental voltage: each side iterates to its own last digits.</summary>
    private const double FundamentalNoise = 1e-14;

    private readonly PlantInState _state;
    private readonly Dictionary<(string Bus, double Order), Complex[]> _volt = [];
    private readonly Dictionary<(string Element, string Bus, double Order), Complex[]> _ampere = [];
    private readonly Dictionary<(string Bus, double Order), double> _rounding = [];
    private readonly Dictionary<(string Element, string Bus, double Order), double> _ampereRounding = [];

    public TwinDistortion(PlantInState state)
    {
        _state = state;
        Flow = TwinPowerFlow.Solve(state);
        if (!Flow.Converged)
        {
            throw new InvalidOperationException("The twin's power flow did not converge.");
        }

        FundamentalCurrents();
        List<TwinInjection> all = [.. Injections()];
        Dropped = [.. all.Where(i => TwinOrder.SequenceSign(i.Order) == 0)];
        Orders = [.. all.Except(Dropped).Select(i => i.Order).Distinct().Order()];
        foreach (double order in Orders)
        {
            Solve(order, [.. all.Where(i => i.Order == order)]);
        }
    }

    /// <summary>The fundamental.</summary>
    public TwinPowerFlow Flow { get; }

    /// <summary>Orders solved, ascending, without 1.</summary>
    public List<double> Orders { get; }

    /// <summary>Injections of zero-sequence orders: no path through these elements, left out.</summary>
    public List<TwinInjection> Dropped { get; }

    /// <summary>Every end of every element that has a current at the order.</summary>
    public IEnumerable<(string Element, string Bus)> Ends(double order) =>
        _ampere.Keys.Where(k => k.Order == order).Select(k => (k.Element, k.Bus));

    /// <summary>Phase-to-neutral volts at a bus, one entry a source (a single one at order 1).</summary>
    public Complex[] Volt(string bus, double order) => order == 1 ? [Flow.Volt(bus)] : _volt[(bus, order)];

    /// <summary>Amperes into an element at a bus, one entry a source.</summary>
    public Complex[] Ampere(string element, string bus, double order) => _ampere[(element, bus, order)];

    /// <summary>How far the phasor sum at a bus may move by rounding of the stamps alone, volts.</summary>
    public double RoundingVolt(string bus, double order) => order == 1 ? 0 : _rounding[(bus, order)];

    /// <summary>How far a current may move by rounding of its own stamps and of the voltages, amperes.</summary>
    public double RoundingAmpere(string element, string bus, double order) => _ampereRounding.GetValueOrDefault((element, bus, order));

    /// <summary>THD of voltage, percent of V_1; null on a dead bus.</summary>
    public double? ThdPercent(string bus, Func<double, Complex[], double> rule) => Flow.IsLive(bus)
        ? 100 * Math.Sqrt(Orders.Where(h => h == Math.Floor(h) && h is >= 2 and <= 50).Sum(h => Math.Pow(rule(h, Volt(bus, h)), 2)))
            / Flow.Volt(bus).Magnitude
        : null;

    /// <summary>Current INTO the bus a converter injects at an order, before anything is dropped.</summary>
    internal static Complex ConverterInjection(Converter converter, SpectrumLine line, Complex drawnAtFundamental)
    {
        double h = TwinOrder.Snap(line.Order);
        SpectrumLine first = converter.Spectrum.Lines.Single(l => TwinOrder.Snap(l.Order) == 1);
        double argument = drawnAtFundamental.Phase * 180 / Math.PI;
        double degrees = line.AngleDeg + h * (argument - first.AngleDeg)
            - (h - TwinOrder.SequenceSign(h)) * converter.PhaseShiftDeg;
        double magnitude = line.Percent / 100 * drawnAtFundamental.Magnitude * converter.Diversity;
        return -Complex.FromPolarCoordinates(magnitude, degrees * Math.PI / 180);
    }

    private static Complex BackgroundEmf(Supply supply, double nominalPhaseVolt, SpectrumLine line)
    {
        double h = TwinOrder.Snap(line.Order);
        double firstAngle = supply.Background!.Lines.Where(l => TwinOrder.Snap(l.Order) == 1).Select(l => l.AngleDeg).SingleOrDefault();
        double degrees = line.AngleDeg + h * (supply.AngleDeg - firstAngle);
        return Complex.FromPolarCoordinates(line.Percent / 100 * nominalPhaseVolt, degrees * Math.PI / 180);
    }

    private IEnumerable<TwinInjection> Injections()
    {
        foreach (Converter converter in _state.Plant.Of<Converter>().Where(c => _state.IsIn(c) && Flow.DrawnAmpere(c) != Complex.Zero))
        {
            foreach (SpectrumLine line in converter.Spectrum.Lines.Where(l => TwinOrder.Snap(l.Order) != 1))
            {
                yield return new(converter, TwinOrder.Snap(line.Order), ConverterInjection(converter, line, Flow.DrawnAmpere(converter)));
            }
        }

        foreach (Supply supply in _state.Plant.Of<Supply>().Where(s => _state.IsIn(s) && s.Background is not null))
        {
            double nominal = _state.Plant.Bus(supply.Bus).NominalKv * 1000 / Math.Sqrt(3);
            foreach (SpectrumLine line in supply.Background!.Lines.Where(l => TwinOrder.Snap(l.Order) != 1))
            {
                double h = TwinOrder.Snap(line.Order);
                yield return new(supply, h, BackgroundEmf(supply, nominal, line) / TwinShunts.SupplyImpedance(_state, supply, h));
            }
        }
    }

    private void FundamentalCurrents()
    {
        foreach (TwinPart part in Flow.Parts)
        {
            for (int i = 0; i < part.Buses.Count; i++)
            {
                Complex sum = Complex.Zero;
                for (int k = 0; k < part.Buses.Count; k++)
                {
                    sum += part.Y[i, k] * Flow.Volt(part.Buses[k]);
                }

                _ampere[(part.Name, part.Buses[i], 1)] = [sum];
                _ampereRounding[(part.Name, part.Buses[i], 1)] = TermSum(part, i, b => FundamentalNoise * Flow.Volt(b).Magnitude);
            }
        }

        foreach (ShuntElement element in _state.Plant.Of<ShuntElement>().Where(_state.IsIn))
        {
            Complex? ampere = element switch
            {
                Supply supply => Flow.SupplyAmpere(supply),
                Generator generator => Flow.GeneratorAmpere(generator),
                LinearLoad or Motor or Converter => Flow.DrawnAmpere(element),
                _ => null,
            };
            if (ampere is { } value)
            {
                _ampere[(element.Name, element.Bus, 1)] = [value];
            }
        }
    }

    private void Solve(double order, List<TwinInjection> sources)
    {
        List<TwinPart> parts = TwinPart.Harmonic(_state, order, TwinOrder.SequenceSign(order));
        TwinNodes nodes = new(_state);
        TwinMatrix matrix = new(nodes, parts);
        List<Complex[]> solved = [];
        foreach (TwinInjection source in sources)
        {
            var injection = new Complex[nodes.Count];
            injection[nodes.Of(source.Element.Bus)] = source.Ampere;
            solved.Add(matrix.Solve(injection));
        }

        foreach (Bus bus in _state.Plant.Buses)
        {
            int node = nodes.Of(bus.Name);
            _volt[(bus.Name, order)] = [.. solved.Select(v => v[node])];
            _rounding[(bus.Name, order)] = solved.Sum(v => matrix.RoundingVolt(v)[node]);
        }

        foreach (TwinPart part in parts)
        {
            for (int i = 0; i < part.Buses.Count; i++)
            {
                _ampere[(part.Name, part.Buses[i], order)] =
                    [.. sources.Select((source, s) => PartCurrent(part, i, nodes, solved[s]) - OwnEmf(part, source))];
                _ampereRounding[(part.Name, part.Buses[i], order)] = TermSum(part, i, b => _rounding[(b, order)]);
            }
        }

        foreach (Converter converter in _state.Plant.Of<Converter>().Where(_state.IsIn))
        {
            _ampere[(converter.Name, converter.Bus, order)] =
                [.. sources.Select(s => ReferenceEquals(s.Element, converter) ? -s.Ampere : Complex.Zero)];
        }
    }

    private static double TermSum(TwinPart part, int end, Func<string, double> volt) =>
        Enumerable.Range(0, part.Buses.Count).Sum(k => part.Y[end, k].Magnitude * volt(part.Buses[k]));

    private static Complex PartCurrent(TwinPart part, int end, TwinNodes nodes, Complex[] v)
    {
        Complex sum = Complex.Zero;
        for (int k = 0; k < part.Buses.Count; k++)
        {
            sum += part.Y[end, k] * v[nodes.Of(part.Buses[k])];
        }

        return sum;
    }

    /// <summary>E/Z of the supply itself: the current into it is (V - E)/Z.</summary>
    private static Complex OwnEmf(TwinPart part, TwinInjection source) =>
        source.Element is Supply && source.Element.Name == part.Name ? source.Ampere : Complex.Zero;
}
