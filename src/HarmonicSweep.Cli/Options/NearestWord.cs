namespace HarmonicSweep.Cli;

/// <summary>The known word a mistyped one most likely means.</summary>
internal static class NearestWord
{
    /// <summary><c> Did you mean 'word'?</c> with its leading blank, or nothing when no word is close.</summary>
    public static string Hint(string typed, IEnumerable<string> known) =>
        Find(typed, known) is { } word ? $" Did you mean '{word}'?" : "";

    /// <summary>The closest known word, at most a third of its letters (and two at least) away; null when none is.</summary>
    public static string? Find(string typed, IEnumerable<string> known)
    {
        string? best = null;
        int bestDistance = int.MaxValue;
        foreach (string word in known)
        {
            int distance = Distance(typed.ToUpperInvariant(), word.ToUpperInvariant());
            if (distance < bestDistance && distance <= Math.Max(2, word.Length / 3) && distance < word.Length)
            {
                (best, bestDistance) = (word, distance);
            }
        }

        return best;
    }

    /// <summary>Insertions, deletions, replacements and swaps of neighbours that turn one word into the other.</summary>
    private static int Distance(string a, string b)
    {
        int[,] d = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            for (int j = 0; j <= b.Length; j++)
            {
                if (i == 0 || j == 0)
                {
                    d[i, j] = i + j;
                    continue;
                }

                int replaced = d[i - 1, j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                d[i, j] = Math.Min(replaced, Math.Min(d[i - 1, j], d[i, j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                {
                    d[i, j] = Math.Min(d[i, j], d[i - 2, j - 2] + 1);
                }
            }
        }

        return d[a.Length, b.Length];
    }
}
