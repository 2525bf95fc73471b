using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Separators;

/// <summary>A separator at work on a reservoir.</summary>
public sealed class SeparatorRunEvent : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required Guid SeparatorId { get; init; }

    public Separator? Separator { get; set; }

    public required Guid ReservoirId { get; set; }

    public Reservoir? Reservoir { get; set; }

    public required DateTime StartedAt { get; init; }

    /// <summary>Null: still running.</summary>
    public DateTime? EndedAt { get; set; }

    public string NaturalKey => $"{Separator?.Code ?? SeparatorId.ToString()} {StartedAt:yyyy-MM-ddTHH:mm:ss.FFFZ}";
}
