using System.Globalization;
using static System.FormattableString;

namespace HarmonicSweep.Cases.Reading;

/// <summary>
/// What a name may hold. Names stand in tables, plots and file names, and are told apart by eye, so a character that cannot be
/// seen, or that looks like another, has no place in them.
/// </summary>
internal static class Label
{
    /// <summary>Most characters of a name.</summary>
    public const int Longest = 100;

    /// <summary>Legal names in one clause, for messages.</summary>
    public const string Expected = "a name of at most 100 visible characters and plain blanks";

    /// <summary>What is wrong with a name; null when nothing is.</summary>
    public static string? Fault(string name)
    {
        if (name.Length > Longest)
        {
            return Invariant($"has {name.Length} characters");
        }

        for (int i = 0; i < name.Length; i++)
        {
            char c = name[i];
            bool pair = char.IsSurrogatePair(name, i);
            UnicodeCategory category = CharUnicodeInfo.GetUnicodeCategory(name, i);
            string? fault = category switch
            {
                _ when c is '\n' or '\r' => "has a line break in it",
                UnicodeCategory.Control or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator => "has a control character in it",
                UnicodeCategory.Format => "has an invisible character in it",
                UnicodeCategory.SpaceSeparator when c != ' ' => "has a blank of another kind in it",
                UnicodeCategory.Surrogate => "has a damaged character in it",
                _ when c == '\uFFFD' => "has a damaged character in it",
                _ when c is >= '\u0300' and <= '\u036F' => "has an accent stored apart from its letter",
                _ => null,
            };
            if (fault is not null)
            {
                return c < ' ' ? fault : Invariant($"{fault} (U+{(int)c:X4})");
            }

            i += pair ? 1 : 0;
        }

        return null;
    }

    /// <summary>A cell as it stands in a message: shortened.</summary>
    public static string Shown(this string cell) => cell.Length <= 60 ? cell : cell[..40] + "...";
}
