using Plant.Advice;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Laboratory;

/// <summary>A bottle of oil on its way to the laboratory: what the label on it stands for.</summary>
public sealed class Bottle : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required string Code { get; init; }

    public required Guid ReservoirId { get; set; }

    public Reservoir? Reservoir { get; set; }

    public required SamplePoint Point { get; set; }

    public required DateTime TakenAt { get; set; }

    public double? OilTemperatureC { get; set; }

    public required string TakenBy { get; init; }

    public string NaturalKey => Code;
}
