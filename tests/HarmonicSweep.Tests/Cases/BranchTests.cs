using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Couplers, transformers, lines and reactors: rules between cells, and doubts.</summary>
public class BranchTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "coupler of unlike buses", p => p.Replace("couplers.csv", "MAIN,MAIN-B", "MAIN,LV") },
        { "X/R and load loss", p => p.Replace("transformers.csv", "10,15,,Dyn11", "10,15,60,Dyn11") },
        { "load loss beyond the impedance", p => p.Replace("transformers.csv", "6,,12,", "6,,120,") },
        { "no-load power below the loss", p => p.Replace("transformers.csv", "0.1,2,0.8", "0.1,9,0.8") },
        { "vector group of wrong parity", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Dyn6") },
        { "vector group with an odd clock for YNyn", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,YNyn1") },
        { "vector group beyond 12", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Dyn13") },
        { "vector group unknown", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Delta-star") },
        { "zigzag", p => p.Replace("transformers.csv", "15,,Dyn11", "15,,Dzn0") },
        { "tap beyond 30", p => p.Replace("transformers.csv", "Dyn11,0,constant", "Dyn11,31,constant") },
        { "impedance beyond 100", p => p.Replace("transformers.csv", "33,11,10,15", "33,11,110,15") },
        { "law unknown", p => p.Replace("transformers.csv", "0,constant,,8", "0,constantly,,8") },
        { "eddy without a share", p => p.Replace("transformers.csv", "eddy,0.1", "eddy,") },
        { "eddy of a cable", p => p.Replace("cables.csv", "1,cable,", "1,eddy,") },
        { "bessel of a reactor", p => p.Replace("reactors.csv", "constant", "bessel") },
        { "bessel without resistance", p => p.Replace("cables.csv", "0.164,0.105,370,1,cable", "0,0.105,370,1,bessel") },
        { "power law that is not 1 at h = 1", p => p.Replace("reactors.csv", "constant", "power:0.9;0.2;1.5") },
        { "power law with too few numbers", p => p.Replace("reactors.csv", "constant", "power:0.9;0.1") },
        { "power law with an exponent past all sense", p => p.Replace("reactors.csv", "constant", "power:0.9;0.1;1e300") },
        { "cable without impedance", p => p.Replace("cables.csv", "0.164,0.105", "0,0") },
        { "reactor with both", p => p.Replace("reactors.csv", "0.2,,40", "0.2,0.6,40") },
        { "reactor with neither", p => p.Replace("reactors.csv", "0.2,,40", ",,40") },
        { "reactor without q_factor", p => p.Replace("reactors.csv", "0.2,,40", "0.2,,") },
        { "zero-sequence columns blank", p => p.With("cables.csv", "name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km,capacitance_nf_km,zero_resistance_ohm_km\nC1,MAIN,MAIN-B,1,0.2,0.1,300,") },
        { "zero-sequence column filled", p => p.With("cables.csv", "name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km,capacitance_nf_km,zero_resistance_ohm_km\nC1,MAIN,MAIN-B,1,0.2,0.1,300,0.5") },
        { "z0 of a transformer", p => p.With("transformers.csv", "name,hv_side,lv_side,rated_mva,impedance_percent,z0_percent,hv_grounding_ohm,lv_grounding_ohm\nT1,GRID-BUS,MAIN,10,10,9,5,0") },
        { "doubt: rated voltage", p => p.Replace("transformers.csv", "10,33,11,10", "10,33,0.4,10") },
        { "doubt: sides exchanged", p => p.Replace("transformers.csv", "T2,MAIN,LV,1,11,0.4", "T2,LV,MAIN,1,0.4,11") },
        { "doubt: kVA for MVA", p => p.Replace("transformers.csv", "T2,MAIN,LV,1,11,0.4,6,,12,Dyn11,0,eddy,0.1,2,0.8", "T2,MAIN,LV,1000,11,0.4,6,10,,Dyn11,0,eddy,0.1,2,0.8") },
        { "doubt: impedance in per unit", p => p.Replace("transformers.csv", "33,11,10,15", "33,11,0.1,15") },
        { "doubt: X/R of a transformer", p => p.Replace("transformers.csv", "10,15,,Dyn11", "10,150,,Dyn11") },
        { "doubt: metres of cable", p => p.Replace("cables.csv", "1.2", "1200") },
        { "doubt: metres of line", p => p.Replace("lines.csv", "MAIN-B,8,", "MAIN-B,8000,") },
        { "doubt: line between voltages", p => p.Replace("lines.csv", "L1,MAIN,MAIN-B", "L1,MAIN,LV") },
        { "doubt: volts for kilovolts", p => p.Replace("buses.csv", "LV,0.4", "LV,690").Replace("transformers.csv", "1,11,0.4,6", "1,11,,6").Without("loads.csv").Without("motors.csv").Without("capacitors.csv").Without("converters.csv").Without("states.csv") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
