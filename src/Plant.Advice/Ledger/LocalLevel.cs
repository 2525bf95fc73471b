namespace Plant.Advice.Ledger;

/// <summary>Local level and trend of a short series.</summary>
/// <param name="WaterPpm">Level at the newest observation [mg/kg].</param>
/// <param name="Variance">Its variance [(mg/kg)²].</param>
/// <param name="SlopePpmPerDay">Trend [mg/kg per day].</param>
/// <param name="SlopeSdPpmPerDay">Its standard deviation [mg/kg per day].</param>
/// <param name="WanderPpm2PerDay">Variance that a day adds [(mg/kg)²/day].</param>
public readonly record struct LocalLevel(double WaterPpm, double Variance, double SlopePpmPerDay, double SlopeSdPpmPerDay, double WanderPpm2PerDay)
{
    /// <summary>Circulating oil neither loses all of its water nor holds much more than it can: its wander is bounded to this share of the level [1].</summary>
    public const double WidestShare = 0.35;

    // a trend fades: it is followed to about so many days [days]
    private const double TrendDays = 30;

    /// <summary>Days for which a trend counts, that many days ahead.</summary>
    /// <param name="daysAhead">Days ahead [days].</param>
    /// <returns>Days [days].</returns>
    public static double Reach(double daysAhead) => TrendDays * (1 - Math.Exp(-daysAhead / TrendDays));

    /// <summary>Runs a local-level filter over the observations.</summary>
    /// <param name="usable">Observations in order; at least one.</param>
    /// <returns>Level and trend at the newest.</returns>
    public static LocalLevel Through(IReadOnlyList<Observation> usable)
    {
        ArgumentNullException.ThrowIfNull(usable);
        var wander = Wander(usable);
        var level = usable[0].WaterPpm;
        var variance = Square(usable[0].StandardUncertaintyPpm);
        for (var i = 1; i < usable.Count; i++)
        {
            variance += wander * (usable[i].At - usable[i - 1].At).TotalDays;
            var noise = Square(usable[i].StandardUncertaintyPpm);
            var surprise = Square(usable[i].WaterPpm - level) / (variance + noise);
            if (surprise > 9 && usable[i].WaterPpm > level)
            {
                // bottles gain water, they do not lose it: only a high surprise is doubted
                noise *= surprise / 9;
            }

            var gain = variance / (variance + noise);
            level += gain * (usable[i].WaterPpm - level);
            variance *= 1 - gain;
        }

        var (slope, slopeSd) = Slope(usable, wander);
        return new LocalLevel(level, variance, slope, slopeSd, wander);
    }

    /// <summary>What the content moves by in a day beyond what measurement explains; the largest step is left out, two usual ones are put in.</summary>
    private static double Wander(IReadOnlyList<Observation> usable)
    {
        double sum = 0, largest = 0, level = 0;
        for (var i = 0; i < usable.Count; i++)
        {
            level += usable[i].WaterPpm / usable.Count;
            if (i == 0)
            {
                continue;
            }

            var days = Math.Max(1, (usable[i].At - usable[i - 1].At).TotalDays);
            var excess = Square(usable[i].WaterPpm - usable[i - 1].WaterPpm) - Square(usable[i].StandardUncertaintyPpm) - Square(usable[i - 1].StandardUncertaintyPpm);
            var rate = Math.Max(0, excess) / days;
            sum += rate;
            largest = Math.Max(largest, rate);
        }

        var usual = Square(0.025 * level) + 0.05;
        var steps = usable.Count - 1;
        return steps >= 4 ? (sum - largest + (2 * usual)) / (steps + 1) : (sum + (2 * usual)) / (steps + 2);
    }

    private static (double Slope, double Sd) Slope(IReadOnlyList<Observation> usable, double wander)
    {
        var first = Math.Max(0, usable.Count - 5);
        var count = usable.Count - first;
        var span = (usable[^1].At - usable[first].At).TotalDays;
        if (count < 3 || span < 14)
        {
            return (0, Math.Sqrt(wander / 30));
        }

        var x = new double[count];
        var y = new double[count];
        double noise = 0, mean = 0, spread = 0;
        for (var i = 0; i < count; i++)
        {
            x[i] = (usable[first + i].At - usable[first].At).TotalDays;
            y[i] = usable[first + i].WaterPpm;
            noise += Square(usable[first + i].StandardUncertaintyPpm) / count;
            mean += x[i] / count;
        }

        foreach (var day in x)
        {
            spread += Square(day - mean);
        }

        var slope = Robust.TheilSen(x, y) ?? 0;
        var sd = Math.Sqrt((noise / spread) + (wander / span));
        // a slope that its own error explains is no slope
        return (slope == 0 ? 0 : slope * Square(slope) / (Square(slope) + Square(sd)), sd);
    }

    private static double Square(double x) => x * x;
}
