using System.Globalization;
using Plant.Physics;

namespace Plant.Register.Storage;

/// <summary>Rules for single values. Each names the field, the value and the remedy.</summary>
public static class Rule
{
    public const double LowestTemperatureC = -60;
    public const double HighestTemperatureC = 250;
    public const double HighestPpm = 1e6;

    public static void Required(this List<Refusal> refusals, string field, string? value, int length = 80)
    {
        if (string.IsNullOrWhiteSpace(value))
        {
            refusals.Add(new Refusal(field, value ?? string.Empty, "may not be empty"));
        }
        else
        {
            refusals.Text(field, value, length);
        }
    }

    public static void Required<T>(this List<Refusal> refusals, string field, T? value)
        where T : struct
    {
        if (value is null)
        {
            refusals.Add(new Refusal(field, string.Empty, "may not be empty"));
        }
    }

    public static void Text(this List<Refusal> refusals, string field, string? value, int length = 80)
    {
        if (value is null)
        {
            return;
        }

        if (value.Length > length)
        {
            refusals.Add(new Refusal(field, value[..20] + "…", string.Create(CultureInfo.InvariantCulture, $"is {value.Length} characters long: at most {length}")));
        }

        if (value.Any(c => char.IsControl(c) && c is not ('\t' or '\r' or '\n')) || value.Any(char.IsSurrogate) && !WellFormed(value))
        {
            refusals.Add(new Refusal(field, value, "holds control characters: remove them"));
        }
    }

    public static void Range(this List<Refusal> refusals, string field, double? value, double low, double high, string unit)
    {
        if (value is { } number && !(number >= low && number <= high))
        {
            refusals.Add(new Refusal(field, number.ToString("R", CultureInfo.InvariantCulture),
                string.Create(CultureInfo.InvariantCulture, $"must lie between {low} and {high} {unit}").TrimEnd()));
        }
    }

    public static void Positive(this List<Refusal> refusals, string field, double? value, double high, string unit)
    {
        if (value is { } number && !(number > 0 && number <= high))
        {
            refusals.Add(new Refusal(field, number.ToString("R", CultureInfo.InvariantCulture),
                string.Create(CultureInfo.InvariantCulture, $"must be above 0 and at most {high} {unit}").TrimEnd()));
        }
    }

    public static void Temperature(this List<Refusal> refusals, string field, double? value) =>
        refusals.Range(field, value, LowestTemperatureC, HighestTemperatureC, "°C");

    public static void Ppm(this List<Refusal> refusals, string field, double? value) => refusals.Range(field, value, 0, HighestPpm, "mg/kg");

    public static void OneOf<T>(this List<Refusal> refusals, string field, string? value)
        where T : struct, Enum
    {
        if (value is not null && !Code.TryParse<T>(value, out _))
        {
            refusals.Add(new Refusal(field, value, $"must be one of {string.Join(", ", Code.All<T>())}"));
        }
    }

    public static void Time(this List<Refusal> refusals, string field, DateTimeOffset? value)
    {
        if (value is not { } time)
        {
            return;
        }

        if (time.Year is < 1950 or > 2200)
        {
            refusals.Add(new Refusal(field, time.ToString("O", CultureInfo.InvariantCulture), "must lie between the years 1950 and 2200"));
        }
        else if (time.Ticks % TimeSpan.TicksPerMillisecond != 0)
        {
            refusals.Add(new Refusal(field, time.ToString("O", CultureInfo.InvariantCulture), "is finer than a millisecond: give at most three decimals of a second"));
        }
    }

    /// <summary>Code as the enumeration's value; the text has been checked.</summary>
    public static T? Parse<T>(string? code)
        where T : struct, Enum => code is not null && Code.TryParse<T>(code, out var value) ? value : null;

    private static bool WellFormed(string text)
    {
        for (var i = 0; i < text.Length; i++)
        {
            if (char.IsHighSurrogate(text[i]) && i + 1 < text.Length && char.IsLowSurrogate(text[i + 1]))
            {
                i++;
            }
            else if (char.IsSurrogate(text[i]))
            {
                return false;
            }
        }

        return true;
    }
}
