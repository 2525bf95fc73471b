using Plant.Advice;
using Plant.Physics.Tanks;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>A reservoir: the columns of reservoirs.csv, each group of values with its origin.</summary>
public sealed class Reservoir : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    /// <summary>Short number that keys its sensor readings.</summary>
    public int SeriesNumber { get; set; }

    public required string Tag { get; init; }

    public required string Name { get; set; }

    public Guid? AreaId { get; set; }

    public Area? Area { get; set; }

    public string? Service { get; set; }

    public required Guid FluidId { get; set; }

    public Fluid? Fluid { get; set; }

    public TankShape? Shape { get; set; }

    public double? LengthMm { get; set; }

    public double? WidthMm { get; set; }

    public double? HeightMm { get; set; }

    public double? OilVolumeL { get; set; }

    public double? SuctionHeightMm { get; set; }

    public double? CirculationLPerMin { get; set; }

    public double? OperatingTemperatureC { get; set; }

    public double? ColdestTemperatureC { get; set; }

    public double? HeadspaceRhPercent { get; set; }

    public Breather? Breather { get; set; }

    public double? WaterLimitPpm { get; set; }

    public double? WaterCapacityL { get; set; }

    public int? Criticality { get; set; }

    public DateTime? CommissionedAt { get; set; }

    public ValueOrigin DimensionsOrigin { get; set; }

    public ValueOrigin TemperaturesOrigin { get; set; }

    public ValueOrigin LimitOrigin { get; set; }

    public ValueOrigin CapacityOrigin { get; set; }

    public string NaturalKey => Tag;
}
