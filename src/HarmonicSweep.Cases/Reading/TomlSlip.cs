namespace HarmonicSweep.Cases.Reading;

/// <summary>Says in plain words what is wrong with a line of case.toml, by looking at the line as a person would.</summary>
internal static class TomlSlip
{
    /// <summary>Message and remedy for a line that is not TOML.</summary>
    public static (string Message, string Remedy) Explain(string line)
    {
        string text = line.Trim();
        int equals = text.IndexOf('=');
        if (text.IndexOfAny(['\u201C', '\u201D', '\u201E', '\u2018', '\u2019', '\u00AB', '\u00BB']) >= 0)
        {
            return ("a typographic quotation mark stands here; expected straight quotes.", "write texts in straight double quotes: title = \"Plant\".");
        }

        if (text.StartsWith('[') && equals < 0)
        {
            return ($"'{text.Shown()}' is no table header; expected a name in one pair of brackets.", "write [sweep], [limits] or [summation] on a line of its own.");
        }

        if (equals < 0)
        {
            return ($"'{text.Shown()}' is neither key = value, nor a [table], nor a comment.", "write = between key and value; begin a comment with #.");
        }

        string key = text[..equals].Trim();
        return key.Length == 0 || key.Any(c => !char.IsAsciiLetterOrDigit(c) && c is not ('_' or '-' or '.' or '"'))
            ? ($"'{key.Shown()}' is no key; expected one word of letters, digits and _ before the =.", "write key = value on a line of its own.")
            : Value(key, text[(equals + 1)..].Trim());
    }

    private static (string Message, string Remedy) Value(string key, string value)
    {
        string example = $"write the text in double quotes: {key} = \"...\".";
        return value switch
        {
            "" => ($"{key} has no value.", "write a value after the =, or put # before the key to leave it out."),
            ['"' or '\'', ..] when value.Contains('\\') => ($"{key}: a backslash stands in a text in double quotes, where it has a meaning of its own.", "double it, or write the text in single quotes."),
            ['"' or '\'', ..] => ($"{key}: the text {value.Shown()} is not closed by its quotation mark, or more follows it.", example),
            ['[', ..] => ($"{key}: the list {value.Shown()} is not closed, or a comma between its items is missing.", $"write {key} = [\"...\", \"...\"]."),
            _ when value.Count('=') > 0 => ($"{key}: a second = stands on the line.", "write one key = value on a line."),
            _ when !(char.IsAsciiDigit(value[0]) || value[0] is '+' or '-' or '.') => ($"{key}: '{value.Shown()}' is neither a number nor a text in quotes.", example),
            _ when value.Contains(',') => ($"{key} is {value.Shown()}, with a comma; expected digits with a decimal point.", "write decimals with a point, and no thousands separators."),
            ['0', >= '0' and <= '9', ..] => ($"{key} is {value.Shown()}; expected a number without leading zeros.", "remove the zeros."),
            ['.', ..] or [.., '.'] => ($"{key} is {value.Shown()}; expected digits on both sides of the decimal point.", "write for example 0.5 or 50."),
            _ => ($"{key} is '{value.Shown()}'; expected a number alone.", "write digits with a decimal point, without a unit; begin a comment with #."),
        };
    }
}
