using System.Globalization;

namespace Plant.Physics.Calculators;

/// <summary>Checks of request fields; each refusal names field, value and allowed range.</summary>
internal static class Input
{
    public static double Within(this List<Refusal> refusals, string field, double? value, double low, double high, string unit, bool openLow = false)
    {
        if (value is { } number && (openLow ? number > low : number >= low) && number <= high)
        {
            return number;
        }

        refusals.Add(new Refusal(field, value?.ToString("R", CultureInfo.InvariantCulture) ?? "",
            string.Create(CultureInfo.InvariantCulture, $"{(value is null ? "is missing: it " : "")}must {(openLow ? $"be above {low} and at most {high}" : $"lie between {low} and {high}")} {unit}").TrimEnd()));
        return double.NaN;
    }

    public static double? Optional(this List<Refusal> refusals, string field, double? value, double low, double high, string unit, bool openLow = false) =>
        value is null ? null : refusals.Within(field, value, low, high, unit, openLow);

    /// <summary>A temperature that liquid water and oils have [°C] → [K].</summary>
    public static double TemperatureK(this List<Refusal> refusals, string field, double? value) =>
        refusals.Within(field, value, -60, 250, "°C") + Constants.ZeroCelsiusK;

    /// <summary>Droplet diameters [µm].</summary>
    public static IReadOnlyList<double> DropletsUm(this List<Refusal> refusals, IReadOnlyList<double>? sizes)
    {
        if (sizes is null || sizes.Count is 0 or > 10_000)
        {
            refusals.Add(new Refusal("dropletUm", sizes is null ? "" : sizes.Count.ToString(CultureInfo.InvariantCulture) + " sizes", "must hold 1 to 10000 diameters in µm"));
            return [];
        }

        for (var i = 0; i < sizes.Count; i++)
        {
            refusals.Within(string.Create(CultureInfo.InvariantCulture, $"dropletUm[{i}]"), sizes[i], 0, 1e5, "µm", openLow: true);
        }

        return sizes;
    }
}
