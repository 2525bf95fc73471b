namespace Plant.Register.Audit;

/// <summary>What a record said before it was amended or withdrawn.</summary>
public sealed class Revision
{
    public required Guid Id { get; init; }

    public required string Kind { get; init; }

    public required Guid RecordId { get; init; }

    /// <summary>1 for the original.</summary>
    public required int Number { get; init; }

    /// <summary>The earlier content (JSON).</summary>
    public required string Content { get; init; }

    /// <summary>When it was replaced.</summary>
    public required DateTime ReplacedAt { get; init; }

    public required string ReplacedBy { get; init; }

    public required string Reason { get; init; }
}
