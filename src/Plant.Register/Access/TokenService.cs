using System.Security.Cryptography;
using System.Text;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Access;

/// <summary>API tokens: shown once when made, stored as a hash.</summary>
public sealed class TokenService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer, TimeProvider clock)
{
    /// <summary>Longest life of a token.</summary>
    public const int MaximumDays = 3650;

    /// <summary>Makes a token and returns it; this is the only time that it can be read.</summary>
    public async Task<Outcome<string>> CreateAsync(Actor actor, string? name, string? role, int? days, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.Administer))
        {
            return Outcome<string>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not make tokens");
        }

        var refusals = new List<Refusal>();
        refusals.Required("name", name);
        if (!PlantRole.All.Contains(role))
        {
            refusals.Add(new Refusal("role", role ?? string.Empty, $"must be one of {string.Join(", ", PlantRole.All)}"));
        }

        refusals.Range("days", days, 1, MaximumDays, "days");
        if (refusals.Count > 0)
        {
            return Outcome<string>.Invalid(refusals);
        }

        var plain = "slt_" + Convert.ToHexStringLower(RandomNumberGenerator.GetBytes(32));
        var now = DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds()).UtcDateTime;
        var token = new ApiToken { Id = Guid.CreateVersion7(), Name = name!, Role = role!, Hash = HashOf(plain), CreatedAt = now, ExpiresAt = days is { } life ? now.AddDays(life) : null };
        return await writer.WriteAsync(actor, null, (context, _) =>
        {
            context.Add(token);
            return Task.FromResult(Outcome<string>.Done(plain));
        }, cancellation);
    }

    /// <summary>Who a token speaks for; null where it is unknown, revoked or has expired.</summary>
    public async Task<Actor?> ValidateAsync(string plain, CancellationToken cancellation = default)
    {
        var hash = HashOf(plain);
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var token = await context.ApiTokens.AsNoTracking().FirstOrDefaultAsync(t => t.Hash == hash, cancellation);
        var now = clock.GetUtcNow().UtcDateTime;
        return token is null || token.RevokedAt is not null || token.ExpiresAt <= now ? null : new Actor($"token {token.Name}", new HashSet<string> { token.Role });
    }

    private static string HashOf(string plain) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(plain)));
}
