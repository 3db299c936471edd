using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Headers and cells: every complaint names its place and says how to mend it.</summary>
public class HeaderTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "sound", p => p },
        { "unknown column", p => p.Replace("loads.csv", "power_factor", "powerfactor") },
        { "column of no likeness", p => p.Replace("buses.csv", "note", "colour") },
        { "required column missing", p => p.With("buses.csv", "bus\nGRID-BUS\nMAIN\nMAIN-B\nLV") },
        { "required column missing in an element table", p => p.With("loads.csv", "name,bus,power_factor\nLIGHTS,LV,0.9") },
        { "name column missing", p => p.With("loads.csv", "bus,p_kw,power_factor\nLV,350,0.9") },
        { "repeated column", p => p.With("loads.csv", "name,bus,p_kw,P_kW,power_factor\nLIGHTS,LV,350,abc,0.9") },
        { "cells under no header", p => p.With("loads.csv", "name,bus,p_kw,,power_factor\nLIGHTS,LV,350,7,0.9") },
        { "headers all wrong", p => p.With("loads.csv", "id,node,kilowatts\nLIGHTS,LV,350\nMORE,LV,20") },
        { "no header at all", p => p.With("loads.csv", "LIGHTS,LV,350,0.9") },
        { "too few cells", p => p.With("loads.csv", "name,bus,p_kw,power_factor\nLIGHTS,LV,350") },
        { "decimal comma among commas", p => p.With("loads.csv", "name,bus,p_kw,power_factor\nLIGHTS,LV,350,0,92") },
        { "too few cells in a bus row", p => p.Replace("buses.csv", "MAIN,11,", "MAIN,11") },
        { "blank required cells", p => p.With("loads.csv", "name,bus,p_kw,power_factor\n,,,0.9") },
        { "text for a number", p => p.Replace("loads.csv", "350", "350 kW") },
        { "below the range", p => p.Replace("cables.csv", "1.2", "-1.2") },
        { "zero where above 0 is expected", p => p.Replace("transformers.csv", "MAIN,10,33", "MAIN,0,33") },
        { "percent for a fraction", p => p.Replace("loads.csv", "0.92", "92") },
        { "fraction of a motor", p => p.Replace("motors.csv", "0.25,3", "0.25,2.5") },
        { "unknown word", p => p.Replace("loads.csv", "parallel", "paralel") },
        { "yes or no", p => p.Replace("couplers.csv", ",no", ",open") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
