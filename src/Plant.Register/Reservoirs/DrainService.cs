using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Drains.</summary>
public sealed class DrainService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer) : RecordService<DrainEvent, DrainFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.RecordWork;

    /// <summary>A new record from checked fields.</summary>
    public static DrainEvent Make(Guid id, DrainFields fields, Reservoir reservoir) => new()
    {
        Id = id,
        ReservoirId = reservoir.Id,
        Reservoir = reservoir,
        DrainedAt = fields.DrainedAt!.Value.UtcDateTime,
        WaterL = fields.WaterL!.Value,
        OilL = fields.OilL,
    };

    public static void ApplyTo(DrainEvent drain, DrainFields fields)
    {
        drain.WaterL = fields.WaterL!.Value;
        drain.OilL = fields.OilL;
    }

    public static DrainFields FieldsOf(DrainEvent drain, string? tag) =>
        new() { Tag = tag, DrainedAt = new DateTimeOffset(drain.DrainedAt, TimeSpan.Zero), WaterL = drain.WaterL, OilL = drain.OilL };

    protected override IQueryable<DrainEvent> Query(PlantDbContext context) => context.Drains.Include(d => d.Reservoir);

    protected override IQueryable<DrainEvent> OfTag(IQueryable<DrainEvent> query, string tag) => query.Where(d => d.Reservoir!.Tag == tag);

    protected override Task<DrainEvent?> FindByFieldsAsync(PlantDbContext context, DrainFields fields, References references, CancellationToken cancellation)
    {
        var (reservoir, at) = (references.Reservoir!.Id, fields.DrainedAt!.Value.UtcDateTime);
        return Query(context).FirstOrDefaultAsync(d => d.ReservoirId == reservoir && d.DrainedAt == at, cancellation);
    }

    protected override async Task<References> ResolveAsync(PlantDbContext context, DrainFields fields, List<Refusal> refusals, CancellationToken cancellation) =>
        new(Reservoir: await References.ReservoirAsync(context, fields.Tag, refusals, cancellation));

    protected override DrainEvent Make(Guid id, DrainFields fields, References references, Actor actor) => Make(id, fields, references.Reservoir!);

    protected override void Apply(DrainEvent record, DrainFields fields, References references) => ApplyTo(record, fields);

    protected override DrainFields ToFields(DrainEvent record) => FieldsOf(record, record.Reservoir?.Tag);

    protected override void CheckKey(DrainEvent record, DrainFields fields, List<Refusal> refusals)
    {
        KeyStays(refusals, "tag", fields.Tag, record.Reservoir!.Tag);
        KeyStays(refusals, "drainedAt", fields.DrainedAt!.Value.UtcDateTime.ToString("O", CultureInfo.InvariantCulture), record.DrainedAt.ToString("O", CultureInfo.InvariantCulture));
    }
}
