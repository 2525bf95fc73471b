using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Corrective work on a reservoir, proposed by one person and approved by another.</summary>
public sealed class WorkOrder : IRecord
{
    public Guid Id { get; init; }

    public Guid Token { get; set; }

    public DateTime? WithdrawnAt { get; set; }

    public required string Number { get; init; }

    public required Guid ReservoirId { get; init; }

    public Reservoir? Reservoir { get; set; }

    public required WorkOrderKind Kind { get; set; }

    public WorkOrderState State { get; set; }

    /// <summary>What is to be done.</summary>
    public required string Task { get; set; }

    /// <summary>Why: the reason of the advice, as it stood.</summary>
    public required string Reason { get; set; }

    public required string Author { get; init; }

    public required DateTime CreatedAt { get; init; }

    public DateTime? DueAt { get; set; }

    public string NaturalKey => Number;
}
