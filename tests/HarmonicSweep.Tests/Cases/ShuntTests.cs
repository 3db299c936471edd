using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Supplies, generators, loads and motors: rules between cells, and doubts.</summary>
public class ShuntTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "no short-circuit power", p => p.Replace("supplies.csv", "500,,300,,", ",,,,") },
        { "short-circuit power twice", p => p.Replace("supplies.csv", "500,,300,,", "500,9,300,9,") },
        { "smallest above largest", p => p.Replace("supplies.csv", "500,,300,,", "300,,500,,") },
        { "smallest above largest in kA", p => p.Replace("supplies.csv", "500,,300,,", ",5,,9,") },
        { "EMF in percent", p => p.Replace("supplies.csv", "GRID-BUS,1,0", "GRID-BUS,100,0") },
        { "impedance table", p => p.With("supplies.csv", "name,bus,sc_mva_max,impedance_table,x0_over_x1,r0_over_r1\nGRID,GRID-BUS,500,measured,3,4") },
        { "generators of unlike voltage", p => p.Append("generators.csv", "GEN2,MAIN-B,2.5,11,1,1.02,0.15,0.17,,0.01,") },
        { "generator grounding", p => p.Replace("generators.csv", "open", "solid") },
        { "generator x0", p => p.With("generators.csv", "name,bus,rated_mva,xd2_pu,x0_pu\nGEN,MAIN-B,2.5,0.15,0.05") },
        { "generator reactance in percent", p => p.Replace("generators.csv", "0.15,0.17", "15,17") },
        { "generator x2 makes xq2 idle", p => p.Replace("generators.csv", "0.15,0.17,,", "0.15,0.17,0.16,") },
        { "load without Q", p => p.Replace("loads.csv", "0.92", "") },
        { "load with both", p => p.Replace("loads.csv", "0.92,,", "0.92,100,") },
        { "cigre of a resistive load", p => p.Replace("loads.csv", "0.92,,parallel", "0.999,,cigre") },
        { "cigre at its bound", p => p.Replace("loads.csv", "350,0.92,,parallel", "670,,74,cigre") },
        { "cigre without P", p => p.Replace("loads.csv", "350,0.92,,parallel", "0,,74,cigre") },
        { "negative P", p => p.Replace("loads.csv", "350,0.92", "-350,0.92") },
        { "power factor 0", p => p.Replace("loads.csv", "0.92", "0") },
        { "motor share beyond 100", p => p.Replace("loads.csv", "parallel,0,delta", "parallel,140,delta") },
        { "connection", p => p.Replace("loads.csv", "delta", "star") },
        { "motor efficiency missing", p => p.Replace("motors.csv", "0.4,94", "0.4,") },
        { "motor efficiency beyond 100", p => p.Replace("motors.csv", "0.4,94", "0.4,104") },
        { "motor count 0", p => p.Replace("motors.csv", "0.25,3", "0.25,0") },
        { "doubt: short-circuit power in kVA", p => p.Replace("supplies.csv", "500,,300,,", "500000,,300000,,") },
        { "doubt: short-circuit current in A", p => p.Replace("supplies.csv", "500,,300,,", ",8700,,5200,") },
        { "doubt: X/R of a supply", p => p.Replace("supplies.csv", ",12,voltage", ",0.1,voltage") },
        { "doubt: kVA of a generator", p => p.Replace("generators.csv", "2.5", "2500") },
        { "doubt: W of a load", p => p.Replace("loads.csv", "350", "350000") },
        { "doubt: W of a motor", p => p.Replace("motors.csv", "LV,55,", "LV,55000,") },
        { "doubt: W of a converter", p => p.Replace("converters.csv", "LV,400,", "LV,400000,") },
        { "doubt: efficiency as a fraction", p => p.Replace("motors.csv", "0.4,94", "0.4,0.94") },
        { "doubt: rated voltage of a motor", p => p.Replace("motors.csv", "55,0.4", "55,400") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
