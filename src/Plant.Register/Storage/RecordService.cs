using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Audit;

namespace Plant.Register.Storage;

/// <summary>Read, create, amend and withdraw records of one kind. Roles are checked here, whoever calls.</summary>
public abstract class RecordService<TRecord, TFields>(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer)
    where TRecord : class, IRecord
    where TFields : class, IFields
{
    /// <summary>Most rows on a page.</summary>
    public const int PageLimit = 500;

    protected IDbContextFactory<PlantDbContext> Contexts => contexts;

    protected RegisterWriter Writer => writer;

    /// <summary>Who may write records of this kind.</summary>
    protected abstract Duty WriteDuty { get; }

    public async Task<Outcome<Page<Recorded<TFields>>>> ListAsync(
        Actor actor, string? tag, int limit, Guid? cursor, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.Read))
        {
            return Forbidden<Page<Recorded<TFields>>>(actor, "read the register");
        }

        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var query = Query(context).AsNoTracking().Where(record => record.WithdrawnAt == null);
        if (tag is not null)
        {
            query = OfTag(query, tag);
        }

        if (cursor is { } after)
        {
            query = query.Where(record => record.Id > after);
        }

        var count = Math.Clamp(limit, 1, PageLimit);
        var rows = await query.OrderBy(record => record.Id).Take(count + 1).ToListAsync(cancellation);
        var page = rows.Take(count).Select(Read).ToList();
        return Outcome<Page<Recorded<TFields>>>.Done(new(page, rows.Count > count ? page[^1].Id : null));
    }

    /// <summary>Reads one record by its id, or by its key where the kind has a short one.</summary>
    public async Task<Outcome<Recorded<TFields>>> GetAsync(Actor actor, string idOrKey, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.Read))
        {
            return Forbidden<Recorded<TFields>>(actor, "read the register");
        }

        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var record = await FindAsync(context, idOrKey, cancellation);
        return record is null or { WithdrawnAt: not null } ? NotFound(idOrKey) : Outcome<Recorded<TFields>>.Done(Read(record));
    }

    /// <summary>Creates a record. The same request repeated has no second effect and ends the same.</summary>
    public Task<Outcome<Recorded<TFields>>> CreateAsync(Actor actor, Guid? id, TFields fields, CancellationToken cancellation = default) =>
        WriteAsync(actor, null, fields, async (context, references, stop) =>
        {
            var recordId = id ?? Guid.CreateVersion7();
            var known = await Query(context).FirstOrDefaultAsync(record => record.Id == recordId, stop) ?? await FindByFieldsAsync(context, fields, references, stop);
            var made = Make(recordId, fields, references, actor);
            if (known is null)
            {
                await PrepareAsync(context, made, stop);
                context.Add(made);
                return Outcome<TRecord>.Done(made);
            }

            return known.WithdrawnAt is null && Same(known, made)
                ? Outcome<TRecord>.Done(known)
                : Outcome<TRecord>.Refused(OutcomeKind.Conflict, $"{known.NaturalKey} is recorded already with other values; amend it and say why");
        }, cancellation);

    /// <summary>Corrects a record: what it said before stays readable.</summary>
    public Task<Outcome<Recorded<TFields>>> AmendAsync(
        Actor actor, string idOrKey, Guid token, TFields fields, string? reason, CancellationToken cancellation = default) =>
        WriteAsync(actor, reason, fields, async (context, references, stop) =>
        {
            var record = await FindAsync(context, idOrKey, stop);
            if (record is null)
            {
                return Outcome<TRecord>.Refused(OutcomeKind.NotFound, $"there is no {idOrKey}");
            }

            if (MayAmend(record, actor) is { } refusal)
            {
                return Outcome<TRecord>.Refused(OutcomeKind.Forbidden, refusal);
            }

            var refusals = new List<Refusal>();
            CheckKey(record, fields, refusals);
            if (refusals.Count > 0)
            {
                return Outcome<TRecord>.Invalid(refusals);
            }

            RegisterWriter.Expect(context, record, token);
            Apply(record, fields, references);
            Amended(record, actor);
            record.WithdrawnAt = null;
            if (context.Entry(record).State == EntityState.Unchanged && record.Token != token)
            {
                return Outcome<TRecord>.Refused(OutcomeKind.Stale, $"{record.NaturalKey} was changed since it was read; read it again");
            }

            return Outcome<TRecord>.Done(record);
        }, cancellation);

    /// <summary>Withdraws a record: it counts for nothing and stays readable.</summary>
    public async Task<Outcome<Recorded<TFields>>> WithdrawAsync(Actor actor, string idOrKey, Guid token, string? reason, DateTime now, CancellationToken cancellation = default)
    {
        if (!actor.May(WriteDuty))
        {
            return Forbidden<Recorded<TFields>>(actor, "withdraw records of this kind");
        }

        var outcome = await writer.WriteAsync(actor, reason, async (context, stop) =>
        {
            var record = await FindAsync(context, idOrKey, stop);
            if (record is null)
            {
                return Outcome<TRecord>.Refused(OutcomeKind.NotFound, $"there is no {idOrKey}");
            }

            if (MayAmend(record, actor) is { } refusal)
            {
                return Outcome<TRecord>.Refused(OutcomeKind.Forbidden, refusal);
            }

            if (record.WithdrawnAt is null)
            {
                RegisterWriter.Expect(context, record, token);
                record.WithdrawnAt = now.AddTicks(-(now.Ticks % TimeSpan.TicksPerMillisecond));
            }

            return Outcome<TRecord>.Done(record);
        }, cancellation);
        return Map(outcome);
    }

    /// <summary>Records of this kind with what their columns name.</summary>
    protected abstract IQueryable<TRecord> Query(PlantDbContext context);

    protected abstract IQueryable<TRecord> OfTag(IQueryable<TRecord> query, string tag);

    /// <summary>The record with this short key, where the kind has one.</summary>
    protected virtual Task<TRecord?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) => Task.FromResult<TRecord?>(null);

    /// <summary>The record with the key that the fields name.</summary>
    protected abstract Task<TRecord?> FindByFieldsAsync(PlantDbContext context, TFields fields, References references, CancellationToken cancellation);

    /// <summary>Finds what the fields name (reservoir, fluid, separator), or refuses.</summary>
    protected abstract Task<References> ResolveAsync(PlantDbContext context, TFields fields, List<Refusal> refusals, CancellationToken cancellation);

    protected abstract TRecord Make(Guid id, TFields fields, References references, Actor actor);

    /// <summary>Last step before a new record is added.</summary>
    protected virtual Task PrepareAsync(PlantDbContext context, TRecord record, CancellationToken cancellation) => Task.CompletedTask;

    protected abstract void Apply(TRecord record, TFields fields, References references);

    protected abstract TFields ToFields(TRecord record);

    /// <summary>The key of a record does not change; what it is called is what it is.</summary>
    protected abstract void CheckKey(TRecord record, TFields fields, List<Refusal> refusals);

    /// <summary>Why this actor may not amend or withdraw this record; null where it may.</summary>
    protected virtual string? MayAmend(TRecord record, Actor actor) => null;

    /// <summary>What else an amendment changes.</summary>
    protected virtual void Amended(TRecord record, Actor actor)
    {
    }

    protected static void KeyStays(List<Refusal> refusals, string field, string? given, string recorded)
    {
        if (given != recorded)
        {
            refusals.Add(new Refusal(field, given ?? string.Empty, $"is the key and stays {recorded}: withdraw this record and make another one"));
        }
    }

    private static Outcome<T> Forbidden<T>(Actor actor, string what) => Outcome<T>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not {what}");

    private static Outcome<Recorded<TFields>> NotFound(string key) => Outcome<Recorded<TFields>>.Refused(OutcomeKind.NotFound, $"there is no {key}");

    /// <summary>Equal in every column: what a repeated request makes anew does not count.</summary>
    private bool Same(TRecord known, TRecord made) => JsonSerializer.Serialize(ToFields(known)) == JsonSerializer.Serialize(ToFields(made));

    private Recorded<TFields> Read(TRecord record) => new(record.Id, record.Token, ToFields(record), record.WithdrawnAt is not null);

    private async Task<TRecord?> FindAsync(PlantDbContext context, string idOrKey, CancellationToken cancellation) =>
        Guid.TryParse(idOrKey, out var id)
            ? await Query(context).FirstOrDefaultAsync(record => record.Id == id, cancellation)
            : await FindByKeyAsync(context, idOrKey, cancellation);

    private async Task<Outcome<Recorded<TFields>>> WriteAsync(
        Actor actor, string? reason, TFields fields, Func<PlantDbContext, References, CancellationToken, Task<Outcome<TRecord>>> change, CancellationToken cancellation)
    {
        if (!actor.May(WriteDuty))
        {
            return Forbidden<Recorded<TFields>>(actor, "write records of this kind");
        }

        var refusals = new List<Refusal>();
        fields.Check(refusals);
        if (refusals.Count > 0)
        {
            return Outcome<Recorded<TFields>>.Invalid(refusals);
        }

        return Map(await writer.WriteAsync(actor, reason, async (context, stop) =>
        {
            var references = await ResolveAsync(context, fields, refusals, stop);
            return refusals.Count > 0 ? Outcome<TRecord>.Invalid(refusals) : await change(context, references, stop);
        }, cancellation));
    }

    private Outcome<Recorded<TFields>> Map(Outcome<TRecord> outcome) =>
        outcome.IsDone ? Outcome<Recorded<TFields>>.Done(Read(outcome.Value!)) : new(outcome.Kind, null, outcome.Refusals, outcome.Message);
}
