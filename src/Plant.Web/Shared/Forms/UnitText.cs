using System.Globalization;
using System.Text.RegularExpressions;

namespace Plant.Web.Shared.Forms;

/// <summary>Reads what people type with a unit: "55 gal", "0.2 m3", "140 F". The bare number is in the field's own unit.</summary>
public static partial class UnitText
{
    private static readonly Dictionary<string, Dictionary<string, Func<double, double>>> Units = new(StringComparer.Ordinal)
    {
        ["L"] = new(StringComparer.OrdinalIgnoreCase)
        {
            ["l"] = v => v, ["litre"] = v => v, ["litres"] = v => v, ["ml"] = v => v / 1000, ["m3"] = v => v * 1000, ["m³"] = v => v * 1000,
            ["gal"] = v => v * 3.785411784, ["gallon"] = v => v * 3.785411784, ["gallons"] = v => v * 3.785411784,
        },
        ["°C"] = new(StringComparer.OrdinalIgnoreCase)
        {
            ["c"] = v => v, ["°c"] = v => v, ["f"] = v => (v - 32) / 1.8, ["°f"] = v => (v - 32) / 1.8, ["k"] = v => v - 273.15,
        },
        ["mm"] = new(StringComparer.OrdinalIgnoreCase)
        {
            ["mm"] = v => v, ["cm"] = v => v * 10, ["m"] = v => v * 1000, ["in"] = v => v * 25.4, ["\""] = v => v * 25.4, ["ft"] = v => v * 304.8,
        },
        ["L/min"] = new(StringComparer.OrdinalIgnoreCase)
        {
            ["l/min"] = v => v, ["lpm"] = v => v, ["m3/h"] = v => v * 1000 / 60, ["m³/h"] = v => v * 1000 / 60, ["gpm"] = v => v * 3.785411784,
        },
        ["ppm"] = new(StringComparer.OrdinalIgnoreCase) { ["ppm"] = v => v, ["mg/kg"] = v => v, ["%"] = v => v * 10_000 },
        ["%"] = new(StringComparer.OrdinalIgnoreCase) { ["%"] = v => v },
        [""] = new(StringComparer.OrdinalIgnoreCase),
    };

    /// <summary>Reads a text in a unit's field.</summary>
    /// <returns>True where it was understood; an empty text is "not known".</returns>
    public static bool TryRead(string? text, string unit, out double? value, out string? remedy)
    {
        value = null;
        remedy = null;
        if (string.IsNullOrWhiteSpace(text))
        {
            return true;
        }

        var match = Pattern().Match(text.Replace('−', '-').Replace("\u00a0", " ", StringComparison.Ordinal).Trim());
        if (!match.Success)
        {
            remedy = $"\"{text}\" is not understood: type a number{(unit.Length > 0 ? $" in {unit}, or with another unit such as {Example(unit)}" : "")}";
            return false;
        }

        var digits = match.Groups[1].Value;
        if (digits.Contains(',', StringComparison.Ordinal) && (digits.Contains('.', StringComparison.Ordinal) || Ambiguous().IsMatch(digits)))
        {
            remedy = $"\"{text}\" may mean two numbers: write it without a thousands separator";
            return false;
        }

        var number = double.Parse(digits.Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture);
        var given = match.Groups[2].Value;
        if (given.Length == 0)
        {
            value = number;
            return true;
        }

        if (!Units[unit].TryGetValue(given, out var convert))
        {
            remedy = $"{given} is no unit of this field: use {(Units[unit].Count > 0 ? string.Join(", ", Units[unit].Keys) : "a bare number")}";
            return false;
        }

        value = Math.Round(convert(number), 6);
        return true;
    }

    private static string Example(string unit) => unit switch { "L" => "55 gal or 0.2 m3", "°C" => "140 F", "mm" => "1.2 m", "L/min" => "20 gpm", _ => "0.02 %" };

    [GeneratedRegex(@"^([+-]?[\d.,]*\d(?:[eE][+-]?\d+)?)\s*(\S*)$")]
    private static partial Regex Pattern();

    [GeneratedRegex(@"^[+-]?\d{1,3}(,\d{3})+$")]
    private static partial Regex Ambiguous();
}
