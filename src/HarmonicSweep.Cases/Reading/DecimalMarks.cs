using System.Globalization;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>
/// Numbers of one table. Where the separator leaves the comma free, a decimal comma is read; a table that uses both marks
/// is refused, since 1.234 would then be a guess.
/// </summary>
internal sealed class DecimalMarks(string file, bool commas, FindingList findings)
{
    private SourceLocation? _point;
    private SourceLocation? _comma;
    private string _pointCell = "";
    private string _commaCell = "";
    private bool _mixed;

    /// <summary>The number, finite; null when it is none; <paramref name="complained"/> when the finding about it was given here.</summary>
    public double? Parse(string cell, SourceLocation location, string called, out bool complained)
    {
        complained = false;
        bool comma = cell.Contains(',');
        bool point = cell.Contains('.');
        if (comma && (point || !commas || cell.IndexOf(',') != cell.LastIndexOf(',')))
        {
            complained = true;
            findings.Error(
                Ids.DecimalMarks, location,
                $"{called}{location.Column} is '{cell.Shown()}', with a comma {(point ? "and a point" : commas ? "more than once" : "in a table whose columns are separated by commas")}; expected digits with one decimal mark.",
                "leave out thousands separators and write decimals with a point.");
            return null;
        }

        if (comma)
        {
            (_comma, _commaCell) = (_comma ?? location, _comma is null ? cell : _commaCell);
        }
        else if (point)
        {
            (_point, _pointCell) = (_point ?? location, _point is null ? cell : _pointCell);
        }

        if (_comma is not null && _point is not null && !_mixed)
        {
            _mixed = true;
            complained = true;
            findings.Error(
                Ids.DecimalMarks, location,
                $"{file} writes decimals both ways: '{_commaCell.Shown()}' at {_comma} and '{_pointCell.Shown()}' at {_point}; expected one way in a table.",
                "write every decimal with a point, or every one with a comma.");
            return null;
        }

        return double.TryParse(comma ? cell.Replace(',', '.') : cell, NumberStyles.Float, CultureInfo.InvariantCulture, out double value)
            && double.IsFinite(value)
            ? value
            : null;
    }
}
