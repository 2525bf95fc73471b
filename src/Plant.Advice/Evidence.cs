using Plant.Advice.Dehydration;
using Plant.Advice.Drains;
using Plant.Advice.Ledger;
using Plant.Physics;
using Plant.Physics.Fluids;

namespace Plant.Advice;

/// <summary>Everything that was worked out of a reservoir's records, before it is put into words.</summary>
internal sealed record Evidence
{
    /// <summary>Settled water counts as free beyond this share of the oil volume [1].</summary>
    public const double FreeShare = 1e-4;

    public required ReservoirHistory History { get; init; }

    public required DateTime AsOf { get; init; }

    public required PlanningRule Rule { get; init; }

    public required OilState Oil { get; init; }

    public required IReadOnlyList<Observation> Observations { get; init; }

    public OilWater? Water { get; init; }

    public Ingress? Ingress { get; init; }

    public SettledWater? Settled { get; init; }

    public double? CapacityL { get; init; }

    public double? LimitPpm { get; init; }

    public DrainPlan Plan { get; init; } = DrainPlan.None;

    public DateTime? DehydrateBy { get; init; }

    public double? FreeNow { get; init; }

    public double? FreeColdest { get; init; }

    public double? AboveNearSaturation { get; init; }

    /// <summary>Content that a rise in the oil ends at: beyond saturation it settles.</summary>
    public double? CeilingPpm => Oil.SaturationPpm * 1.1;

    public static Evidence Gather(ReservoirHistory history, DateTime asOf, PlanningRule rule, Working? working)
    {
        ArgumentNullException.ThrowIfNull(history);
        ArgumentNullException.ThrowIfNull(rule);
        var known = Known(history, asOf);
        var oil = OilState.Of(known, working);
        var observations = Ledger.Observations.Of(known, oil.Fluid, asOf);
        var water = OilWater.Estimate(observations, asOf, LastReset(known, asOf), oil.SaturationPpm * 1.1, oil.SaturationColdestPpm);
        var capacity = Capacity.LitresOf(known, oil.WaterGoes, working);
        var limit = known.WaterLimitPpm ?? known.Fluid.WaterLimitPpm;
        var evidence = new Evidence
        {
            History = known,
            AsOf = asOf,
            Rule = rule,
            Oil = oil,
            Observations = observations,
            Water = water,
            CapacityL = capacity,
            LimitPpm = limit,
        };
        return evidence.WithBalance(working).WithChances(working).WithDates(working);
    }

    private Evidence WithBalance(Working? working)
    {
        var intervals = new BalanceIntervals(History, Oil, Observations, AsOf).All();
        var ingress = Oil.MassKg is { } mass && intervals.Count > 0 ? Ledger.Ingress.Estimate(intervals, mass) : null;
        var surge = Surge.Of(Observations, Water, Oil, History.Drains.Count > 0 ? History.Drains[^1].At : null);
        if (surge is { Chance: > 0.5 } sure && ingress is not null && sure.GPerDay > ingress.MedianGPerDay)
        {
            ingress = ingress.Surged(sure);
        }

        var settled = Observations.Count == 0 && History.Drains.Count == 0
            ? null
            : SettledWater.Estimate(History, intervals, ingress, Surplus(), RedissolvedLPerDay(), AsOf);
        if (working is not null && Water is { } water)
        {
            working.Add("water in the circulating oil", FormattableString.Invariant($"robust level of {Observations.Count(o => !o.Outlying)} observations, carried to {AsOf:yyyy-MM-dd}; 90 % {water.Low90Ppm:0}–{water.High90Ppm:0} mg/kg"),
                water.WaterPpm, "mg/kg", $"Karl Fischer repeatability, and sampling scatter 7 % + 5 mg/kg: {Priors.Source}");
            working.Add("trend", "Theil–Sen slope of the newest observations, shrunk by its own error", water.SlopePpmPerDay, "mg/kg/day", "Theil 1950, Sen 1968");
        }

        if (working is not null && ingress is not null)
        {
            working.Add("ingress", FormattableString.Invariant($"posterior median over {ingress.Intervals} balanced intervals (drained + taken up by the oil + breathed out); 90 % {ingress.Low90GPerDay:0}–{ingress.High90GPerDay:0} g/day"),
                ingress.MedianGPerDay, "g/day", $"water balance; prior median {Priors.IngressPpmPerDay} mg/kg/day: {Priors.Source}");
        }

        if (working is not null && settled is not null)
        {
            working.Add("settled water", FormattableString.Invariant($"left by the last drain, and gathered since at {settled.RateLPerDay:0.###} L/day; 90 % {settled.Low90L:0.##}–{settled.High90L:0.##} L"),
                settled.MedianL, "L", $"drained volumes; a drain takes 90 ± 8 %: {Priors.Source}");
        }

        return this with { Ingress = ingress, Settled = surge is null || settled is null ? settled : settled with { Surge = surge, SurgeDays = Math.Max(0, (AsOf - surge.From).TotalDays) } };
    }

