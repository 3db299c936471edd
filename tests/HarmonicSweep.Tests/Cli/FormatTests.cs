using HarmonicSweep.Cli;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>Numbers for a person; expected texts are rounded by hand.</summary>
public class FormatTests
{
    [Theory]
    [InlineData(null, "-")]
    [InlineData(double.NaN, "-")]
    [InlineData(double.PositiveInfinity, "-")]
    [InlineData(0.0, "0")]
    [InlineData(1.0, "1.000")]
    [InlineData(-12.3456, "-12.35")]
    [InlineData(123456.0, "123456")]
    [InlineData(0.0123456, "0.01235")]
    [InlineData(1.5e-16, "1.500E-16")]
    [InlineData(2.5e9, "2.500E+9")]
    public void Number_keeps_four_significant_digits(double? value, string expected) => Assert.Equal(expected, Format.Number(value));

    [Theory]
    [InlineData(null, "-")]
    [InlineData(0.0, "0")]
    [InlineData(0.01234567, "0.0123")]
    [InlineData(0.00001, "0.0000")]
    [InlineData(7.18912, "7.189")]
    [InlineData(101.947, "101.9")]
    public void Percent_stops_at_four_decimals(double? value, string expected) => Assert.Equal(expected, Format.Percent(value));

    [Theory]
    [InlineData(5.0, "5")]
    [InlineData(11.3, "11.3")]
    [InlineData(null, "-")]
    public void GivenOrder_is_written_as_given(double? order, string expected) => Assert.Equal(expected, Format.GivenOrder(order));

    [Fact]
    public void Some_counts_what_it_leaves_out() => Assert.Equal("a, b and 2 more", Format.Some(["a", "b", "c", "d"], 2));
}
