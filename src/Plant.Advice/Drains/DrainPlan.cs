using Plant.Advice.Ledger;

namespace Plant.Advice.Drains;

/// <summary>When a reservoir must be drained by the plant's planning rule.</summary>
/// <param name="IntervalDays">How long a drained reservoir may go [days]; null: a year or more.</param>
/// <param name="By">When the next drain is due (UTC); null: not within a year.</param>
/// <param name="Earliest">Earliest date within the 90 % interval (UTC).</param>
/// <param name="Latest">Latest date within the 90 % interval (UTC); null: not within a year.</param>
public sealed record DrainPlan(double? IntervalDays, DateTime? By, DateTime? Earliest, DateTime? Latest)
{
    /// <summary>How far ahead dates are told [days].</summary>
    public const double HorizonDays = 365;

    /// <summary>No drain within a year.</summary>
    public static readonly DrainPlan None = new(null, null, null, null);

    /// <summary>Applies the rule: at most the accepted chance that settled water passes the share of its capacity.</summary>
    /// <param name="settled">Settled water.</param>
    /// <param name="capacityL">Capacity [L].</param>
    /// <param name="rule">The rule.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>The plan.</returns>
    public static DrainPlan Of(SettledWater settled, double capacityL, PlanningRule rule, DateTime asOf)
    {
        ArgumentNullException.ThrowIfNull(settled);
        ArgumentNullException.ThrowIfNull(rule);
        var allowed = capacityL * rule.CapacityShare;
        var steady = settled with { SinceDays = 0, Surge = null, NowL = Math.Min((1 - Priors.DrainEfficiency) * settled.NowL, 0.1 * allowed) };
        var interval = Longest(days => steady.ChanceAbove(allowed, days) <= rule.Risk);
        var ahead = Longest(days => settled.ChanceAbove(allowed, days) <= rule.Risk);
        if (ahead is null)
        {
            return new DrainPlan(interval, null, null, null);
        }

        // where the date may move: were the rate known to be at either end of its interval
        var early = Longest(days => settled.At(days, 0.95) <= allowed);
        var late = Longest(days => settled.At(days, 0.05) <= allowed);
        var by = asOf.AddDays(ahead.Value);
        var earliest = asOf.AddDays(Math.Min(ahead.Value, early ?? HorizonDays) * 0.8);
        return new DrainPlan(interval, by, earliest, late is { } last ? Later(asOf.AddDays(last), by) : null);
    }

    /// <summary>The longest time, in tenths of a day, for which a condition that only ever turns false holds; null where it holds for a year.</summary>
    private static double? Longest(Func<double, bool> holds)
    {
        if (holds(HorizonDays))
        {
            return null;
        }

        if (!holds(0))
        {
            return 0;
        }

        double low = 0, high = HorizonDays;
        while (high - low > 0.05)
        {
            var middle = 0.5 * (low + high);
            if (holds(middle))
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return Math.Round(low, 1);
    }

    private static DateTime Later(DateTime one, DateTime other) => one > other ? one : other;
}
