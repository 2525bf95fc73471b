using System.Globalization;

namespace Plant.Advice;

/// <summary>Writes numbers with as many figures as they carry.</summary>
public static class Significant
{
    private const int MostDecimals = 2;

    // one figure of the uncertainty is enough from here on: 3.5 of its leading decade
    private const double OneFigureFrom = 3.5;

    /// <summary>An estimate and its interval, rounded to the figures that the interval allows.</summary>
    /// <param name="value">The estimate.</param>
    /// <param name="low">Lower end of its interval.</param>
    /// <param name="high">Upper end of its interval.</param>
    /// <returns>The three as text, invariant.</returns>
    public static (string Value, string Low, string High) Of(double value, double low, double high)
    {
        var half = (high - low) / 2;
        if (!(half > 0))
        {
            return (Of(value), Of(low), Of(high));
        }

        var decade = (int)Math.Floor(Math.Log10(half));
        var decimals = (half / Math.Pow(10, decade) < OneFigureFrom ? 1 : 0) - decade;
        return (Rounded(value, decimals), Rounded(low, decimals), Rounded(high, decimals));
    }

    /// <summary>A number without an interval: two or three figures.</summary>
    /// <param name="value">The number.</param>
    /// <returns>It as text, invariant.</returns>
    public static string Of(double value) => Math.Abs(value) switch
    {
        < 0.005 => "0",
        < 0.095 => value.ToString("0.00", CultureInfo.InvariantCulture),
        < 9.95 => value.ToString("0.0", CultureInfo.InvariantCulture),
        < 995 => value.ToString("0", CultureInfo.InvariantCulture),
        _ => (Math.Round(value / 10) * 10).ToString("#,0", CultureInfo.InvariantCulture),
    };

    private static string Rounded(double value, int decimals)
    {
        decimals = Math.Min(decimals, MostDecimals);
        var unit = Math.Pow(10, -decimals);
        var rounded = Math.Round(value / unit, MidpointRounding.AwayFromZero) * unit;
        return rounded == 0 ? "0" : rounded.ToString(decimals > 0 ? "#,0." + new string('0', decimals) : "#,0", CultureInfo.InvariantCulture);
    }
}
