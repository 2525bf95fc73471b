namespace Plant.Register.Audit;

/// <summary>Rows that one unit of work wrote in bulk: one audit entry.</summary>
/// <param name="Kind">Kind of record.</param>
/// <param name="Key">What it was: the file's name, the number of readings.</param>
/// <param name="Detail">Counts and digests (JSON).</param>
/// <param name="CountDelta">Records more.</param>
/// <param name="SumDelta">What the sum of contents grew by.</param>
public sealed record RecordBatch(string Kind, string Key, string Detail, long CountDelta, ContentSum SumDelta);
