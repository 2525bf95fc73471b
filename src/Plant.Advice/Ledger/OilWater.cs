namespace Plant.Advice.Ledger;

/// <summary>Water in the circulating oil now, and where it is heading.</summary>
/// <param name="WaterPpm">Best value [mg/kg].</param>
/// <param name="SdPpm">Standard deviation [mg/kg].</param>
/// <param name="SlopePpmPerDay">Trend [mg/kg per day].</param>
/// <param name="SlopeSdPpmPerDay">Standard deviation of the trend [mg/kg per day].</param>
/// <param name="WanderPpm2PerDay">Variance that a day adds [(mg/kg)²/day].</param>
public sealed record OilWater(double WaterPpm, double SdPpm, double SlopePpmPerDay, double SlopeSdPpmPerDay, double WanderPpm2PerDay)
{
    private const int Window = 8;
    private const double WindowDays = 300;

    /// <summary>Lower end of the 90 % interval [mg/kg].</summary>
    public double Low90Ppm => WaterPpm * Math.Exp(-Normal.Z90 * LogSd);

    /// <summary>Upper end of the 90 % interval [mg/kg].</summary>
    public double High90Ppm => WaterPpm * Math.Exp(Normal.Z90 * LogSd);

    /// <summary>Standard deviation of the logarithm [1].</summary>
    public double LogSd => Math.Sqrt(Math.Log(1 + Square(SdPpm / WaterPpm)));

    /// <summary>Local level through the newest observations, carried forward to a time.</summary>
    /// <param name="observations">Observations in order.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <param name="resetAt">When the oil was dried or diluted last (UTC): what was before says nothing of now.</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg]; null where there is none.</param>
    /// <returns>The estimate; null without an observation.</returns>
    public static OilWater? Estimate(IReadOnlyList<Observation> observations, DateTime asOf, DateTime? resetAt, double? ceilingPpm)
    {
        ArgumentNullException.ThrowIfNull(observations);
        var usable = observations.Where(o => !o.Outlying && (asOf - o.At).TotalDays <= WindowDays && (resetAt is null || o.At > resetAt)).TakeLast(Window).ToList();
        if (usable.Count == 0)
        {
            usable = [.. observations.Where(o => !o.Outlying).TakeLast(1)];
        }

        if (usable.Count == 0)
        {
            return null;
        }

        var wander = Wander(usable);
        var (level, variance) = Filter(usable, wander);
        var (slope, slopeSd) = Slope(usable, wander);
        var ahead = Math.Max(0, (asOf - usable[^1].At).TotalDays);
        // a trend fades: half of it is believed after two months
        var reach = Math.Min(ahead, 60);
        var now = level + (slope * reach * 0.5);
        if (ceilingPpm is { } ceiling && now > ceiling && now > level)
        {
            now = Math.Max(level, ceiling);
        }

        now = Math.Max(now, Math.Max(1, 0.3 * level));
        var sd = Math.Sqrt(variance + (wander * ahead) + Square(0.5 * slopeSd * reach));
        return new OilWater(now, Math.Max(sd, 0.03 * now), slope, slopeSd, wander);
    }

    /// <summary>What the content moves by in a day beyond what measurement explains.</summary>
    private static double Wander(List<Observation> usable)
    {
        var level = Robust.Median([.. usable.Select(o => o.WaterPpm)]);
        var least = Square(0.012 * level) + 0.05;
        if (usable.Count < 3)
        {
            return least * 2;
        }

        var rates = new List<double>(usable.Count);
        for (var i = 1; i < usable.Count; i++)
        {
            var days = Math.Max(1, (usable[i].At - usable[i - 1].At).TotalDays);
            var excess = Square(usable[i].WaterPpm - usable[i - 1].WaterPpm) - Square(usable[i].StandardUncertaintyPpm) - Square(usable[i - 1].StandardUncertaintyPpm);
            rates.Add(Math.Max(0, excess) / days);
        }

        return Math.Max(least, rates.Average());
    }

    private static (double Level, double Variance) Filter(List<Observation> usable, double wander)
    {
        var level = usable[0].WaterPpm;
        var variance = Square(usable[0].StandardUncertaintyPpm);
        for (var i = 1; i < usable.Count; i++)
        {
            variance += wander * (usable[i].At - usable[i - 1].At).TotalDays;
            var noise = Square(usable[i].StandardUncertaintyPpm);
            var surprise = Square(usable[i].WaterPpm - level) / (variance + noise);
            if (surprise > 9)
            {
                noise *= surprise / 9;
            }

            var gain = variance / (variance + noise);
            level += gain * (usable[i].WaterPpm - level);
            variance *= 1 - gain;
        }

        return (level, variance);
    }

    private static (double Slope, double Sd) Slope(List<Observation> usable, double wander)
    {
        var recent = usable.TakeLast(5).ToList();
        var span = (recent[^1].At - recent[0].At).TotalDays;
        if (recent.Count < 3 || span < 14)
        {
            return (0, Math.Sqrt(wander / 30));
        }

        var x = recent.ConvertAll(o => (o.At - recent[0].At).TotalDays);
        var slope = Robust.TheilSen(x, recent.ConvertAll(o => o.WaterPpm)) ?? 0;
        var noise = recent.Average(o => Square(o.StandardUncertaintyPpm));
        var mean = x.Average();
        var sd = Math.Sqrt((noise / x.Sum(v => Square(v - mean))) + (wander / span));
        // a slope that its own error explains is no slope
        var believed = slope * Square(slope) / (Square(slope) + Square(sd));
        return (double.IsNaN(believed) ? 0 : believed, sd);
    }

    private static double Square(double x) => x * x;
}
