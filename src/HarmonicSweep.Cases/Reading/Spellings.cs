using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Doubts names that differ in capital letters only: most likely one thing spelled in two ways, whose rows fall apart.</summary>
internal sealed class Spellings
{
    private readonly Dictionary<string, (string Name, SourceLocation Location)> _first = new(StringComparer.OrdinalIgnoreCase);

    /// <summary>Notes a new name, and warns when it was seen in another spelling.</summary>
    public void Add(string name, Row row, string column)
    {
        if (!_first.TryAdd(name, (name, row.Location)) && _first[name].Name != name)
        {
            row.Warning(
                Ids.LetterCase, column, $"the names '{name}' and '{_first[name].Name}' ({_first[name].Location}) differ in capital letters only; they are taken for two things.",
                "spell both alike if they are one thing, or rename one of the two.");
        }
    }
}
