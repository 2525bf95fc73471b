using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Oil added to a reservoir.</summary>
public sealed class TopUpEvent : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required Guid ReservoirId { get; init; }

    public Reservoir? Reservoir { get; set; }

    public required DateTime AddedAt { get; init; }

    public required double OilL { get; set; }

    public double? WaterPpm { get; set; }

    public string NaturalKey => $"{Reservoir?.Tag ?? ReservoirId.ToString()} {AddedAt:yyyy-MM-ddTHH:mm:ss.FFFZ}";
}
