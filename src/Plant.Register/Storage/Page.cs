namespace Plant.Register.Storage;

/// <summary>A page of a list.</summary>
/// <param name="Items">The rows.</param>
/// <param name="NextCursor">Where the next page begins; null on the last.</param>
public sealed record Page<T>(IReadOnlyList<T> Items, Guid? NextCursor);

/// <summary>A record as it is read: what it is called, which version, its columns.</summary>
public sealed record Recorded<TFields>(Guid Id, Guid Token, TFields Fields, bool Withdrawn);
