using System.Globalization;

namespace Plant.Web.Shared.Drawing;

/// <summary>Numbers for people: as many figures as the estimate carries.</summary>
public static class Figures
{
    public static string Of(double? value) => value switch
    {
        null => "–",
        { } v when Math.Abs(v) < 0.095 => v.ToString("0.00", CultureInfo.InvariantCulture),
        { } v when Math.Abs(v) < 9.95 => v.ToString("0.0", CultureInfo.InvariantCulture),
        { } v when Math.Abs(v) < 995 => v.ToString("0", CultureInfo.InvariantCulture),
        { } v => (Math.Round(v / 10) * 10).ToString("#,0", CultureInfo.InvariantCulture),
    };

    public static string Range(double? low, double? high) => low is null || high is null ? "" : $"{Of(low)}–{Of(high)}";

    public static string Day(DateTime? time) => time?.ToString("d MMM yyyy", CultureInfo.InvariantCulture) ?? "–";

    public static string ShortDay(DateTime time) => time.ToString("d MMM", CultureInfo.InvariantCulture);

    /// <summary>A value of a working: four figures, or fewer.</summary>
    public static string Step(double? value) => value is { } number ? number.ToString("G4", CultureInfo.InvariantCulture) : "";
}
