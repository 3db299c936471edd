using System.Security.Cryptography;
using System.Text;
using HarmonicSweep.Cases.Reading;
using HarmonicSweep.Cases.Schema;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases;

/// <summary>What reading a case folder gave.</summary>
/// <param name="Case">The case; null when there is an error.</param>
/// <param name="Findings">Every finding, by file and line.</param>
public sealed record CaseReadResult(CaseFile? Case, IReadOnlyList<Finding> Findings);

/// <summary>Reads a case folder: every table, every rule, every complaint at once.</summary>
public sealed class CaseReader
{
    private const string CaseFileName = "case.toml";

    private readonly string _folder;
    private readonly FindingList _findings = new();
    private readonly List<AssumedValue> _assumed = [];
    private readonly List<SourceEntry> _sources = [];
    private readonly HashSet<string> _unread = new(StringComparer.Ordinal);
    private readonly SortedDictionary<string, byte[]> _files = new(StringComparer.Ordinal);

    private CaseReader(string folder) => _folder = folder;

    /// <summary>Reads a folder. Never throws for what stands in it.</summary>
    public static CaseReadResult Read(string folder)
    {
        var reader = new CaseReader(folder);
        CaseFile? found = reader.Read();
        IReadOnlyList<Finding> findings = reader._findings.Sorted();
        return new CaseReadResult(reader._findings.HasErrors ? null : found! with { Findings = findings }, findings);
    }

    private CaseFile? Read()
    {
        if (!Directory.Exists(_folder))
        {
            _findings.Error(
                Ids.NoFolder, null, $"there is no folder '{_folder}'.",
                File.Exists(_folder) ? "give the folder that holds case.toml, not a file." : "check the path, or make a case with: hsweep new FOLDER");
            return null;
        }

        try
        {
            LoadFiles();
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            _findings.Error(Ids.Unreadable, null, $"the folder '{_folder}' cannot be read: {exception.Message}", "mend its permissions.");
            return null;
        }

        CaseToml toml = ReadToml();
        var tables = new TableReader(_findings, _assumed, _sources);
        tables.Incomplete.UnionWith(_unread);
        List<Row> busRows = Rows(tables, Tables.Buses);
        var buses = new Dictionary<string, Bus>(StringComparer.Ordinal);
        foreach (Row row in busRows)
        {
            Plausibility.BusVoltage(row);
            buses[row.Name] = new Bus(row.Name, row.Number("nominal_kv"), row.Location, row.Has("note") ? row.Text("note") : null);
        }

        // a bus whose row has an error is still a bus: what ends at it is not to blame
        tables.BusNames.UnionWith(tables.Names.Keys);
        CheckBuses(tables, toml);
        Dictionary<string, Spectrum> spectra = SpectrumReader.Read(Rows(tables, Tables.Spectra), _assumed);
        List<PlantElement> elements = Elements(tables, buses, spectra, toml.FrequencyHz);
        Dictionary<string, PlantElement> byName = elements.ToDictionary(e => e.Name, StringComparer.Ordinal);
        List<OperatingState> states = StateReader.Read(Rows(tables, Tables.States), byName, tables);
        foreach (Table later in Tables.All.Where(t => t.Later))
        {
            RefuseLater(later);
        }

        PlantRules.Check(elements, buses, spectra, _findings);
        return _findings.HasErrors ? null : new CaseFile
        {
            Plant = new Plant(toml.Title, toml.FrequencyHz, buses.Values, elements),
            States = states,
            Settings = toml.Settings!,
            Assumed = _assumed,
            Sources = _sources,
            Findings = [],
            Folder = _folder,
            Hash = Hash(),
        };
    }

    private void LoadFiles()
    {
        string[] known = [CaseFileName, .. Tables.All.Select(t => t.File)];
        foreach (string path in Directory.EnumerateFileSystemEntries(_folder).Order(StringComparer.Ordinal))
        {
            string name = Path.GetFileName(path);
            if (known.Contains(name))
            {
                LoadFile(path, name);
            }
            else if (Directory.Exists(path))
            {
                continue;
            }
            else if (Path.GetExtension(name).ToLowerInvariant() is ".csv" or ".toml" && !name.StartsWith('.'))
            {
                _findings.Error(
                    Ids.UnknownFile, new SourceLocation(name, 0), $"unknown file {name}; known are {string.Join(", ", known)}.",
                    NearestName.Suggest(name, known, "move it out of the case folder."));
            }
        }
    }

