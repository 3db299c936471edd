using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Makes elements of checked rows: fills defaults in, holds the rules between cells, and doubts what looks wrong.</summary>
internal sealed partial class ElementBuilder(
    IReadOnlyDictionary<string, Bus> buses, IReadOnlyDictionary<string, Spectrum> spectra, TableReader tables, double fundamentalHz, FindingList findings)
{
    private const string NominalKv = "nominal_kv of its bus";

    /// <summary>Builds one element; null after an error.</summary>
    public PlantElement? Build(string file, Row row)
    {
        int errors = findings.ErrorCount;
        PlantElement? element = file switch
        {
            "couplers.csv" => Coupler(row),
            "supplies.csv" => Supply(row),
            "generators.csv" => Generator(row),
            "transformers.csv" => Transformer(row),
            "cables.csv" => Line(row, isCable: true),
            "lines.csv" => Line(row, isCable: false),
            "reactors.csv" => Reactor(row),
            "loads.csv" => Load(row),
            "motors.csv" => Motor(row),
            "capacitors.csv" => Bank(row),
            "filters.csv" => Filter(row),
            "converters.csv" => Converter(row),
            _ => throw new ArgumentOutOfRangeException(nameof(file), file, "No element is made of the rows of this table."),
        };
        return findings.ErrorCount == errors ? element : null;
    }

    private double NominalOf(Row row, string column = "bus") => buses[row.Text(column)].NominalKv;

    /// <summary>Rated voltage of an element, default nominal; a rating far from nominal is doubted.</summary>
    private double RatedKv(Row row, string column = "rated_kv", string bus = "bus")
    {
        double nominal = NominalOf(row, bus);
        double rated = row.Number(column, nominal, NominalKv);
        Plausibility.RatedAgainstNominal(row, column, rated, nominal);
        return rated;
    }

    private bool TwoBuses(Row row, string first = "end_a", string second = "end_b")
    {
        if (row.Text(first) != row.Text(second))
        {
            return true;
        }

        row.Error(Ids.SameBus, second, $"{row.Name}: both ends are at {row.Text(first)}; expected two buses.", "name the bus of the other end.");
        return false;
    }

    private static Connection ConnectionOf(Row row) => row.Text("connection").ToLowerInvariant() switch
    {
        "wye" => Connection.Wye,
        "wye_grounded" => Connection.WyeGrounded,
        _ => Connection.Delta,
    };
}
