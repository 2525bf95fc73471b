using Plant.Advice;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Separators;

/// <summary>A separator: fixed to a reservoir, or portable.</summary>
public sealed class Separator : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required string Code { get; init; }

    /// <summary>The reservoir that a fixed one serves.</summary>
    public Guid? ReservoirId { get; set; }

    public Reservoir? Reservoir { get; set; }

    public required SeparatorKind Kind { get; set; }

    public double? FlowLPerMin { get; set; }

    public double? Efficiency { get; set; }

    public double? CutSizeUm { get; set; }

    public double? PressureKPa { get; set; }

    public double? OilTemperatureC { get; set; }

    public double? CapacityL { get; set; }

    public bool? Portable { get; set; }

    public string NaturalKey => Code;
}
