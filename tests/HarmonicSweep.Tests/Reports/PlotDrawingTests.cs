using HarmonicSweep.Reports.Drawing;
using Xunit;

namespace HarmonicSweep.Tests.Reports;

/// <summary>The small parts pictures are made of.</summary>
public sealed class PlotDrawingTests
{
    [Fact]
    public void Thinning_keeps_ends_and_extremes_and_at_most_1500_spots()
    {
        var random = new Random(20261201);
        Spot[] run = [.. Enumerable.Range(0, 20_000).Select(i => new Spot(60 + 540.0 * i / 19_999, 300 + 200 * (random.NextDouble() - 0.5)))];
        run[7777] = run[7777] with { Y = 1 };
        run[12345] = run[12345] with { Y = 599 };

        Spot[] thin = Curve.Thin(run);

        Assert.InRange(thin.Length, 2, 1500);
        Assert.Equal(run[0], thin[0]);
        Assert.Equal(run[^1], thin[^1]);
        Assert.Contains(run[7777], thin);
        Assert.Contains(run[12345], thin);
        Assert.Equal(thin.OrderBy(s => s.X), thin);
    }

    [Fact]
    public void Thinning_a_smooth_curve_stays_within_a_tenth_of_a_unit()
    {
        Spot[] run = [.. Enumerable.Range(0, 361).Select(i => new Spot(60 + 1.5 * i, 300 - 200 * Math.Sin(i * Math.PI / 180)))];

        Spot[] thin = Curve.Thin(run);

        Assert.InRange(thin.Length, 20, 150);
        foreach (Spot spot in run)
        {
            int after = Math.Max(1, Array.FindIndex(thin, t => t.X >= spot.X));
            Spot a = thin[after - 1], b = thin[after];
            double y = a.Y + (b.Y - a.Y) * (spot.X - a.X) / (b.X - a.X);
            // the tolerance, 0.06, is square to the line; these lines rise at most 200·(π/180)/1.5 = 2.3, so 2.5 times that upright
            Assert.Equal(y, spot.Y, 0.16);
        }
    }

    [Fact]
    public void Gaps_and_wrapped_angles_break_a_curve()
    {
        var panel = new Panel(new Box(0, 0, 100, 100), LinearScale.Over(0, 10, 5), LinearScale.Stepped(-180, 180, 90, 45));

        Assert.Equal([2, 1], Curve.Runs(panel, [0, 1, 2, 3], [10, 20, null, 30]).Select(r => r.Length));
        Assert.Equal([2, 2], Curve.Runs(panel, [0, 1, 2, 3], [170, 175, -175, -170], 180).Select(r => r.Length));
    }

    [Theory]
    [InlineData(0, "0")]
    [InlineData(12.44, "12.4")]
    [InlineData(0.01234, "0.0123")]
    [InlineData(1240.4, "1240")]
    [InlineData(9.996, "10.00")]
    [InlineData(2.5e7, "2.5·10⁷")]
    [InlineData(4.2e-5, "4.2·10⁻⁵")]
    public void Short_figures_read_as_a_person_writes_them(double value, string expected) => Assert.Equal(expected, Figures.Short(value));

    [Fact]
    public void Log_scale_covers_its_values_and_labels_decades()
    {
        LogScale scale = LogScale.Covering([[0.02, null], [500]], headRoom: 0.2);

        Assert.True(scale.From < 0.02);
        Assert.Equal(0.8, scale.Fraction(500), 0.001);
        Assert.Equal(["0.1", "1", "10", "100", "1000"], scale.Ticks.Where(t => t.Label is not null).Select(t => t.Label));
        // equal ratios are equal lengths, by definition of the scale
        Assert.Equal(scale.Fraction(10) - scale.Fraction(1), scale.Fraction(100) - scale.Fraction(10), 1e-12);
    }

    [Fact]
    public void Linear_scale_has_round_steps_and_a_true_minus()
    {
        Assert.Equal(["−90", "−45", "0", "45", "90"], LinearScale.Stepped(-90, 90, 45, 15).Ticks.Where(t => t.Label is not null).Select(t => t.Label));
        Assert.Equal(["0.0", "0.5", "1.0", "1.5", "2.0"], LinearScale.FromZero(2.1, 5).Ticks.Where(t => t.Label is not null).Select(t => t.Label));
    }

