using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Everything wrong is told at once, by file and line.</summary>
public class ManyErrorsTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "ten errors and more over many files",
            p => p.Replace("case.toml", "step_hz = 1", "step_hz = -1")
                .Replace("buses.csv", "MAIN-B,11", "MAIN-B,11 kV")
                .Replace("cables.csv", "1.2", "-1.2")
                .Replace("capacitors.csv", "7,50", "7,")
                .Replace("converters.csv", "six pulse", "six puls")
                .Replace("loads.csv", "LIGHTS,LV,350,0.92", "LIGHTS,LVV,350,92")
                .Append("loads.csv", "LIGHTS,LV,,,,,,")
                .Replace("motors.csv", "efficiency_percent", "efficiency")
                .Replace("states.csv", "steps=2", "step=2")
                .Append("states.csv", "base,GRID,out")
                .Replace("supplies.csv", "500,,300,,", "500,9,300,,")
                .Replace("transformers.csv", "15,,Dyn11", "15,,Dyn10")
                .With("bus.csv", "bus\n") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
