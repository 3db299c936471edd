using HarmonicSweep.Cases;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>
/// The ledger: every default of MODELS that was used is listed with unit and reason, and nothing that was given. Defaults are
/// those of the model description: rated voltages nominal, X/R 10, locked rotor 6 pu at 0.2, laws by kind of element.
/// </summary>
public class LedgerTests
{
    /// <summary>Every optional cell blank.</summary>
    private static PlantText Blank => PlantText.Good
        .With("case.toml", "title = \"Blank\"\nfrequency_hz = 60")
        .With("couplers.csv", "name,end_a,end_b\nBC,MAIN,MAIN-B")
        .With("supplies.csv", "name,bus,sc_mva_max\nGRID,GRID-BUS,500")
        .With("generators.csv", "name,bus,rated_mva,xd2_pu\nGEN,MAIN-B,2.5,0.15")
        .With("transformers.csv", "name,hv_side,lv_side,rated_mva,impedance_percent\nT1,GRID-BUS,MAIN,10,10\nT2,MAIN,LV,1,6")
        .With("cables.csv", "name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km\nC1,MAIN,MAIN-B,1.2,0.164,0.105")
        .With("lines.csv", "name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km\nL1,MAIN,MAIN-B,8,0.3,0.36")
        .With("reactors.csv", "name,end_a,end_b,x_ohm,q_factor\nR1,MAIN,MAIN-B,0.2,40")
        .With("loads.csv", "name,bus,p_kw,power_factor\nLIGHTS,LV,350,0.92")
        .With("motors.csv", "name,bus,rated_kw,efficiency_percent,power_factor\nPUMPS,LV,55,94,0.86")
        .With("capacitors.csv", "name,bus,rated_kvar\nBANK,LV,300")
        .With("filters.csv", "name,bus,kind,rated_kvar,tuned_order,q_factor\nF5,MAIN,single_tuned,1200,4.85,60")
        .With("spectra.csv", "spectrum,order,percent\nsix pulse,1,100\nsix pulse,5,20")
        .With("converters.csv", "name,bus,rated_kw,power_factor,spectrum\nDRIVE,LV,400,0.95,six pulse")
        .Without("states.csv");

    private static readonly string[] OfBlank =
    [
        "case from_hz 60 Hz", "case to_hz 3000 Hz", "case step_hz 1 Hz", "case rule phasor", "case standards IEEE 519-2022",
        "six pulse angle_deg 0 degrees",
        "BC closed yes",
        "GRID sc_mva_min 500 MVA", "GRID resistance_law constant", "GRID x_over_r 10", "GRID voltage_pu 1 pu", "GRID angle_deg 0 degrees",
        "GEN resistance_law sqrt", "GEN xq2_pu 0.15 pu", "GEN rated_kv 11 kV", "GEN p_mw 0 MW", "GEN voltage_pu 1 pu", "GEN ra_pu 0 pu",
        "T1 hv_kv 33 kV", "T1 lv_kv 11 kV", "T1 x_over_r 10", "T1 resistance_law constant", "T1 vector_group Yy0", "T1 tap_percent 0 percent",
        "T1 no_load_loss_kw 0 kW", "T1 no_load_current_percent 0 percent",
        "T2 hv_kv 11 kV", "T2 lv_kv 0.4 kV", "T2 x_over_r 10", "T2 resistance_law constant", "T2 vector_group Yy0", "T2 tap_percent 0 percent",
        "T2 no_load_loss_kw 0 kW", "T2 no_load_current_percent 0 percent",
        "C1 resistance_law cable", "C1 capacitance_nf_km 0 nF/km", "C1 circuits 1",
        "L1 resistance_law line", "L1 capacitance_nf_km 0 nF/km", "L1 circuits 1",
        "R1 resistance_law constant",
        "LIGHTS model parallel", "LIGHTS motor_share_percent 0 percent",
        "PUMPS resistance_law sqrt", "PUMPS rated_kv 0.4 kV", "PUMPS loading_percent 100 percent", "PUMPS locked_rotor_pu 6 pu", "PUMPS locked_rotor_pf 0.2",
        "PUMPS count 1",
        "BANK rated_kv 0.4 kV", "BANK steps 1", "BANK steps_in 1", "BANK loss_w_per_kvar 0 W/kvar",
        "F5 rated_kv 11 kV", "F5 resistance_law constant",
        "DRIVE phase_shift_deg 0 degrees", "DRIVE loading_percent 100 percent", "DRIVE diversity 1",
    ];

    [Fact]
    public void Every_default_is_listed_with_its_unit()
    {
        CaseFile read = Blank.ReadSound();
        string[] listed = [.. read.Assumed.Select(a => $"{a.Element} {a.Column} {a.Value}")];
        Assert.Equal(OfBlank.Order(StringComparer.Ordinal), listed.Order(StringComparer.Ordinal));
        Assert.All(read.Assumed, a => Assert.False(string.IsNullOrWhiteSpace(a.Why), $"{a.Element} {a.Column} has no reason"));
    }

    /// <summary>Only laws that have no column of their own are left, since everything else is given.</summary>
    [Fact]
    public void What_is_given_is_not_listed() => Assert.Equal(
        ["BANK resistance_law", "F5 resistance_law", "GEN resistance_law", "GRID resistance_law", "PUMPS resistance_law"],
        PlantText.Good.ReadSound().Assumed.Select(a => $"{a.Element} {a.Column}").Order(StringComparer.Ordinal));

    [Fact]
    public void Standard_without_an_edition_is_listed() => Assert.Contains(
        PlantText.Good.Replace("case.toml", "IEEE 519-2022", "IEEE Std 519").ReadSound().Assumed,
        a => a is { Column: "standards", Value: "IEEE 519-2022", Why: "no edition was given" });
}
