using HarmonicSweep.Studies.Standards;
using Xunit;

namespace HarmonicSweep.Tests.Published;

/// <summary>
/// IEEE 519 limits, typed here a second time. Table 2: reprint of the 1992 numbers in Kusko and Thompson, Power Quality in Electrical
/// Systems, p. 17 (2014 and 2022 keep them; last column up to h = 50 since 2014). Table 1: ebrary.net "Current limits" and a comparison of
/// the editions. Tables 3 and 4: from memory. Even orders of 2022 (half up to h = 6, whole above): a comparison of the editions on
/// studylib.net. A ratio on a boundary takes the upper row. Exact: table values.
/// </summary>
public sealed class LimitTableTests
{
    [Theory]
    [InlineData(0.4, 5, 8)]
    [InlineData(1, 5, 8)]
    [InlineData(1.001, 3, 5)]
    [InlineData(69, 3, 5)]
    [InlineData(69.01, 1.5, 2.5)]
    [InlineData(161, 1.5, 2.5)]
    [InlineData(161.1, 1, 1.5)]
    [InlineData(400, 1, 1.5)]
    public void Voltage_limits_by_class(double kv, double individual, double thd)
    {
        VoltageRow row = Ieee519.VoltageLimits(kv);
        Assert.Equal((individual, thd), (row.IndividualPercent, row.ThdPercent));
    }

    [Theory]
    [InlineData(13.8, 19.99, 4.0, 2.0, 1.5, 0.6, 0.3, 5.0)]
    [InlineData(13.8, 20, 7.0, 3.5, 2.5, 1.0, 0.5, 8.0)]
    [InlineData(69, 49.9, 7.0, 3.5, 2.5, 1.0, 0.5, 8.0)]
    [InlineData(0.48, 50, 10.0, 4.5, 4.0, 1.5, 0.7, 12.0)]
    [InlineData(13.8, 100, 12.0, 5.5, 5.0, 2.0, 1.0, 15.0)]
    [InlineData(13.8, 999, 12.0, 5.5, 5.0, 2.0, 1.0, 15.0)]
    [InlineData(13.8, 1000, 15.0, 7.0, 6.0, 2.5, 1.4, 20.0)]
    [InlineData(115, 10, 2.0, 1.0, 0.75, 0.3, 0.15, 2.5)]
    [InlineData(161, 20, 3.5, 1.75, 1.25, 0.5, 0.25, 4.0)]
    [InlineData(115, 50, 5.0, 2.25, 2.0, 0.75, 0.35, 6.0)]
    [InlineData(115, 100, 6.0, 2.75, 2.5, 1.0, 0.5, 7.5)]
    [InlineData(115, 1e6, 7.5, 3.5, 3.0, 1.25, 0.7, 10.0)]
    [InlineData(230, 24.9, 1.0, 0.5, 0.38, 0.15, 0.1, 1.5)]
    [InlineData(230, 25, 2.0, 1.0, 0.75, 0.3, 0.15, 2.5)]
    [InlineData(400, 50, 3.0, 1.5, 1.15, 0.45, 0.22, 3.75)]
    public void Current_limits_by_ratio_and_band(double kv, double ratio, double to11, double to17, double to23, double to35, double to50, double tdd)
    {
        CurrentRow row = Ieee519.CurrentTableFor(kv).RowFor(ratio);
        (int Order, double Limit)[] edges =
        [
            (3, to11), (5, to11), (9, to11), (11, to17), (15, to17), (17, to23), (21, to23), (23, to35), (33, to35), (35, to50), (49, to50),
        ];
        Assert.All(edges, e => Assert.Equal(e.Limit, row.LimitPercent(e.Order)));
        Assert.Equal(tdd, row.TddPercent);
    }

    [Fact]
    public void Even_orders_take_half_to_the_6th_and_the_whole_above()
    {
        CurrentRow row = Ieee519.CurrentTableFor(13.8).RowFor(10);
        Assert.Equal([2.0, 2.0, 2.0, 4.0, 4.0, 2.0, 1.5, 0.6, 0.3], ((int[])[2, 4, 6, 8, 10, 12, 22, 34, 50]).Select(row.LimitPercent));
    }

    [Fact]
    public void Table_3_is_half_of_table_2()
    {
        CurrentTable two = Ieee519.CurrentTableFor(69);
        CurrentTable three = Ieee519.CurrentTableFor(69.1);
        foreach (double ratio in (double[])[5, 30, 70, 500, 2000])
        {
            Assert.Equal(two.RowFor(ratio).BandPercent.Select(p => p / 2), three.RowFor(ratio).BandPercent);
            Assert.Equal(two.RowFor(ratio).TddPercent / 2, three.RowFor(ratio).TddPercent);
        }
    }
}
