using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Supplies, generators, loads and motors: rules between cells, and doubts.</summary>
public class ShuntTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "no short-circuit power", p => p.Replace("supplies.csv", "500,,300,,", ",,,,"),
            "supplies.csv(2,sc_mva_max): error HS020: GRID: neither sc_mva_max nor sc_ka_max is given; without an impedance it is an ideal voltage source, which has no admittance to enter. Fix: give the short-circuit power in MVA or the short-circuit current in kA."
        },
        { "short-circuit power twice", p => p.Replace("supplies.csv", "500,,300,,", "500,9,300,9,"),
            "supplies.csv(2,sc_ka_max): error HS020: GRID: both sc_mva_max and sc_ka_max are given; expected one of them. Fix: leave one of them blank.",
            "supplies.csv(2,sc_ka_min): error HS020: GRID: both sc_mva_min and sc_ka_min are given; expected one of them. Fix: leave one of them blank."
        },
        { "smallest above largest", p => p.Replace("supplies.csv", "500,,300,,", "300,,500,,"),
            "supplies.csv(2,sc_mva_min): error HS021: GRID: the smallest short-circuit power, 500 MVA, exceeds the largest, 300 MVA. Fix: exchange them."
        },
        { "smallest above largest in kA", p => p.Replace("supplies.csv", "500,,300,,", ",5,,9,"),
            "supplies.csv(2,sc_ka_min): error HS021: GRID: the smallest short-circuit power, 514.42 MVA, exceeds the largest, 285.79 MVA. Fix: exchange them."
        },
        { "EMF in percent", p => p.Replace("supplies.csv", "GRID-BUS,1,0", "GRID-BUS,100,0"),
            "supplies.csv(2,voltage_pu): error HS011: GRID: voltage_pu is 100; expected a number above 0 up to 2 in pu. Fix: correct the value, or check its unit."
        },
        { "impedance table", p => p.With("supplies.csv", "name,bus,sc_mva_max,impedance_table,x0_over_x1,r0_over_r1\nGRID,GRID-BUS,500,measured,3,4"),
            "supplies.csv(2,impedance_table): error HS017: GRID: impedance_table is 'measured', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it.",
            "supplies.csv(2,x0_over_x1): error HS017: GRID: x0_over_x1 is '3', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it.",
            "supplies.csv(2,r0_over_r1): error HS017: GRID: r0_over_r1 is '4', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it."
        },
        { "generators of unlike voltage", p => p.Append("generators.csv", "GEN2,MAIN-B,2.5,11,1,1.02,0.15,0.17,,0.01,"),
            "generators.csv(3,voltage_pu): error HS031: GEN2 holds 1.02 pu at bus MAIN-B, where GEN holds 1 pu; expected the same. Fix: give both the same voltage_pu."
        },
        { "generator grounding", p => p.Replace("generators.csv", "open", "solid"),
            "generators.csv(2,grounding): error HS017: GEN: grounding is 'solid', but its model is not in this version; expected open or a blank cell. Fix: leave the cell blank or write open; positive and negative sequence do not depend on it."
        },
        { "generator x0", p => p.With("generators.csv", "name,bus,rated_mva,xd2_pu,x0_pu\nGEN,MAIN-B,2.5,0.15,0.05"),
            "generators.csv(2,x0_pu): error HS017: GEN: x0_pu is '0.05', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it."
        },
        { "generator reactance in percent", p => p.Replace("generators.csv", "0.15,0.17", "15,17"),
            "generators.csv(2,xd2_pu): error HS011: GEN: xd2_pu is 15; expected a number above 0 up to 10 in pu. Fix: correct the value, or check its unit.",
            "generators.csv(2,xq2_pu): error HS011: GEN: xq2_pu is 17; expected a number above 0 up to 10 in pu. Fix: correct the value, or check its unit."
        },
        { "generator x2 makes xq2 idle", p => p.Replace("generators.csv", "0.15,0.17,,", "0.15,0.17,0.16,"),
            "generators.csv(2,xq2_pu): note HS117: GEN: xq2_pu has no effect where x2_pu is given. Fix: nothing needs mending; x2_pu is what harmonics see."
        },
        { "load without Q", p => p.Replace("loads.csv", "0.92", ""),
            "loads.csv(2,power_factor): error HS020: LIGHTS: expected exactly one of power_factor and q_kvar; neither is given. Fix: fill one of them in."
        },
        { "load with both", p => p.Replace("loads.csv", "0.92,,", "0.92,100,"),
            "loads.csv(2,power_factor): error HS020: LIGHTS: expected exactly one of power_factor and q_kvar; both are given. Fix: leave one of them blank."
        },
        { "cigre of a resistive load", p => p.Replace("loads.csv", "0.92,,parallel", "0.999,,cigre"),
            "loads.csv(2,model): error HS021: LIGHTS: the model cigre needs P above 0 and Q/P above 0.1104 (0.74/6.7); P is 350 kW, Q is 15.66 kvar. Fix: use the model parallel, or check the power factor."
        },
        { "cigre at its bound", p => p.Replace("loads.csv", "350,0.92,,parallel", "670,,74,cigre"),
            "loads.csv(2,model): error HS021: LIGHTS: the model cigre needs P above 0 and Q/P above 0.1104 (0.74/6.7); P is 670 kW, Q is 74 kvar. Fix: use the model parallel, or check the power factor."
        },
        { "cigre without P", p => p.Replace("loads.csv", "350,0.92,,parallel", "0,,74,cigre"),
            "loads.csv(2,model): error HS021: LIGHTS: the model cigre needs P above 0 and Q/P above 0.1104 (0.74/6.7); P is 0 kW, Q is 74 kvar. Fix: use the model parallel, or check the power factor."
        },
        { "negative P", p => p.Replace("loads.csv", "350,0.92", "-350,0.92"),
            "loads.csv(2,p_kw): error HS011: LIGHTS: p_kw is -350; expected a number of at least 0 in kW. Fix: remove the minus sign, or check which column the value belongs to."
        },
        { "power factor 0", p => p.Replace("loads.csv", "0.92", "0"),
            "loads.csv(2,power_factor): error HS011: LIGHTS: power_factor is 0; expected a number above 0 up to 1. Fix: correct the value, or check which column it belongs to."
        },
        { "motor share beyond 100", p => p.Replace("loads.csv", "parallel,0,delta", "parallel,140,delta"),
            "loads.csv(2,motor_share_percent): error HS011: LIGHTS: motor_share_percent is 140; expected a number from 0 to 100 in percent. Fix: correct the value, or check its unit."
        },
        { "connection", p => p.Replace("loads.csv", "delta", "star"),
            "loads.csv(2,connection): error HS014: LIGHTS: connection is 'star'; expected one of delta, wye, wye_grounded. Fix: write one of those words, or leave the cell blank for the default."
        },
        { "motor efficiency missing", p => p.Replace("motors.csv", "0.4,94", "0.4,"),
            "motors.csv(2,efficiency_percent): error HS009: PUMPS: efficiency_percent is blank; expected a number above 0 up to 100 in percent. Fix: fill the cell in."
        },
        { "motor efficiency beyond 100", p => p.Replace("motors.csv", "0.4,94", "0.4,104"),
            "motors.csv(2,efficiency_percent): error HS011: PUMPS: efficiency_percent is 104; expected a number above 0 up to 100 in percent. Fix: correct the value, or check its unit."
        },
        { "motor count 0", p => p.Replace("motors.csv", "0.25,3", "0.25,0"),
            "motors.csv(2,count): error HS011: PUMPS: count is 0; expected a whole number from 1 to 100000. Fix: correct the value, or check which column it belongs to."
        },
        { "doubt: short-circuit power in kVA", p => p.Replace("supplies.csv", "500,,300,,", "500000,,300000,,"),
            "supplies.csv(2,sc_mva_max): warning HS114: GRID: a short-circuit power of 500000 MVA is outside the usual 1 to 200000. Fix: check that it is MVA (or kA) and not kVA, A or ohm."
        },
        { "doubt: short-circuit current in A", p => p.Replace("supplies.csv", "500,,300,,", ",8700,,5200,"),
            "supplies.csv(2,sc_ka_max): warning HS114: GRID: a short-circuit power of 497272 MVA is outside the usual 1 to 200000. Fix: check that it is MVA (or kA) and not kVA, A or ohm."
        },
        { "doubt: X/R of a supply", p => p.Replace("supplies.csv", ",12,voltage", ",0.1,voltage"),
            "supplies.csv(2,x_over_r): warning HS108: GRID: X/R is 0.1, outside the usual 1 to 50. Fix: check that it is X over R at the fundamental."
        },
        { "doubt: kVA of a generator", p => p.Replace("generators.csv", "2.5", "2500"),
            "generators.csv(2,rated_mva): warning HS104: GEN: 2500 MVA is large for a generator of a plant; it looks like kVA. Fix: write 2.5 if 2500 kVA is meant."
        },
        { "doubt: W of a load", p => p.Replace("loads.csv", "350", "350000"),
            "loads.csv(2,p_kw): warning HS105: LIGHTS: 350000 kW is large at 0.4 kV; it looks like W. Fix: write 350 if 350000 W is meant."
        },
        { "doubt: W of a motor", p => p.Replace("motors.csv", "LV,55,", "LV,55000,"),
            "motors.csv(2,rated_kw): warning HS105: PUMPS: 55000 kW is large at 0.4 kV; it looks like W. Fix: write 55 if 55000 W is meant."
        },
        { "doubt: W of a converter", p => p.Replace("converters.csv", "LV,400,", "LV,400000,"),
            "converters.csv(2,rated_kw): warning HS105: DRIVE: 400000 kW is large at 0.4 kV; it looks like W. Fix: write 400 if 400000 W is meant."
        },
        { "doubt: efficiency as a fraction", p => p.Replace("motors.csv", "0.4,94", "0.4,0.94"),
            "motors.csv(2,efficiency_percent): warning HS113: PUMPS: an efficiency of 0.94 percent; it looks like a fraction. Fix: write 94."
        },
        { "doubt: rated voltage of a motor", p => p.Replace("motors.csv", "55,0.4", "55,400"),
            "motors.csv(2,rated_kv): warning HS102: PUMPS: rated_kv is 400 kV at a bus of 0.4 kV, more than 20 percent apart. Fix: check the rated voltage, the bus, and that kV is meant."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
