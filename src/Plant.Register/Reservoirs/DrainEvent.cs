using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Water and oil let out of a reservoir.</summary>
public sealed class DrainEvent : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required Guid ReservoirId { get; init; }

    public Reservoir? Reservoir { get; set; }

    public required DateTime DrainedAt { get; init; }

    public required double WaterL { get; set; }

    public double? OilL { get; set; }

    public string NaturalKey => $"{Reservoir?.Tag ?? ReservoirId.ToString()} {DrainedAt:yyyy-MM-ddTHH:mm:ss.FFFZ}";
}
