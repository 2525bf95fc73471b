using Plant.Advice.Ledger;

namespace Plant.Advice.Dehydration;

/// <summary>Circulating water ahead, and against its limit.</summary>
public static class LimitForecast
{
    /// <summary>Chance at which a limit counts as passed [0 to 1].</summary>
    public const double Chance = 0.05;

    private const int HorizonDays = 365;
    private const double WidestShare = 0.35;

    // a trend is followed for so long and then taken to have met its balance with the headspace [days]
    private const double TrendDays = 90;

    /// <summary>What may be the case some days from now, if nobody does anything.</summary>
    /// <param name="water">Water in the oil now.</param>
    /// <param name="daysAhead">Days from now [days].</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg], or null.</param>
    /// <returns>The cases with their weights.</returns>
    public static IReadOnlyList<WaterCase> At(OilWater water, double daysAhead, double? ceilingPpm)
    {
        ArgumentNullException.ThrowIfNull(water);
        var reach = TrendDays * (1 - Math.Exp(-daysAhead / TrendDays));
        var cases = new WaterCase[water.Cases.Count];
        for (var i = 0; i < cases.Length; i++)
        {
            var now = water.Cases[i];
            var median = now.WaterPpm + (water.SlopePpmPerDay * reach);
            if (ceilingPpm is { } ceiling)
            {
                median = Math.Min(median, Math.Max(ceiling, now.WaterPpm));
            }

            median = Math.Max(median, 0.2 * now.WaterPpm);
            var added = Math.Min(
                (water.WanderPpm2PerDay * daysAhead) + Math.Pow(water.SlopeSdPpmPerDay * reach, 2),
                Math.Pow(LocalLevel.WidestShare * median, 2));
            cases[i] = new WaterCase(now.Weight, median, Math.Sqrt((now.LogSd * now.LogSd) + Math.Log(1 + (added / (median * median)))));
        }

        return cases;
    }

    /// <summary>Chance that the content is above a limit some days from now.</summary>
    /// <param name="water">Water in the oil now.</param>
    /// <param name="limitPpm">Limit [mg/kg].</param>
    /// <param name="daysAhead">Days from now [days].</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg], or null.</param>
    /// <returns>Chance [0 to 1].</returns>
    public static double ChanceAbove(OilWater water, double limitPpm, double daysAhead, double? ceilingPpm) =>
        OilWater.ChanceAbove(At(water, daysAhead, ceilingPpm), limitPpm, 0);

    /// <summary>When the chance passes 5 %.</summary>
    /// <param name="water">Water in the oil now.</param>
    /// <param name="limitPpm">Limit [mg/kg].</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg], or null.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>The date (UTC); null: not within a year.</returns>
    public static DateTime? PassedBy(OilWater water, double limitPpm, double? ceilingPpm, DateTime asOf)
    {
        // by weeks, then by days within the week
        for (var week = 0; week <= HorizonDays; week += 7)
        {
            if (ChanceAbove(water, limitPpm, week, ceilingPpm) > Chance)
            {
                var day = Math.Max(0, week - 6);
                while (day < week && ChanceAbove(water, limitPpm, day, ceilingPpm) <= Chance)
                {
                    day++;
                }

                return asOf.AddDays(day);
            }
        }

        return null;
    }
}
