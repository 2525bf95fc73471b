using Plant.Advice.Ledger;

namespace Plant.Advice.Drains;

/// <summary>Settled (or floating) water now and the rate at which it gathers.</summary>
/// <param name="NowL">Median now [L]; 0 where none stands.</param>
/// <param name="NowLogSd">Standard deviation of its natural logarithm [1].</param>
/// <param name="RateLPerDay">Median rate from now on [L/day]; 0 where none settles.</param>
/// <param name="RateLogSd">Standard deviation of the rate's natural logarithm [1].</param>
/// <param name="RedissolvedL">What warm unsaturated oil may have taken back since [L].</param>
/// <param name="SinceDays">Days since the last drain [days].</param>
public sealed record SettledWater(double NowL, double NowLogSd, double RateLPerDay, double RateLogSd, double RedissolvedL, double SinceDays)
{
    private const int HalfLifeDays = 120;

    /// <summary>A sudden rise of undissolved water, or null.</summary>
    public Surge? Surge { get; init; }

    /// <summary>Days since the surge began [days].</summary>
    public double SurgeDays { get; init; }

    /// <summary>Best value now [L].</summary>
    public double MedianL => NowL;

    /// <summary>Lower end of the 90 % interval [L].</summary>
    public double Low90L => At(0, 0.05);

    /// <summary>Upper end of the 90 % interval [L].</summary>
    public double High90L => At(0, 0.95);

    /// <summary>Settled water some days from now, at a level of chance, if the ingress stays as it is.</summary>
    /// <param name="daysAhead">Days from now [days].</param>
    /// <param name="chance">Chance that it is less [0 to 1].</param>
    /// <returns>Settled water [L].</returns>
    public double At(double daysAhead, double chance)
    {
        var z = Normal.Quantile(chance);
        var takenBack = z < 0 ? RedissolvedL * -z / Normal.Z90 : 0;
        return Math.Max(0, Amount(daysAhead, 0, z) - takenBack);
    }

    /// <summary>Chance that settled water is above an amount some days from now; that a leak starts, or started unseen since the last drain, is part of it.</summary>
    /// <param name="amountL">Amount [L].</param>
    /// <param name="daysAhead">Days from now [days].</param>
    /// <returns>Chance [0 to 1].</returns>
    public double ChanceAbove(double amountL, double daysAhead)
    {
        var usual = ChanceAbove(amountL, daysAhead, 0);
        if (RateLPerDay > 0 && daysAhead > 0)
        {
            var leak = 1 - Math.Exp(-Priors.LeaksPerYear * (SinceDays + daysAhead) / 365);
            var filled = 0.0;
            foreach (var factor in Priors.LeakFactors)
            {
                // it starts somewhere in the middle of the time
                filled += ChanceAbove(amountL, daysAhead, RateLPerDay * (factor - 1) * 0.5 * (SinceDays + daysAhead)) / Priors.LeakFactors.Length;
            }

            usual = ((1 - leak) * usual) + (leak * filled);
        }

        return Surge is { } surge ? ((1 - surge.Chance) * usual) + (surge.Chance * Math.Max(usual, Surged(surge, amountL, daysAhead))) : usual;
    }

    private double Surged(Surge surge, double amountL, double daysAhead)
    {
        var room = amountL - NowL;
        var came = surge.GPerDay / 1000 / Priors.WaterKgPerL * (SurgeDays + daysAhead);
        return room <= 0 ? 1 : came <= 0 ? 0 : Normal.Cdf(Math.Log(came / room) / Ledger.Surge.LogSd);
    }

