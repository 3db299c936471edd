using System.Text.Encodings.Web;
using System.Text.Json;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>Writes a study result as one JSON document, a contract that other programs read.</summary>
public static class ResultJson
{
    /// <summary>Name under which the program signs its documents.</summary>
    public const string ToolName = "hsweep";

    private static readonly JsonWriterOptions Options = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes the whole result of a command.</summary>
    /// <param name="stream">Receives UTF-8 without byte order mark; not closed.</param>
    /// <param name="caseFile">The case it was computed from.</param>
    /// <param name="result">What was computed.</param>
    /// <param name="version">Version of the program.</param>
    /// <exception cref="IOException">The stream cannot be written.</exception>
    public static void Write(Stream stream, CaseFile caseFile, StudyResult result, string version) =>
        Write(stream, caseFile, result, version, static () => []);

    /// <summary>Writes the whole result of a command, with the names of the files written beside it.</summary>
    /// <param name="stream">Receives UTF-8 without byte order mark; not closed.</param>
    /// <param name="caseFile">The case it was computed from.</param>
    /// <param name="result">What was computed.</param>
    /// <param name="version">Version of the program.</param>
    /// <param name="files">Gives the files beside the document, paths relative to it; asked last, so they may still be written meanwhile.</param>
    /// <exception cref="IOException">The stream cannot be written.</exception>
    public static void Write(
        Stream stream, CaseFile caseFile, StudyResult result, string version, Func<IReadOnlyList<string>> files)
    {
        using var json = new Utf8JsonWriter(stream, Options);
        json.WriteStartObject();
        WriteTool(json, version);
        json.WriteStartObject("case");
        json.WriteString("title", caseFile.Plant.Title);
        json.WriteString("folder", caseFile.Folder);
        json.WriteString("hash", caseFile.Hash);
        json.Number("frequency_hz", caseFile.Plant.FrequencyHz);
        json.WriteString("pcc", caseFile.Settings.PccBus);
        json.WriteString("rule", caseFile.Settings.Rule.Word());
        json.Words("standards", caseFile.Settings.Standards);
        json.WriteEndObject();
        json.WriteBoolean("limit_exceeded", result.LimitExceeded);
        json.Objects("states", result.States, JsonState.Write);
        if (result.Screen is { } screen)
        {
            JsonScreen.Write(json, screen);
        }

        WriteFindings(json, [.. caseFile.Findings, .. result.Findings]);
        json.Objects("assumed", caseFile.Assumed, static (j, a) =>
        {
            j.WriteString("element", a.Element);
            j.WriteString("column", a.Column);
            j.WriteString("value", a.Value);
            j.WriteString("why", a.Why);
        });
        json.Objects("sources", caseFile.Sources, static (j, s) =>
        {
            j.WriteString("element", s.Element);
            j.WriteString("source", s.Source);
            WriteLocation(j, s.Location);
        });
        json.Words("files", files());
        json.WriteEndObject();
    }

    /// <summary>Writes the document of a case that was not computed: no states, the findings that say why.</summary>
    /// <param name="stream">Receives UTF-8 without byte order mark; not closed.</param>
    /// <param name="folder">Case folder as given.</param>
    /// <param name="findings">What is wrong.</param>
    /// <param name="version">Version of the program.</param>
    /// <exception cref="IOException">The stream cannot be written.</exception>
    public static void WriteRefusal(Stream stream, string folder, IReadOnlyList<Finding> findings, string version)
    {
        using var json = new Utf8JsonWriter(stream, Options);
        json.WriteStartObject();
        WriteTool(json, version);
        json.WriteStartObject("case");
        json.WriteNull("title");
        json.WriteString("folder", folder);
        json.WriteNull("hash");
        json.WriteEndObject();
        json.Words("states", []);
        WriteFindings(json, findings);
        json.Words("assumed", []);
        json.WriteEndObject();
    }

    private static void WriteTool(Utf8JsonWriter json, string version)
    {
        json.WriteStartObject("tool");
        json.WriteString("name", ToolName);
        json.WriteString("version", version);
        json.WriteEndObject();
    }

    private static void WriteFindings(Utf8JsonWriter json, IReadOnlyList<Finding> findings) =>
        json.Objects("findings", findings, static (j, f) =>
        {
            j.WriteString("severity", f.Severity.Word());
            j.WriteString("id", f.Id);
            WriteLocation(j, f.Location);
            j.WriteString("message", f.Message);
            j.WriteString("remedy", f.Remedy);
        });

    /// <summary>A line of 0 means the whole file, which the contract writes as null.</summary>
    private static void WriteLocation(Utf8JsonWriter json, SourceLocation? location)
    {
        json.WriteString("file", location?.File);
        json.Number("line", location is { Line: > 0 } ? location.Line : null);
        json.WriteString("column", location?.Column);
    }
}
