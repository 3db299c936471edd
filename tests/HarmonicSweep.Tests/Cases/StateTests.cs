using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Operating states.</summary>
public class StateTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "reserved base", p => p.Append("states.csv", "base,BANK,out"),
            "states.csv(4,state): error HS027: 'base' is a reserved name: base is the plant as drawn, all means every state. Fix: give the state another name."
        },
        { "reserved all", p => p.Append("states.csv", "All,BANK,out"),
            "states.csv(4,state): error HS027: 'All' is a reserved name: base is the plant as drawn, all means every state. Fix: give the state another name."
        },
        { "element unknown", p => p.Append("states.csv", "night,BANKK,out"),
            "states.csv(4,element): error HS024: 'BANKK' is no element; expected the name of an element of the plant. Fix: did you mean 'BANK'? Otherwise add it to its table, or correct the name."
        },
        { "bus for an element", p => p.Append("states.csv", "night,MAIN,out"),
            "states.csv(4,element): error HS024: 'MAIN' is a bus; expected an element (a bus goes out with what connects it). Fix: name the coupler, transformer or line that connects it."
        },
        { "setting unknown", p => p.Append("states.csv", "night,GRID,off"),
            "states.csv(4,setting): error HS025: setting 'off' is not known; expected in, out, sc=min, sc=max or sc=MVA. Fix: did you mean 'out'? Otherwise write for example in, out, steps=2, sc=min, sc=max, sc=250, tap=-2.5, loading=60."
        },
        { "setting misspelt", p => p.Append("states.csv", "night,LIGHTS,loadin=20"),
            "states.csv(4,setting): error HS025: setting 'loadin=20' is not known; expected in, out or loading=PERCENT. Fix: did you mean 'loading='? Otherwise write for example in, out, steps=2, sc=min, sc=max, sc=250, tap=-2.5, loading=60."
        },
        { "setting without a value", p => p.Append("states.csv", "dim,LIGHTS,loading"),
            "states.csv(4,setting): error HS011: setting is 'loading'; expected a number from 0 to 300 in percent. Fix: correct the number."
        },
        { "setting with a value too much", p => p.Append("states.csv", "dim,LIGHTS,out=1"),
            "states.csv(4,setting): error HS025: setting 'out=1' is not known; expected in, out or loading=PERCENT. Fix: did you mean 'out'? Otherwise write for example in, out, steps=2, sc=min, sc=max, sc=250, tap=-2.5, loading=60."
        },
        { "steps beyond the bank", p => p.Replace("states.csv", "steps=2", "steps=7"),
            "states.csv(3,setting): error HS011: setting is 'steps=7'; expected a whole number from 0 to 6, the steps of BANK. Fix: correct the number."
        },
        { "steps below 0", p => p.Replace("states.csv", "steps=2", "steps=-1"),
            "states.csv(3,setting): error HS011: setting is 'steps=-1'; expected a whole number from 0 to 6, the steps of BANK. Fix: correct the number."
        },
        { "half a step", p => p.Replace("states.csv", "steps=2", "steps=2.5"),
            "states.csv(3,setting): error HS011: setting is 'steps=2.5'; expected a whole number from 0 to 6, the steps of BANK. Fix: correct the number."
        },
        { "steps of a load", p => p.Replace("states.csv", "night,BANK", "night,LIGHTS"),
            "states.csv(3,setting): error HS026: 'steps=2' does not apply to LIGHTS; expected in, out or loading=PERCENT. Fix: correct the setting or the element."
        },
        { "steps of a filter", p => p.Replace("states.csv", "night,BANK", "night,F5"),
            "states.csv(3,setting): error HS026: 'steps=2' does not apply to F5; expected in, out. Fix: correct the setting or the element."
        },
        { "sc of a generator", p => p.Replace("states.csv", "weak grid,GRID", "weak grid,GEN"),
            "states.csv(2,setting): error HS026: 'sc=min' does not apply to GEN; expected in, out. Fix: correct the setting or the element."
        },
        { "sc of nothing", p => p.Replace("states.csv", "sc=min", "sc=0"),
            "states.csv(2,setting): error HS011: setting is 'sc=0'; expected min, max or a number above 0 in MVA. Fix: correct the number."
        },
        { "sc infinite", p => p.Replace("states.csv", "sc=min", "sc=inf"),
            "states.csv(2,setting): error HS011: setting is 'sc=inf'; expected min, max or a number above 0 in MVA. Fix: correct the number."
        },
        { "sc overflows", p => p.Replace("states.csv", "sc=min", "sc=1e308"),
            "states.csv(2,setting): error HS011: setting is 'sc=1e308'; expected min, max or a number above 0 in MVA. Fix: correct the number."
        },
        { "tap of a cable", p => p.Append("states.csv", "night,C1,tap=2.5"),
            "states.csv(4,setting): error HS026: 'tap=2.5' does not apply to C1; expected in, out. Fix: correct the setting or the element."
        },
        { "tap beyond 30", p => p.Append("states.csv", "night,T1,tap=-45"),
            "states.csv(4,setting): error HS011: setting is 'tap=-45'; expected a number from -30 to 30 in percent. Fix: correct the number."
        },
        { "loading of a bank", p => p.Append("states.csv", "night,BANK,loading=50"),
            "states.csv(4,setting): error HS026: 'loading=50' does not apply to BANK; expected in, out or steps=NUMBER. Fix: correct the setting or the element."
        },
        { "loading beyond 300", p => p.Append("states.csv", "night,DRIVE,loading=1000"),
            "states.csv(4,setting): error HS011: setting is 'loading=1000'; expected a number from 0 to 300 in percent. Fix: correct the number."
        },
        { "decimal comma among commas", p => p.Append("states.csv", "night,T1,\"tap=-2,5\""),
            "states.csv(4,setting): error HS011: setting is 'tap=-2,5'; expected a number from -30 to 30 in percent. Fix: correct the number."
        },
        { "same setting twice", p => p.Append("states.csv", "night,BANK,steps=3"),
            "states.csv(4,setting): error HS028: state night sets BANK twice in the same way. Fix: keep one of the rows."
        },
        { "in and out", p => p.Append("states.csv", "night,T1,in\nnight,T1,out"),
            "states.csv(5,setting): error HS028: state night sets T1 twice in the same way. Fix: keep one of the rows."
        },
        { "state spelled in two ways", p => p.Append("states.csv", "Night,LIGHTS,out"),
            "states.csv(4,state): warning HS116: the names 'Night' and 'night' (states.csv(3)) differ in capital letters only; they are taken for two things. Fix: spell both alike if they are one thing, or rename one of the two."
        },
        { "setting of what is out", p => p.Append("states.csv", "night,BANK,out"),
            "states.csv(3,setting): warning HS117: 'steps=2' has no effect: state night takes BANK out. Fix: keep one of the two rows."
        },
        { "blank cells", p => p.Append("states.csv", ",,") .Append("states.csv", "night,,out"),
            "states.csv(5,element): error HS009: element is blank; expected the name of an element of the plant. Fix: fill the cell in."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
