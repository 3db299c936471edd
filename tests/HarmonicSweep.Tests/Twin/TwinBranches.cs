using System.Numerics;
using HarmonicSweep.Network;

namespace HarmonicSweep.Tests.Twin;

/// <summary>
/// Two-port admittances of the branches, siemens per phase, written from the model text.
/// Entry [0,0] belongs to end A (high-voltage side), [1,1] to end B; currents are positive into the element.
/// </summary>
internal static class TwinBranches
{
    private static readonly Complex J = Complex.ImaginaryOne;

    public static Complex[,] Line(Line line, double frequencyHz, double h)
    {
        Complex z = line.ResistanceOhmPerKm * line.Law.Factor(h) + J * h * line.ReactanceOhmPerKm;
        Complex y = J * h * (2 * Math.PI * frequencyHz) * line.CapacitanceNanofaradPerKm * 1e-9;
        Complex series;
        Complex halfShunt;
        if (y == Complex.Zero)
        {
            series = 1 / (z * line.LengthKm);
            halfShunt = 0;
        }
        else
        {
            Complex characteristic = Complex.Sqrt(z / y);
            Complex gl = Complex.Sqrt(z * y) * line.LengthKm;
            series = 1 / (characteristic * Sinh(gl));
            halfShunt = HalfTangent(gl) / characteristic;
        }

        return Scaled(line.Circuits, new[,] { { series + halfShunt, -series }, { -series, series + halfShunt } });
    }

    public static Complex[,] Reactor(SeriesReactor reactor, double h)
    {
        Complex y = 1 / (reactor.ReactanceOhm / reactor.QualityFactor * reactor.Law.Factor(h) + J * h * reactor.ReactanceOhm);
        return new[,] { { y, -y }, { -y, y } };
    }

    /// <summary>The ideal ratio, the shift and the short-circuit impedance, as the model text has them.</summary>
    /// <param name="sequence">+1 positive, -1 negative sequence.</param>
    public static Complex[,] Transformer(PlantInState state, Transformer transformer, double h, int sequence)
    {
        double baseOhm = transformer.LvKv * transformer.LvKv / transformer.RatedMva;
        double r = transformer.ResistancePercent / 100 * baseOhm;
        double magnitude = transformer.ImpedancePercent / 100 * baseOhm;
        double x = Math.Sqrt(magnitude * magnitude - r * r);
        Complex y = 1 / (r * transformer.Law.Factor(h) + J * h * x);
        double a = transformer.HvKv / transformer.LvKv * (1 + state.TapPercent(transformer) / 100);
        Complex turn = Complex.FromPolarCoordinates(1, sequence * transformer.Group.Clock * Math.PI / 6);
        return new[,] { { y / (a * a), -(y / a) * turn }, { -(y / a) * Complex.Conjugate(turn), y } };
    }

    public static Complex NoLoad(Transformer transformer, double h)
    {
        double p0 = transformer.NoLoadLossKw / 1000;
        double s0 = transformer.NoLoadCurrentPercent / 100 * transformer.RatedMva;
        double hv2 = transformer.HvKv * transformer.HvKv;
        return new Complex(p0 / hv2, -Math.Sqrt(Math.Max(s0 * s0 - p0 * p0, 0)) / (h * hv2));
    }

    /// <summary>
    /// sinh by its definition, or by its series where e^x - e^-x would cancel (|x| below 0.1: the first
    /// term left out is below 1e-21 of the sum).
    /// </summary>
    private static Complex Sinh(Complex x)
    {
        if (x.Magnitude > 0.1)
        {
            return (Complex.Exp(x) - Complex.Exp(-x)) / 2;
        }

        Complex term = x;
        Complex sum = x;
        for (int n = 1; n <= 7; n++)
        {
            term *= x * x / (2 * n * (2 * n + 1));
            sum += term;
        }

        return sum;
    }

    /// <summary>tanh(x/2) = sinh x/(1 + cosh x), where nothing cancels near x = 0.</summary>
    private static Complex HalfTangent(Complex x) => Sinh(x) / (1 + (Complex.Exp(x) + Complex.Exp(-x)) / 2);

    private static Complex[,] Scaled(double factor, Complex[,] y)
    {
        for (int i = 0; i < 2; i++)
        {
            for (int k = 0; k < 2; k++)
            {
                y[i, k] *= factor;
            }
        }

        return y;
    }
}
