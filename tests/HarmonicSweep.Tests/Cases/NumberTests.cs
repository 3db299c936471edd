using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Numbers nobody could mean: refused with the cell as it stands, never read as something else.</summary>
public class NumberTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "huge", p => p.Replace("loads.csv", "350", "1e308") },
        { "beyond a double", p => p.Replace("loads.csv", "350", "1e400") },
        { "tiny", p => p.Replace("loads.csv", "350", "1e-320") },
        { "below a double", p => p.Replace("loads.csv", "350", "1e-400") },
        { "squared it overflows", p => p.Replace("buses.csv", "LV,0.4", "LV,1e200") },
        { "NaN", p => p.Replace("loads.csv", "350", "NaN") },
        { "Infinity", p => p.Replace("loads.csv", "350", "Infinity") },
        { "infinity sign", p => p.Replace("loads.csv", "350", "\u221E") },
        { "full-width digits", p => p.Replace("loads.csv", "350", "\uFF11\uFF12") },
        { "hexadecimal", p => p.Replace("loads.csv", "350", "0x10") },
        { "blank for thousands", p => p.Replace("loads.csv", "350", "1 350") },
        { "narrow blank for thousands", p => p.Replace("loads.csv", "350", "1\u202F350") },
        { "apostrophe for thousands", p => p.Replace("loads.csv", "350", "1'350") },
        { "minus sign of typography", p => p.Replace("supplies.csv", "GRID-BUS,1,0", "GRID-BUS,1,\u221230") },
        { "percent sign", p => p.Replace("transformers.csv", "33,11,10,15", "33,11,10 %,15") },
        { "formula", p => p.Replace("loads.csv", "350", "=A1*2") },
        { "error of a spreadsheet", p => p.Replace("loads.csv", "350", "#REF!") },
        { "date of a spreadsheet", p => p.Replace("transformers.csv", "MAIN,10,33", "MAIN,10-Jan,33") },
        { "a cell of a million digits", p => p.Replace("loads.csv", "350", new string('9', 1_000_000)) },
        { "a cell of a million letters", p => p.Replace("loads.csv", "350", new string('x', 1_000_000)) },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