    [Fact]
    public void Names_are_shortened_in_the_middle_to_fit()
    {
        string fitted = Roboto.Fit("Hauptverteilung Süd 1, Feld 12", Look.Text, 100);

        Assert.StartsWith("Haupt", fitted, StringComparison.Ordinal);
        Assert.EndsWith("12", fitted, StringComparison.Ordinal);
        Assert.Contains("…", fitted, StringComparison.Ordinal);
        Assert.InRange(Roboto.Width(fitted, Look.Text), 80, 100);
        Assert.Equal("LV-1", Roboto.Fit("LV-1", Look.Text, 100));
    }

    [Fact]
    public void Svg_escapes_markup_in_names() =>
        Assert.Equal("A<B>&\"C\"", System.Xml.Linq.XDocument.Parse(SvgOf("A<B>&\"C\"")).Descendants().Last().Value);

    [Fact]
    public void Series_differ_in_dash_and_in_mark()
    {
        Assert.Equal(Look.Series.Length, Look.Series.Select(s => s.Mark).Distinct().Count());
        Assert.Equal(Look.Series.Length, Look.Series.Select(s => string.Join(' ', s.Dash)).Distinct(StringComparer.Ordinal).Count());
    }

    [Theory]
    [InlineData("normal", new double[] { 1, 0, 0, 0, 1, 0, 0, 0, 1 })]
    [InlineData("red-blind", new double[] { 0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998 })]
    [InlineData("green-blind", new double[] { 0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.011820, 0.042940, 0.968881 })]
    [InlineData("blue-blind", new double[] { 1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.303900 })]
    public void Series_and_bars_stay_apart_for_every_eye(string eye, double[] matrix)
    {
        // matrices: Machado, Oliveira, Fernandes 2009, full severity, in linear light (values from memory)
        foreach (Colour[] colours in new[] { Look.Series.Select(s => s.Colour).ToArray(), Look.Bars })
        {
            for (int i = 0; i < colours.Length; i++)
            {
                for (int j = 0; j < i; j++)
                {
                    double[] a = LabOf(colours[i], matrix), b = LabOf(colours[j], matrix);
                    double distance = Math.Sqrt(a.Zip(b, (x, y) => (x - y) * (x - y)).Sum());
                    // 2.3 is a just noticeable difference (common practice); thin lines need several times that
                    Assert.True(distance > 18, FormattableString.Invariant($"{eye}: colours {i} and {j} are {distance:0.0} apart"));
                }
            }
        }
    }

    [Fact]
    public void Heat_shades_darken_all_the_way()
    {
        double[] identity = [1, 0, 0, 0, 1, 0, 0, 0, 1];
        double[] lightness = [.. Enumerable.Range(0, 64).Select(i => LabOf(Look.Heat(i / 63.0), identity)[0])];

        Assert.All(lightness.Zip(lightness.Skip(1)), pair => Assert.True(pair.Second < pair.First));
        Assert.True(lightness[0] > 95 && lightness[^1] < 10);
    }

    private static string SvgOf(string text)
    {
        var sheet = new SvgSheet(100, 50, "t");
        sheet.Write(text, 0, 20, Look.Text);
        return sheet.ToDocument();
    }

    /// <summary>CIE 1976 L*a*b* under D65 of an sRGB colour (IEC 61966-2-1) seen through a matrix.</summary>
    private static double[] LabOf(Colour colour, double[] m)
    {
        double[] c = [Linear(colour.Red), Linear(colour.Green), Linear(colour.Blue)];
        double[] s = [.. Enumerable.Range(0, 3).Select(r => Math.Clamp(m[3 * r] * c[0] + m[3 * r + 1] * c[1] + m[3 * r + 2] * c[2], 0, 1))];
        double x = F((0.4124 * s[0] + 0.3576 * s[1] + 0.1805 * s[2]) / 0.9505);
        double y = F(0.2126 * s[0] + 0.7152 * s[1] + 0.0722 * s[2]);
        double z = F((0.0193 * s[0] + 0.1192 * s[1] + 0.9505 * s[2]) / 1.089);
        return [116 * y - 16, 500 * (x - y), 200 * (y - z)];

        static double Linear(byte value) => value / 255.0 is var v && v <= 0.04045 ? v / 12.92 : Math.Pow((v + 0.055) / 1.055, 2.4);
        static double F(double t) => t > 216.0 / 24389 ? Math.Cbrt(t) : (24389.0 / 27 * t + 16) / 116;
    }
}
