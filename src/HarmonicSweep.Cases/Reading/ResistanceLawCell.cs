using System.Globalization;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Reads a resistance_law cell.</summary>
internal static class ResistanceLawCell
{
    private const double MostExponent = 10;

    /// <summary>The law, or null after a finding.</summary>
    /// <param name="row">Row.</param>
    /// <param name="otherwise">Word of the default law of the element.</param>
    /// <param name="bessel">Makes the skin-effect law; null where it does not apply.</param>
    /// <param name="eddyLossPu">Eddy share; null where the element has none.</param>
    public static ResistanceLaw? Read(Row row, string otherwise, Func<ResistanceLaw>? bessel = null, double? eddyLossPu = null)
    {
        const string Column = "resistance_law";
        string word = row.Word(Column, otherwise, "default law of this kind of element");
        switch (word)
        {
            case "constant":
                return ResistanceLaw.Constant;
            case "sqrt":
                return ResistanceLaw.SquareRoot;
            case "line":
                return ResistanceLaw.Line;
            case "cable":
                return ResistanceLaw.Cable;
            case "bessel" when bessel is not null:
                return bessel();
            case "bessel":
                row.Error(Ids.Rule, Column, $"{row.Name}: the law bessel is for cables and lines only.", "write constant, sqrt or power:a;b;c.");
                return null;
            case "eddy" when !row.HasColumn("eddy_loss_pu"):
                row.Error(Ids.Rule, Column, $"{row.Name}: the law eddy is for transformers only.", "write constant, sqrt or power:a;b;c.");
                return null;
            case "eddy" when eddyLossPu is { } share:
                return ResistanceLaw.Eddy(share);
            case "eddy":
                row.Error(Ids.Rule, Column, $"{row.Name}: the law eddy needs eddy_loss_pu, which is blank; expected a number from 0 to 1.", "fill eddy_loss_pu in, or choose another law.");
                return null;
        }

        if (word.StartsWith("power:", StringComparison.Ordinal))
        {
            string[] parts = word[6..].Split(';');
            double[] p = [.. parts.Select(t => double.TryParse(t.Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture, out double v) ? v : double.NaN)];
            if (p.Length == 3 && Array.TrueForAll(p, double.IsFinite) && p[0] >= 0 && p[1] >= 0 && Math.Abs(p[0] + p[1] - 1) <= 1e-9 && Math.Abs(p[2]) <= MostExponent)
            {
                return ResistanceLaw.Power(p[0], p[1], p[2]);
            }

            row.Error(Ids.Rule, Column, $"{row.Name}: {Column} '{row.Text(Column).Shown()}' is no power law; expected power:a;b;c with a and b of at least 0, a + b = 1 and c from -10 to 10.", "write for example power:0.9;0.1;1.5 (in quotes where the columns are separated by semicolons).");
            return null;
        }

        string[] words = ["constant", "sqrt", "line", "cable", bessel is not null ? "bessel" : "", row.HasColumn("eddy_loss_pu") ? "eddy" : "", "power:a;b;c"];
        words = [.. words.Where(w => w.Length > 0)];
        row.Error(Ids.UnknownWord, Column, $"{row.Name}: {Column} '{row.Text(Column).Shown()}' is not known; expected one of {string.Join(", ", words)}.", NearestName.Suggest(word, words, "write one of those."));
        return null;
    }
}
