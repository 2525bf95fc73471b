using System.Globalization;
using Plant.Advice.Dehydration;
using Plant.Advice.Drains;
using Plant.Advice.Ledger;
using Plant.Physics;
using Plant.Physics.Fluids;

namespace Plant.Advice;

/// <summary>Puts the evidence into the columns of an assessment and into words.</summary>
internal static class Statement
{
    private const double ActWithinDays = 30;
    private const double WorthTelling = 0.05;

    public static Assessment Of(Evidence evidence, Working? working)
    {
        var condition = Judge(evidence);
        var (dissolved, emulsified) = Split(evidence);
        var (dehydration, why) = Dehydrate(evidence, condition, emulsified ?? 0);
        if (dehydration is not null)
        {
            working?.Add("dehydration", why, null, "", "common practice");
        }

        var last = Newest(evidence);
        var drainsSoon = evidence.Plan.By is { } by && (by - evidence.AsOf).TotalDays <= ActWithinDays;
        return new Assessment
        {
            Tag = evidence.History.Tag,
            AsOf = evidence.AsOf,
            Condition = condition,
            ProbabilityFreeNow = evidence.FreeNow,
            ProbabilityFreeColdest = evidence.FreeColdest,
            WaterPpm = evidence.Water?.WaterPpm,
            WaterPpmLow90 = evidence.Water?.Low90Ppm,
            WaterPpmHigh90 = evidence.Water?.High90Ppm,
            SaturationNowPpm = evidence.Oil.SaturationPpm,
            SaturationColdestPpm = evidence.Oil.SaturationColdestPpm,
            DissolvedPpm = dissolved,
            EmulsifiedPpm = emulsified,
            SettledWaterL = evidence.Settled?.MedianL,
            SettledWaterLLow90 = evidence.Settled?.Low90L,
            SettledWaterLHigh90 = evidence.Settled?.High90L,
            IngressGPerDay = evidence.Ingress?.MedianGPerDay,
            IngressGPerDayLow90 = evidence.Ingress?.Low90GPerDay,
            IngressGPerDayHigh90 = evidence.Ingress?.High90GPerDay,
            IngressChangedAt = evidence.Ingress?.ChangedAt,
            WaterGoes = evidence.Oil.WaterGoes,
            DrainIntervalDays = evidence.Plan.IntervalDays,
            DrainBy = evidence.Plan.By,
            DrainByEarliest = evidence.Plan.Earliest,
            DrainByLatest = evidence.Plan.Latest,
            DehydrateBy = evidence.DehydrateBy,
            Dehydration = dehydration,
            Reason = Reason(evidence, condition, dehydration),
            Basis = last is null ? Basis.NoSamples : evidence.Oil.Fluid is null or { SolubilityIsFamilyDefault: true } ? Basis.FamilyDefault : Basis.Measured,
            CapacityL = evidence.CapacityL,
            LimitPpm = evidence.LimitPpm,
            LastSampleAt = last,
            SampleOverdue = Sampling.IsOverdue(evidence.History, evidence.AsOf),
            Actions = Actions(evidence, dehydration, why, drainsSoon),
            Cautions = Cautions.For(evidence.History, drainsSoon, dehydration),
        };
    }

    private static DateTime? Newest(Evidence evidence)
    {
        var observed = evidence.Observations.Count > 0 ? evidence.Observations[^1].At : (DateTime?)null;
        var sampled = evidence.History.Samples.Count > 0 ? evidence.History.Samples[^1].TakenAt : (DateTime?)null;
        return observed > sampled || sampled is null ? observed : sampled;
    }

    private static Condition Judge(Evidence evidence) =>
        evidence.FreeNow is null ? Condition.Unknown
        : evidence.FreeNow >= 0.5 ? Condition.FreeWater
        : evidence.FreeColdest >= 0.5 ? Condition.FreeWaterWhenCold
        : evidence.AboveNearSaturation > 0.5 ? Condition.NearSaturation
        : Condition.Dry;

