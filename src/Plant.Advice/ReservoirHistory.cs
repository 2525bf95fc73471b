using Plant.Physics.Fluids;
using Plant.Physics.Tanks;

namespace Plant.Advice;

/// <summary>All that is recorded of one reservoir and matters for its water; null is "not known". Times are UTC.</summary>
public sealed record ReservoirHistory
{
    /// <summary>Tag of the reservoir.</summary>
    public required string Tag { get; init; }

    /// <summary>The fluid in it.</summary>
    public required FluidSheet Fluid { get; init; }

    /// <summary>What it serves, in the plant's words.</summary>
    public string? Service { get; init; }

    /// <summary>Shape.</summary>
    public TankShape? Shape { get; init; }

    /// <summary>Inside length [mm].</summary>
    public double? LengthMm { get; init; }

    /// <summary>Inside width, or the diameter of a standing cylinder [mm].</summary>
    public double? WidthMm { get; init; }

    /// <summary>Inside height, or the diameter of a lying cylinder [mm].</summary>
    public double? HeightMm { get; init; }

    /// <summary>Volume of the oil [L].</summary>
    public double? OilVolumeL { get; init; }

    /// <summary>Height of the suction mouth above the floor [mm].</summary>
    public double? SuctionHeightMm { get; init; }

    /// <summary>Circulation [L/min].</summary>
    public double? CirculationLPerMin { get; init; }

    /// <summary>Running temperature of the oil [°C].</summary>
    public double? OperatingTemperatureC { get; init; }

    /// <summary>Coldest temperature that the oil stands at [°C].</summary>
    public double? ColdestTemperatureC { get; init; }

    /// <summary>Relative humidity of the headspace [%].</summary>
    public double? HeadspaceRhPercent { get; init; }

    /// <summary>How it breathes.</summary>
    public Breather? Breather { get; init; }

    /// <summary>The reservoir's own limit for water [mg/kg]; null: the fluid's.</summary>
    public double? WaterLimitPpm { get; init; }

    /// <summary>Settled water that may stand before it does harm [L]; null: computed.</summary>
    public double? WaterCapacityL { get; init; }

    /// <summary>Consequence of a failure, 1 (low) to 5.</summary>
    public int? Criticality { get; init; }

    /// <summary>In service since.</summary>
    public DateTime? CommissionedAt { get; init; }

    /// <summary>Laboratory results, a row a replicate, ordered by <see cref="WaterSample.TakenAt"/>.</summary>
    public IReadOnlyList<WaterSample> Samples { get; init; } = [];

    /// <summary>Drains, in order of time.</summary>
    public IReadOnlyList<Drain> Drains { get; init; } = [];

    /// <summary>Top-ups, in order of time.</summary>
    public IReadOnlyList<TopUp> TopUps { get; init; } = [];

    /// <summary>Runs of separators on this reservoir, in order of start.</summary>
    public IReadOnlyList<SeparatorRun> SeparatorRuns { get; init; } = [];

    /// <summary>Online sensor readings, in order of time.</summary>
    public IReadOnlyList<SensorReading> Readings { get; init; } = [];
}

/// <summary>One laboratory result: one replicate of one sample.</summary>
/// <param name="Sample">Code of the sample (bottle).</param>
/// <param name="Replicate">Number of the replicate, from 1.</param>
/// <param name="TakenAt">When the oil was taken (UTC).</param>
/// <param name="ReceivedAt">When the laboratory received it (UTC): nothing was known before; null: at <paramref name="TakenAt"/>.</param>
/// <param name="Point">Where it was taken.</param>
/// <param name="OilTemperatureC">Temperature of the oil when it was taken [°C].</param>
/// <param name="Method">Method.</param>
/// <param name="WaterPpm">Water content [mg/kg].</param>
/// <param name="WaterActivity">Relative saturation [0 to 1].</param>
/// <param name="Crackles">Result of a crackle test.</param>
public sealed record WaterSample(
    string Sample, int Replicate, DateTime TakenAt, DateTime? ReceivedAt, SamplePoint Point, double? OilTemperatureC,
    WaterMethod Method, double? WaterPpm, double? WaterActivity, bool? Crackles);

/// <summary>Water and oil let out of a reservoir.</summary>
/// <param name="At">When (UTC).</param>
/// <param name="WaterL">Water [L].</param>
/// <param name="OilL">Oil lost with it [L].</param>
public readonly record struct Drain(DateTime At, double WaterL, double? OilL);

/// <summary>Oil added.</summary>
/// <param name="At">When (UTC).</param>
/// <param name="OilL">Volume [L].</param>
/// <param name="WaterPpm">Its water content [mg/kg].</param>
public readonly record struct TopUp(DateTime At, double OilL, double? WaterPpm);

/// <summary>A separator at work on the reservoir.</summary>
/// <param name="Kind">Kind of separator.</param>
/// <param name="StartedAt">Start (UTC).</param>
/// <param name="EndedAt">End (UTC); null: still running.</param>
/// <param name="FlowLPerMin">Flow [L/min].</param>
/// <param name="Efficiency">Share of what it can take that it takes in one pass [0 to 1].</param>
/// <param name="PressureKPa">Absolute pressure of a vacuum chamber [kPa].</param>
/// <param name="OilTemperatureC">Oil temperature in the separator [°C].</param>
/// <param name="CapacityL">Water that an absorbent takes up [L].</param>
public sealed record SeparatorRun(
    SeparatorKind Kind, DateTime StartedAt, DateTime? EndedAt, double? FlowLPerMin, double? Efficiency,
    double? PressureKPa, double? OilTemperatureC, double? CapacityL);

/// <summary>One reading of an online sensor.</summary>
/// <param name="At">When (UTC).</param>
/// <param name="OilTemperatureC">Oil temperature [°C].</param>
/// <param name="WaterActivity">Relative saturation [0 to 1].</param>
public readonly record struct SensorReading(DateTime At, double? OilTemperatureC, double? WaterActivity);
