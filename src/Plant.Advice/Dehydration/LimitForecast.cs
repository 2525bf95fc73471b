using Plant.Advice.Ledger;

namespace Plant.Advice.Dehydration;

/// <summary>Circulating water against its limit.</summary>
public static class LimitForecast
{
    /// <summary>Chance at which a limit counts as passed [0 to 1].</summary>
    public const double Chance = 0.05;

    private const int HorizonDays = 365;
    private const double WidestShare = 0.35;

    // a trend is followed for so long and then taken to have met its balance with the headspace [days]
    private const double TrendDays = 120;

    /// <summary>Mean content some days from now.</summary>
    /// <param name="water">Water in the oil now.</param>
    /// <param name="days">Days from now [days].</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg], or null.</param>
    /// <returns>Mean [mg/kg] and standard deviation [mg/kg].</returns>
    public static (double MeanPpm, double SdPpm) At(OilWater water, double days, double? ceilingPpm)
    {
        ArgumentNullException.ThrowIfNull(water);
        var reach = TrendDays * (1 - Math.Exp(-days / TrendDays));
        var mean = water.WaterPpm + (water.SlopePpmPerDay * reach);
        if (ceilingPpm is { } ceiling)
        {
            mean = Math.Min(mean, Math.Max(ceiling, water.WaterPpm));
        }

        mean = Math.Max(mean, Math.Max(1, 0.2 * water.WaterPpm));
        var variance = (water.SdPpm * water.SdPpm) + Math.Pow(water.SlopeSdPpmPerDay * reach, 2) + (water.WanderPpm2PerDay * Math.Min(days, 180));
        // circulating oil neither loses all of its water nor holds much more than it can: the spread is bounded
        return (mean, Math.Min(Math.Sqrt(variance), Math.Max(water.SdPpm, WidestShare * mean)));
    }

    /// <summary>Chance that the content is above a limit some days from now.</summary>
    /// <param name="water">Water in the oil now.</param>
    /// <param name="limitPpm">Limit [mg/kg].</param>
    /// <param name="days">Days from now [days].</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg], or null.</param>
    /// <returns>Chance [0 to 1].</returns>
    public static double ChanceAbove(OilWater water, double limitPpm, double days, double? ceilingPpm)
    {
        var (mean, sd) = At(water, days, ceilingPpm);
        var spread = Math.Sqrt(Math.Log(1 + Math.Pow(sd / mean, 2)));
        return limitPpm <= 0 ? 1 : 1 - Normal.Cdf(Math.Log(limitPpm / mean) / spread);
    }

    /// <summary>When the chance passes 5 %.</summary>
    /// <param name="water">Water in the oil now.</param>
    /// <param name="limitPpm">Limit [mg/kg].</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg], or null.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>The date (UTC); null: not within a year.</returns>
    public static DateTime? PassedBy(OilWater water, double limitPpm, double? ceilingPpm, DateTime asOf)
    {
        for (var day = 0; day <= HorizonDays; day++)
        {
            if (ChanceAbove(water, limitPpm, day, ceilingPpm) > Chance)
            {
                return asOf.AddDays(day);
            }
        }

        return null;
    }
}
