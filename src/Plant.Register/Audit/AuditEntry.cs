namespace Plant.Register.Audit;

/// <summary>One line of the audit chain: who did what when and why. Each carries the hash of the one before it.</summary>
public sealed class AuditEntry
{
    /// <summary>Position in the chain, from 1 without gaps.</summary>
    public required long Sequence { get; init; }

    public required DateTime At { get; init; }

    public required string Actor { get; init; }

    /// <summary>created, amended, withdrawn, imported, signed-in …</summary>
    public required string Action { get; init; }

    /// <summary>Kind of record: reservoir, fluid, sample …</summary>
    public required string Kind { get; init; }

    public Guid? RecordId { get; init; }

    /// <summary>The record's natural key, or for a batch what it was.</summary>
    public required string Key { get; init; }

    public string? Reason { get; init; }

    /// <summary>Content after the change (JSON), or for a batch its counts and digests.</summary>
    public required string Detail { get; init; }

    /// <summary>Sum of the content hashes of all records of this kind after the change (hex): binds the tables to the chain.</summary>
    public required string ContentSum { get; init; }

    public required string PreviousHash { get; init; }

    public required string Hash { get; init; }
}
