using System.Numerics;

namespace HarmonicSweep.Network;

/// <summary>Angles in degrees.</summary>
public static class Angle
{
    /// <summary>The unit phasor at an angle in degrees; exact at multiples of 90.</summary>
    public static Complex Phasor(double degrees)
    {
        double turn = Math.IEEERemainder(degrees, 360);
        return turn switch
        {
            0 => Complex.One,
            90 => Complex.ImaginaryOne,
            -90 => -Complex.ImaginaryOne,
            180 or -180 => -Complex.One,
            _ => Complex.FromPolarCoordinates(1, turn * Math.PI / 180),
        };
    }

    /// <summary>The angle of a phasor, degrees, above -180 to 180.</summary>
    public static double Degrees(Complex phasor) => phasor.Phase * 180 / Math.PI;
}
