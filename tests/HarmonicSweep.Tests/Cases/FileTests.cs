using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Files that are missing, unknown, not text, or quoted wrongly.</summary>
public class FileTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "no case.toml", p => p.Without("case.toml"),
            "case.toml: error HS002: there is no case.toml in 'FOLDER'; expected at least title and frequency_hz. Fix: write one, or start from the templates of: hsweep new FOLDER"
        },
        { "no buses", p => p.Without("buses.csv"),
            "buses.csv: error HS039: the plant has no bus; expected at least one. Fix: list the buses in buses.csv: name and nominal_kv."
        },
        { "buses header only", p => p.With("buses.csv", "bus,nominal_kv"),
            "buses.csv: error HS039: the plant has no bus; expected at least one. Fix: list the buses in buses.csv: name and nominal_kv."
        },
        { "buses empty", p => p.With("buses.csv", ""),
            "buses.csv: error HS039: the plant has no bus; expected at least one. Fix: list the buses in buses.csv: name and nominal_kv."
        },
        { "buses comments only", p => p.With("buses.csv", "# none\n\n# yet\n"),
            "buses.csv: error HS039: the plant has no bus; expected at least one. Fix: list the buses in buses.csv: name and nominal_kv."
        },
        { "no source", p => p.Without("supplies.csv").Without("generators.csv").Without("states.csv").With("spectra.csv", "spectrum,order,percent,angle_deg\nsix pulse,1,100,0\nsix pulse,5,20,180"),
            "supplies.csv: error HS040: the plant has neither a supply nor a generator, so no bus is live. Fix: add the utility in-feed to supplies.csv."
        },
        { "unknown table", p => p.With("load.csv", "name\n"),
            "load.csv: error HS004: unknown file load.csv; known are case.toml, buses.csv, couplers.csv, supplies.csv, generators.csv, transformers.csv, cables.csv, lines.csv, reactors.csv, loads.csv, motors.csv, capacitors.csv, filters.csv, spectra.csv, converters.csv, states.csv, transformers3.csv, grounding_transformers.csv, impedance_tables.csv. Fix: did you mean 'loads.csv'? Otherwise move it out of the case folder."
        },
        { "table in capitals", p => p.Without("loads.csv").With("Loads.CSV", "name\n"),
            "Loads.CSV: error HS004: unknown file Loads.CSV; known are case.toml, buses.csv, couplers.csv, supplies.csv, generators.csv, transformers.csv, cables.csv, lines.csv, reactors.csv, loads.csv, motors.csv, capacitors.csv, filters.csv, spectra.csv, converters.csv, states.csv, transformers3.csv, grounding_transformers.csv, impedance_tables.csv. Fix: did you mean 'loads.csv'? Otherwise move it out of the case folder."
        },
        { "unknown toml", p => p.With("settings.toml", "x = 1"),
            "settings.toml: error HS004: unknown file settings.toml; known are case.toml, buses.csv, couplers.csv, supplies.csv, generators.csv, transformers.csv, cables.csv, lines.csv, reactors.csv, loads.csv, motors.csv, capacitors.csv, filters.csv, spectra.csv, converters.csv, states.csv, transformers3.csv, grounding_transformers.csv, impedance_tables.csv. Fix: move it out of the case folder."
        },
        { "other files left alone", p => p.With("notes.txt", "hello").With(".hidden.csv", "x").With("drawing.dwg", [0, 1, 2]) },
        { "three-winding transformers", p => p.With("transformers3.csv", "name,hv_side\nT9,MAIN\nT10,MAIN"),
            "transformers3.csv(2): error HS017: transformers3.csv: the model of a three-winding transformer is not in this version. Fix: remove the rows; the results then hold without them."
        },
        { "later table without rows", p => p.With("impedance_tables.csv", "table,frequency_hz,r_ohm,x_ohm\n") },
        { "code page", p => p.With("loads.csv", [.. "name,bus,p_kw,power_factor\nS"u8, 0xE4, .. "ge,LV,3,0.9"u8]),
            "loads.csv(2): error HS003: the file is not UTF-8: a letter beyond ASCII is stored in another code page. Fix: save it as 'CSV UTF-8' from the spreadsheet, or as UTF-8 from the editor."
        },
        { "code page in buses", p => p.With("buses.csv", [.. "bus,nominal_kv\nS"u8, 0xE4, .. "ge,0.4\n"u8]),
            "buses.csv(2): error HS003: the file is not UTF-8: a letter beyond ASCII is stored in another code page. Fix: save it as 'CSV UTF-8' from the spreadsheet, or as UTF-8 from the editor."
        },
        { "UTF-16 without mark", p => p.With("loads.csv", [.. "n\0a\0m\0e\0"u8]),
            "loads.csv(1): error HS003: the file holds zero characters, as UTF-16 without a byte-order mark does; expected UTF-8 text. Fix: save it as 'CSV UTF-8', or as UTF-16 with a byte-order mark."
        },
        { "UTF-16 cut in half", p => p.With("loads.csv", [0xFF, 0xFE, 0x41, 0x00, 0x00, 0xD8]),
            "loads.csv: error HS003: the file begins as UTF-16 but is damaged: half a character stands in it. Fix: save it as 'CSV UTF-8' from the spreadsheet, or as UTF-8 from the editor."
        },
        { "inch mark", p => p.Append("loads.csv", "5\" line,LV,3,0.9,,,,"),
            "loads.csv(3): error HS018: a quotation mark stands inside a cell or has no partner; expected a pair of quotes around the whole cell. Fix: close the quote, or remove it; a quote that belongs to the text is doubled, with quotes around the cell: \"5\"\" pipe\"."
        },
        { "quote never closed", p => p.Append("loads.csv", "\"A,LV,3,0.9,,,,\nB,LV,3,0.9,,,,\nC,NOWHERE,3,0.9,,,,"),
            "loads.csv(3): error HS018: a quotation mark stands inside a cell or has no partner; what follows it in the file was not read; expected a pair of quotes around the whole cell. Fix: close the quote, or remove it; a quote that belongs to the text is doubled, with quotes around the cell: \"5\"\" pipe\"."
        },
        { "quote never closed in buses", p => p.With("buses.csv", "bus,nominal_kv\nGRID-BUS,33\n\"MAIN,11\nMAIN-B,11\nLV,0.4"),
            "buses.csv(3): error HS018: a quotation mark stands inside a cell or has no partner; what follows it in the file was not read; expected a pair of quotes around the whole cell. Fix: close the quote, or remove it; a quote that belongs to the text is doubled, with quotes around the cell: \"5\"\" pipe\"."
        },
        { "quote never closed in the header", p => p.With("buses.csv", "\"bus,nominal_kv\nGRID-BUS,33"),
            "buses.csv(1): error HS018: a quotation mark stands inside a cell or has no partner; what follows it in the file was not read; expected a pair of quotes around the whole cell. Fix: close the quote, or remove it; a quote that belongs to the text is doubled, with quotes around the cell: \"5\"\" pipe\"."
        },
        { "quote after the end", p => p.Append("loads.csv", "\""),
            "loads.csv(3): error HS018: a quotation mark stands inside a cell or has no partner; expected a pair of quotes around the whole cell. Fix: close the quote, or remove it; a quote that belongs to the text is doubled, with quotes around the cell: \"5\"\" pipe\"."
        },
        { "line after a quoted line break", p => p.With("buses.csv", "bus,nominal_kv,note\nGRID-BUS,33,\"incoming\nfrom the utility\"\nMAIN,eleven,\nMAIN-B,11,\nLV,0.4,"),
            "buses.csv(4,nominal_kv): error HS010: MAIN: nominal_kv is 'eleven'; expected a number above 0 in kV. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "row taken for a comment", p => p.Append("loads.csv", "#1 FAN,LV,3,0.9,,,,\n# 2 FAN,LV,3,0.9,,,,"),
            "loads.csv(3): warning HS118: the line begins with #, so it is a comment, but it has the cells of a row. Fix: put the name in double quotes if it is a row; write a blank after the # if it is a comment."
        },
        { "law in a semicolon table", p => p.With("reactors.csv", "name;end_a;end_b;x_ohm;q_factor;resistance_law\nR1;MAIN;MAIN-B;0,2;40;power:0.9;0.1;1.5"),
            "reactors.csv(2): error HS008: the row has 8 cells; expected 6, as in the header. Fix: give every column its cell (blank between two separators); put a text that holds the separator in double quotes."
        },
        { "decimals both ways", p => p.With("buses.csv", "bus;nominal_kv\nGRID-BUS;33\nMAIN;11,0\nMAIN-B;11.0\nLV;0,4"),
            "buses.csv(4,nominal_kv): error HS019: buses.csv writes decimals both ways: '11,0' at buses.csv(3,nominal_kv) and '11.0' at buses.csv(4,nominal_kv); expected one way in a table. Fix: write every decimal with a point, or every one with a comma."
        },
        { "thousands and decimals", p => p.With("loads.csv", "name;bus;p_kw;power_factor\nLIGHTS;LV;1.350,5;0,92\nFANS;LV;1,350,5;0,92"),
            "loads.csv(2,p_kw): error HS019: LIGHTS: p_kw is '1.350,5', with a comma and a point; expected digits with one decimal mark. Fix: leave out thousands separators and write decimals with a point.",
            "loads.csv(3,p_kw): error HS019: FANS: p_kw is '1,350,5', with a comma more than once; expected digits with one decimal mark. Fix: leave out thousands separators and write decimals with a point."
        },
        { "thousands in quotes", p => p.Replace("loads.csv", "350", "\"1,350\""),
            "loads.csv(2,p_kw): error HS019: LIGHTS: p_kw is '1,350', with a comma in a table whose columns are separated by commas; expected digits with one decimal mark. Fix: leave out thousands separators and write decimals with a point."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