    /// <summary>Estimates it from what drains brought, and where there were none from what the oil cannot hold.</summary>
    /// <param name="history">The records.</param>
    /// <param name="intervals">Balances in order.</param>
    /// <param name="ingress">The ingress.</param>
    /// <param name="surplus">Share of the ingress that the oil does not take up: since the last drain, and now; and the chance that it lets some fall when cold.</param>
    /// <param name="redissolvedLPerDay">What warm unsaturated oil may take back in a day [L/day].</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>The estimate.</returns>
    public static SettledWater Estimate(
        ReservoirHistory history, IReadOnlyList<BalanceInterval> intervals, Ingress? ingress, (double Since, double Now, double Cold) surplus, double redissolvedLPerDay, DateTime asOf)
    {
        ArgumentNullException.ThrowIfNull(history);
        ArgumentNullException.ThrowIfNull(intervals);
        var last = history.Drains.Count > 0 ? history.Drains[^1] : (Drain?)null;
        var left = last is { } drain ? drain.WaterL * (1 - Priors.DrainEfficiency) / Priors.DrainEfficiency : 0;
        var since = Math.Clamp((asOf - (last?.At ?? Begin(history, asOf))).TotalDays, 0, 730);
        var takenBack = redissolvedLPerDay * Math.Min(since, 30);
        var observed = intervals.Where(i => i.SettledLPerDay is not null && (ingress?.ChangedAt is null || i.To > ingress.ChangedAt)).TakeLast(8).ToList();
        if (observed.Count > 0)
        {
            var (rate, spread) = FromDrains(observed);
            if (rate <= 0 && ingress is not null && surplus.Now > 0.05)
            {
                // nothing came so far, but the oil is full: what comes in next may settle
                (rate, spread) = (0.1 * surplus.Now * FromIngress(ingress), 1.2);
            }

            return Gathered(left, rate, rate, spread, since, takenBack);
        }

        if (ingress is null)
        {
            return new SettledWater(left, 0.5, 0, 0, takenBack, since);
        }

        // nobody ever looked: what stood before the records, and what cold stands let fall, is hardly known
        var drained = history.Drains.Count > 0;
        var past = drained ? surplus.Since : Math.Max(surplus.Since, Priors.UndrainedShare * surplus.Cold);
        var inflow = FromIngress(ingress);
        var wide = Math.Sqrt(Math.Pow(Math.Log(Math.Max(1.05, ingress.High90GPerDay / ingress.Low90GPerDay)) / (2 * Normal.Z90), 2) + (drained ? 0.5 : 1));
        return Gathered(left, inflow * past, inflow * (surplus.Now > 0.01 ? surplus.Now : 0), wide, since, takenBack);
    }

    private static SettledWater Gathered(double leftL, double pastLPerDay, double rateLPerDay, double spread, double sinceDays, double takenBackL)
    {
        var gathered = pastLPerDay * sinceDays;
        var now = leftL + gathered;
        // what a drain leaves is known to about its half
        var nowSpread = now <= 0 ? 0 : ((0.5 * leftL) + (spread * gathered)) / now;
        return new SettledWater(now, nowSpread, rateLPerDay, spread, takenBackL, sinceDays);
    }

    private static double FromIngress(Ingress ingress) => ingress.MedianGPerDay / 1000 / Priors.WaterKgPerL;

    /// <summary>Mean rate over the newest drains as the median and spread of a lognormal of the same mean and variance.</summary>
    private static (double LPerDay, double LogSd) FromDrains(List<BalanceInterval> observed)
    {
        double weights = 0, squares = 0, sum = 0;
        foreach (var interval in observed)
        {
            var weight = Weight(observed, interval);
            weights += weight;
            squares += weight * weight;
            sum += weight * interval.SettledLPerDay!.Value;
        }

        var mean = sum / weights;
        if (mean <= 0)
        {
            return (0, 1);
        }

        var effective = weights * weights / squares;
        var variance = 0.0;
        foreach (var interval in observed)
        {
            variance += Weight(observed, interval) / weights * Math.Pow((interval.SettledLPerDay!.Value / mean) - 1, 2);
        }

        // few drains know their own scatter badly: two imagined ones of usual scatter stand beside them
        var scatter = ((variance * effective) + (2 * 0.16)) / (effective + 1);
        var newest = observed[^1].SettledLPerDay!.Value;
        if (newest > 2 * mean && observed.Count > 1)
        {
            // the newest drain may be the first of a leak
            mean = newest;
            scatter = Math.Max(scatter, 0.4);
        }

        var spread = Math.Log(1 + scatter + (scatter / effective) + 0.02);
        return (mean * Math.Exp(-0.5 * spread), Math.Sqrt(spread));
    }

    private static double Weight(List<BalanceInterval> observed, BalanceInterval interval) =>
        Math.Max(1, interval.Days) * Math.Pow(0.5, (observed[^1].To - interval.To).TotalDays / HalfLifeDays);

    private double Amount(double daysAhead, double leakedL, double z) =>
        (NowL * Math.Exp(z * NowLogSd)) + (((RateLPerDay * daysAhead) + leakedL) * Math.Exp(z * RateLogSd));

    /// <summary>Both terms grow with one quantile: the chance is that of the quantile at which their sum is the amount.</summary>
    private double ChanceAbove(double amountL, double daysAhead, double leakedL)
    {
        if (Amount(daysAhead, leakedL, -6) >= amountL)
        {
            return 1;
        }

        if (Amount(daysAhead, leakedL, 6) <= amountL)
        {
            return 0;
        }

        double low = -6, high = 6;
        while (high - low > 1e-3)
        {
            var middle = 0.5 * (low + high);
            if (Amount(daysAhead, leakedL, middle) < amountL)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return 1 - Normal.Cdf(low);
    }

    private static DateTime Begin(ReservoirHistory history, DateTime asOf)
    {
        var first = history.Samples.Count > 0 ? history.Samples[0].TakenAt : asOf;
        return history.CommissionedAt is { } commissioned && commissioned > first && commissioned < asOf ? commissioned : first;
    }
}
