using System.Text;
using HarmonicSweep.Cases;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>
/// A small sound plant as the texts of its files, one of each kind of element, and the ways to break it. Every change gives a
/// new plant; reading goes through a folder on disk.
/// </summary>
internal sealed class PlantText
{
    private readonly SortedDictionary<string, byte[]> _files;

    private PlantText(SortedDictionary<string, byte[]> files) => _files = files;

    /// <summary>The sound plant: it reads without a single finding.</summary>
    public static PlantText Good { get; } = new PlantText(new(StringComparer.Ordinal))
        .With("case.toml", """
            title = "Small plant"
            frequency_hz = 50

            [sweep]
            from_hz = 50
            to_hz = 2500
            step_hz = 1

            [limits]
            standards = ["IEEE 519-2022"]
            pcc = "GRID-BUS"

            [summation]
            rule = "phasor"
            """)
        .With("buses.csv", """
            bus,nominal_kv,note
            GRID-BUS,33,incoming
            MAIN,11,
            MAIN-B,11,
            LV,0.4,
            """)
        .With("couplers.csv", """
            name,end_a,end_b,closed
            BC,MAIN,MAIN-B,no
            """)
        .With("supplies.csv", """
            name,bus,voltage_pu,angle_deg,sc_mva_max,sc_ka_max,sc_mva_min,sc_ka_min,x_over_r,background_spectrum,demand_mva
            GRID,GRID-BUS,1,0,500,,300,,12,voltage,8
            """)
        .With("generators.csv", """
            name,bus,rated_mva,rated_kv,p_mw,voltage_pu,xd2_pu,xq2_pu,x2_pu,ra_pu,grounding
            GEN,MAIN-B,2.5,11,1.8,1,0.15,0.17,,0.01,open
            """)
        .With("transformers.csv", """
            name,hv_side,lv_side,rated_mva,hv_kv,lv_kv,impedance_percent,x_over_r,load_loss_kw,vector_group,tap_percent,resistance_law,eddy_loss_pu,no_load_loss_kw,no_load_current_percent
            T1,GRID-BUS,MAIN,10,33,11,10,15,,Dyn11,0,constant,,8,0.4
            T2,MAIN,LV,1,11,0.4,6,,12,Dyn11,0,eddy,0.1,2,0.8
            """)
        .With("cables.csv", """
            name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km,capacitance_nf_km,circuits,resistance_law,conductor_mm2,ampacity_a
            C1,MAIN,MAIN-B,1.2,0.164,0.105,370,1,cable,185,360
            """)
        .With("lines.csv", """
            name,end_a,end_b,length_km,resistance_ohm_km,reactance_ohm_km,capacitance_nf_km,circuits,resistance_law,conductor_mm2,ampacity_a
            L1,MAIN,MAIN-B,8,0.3,0.36,9,1,line,,
            """)
        .With("reactors.csv", """
            name,end_a,end_b,x_ohm,l_mh,q_factor,resistance_law
            R1,MAIN,MAIN-B,0.2,,40,constant
            """)
        .With("loads.csv", """
            name,bus,p_kw,power_factor,q_kvar,model,motor_share_percent,connection
            LIGHTS,LV,350,0.92,,parallel,0,delta
            """)
        .With("motors.csv", """
            name,bus,rated_kw,rated_kv,efficiency_percent,power_factor,loading_percent,locked_rotor_pu,locked_rotor_pf,count
            PUMPS,LV,55,0.4,94,0.86,80,6.5,0.25,3
            """)
        .With("capacitors.csv", """
            name,bus,rated_kvar,rated_kv,steps,steps_in,connection,detuning_percent,reactor_q,loss_w_per_kvar,tolerance_percent
            BANK,LV,300,0.4,6,6,delta,7,50,0.3,5
            """)
        .With("filters.csv", """
            name,bus,kind,rated_kvar,rated_kv,tuned_order,second_order,q_factor,damping_ohm,connection
            F5,MAIN,single_tuned,1200,11,4.85,,60,,wye
            """)
        .With("spectra.csv", """
            spectrum,order,percent,angle_deg
            six pulse,1,100,0
            six pulse,5,20,180
            voltage,5,1.5,30
            """)
        .With("converters.csv", """
            name,bus,rated_kw,rated_a,power_factor,spectrum,phase_shift_deg,loading_percent,diversity
            DRIVE,LV,400,,0.95,six pulse,0,80,1
            """)
        .With("states.csv", """
            state,element,setting
            weak grid,GRID,sc=min
            night,BANK,steps=2
            """);

    /// <summary>Names of the files, sorted.</summary>
    public IEnumerable<string> Files => _files.Keys;

    /// <summary>Text of a file.</summary>
    public string this[string file] => Encoding.UTF8.GetString(_files[file]);

    /// <summary>With a file added or replaced.</summary>
    public PlantText With(string file, string text) => With(file, Encoding.UTF8.GetBytes(text.ReplaceLineEndings("\n")));

    /// <summary>With a file added or replaced by bytes as they are.</summary>
    public PlantText With(string file, byte[] bytes) => new(new(_files, StringComparer.Ordinal) { [file] = bytes });

    /// <summary>Without a file.</summary>
    public PlantText Without(string file)
    {
        var files = new SortedDictionary<string, byte[]>(_files, StringComparer.Ordinal);
        Assert.True(files.Remove(file), $"the plant has no {file}");
        return new PlantText(files);
    }

    /// <summary>With a passage, which must stand exactly once in the file, replaced.</summary>
    public PlantText Replace(string file, string old, string by)
    {
        string text = this[file];
        int at = text.IndexOf(old, StringComparison.Ordinal);
        Assert.True(at >= 0 && text.IndexOf(old, at + 1, StringComparison.Ordinal) < 0, $"'{old}' must stand once in {file}");
        return With(file, text.Replace(old, by, StringComparison.Ordinal));
    }

    /// <summary>With a line added at the end of a file.</summary>
    public PlantText Append(string file, string line) => With(file, this[file] + "\n" + line);

    /// <summary>Reads the plant from a folder on disk, which is removed afterwards.</summary>
    public CaseReadResult Read() => Read(out _);

    /// <summary>Reads the plant from a folder on disk, which is removed afterwards.</summary>
    public CaseReadResult Read(out string path)
    {
        using var folder = new TempFolder();
        path = folder.Path;
        WriteTo(path);
        return CaseReader.Read(path);
    }

    /// <summary>Reads a plant that must be sound.</summary>
    public CaseFile ReadSound()
    {
        CaseReadResult result = Read();
        Assert.True(result.Case is not null, string.Join("\n", result.Findings));
        return result.Case;
    }

    /// <summary>Writes every file into a folder.</summary>
    public void WriteTo(string folder)
    {
        foreach ((string name, byte[] bytes) in _files)
        {
            File.WriteAllBytes(Path.Combine(folder, name), bytes);
        }
    }
}
