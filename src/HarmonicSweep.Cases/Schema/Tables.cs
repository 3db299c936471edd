namespace HarmonicSweep.Cases.Schema;

/// <summary>Every table of a case folder, in the order they are read.</summary>
internal static class Tables
{
    private static readonly string[] _connections = ["delta", "wye", "wye_grounded"];

    /// <summary>buses.csv.</summary>
    public static readonly Table Buses = new(
        "buses.csv", "a bus",
        Column.Naming("bus"),
        Column.Positive("nominal_kv", "kV", "line-to-line", required: true),
        Column.Free("note"))
    { Example = "MAIN,11,main switchboard" };

    /// <summary>couplers.csv.</summary>
    public static readonly Table Couplers = new(
        "couplers.csv", "an ideal switch or bus coupler",
        Column.Naming(), Column.AtBus("end_a"), Column.AtBus("end_b"),
        new Column { Name = "closed", Kind = CellKind.YesNo, Comment = "blank = yes" })
    { Example = "BC-1,MAIN-A,MAIN-B,no" };

    /// <summary>supplies.csv.</summary>
    public static readonly Table Supplies = new(
        "supplies.csv", "a utility in-feed",
        Column.Naming(), Column.AtBus("bus"),
        Column.Between("voltage_pu", "pu", 0, 2, "EMF behind the impedance, blank = 1", above: true),
        Column.Any("angle_deg", "degrees", "blank = 0"),
        Column.Positive("sc_mva_max", "MVA", "largest short-circuit power, or sc_ka_max"),
        Column.Positive("sc_ka_max", "kA", "instead of sc_mva_max"),
        Column.Positive("sc_mva_min", "MVA", "smallest short-circuit power, blank = the largest"),
        Column.Positive("sc_ka_min", "kA", "instead of sc_mva_min"),
        Column.NotNegative("x_over_r", "", "blank = 10"),
        Column.Coming("x0_over_x1"), Column.Coming("r0_over_r1"), Column.Coming("impedance_table"),
        Column.Free("background_spectrum", "a spectrum of spectra.csv, percent of nominal voltage"),
        Column.Positive("demand_mva", "MVA", "maximum demand, the base of I_L"))
    { Example = "GRID,MAIN,1,0,500,,300,,12,,8" };

    /// <summary>generators.csv.</summary>
    public static readonly Table Generators = new(
        "generators.csv", "a synchronous machine, per unit on its own rating",
        Column.Naming(), Column.AtBus("bus"),
        Column.Positive("rated_mva", "MVA", required: true),
        Column.Positive("rated_kv", "kV", "blank = nominal_kv of the bus"),
        Column.NotNegative("p_mw", "MW", "blank = 0"),
        Column.Between("voltage_pu", "pu", 0, 2, "held at the bus, blank = 1", above: true),
        Column.Between("xd2_pu", "pu", 0, 10, "subtransient, direct axis", required: true, above: true),
        Column.Between("xq2_pu", "pu", 0, 10, "subtransient, quadrature axis, blank = xd2_pu", above: true),
        Column.Between("x2_pu", "pu", 0, 10, "negative sequence, replaces the mean of the two", above: true),
        Column.Coming("x0_pu"),
        Column.Between("ra_pu", "pu", 0, 1, "armature resistance, blank = 0"),
        Column.Free("grounding", "open (blank); other groundings come with the zero sequence"))
    { Example = "GEN,MAIN,2.5,,1.8,1,0.15,,,0.01," };

    /// <summary>transformers.csv.</summary>
    public static readonly Table Transformers = new(
        "transformers.csv", "a two-winding transformer",
        Column.Naming(), Column.AtBus("hv_side"), Column.AtBus("lv_side"),
        Column.Positive("rated_mva", "MVA", required: true),
        Column.Positive("hv_kv", "kV", "rated voltage, blank = nominal_kv of the bus"),
        Column.Positive("lv_kv", "kV", "rated voltage, blank = nominal_kv of the bus"),
        Column.Between("impedance_percent", "percent", 0, 100, "on its own rating", required: true, above: true),
        Column.NotNegative("x_over_r", "", "or load_loss_kw; both blank = 10"),
        Column.NotNegative("load_loss_kw", "kW", "or x_over_r"),
        Column.Free("vector_group", "for example Dyn11, blank = Yy0"),
        Column.Between("tap_percent", "percent", -30, 30, "of the ratio, at the high side, blank = 0"),
        Column.Free("resistance_law", "constant (blank), sqrt, line, cable, eddy or power:a;b;c"),
        Column.Coming("z0_percent"), Column.Coming("hv_grounding_ohm"), Column.Coming("lv_grounding_ohm"),
        Column.Between("eddy_loss_pu", "pu", 0, 1, "share of the load loss, needed by the law eddy"),
        Column.NotNegative("no_load_loss_kw", "kW"),
        Column.Between("no_load_current_percent", "percent", 0, 100))
    { Example = "T1,GRID-BUS,MAIN,10,33,11,10,15,,Dyn11,0,constant,,8,0.4" };

