namespace HarmonicSweep.Cases.Reading;

/// <summary>The known name a mistyped one most likely stands for.</summary>
public static class NearestName
{
    /// <summary>Words longer than this are no slip of the pen.</summary>
    private const int Longest = 100;

    /// <summary>
    /// The candidate at the smallest edit distance (Levenshtein 1966), letter case left out; else one that begins with
    /// the word; null when none is within a third of the length either.
    /// </summary>
    public static string? Of(string word, IEnumerable<string> candidates)
    {
        if (word.Length > Longest)
        {
            return null;
        }

        string lower = word.ToLowerInvariant();
        string? best = null;
        int least = Math.Max(2, word.Length / 3) + 1;
        foreach (string candidate in candidates.Where(c => Math.Abs(c.Length - word.Length) < least))
        {
            int distance = Distance(lower, candidate.ToLowerInvariant());
            if (distance < least)
            {
                least = distance;
                best = candidate;
            }
        }

        // or a word left unfinished: efficiency for efficiency_percent
        return best ?? (lower.Length < 3 ? null : candidates.FirstOrDefault(c => c.StartsWith(lower, StringComparison.OrdinalIgnoreCase)));
    }

    /// <summary>A remedy that begins with the suggestion, when there is one.</summary>
    public static string Suggest(string word, IEnumerable<string> candidates, string otherwise) =>
        Of(word, candidates) is { } nearest ? $"did you mean '{nearest}'? Otherwise {otherwise}" : otherwise;

    private static int Distance(string a, string b)
    {
        int[] row = new int[b.Length + 1];
        for (int j = 0; j <= b.Length; j++)
        {
            row[j] = j;
        }

        for (int i = 1; i <= a.Length; i++)
        {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.Length; j++)
            {
                int substitution = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.Min(substitution, Math.Min(row[j], row[j - 1]) + 1);
            }
        }

        return row[b.Length];
    }
}
