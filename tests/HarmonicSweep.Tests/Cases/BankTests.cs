using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Banks, filters, converters and spectra: rules between cells, and doubts.</summary>
public class BankTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "detuning without reactor_q", p => p.Replace("capacitors.csv", "7,50", "7,"),
            "capacitors.csv(2,reactor_q): error HS021: BANK: it has detuning_percent 7 but no reactor_q; expected a number above 0. Fix: give X/R of the reactor at the fundamental (maker's sheet)."
        },
        { "reactor_q without detuning", p => p.Replace("capacitors.csv", "7,50", ",50"),
            "capacitors.csv(2,reactor_q): warning HS117: BANK: reactor_q has no effect without detuning_percent: the bank is taken without a reactor. Fix: give detuning_percent, or leave reactor_q blank."
        },
        { "more steps in than there are", p => p.Replace("capacitors.csv", "6,6,delta", "6,7,delta"),
            "capacitors.csv(2,steps_in): error HS011: BANK: steps_in is 7; expected a whole number from 0 to 6, its steps. Fix: correct steps_in or steps."
        },
        { "half a step", p => p.Replace("capacitors.csv", "6,6,delta", "6,2.5,delta"),
            "capacitors.csv(2,steps_in): error HS011: BANK: steps_in is 2.5; expected a whole number from 0 to 100000. Fix: correct the value, or check which column it belongs to."
        },
        { "detuning as a fraction of 100", p => p.Replace("capacitors.csv", "7,50", "100,50"),
            "capacitors.csv(2,detuning_percent): error HS011: BANK: detuning_percent is 100; expected a number from 0 to 99 in percent. Fix: correct the value, or check its unit."
        },
        { "doubt: kvar at rated voltage", p => p.Replace("capacitors.csv", "300,0.4", "300,0.48"),
            "capacitors.csv(2,rated_kv): warning HS106: BANK: 300 kvar at 0.48 kV delivers 224.01 kvar at the bus's 0.4 kV. Fix: nothing needs mending if rated_kvar is that at rated_kv; else convert it."
        },
        { "doubt: kvar of a filter at rated voltage", p => p.Replace("filters.csv", "1200,11", "1200,13.2"),
            "filters.csv(2,rated_kv): warning HS106: F5: 1200 kvar of capacitors at 13.2 kV are 833.33 kvar at the bus's 11 kV. Fix: nothing needs mending if rated_kvar is that of the capacitors at rated_kv; else convert it."
        },
        { "filter kind", p => p.Replace("filters.csv", "single_tuned", "single tuned"),
            "filters.csv(2,kind): error HS014: F5: kind is 'single tuned'; expected one of single_tuned, high_pass_2, high_pass_3, c_type, double_tuned. Fix: did you mean 'single_tuned'? Otherwise write one of those words."
        },
        { "filter kind blank", p => p.Replace("filters.csv", "single_tuned", ""),
            "filters.csv(2,kind): error HS009: F5: kind is blank; expected one of single_tuned, high_pass_2, high_pass_3, c_type, double_tuned. Fix: fill the cell in."
        },
        { "single_tuned without q_factor", p => p.Replace("filters.csv", ",60,,wye", ",,,wye"),
            "filters.csv(2,q_factor): error HS021: F5: a single_tuned filter needs q_factor; expected a number above 0. Fix: give the quality factor of its coil."
        },
        { "single_tuned with a damping resistor", p => p.Replace("filters.csv", ",60,,wye", ",60,5,wye"),
            "filters.csv(2,damping_ohm): error HS021: F5: a single_tuned filter has no damping resistor; expected a blank cell. Fix: leave damping_ohm blank, or choose a damped kind."
        },
        { "single_tuned with a second order", p => p.Replace("filters.csv", "4.85,,60", "4.85,7,60"),
            "filters.csv(2,second_order): error HS021: F5: second_order is for double_tuned filters only; expected a blank cell. Fix: leave it blank."
        },
        { "double_tuned without a second order", p => p.Replace("filters.csv", "single_tuned", "double_tuned"),
            "filters.csv(2,second_order): error HS021: F5: second_order is blank; expected a number above its tuned_order, 4.85, for a double_tuned filter. Fix: give the upper of its two orders."
        },
        { "double_tuned upside down", p => p.Replace("filters.csv", "single_tuned", "double_tuned").Replace("filters.csv", "4.85,,60", "4.85,4,60"),
            "filters.csv(2,second_order): error HS021: F5: second_order is 4; expected a number above its tuned_order, 4.85, for a double_tuned filter. Fix: give the upper of its two orders."
        },
        { "high_pass_2 without damping", p => p.Replace("filters.csv", "single_tuned", "high_pass_2").Replace("filters.csv", ",60,,wye", ",,,wye"),
            "filters.csv(2,q_factor): error HS021: F5: neither q_factor nor damping_ohm is given; expected one of them. Fix: give the damping resistance or the quality factor."
        },
        { "high_pass_3 with both", p => p.Replace("filters.csv", "single_tuned", "high_pass_3").Replace("filters.csv", ",60,,wye", ",60,5,wye"),
            "filters.csv(2,q_factor): note HS117: F5: q_factor has no effect where damping_ohm is given. Fix: nothing needs mending; damping_ohm is the damping resistor."
        },
        { "c_type below the fundamental", p => p.Replace("filters.csv", "single_tuned", "c_type").Replace("filters.csv", "4.85", "0.9"),
            "filters.csv(2,tuned_order): error HS011: F5: tuned_order is 0.9; expected a number above 1 for a c_type filter. Fix: correct the order."
        },
        { "converter with both ratings", p => p.Replace("converters.csv", "400,,0.95", "400,600,0.95"),
            "converters.csv(2,rated_kw): error HS020: DRIVE: expected exactly one of rated_kw and rated_a; both are given. Fix: leave one of them blank."
        },
        { "converter with neither", p => p.Replace("converters.csv", "400,,0.95", ",,0.95"),
            "converters.csv(2,rated_kw): error HS020: DRIVE: expected exactly one of rated_kw and rated_a; neither is given. Fix: fill one of them in."
        },
        { "converter by pulses", p => p.With("converters.csv", "name,bus,rated_kw,power_factor,spectrum,pulses,firing_deg\nDRIVE,LV,400,0.95,,6,15"),
            "converters.csv(2,pulses): error HS017: DRIVE: pulses is '6', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it.",
            "converters.csv(2,firing_deg): error HS017: DRIVE: firing_deg is '15', but its model is not in this version; expected a blank cell. Fix: leave the cell blank; the results then hold without it."
        },
        { "diversity beyond 1", p => p.Replace("converters.csv", "80,1", "80,1.2"),
            "converters.csv(2,diversity): error HS011: DRIVE: diversity is 1.2; expected a number from 0 to 1. Fix: correct the value, or check which column it belongs to."
        },
        { "spectrum without order 1", p => p.Replace("spectra.csv", "six pulse,1,100,0\n", ""),
            "converters.csv(2,spectrum): error HS023: DRIVE: its spectrum six pulse (spectra.csv(2)) has no line of order 1; expected 100 percent of the fundamental current. Fix: add the line six pulse,1,100,0 to spectra.csv, and give the others in percent of it."
        },
        { "spectrum in fractions", p => p.Replace("spectra.csv", "six pulse,1,100,0", "six pulse,1,1,0"),
            "converters.csv(2,spectrum): error HS023: DRIVE: its spectrum six pulse (spectra.csv(2)) has 1 percent at order 1; expected 100 percent of the fundamental current. Fix: add the line six pulse,1,100,0 to spectra.csv, and give the others in percent of it."
        },
        { "spectrum with an order twice", p => p.Append("spectra.csv", "six pulse,5.0000000001,3,0"),
            "spectra.csv(5,order): error HS042: spectrum six pulse has order 5.0000000001 twice. Fix: keep one of the lines."
        },
        { "spectrum spelled in two ways", p => p.Append("spectra.csv", "Six pulse,7,3,0"),
            "spectra.csv(5,spectrum): warning HS116: the names 'Six pulse' and 'six pulse' (spectra.csv(2)) differ in capital letters only; they are taken for two things. Fix: spell both alike if they are one thing, or rename one of the two.",
            "spectra.csv(5): note HS115: spectrum Six pulse is used by nobody. Fix: nothing needs mending, unless a converter was meant to use it."
        },
        { "order 0", p => p.Append("spectra.csv", "six pulse,0,3,0"),
            "spectra.csv(5,order): error HS011: order is 0; expected a number above 0 up to 1000. Fix: correct the value, or check which column it belongs to."
        },
        { "percent missing", p => p.Append("spectra.csv", "six pulse,7,,0"),
            "spectra.csv(5,percent): error HS009: percent is blank; expected a number of at least 0 in percent. Fix: fill the cell in."
        },
        { "doubt: more than the fundamental", p => p.Append("spectra.csv", "six pulse,7,140,0"),
            "spectra.csv(5,percent): warning HS110: spectrum six pulse: order 7 is 140 percent, more than the fundamental. Fix: check that the value is percent of the fundamental and not ampere."
        },
        { "doubt: spectrum of nobody", p => p.Append("spectra.csv", "twelve pulse,1,100,0"),
            "spectra.csv(5): note HS115: spectrum twelve pulse is used by nobody. Fix: nothing needs mending, unless a converter was meant to use it."
        },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
