using System.Collections;
using HarmonicSweep.Cases;
using HarmonicSweep.Network;
using Xunit;

namespace HarmonicSweep.Tests.Cases;

/// <summary>Named ways to break the sound plant, each with every line the reader must then say, in order, and no other.</summary>
internal sealed class BrokenPlants : IEnumerable<string>
{
    private readonly Dictionary<string, (Func<PlantText, PlantText> Break, string[] Expected)> _plants = new(StringComparer.Ordinal);

    /// <summary>The names, as data of a theory.</summary>
    public TheoryData<string> Names => [.. _plants.Keys];

    /// <summary>Adds a broken plant.</summary>
    public void Add(string name, Func<PlantText, PlantText> breaking, params IEnumerable<string> expected) => _plants.Add(name, (breaking, [.. expected]));

    /// <summary>Reads one and compares every line.</summary>
    public void Check(string name)
    {
        (Func<PlantText, PlantText> breaking, string[] expected) = _plants[name];
        CaseReadResult result = breaking(PlantText.Good).Read(out string folder);
        string[] found = [.. result.Findings.Select(f => f.ToString().Replace(folder, "FOLDER", StringComparison.Ordinal))];
        if (!found.SequenceEqual(expected))
        {
            Assert.Fail($"expected\n{string.Join("\n", expected)}\nfound\n{string.Join("\n", found)}\n.");
        }

        Assert.Equal(result.Findings.Any(f => f.Severity == Severity.Error), result.Case is null);
    }

    /// <inheritdoc/>
    public IEnumerator<string> GetEnumerator() => _plants.Keys.GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();
}
