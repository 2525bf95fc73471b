namespace Plant.Advice.Ledger;

/// <summary>Undissolved water that suddenly rose: much more comes in than before, if the newest sample is true.</summary>
/// <param name="Chance">Chance that it is so [0 to 1].</param>
/// <param name="From">Since when at the earliest (UTC).</param>
/// <param name="GPerDay">Median of what comes in [g/day].</param>
public sealed record Surge(double Chance, DateTime From, double GPerDay)
{
    /// <summary>Standard deviation of the natural logarithm of what comes in: the clearing rate is hardly known [1].</summary>
    public const double LogSd = 1.2;

    private const double Sure = 0.95;
    private const double LeastRise = 1.25;

    /// <summary>Looks for one since the last drain: a drained volume tells better.</summary>
    /// <param name="observations">Observations in order.</param>
    /// <param name="water">Water in the oil.</param>
    /// <param name="oil">The oil.</param>
    /// <param name="lastDrainAt">The last drain (UTC), or null.</param>
    /// <returns>The surge, or null.</returns>
    public static Surge? Of(IReadOnlyList<Observation> observations, OilWater? water, OilState oil, DateTime? lastDrainAt)
    {
        ArgumentNullException.ThrowIfNull(observations);
        ArgumentNullException.ThrowIfNull(oil);
        if (water is null || oil.SaturationPpm is not { } saturation || oil.MassKg is not { } mass)
        {
            return null;
        }

        var newest = observations.Count - 1;
        while (newest >= 0 && observations[newest].Outlying)
        {
            newest--;
        }

        if (newest < 2 || observations[newest].At <= lastDrainAt)
        {
            return null;
        }

        // back over the high ones to the last that was as usual
        var usual = Math.Max(saturation, Earlier(observations, newest));
        var before = newest;
        while (before >= 0 && (observations[before].Outlying || observations[before].WaterPpm > LeastRise * usual))
        {
            before--;
        }

        var rise = observations[newest].WaterPpm - usual;
        if (before < 0 || before == newest || rise < 3 * observations[newest].StandardUncertaintyPpm)
        {
            return null;
        }

        var from = observations[before].At > lastDrainAt || lastDrainAt is null ? observations[before].At : lastDrainAt.Value;
        return new Surge(water.NewestContradicts ? OilWater.BelieveLoneShare : Sure, from, rise * Priors.ClearingPerDay * mass / 1000);
    }

    /// <summary>Median of up to eight observations before the newest two [mg/kg].</summary>
    private static double Earlier(IReadOnlyList<Observation> observations, int newest)
    {
        var levels = new List<double>(8);
        for (var i = newest - 2; i >= 0 && levels.Count < 8; i--)
        {
            if (!observations[i].Outlying)
            {
                levels.Add(observations[i].WaterPpm);
            }
        }

        return levels.Count == 0 ? 0 : Robust.Median(levels);
    }
}
