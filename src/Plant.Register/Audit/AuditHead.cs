namespace Plant.Register.Audit;

/// <summary>Running sum of the content of all records of one kind; locked first by every write, so that the chain has one writer.</summary>
public sealed class AuditHead
{
    /// <summary>Kind of record; the empty kind holds the end of the chain itself.</summary>
    public required string Kind { get; init; }

    /// <summary>Number of records (for the chain: its last sequence number).</summary>
    public long Count { get; set; }

    /// <summary>Sum mod 2²⁵⁶ of the records' content hashes (hex); for the chain: the last hash.</summary>
    public required string Sum { get; set; }
}