    private void LoadFile(string path, string name)
    {
        try
        {
            if (!Directory.Exists(path))
            {
                _files[name] = File.ReadAllBytes(path);
                return;
            }

            _findings.Error(Ids.Unreadable, new SourceLocation(name, 0), $"{name} is a folder; expected a file.", "rename the folder, and write the table as a file.");
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            _findings.Error(
                Ids.Unreadable, new SourceLocation(name, 0), $"{name} cannot be read: {exception.Message}",
                "close the program that holds it, mend its permissions, or mend the link that leads nowhere.");
        }

        _unread.Add(name);
    }

    private CaseToml ReadToml()
    {
        if (_unread.Contains(CaseFileName))
        {
            return CaseToml.Nothing;
        }

        if (!_files.TryGetValue(CaseFileName, out byte[]? bytes))
        {
            _findings.Error(
                Ids.NoCaseFile, new SourceLocation(CaseFileName, 0), $"there is no case.toml in '{_folder}'; expected at least title and frequency_hz.",
                "write one, or start from the templates of: hsweep new FOLDER");
            return CaseToml.Nothing;
        }

        return TextFile.Decode(bytes, CaseFileName, _findings) is { } text ? CaseToml.Read(text, _findings, _assumed) : CaseToml.Nothing;
    }

    private List<Row> Rows(TableReader tables, Table table)
    {
        if (!_files.TryGetValue(table.File, out byte[]? bytes))
        {
            return [];
        }

        if (TextFile.Decode(bytes, table.File, _findings) is not { } text)
        {
            tables.Incomplete.Add(table.File);
            return [];
        }

        return tables.Read(table, CsvFile.Read(table.File, text, _findings));
    }

    private void CheckBuses(TableReader tables, CaseToml toml)
    {
        if (tables.BusNames.Count == 0)
        {
            // where rows of buses.csv were lost, that is what has to be mended
            if (!tables.Incomplete.Contains(Tables.Buses.File))
            {
                _findings.Error(Ids.NoBuses, new SourceLocation(Tables.Buses.File, 0), "the plant has no bus; expected at least one.", "list the buses in buses.csv: name and nominal_kv.");
            }

            return;
        }

        if (toml.PccBus is { } pcc && !tables.BusNames.Contains(pcc) && !tables.Incomplete.Contains(Tables.Buses.File))
        {
            _findings.Error(
                Ids.PccUnknown, toml.PccLocation, $"pcc '{pcc.Shown()}' is no bus; expected the name of a bus of buses.csv.", NearestName.Suggest(pcc, tables.BusNames, "name a bus of buses.csv."));
        }
    }

    private List<PlantElement> Elements(
        TableReader tables, Dictionary<string, Bus> buses, Dictionary<string, Spectrum> spectra, double frequencyHz)
    {
        var builder = new ElementBuilder(buses, spectra, tables, frequencyHz, _findings);
        var elements = new List<PlantElement>();
        foreach (Table table in Tables.All.Where(t => !t.Later && t != Tables.Buses && t != Tables.Spectra && t != Tables.States))
        {
            foreach (Row row in Rows(tables, table))
            {
                // a bus named in a row that could not be read has no voltage to build with; its own error says so
                if (row.BusNames.All(buses.ContainsKey) && builder.Build(table.File, row) is { } element)
                {
                    elements.Add(element);
                }
            }
        }

        return elements;
    }

    private void RefuseLater(Table table)
    {
        if (_files.TryGetValue(table.File, out byte[]? bytes) && TextFile.Decode(bytes, table.File, _findings) is { } text
            && CsvFile.Read(table.File, text, _findings) is { Records.Count: > 0 } csv)
        {
            _findings.Error(
                Ids.LaterModel, new SourceLocation(table.File, csv.Records[0].Line), $"{table.File}: the model of {table.Row} is not in this version.",
                "remove the rows; the results then hold without them.");
        }
    }

    private string Hash()
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach ((string name, byte[] bytes) in _files)
        {
            hash.AppendData(Encoding.UTF8.GetBytes(name + "\n"));
            hash.AppendData(bytes);
        }

        return Convert.ToHexStringLower(hash.GetHashAndReset());
    }
}
