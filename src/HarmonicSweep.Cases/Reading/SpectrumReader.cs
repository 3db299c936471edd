using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Gathers the lines of spectra.csv into spectra.</summary>
internal static class SpectrumReader
{
    /// <summary>Spectra by name; a repeated order is a finding.</summary>
    public static Dictionary<string, Spectrum> Read(IReadOnlyList<Row> rows, List<AssumedValue> assumed)
    {
        var spectra = new Dictionary<string, Spectrum>(StringComparer.Ordinal);
        var spellings = new Spellings();
        foreach (IGrouping<string, Row> group in rows.GroupBy(r => r.Text("spectrum")))
        {
            spellings.Add(group.Key, group.First(), "spectrum");
            var lines = new List<SpectrumLine>();
            bool angleAssumed = false;
            foreach (Row row in group)
            {
                double order = HarmonicOrder.Snap(row.Number("order"));
                double percent = row.Number("percent");
                angleAssumed |= !row.Has("angle_deg");
                if (lines.Exists(l => l.Order == order))
                {
                    row.Error(Ids.RepeatedOrder, "order", $"spectrum {group.Key} has order {row.Text("order")} twice.", "keep one of the lines.");
                }

                lines.Add(new SpectrumLine(order, percent, row.Find("angle_deg") ?? 0));
                if (percent > 100)
                {
                    row.Warning(
                        Ids.SpectrumLine, "percent", $"spectrum {group.Key}: order {row.Text("order")} is {row.Text("percent")} percent, more than the fundamental.",
                        "check that the value is percent of the fundamental and not ampere.");
                }
            }

            if (angleAssumed)
            {
                assumed.Add(new AssumedValue(group.Key, "angle_deg", "0 degrees", "no angle given for some line of the spectrum"));
            }

            lines.Sort(static (a, b) => a.Order.CompareTo(b.Order));
            spectra[group.Key] = new Spectrum(group.Key, lines, group.First().Location);
        }

        return spectra;
    }
}