    private static (double? Dissolved, double? Emulsified) Split(Evidence evidence)
    {
        if (evidence.Water is not { } water)
        {
            return (null, null);
        }

        if (evidence.Oil.SaturationPpm is not { } saturation)
        {
            return evidence.Oil.Fluid is { HasSaturation: false } ? (water.WaterPpm, 0) : (null, null);
        }

        var dissolved = Math.Min(water.WaterPpm, saturation);
        return (dissolved, water.WaterPpm - dissolved);
    }

    private static (SeparatorKind? Kind, string Why) Dehydrate(Evidence evidence, Condition condition, double emulsified)
    {
        var soon = evidence.DehydrateBy is { } by && (by - evidence.AsOf).TotalDays <= ActWithinDays;
        var hazy = condition == Condition.FreeWater && emulsified > 0.1 * evidence.Oil.SaturationPpm;
        if (evidence.Water is null || !(soon || hazy))
        {
            return (null, "");
        }

        var target = soon ? 0.7 * evidence.LimitPpm!.Value : evidence.Oil.SaturationPpm!.Value;
        var (kind, why) = MethodChoice.For(evidence.Oil, target, emulsified);
        return Confirmed(evidence, new MethodTask(evidence.Water.WaterPpm, target, evidence.Ingress?.MedianGPerDay ?? 0, evidence.Settled?.MedianL ?? 0), kind, why);
    }

    /// <summary>The first choice where the physics says that it gets there; else the cheapest that does.</summary>
    private static (SeparatorKind? Kind, string Why) Confirmed(Evidence evidence, MethodTask task, SeparatorKind? kind, string why)
    {
        var options = MethodComparison.Of(evidence.Oil, task);
        if (kind is null || options.Any(o => o.Kind == kind && o.Works) || options.FirstOrDefault(o => o.Works && o.Kind is not null) is not { } other)
        {
            return (kind, why);
        }

        var failed = options.First(o => o.Kind == kind);
        return (other.Kind, $"{MethodChoice.Words(kind.Value)} {failed.Out}");
    }

    private static string Reason(Evidence evidence, Condition condition, SeparatorKind? dehydration)
    {
        var text = new List<string>();
        var water = evidence.Water;
        if (water is null)
        {
            text.Add(condition == Condition.FreeWater && CrackleTest.Newest(evidence.History.Samples, evidence.AsOf) == true
                ? "The newest sample crackled on the hot plate: it holds undissolved water; how much is not known."
                : evidence.Settled is { MedianL: > 0.1 } found
                ? $"No usable sample; the drains say about {Litres(found.MedianL)} of water stand in it."
                : "No usable sample: nothing to go by. Take one from the return line while it runs.");
        }
        else if (evidence.Oil.Fluid is { HasSaturation: false })
        {
            text.Add($"Water-soluble polyalkylene glycol without a solubility curve: it has no saturation, so free water cannot be told; {Estimate(water)} in it{Against(evidence)}.");
        }
        else if (evidence.Oil.SaturationPpm is not { } saturation)
        {
            text.Add($"{Estimate(water)} in the oil, but its running temperature is not known: enter it to compare with saturation.");
        }
        else
        {
            text.Add(condition switch
            {
                Condition.FreeWater when evidence.Settled is { MedianL: > 0 } settled && (settled.MedianL > 0.05 || water.WaterPpm <= saturation) =>
                    $"About {Standing(settled, evidence.Oil.WaterGoes)}; {Estimate(water)} in it against {Ppm(saturation)} that it holds.",
                Condition.FreeWater when water.WaterPpm <= saturation => $"{Estimate(water)} in the oil against {Ppm(saturation)} that it holds while running; undissolved water is more likely than not.",
                Condition.FreeWater => $"{Estimate(water)} in the oil, more than the {Ppm(saturation)} that it holds while running.",
                Condition.FreeWaterWhenCold => $"{Estimate(water)} stay dissolved while it runs ({Ppm(saturation)}), but cold it holds only {Ppm(evidence.Oil.SaturationColdestPpm!.Value)}.",
                Condition.NearSaturation => $"{Estimate(water)} are close to the {Ppm(evidence.Oil.SaturationColdestPpm!.Value)} that the oil holds when cold.",
                _ => $"{Estimate(water)} are below the {Ppm(evidence.Oil.SaturationColdestPpm!.Value)} that the oil holds when cold.",
            });
        }

        if (evidence.Ingress is { ChangedAt: { } changed, EarlierGPerDay: { } earlier } ingress)
        {
            text.Add(string.Create(CultureInfo.InvariantCulture, $"Ingress rose to {Significant.Of(ingress.MedianGPerDay, ingress.Low90GPerDay, ingress.High90GPerDay).Value} g/day about {changed:d MMM yyyy}, from {Significant.Of(earlier)}: look for a leak."));
        }

        if (dehydration is not null && evidence is { DehydrateBy: { } passed, LimitPpm: { } limit } && water is not null)
        {
            text.Add(water.WaterPpm > limit ? $"Its limit of {Ppm(limit)} is passed."
                : passed <= evidence.AsOf ? $"It may be above its limit of {Ppm(limit)} already."
                : string.Create(CultureInfo.InvariantCulture, $"It may pass its limit of {Ppm(limit)} by {passed:d MMM yyyy}."));
        }

        if (evidence.CapacityL is null && evidence.Settled is { MedianL: > WorthTelling })
        {
            text.Add("No drain date: its capacity for settled water is not known.");
        }

        if (evidence.Plan.By is not null || dehydration is not null)
        {
            text.Add(Cautions.Advisory);
        }

        return string.Join(" ", text);
    }