    /// <summary>cables.csv.</summary>
    public static readonly Table Cables = Lines("cables.csv", "a cable", "cable") with
    { Example = "C1,MAIN,PUMPS,1.2,0.164,0.105,370,1,,185,360" };

    /// <summary>lines.csv.</summary>
    public static readonly Table OverheadLines = Lines("lines.csv", "an overhead line", "line") with
    { Example = "L1,MAIN,WELL,8,0.3,0.36,9,1,,," };

    /// <summary>reactors.csv.</summary>
    public static readonly Table Reactors = new(
        "reactors.csv", "a series reactor",
        Column.Naming(), Column.AtBus("end_a"), Column.AtBus("end_b"),
        Column.Positive("x_ohm", "ohm", "at the fundamental, or l_mh"),
        Column.Positive("l_mh", "mH", "instead of x_ohm"),
        Column.Positive("q_factor", "", "X/R at the fundamental", required: true),
        Column.Free("resistance_law", "constant (blank), sqrt, line, cable or power:a;b;c"))
    { Example = "R1,MAIN,DRIVES,0.2,,40," };

    /// <summary>loads.csv.</summary>
    public static readonly Table Loads = new(
        "loads.csv", "a linear load",
        Column.Naming(), Column.AtBus("bus"),
        Column.NotNegative("p_kw", "kW", required: true),
        Column.Between("power_factor", "", 0, 1, "lagging, or q_kvar", above: true),
        Column.Any("q_kvar", "kvar", "instead of power_factor, negative = capacitive"),
        Column.OneOf("model", "as harmonics see it, blank = parallel", false, "parallel", "series", "growing", "cigre", "none"),
        Column.Between("motor_share_percent", "percent", 0, 100, "blank = 0"),
        Column.OneOf("connection", "blank = delta; matters to the zero sequence only", false, _connections))
    { Example = "LIGHTS,LV,350,0.92,,parallel,0,delta" };

    /// <summary>motors.csv.</summary>
    public static readonly Table Motors = new(
        "motors.csv", "an induction motor or a lumped group",
        Column.Naming(), Column.AtBus("bus"),
        Column.Positive("rated_kw", "kW", "shaft power of one motor", required: true),
        Column.Positive("rated_kv", "kV", "blank = nominal_kv of the bus"),
        Column.Between("efficiency_percent", "percent", 0, 100, required: true, above: true),
        Column.Between("power_factor", "", 0, 1, required: true, above: true),
        Column.Between("loading_percent", "percent", 0, 300, "blank = 100"),
        Column.Between("locked_rotor_pu", "pu", 0, 20, "current, blank = 6", above: true),
        Column.Between("locked_rotor_pf", "", 0, 1, "blank = 0.2", above: true),
        Column.Count("count", 1, "equal motors, blank = 1"))
    { Example = "PUMP-MOTORS,LV,55,,94,0.86,80,6.5,0.25,3" };

    /// <summary>capacitors.csv.</summary>
    public static readonly Table Capacitors = new(
        "capacitors.csv", "a capacitor bank",
        Column.Naming(), Column.AtBus("bus"),
        Column.Positive("rated_kvar", "kvar", "of the capacitors of the whole bank at rated_kv", required: true),
        Column.Positive("rated_kv", "kV", "of the capacitors, blank = nominal_kv of the bus"),
        Column.Count("steps", 1, "equal steps, blank = 1"),
        Column.Count("steps_in", 0, "in service as drawn, blank = all"),
        Column.OneOf("connection", "blank = delta; matters to the zero sequence only", false, _connections),
        Column.Between("detuning_percent", "percent", 0, 99, "p = X_L/X_C, blank = no reactor"),
        Column.Positive("reactor_q", "", "X/R of the reactor, needed with detuning_percent"),
        Column.Between("loss_w_per_kvar", "W/kvar", 0, 100, "blank = 0"),
        Column.Between("tolerance_percent", "percent", 0, 50))
    { Example = "BANK,LV,300,0.48,6,6,delta,7,50,0.3,5" };

