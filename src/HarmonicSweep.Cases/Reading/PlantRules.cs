using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Rules between rows: a source at all, generators at one bus, spectra nobody uses.</summary>
internal static class PlantRules
{
    public static void Check(
        IReadOnlyList<PlantElement> elements, IReadOnlyDictionary<string, Bus> buses, IReadOnlyDictionary<string, Spectrum> spectra, FindingList findings)
    {
        if (!findings.HasErrors && buses.Count > 0 && !elements.Any(e => e is Supply or Generator))
        {
            findings.Error(
                Ids.NoSource, new SourceLocation(Tables.Supplies.File, 0), "the plant has neither a supply nor a generator, so no bus is live.",
                "add the utility in-feed to supplies.csv.");
        }

        foreach (IGrouping<string, Generator> atBus in elements.OfType<Generator>().GroupBy(g => g.Bus))
        {
            Generator first = atBus.First();
            foreach (Generator other in atBus.Where(g => g.VoltagePu != first.VoltagePu))
            {
                findings.Error(
                    Ids.GeneratorVoltages, other.Location.At("voltage_pu"),
                    $"{other.Name} holds {other.VoltagePu.Plain()} pu at bus {other.Bus}, where {first.Name} holds {first.VoltagePu.Plain()} pu; expected the same.",
                    "give both the same voltage_pu.");
            }
        }

        var used = new HashSet<string>(elements.OfType<Converter>().Select(c => c.Spectrum.Name), StringComparer.Ordinal);
        used.UnionWith(elements.OfType<Supply>().Where(s => s.Background is not null).Select(s => s.Background!.Name));
        foreach (Spectrum spectrum in spectra.Values.Where(s => !used.Contains(s.Name) && !findings.HasErrors))
        {
            findings.Note(Ids.UnusedSpectrum, spectrum.Location, $"spectrum {spectrum.Name} is used by nobody.", "nothing needs mending, unless a converter was meant to use it.");
        }
    }
}
