using Plant.Advice.Ledger;

namespace Plant.Advice.Drains;

/// <summary>Settled (or floating) water now and the rate at which it gathers.</summary>
/// <param name="LeftL">What the last drain left behind [L].</param>
/// <param name="RateLPerDay">Median rate since [L/day]; 0 where none settles.</param>
/// <param name="RateLogSd">Standard deviation of the rate's logarithm [1].</param>
/// <param name="SinceDays">Days since the last drain (or since records begin) [days].</param>
/// <param name="Observed">True where drains were recorded.</param>
public sealed record SettledWater(double LeftL, double RateLPerDay, double RateLogSd, double SinceDays, bool Observed)
{
    private const double WaterKgPerL = 0.998;

    /// <summary>Best value now [L].</summary>
    public double MedianL => At(0, 0.5);

    /// <summary>Lower end of the 90 % interval [L].</summary>
    public double Low90L => At(0, 0.05);

    /// <summary>Upper end of the 90 % interval [L].</summary>
    public double High90L => At(0, 0.95);

    /// <summary>Settled water some days from now, at a level of chance.</summary>
    /// <param name="daysAhead">Days from now [days].</param>
    /// <param name="chance">Chance that it is less [0 to 1].</param>
    /// <returns>Settled water [L].</returns>
    public double At(double daysAhead, double chance)
    {
        var z = Normal.Quantile(chance);
        var gathered = RateLPerDay <= 0 ? 0 : RateLPerDay * Math.Exp(z * RateLogSd) * (SinceDays + daysAhead);
        // what a drain leaves is known to about its half
        return Math.Max(0, (LeftL * Math.Exp(0.5 * z)) + gathered);
    }

    /// <summary>Chance that settled water is above an amount some days from now.</summary>
    /// <param name="amountL">Amount [L].</param>
    /// <param name="daysAhead">Days from now [days].</param>
    /// <returns>Chance [0 to 1].</returns>
    public double ChanceAbove(double amountL, double daysAhead)
    {
        var room = amountL - LeftL;
        var days = SinceDays + daysAhead;
        if (RateLPerDay <= 0 || days <= 0)
        {
            return room < 0 ? 1 - Normal.Cdf(Math.Log(amountL / LeftL) / 0.5) : 0;
        }

        return room <= 0 ? 1 : 1 - Normal.Cdf(Math.Log(room / days / RateLPerDay) / RateLogSd);
    }

    /// <summary>Estimates it from what drains brought, and where there were none from what the oil cannot hold.</summary>
    /// <param name="history">The records.</param>
    /// <param name="intervals">Balances in order.</param>
    /// <param name="ingress">The ingress.</param>
    /// <param name="surplusShare">Share of the ingress that the oil does not take up [0 to 1].</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>The estimate.</returns>
    public static SettledWater Estimate(
        ReservoirHistory history, IReadOnlyList<BalanceInterval> intervals, Ingress? ingress, double surplusShare, DateTime asOf)
    {
        ArgumentNullException.ThrowIfNull(history);
        ArgumentNullException.ThrowIfNull(intervals);
        var drains = history.Drains.Where(d => d.At <= asOf).ToList();
        var left = drains.Count > 0 ? drains[^1].WaterL * (1 - Priors.DrainEfficiency) / Priors.DrainEfficiency : 0;
        var begin = drains.Count > 0 ? drains[^1].At : Begin(history, asOf);
        var since = Math.Max(0, (asOf - begin).TotalDays);
        var observed = intervals.Where(i => i.SettledLPerDay is not null && (ingress?.ChangedAt is null || i.To > ingress.ChangedAt)).TakeLast(8).ToList();
        if (observed.Count >= 2 || (observed.Count == 1 && surplusShare < 0.05))
        {
            return FromDrains(observed, left, since, ingress, surplusShare);
        }

        if (ingress is null || surplusShare <= 0.01)
        {
            return new SettledWater(left, 0, 0, since, drains.Count > 0);
        }

        var rate = ingress.MedianGPerDay / 1000 / WaterKgPerL * surplusShare;
        var spread = Math.Log(Math.Max(1.05, ingress.High90GPerDay / ingress.Low90GPerDay)) / (2 * Normal.Z90);
        return new SettledWater(left, rate, Math.Sqrt((spread * spread) + 0.25), Math.Min(since, 730), drains.Count > 0);
    }

    private static SettledWater FromDrains(List<BalanceInterval> observed, double left, double since, Ingress? ingress, double surplusShare)
    {
        double weights = 0, sum = 0;
        var logs = new List<double>(observed.Count);
        foreach (var interval in observed)
        {
            var floor = Priors.SmallestDrainL / 2 / Math.Max(1, interval.Days);
            var log = Math.Log(Math.Max(floor, interval.SettledLPerDay!.Value));
            var weight = Math.Pow(0.5, (observed[^1].To - interval.To).TotalDays / 90);
            logs.Add(log);
            weights += weight;
            sum += weight * log;
        }

        var mean = sum / weights;
        var variance = 0.0;
        for (var i = 0; i < observed.Count; i++)
        {
            variance += Math.Pow(0.5, (observed[^1].To - observed[i].To).TotalDays / 90) * Math.Pow(logs[i] - mean, 2);
        }

        // the scatter between drains is the scatter of the next one; with few drains it is known badly
        var scatter = Math.Sqrt((variance / weights * observed.Count / Math.Max(1, observed.Count - 1)) + (0.09 / observed.Count) + 0.04);
        var nothing = observed.TrueForAll(i => i.SettledLPerDay!.Value * i.Days < Priors.SmallestDrainL);
        if (nothing && surplusShare < 0.05)
        {
            return new SettledWater(left, 0, 0, since, true);
        }

        if (nothing && ingress is not null)
        {
            // nothing came so far, but the oil is full: what comes in next may settle
            mean = Math.Max(mean, Math.Log(Math.Max(1e-6, 0.1 * surplusShare * ingress.MedianGPerDay / 1000)));
            scatter = Math.Max(scatter, 1);
        }

        return new SettledWater(left, Math.Exp(mean), Math.Min(scatter, 1.5), since, true);
    }

    private static DateTime Begin(ReservoirHistory history, DateTime asOf)
    {
        var first = history.Samples.Count > 0 ? history.Samples.Min(s => s.TakenAt) : asOf;
        return history.CommissionedAt is { } commissioned && commissioned > first && commissioned < asOf ? commissioned : first;
    }
}
