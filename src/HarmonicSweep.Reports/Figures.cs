using System.Globalization;

namespace HarmonicSweep.Reports;

/// <summary>Numbers as they stand on a picture.</summary>
internal static class Figures
{
    /// <summary>Three significant digits, without an exponent where a person would not use one: 0.0123, 12.4, 1240.</summary>
    public static string Short(double value)
    {
        double size = Math.Abs(value);
        if (size is 0)
        {
            return "0";
        }

        if (size is < 1e-3 or >= 1e6)
        {
            int exponent = (int)Math.Floor(Math.Log10(size));
            string digits = (value / Math.Pow(10, exponent)).ToString("0.##", CultureInfo.InvariantCulture);
            return $"{digits}·{Power(exponent)}";
        }

        int decimals = Math.Clamp(2 - (int)Math.Floor(Math.Log10(size)), 0, 5);
        return value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
    }

    /// <summary>A round number at a tick: 0.02, 5, 200; very small and large ones with a power of ten.</summary>
    public static string Tick(double value) => value is not 0 && Math.Abs(value) is < 1e-3 or >= 1e6
        ? Short(value)
        : value.ToString("0.####", CultureInfo.InvariantCulture);

    /// <summary>An order: whole as it is, else two decimals.</summary>
    public static string Order(double order) => order.ToString("0.##", CultureInfo.InvariantCulture);

    /// <summary>A computed order, always two decimals: it must not look like a whole one.</summary>
    public static string ComputedOrder(double order) => order.ToString("0.00", CultureInfo.InvariantCulture);

    /// <summary>A percentage, two decimals below 10.</summary>
    public static string Percent(double percent) =>
        percent.ToString(Math.Abs(percent) < 9.995 ? "0.00" : "0.0", CultureInfo.InvariantCulture);

    /// <summary>A limit as the standard prints it.</summary>
    public static string LimitPercent(double percent) => percent.ToString("0.###", CultureInfo.InvariantCulture);

    /// <summary>10 to a whole power, with a raised exponent.</summary>
    public static string Power(int exponent)
    {
        const string raised = "⁰¹²³⁴⁵⁶⁷⁸⁹";
        string digits = string.Concat(Math.Abs(exponent).ToString(CultureInfo.InvariantCulture).Select(c => raised[c - '0']));
        return exponent < 0 ? $"10⁻{digits}" : $"10{digits}";
    }
}
