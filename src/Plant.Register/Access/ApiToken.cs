namespace Plant.Register.Access;

/// <summary>An API token: only its hash is stored.</summary>
public sealed class ApiToken
{
    public Guid Id { get; init; }

    public required string Name { get; init; }

    public required string Role { get; init; }

    /// <summary>SHA-256 of the token, lower-case hex.</summary>
    public required string Hash { get; init; }

    public required DateTime CreatedAt { get; init; }

    public DateTime? ExpiresAt { get; init; }

    public DateTime? RevokedAt { get; set; }
}
