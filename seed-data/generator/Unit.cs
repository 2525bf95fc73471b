namespace Skarrow;

/// <summary>Water that comes in on top of the usual: g/day, rising or falling evenly in its logarithm between two days (days before the end).</summary>
public sealed record Leak(double FromDay, double ToDay, double StartGPerDay, double EndGPerDay);

/// <summary>A stretch of a separator's work on a reservoir, in days before the end; null: still running.</summary>
public sealed record Run(string Separator, string Tag, double FromDay, double? ToDay);

/// <summary>One reservoir: what the register knows, and below it what only the simulation knows.</summary>
public sealed record Unit
{
    public required string Tag { get; init; }

    public required string Name { get; init; }

    public required string Area { get; init; }

    public required string Service { get; init; }

    public required string Fluid { get; init; }

    public required string Shape { get; init; }

    public double? LengthMm { get; init; }

    public double? WidthMm { get; init; }

    public double HeightMm { get; init; }

    public required double OilL { get; init; }

    public double? SuctionMm { get; init; }

    public double? CirculationLPerMin { get; init; }

    public required double OperatingC { get; init; }

    public required double ColdestC { get; init; }

    public double? RhPercent { get; init; }

    public required string Breather { get; init; }

    public double? LimitPpm { get; init; }

    public double? CapacityL { get; init; }

    public int Criticality { get; init; }

    public DateTime CommissionedAt { get; init; }

    public Rhythm Rhythm { get; init; }

    /// <summary>How far the usual ingress lifts the oil above its balance with the air, as a share of the saturation when cold.</summary>
    public double Fill { get; init; }

    /// <summary>Days between samples; 0: none are taken.</summary>
    public double SampleDays { get; init; }

    /// <summary>Days between drain rounds; 0: none.</summary>
    public double DrainDays { get; init; }

    /// <summary>Sampling stopped so many days before the end.</summary>
    public double LastSampleDay { get; init; }

    /// <summary>Draining stopped so many days before the end.</summary>
    public double LastDrainDay { get; init; }

    public IReadOnlyList<Leak> Leaks { get; init; } = [];

    /// <summary>The breather lets the weather in from this day before the end.</summary>
    public double? BreatherFailsDay { get; init; }

    /// <summary>Speed of clearing against that of a healthy oil of the same thickness.</summary>
    public double Clearing { get; init; } = 1;

    /// <summary>Share of new droplets that are too fine to settle in days.</summary>
    public double FineShare { get; init; } = 0.06;

    /// <summary>The first bottle from this day before the end is not clean.</summary>
    public double? DirtyBottleDay { get; init; }

    /// <summary>Online sensor: first day before the end, and hours between readings.</summary>
    public (double FromDay, int Hours)? Sensor { get; init; }

    /// <summary>The sensor gives the same figure from this day before the end.</summary>
    public double? SensorSticksDay { get; init; }

    /// <summary>Litres of water under the oil when the records begin.</summary>
    public double SettledAtStartL { get; init; }
}
