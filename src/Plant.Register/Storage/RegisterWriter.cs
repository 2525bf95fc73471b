using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.ChangeTracking;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Audit;
using Plant.Register.Reservoirs;

namespace Plant.Register.Storage;

/// <summary>
/// The one way to write: takes the write gate, opens an immediate transaction, runs the change, then in the same transaction keeps what
/// amended records said before (<see cref="Revision"/>), renews their tokens, appends to the audit chain, and commits.
/// </summary>
public sealed class RegisterWriter(IDbContextFactory<PlantDbContext> contexts, IDatabaseEngine engine, TimeProvider clock)
{
    /// <summary>Shortest reason that says something.</summary>
    public const int ReasonLength = 10;

    /// <summary>Raised after a commit.</summary>
    public event Action<RegisterChange>? Changed;

    /// <summary>States which version of a record the caller saw: a save on another one is stale.</summary>
    public static void Expect(PlantDbContext context, IRecord record, Guid token) =>
        context.Entry(record).Property(nameof(IRecord.Token)).OriginalValue = token;

    public async Task<Outcome<T>> WriteAsync<T>(
        Actor actor, string? reason, Func<PlantDbContext, CancellationToken, Task<Outcome<T>>> change, CancellationToken cancellation = default)
    {
        RegisterChange? done = null;
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        await using (var write = await engine.BeginWriteAsync(context, cancellation))
        {
            Outcome<T> outcome;
            if (actor.PersonId is { } person && !await StillMayAsync(context, person, actor, cancellation))
            {
                return Outcome<T>.Refused(OutcomeKind.Forbidden, $"the roles of {actor.Name} have changed: sign in again");
            }

            try
            {
                outcome = await change(context, cancellation);
                if (!outcome.IsDone)
                {
                    return outcome;
                }

                var refusal = await RecordAsync(context, actor, reason, cancellation);
                if (refusal is not null)
                {
                    return Outcome<T>.Invalid(refusal);
                }

                done = RegisterChange.Of(context);
                await context.SaveChangesAsync(cancellation);
                await write.Transaction.CommitAsync(cancellation);
            }
            catch (DbUpdateConcurrencyException stale)
            {
                return Outcome<T>.Refused(OutcomeKind.Stale, await StaleMessageAsync(context, stale, cancellation));
            }
            catch (DbUpdateException failure) when (engine.IsUniqueViolation(failure))
            {
                return Outcome<T>.Refused(OutcomeKind.Conflict, "a record with this key exists already; read it and amend it instead");
            }

            if (done.WholeFleet || done.ReservoirIds.Count > 0)
            {
                Changed?.Invoke(done);
            }

            return outcome;
        }
    }

    /// <summary>Both databases keep times to the millisecond, so what is hashed must not be finer.</summary>
    private static DateTime Milliseconds(DateTimeOffset time) => DateTimeOffset.FromUnixTimeMilliseconds(time.ToUnixTimeMilliseconds()).UtcDateTime;

    /// <summary>A role that was taken away, or an account that was closed, works at the next write.</summary>
    private static async Task<bool> StillMayAsync(PlantDbContext context, Guid person, Actor actor, CancellationToken cancellation)
    {
        var roles = await context.UserRoles.Where(r => r.UserId == person && context.Users.Any(u => u.Id == person && !u.Disabled))
            .Join(context.Roles, r => r.RoleId, role => role.Id, (_, role) => role.Name!).ToListAsync(cancellation);
        return actor.Roles.All(roles.Contains);
    }

    private static async Task<string> StaleMessageAsync(PlantDbContext context, DbUpdateConcurrencyException stale, CancellationToken cancellation)
    {
        var record = (IRecord)stale.Entries[0].Entity;
        var last = await context.AuditEntries.AsNoTracking().Where(e => e.RecordId == record.Id).OrderByDescending(e => e.Sequence)
            .Select(e => new { e.Actor, e.At }).FirstOrDefaultAsync(cancellation);
        return last is null
            ? $"{record.NaturalKey} is no longer there"
            : FormattableString.Invariant($"{record.NaturalKey} was changed by {last.Actor} at {last.At:yyyy-MM-dd HH:mm} UTC; read it again before you change it");
    }

