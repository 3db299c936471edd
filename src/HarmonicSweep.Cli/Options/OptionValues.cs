using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;

namespace HarmonicSweep.Cli;

/// <summary>Options whose values are read with a decimal point, whatever the machine's culture, and checked on the spot.</summary>
internal static class OptionValues
{
    /// <summary>A number that meets a condition.</summary>
    public static Option<double?> Number(string name, string unit, string description, Func<double, bool> valid, string expected) => new(name)
    {
        HelpName = unit,
        Description = description,
        CustomParser = result =>
        {
            string text = result.Tokens[^1].Value;
            if (TryRead(text, out double value) && valid(value))
            {
                return value;
            }

            result.AddError($"{name} got '{text}'; expected {expected}, with a decimal point.");
            return null;
        },
    };

    /// <summary>A whole number of 1 or more.</summary>
    public static Option<int?> Count(string name, string description) => new(name)
    {
        HelpName = "n",
        Description = description,
        CustomParser = result =>
        {
            string text = result.Tokens[^1].Value;
            if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int value) && value >= 1)
            {
                return value;
            }

            result.AddError($"{name} got '{text}'; expected a whole number of 1 or more.");
            return null;
        },
    };

    /// <summary>Orders separated by commas, kept exactly as given.</summary>
    public static Option<double[]?> Orders(string name, string description) => new(name)
    {
        HelpName = "h,h,...",
        Description = description,
        CustomParser = result =>
        {
            var orders = new List<double>();
            foreach (string text in result.Tokens.SelectMany(t => t.Value.Split(',')))
            {
                if (TryRead(text, out double order) && order > 0)
                {
                    orders.Add(order);
                }
                else
                {
                    result.AddError($"{name} got '{text}'; expected orders above 0 separated by commas, for example 5,7,11.3.");
                }
            }

            return [.. orders];
        },
    };

    /// <summary>One of a few words.</summary>
    public static Option<T?> Word<T>(string name, string description, params (string Word, T Value)[] words)
        where T : struct
    {
        var option = new Option<T?>(name)
        {
            HelpName = string.Join('|', words.Select(w => w.Word)),
            Description = description,
            CustomParser = result =>
            {
                string text = result.Tokens[^1].Value;
                foreach ((string word, T value) in words)
                {
                    if (string.Equals(word, text, StringComparison.OrdinalIgnoreCase))
                    {
                        return value;
                    }
                }

                string[] known = [.. words.Select(w => w.Word)];
                result.AddError($"{name} got '{text}'; expected {string.Join(", ", known)}.{NearestWord.Hint(text, known)}");
                return null;
            },
        };
        option.CompletionSources.Add([.. words.Select(w => w.Word)]);
        return option;
    }

    private static bool TryRead(string text, out double value) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value);
}