    private Evidence WithChances(Working? working)
    {
        double? now = null, coldest = null, near = null;
        var settledFree = Settled is { } settled && Oil.VolumeL is { } volume ? settled.ChanceAbove(FreeShare * volume, 0) : 0;
        if (Water is { } water && Oil.SaturationPpm is { } saturation && Oil.SaturationColdestPpm is { } cold)
        {
            now = Either(CrackleTest.Update(water.ChanceAbove(saturation, Oil.SaturationLogSd), History.Samples, AsOf), settledFree);
            coldest = Math.Max(now.Value, Either(water.ChanceAbove(cold, Oil.SaturationLogSd), settledFree));
            near = water.ChanceAbove(0.8 * cold, Oil.SaturationLogSd);
            working?.Add("chance of free water now", FormattableString.Invariant($"1 − (1 − Φ(ln({water.WaterPpm:0}/{saturation:0})/σ))·(1 − {settledFree:0.###}), σ from the content and the saturation"), now, "1", Citations.Normal);
            working?.Add("chance of free water at the coldest temperature", FormattableString.Invariant($"the same against {cold:0} mg/kg"), coldest, "1", Citations.Normal);
        }
        else if (settledFree > 0.5)
        {
            now = coldest = settledFree;
        }
        else if (Water is null && CrackleTest.Newest(History.Samples, AsOf) == true)
        {
            now = coldest = CrackleTest.Update(CrackleTest.Prior, History.Samples, AsOf);
        }

        return this with { FreeNow = now, FreeColdest = coldest, AboveNearSaturation = near };
    }

    private Evidence WithDates(Working? working)
    {
        var plan = Settled is { } settled && CapacityL is { } capacity && Oil.WaterGoes != WaterDirection.Neither ? DrainPlan.Of(settled, capacity, Rule, AsOf) : DrainPlan.None;
        var dehydrate = Water is { } water && LimitPpm is { } limit ? LimitForecast.PassedBy(water, limit, CeilingPpm, AsOf) : null;
        working?.Add("drain interval", FormattableString.Invariant($"longest time with at most {100 * Rule.Risk:0.#} % chance of passing {100 * Rule.CapacityShare:0} % of the capacity"), plan.IntervalDays, "days", "planning rule of the plant");
        if (working is not null && Water is not null && LimitPpm is { } allowed)
        {
            working.Add("chance of being above the limit now", FormattableString.Invariant($"limit {allowed:0} mg/kg"), LimitForecast.ChanceAbove(Water, allowed, 0, CeilingPpm), "1", Citations.Normal);
        }

        return this with { Plan = plan, DehydrateBy = dehydrate };
    }

    /// <summary>Share of new water that the oil does not take up: on average since the last drain, and now; and the chance that it lets some fall when cold.</summary>
    private (double Since, double Now, double Cold) Surplus()
    {
        if (Water is not { } water || Oil.SaturationPpm is not { } saturation)
        {
            return (0, 0, 0);
        }

        // cold stands make water fall out of oil that is unsaturated while warm
        // and the drier it is while warm, the more of that it takes back
        var keeps = Math.Min(1, Math.Pow(water.WaterPpm / (0.7 * saturation), 2));
        var aboveCold = Oil.SaturationColdestPpm is { } cold ? keeps * water.ChanceAbove(cold, Oil.SaturationLogSd) : 0;
        var least = Priors.ColdStandShare * aboveCold;
        var now = Math.Max(least, water.ChanceAbove(0.9 * saturation, Oil.SaturationLogSd));
        var from = History.Drains.Count > 0 ? History.Drains[^1].At : DateTime.MinValue;
        double sum = now, count = 1;
        foreach (var observation in Observations)
        {
            if (observation.At > from && !observation.Outlying)
            {
                sum += Math.Max(least, Normal.Cdf(Math.Log(observation.WaterPpm / (0.9 * saturation)) / Math.Sqrt((Oil.SaturationLogSd * Oil.SaturationLogSd) + 0.01)));
                count++;
            }
        }

        return (sum / count, now, aboveCold);
    }

    /// <summary>What warm unsaturated oil may take back from the bottom in a day [L/day].</summary>
    private double RedissolvedLPerDay() =>
        Water is { } water && Oil.SaturationPpm is { } saturation && Oil.MassKg is { } mass
            ? Priors.RedissolvedPerDay * Math.Max(0, saturation - water.WaterPpm) * mass / 1e6 / Priors.WaterKgPerL
            : 0;

    private static double Either(double one, double other) => 1 - ((1 - one) * (1 - other));

    /// <summary>The end of the last run that dried the oil: samples from before say nothing of now.</summary>
    private static DateTime? LastReset(ReservoirHistory history, DateTime asOf)
    {
        DateTime? reset = null;
        foreach (var run in history.SeparatorRuns)
        {
            if (run.EndedAt is { } end && end <= asOf && run.Kind is SeparatorKind.VacuumDehydrator or SeparatorKind.Absorbent && end > (reset ?? DateTime.MinValue))
            {
                reset = end;
            }
        }

        return reset;
    }

    private static ReservoirHistory Known(ReservoirHistory history, DateTime asOf) => history with
    {
        Samples = [.. history.Samples.Where(s => s.TakenAt <= asOf && (s.ReceivedAt ?? s.TakenAt) <= asOf).OrderBy(s => s.TakenAt).ThenBy(s => s.Sample, StringComparer.Ordinal).ThenBy(s => s.Replicate)],
        Drains = [.. history.Drains.Where(d => d.At <= asOf).OrderBy(d => d.At)],
        TopUps = [.. history.TopUps.Where(t => t.At <= asOf).OrderBy(t => t.At)],
        SeparatorRuns = [.. history.SeparatorRuns.Where(r => r.StartedAt <= asOf).OrderBy(r => r.StartedAt)],
        Readings = history.Readings.Count > 0 && (history.Readings[^1].At > asOf) ? [.. history.Readings.Where(r => r.At <= asOf)] : history.Readings,
    };
}
