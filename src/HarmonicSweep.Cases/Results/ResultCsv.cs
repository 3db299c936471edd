using System.Numerics;
using HarmonicSweep.Network;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>A study result as CSV tables, one a part; heads in lower_snake_case carry the unit.</summary>
public static class ResultCsv
{
    /// <summary>Every part that has a row, in the order in which a reader wants them.</summary>
    public static IReadOnlyList<CsvTable> Tables(CaseFile caseFile, StudyResult result)
    {
        CsvTable[] all =
        [
            .. CsvStates.Tables(result.States, caseFile.Plant.FrequencyHz),
            .. result.Screen is { } screen ? CsvScreen.Tables(screen) : [],
            FindingTable([.. caseFile.Findings, .. result.Findings]),
            new CsvTable<AssumedValue>(
                "assumed", "Defaults that were used", caseFile.Assumed,
                new("element", x => x.Element), new("column", x => x.Column), new("value", x => x.Value), new("why", x => x.Why)),
            new CsvTable<SourceEntry>(
                "sources", "Where the input data come from", caseFile.Sources,
                new("element", x => x.Element), new("source", x => x.Source), new("file", x => x.Location.File), new("line", x => x.Location.Line)),
        ];
        return [.. all.Where(t => !t.IsEmpty)];
    }

    private static CsvTable<Finding> FindingTable(IReadOnlyList<Finding> findings) => new(
        "findings", "Warnings and notes", findings,
        new("severity", x => x.Severity.Word()),
        new("id", x => x.Id),
        new("file", x => x.Location?.File),
        new("line", x => x.Location is { Line: > 0 } at ? at.Line : default(CsvField)),
        new("column", x => x.Location?.Column),
        new("message", x => x.Message),
        new("remedy", x => x.Remedy));
}

/// <summary>Parts of complex values in tables.</summary>
public static class CsvComplex
{
    /// <summary>Angle in degrees.</summary>
    public static double Degrees(this Complex value) => value.Phase * 180 / Math.PI;
}
