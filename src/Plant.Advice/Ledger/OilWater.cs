namespace Plant.Advice.Ledger;

/// <summary>Water in the circulating oil now, and where it is heading: a mixture of what may be the case.</summary>
/// <param name="Cases">The cases with their weights; the first is the usual one.</param>
/// <param name="SlopePpmPerDay">Trend [mg/kg per day].</param>
/// <param name="SlopeSdPpmPerDay">Standard deviation of the trend [mg/kg per day].</param>
/// <param name="WanderPpm2PerDay">Variance that a day adds [(mg/kg)²/day].</param>
/// <param name="NewestContradicts">True where the newest sample is far above those before: a dirty bottle, or the first of a change.</param>
public sealed record OilWater(IReadOnlyList<WaterCase> Cases, double SlopePpmPerDay, double SlopeSdPpmPerDay, double WanderPpm2PerDay, bool NewestContradicts)
{
    private const int Window = 8;
    private const double WindowDays = 300;

    /// <summary>Of two far results in a row the second is believed; of one alone this share turns out true (judgement) [1].</summary>
    public const double BelieveLoneShare = 0.35;

    // chance that oil that was lower than usual has come back up since (judgement)
    private const double RefilledShare = 0.4;

    /// <summary>Best value: the median [mg/kg].</summary>
    public double WaterPpm { get; } = Quantile(Cases, 0.5);

    /// <summary>Lower end of the 90 % interval [mg/kg].</summary>
    public double Low90Ppm { get; } = Quantile(Cases, 0.05);

    /// <summary>Upper end of the 90 % interval [mg/kg].</summary>
    public double High90Ppm { get; } = Quantile(Cases, 0.95);

    /// <summary>Chance that the content is above an amount that is itself uncertain.</summary>
    /// <param name="amountPpm">Amount [mg/kg].</param>
    /// <param name="amountLogSd">Standard deviation of its natural logarithm [1].</param>
    /// <returns>Chance [0 to 1].</returns>
    public double ChanceAbove(double amountPpm, double amountLogSd) => ChanceAbove(Cases, amountPpm, amountLogSd);

    /// <summary>Chance that a mixture is above an amount.</summary>
    /// <param name="cases">The mixture.</param>
    /// <param name="amountPpm">Amount [mg/kg].</param>
    /// <param name="amountLogSd">Standard deviation of its natural logarithm [1].</param>
    /// <returns>Chance [0 to 1].</returns>
    public static double ChanceAbove(IReadOnlyList<WaterCase> cases, double amountPpm, double amountLogSd)
    {
        ArgumentNullException.ThrowIfNull(cases);
        if (amountPpm <= 0)
        {
            return 1;
        }

        var chance = 0.0;
        foreach (var one in cases)
        {
            chance += one.Weight * Normal.Cdf(Math.Log(one.WaterPpm / amountPpm) / Math.Sqrt(Square(one.LogSd) + Square(amountLogSd)));
        }

        return Math.Clamp(chance, 0, 1);
    }

