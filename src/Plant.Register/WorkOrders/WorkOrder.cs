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

    public required string Author { get; set; }

    public required DateTime CreatedAt { get; init; }

    public DateTime? DueAt { get; set; }

    /// <summary>The assessment and its working as they stood when the order was drafted (JSON); null for one by hand.</summary>
    public string? Evidence { get; init; }

    public DateTime? SubmittedAt { get; set; }

    public string? DecidedBy { get; set; }

    public DateTime? DecidedAt { get; set; }

    /// <summary>What the last step was said with: why rejected, what was asked back, why withdrawn.</summary>
    public string? Note { get; set; }

    public string? DoneBy { get; set; }

    public DateTime? DoneAt { get; set; }

    /// <summary>What was found.</summary>
    public string? Findings { get; set; }

    public double? DrainedWaterL { get; set; }

    public double? DrainedOilL { get; set; }

    /// <summary>Code of the separator that ran, where one did.</summary>
    public string? Separator { get; set; }

    public double? RunHours { get; set; }

    /// <summary>The sample that verified the work.</summary>
    public string? VerifiedBySample { get; set; }

    public double? FoundPpm { get; set; }

    public double? ExpectedLowPpm { get; set; }

    public double? ExpectedHighPpm { get; set; }

    public string NaturalKey => Number;
}
