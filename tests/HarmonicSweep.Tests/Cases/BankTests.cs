using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Banks, filters, converters and spectra: rules between cells, and doubts.</summary>
public class BankTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "detuning without reactor_q", p => p.Replace("capacitors.csv", "7,50", "7,") },
        { "reactor_q without detuning", p => p.Replace("capacitors.csv", "7,50", ",50") },
        { "more steps in than there are", p => p.Replace("capacitors.csv", "6,6,delta", "6,7,delta") },
        { "half a step", p => p.Replace("capacitors.csv", "6,6,delta", "6,2.5,delta") },
        { "detuning as a fraction of 100", p => p.Replace("capacitors.csv", "7,50", "100,50") },
        { "doubt: kvar at rated voltage", p => p.Replace("capacitors.csv", "300,0.4", "300,0.48") },
        { "doubt: kvar of a filter at rated voltage", p => p.Replace("filters.csv", "1200,11", "1200,13.2") },
        { "filter kind", p => p.Replace("filters.csv", "single_tuned", "single tuned") },
        { "filter kind blank", p => p.Replace("filters.csv", "single_tuned", "") },
        { "single_tuned without q_factor", p => p.Replace("filters.csv", ",60,,wye", ",,,wye") },
        { "single_tuned with a damping resistor", p => p.Replace("filters.csv", ",60,,wye", ",60,5,wye") },
        { "single_tuned with a second order", p => p.Replace("filters.csv", "4.85,,60", "4.85,7,60") },
        { "double_tuned without a second order", p => p.Replace("filters.csv", "single_tuned", "double_tuned") },
        { "double_tuned upside down", p => p.Replace("filters.csv", "single_tuned", "double_tuned").Replace("filters.csv", "4.85,,60", "4.85,4,60") },
        { "high_pass_2 without damping", p => p.Replace("filters.csv", "single_tuned", "high_pass_2").Replace("filters.csv", ",60,,wye", ",,,wye") },
        { "high_pass_3 with both", p => p.Replace("filters.csv", "single_tuned", "high_pass_3").Replace("filters.csv", ",60,,wye", ",60,5,wye") },
        { "c_type below the fundamental", p => p.Replace("filters.csv", "single_tuned", "c_type").Replace("filters.csv", "4.85", "0.9") },
        { "converter with both ratings", p => p.Replace("converters.csv", "400,,0.95", "400,600,0.95") },
        { "converter with neither", p => p.Replace("converters.csv", "400,,0.95", ",,0.95") },
        { "converter by pulses", p => p.With("converters.csv", "name,bus,rated_kw,power_factor,spectrum,pulses,firing_deg\nDRIVE,LV,400,0.95,,6,15") },
        { "diversity beyond 1", p => p.Replace("converters.csv", "80,1", "80,1.2") },
        { "spectrum without order 1", p => p.Replace("spectra.csv", "six pulse,1,100,0\n", "") },
        { "spectrum in fractions", p => p.Replace("spectra.csv", "six pulse,1,100,0", "six pulse,1,1,0") },
        { "spectrum with an order twice", p => p.Append("spectra.csv", "six pulse,5.0000000001,3,0") },
        { "order 0", p => p.Append("spectra.csv", "six pulse,0,3,0") },
        { "percent missing", p => p.Append("spectra.csv", "six pulse,7,,0") },
        { "doubt: more than the fundamental", p => p.Append("spectra.csv", "six pulse,7,140,0") },
        { "doubt: spectrum of nobody", p => p.Append("spectra.csv", "twelve pulse,1,100,0") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
