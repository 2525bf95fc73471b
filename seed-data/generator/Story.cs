namespace Skarrow;

/// <summary>Something worth finding: what is changed on one reservoir, and what a reader of the records should be told.</summary>
public sealed record Story(string Tag, double? SinceDay, string Happens, string Says)
{
    /// <summary>How the reservoir differs from its group.</summary>
    public required Func<Unit, Unit> Change { get; init; }
}
