using System.Text;
using System.Text.Json;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>
/// A folder that receives the files of a result, all or none: they are written to a hidden folder inside it and
/// moved only when every one is complete. Files of an earlier result that the new one does not replace are removed,
/// so that a folder never mixes two runs.
/// </summary>
public sealed class ResultFolder : IDisposable
{
    /// <summary>Name of the JSON document; it lists the other files and is moved last.</summary>
    public const string DocumentName = "result.json";

    private readonly string _folder;
    private readonly bool _created;
    private bool _committed;

    private ResultFolder(string folder, bool created, string stagingFolder)
    {
        _folder = folder;
        _created = created;
        StagingFolder = stagingFolder;
    }

    /// <summary>Where files are put until <see cref="Commit"/>; its content keeps its relative paths.</summary>
    public string StagingFolder { get; }

    /// <summary>Creates the folder where it is missing and makes sure that it can be written.</summary>
    /// <param name="folder">Folder that receives the files.</param>
    /// <exception cref="IOException">The folder cannot be created or written.</exception>
    /// <exception cref="UnauthorizedAccessException">The folder must not be written.</exception>
    public static ResultFolder Open(string folder)
    {
        string full = Path.GetFullPath(folder);
        bool created = !Directory.Exists(full);
        Directory.CreateDirectory(full);
        string staging = Path.Combine(full, ".writing-" + Path.GetRandomFileName());
        Directory.CreateDirectory(staging);
        return new ResultFolder(full, created, staging);
    }

    /// <summary>Writes every CSV table.</summary>
    /// <exception cref="IOException">A file cannot be written.</exception>
    public void WriteTables(CaseFile caseFile, StudyResult result)
    {
        foreach (CsvTable table in ResultCsv.Tables(caseFile, result))
        {
            WriteText(table.Name + ".csv", table.Write);
        }
    }

    /// <summary>Writes one text file, UTF-8 without byte order mark.</summary>
    /// <exception cref="IOException">The file cannot be written.</exception>
    public void WriteText(string name, Action<TextWriter> write)
    {
        using var writer = new StreamWriter(Path.Combine(StagingFolder, name), append: false, new UTF8Encoding(false)) { NewLine = "\n" };
        write(writer);
    }

    /// <summary>Writes the JSON document, which lists the files written so far, then moves everything into place.</summary>
    /// <param name="caseFile">The case it was computed from.</param>
    /// <param name="result">What was computed.</param>
    /// <param name="version">Version of the program.</param>
    /// <param name="finish">Returns when every other file is staged; called after the bulk of the document is written.</param>
    /// <returns>Names of the files, relative to the folder, in ordinal order; the document is one of them.</returns>
    /// <exception cref="IOException">A file cannot be written or moved.</exception>
    public IReadOnlyList<string> Commit(CaseFile caseFile, StudyResult result, string version, Action? finish = null)
    {
        string[] files = [];
        using (FileStream stream = File.Create(Path.Combine(StagingFolder, DocumentName)))
        {
            ResultJson.Write(stream, caseFile, result, version, () =>
            {
                finish?.Invoke();
                return files = [.. StagedFiles().Where(f => f != DocumentName)];
            });
        }

        string[] stale = [.. FilesOfEarlierResult().Except(files, StringComparer.Ordinal)];
        _committed = true;
        foreach (string file in (string[])[.. files, DocumentName])
        {
            string target = Path.Combine(_folder, file);
            Directory.CreateDirectory(Path.GetDirectoryName(target)!);
            File.Move(Path.Combine(StagingFolder, file), target, overwrite: true);
        }

        foreach (string file in stale)
        {
            File.Delete(Path.Combine(_folder, file));
        }

        return [.. files.Append(DocumentName).Order(StringComparer.Ordinal)];
    }

    /// <summary>Removes what was not moved, and the folder itself when it was made for a result that never came.</summary>
    public void Dispose()
    {
        Directory.Delete(StagingFolder, recursive: true);
        if (_created && !_committed && !Directory.EnumerateFileSystemEntries(_folder).Any())
        {
            Directory.Delete(_folder);
        }
    }

    private string[] StagedFiles() =>
    [
        .. Directory.EnumerateFiles(StagingFolder, "*", SearchOption.AllDirectories)
            .Select(f => Path.GetRelativePath(StagingFolder, f).Replace('\\', '/'))
            .Order(StringComparer.Ordinal),
    ];

    /// <summary>What the document of an earlier run lists; anything else in the folder is not ours to touch.</summary>
    private IEnumerable<string> FilesOfEarlierResult()
    {
        string document = Path.Combine(_folder, DocumentName);
        if (!File.Exists(document))
        {
            return [];
        }

        try
        {
            using FileStream stream = File.OpenRead(document);
            using JsonDocument json = JsonDocument.Parse(stream);
            return json.RootElement.ValueKind == JsonValueKind.Object && json.RootElement.TryGetProperty("files", out JsonElement files) && files.ValueKind == JsonValueKind.Array
                ? [.. files.EnumerateArray().Select(f => f.GetString()).OfType<string>().Where(IsOurs)]
                : [];
        }
        catch (JsonException)
        {
            // not a document of ours: it is overwritten, and nothing else is removed on its word
            return [];
        }
    }

    private bool IsOurs(string file) =>
        !Path.IsPathRooted(file) && !file.Split('/', '\\').Contains("..") && File.Exists(Path.Combine(_folder, file));
}
