using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Everything wrong is told at once, by file and line.</summary>
public class ManyErrorsTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "ten errors and more over many files", p => p.Replace("case.toml", "step_hz = 1", "step_hz = -1")
                .Replace("buses.csv", "MAIN-B,11", "MAIN-B,11 kV")
                .Replace("cables.csv", "1.2", "-1.2")
                .Replace("capacitors.csv", "7,50", "7,")
                .Replace("converters.csv", "six pulse", "six puls")
                .Replace("loads.csv", "LIGHTS,LV,350,0.92", "LIGHTS,LVV,350,92")
                .Append("loads.csv", "LIGHTS,LV,,,,,,")
                .Replace("motors.csv", "efficiency_percent", "efficiency")
                .Replace("states.csv", "steps=2", "step=2")
                .Append("states.csv", "base,GRID,out")
                .Replace("supplies.csv", "500,,300,,", "500,9,300,,")
                .Replace("transformers.csv", "15,,Dyn11", "15,,Dyn10")
                .With("bus.csv", "bus\n"),
            "bus.csv: error HS004: unknown file bus.csv; known are case.toml, buses.csv, couplers.csv, supplies.csv, generators.csv, transformers.csv, cables.csv, lines.csv, reactors.csv, loads.csv, motors.csv, capacitors.csv, filters.csv, spectra.csv, converters.csv, states.csv, transformers3.csv, grounding_transformers.csv, impedance_tables.csv. Fix: did you mean 'buses.csv'? Otherwise move it out of the case folder.",
            "buses.csv(4,nominal_kv): error HS010: MAIN-B: nominal_kv is '11 kV'; expected a number above 0 in kV. Fix: write digits with a decimal point, without units or thousands separators.",
            "cables.csv(2,length_km): error HS011: C1: length_km is -1.2; expected a number above 0 in km. Fix: remove the minus sign, or check which column the value belongs to.",
            "capacitors.csv(2,reactor_q): error HS021: BANK: it has detuning_percent 7 but no reactor_q; expected a number above 0. Fix: give X/R of the reactor at the fundamental (maker's sheet).",
            "case.toml(7,step_hz): error HS036: step_hz is -1; expected a number above 0 in Hz. Fix: correct the value.",
            "converters.csv(2,spectrum): error HS022: DRIVE: spectrum 'six puls' is not in spectra.csv; expected the name of a spectrum of spectra.csv. Fix: did you mean 'six pulse'? Otherwise add its lines to spectra.csv.",
            "loads.csv(2,bus): error HS015: LIGHTS: bus 'LVV' is no bus; expected the name of a bus of buses.csv. Fix: did you mean 'LV'? Otherwise add the bus to buses.csv.",
            "loads.csv(2,power_factor): error HS011: LIGHTS: power_factor is 92; expected a number above 0 up to 1. Fix: write 0.92 if 92 percent is meant.",
            "loads.csv(3,name): error HS016: the name 'LIGHTS' is already taken at loads.csv(2); expected a name that nothing else bears. Fix: rename one of the two; buses and elements share their names.",
            "loads.csv(3,p_kw): error HS009: LIGHTS: p_kw is blank; expected a number of at least 0 in kW. Fix: fill the cell in.",
            "motors.csv(1,efficiency): error HS005: unknown column 'efficiency'; known are name, bus, rated_kw, rated_kv, efficiency_percent, power_factor, loading_percent, locked_rotor_pu, locked_rotor_pf, count, source. Fix: did you mean 'efficiency_percent'? Otherwise remove the column (remarks may stand in a column named source or in # lines).",
            "motors.csv(1,efficiency_percent): error HS007: column efficiency_percent is missing; expected a number above 0 up to 100 in percent in every row. Fix: add the column to the header and fill it in.",
            "states.csv(3,setting): error HS025: setting 'step=2' is not known; expected in, out, steps=NUMBER, sc=MVA, tap=PERCENT or loading=PERCENT. Fix: did you mean 'steps='? Otherwise write for example in, out, steps=2, sc=min, sc=max, sc=250, tap=-2.5, loading=60.",
            "states.csv(4,state): error HS027: 'base' is a reserved name: base is the plant as drawn, all means every state. Fix: give the state another name.",
            "supplies.csv(2,sc_ka_max): error HS020: GRID: both sc_mva_max and sc_ka_max are given; expected one of them. Fix: leave one of them blank.",
            "transformers.csv(2,vector_group): error HS021: T1: 'Dyn10' is no vector group; expected D, Y or YN, then d, y or yn, then a clock number 0 to 12, even for Yy and Dd, odd for Yd and Dy. Fix: write for example Dyn11 or YNd5."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
