using System.Numerics;
using System.Text.Json;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Cases.Results;

/// <summary>Values as the JSON contract writes them: shortest round-trip numbers, never a non-finite one.</summary>
internal static class JsonValues
{
    /// <summary>Writes a number; null where it is missing or not finite.</summary>
    public static void Value(this Utf8JsonWriter json, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            json.WriteNumberValue(number);
        }
        else
        {
            json.WriteNullValue();
        }
    }

    /// <summary>Writes a named number; null where it is missing or not finite.</summary>
    public static void Number(this Utf8JsonWriter json, string name, double? value)
    {
        json.WritePropertyName(name);
        json.Value(value);
    }

    /// <summary>Writes a complex value as <c>[re, im]</c>; null where it is missing or not finite.</summary>
    public static void Value(this Utf8JsonWriter json, Complex? value)
    {
        if (value is { } number && Complex.IsFinite(number))
        {
            json.WriteStartArray();
            json.WriteNumberValue(number.Real);
            json.WriteNumberValue(number.Imaginary);
            json.WriteEndArray();
        }
        else
        {
            json.WriteNullValue();
        }
    }

    /// <summary>Writes a named complex value.</summary>
    public static void Phasor(this Utf8JsonWriter json, string name, Complex value)
    {
        json.WritePropertyName(name);
        json.Value(value);
    }

    /// <summary>Writes a value under each summation rule as an object keyed by rule.</summary>
    public static void ByRule(this Utf8JsonWriter json, string name, RuleValues values)
    {
        json.WriteStartObject(name);
        foreach (SummationRule rule in ResultWords.Rules)
        {
            json.Number(rule.Word(), values[rule]);
        }

        json.WriteEndObject();
    }

    /// <summary>Writes a named list of numbers.</summary>
    public static void Numbers(this Utf8JsonWriter json, string name, IEnumerable<double> values) =>
        json.List(name, values, static (j, v) => j.Value(v));

    /// <summary>Writes a named list of words.</summary>
    public static void Words(this Utf8JsonWriter json, string name, IEnumerable<string> values) =>
        json.List(name, values, static (j, v) => j.WriteStringValue(v));

    /// <summary>Writes a named list, each item by <paramref name="write"/>.</summary>
    public static void List<T>(this Utf8JsonWriter json, string name, IEnumerable<T> items, Action<Utf8JsonWriter, T> write)
    {
        json.WriteStartArray(name);
        foreach (T item in items)
        {
            write(json, item);
        }

        json.WriteEndArray();
    }

    /// <summary>Writes a named list of objects, the properties of each by <paramref name="write"/>.</summary>
    public static void Objects<T>(this Utf8JsonWriter json, string name, IEnumerable<T> items, Action<Utf8JsonWriter, T> write) =>
        json.List(name, items, (j, item) =>
        {
            j.WriteStartObject();
            write(j, item);
            j.WriteEndObject();
        });
}
