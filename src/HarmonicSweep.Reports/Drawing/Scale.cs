using System.Globalization;

namespace HarmonicSweep.Reports.Drawing;

/// <summary>A tick of an axis; a tick without a label is a minor one.</summary>
internal sealed record Tick(double Value, string? Label);

/// <summary>Maps values to a fraction of an axis and knows the ticks of it.</summary>
internal abstract class Scale(double from, double to, IReadOnlyList<Tick> ticks)
{
    public double From { get; } = from;

    public double To { get; } = to;

    /// <summary>Ticks within the range, ascending.</summary>
    public IReadOnlyList<Tick> Ticks { get; } = ticks;

    /// <summary>0 at <see cref="From"/>, 1 at <see cref="To"/>.</summary>
    public abstract double Fraction(double value);

    /// <summary>Width of the widest tick label, sheet units.</summary>
    public double WidestLabel() => Ticks.Max(t => t.Label is null ? 0 : Roboto.Width(t.Label, Look.Text));
}

/// <summary>Even steps.</summary>
internal sealed class LinearScale : Scale
{
    private LinearScale(double from, double to, double step, double minorStep)
        : base(from, to, [.. TicksOf(from, to, step, minorStep)])
    {
    }

    /// <summary>A scale over exactly this range, or half a unit to both sides of a range without width.</summary>
    /// <param name="from">First value.</param>
    /// <param name="to">Last value.</param>
    /// <param name="most">Most labelled steps.</param>
    public static LinearScale Over(double from, double to, int most)
    {
        if (to <= from)
        {
            (from, to) = (from - 0.5, to + 0.5);
        }

        (double step, double minor) = NiceStep((to - from) / most);
        return new LinearScale(from, to, step, minor);
    }

    /// <summary>A scale from zero to a round value at or above the largest.</summary>
    public static LinearScale FromZero(double largest, int most)
    {
        (double step, double minor) = NiceStep((largest > 0 ? largest : 1) / most);
        double to = minor * Math.Ceiling((largest > 0 ? largest : 1) / minor * (1 - 1e-9));
        return new LinearScale(0, to, step, minor);
    }

    /// <summary>A scale with this very step.</summary>
    public static LinearScale Stepped(double from, double to, double step, double minorStep) => new(from, to, step, minorStep);

    public override double Fraction(double value) => (value - From) / (To - From);

    private static (double Step, double Minor) NiceStep(double atLeast)
    {
        double decade = Math.Pow(10, Math.Floor(Math.Log10(atLeast)));
        return (atLeast / decade) switch
        {
            <= 1 + 1e-9 => (decade, decade / 5),
            <= 2 + 1e-9 => (2 * decade, decade / 2),
            <= 5 + 1e-9 => (5 * decade, decade),
            _ => (10 * decade, 2 * decade),
        };
    }

    private static IEnumerable<Tick> TicksOf(double from, double to, double step, double minorStep)
    {
        int perStep = (int)Math.Round(step / minorStep);
        int decimals = Math.Clamp((int)Math.Ceiling(-Math.Log10(step) - 1e-9), 0, 15);
        string format = "F" + decimals.ToString(CultureInfo.InvariantCulture);
        for (long i = (long)Math.Ceiling(from / minorStep - 1e-6); i * minorStep <= to + 1e-6 * minorStep; i++)
        {
            double value = i * minorStep;
            yield return new Tick(value, i % perStep == 0 ? value.ToString(format, CultureInfo.InvariantCulture).Replace('-', '−') : null);
        }
    }
}

/// <summary>Even decades.</summary>
internal sealed class LogScale : Scale
{
    /// <summary>More decades than these below the largest value are cut off: nothing physical lies there.</summary>
    private const double MostDecades = 9;

    private readonly double _logFrom;
    private readonly double _logSpan;

    private LogScale(double from, double to)
        : base(from, to, [.. TicksOf(from, to)])
    {
        _logFrom = Math.Log10(from);
        _logSpan = Math.Log10(to) - _logFrom;
    }

    /// <summary>A scale that covers the positive values, with free room for labels at the top.</summary>
    /// <param name="values">Values by series; those not above zero are passed over.</param>
    /// <param name="headRoom">Fraction of the axis kept free above the largest value.</param>
    public static LogScale Covering(IEnumerable<IEnumerable<double?>> values, double headRoom = 0)
    {
        double smallest = double.PositiveInfinity, largest = 0;
        foreach (double? entry in values.SelectMany(v => v))
        {
            if (entry is { } value && value > 0)
            {
                smallest = Math.Min(smallest, value);
                largest = Math.Max(largest, value);
            }
        }

        if (largest is 0)
        {
            (smallest, largest) = (0.1, 10);
        }

        double top = Math.Log10(largest), bottom = Math.Max(Math.Log10(smallest), top - MostDecades);
        double span = Math.Max(top - bottom, 0.5);
        bottom = (top + bottom - span) / 2 - 0.04 * span;
        top = bottom + 1.04 * span / (1 - Math.Clamp(headRoom, 0.03, 0.5));
        return new LogScale(Math.Pow(10, bottom), Math.Pow(10, top));
    }

    public override double Fraction(double value) =>
        value <= From ? 0 : Math.Clamp((Math.Log10(value) - _logFrom) / _logSpan, 0, 1);

    private static IEnumerable<Tick> TicksOf(double from, double to)
    {
        double decades = Math.Log10(to / from);
        int every = decades > 7 ? 2 : 1;
        int[] labelled = decades > 2.5 ? [1] : decades > 1.2 ? [1, 2, 5] : [1, 2, 3, 4, 5, 7];
        for (int exponent = (int)Math.Floor(Math.Log10(from)); exponent <= (int)Math.Ceiling(Math.Log10(to)); exponent++)
        {
            for (int digit = 1; digit <= 9; digit++)
            {
                double value = digit * Math.Pow(10, exponent);
                if (value < from * (1 - 1e-9) || value > to * (1 + 1e-9) || (every == 2 && digit > 1))
                {
                    continue;
                }

                bool label = labelled.Contains(digit) && (every == 1 || exponent % 2 == 0);
                yield return new Tick(value, label ? LabelOf(digit, exponent) : null);
            }
        }
    }

    private static string LabelOf(int digit, int exponent) => exponent is >= -3 and <= 4
        ? (digit * Math.Pow(10, exponent)).ToString("0.####", CultureInfo.InvariantCulture)
        : digit == 1 ? Figures.Power(exponent) : $"{digit.ToString(CultureInfo.InvariantCulture)}·{Figures.Power(exponent)}";
}
