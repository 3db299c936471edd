using System.Globalization;
using System.Numerics;
using HarmonicSweep.Tests.Twin;
using Xunit;

namespace HarmonicSweep.Tests.Properties;

/// <summary>
/// Holds one impedance against the twin. Two programs that stamp the same model in different order and units differ by the rounding of
/// the stamps, amplified by the condition of the network: the bound is 1e-10 of the value plus 64 roundings amplified entry by entry
/// (|Z||Y||Z|, first-order perturbation theory), so a well-conditioned network is held to 1e-10 and none is let off.
/// </summary>
internal static class ImpedanceComparison
{
    public static void Check(TwinMatrix matrix, string at, string from, Complex? actual, string label)
    {
        Complex? expected = matrix.Impedance(at, from);
        string where = string.Create(CultureInfo.InvariantCulture, $"{label}, at {at} from {from}: twin {expected}, study {actual}");
        Assert.True(expected.HasValue == actual.HasValue, where);
        if (expected is { } z)
        {
            double bound = 1e-10 * z.Magnitude + 64 * matrix.RoundingOhm(at, from);
            Assert.True((actual!.Value - z).Magnitude <= bound, where);
        }
    }
}