    private static List<string> Actions(Evidence evidence, SeparatorKind? dehydration, string why, bool drainsSoon)
    {
        var actions = new List<string>();
        var floats = evidence.Oil.WaterGoes == WaterDirection.Up;
        if (evidence.Plan.By is { } by)
        {
            var interval = evidence.Plan.IntervalDays is { } days ? string.Create(CultureInfo.InvariantCulture, $", then every {Math.Max(1, Math.Floor(days)):0} days") : "";
            var when = by <= evidence.AsOf ? "now" : string.Create(CultureInfo.InvariantCulture, $"by {by:d MMM yyyy}");
            actions.Add(floats ? $"Skim the water off the top {when}{interval}." : $"Drain {when}{interval}.");
            if (evidence.Plan.IntervalDays < 7)
            {
                actions.Add("It fills within days: no date can keep it. Fit a level alarm or an automatic drain, and find where the water comes from.");
            }
        }

        if (evidence.CapacityL is null && evidence.Settled is { MedianL: > WorthTelling })
        {
            actions.Add("Enter the tank's dimensions and suction height, or how much water may stand: without them no drain date can be told.");
        }

        if (evidence.Oil.WaterGoes == WaterDirection.Neither && evidence.FreeColdest >= 0.5)
        {
            actions.Add("Water and fluid weigh the same here: do not count on draining.");
        }

        if (evidence.Ingress?.ChangedAt is not null)
        {
            actions.Add("Find and repair the leak: cooler, gland, breather, in the order of what is nearest.");
        }

        if (dehydration is { } kind)
        {
            actions.Add($"Dehydrate with {MethodChoice.Words(kind)}{(drainsSoon ? " after the drain" : "")}: {why}.");
        }

        if (evidence.Water is { NewestContradicts: true })
        {
            actions.Add("Take another sample: the newest result is far above those before it, so it is a dirty bottle or the start of a leak.");
        }

        if (Sampling.IsOverdue(evidence.History, evidence.AsOf))
        {
            actions.Add("Take a sample from the return line while it runs: the last one is too old to go by.");
        }

        if (actions.Count == 0)
        {
            actions.Add("Nothing now; sample as planned.");
        }

        return actions;
    }

    private static string Against(Evidence evidence) => evidence.LimitPpm is { } limit ? $" against a limit of {Ppm(limit)}" : "";

    private static string Standing(SettledWater settled, WaterDirection? goes)
    {
        var (value, low, high) = Significant.Of(settled.MedianL, settled.Low90L, settled.High90L);
        return $"{value} L of water {(goes == WaterDirection.Up ? "float on" : "stand under")} the oil ({low} to {high} L)";
    }

    private static string Estimate(OilWater water) => $"{Significant.Of(water.WaterPpm, water.Low90Ppm, water.High90Ppm).Value} ppm";

    private static string Ppm(double value) => $"{Significant.Of(value)} ppm";

    private static string Litres(double value) => $"{Significant.Of(value)} L";
}
