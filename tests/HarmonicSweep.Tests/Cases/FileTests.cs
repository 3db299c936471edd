using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Files that are missing, unknown, not text, or quoted wrongly.</summary>
public class FileTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "no case.toml", p => p.Without("case.toml") },
        { "no buses", p => p.Without("buses.csv") },
        { "buses header only", p => p.With("buses.csv", "bus,nominal_kv") },
        { "buses empty", p => p.With("buses.csv", "") },
        { "buses comments only", p => p.With("buses.csv", "# none\n\n# yet\n") },
        { "no source", p => p.Without("supplies.csv").Without("generators.csv").Without("states.csv").With("spectra.csv", "spectrum,order,percent,angle_deg\nsix pulse,1,100,0\nsix pulse,5,20,180") },
        { "unknown table", p => p.With("load.csv", "name\n") },
        { "table in capitals", p => p.Without("loads.csv").With("Loads.CSV", "name\n") },
        { "unknown toml", p => p.With("settings.toml", "x = 1") },
        { "other files left alone", p => p.With("notes.txt", "hello").With(".hidden.csv", "x").With("drawing.dwg", [0, 1, 2]) },
        { "three-winding transformers", p => p.With("transformers3.csv", "name,hv_side\nT9,MAIN\nT10,MAIN") },
        { "later table without rows", p => p.With("impedance_tables.csv", "table,frequency_hz,r_ohm,x_ohm\n") },
        { "code page", p => p.With("loads.csv", [.. "name,bus,p_kw,power_factor\nS"u8, 0xE4, .. "ge,LV,3,0.9"u8]) },
        { "code page in buses", p => p.With("buses.csv", [.. "bus,nominal_kv\nS"u8, 0xE4, .. "ge,0.4\n"u8]) },
        { "UTF-16 without mark", p => p.With("loads.csv", [.. "n\0a\0m\0e\0"u8]) },
        { "UTF-16 cut in half", p => p.With("loads.csv", [0xFF, 0xFE, 0x41, 0x00, 0x00, 0xD8]) },
        { "inch mark", p => p.Append("loads.csv", "5\" line,LV,3,0.9,,,,") },
        { "quote never closed", p => p.Append("loads.csv", "\"A,LV,3,0.9,,,,\nB,LV,3,0.9,,,,\nC,NOWHERE,3,0.9,,,,") },
        { "quote never closed in buses", p => p.With("buses.csv", "bus,nominal_kv\nGRID-BUS,33\n\"MAIN,11\nMAIN-B,11\nLV,0.4") },
        { "quote never closed in the header", p => p.With("buses.csv", "\"bus,nominal_kv\nGRID-BUS,33") },
        { "quote after the end", p => p.Append("loads.csv", "\"") },
        { "line after a quoted line break", p => p.With("buses.csv", "bus,nominal_kv,note\nGRID-BUS,33,\"incoming\nfrom the utility\"\nMAIN,eleven,\nMAIN-B,11,\nLV,0.4,") },
        { "row taken for a comment", p => p.Append("loads.csv", "#1 FAN,LV,3,0.9,,,,\n# 2 FAN,LV,3,0.9,,,,") },
        { "law in a semicolon table", p => p.With("reactors.csv", "name;end_a;end_b;x_ohm;q_factor;resistance_law\nR1;MAIN;MAIN-B;0,2;40;power:0.9;0.1;1.5") },
        { "decimals both ways", p => p.With("buses.csv", "bus;nominal_kv\nGRID-BUS;33\nMAIN;11,0\nMAIN-B;11.0\nLV;0,4") },
        { "thousands and decimals", p => p.With("loads.csv", "name;bus;p_kw;power_factor\nLIGHTS;LV;1.350,5;0,92\nFANS;LV;1,350,5;0,92") },
        { "thousands in quotes", p => p.Replace("loads.csv", "350", "\"1,350\"") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
