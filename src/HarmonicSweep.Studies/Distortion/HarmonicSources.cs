using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Studies;

/// <summary>One harmonic source: a converter's current, or the background voltage behind a supply.</summary>
internal abstract record HarmonicSource(ShuntElement Element)
{
    /// <summary>Orders it has, snapped, ascending.</summary>
    public abstract IEnumerable<double> Orders { get; }
}

/// <summary>A converter as a current source; <see cref="DrawnAmpere"/> is what it draws, so its injection is the negative.</summary>
internal sealed record ConverterSource(Converter Converter, Complex FundamentalAmpere) : HarmonicSource(Converter)
{
    public override IEnumerable<double> Orders => Converter.Spectrum.Lines.Where(l => l.Percent != 0).Select(l => HarmonicOrder.Snap(l.Order));

    /// <summary>
    /// I_h = percent/100 |I_1| (times diversity) at th_h + h(arg I_1 - th_1), turned by -(h - s) th for the phase shift th
    /// of its own transformer, s = +1, -1 by sequence; A rms, zero at an order it does not have.
    /// </summary>
    public Complex DrawnAmpere(double order)
    {
        double reference = Line(1)?.AngleDeg ?? 0;
        if (Line(order) is not { } line)
        {
            return Complex.Zero;
        }

        double sign = HarmonicOrder.SequenceOf(order) == Sequence.Negative ? -1 : 1;
        double degrees = line.AngleDeg + order * (Angle.Degrees(FundamentalAmpere) - reference)
            - (order - sign) * Converter.PhaseShiftDeg;
        return line.Percent / 100 * Converter.Diversity * Complex.Abs(FundamentalAmpere) * Angle.Phasor(degrees);
    }

    private SpectrumLine? Line(double order)
    {
        foreach (SpectrumLine line in Converter.Spectrum.Lines)
        {
            if (HarmonicOrder.Snap(line.Order) == order)
            {
                return line;
            }
        }

        return null;
    }
}

/// <summary>A supply's background: an EMF of percent/100 of nominal at th_h + h(angle - th_1), th_1 = 0 without an order-1 line.</summary>
internal sealed record BackgroundSource(Supply Supply, double NominalKv) : HarmonicSource(Supply)
{
    public override IEnumerable<double> Orders => Supply.Background!.Lines.Where(l => l.Percent != 0).Select(l => HarmonicOrder.Snap(l.Order));

    /// <summary>EMF at an order, kV (sqrt3 times phase-to-neutral).</summary>
    public Complex EmfKv(double order)
    {
        double reference = 0;
        SpectrumLine? found = null;
        foreach (SpectrumLine line in Supply.Background!.Lines)
        {
            double snapped = HarmonicOrder.Snap(line.Order);
            reference = snapped == 1 ? line.AngleDeg : reference;
            found = snapped == order ? line : found;
        }

        return found is { } l
            ? l.Percent / 100 * NominalKv * Angle.Phasor(l.AngleDeg + order * (Supply.AngleDeg - reference))
            : Complex.Zero;
    }
}

/// <summary>The sources of a state.</summary>
internal static class HarmonicSources
{
    /// <summary>Live, loaded converters and supplies with a background, in plant order.</summary>
    public static HarmonicSource[] Of(PlantInState plant, PowerFlowSolution powerFlow)
    {
        var sources = new List<HarmonicSource>();
        foreach (PlantElement element in plant.Plant.Elements)
        {
            if (!plant.IsIn(element))
            {
                continue;
            }

            if (element is Converter converter && powerFlow.DrawnAmpere(converter) is var drawn && drawn != Complex.Zero)
            {
                sources.Add(new ConverterSource(converter, drawn));
            }
            else if (element is Supply { Background: not null } supply)
            {
                sources.Add(new BackgroundSource(supply, plant.Plant.Bus(supply.Bus).NominalKv));
            }
        }

        return [.. sources];
    }
}
