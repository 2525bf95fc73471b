
namespace Plant.Advice.Ledger;

/// <summary>Cuts the history of a reservoir into intervals and balances each.</summary>
internal sealed class BalanceIntervals(ReservoirHistory history, OilState oil, IReadOnlyList<Observation> observations, DateTime asOf)
{
    private const double HorizonDays = 540;
    private const double ShortestDays = 5;

    private readonly List<Observation> usable = [.. observations.Where(o => !o.Outlying)];

    public IReadOnlyList<BalanceInterval> All()
    {
        var start = asOf.AddDays(-HorizonDays);
        var drains = history.Drains.Where(d => d.At <= asOf && d.At >= start).ToList();
        var found = drains.Count >= 2 ? BetweenDrains(drains) : [];
        var after = drains.Count >= 2 ? drains[^1].At : start;
        if (drains.Count < 2)
        {
            found.AddRange(BetweenSamples(after));
        }

        return found;
    }

    private List<BalanceInterval> BetweenDrains(List<Drain> drains)
    {
        var found = new List<BalanceInterval>(drains.Count);
        var left = 0.0;
        var from = drains[0].At;
        left = Left(drains[0].WaterL);
        double drained = 0;
        for (var i = 1; i < drains.Count; i++)
        {
            drained += drains[i].WaterL;
            var days = (drains[i].At - from).TotalDays;
            if (days < ShortestDays)
            {
                continue;
            }

            var settled = Math.Max(0, (drained / Priors.DrainEfficiency) - left);
            var (uptake, uptakeSd, full) = Uptake(from, drains[i].At);
            var settledSd = (0.1 * settled) + 0.05 + (0.5 * left);
            var ingress = ((settled * Priors.WaterKgPerL * 1000) + uptake) / days;
            var sd = Math.Sqrt(Math.Pow(settledSd * Priors.WaterKgPerL * 1000, 2) + Math.Pow(uptakeSd, 2)) / days;
            found.Add(new BalanceInterval(from, drains[i].At, ingress, sd, settled / days, full && drained < Priors.SmallestDrainL));
            left = Left(drained);
            from = drains[i].At;
            drained = 0;
        }

        return found;
    }

    private IEnumerable<BalanceInterval> BetweenSamples(DateTime after)
    {
        var points = usable.Where(o => o.At >= after).ToList();
        for (var i = 0; i < points.Count;)
        {
            var j = i + 1;
            while (j < points.Count && (points[j].At - points[i].At).TotalDays < 20)
            {
                j++;
            }

            if (j >= points.Count)
            {
                yield break;
            }

            var (uptake, sd, full) = Uptake(points[i].At, points[j].At);
            var days = (points[j].At - points[i].At).TotalDays;
            // a fall from above the cold saturation says that water went somewhere, not that little came in
            var fell = uptake <= 0 && oil.SaturationColdestPpm is { } cold && points[i].WaterPpm > cold;
            yield return new BalanceInterval(points[i].At, points[j].At, uptake / days, sd / days, null, full || fell);
            i = j;
        }
    }

    /// <summary>Water that the oil took up and breathed out between two times [g], and whether it was full.</summary>
    private (double G, double SdG, bool Full) Uptake(DateTime from, DateTime to)
    {
        if (oil.MassKg is not { } mass || Around(from) is not { } first || Around(to) is not { } last)
        {
            return (0, (oil.MassKg ?? 100) * 0.05, false);
        }

        var days = (to - from).TotalDays;
        var middle = 0.5 * (first.WaterPpm + last.WaterPpm);
        var exchange = oil.HeadspacePpm is { } rest ? oil.ExchangePerDay * (middle - rest) * days : 0;
        var removed = Removed(from, to, middle);
        var diluted = 0.0;
        foreach (var topUp in history.TopUps)
        {
            if (topUp.At > from && topUp.At <= to && oil.VolumeL is { } volume)
            {
                diluted += Math.Min(1, topUp.OilL / volume) * (middle - (topUp.WaterPpm ?? Math.Min(middle, 50)));
            }
        }

        var change = last.WaterPpm - first.WaterPpm + exchange + removed + diluted;
        var variance = Math.Pow(first.StandardUncertaintyPpm, 2) + Math.Pow(last.StandardUncertaintyPpm, 2) + Math.Pow(exchange, 2) + Math.Pow(0.5 * removed, 2);
        var full = oil.SaturationPpm is { } saturation && middle > 0.8 * saturation;
        return (mass * change / 1000, mass * Math.Sqrt(variance) / 1000, full);
    }

    /// <summary>What separators took out between two times, as content [mg/kg].</summary>
    private double Removed(DateTime from, DateTime to, double waterPpm)
    {
        var removed = 0.0;
        foreach (var run in history.SeparatorRuns)
        {
            var begin = run.StartedAt > from ? run.StartedAt : from;
            var end = (run.EndedAt ?? asOf) < to ? run.EndedAt ?? asOf : to;
            if (end > begin && oil.VolumeL is { } volume && run.FlowLPerMin is { } flow)
            {
                var turns = flow * (end - begin).TotalMinutes / volume * (run.Efficiency ?? 0.8);
                removed += Math.Max(0, waterPpm - oil.FloorPpm(run)) * Math.Min(turns, 3);
            }
        }

        return removed;
    }

    /// <summary>The content at a time: between the neighbours, by their distance.</summary>
    private Observation? Around(DateTime time)
    {
        Observation? before = null, after = null;
        foreach (var observation in usable)
        {
            if (observation.At <= time)
            {
                before = observation;
            }
            else
            {
                after = observation;
                break;
            }
        }

        if (before is null || after is null)
        {
            return before ?? after;
        }

        var share = (time - before.At).TotalDays / (after.At - before.At).TotalDays;
        return before with
        {
            WaterPpm = before.WaterPpm + (share * (after.WaterPpm - before.WaterPpm)),
            StandardUncertaintyPpm = Math.Max(before.StandardUncertaintyPpm, after.StandardUncertaintyPpm),
        };
    }

    private static double Left(double drainedL) => drainedL * (1 - Priors.DrainEfficiency) / Priors.DrainEfficiency;
}
