using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Couplers, transformers, lines and reactors: rules between cells, and doubts.</summary>
public class BranchTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "coupler of unlike buses", p => p.Replace("couplers.csv", "MAIN,MAIN-B", "MAIN,LV"),
            "couplers.csv(2,end_b): error HS030: BC: it couples 11 kV to 0.4 kV; expected buses of one nominal_kv. Fix: connect buses of the same voltage, or put a transformer between them."
        },
        { "X/R and load loss", p => p.Replace("transformers.csv", "10,15,,Dyn11", "10,15,60,Dyn11"),
            "transformers.csv(2,load_loss_kw): error HS020: T1: both x_over_r and load_loss_kw are given; expected one of them. Fix: leave one of them blank."
        },
        { "load loss beyond the impedance", p => p.Replace("transformers.csv", "6,,12,", "6,,120,"),
            "transformers.csv(3,load_loss_kw): error HS021: T2: a load loss of 120 kW is 12 percent of its rating, more than its impedance of 6 percent. Fix: check the unit of load_loss_kw and rated_mva."
        },
        { "no-load power below the loss", p => p.Replace("transformers.csv", "0.1,2,0.8", "0.1,9,0.8"),
            "transformers.csv(3,no_load_current_percent): error HS021: T2: a no-load current of 0.8 percent is 8 kVA, less than the no-load loss of 9 kW. Fix: check both: the loss is part of the no-load power."
        },
        { "vector group of wrong parity", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Dyn6"),
            "transformers.csv(2,vector_group): error HS021: T1: 'Dyn6' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy. Fix: write for example Dyn11 or YNd5."
        },
        { "vector group with an odd clock for YNyn", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,YNyn1"),
            "transformers.csv(2,vector_group): error HS021: T1: 'YNyn1' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy. Fix: write for example Dyn11 or YNd5."
        },
        { "vector group beyond 12", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Dyn13"),
            "transformers.csv(2,vector_group): error HS021: T1: 'Dyn13' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy. Fix: write for example Dyn11 or YNd5."
        },
        { "vector group unknown", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Delta-star"),
            "transformers.csv(2,vector_group): error HS021: T1: 'Delta-star' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy. Fix: write for example Dyn11 or YNd5."
        },
        { "zigzag", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Dzn0"),
            "transformers.csv(2,vector_group): error HS021: T1: 'Dzn0' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy. Fix: write for example Dyn11 or YNd5."
        },
        { "tap beyond 30", p => p.Replace("transformers.csv", "Dyn11,0,constant", "Dyn11,31,constant"),
            "transformers.csv(2,tap_percent): error HS011: T1: tap_percent is 31; expected a number from -30 to 30 in percent. Fix: correct the value, or check its unit."
        },
        { "impedance beyond 100", p => p.Replace("transformers.csv", "33,11,10,15", "33,11,110,15"),
            "transformers.csv(2,impedance_percent): error HS011: T1: impedance_percent is 110; expected a number above 0 up to 100 in percent. Fix: correct the value, or check its unit."
        },
        { "law unknown", p => p.Replace("transformers.csv", "0,constant,,8", "0,constantly,,8"),
            "transformers.csv(2,resistance_law): error HS014: T1: resistance_law 'constantly' is not known; expected one of constant, sqrt, line, cable, eddy, power:a;b;c. Fix: did you mean 'constant'? Otherwise write one of those."
        },
        { "eddy without a share", p => p.Replace("transformers.csv", "eddy,0.1", "eddy,"),
            "transformers.csv(3,resistance_law): error HS021: T2: the law eddy needs eddy_loss_pu, which is blank; expected a number from 0 to 1. Fix: fill eddy_loss_pu in, or choose another law."
        },
        { "eddy of a cable", p => p.Replace("cables.csv", "1,cable,", "1,eddy,"),
            "cables.csv(2,resistance_law): error HS021: C1: the law eddy is for transformers only. Fix: write constant, sqrt or power:a;b;c."
        },
        { "bessel of a reactor", p => p.Replace("reactors.csv", "constant", "bessel"),
            "reactors.csv(2,resistance_law): error HS021: R1: the law bessel is for cables and lines only. Fix: write constant, sqrt or power:a;b;c."
        },
        { "bessel without resistance", p => p.Replace("cables.csv", "0.164,0.105,370,1,cable", "0,0.105,370,1,bessel"),
            "cables.csv(2,resistance_ohm_km): error HS021: C1: the law bessel needs a resistance above 0 ohm/km. Fix: give the resistance, or choose another law."
        },
        { "power law that is not 1 at h = 1", p => p.Replace("reactors.csv", "constant", "power:0.9;0.2;1.5"),
            "reactors.csv(2,resistance_law): error HS021: R1: resistance_law 'power:0.9;0.2;1.5' is no power law; expected power:a;b;c with a and b of at least 0, a + b = 1 and c from -10 to 10. Fix: write for example power:0.9;0.1;1.5 (in quotes where the columns are separated by semicolons)."
        },
        { "power law with too few numbers", p => p.Replace("reactors.csv", "constant", "power:0.9;0.1"),
            "reactors.csv(2,resistance_law): error HS021: R1: resistance_law 'power:0.9;0.1' is no power law; expected power:a;b;c with a and b of at least 0, a + b = 1 and c from -10 to 10. Fix: write for example power:0.9;0.1;1.5 (in quotes where the columns are separated by semicolons)."
        },
        { "power law with an exponent past all sense", p => p.Replace("reactors.csv", "constant", "power:0.9;0.1;1e300"),
            "reactors.csv(2,resistance_law): error HS021: R1: resistance_law 'power:0.9;0.1;1e300' is no power law; expected power:a;b;c with a and b of at least 0, a + b = 1 and c from -10 to 10. Fix: write for example power:0.9;0.1;1.5 (in quotes where the columns are separated by semicolons)."
        },
        { "cable without impedance", p => p.Replace("cables.csv", "0.164,0.105", "0,0"),
            "cables.csv(2,reactance_ohm_km): error HS021: C1: resistance and reactance are both 0; expected an impedance. Fix: give its impedance, or use a coupler."
        },
        { "reactor with both", p => p.Replace("reactors.csv", "0.2,,40", "0.2,0.6,40"),
            "reactors.csv(2,x_ohm): error HS020: R1: expected exactly one of x_ohm and l_mh; both are given. Fix: leave one of them blank."
        },
        { "reactor with neither", p => p.Replace("reactors.csv", "0.2,,40", ",,40"),
            "reactors.csv(2,x_ohm): error HS020: R1: expected exactly one of x_ohm and l_mh; neither is given. Fix: fill one of them in."
        },
        { "reactor without q_factor", p => p.Replace("reactors.csv", "0.2,,40", "0.2,,"),
            "reactors.csv(2,q_factor): error HS009: R1: q_factor is blank; expected a number above 0. Fix: fill the cell in."
        },
        { "zero-sequence columns blank", p => p.With("cables.csv", "name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km,capacitance_nf_km,zero_resistance_ohm_km\nC1,MAIN,MAIN-B,1,0.2,0.1,300,") },
        { "zero-sequence column filled", p => p.With("cables.csv", "name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km,capacitance_nf_km,zero_resistance_ohm_km\nC1,MAIN,MAIN-B,1,0.2,0.1,300,0.5"),
            "cables.csv(2,zero_resistance_ohm_km): error HS017: C1: zero_resistance_ohm_km is '0.5', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it."
        },
        { "z0 of a transformer", p => p.With("transformers.csv", "name,hv_side,lv_side,rated_mva,impedance_percent,z0_percent,hv_grounding_ohm,lv_grounding_ohm\nT1,GRID-BUS,MAIN,10,10,9,5,0"),
            "transformers.csv(2,z0_percent): error HS017: T1: z0_percent is '9', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it.",
            "transformers.csv(2,hv_grounding_ohm): error HS017: T1: hv_grounding_ohm is '5', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it.",
            "transformers.csv(2,lv_grounding_ohm): error HS017: T1: lv_grounding_ohm is '0', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it."
        },
        { "doubt: rated voltage", p => p.Replace("transformers.csv", "10,33,11,10", "10,33,0.4,10"),
            "transformers.csv(2,lv_kv): warning HS102: T1: lv_kv is 0.4 kV at a bus of 11 kV, more than 20 percent apart. Fix: check the rated voltage, the bus, and that kV is meant."
        },
        { "doubt: sides exchanged", p => p.Replace("transformers.csv", "T2,MAIN,LV,1,11,0.4", "T2,LV,MAIN,1,0.4,11"),
            "transformers.csv(3,hv_side): warning HS103: T2: its high-voltage side has 0.4 kV and its low-voltage side 11 kV. Fix: exchange hv_side and lv_side, and their rated voltages."
        },
        { "doubt: kVA for MVA", p => p.Replace("transformers.csv", "T2,MAIN,LV,1,11,0.4,6,,12,Dyn11,0,eddy,0.1,2,0.8", "T2,MAIN,LV,1000,11,0.4,6,10,,Dyn11,0,eddy,0.1,2,0.8"),
            "transformers.csv(3,rated_mva): warning HS104: T2: 1000 MVA is large for 0.4 kV; it looks like kVA. Fix: write 1 if 1000 kVA is meant."
        },
        { "doubt: impedance in per unit", p => p.Replace("transformers.csv", "33,11,10,15", "33,11,0.1,15"),
            "transformers.csv(2,impedance_percent): warning HS109: T1: an impedance of 0.1 percent is outside the usual 2 to 25. Fix: check that it is percent on rated_mva."
        },
        { "doubt: X/R of a transformer", p => p.Replace("transformers.csv", "10,15,,Dyn11", "10,150,,Dyn11"),
            "transformers.csv(2,x_over_r): warning HS108: T1: X/R is 150, outside the usual 1 to 60. Fix: check that it is X over R at the fundamental."
        },
        { "doubt: metres of cable", p => p.Replace("cables.csv", "1.2", "1200"),
            "cables.csv(2,length_km): warning HS107: C1: 1200 km is long for a cable; it looks like metres. Fix: write 1.2 if 1200 m is meant."
        },
        { "doubt: metres of line", p => p.Replace("lines.csv", "MAIN-B,8,", "MAIN-B,8000,"),
            "lines.csv(2,length_km): warning HS107: L1: 8000 km is long for a line; it looks like metres. Fix: write 8 if 8000 m is meant."
        },
        { "doubt: line between voltages", p => p.Replace("lines.csv", "L1,MAIN,MAIN-B", "L1,MAIN,LV"),
            "lines.csv(2,end_b): warning HS103: L1: it runs from 11 kV to 0.4 kV. Fix: check its ends: a line joins buses of one voltage."
        },
        { "doubt: volts for kilovolts", p => p.Replace("buses.csv", "LV,0.4", "LV,690").Replace("transformers.csv", "1,11,0.4,6", "1,11,,6").Without("loads.csv").Without("motors.csv").Without("capacitors.csv").Without("converters.csv").Without("states.csv"),
            "buses.csv(5,nominal_kv): warning HS111: LV: 690 kV is no usual transmission voltage; it looks like volts. Fix: write 0.69 if 690 V is meant.",
            "spectra.csv(2): note HS115: spectrum six pulse is used by nobody. Fix: nothing needs mending, unless a converter was meant to use it.",
            "transformers.csv(3,hv_side): warning HS103: T2: its high-voltage side has 11 kV and its low-voltage side 690 kV. Fix: exchange hv_side and lv_side, and their rated voltages."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