    /// <summary>Content that a mixture is below with a chance.</summary>
    /// <param name="cases">The mixture.</param>
    /// <param name="chance">Chance [0 to 1].</param>
    /// <returns>Content [mg/kg].</returns>
    public static double Quantile(IReadOnlyList<WaterCase> cases, double chance)
    {
        ArgumentNullException.ThrowIfNull(cases);
        double low = double.PositiveInfinity, high = double.NegativeInfinity;
        foreach (var one in cases)
        {
            low = Math.Min(low, Math.Log(one.WaterPpm) - (5 * one.LogSd));
            high = Math.Max(high, Math.Log(one.WaterPpm) + (5 * one.LogSd));
        }

        while (high - low > 1e-5)
        {
            var middle = 0.5 * (low + high);
            if (1 - ChanceAbove(cases, Math.Exp(middle), 0) < chance)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return Math.Exp(0.5 * (low + high));
    }

    /// <summary>Local level through the newest observations, carried forward to a time.</summary>
    /// <param name="observations">Observations in order.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <param name="resetAt">When the oil was dried last (UTC): what was before says nothing of now.</param>
    /// <param name="ceilingPpm">Content that a rise ends at [mg/kg]; null where there is none.</param>
    /// <param name="coldestPpm">Saturation at the coldest temperature [mg/kg]; null where there is none.</param>
    /// <returns>The estimate; null without an observation.</returns>
    public static OilWater? Estimate(IReadOnlyList<Observation> observations, DateTime asOf, DateTime? resetAt, double? ceilingPpm, double? coldestPpm)
    {
        ArgumentNullException.ThrowIfNull(observations);
        var usable = Newest(observations, asOf, resetAt);
        if (usable.Count == 0)
        {
            return null;
        }

        var lone = IsLone(usable);
        var newest = usable[^1];
        if (lone)
        {
            usable.RemoveAt(usable.Count - 1);
        }

        var local = LocalLevel.Through(usable);
        var ahead = Math.Max(0, (asOf - usable[^1].At).TotalDays);
        var reach = LocalLevel.Reach(ahead);
        var now = local.WaterPpm + (local.SlopePpmPerDay * reach);
        if (ceilingPpm is { } ceiling && now > ceiling && now > local.WaterPpm)
        {
            now = Math.Max(local.WaterPpm, ceiling);
        }

        now = Math.Max(now, Math.Max(1, 0.3 * local.WaterPpm));
        var sd = Math.Sqrt(local.Variance + Math.Min(local.WanderPpm2PerDay * ahead, Square(LocalLevel.WidestShare * now)) + Square(local.SlopeSdPpmPerDay * reach));
        // readings of one sensor share the error of the solubility: it does not average out
        var shared = usable[^1].Replicates == 0 ? usable[^1].StandardUncertaintyPpm / Math.Max(1, usable[^1].WaterPpm) : 0.03;
        var logSd = Math.Max(shared, Math.Sqrt(Math.Log(1 + Square(sd / now))));
        var cases = new List<WaterCase>(3);
        var rest = 1.0;
        if (lone)
        {
            cases.Add(new WaterCase(BelieveLoneShare, newest.WaterPpm, Math.Max(0.05, newest.StandardUncertaintyPpm / newest.WaterPpm) + (0.01 * Math.Min(30, (asOf - newest.At).TotalDays))));
            rest -= BelieveLoneShare;
        }

        if (coldestPpm is { } cold && cold < 0.9 * now)
        {
            // a cold stand, running or just over: water fell out, and the oil fills up again from there
            var depth = Math.Log(now / cold);
            cases.Add(new WaterCase(Priors.ColdStandShare * rest, now * Math.Exp(-0.6 * depth), (0.3 * depth) + logSd));
            rest *= 1 - Priors.ColdStandShare;
        }

        if (Usual(usable) is var usual && usual > 1.1 * now)
        {
            // the newest may have followed a cold stand: the oil may be back where it usually is
            var rise = Math.Log(usual / now);
            var share = RefilledShare * (1 - (0.7 * Math.Exp(-ahead / 20)));
            cases.Add(new WaterCase(share * rest, now * Math.Exp(0.65 * rise), (0.35 * rise) + logSd));
            rest *= 1 - share;
        }

        cases.Insert(0, new WaterCase(rest, now, logSd));
        return new OilWater(cases, local.SlopePpmPerDay, local.SlopeSdPpmPerDay, local.WanderPpm2PerDay, lone);
    }

    private static List<Observation> Newest(IReadOnlyList<Observation> observations, DateTime asOf, DateTime? resetAt)
    {
        var usable = new List<Observation>(Window);
        for (var i = observations.Count - 1; i >= 0 && usable.Count < Window; i--)
        {
            var one = observations[i];
            if (!one.Outlying && (usable.Count == 0 || ((asOf - one.At).TotalDays <= WindowDays && (resetAt is null || one.At > resetAt))))
            {
                usable.Add(one);
            }
        }

        usable.Reverse();
        return usable;
    }

    /// <summary>The level that a quarter of the observations is above [mg/kg].</summary>
    private static double Usual(List<Observation> usable)
    {
        var sorted = new double[usable.Count];
        for (var i = 0; i < sorted.Length; i++)
        {
            sorted[i] = usable[i].WaterPpm;
        }

        Array.Sort(sorted);
        return sorted[(sorted.Length - 1) * 3 / 4];
    }

    private static bool IsLone(List<Observation> usable)
    {
        if (usable.Count < 3)
        {
            return false;
        }

        var before = 0.5 * (usable[^2].WaterPpm + usable[^3].WaterPpm);
        var newest = usable[^1];
        var spread = Math.Max(Math.Abs(usable[^2].WaterPpm - usable[^3].WaterPpm), 0.15 * before);
        return newest.WaterPpm - before > 3 * Math.Sqrt(Square(newest.StandardUncertaintyPpm) + Square(usable[^2].StandardUncertaintyPpm) + (0.5 * spread * spread));
    }

    private static double Square(double x) => x * x;
}

/// <summary>One of the things that may be the case: a lognormal content.</summary>
/// <param name="Weight">Chance of the case [0 to 1].</param>
/// <param name="WaterPpm">Median content [mg/kg].</param>
/// <param name="LogSd">Standard deviation of its natural logarithm [1].</param>
public readonly record struct WaterCase(double Weight, double WaterPpm, double LogSd);
