using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>What a work order says; its state is moved by its own steps, not by writing it.</summary>
public sealed record WorkOrderFields : IFields
{
    public string? Number { get; set; }

    public string? Tag { get; set; }

    public string? Kind { get; set; }

    public string? Task { get; set; }

    public string? Reason { get; set; }

    public DateTimeOffset? DueAt { get; set; }

    /// <summary>Read only.</summary>
    public string? State { get; set; }

    /// <summary>Read only.</summary>
    public string? Author { get; set; }

    /// <summary>Read only.</summary>
    public DateTimeOffset? SubmittedAt { get; set; }

    /// <summary>Read only.</summary>
    public string? DecidedBy { get; set; }

    /// <summary>Read only.</summary>
    public DateTimeOffset? DecidedAt { get; set; }

    /// <summary>Read only.</summary>
    public string? Note { get; set; }

    /// <summary>Read only.</summary>
    public string? DoneBy { get; set; }

    /// <summary>Read only.</summary>
    public DateTimeOffset? DoneAt { get; set; }

    /// <summary>Read only.</summary>
    public string? Findings { get; set; }

    /// <summary>Read only.</summary>
    public double? DrainedWaterL { get; set; }

    /// <summary>Read only.</summary>
    public double? DrainedOilL { get; set; }

    /// <summary>Read only.</summary>
    public string? Separator { get; set; }

    /// <summary>Read only.</summary>
    public double? RunHours { get; set; }

    /// <summary>Read only.</summary>
    public string? VerifiedBySample { get; set; }

    /// <summary>Read only.</summary>
    public double? FoundPpm { get; set; }

    /// <summary>Read only.</summary>
    public double? ExpectedLowPpm { get; set; }

    /// <summary>Read only.</summary>
    public double? ExpectedHighPpm { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("number", Number, 40);
        refusals.Required("tag", Tag);
        refusals.Required("kind", Kind);
        refusals.OneOf<WorkOrderKind>("kind", string.IsNullOrWhiteSpace(Kind) ? null : Kind);
        refusals.Required("task", Task, 2000);
        refusals.Required("reason", Reason, 2000);
        refusals.Time("dueAt", DueAt);
    }
}
