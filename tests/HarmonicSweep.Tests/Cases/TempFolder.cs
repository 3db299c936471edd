namespace HarmonicSweep.Tests.Cases;

/// <summary>A folder of its own that is removed with all it holds.</summary>
internal sealed class TempFolder : IDisposable
{
    /// <summary>Full path.</summary>
    public string Path { get; } = Directory.CreateTempSubdirectory("case-").FullName;

    /// <summary>Path of a file inside.</summary>
    public string this[string file] => System.IO.Path.Combine(Path, file);

    /// <inheritdoc/>
    public void Dispose() => Directory.Delete(Path, recursive: true);
}
