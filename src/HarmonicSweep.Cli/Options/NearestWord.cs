using HarmonicSweep.Cases.Reading;

namespace HarmonicSweep.Cli;

/// <summary>A hint at the known word a mistyped one most likely means.</summary>
internal static class NearestWord
{
    /// <summary><c> Did you mean 'word'?</c> with its leading blank, or nothing when no word is close.</summary>
    public static string Hint(string typed, IEnumerable<string> known) =>
        NearestName.Of(typed, known) is { } word ? $" Did you mean '{word}'?" : "";
}
