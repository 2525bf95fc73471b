using System.Globalization;
using Plant.Advice;

namespace Plant.Web.Shared.Drawing;

/// <summary>Numbers and dates for people.</summary>
public static class Figures
{
    public static string Of(double? value) => value is { } number ? Significant.Of(number) : "–";

    /// <summary>The two ends of an interval, with the figures that it allows.</summary>
    public static string Range(double? low, double? high) => low is { } from && high is { } to
        ? Joined(Significant.Of(from, from, to))
        : "";

    /// <summary>An estimate with the figures that its interval allows.</summary>
    public static string Estimate(double? value, double? low, double? high) => value is { } number && low is { } from && high is { } to
        ? Significant.Of(number, from, to).Value
        : Of(value);

    public static string Day(DateTime? time) => time?.ToString("d MMM yyyy", CultureInfo.InvariantCulture) ?? "–";

    public static string ShortDay(DateTime time) => time.ToString("d MMM", CultureInfo.InvariantCulture);

    /// <summary>A value of a working: four figures, or fewer.</summary>
    public static string Step(double? value) => value is { } number ? number.ToString("G4", CultureInfo.InvariantCulture) : "";

    private static string Joined((string Value, string Low, string High) text) => $"{text.Low}–{text.High}";
}
