namespace HarmonicSweep.Cases;

/// <summary>Writes a set of files whole or not at all: under passing names first, then renamed.</summary>
public static class WholeFiles
{
    /// <summary>Writes every file into a folder, which is made if need be.</summary>
    /// <exception cref="IOException">The folder cannot be written; nothing new stands in it.</exception>
    /// <exception cref="UnauthorizedAccessException">Likewise.</exception>
    public static void Write(string folder, IReadOnlyDictionary<string, byte[]> files)
    {
        Directory.CreateDirectory(folder);
        if (files.Keys.FirstOrDefault(f => Directory.Exists(Path.Combine(folder, f))) is { } taken)
        {
            throw new IOException($"a folder named {taken} stands in the way of the file of that name.");
        }

        var passing = new List<string>();
        try
        {
            foreach ((string name, byte[] bytes) in files)
            {
                string path = Path.Combine(folder, name + ".unfinished");
                passing.Add(path);
                File.WriteAllBytes(path, bytes);
            }

            foreach (string name in files.Keys)
            {
                File.Move(Path.Combine(folder, name + ".unfinished"), Path.Combine(folder, name), overwrite: true);
            }
        }
        finally
        {
            passing.ForEach(File.Delete);
        }
    }
}
