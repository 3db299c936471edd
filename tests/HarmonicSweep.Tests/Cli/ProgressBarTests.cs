using HarmonicSweep.Cli;
using Xunit;

namespace HarmonicSweep.Tests.Cli;

/// <summary>The bar appears after a second, never runs back, and is wiped.</summary>
public class ProgressBarTests
{
    [Fact]
    public void Report_within_the_first_second_shows_nothing()
    {
        using var writer = new StringWriter();
        var clock = new Clock();
        using (var bar = new ProgressBar(writer, clock, "study"))
        {
            clock.Seconds = 0.9;
            bar.Report(0.5);
        }

        Assert.Empty(writer.ToString());
    }

    [Fact]
    public void Report_shows_share_and_seconds_then_wipes_itself()
    {
        using var writer = new StringWriter();
        var clock = new Clock();
        using (var bar = new ProgressBar(writer, clock, "study"))
        {
            clock.Seconds = 2;
            bar.Report(0.5);
            bar.Report(0.9);
            clock.Seconds = 3;
            bar.Report(0.4);
        }

        string[] shown = writer.ToString().Split('\r');
        Assert.Equal("study [===============               ] 50 % 2 s", shown[1]);
        Assert.Equal("study [===========================   ] 90 % 3 s", shown[2]);
        Assert.Equal(5, shown.Length);
        Assert.Equal("", shown[3].Trim());
        Assert.Equal("", shown[4]);
    }

    private sealed class Clock : TimeProvider
    {
        public double Seconds { get; set; }

        public override long TimestampFrequency => 1000;

        public override long GetTimestamp() => (long)(Seconds * 1000);
    }
}
