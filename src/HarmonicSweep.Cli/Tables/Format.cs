using System.Globalization;

namespace HarmonicSweep.Cli;

/// <summary>Numbers for a person: fixed significant digits, decimal point, a dash where there is none.</summary>
internal static class Format
{
    /// <summary>Stands where a value is missing, open or not judged.</summary>
    public const string Missing = "-";

    /// <summary>Four significant digits; powers of ten only where plain digits would mislead.</summary>
    public static string Number(double? value, int digits = 4)
    {
        if (value is not { } number || !double.IsFinite(number))
        {
            return Missing;
        }

        if (number == 0)
        {
            return "0";
        }

        double size = Math.Abs(number);
        if (size is < 1e-3 or >= 1e7)
        {
            return number.ToString("0." + new string('0', digits - 1) + "E+0", CultureInfo.InvariantCulture);
        }

        int decimals = Math.Max(0, digits - 1 - (int)Math.Floor(Math.Log10(size)));
        return number.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
    }

    /// <summary>Four significant digits, but never more than four decimals: less of a percent matters to nobody.</summary>
    public static string Percent(double? value) => value is { } number and not 0 && Math.Abs(number) < 1
        ? number.ToString("F4", CultureInfo.InvariantCulture)
        : Number(value);

    /// <summary>An order that was given or injected: exactly as it is, shortest form.</summary>
    public static string GivenOrder(double? order) => order?.ToString("R", CultureInfo.InvariantCulture) ?? Missing;

    /// <summary>An order that was given or injected: exactly as it is, shortest form.</summary>
    public static string GivenOrderOf(double order) => GivenOrder(order);

    /// <summary>A whole number.</summary>
    public static string Count(int value) => value.ToString(CultureInfo.InvariantCulture);

    /// <summary>A number of things: <c>1 value</c>, <c>3 values</c>.</summary>
    public static string Count(int value, string thing) => $"{Count(value)} {thing}{(value == 1 ? "" : "s")}";

    /// <summary>The first few of a list, and how many more there are.</summary>
    public static string Some(IReadOnlyCollection<string> items, int most) => items.Count <= most
        ? string.Join(", ", items)
        : $"{string.Join(", ", items.Take(most))} and {Count(items.Count - most)} more";
}
