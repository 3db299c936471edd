using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Names, and what refers to them.</summary>
public class NameTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "bus misspelt", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,LW"),
            "loads.csv(2,bus): error HS015: LIGHTS: bus 'LW' is no bus; expected the name of a bus of buses.csv. Fix: did you mean 'LV'? Otherwise add the bus to buses.csv."
        },
        { "bus unknown", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,SUBSTATION 7"),
            "loads.csv(2,bus): error HS015: LIGHTS: bus 'SUBSTATION 7' is no bus; expected the name of a bus of buses.csv. Fix: add the bus to buses.csv."
        },
        { "element for a bus", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,T2"),
            "loads.csv(2,bus): error HS015: LIGHTS: bus 'T2' is an element; expected the name of a bus of buses.csv. Fix: did you mean 'LV'? Otherwise add the bus to buses.csv."
        },
        { "bus in other letters", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,lv"),
            "loads.csv(2,bus): error HS015: LIGHTS: bus 'lv' is no bus; expected the name of a bus of buses.csv. Fix: did you mean 'LV'? Otherwise add the bus to buses.csv."
        },
        { "name twice in a table", p => p.Append("loads.csv", "LIGHTS,LV,20,0.9,,,,"),
            "loads.csv(3,name): error HS016: the name 'LIGHTS' is already taken at loads.csv(2); expected a name that nothing else bears. Fix: rename one of the two; buses and elements share their names."
        },
        { "name of a bus", p => p.Replace("loads.csv", "LIGHTS", "MAIN"),
            "loads.csv(2,name): error HS016: the name 'MAIN' is already taken at buses.csv(3); expected a name that nothing else bears. Fix: rename one of the two; buses and elements share their names."
        },
        { "name in two tables", p => p.Replace("motors.csv", "PUMPS", "LIGHTS"),
            "motors.csv(2,name): error HS016: the name 'LIGHTS' is already taken at loads.csv(2); expected a name that nothing else bears. Fix: rename one of the two; buses and elements share their names."
        },
        { "names that differ in capitals", p => p.Append("loads.csv", "Lights,LV,20,0.9,,parallel,0,"),
            "loads.csv(3,name): warning HS116: the names 'Lights' and 'LIGHTS' (loads.csv(2)) differ in capital letters only; they are taken for two things. Fix: spell both alike if they are one thing, or rename one of the two."
        },
        { "bus twice", p => p.Append("buses.csv", "LV,0.69,"),
            "buses.csv(6,bus): error HS016: the name 'LV' is already taken at buses.csv(5); expected a name that nothing else bears. Fix: rename one of the two; buses and elements share their names."
        },
        { "same bus at both ends", p => p.Replace("cables.csv", "C1,MAIN,MAIN-B", "C1,MAIN,MAIN"),
            "cables.csv(2,end_b): error HS029: C1: both ends are at MAIN; expected two buses. Fix: name the bus of the other end."
        },
        { "same bus at both sides", p => p.Replace("transformers.csv", "T2,MAIN,LV", "T2,LV,LV"),
            "transformers.csv(3,lv_side): error HS029: T2: both ends are at LV; expected two buses. Fix: name the bus of the other end."
        },
        { "line break in a name", p => p.Replace("loads.csv", "LIGHTS", "\"LIG\nHTS\""),
            "loads.csv(2,name): error HS044: name 'LIG HTS' has a line break in it; expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "control character in a name", p => p.Replace("loads.csv", "LIGHTS", "LIG\u0007HTS"),
            "loads.csv(2,name): error HS044: name 'LIG HTS' has a control character in it; expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "invisible character in a name", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,L\u200BV"),
            "loads.csv(2,bus): error HS044: bus 'L\u200BV' has an invisible character in it (U+200B); expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "no-break space in a name", p => p.Replace("loads.csv", "LIGHTS", "LIG\u00A0HTS"),
            "loads.csv(2,name): error HS044: name 'LIG\u00a0HTS' has a blank of another kind in it (U+00A0); expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "accent apart from its letter", p => p.Replace("loads.csv", "LIGHTS", "E\u0301CLAIRAGE"),
            "loads.csv(2,name): error HS044: name 'E\u0301CLAIRAGE' has an accent stored apart from its letter (U+0301); expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "damaged letter", p => p.Replace("loads.csv", "LIGHTS", "S\uFFFDGE"),
            "loads.csv(2,name): error HS044: name 'S\uFFFDGE' has a damaged character in it (U+FFFD); expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "endless name", p => p.Replace("loads.csv", "LIGHTS", new string('x', 1_000_000)),
            "loads.csv(2,name): error HS044: name 'xxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxxx...' has 1000000 characters; expected a name of at most 100 visible characters and plain blanks. Fix: type the name anew, the same in every table."
        },
        { "bus row with an error is still a bus", p => p.Replace("buses.csv", "LV,0.4", "LV,0.4 kV"),
            "buses.csv(5,nominal_kv): error HS010: LV: nominal_kv is '0.4 kV'; expected a number above 0 in kV. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "element row with an error is still an element", p => p.Replace("capacitors.csv", "BANK,LV,300", "BANK,LV,lots"),
            "capacitors.csv(2,rated_kvar): error HS010: BANK: rated_kvar is 'lots'; expected a number above 0 in kvar. Fix: write digits with a decimal point, without units or thousands separators."
        },
        { "spectrum misspelt", p => p.Replace("converters.csv", "six pulse", "sixpulse"),
            "converters.csv(2,spectrum): error HS022: DRIVE: spectrum 'sixpulse' is not in spectra.csv; expected the name of a spectrum of spectra.csv. Fix: did you mean 'six pulse'? Otherwise add its lines to spectra.csv."
        },
        { "spectrum blank", p => p.Replace("converters.csv", "six pulse", ""),
            "converters.csv(2,spectrum): error HS009: DRIVE: spectrum is blank; expected the name of a spectrum of spectra.csv. Fix: give the maker's spectrum, or a measured one."
        },
        { "background misspelt", p => p.Replace("supplies.csv", "voltage,8", "voltages,8"),
            "supplies.csv(2,background_spectrum): error HS022: GRID: background_spectrum 'voltages' is not in spectra.csv; expected the name of a spectrum of spectra.csv. Fix: did you mean 'voltage'? Otherwise add its lines to spectra.csv."
        },
        { "spectra in error are known", p => p.Replace("spectra.csv", "six pulse,1,100,0", "six pulse,1,all,0").Replace("spectra.csv", "voltage,5,1.5,30", "voltage,5,-1.5,30"),
            "spectra.csv(2,percent): error HS010: percent is 'all'; expected a number of at least 0 in percent. Fix: write digits with a decimal point, without units or thousands separators.",
            "spectra.csv(4,percent): error HS011: percent is -1.5; expected a number of at least 0 in percent. Fix: remove the minus sign, or check which column the value belongs to."
        },
        { "no spectra", p => p.Without("spectra.csv"),
            "converters.csv(2,spectrum): error HS022: DRIVE: spectrum 'six pulse' is not in spectra.csv; expected the name of a spectrum of spectra.csv. Fix: add its lines to spectra.csv.",
            "supplies.csv(2,background_spectrum): error HS022: GRID: background_spectrum 'voltage' is not in spectra.csv; expected the name of a spectrum of spectra.csv. Fix: add its lines to spectra.csv."
        },
        { "pcc misspelt", p => p.Replace("case.toml", "GRID-BUS", "GRIDBUS"),
            "case.toml(11,pcc): error HS037: pcc 'GRIDBUS' is no bus; expected the name of a bus of buses.csv. Fix: did you mean 'GRID-BUS'? Otherwise name a bus of buses.csv."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
