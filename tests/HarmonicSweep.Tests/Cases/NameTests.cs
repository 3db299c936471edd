using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Names, and what refers to them.</summary>
public class NameTests
{
    private static readonly BrokenPlants Plants = new()
    {
        { "bus misspelt", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,LW") },
        { "bus unknown", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,SUBSTATION 7") },
        { "element for a bus", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,T2") },
        { "bus in other letters", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,lv") },
        { "name twice in a table", p => p.Append("loads.csv", "LIGHTS,LV,20,0.9,,,,") },
        { "name of a bus", p => p.Replace("loads.csv", "LIGHTS", "MAIN") },
        { "name in two tables", p => p.Replace("motors.csv", "PUMPS", "LIGHTS") },
        { "names that differ in capitals", p => p.Append("loads.csv", "Lights,LV,20,0.9,,parallel,0,") },
        { "bus twice", p => p.Append("buses.csv", "LV,0.69,") },
        { "same bus at both ends", p => p.Replace("cables.csv", "C1,MAIN,MAIN-B", "C1,MAIN,MAIN") },
        { "same bus at both sides", p => p.Replace("transformers.csv", "T2,MAIN,LV", "T2,LV,LV") },
        { "line break in a name", p => p.Replace("loads.csv", "LIGHTS", "\"LIG\nHTS\"") },
        { "control character in a name", p => p.Replace("loads.csv", "LIGHTS", "LIG\u0007HTS") },
        { "invisible character in a name", p => p.Replace("loads.csv", "LIGHTS,LV", "LIGHTS,L\u200BV") },
        { "no-break space in a name", p => p.Replace("loads.csv", "LIGHTS", "LIG\u00A0HTS") },
        { "accent apart from its letter", p => p.Replace("loads.csv", "LIGHTS", "E\u0301CLAIRAGE") },
        { "damaged letter", p => p.Replace("loads.csv", "LIGHTS", "S\uFFFDGE") },
        { "endless name", p => p.Replace("loads.csv", "LIGHTS", new string('x', 1_000_000)) },
        { "bus row with an error is still a bus", p => p.Replace("buses.csv", "LV,0.4", "LV,0.4 kV") },
        { "element row with an error is still an element", p => p.Replace("capacitors.csv", "BANK,LV,300", "BANK,LV,lots") },
        { "spectrum misspelt", p => p.Replace("converters.csv", "six pulse", "sixpulse") },
        { "spectrum blank", p => p.Replace("converters.csv", "six pulse", "") },
        { "background misspelt", p => p.Replace("supplies.csv", "voltage,8", "voltages,8") },
        { "spectra in error are known", p => p.Replace("spectra.csv", "six pulse,1,100,0", "six pulse,1,all,0").Replace("spectra.csv", "voltage,5,1.5,30", "voltage,5,-1.5,30") },
        { "no spectra", p => p.Without("spectra.csv") },
        { "pcc misspelt", p => p.Replace("case.toml", "GRID-BUS", "GRIDBUS") },
    };

    public static TheoryData<string> Names => Plants.Names;

    [Theory]
    [MemberData(nameof(Names))]
    public void Is_told_in_full(string name) => Plants.Check(name);
}
