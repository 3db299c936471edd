using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Numbers nobody could mean: refused with the cell as it stands, never read as something else.</summary>
public class NumberTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "huge", p => p.Replace("loads.csv", "350", "1e308"),
            "loads.csv(2,p_kw): error HS011: LIGHTS: p_kw is 1e308; expected a number of at least 0 in kW (from 1e-12 to 1e12 in size). Fix: correct the value, or check its unit."
        },
        { "beyond a double", p => p.Replace("loads.csv", "350", "1e400"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '1e400'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "tiny", p => p.Replace("loads.csv", "350", "1e-320"),
            "loads.csv(2,p_kw): error HS011: LIGHTS: p_kw is 1e-320; expected a number of at least 0 in kW (from 1e-12 to 1e12 in size). Fix: correct the value, or check its unit."
        },
        { "below a double", p => p.Replace("loads.csv", "350", "1e-400"),
            "loads.csv(2,p_kw): error HS011: LIGHTS: p_kw is 1e-400; expected a number of at least 0 in kW (from 1e-12 to 1e12 in size). Fix: correct the value, or check its unit."
        },
        { "squared it overflows", p => p.Replace("buses.csv", "LV,0.4", "LV,1e200"),
            "buses.csv(5,nominal_kv): error HS011: LV: nominal_kv is 1e200; expected a number above 0 in kV (from 1e-12 to 1e12 in size). Fix: correct the value, or check its unit."
        },
        { "NaN", p => p.Replace("loads.csv", "350", "NaN"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is 'NaN'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "Infinity", p => p.Replace("loads.csv", "350", "Infinity"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is 'Infinity'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "infinity sign", p => p.Replace("loads.csv", "350", "\u221E"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '\u221E'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "full-width digits", p => p.Replace("loads.csv", "350", "\uFF11\uFF12"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '\uFF11\uFF12'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "hexadecimal", p => p.Replace("loads.csv", "350", "0x10"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '0x10'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "blank for thousands", p => p.Replace("loads.csv", "350", "1 350"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '1 350'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "narrow blank for thousands", p => p.Replace("loads.csv", "350", "1\u202F350"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '1\u202F350'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "apostrophe for thousands", p => p.Replace("loads.csv", "350", "1'350"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '1'350'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "minus sign of typography", p => p.Replace("supplies.csv", "GRID-BUS,1,0", "GRID-BUS,1,\u221230"),
            "supplies.csv(2,angle_deg): error HS010: GRID: angle_deg is '\u221230'; expected a number in degrees. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "percent sign", p => p.Replace("transformers.csv", "33,11,10,15", "33,11,10 %,15"),
            "transformers.csv(2,impedance_percent): error HS010: T1: impedance_percent is '10 %'; expected a number above 0 up to 100 in percent. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "formula", p => p.Replace("loads.csv", "350", "=A1*2"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '=A1*2'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "error of a spreadsheet", p => p.Replace("loads.csv", "350", "#REF!"),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '#REF!'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "date of a spreadsheet", p => p.Replace("transformers.csv", "MAIN,10,33", "MAIN,10-Jan,33"),
            "transformers.csv(2,rated_mva): error HS010: T1: rated_mva is '10-Jan'; expected a number above 0 in MVA. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "a cell of a million digits", p => p.Replace("loads.csv", "350", new string('9', 1_000_000)),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is '9999999999999999999999999999999999999999...'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "a cell of a million letters", p => p.Replace("loads.csv", "350", new string('x', 1_000_000)),
            "loads.csv(2,p_kw): error HS010: LIGHTS: p_kw is 'xxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxx...'; expected a number of at least 0 in kW. Fix: write digits with a decimal point, without units or thousands separators."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
