using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Headers and cells: every complaint names its place and says how to mend it.</summary>
public class HeaderTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "sound", p => p },
        { "unknown column", p => p.Replace("loads.csv", "power_factor", "powerfactor"),
            "loads.csv(1,powerfactor): error HS005: unknown column 'powerfactor'; known are name, bus, p_kw, power_factor, q_kvar, model, motor_share_percent, connection, source. Fix: did you mean 'power_factor'? Otherwise remove the column (remarks may stand in a column named source or in # lines)."
        },
        { "column of no likeness", p => p.Replace("buses.csv", "note", "colour"),
            "buses.csv(1,colour): error HS005: unknown column 'colour'; known are bus, nominal_kv, note, source. Fix: remove the column (remarks may stand in a column named source or in # lines)."
        },
        { "required column missing", p => p.With("buses.csv", "bus\nGRID-BUS\nMAIN\nMAIN-B\nLV"),
            "buses.csv(1,nominal_kv): error HS007: column nominal_kv is missing; expected a number above 0 in kV in every row. Fix: add the column to the header and fill it in."
        },
        { "required column missing in an element table", p => p.With("loads.csv", "name,bus,power_factor\nLIGHTS,LV,0.9"),
            "loads.csv(1,p_kw): error HS007: column p_kw is missing; expected a number of at least 0 in kW in every row. Fix: add the column to the header and fill it in."
        },
        { "name column missing", p => p.With("loads.csv", "bus,p_kw,power_factor\nLV,350,0.9"),
            "loads.csv(1,name): error HS007: column name is missing; expected a name that nothing else bears in every row. Fix: add the column to the header and fill it in."
        },
        { "repeated column", p => p.With("loads.csv", "name,bus,p_kw,P_kW,power_factor\nLIGHTS,LV,350,abc,0.9"),
            "loads.csv(1,p_kw): error HS006: column p_kw stands twice in the header. Fix: keep one of them."
        },
        { "cells under no header", p => p.With("loads.csv", "name,bus,p_kw,,power_factor\nLIGHTS,LV,350,7,0.9"),
            "loads.csv(1): error HS005: column 4 has cells but no header. Fix: name the column, or clear it."
        },
        { "headers all wrong", p => p.With("loads.csv", "id,node,kilowatts\nLIGHTS,LV,350\nMORE,LV,20"),
            "loads.csv(1): error HS007: no column of loads.csv stands in its first line; expected a header with name, bus, p_kw, power_factor, q_kvar, model, motor_share_percent, connection, source. Fix: write the header line; required are name, bus, p_kw."
        },
        { "no header at all", p => p.With("loads.csv", "LIGHTS,LV,350,0.9"),
            "loads.csv(1): error HS007: no column of loads.csv stands in its first line; expected a header with name, bus, p_kw, power_factor, q_kvar, model, motor_share_percent, connection, source. Fix: write the header line; required are name, bus, p_kw."
        },
        { "too few cells", p => p.With("loads.csv", "name,bus,p_kw,power_factor\nLIGHTS,LV,350"),
            "loads.csv(2): error HS008: the row has 3 cells; expected 4, as in the header. Fix: give every column its cell (blank between two separators)."
        },
        { "decimal comma among commas", p => p.With("loads.csv", "name,bus,p_kw,power_factor\nLIGHTS,LV,350,0,92"),
            "loads.csv(2): error HS008: the row has 5 cells; expected 4, as in the header. Fix: give every column its cell (blank between two separators); write decimals with a point, and a text with a comma in it in double quotes."
        },
        { "too few cells in a bus row", p => p.Replace("buses.csv", "MAIN,11,", "MAIN,11"),
            "buses.csv(3): error HS008: the row has 2 cells; expected 3, as in the header. Fix: give every column its cell (blank between two separators)."
        },
        { "blank required cells", p => p.With("loads.csv", "name,bus,p_kw,power_factor\n,,,0.9"),
            "loads.csv(2,name): error HS009: name is blank; expected a name that nothing else bears. Fix: fill the cell in.",
            "loads.csv(2,bus): error HS009: bus is blank; expected the name of a bus of buses.csv. Fix: fill the cell in.",
            "loads.csv(2,p_kw): error HS009: p_kw is blank; expected a number of at least 0 in kW. Fix: fill the cell in."
        },
        { "text for a number", p => p.Replace("loads.csv", "350", "350 kW"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '350 kW'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "below the range", p => p.Replace("cables.csv", "1.2", "-1.2"),
            "cables.csv(2,length_km): error HS011: C1: length_km is -1.2; expected a number above 0 in km. Fix: remove the minus sign, or check which column the value belongs to."
        },
        { "zero where above 0 is expected", p => p.Replace("transformers.csv", "MAIN,10,33", "MAIN,0,33"),
            "transformers.csv(2,rated_mva): error HS011: T1: rated_mva is 0; expected a number above 0 in MVA. Fix: correct the value, or check its unit."
        },
        { "percent for a fraction", p => p.Replace("loads.csv", "0.92", "92"),
            "loads.csv(2,power_factor): error HS011: LIGHTS: power_factor is 92; expected a number above 0 up to 1. Fix: write 0.92 if 92 percent is meant."
        },
        { "fraction of a motor", p => p.Replace("motors.csv", "0.25,3", "0.25,2.5"),
            "motors.csv(2,count): error HS011: PUMPS: count is 2.5; expected a whole number from 1 to 100000. Fix: correct the value, or check which column it belongs to."
        },
        { "unknown word", p => p.Replace("loads.csv", "parallel", "paralel"),
            "loads.csv(2,model): error HS014: LIGHTS: model is 'paralel'; expected one of parallel, series, growing, cigre, none. Fix: did you mean 'parallel'? Otherwise write one of those words, or leave the cell blank for the default."
        },
        { "yes or no", p => p.Replace("couplers.csv", ",no", ",open"),
            "couplers.csv(2,closed): error HS014: BC: closed is 'open'; expected yes, no, true, false, 1 or 0. Fix: write yes or no."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
