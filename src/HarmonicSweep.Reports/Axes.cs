using System.Globalization;
using ScottPlot;
using ScottPlot.TickGenerators;

namespace HarmonicSweep.Reports;

/// <summary>Axes of orders and of ohms on a logarithmic scale.</summary>
internal static class Axes
{
    /// <summary>More injected orders than this as lines would hide the curves.</summary>
    private const int MostInjected = 30;

    /// <summary>Room for the numbers of the injected orders above a panel.</summary>
    public const float InjectedRoom = 26;

    /// <summary>Ticks of an order axis: every 5 orders over a usual range.</summary>
    public static void Orders(Plot plot, double from, double to, bool labelled)
    {
        double span = to - from;
        double step = span <= 12 ? 1 : span <= 30 ? 2 : span <= 70 ? 5 : Math.Ceiling(span / 12 / 5) * 5;
        var ticks = new NumericManual();
        for (double tick = Math.Ceiling(from / step - 1e-9) * step; tick <= to + 1e-9; tick += step)
        {
            ticks.AddMajor(tick, labelled ? tick.ToString("0.##", CultureInfo.InvariantCulture) : "");
            for (int minor = 1; minor < 5 && span <= 70; minor++)
            {
                ticks.AddMinor(tick + step * minor / 5);
            }
        }

        plot.Axes.Bottom.TickGenerator = ticks;
        plot.Axes.SetLimitsX(from, to);
        if (labelled)
        {
            plot.Axes.Bottom.Label.Text = "Order h (frequency / fundamental)";
        }
    }

    /// <summary>A vertical axis whose data are log10 of the values, with ticks at 1, 2 and 5.</summary>
    public static void Logarithmic(Plot plot, double lowest, double highest, string label)
    {
        double bottom = Math.Log10(lowest);
        double top = Math.Log10(highest);
        double margin = Math.Max(0.08 * (top - bottom), 0.05);
        // room above for the labels of peaks
        plot.Axes.SetLimitsY(bottom - margin, top + 2.4 * margin);
        var ticks = new NumericManual();
        bool sparse = top - bottom > 3.2;
        for (int decade = (int)Math.Floor(bottom - margin); decade <= Math.Ceiling(top + 2.4 * margin); decade++)
        {
            for (int digit = 1; digit < 10; digit++)
            {
                double value = digit * Math.Pow(10, decade);
                if (digit == 1 || (!sparse && digit is 2 or 5))
                {
                    ticks.AddMajor(Math.Log10(value), Figures.Tick(value));
                }
                else
                {
                    ticks.AddMinor(Math.Log10(value));
                }
            }
        }

        plot.Axes.Left.TickGenerator = ticks;
        plot.Axes.Left.Label.Text = label;
    }

    /// <summary>Ticks at given places with given texts, from the top down when the axis is turned.</summary>
    public static NumericManual Named(IEnumerable<(double Place, string Text)> names)
    {
        var ticks = new NumericManual();
        foreach ((double place, string text) in names)
        {
            ticks.AddMajor(place, text);
        }

        return ticks;
    }

    /// <summary>Thin lines at the injected orders, their numbers above the panel when asked for; with a light rim on a shaded panel.</summary>
    public static void Injected(Plot plot, IReadOnlyList<double> orders, double from, double to, bool numbered, bool shaded = false)
    {
        double[] inside = [.. orders.Where(h => h >= from && h <= to)];
        double lastNumber = double.NegativeInfinity;
        foreach (double order in inside.Length > MostInjected ? [] : inside)
        {
            if (shaded)
            {
                // a rim that carries the line over dark shades
                plot.Add.VerticalLine(order, 2.6f, Colors.White.WithAlpha(0.55));
            }

            ScottPlot.Plottables.VerticalLine line = plot.Add.VerticalLine(order, 1, Look.InjectedOrder, LinePattern.Dotted);
            // numbers closer than this would touch
            if (numbered && order - lastNumber > (to - from) * 0.018)
            {
                lastNumber = order;
                line.LabelText = Figures.Order(order);
                line.LabelOppositeAxis = true;
                line.LabelFontSize = Look.SmallSize;
                line.LabelFontColor = Look.InjectedOrder;
                line.LabelBackgroundColor = Colors.Transparent;
                line.LabelBold = false;
            }
        }
    }
}
