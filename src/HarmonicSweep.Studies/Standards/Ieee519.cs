namespace HarmonicSweep.Studies.Standards;

/// <summary>
/// Limits of IEEE 519, edition 2022, at the point of common coupling, as data.
/// </summary>
/// <remarks>
/// Sources: voltage limits and Table 2 from printed secondary reprints (the rows of 1992 kept by 2014 and 2022); Tables 3 and
/// 4 and the start of the first band at order 2 from memory; the even-order rule of 2022 from a printed comparison of the
/// editions. Verify against the standard before a contractual use.
/// </remarks>
public static class Ieee519
{
    /// <summary>Name and edition shown beside every verdict.</summary>
    public const string Edition = "IEEE 519-2022";

    /// <summary>Token of the limit set in case.toml, punctuation left out.</summary>
    public const string Token = "ieee519-2022";

    private static readonly VoltageRow[] _voltage =
    [
        new("V <= 1.0 kV", 1.0, 5.0, 8.0),
        new("1 kV < V <= 69 kV", 69, 3.0, 5.0),
        new("69 kV < V <= 161 kV", 161, 1.5, 2.5),
        new("161 kV < V", double.PositiveInfinity, 1.0, 1.5),
    ];

    private static readonly CurrentTable[] _current =
    [
        new("Table 2", 69,
        [
            new("I_SC/I_L < 20", 20, [4.0, 2.0, 1.5, 0.6, 0.3], 5.0),
            new("20 <= I_SC/I_L < 50", 50, [7.0, 3.5, 2.5, 1.0, 0.5], 8.0),
            new("50 <= I_SC/I_L < 100", 100, [10.0, 4.5, 4.0, 1.5, 0.7], 12.0),
            new("100 <= I_SC/I_L < 1000", 1000, [12.0, 5.5, 5.0, 2.0, 1.0], 15.0),
            new("1000 <= I_SC/I_L", double.PositiveInfinity, [15.0, 7.0, 6.0, 2.5, 1.4], 20.0),
        ]),
        new("Table 3", 161,
        [
            new("I_SC/I_L < 20", 20, [2.0, 1.0, 0.75, 0.3, 0.15], 2.5),
            new("20 <= I_SC/I_L < 50", 50, [3.5, 1.75, 1.25, 0.5, 0.25], 4.0),
            new("50 <= I_SC/I_L < 100", 100, [5.0, 2.25, 2.0, 0.75, 0.35], 6.0),
            new("100 <= I_SC/I_L < 1000", 1000, [6.0, 2.75, 2.5, 1.0, 0.5], 7.5),
            new("1000 <= I_SC/I_L", double.PositiveInfinity, [7.5, 3.5, 3.0, 1.25, 0.7], 10.0),
        ]),
        new("Table 4", double.PositiveInfinity,
        [
            new("I_SC/I_L < 25", 25, [1.0, 0.5, 0.38, 0.15, 0.1], 1.5),
            new("25 <= I_SC/I_L < 50", 50, [2.0, 1.0, 0.75, 0.3, 0.15], 2.5),
            new("50 <= I_SC/I_L", double.PositiveInfinity, [3.0, 1.5, 1.15, 0.45, 0.22], 3.75),
        ]),
    ];

    /// <summary>Row of Table 1 for a nominal voltage, kV; a voltage on a boundary belongs to the lower class.</summary>
    public static VoltageRow VoltageLimits(double nominalKv) => _voltage.First(r => nominalKv <= r.UpToKv);

    /// <summary>Current table for a nominal voltage, kV.</summary>
    public static CurrentTable CurrentTableFor(double nominalKv) => _current.First(t => nominalKv <= t.UpToKv);
}

/// <summary>A voltage class of Table 1.</summary>
/// <param name="Class">Class as printed.</param>
/// <param name="UpToKv">Upper bound, kV, included.</param>
/// <param name="IndividualPercent">Limit of each order, percent of nominal.</param>
/// <param name="ThdPercent">Limit of THD, percent of nominal.</param>
public sealed record VoltageRow(string Class, double UpToKv, double IndividualPercent, double ThdPercent);

/// <summary>A current table: rows by I_SC/I_L.</summary>
/// <param name="Name">Table of the standard.</param>
/// <param name="UpToKv">Upper bound of its voltage class, kV, included.</param>
/// <param name="Rows">Rows, ascending in ratio.</param>
public sealed record CurrentTable(string Name, double UpToKv, IReadOnlyList<CurrentRow> Rows)
{
    /// <summary>Row of a ratio; a ratio on a boundary takes the upper row.</summary>
    public CurrentRow RowFor(double ratio) => Rows.First(r => ratio < r.Below || double.IsPositiveInfinity(r.Below));
}

/// <summary>A row of a current table, percent of I_L.</summary>
/// <param name="Label">Row as printed.</param>
/// <param name="Below">Upper bound of the ratio, excluded.</param>
/// <param name="BandPercent">Limits of the bands below 11, 17, 23, 35 and up to 50.</param>
/// <param name="TddPercent">Limit of TDD.</param>
public sealed record CurrentRow(string Label, double Below, IReadOnlyList<double> BandPercent, double TddPercent)
{
    /// <summary>
    /// Limit of an integer order from 2 to 50: the band of the order; an even order up to 6 half of it, above 6 the whole
    /// (2022; the 2014 edition allowed a quarter to all even orders).
    /// </summary>
    public double LimitPercent(int order)
    {
        int band = order < 11 ? 0 : order < 17 ? 1 : order < 23 ? 2 : order < 35 ? 3 : 4;
        return BandPercent[band] * (order % 2 == 0 && order <= 6 ? 0.5 : 1);
    }
}
