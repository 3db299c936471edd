using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Operating states.</summary>
public class StateTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "reserved base", p => p.Append("states.csv", "base,BANK,out") },
        { "reserved all", p => p.Append("states.csv", "All,BANK,out") },
        { "element unknown", p => p.Append("states.csv", "night,BANKK,out") },
        { "bus for an element", p => p.Append("states.csv", "night,MAIN,out") },
        { "setting unknown", p => p.Append("states.csv", "night,GRID,off") },
        { "setting misspelt", p => p.Append("states.csv", "night,LIGHTS,loadin=20") },
        { "setting without a value", p => p.Append("states.csv", "dim,LIGHTS,loading") },
        { "setting with a value too much", p => p.Append("states.csv", "dim,LIGHTS,out=1") },
        { "steps beyond the bank", p => p.Replace("states.csv", "steps=2", "steps=7") },
        { "steps below 0", p => p.Replace("states.csv", "steps=2", "steps=-1") },
        { "half a step", p => p.Replace("states.csv", "steps=2", "steps=2.5") },
        { "steps of a load", p => p.Replace("states.csv", "night,BANK", "night,LIGHTS") },
        { "steps of a filter", p => p.Replace("states.csv", "night,BANK", "night,F5") },
        { "sc of a generator", p => p.Replace("states.csv", "weak grid,GRID", "weak grid,GEN") },
        { "sc of nothing", p => p.Replace("states.csv", "sc=min", "sc=0") },
        { "sc infinite", p => p.Replace("states.csv", "sc=min", "sc=inf") },
        { "sc overflows", p => p.Replace("states.csv", "sc=min", "sc=1e308") },
        { "tap of a cable", p => p.Append("states.csv", "night,C1,tap=2.5") },
        { "tap beyond 30", p => p.Append("states.csv", "night,T1,tap=-45") },
        { "loading of a bank", p => p.Append("states.csv", "night,BANK,loading=50") },
        { "loading beyond 300", p => p.Append("states.csv", "night,DRIVE,loading=1000") },
        { "decimal comma among commas", p => p.Append("states.csv", "night,T1,\"tap=-2,5\"") },
        { "same setting twice", p => p.Append("states.csv", "night,BANK,steps=3") },
        { "in and out", p => p.Append("states.csv", "night,T1,in\nnight,T1,out") },
        { "blank cells", p => p.Append("states.csv", ",,") .Append("states.csv", "night,,out") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