    /// <summary>filters.csv.</summary>
    public static readonly Table Filters = new(
        "filters.csv", "a passive filter",
        Column.Naming(), Column.AtBus("bus"),
        Column.OneOf("kind", "", true, "single_tuned", "high_pass_2", "high_pass_3", "c_type", "double_tuned"),
        Column.Positive("rated_kvar", "kvar", "of the capacitors at rated_kv", required: true),
        Column.Positive("rated_kv", "kV", "of the capacitors, blank = nominal_kv of the bus"),
        Column.Between("tuned_order", "", 0, 1000, required: true, above: true),
        Column.Between("second_order", "", 0, 1000, "double_tuned only, above tuned_order", above: true),
        Column.Positive("q_factor", "", "or damping_ohm where the kind has a damping resistor"),
        Column.Positive("damping_ohm", "ohm", "damping resistor"),
        Column.OneOf("connection", "blank = delta; matters to the zero sequence only", false, _connections))
    { Example = "F5,MAIN,single_tuned,1200,12,4.85,,60,,wye" };

    /// <summary>spectra.csv.</summary>
    public static readonly Table Spectra = new(
        "spectra.csv", "one line of a spectrum",
        Column.Free("spectrum", "the name of the spectrum", required: true),
        Column.Between("order", "", 0, 1000, "any real number: interharmonics allowed", required: true, above: true),
        Column.NotNegative("percent", "percent", "of the fundamental (converters) or of nominal voltage (background)", required: true),
        Column.Any("angle_deg", "degrees", "blank = 0"))
    { Example = "six pulse,5,20,180" };

    /// <summary>converters.csv.</summary>
    public static readonly Table Converters = new(
        "converters.csv", "a harmonic-producing load",
        Column.Naming(), Column.AtBus("bus"),
        Column.Positive("rated_kw", "kW", "or rated_a"),
        Column.Positive("rated_a", "A", "instead of rated_kw"),
        Column.Between("power_factor", "", 0, 1, "of the fundamental, lagging", required: true, above: true),
        Column.Free("spectrum", "a spectrum of spectra.csv with an order-1 line of 100"),
        Column.Coming("pulses"), Column.Coming("firing_deg"), Column.Coming("overlap_deg"),
        Column.Any("phase_shift_deg", "degrees", "of its own transformer, blank = 0"),
        Column.Between("loading_percent", "percent", 0, 300, "blank = 100"),
        Column.Between("diversity", "", 0, 1, "factor on every order but the first, blank = 1"))
    { Example = "DRIVE,LV,400,,0.95,six pulse,0,80,1" };

    /// <summary>states.csv.</summary>
    public static readonly Table States = new(
        "states.csv", "one setting of an operating state; what a state does not name stays as drawn",
        Column.Free("state", "a name of the state other than base and all", required: true),
        Column.Free("element", "the name of an element of the plant", required: true),
        Column.Free("setting", "in, out, steps=2, sc=min, sc=max, sc=250, tap=-2.5 or loading=60", required: true))
    { Example = "weak grid,GRID,sc=min" };

    /// <summary>Every table, those of later versions included.</summary>
    public static readonly IReadOnlyList<Table> All =
    [
        Buses, Couplers, Supplies, Generators, Transformers, Cables, OverheadLines, Reactors, Loads, Motors, Capacitors, Filters,
        Spectra, Converters, States,
        new("transformers3.csv", "a three-winding transformer") { Later = true },
        new("grounding_transformers.csv", "a zig-zag grounding transformer") { Later = true },
        new("impedance_tables.csv", "a point of a given Z(f)") { Later = true },
    ];

    private static Table Lines(string file, string row, string law) => new(
        file, row,
        Column.Naming(), Column.AtBus("end_a"), Column.AtBus("end_b"),
        Column.Positive("length_km", "km", required: true),
        Column.NotNegative("resistance_ohm_km", "ohm/km", "of one circuit at operating temperature", required: true),
        Column.NotNegative("reactance_ohm_km", "ohm/km", "of one circuit at the fundamental", required: true),
        Column.NotNegative("capacitance_nf_km", "nF/km", "of one circuit, blank = 0"),
        Column.Coming("zero_resistance_ohm_km"), Column.Coming("zero_reactance_ohm_km"), Column.Coming("zero_capacitance_nf_km"),
        Column.Count("circuits", 1, "equal circuits in parallel, blank = 1"),
        Column.Free("resistance_law", $"{law} (blank), constant, sqrt, line, cable, bessel or power:a;b;c"),
        Column.Positive("conductor_mm2", "mm2"),
        Column.Positive("ampacity_a", "A"));
}
