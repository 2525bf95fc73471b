using Plant.Physics.Fluids;

namespace Plant.Advice;

/// <summary>What the records of one reservoir mean as of a time: where its water is, how fast more comes, what to do. Null is "not known".</summary>
public sealed record Assessment
{
    /// <summary>Tag of the reservoir.</summary>
    public required string Tag { get; init; }

    /// <summary>The time it is judged at (UTC).</summary>
    public required DateTime AsOf { get; init; }

    /// <summary>State.</summary>
    public required Condition Condition { get; init; }

    /// <summary>Chance that undissolved water is anywhere in the reservoir now [0 to 1].</summary>
    public double? ProbabilityFreeNow { get; init; }

    /// <summary>The same after standing at the coldest temperature [0 to 1].</summary>
    public double? ProbabilityFreeColdest { get; init; }

    /// <summary>Water in the circulating oil [mg/kg].</summary>
    public double? WaterPpm { get; init; }

    /// <summary>Lower end of its central 90 % interval [mg/kg].</summary>
    public double? WaterPpmLow90 { get; init; }

    /// <summary>Upper end of its central 90 % interval [mg/kg].</summary>
    public double? WaterPpmHigh90 { get; init; }

    /// <summary>Saturation at the running temperature [mg/kg].</summary>
    public double? SaturationNowPpm { get; init; }

    /// <summary>Saturation at the coldest temperature [mg/kg].</summary>
    public double? SaturationColdestPpm { get; init; }

    /// <summary>Dissolved part [mg/kg].</summary>
    public double? DissolvedPpm { get; init; }

    /// <summary>Emulsified part [mg/kg].</summary>
    public double? EmulsifiedPpm { get; init; }

    /// <summary>Settled (or floating) water [L].</summary>
    public double? SettledWaterL { get; init; }

    /// <summary>Lower end of its 90 % interval [L].</summary>
    public double? SettledWaterLLow90 { get; init; }

    /// <summary>Upper end of its 90 % interval [L].</summary>
    public double? SettledWaterLHigh90 { get; init; }

    /// <summary>Water coming in [g/day].</summary>
    public double? IngressGPerDay { get; init; }

    /// <summary>Lower end of its 90 % interval [g/day].</summary>
    public double? IngressGPerDayLow90 { get; init; }

    /// <summary>Upper end of its 90 % interval [g/day].</summary>
    public double? IngressGPerDayHigh90 { get; init; }

    /// <summary>When the ingress changed, where it did (UTC).</summary>
    public DateTime? IngressChangedAt { get; init; }

    /// <summary>Which way undissolved water goes at the running temperature.</summary>
    public WaterDirection? WaterGoes { get; init; }

    /// <summary>How long a drained reservoir may go by the planning rule [days]; null: a year or more.</summary>
    public double? DrainIntervalDays { get; init; }

    /// <summary>When the next drain is due by the planning rule (UTC); null: not within a year.</summary>
    public DateTime? DrainBy { get; init; }

    /// <summary>When the circulating water passes its limit with a chance of 5 % (UTC); null: not within a year.</summary>
    public DateTime? DehydrateBy { get; init; }

    /// <summary>The dehydration advised, or null.</summary>
    public SeparatorKind? Dehydration { get; init; }

    /// <summary>One sentence with the numbers that decide.</summary>
    public required string Reason { get; init; }

    /// <summary>What it rests on.</summary>
    public required Basis Basis { get; init; }

    /// <summary>Earliest date that the drain may be due within the 90 % interval of what is known (UTC).</summary>
    public DateTime? DrainByEarliest { get; init; }

    /// <summary>Latest date that the drain may be due within the 90 % interval of what is known (UTC).</summary>
    public DateTime? DrainByLatest { get; init; }

    /// <summary>The capacity for settled water that was used [L].</summary>
    public double? CapacityL { get; init; }

    /// <summary>The limit for water in the oil that was used [mg/kg].</summary>
    public double? LimitPpm { get; init; }

    /// <summary>When the newest sample that counts was taken (UTC).</summary>
    public DateTime? LastSampleAt { get; init; }

    /// <summary>True where the sampling is behind the reservoir's own rhythm.</summary>
    public bool SampleOverdue { get; init; }

    /// <summary>What to do, in order, each a plain sentence.</summary>
    public IReadOnlyList<string> Actions { get; init; } = [];

    /// <summary>Cautions that go with the actions.</summary>
    public IReadOnlyList<string> Cautions { get; init; } = [];
}