    private async Task<Refusal?> RecordAsync(PlantDbContext context, Actor actor, string? reason, CancellationToken cancellation)
    {
        context.ChangeTracker.DetectChanges();
        var entries = context.ChangeTracker.Entries<IRecord>().Where(e => e.State is EntityState.Modified || (e.State is EntityState.Added && !context.Batched.Contains(e.Entity.Id))).ToList();
        var created = context.ChangeTracker.Entries().Where(e => e.State == EntityState.Added && e.Entity is Area or Site or ApiToken or PlantUser).ToList();
        if (context.ChangeTracker.Entries().Any(e => e.State == EntityState.Deleted && e.Entity is IRecord))
        {
            throw new InvalidOperationException("a record is withdrawn, never deleted");
        }

        if ((reason?.Trim().Length ?? 0) < ReasonLength && entries.Any(e => e.State == EntityState.Modified))
        {
            return new Refusal("reason", reason ?? string.Empty, $"say in at least {ReasonLength} characters why the record is changed");
        }

        if (entries.Count + created.Count + context.Batches.Count == 0)
        {
            return null;
        }

        var now = Milliseconds(clock.GetUtcNow());
        var chain = await AuditChain.OpenAsync(context, now, actor, reason?.Trim(), cancellation);
        foreach (var entry in created)
        {
            var (kind, key) = entry.Entity switch
            {
                Area area => ("area", area.Name),
                Site site => ("site", site.Name),
                ApiToken token => ("token", token.Name),
                PlantUser person => ("person", person.Email ?? person.UserName ?? string.Empty),
                _ => throw new InvalidOperationException(),
            };
            chain.Append("created", kind, null, key, "{}", 0, default);
        }

        foreach (var entry in entries)
        {
            await AppendAsync(context, chain, entry, now, actor, reason, cancellation);
        }

        foreach (var batch in context.Batches)
        {
            chain.Append("imported", batch.Kind, null, batch.Key, batch.Detail, batch.CountDelta, batch.SumDelta);
        }

        // the importer works without automatic detection; the new tokens and the heads of the chain must be seen all the same
        context.ChangeTracker.DetectChanges();

        return null;
    }

    private static async Task AppendAsync(
        PlantDbContext context, AuditChain chain, EntityEntry<IRecord> entry, DateTime now, Actor actor, string? reason, CancellationToken cancellation)
    {
        var record = entry.Entity;
        var kind = RecordContent.KindOf(record);
        record.Token = Guid.CreateVersion7();
        var content = RecordContent.Of(record);
        var delta = default(ContentSum);
        delta.Add(RecordContent.Bytes(content));
        if (entry.State == EntityState.Added)
        {
            chain.Append("created", kind, record.Id, record.NaturalKey, content, 1, delta);
            return;
        }

        var earlier = (IRecord)entry.OriginalValues.ToObject();
        var before = RecordContent.Of(earlier);
        delta.Remove(RecordContent.Bytes(before));
        var number = await context.Revisions.CountAsync(r => r.RecordId == record.Id, cancellation) + 1;
        var revision = new Revision
        {
            Id = Guid.CreateVersion7(),
            Kind = kind,
            RecordId = record.Id,
            Number = number,
            Content = before,
            ReplacedAt = now,
            ReplacedBy = actor.Name,
            Reason = reason!.Trim(),
        };
        context.Revisions.Add(revision);
        var action = record.WithdrawnAt is not null && earlier.WithdrawnAt is null ? "withdrawn" : "amended";
        chain.Append(action, kind, record.Id, record.NaturalKey, content, 0, delta);
        var kept = default(ContentSum);
        kept.Add(RecordContent.Bytes(revision));
        chain.Append("kept", RecordContent.RevisionKind, revision.Id, record.NaturalKey, "{}", 1, kept);
    }
}
