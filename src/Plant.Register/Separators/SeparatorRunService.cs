using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Separators;

/// <summary>Runs of separators.</summary>
public sealed class SeparatorRunService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer)
    : RecordService<SeparatorRunEvent, SeparatorRunFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.RecordWork;

    /// <summary>A new record from checked fields.</summary>
    public static SeparatorRunEvent Make(Guid id, SeparatorRunFields fields, Separator separator, Reservoir reservoir) => new()
    {
        Id = id,
        SeparatorId = separator.Id,
        Separator = separator,
        ReservoirId = reservoir.Id,
        Reservoir = reservoir,
        StartedAt = fields.StartedAt!.Value.UtcDateTime,
        EndedAt = fields.EndedAt?.UtcDateTime,
    };

    public static void ApplyTo(SeparatorRunEvent run, SeparatorRunFields fields, Guid reservoirId)
    {
        run.ReservoirId = reservoirId;
        run.EndedAt = fields.EndedAt?.UtcDateTime;
    }

    public static SeparatorRunFields FieldsOf(SeparatorRunEvent run, string? separator, string? tag) => new()
    {
        Separator = separator,
        Tag = tag,
        StartedAt = new DateTimeOffset(run.StartedAt, TimeSpan.Zero),
        EndedAt = run.EndedAt is { } time ? new DateTimeOffset(time, TimeSpan.Zero) : null,
    };

    protected override IQueryable<SeparatorRunEvent> Query(PlantDbContext context) => context.SeparatorRuns.Include(r => r.Separator).Include(r => r.Reservoir);

    protected override IQueryable<SeparatorRunEvent> OfTag(IQueryable<SeparatorRunEvent> query, string tag) => query.Where(r => r.Reservoir!.Tag == tag);

    protected override Task<SeparatorRunEvent?> FindByFieldsAsync(PlantDbContext context, SeparatorRunFields fields, References references, CancellationToken cancellation)
    {
        var (separator, at) = (references.Separator!.Id, fields.StartedAt!.Value.UtcDateTime);
        return Query(context).FirstOrDefaultAsync(r => r.SeparatorId == separator && r.StartedAt == at, cancellation);
    }

    protected override async Task<References> ResolveAsync(PlantDbContext context, SeparatorRunFields fields, List<Refusal> refusals, CancellationToken cancellation)
    {
        var separator = await context.Separators.FirstOrDefaultAsync(s => s.Code == fields.Separator && s.WithdrawnAt == null, cancellation);
        if (separator is null)
        {
            refusals.Add(new Refusal("separator", fields.Separator ?? string.Empty, "names no separator of the register: enter it first, or correct the code"));
        }

        return new References(Separator: separator, Reservoir: await References.ReservoirAsync(context, fields.Tag, refusals, cancellation));
    }

    protected override SeparatorRunEvent Make(Guid id, SeparatorRunFields fields, References references, Actor actor) =>
        Make(id, fields, references.Separator!, references.Reservoir!);

    protected override void Apply(SeparatorRunEvent record, SeparatorRunFields fields, References references)
    {
        ApplyTo(record, fields, references.Reservoir!.Id);
        record.Reservoir = references.Reservoir;
    }

    protected override SeparatorRunFields ToFields(SeparatorRunEvent record) => FieldsOf(record, record.Separator?.Code, record.Reservoir?.Tag);

    protected override void CheckKey(SeparatorRunEvent record, SeparatorRunFields fields, List<Refusal> refusals)
    {
        KeyStays(refusals, "separator", fields.Separator, record.Separator!.Code);
        KeyStays(refusals, "startedAt", fields.StartedAt!.Value.UtcDateTime.ToString("O", CultureInfo.InvariantCulture), record.StartedAt.ToString("O", CultureInfo.InvariantCulture));
    }
}
