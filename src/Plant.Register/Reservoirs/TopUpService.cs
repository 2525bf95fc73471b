using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Top-ups.</summary>
public sealed class TopUpService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer) : RecordService<TopUpEvent, TopUpFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.RecordWork;

    /// <summary>A new record from checked fields.</summary>
    public static TopUpEvent Make(Guid id, TopUpFields fields, Reservoir reservoir) => new()
    {
        Id = id,
        ReservoirId = reservoir.Id,
        Reservoir = reservoir,
        AddedAt = fields.AddedAt!.Value.UtcDateTime,
        OilL = fields.OilL!.Value,
        WaterPpm = fields.WaterPpm,
    };

    public static void ApplyTo(TopUpEvent topUp, TopUpFields fields)
    {
        topUp.OilL = fields.OilL!.Value;
        topUp.WaterPpm = fields.WaterPpm;
    }

    public static TopUpFields FieldsOf(TopUpEvent topUp, string? tag) =>
        new() { Tag = tag, AddedAt = new DateTimeOffset(topUp.AddedAt, TimeSpan.Zero), OilL = topUp.OilL, WaterPpm = topUp.WaterPpm };

    protected override IQueryable<TopUpEvent> Query(PlantDbContext context) => context.TopUps.Include(d => d.Reservoir);

    protected override IQueryable<TopUpEvent> OfTag(IQueryable<TopUpEvent> query, string tag) => query.Where(d => d.Reservoir!.Tag == tag);

    protected override Task<TopUpEvent?> FindByFieldsAsync(PlantDbContext context, TopUpFields fields, References references, CancellationToken cancellation)
    {
        var (reservoir, at) = (references.Reservoir!.Id, fields.AddedAt!.Value.UtcDateTime);
        return Query(context).FirstOrDefaultAsync(d => d.ReservoirId == reservoir && d.AddedAt == at, cancellation);
    }

    protected override async Task<References> ResolveAsync(PlantDbContext context, TopUpFields fields, List<Refusal> refusals, CancellationToken cancellation) =>
        new(Reservoir: await References.ReservoirAsync(context, fields.Tag, refusals, cancellation));

    protected override TopUpEvent Make(Guid id, TopUpFields fields, References references, Actor actor) => Make(id, fields, references.Reservoir!);

    protected override void Apply(TopUpEvent record, TopUpFields fields, References references) => ApplyTo(record, fields);

    protected override TopUpFields ToFields(TopUpEvent record) => FieldsOf(record, record.Reservoir?.Tag);

    protected override void CheckKey(TopUpEvent record, TopUpFields fields, List<Refusal> refusals)
    {
        KeyStays(refusals, "tag", fields.Tag, record.Reservoir!.Tag);
        KeyStays(refusals, "addedAt", fields.AddedAt!.Value.UtcDateTime.ToString("O", CultureInfo.InvariantCulture), record.AddedAt.ToString("O", CultureInfo.InvariantCulture));
    }
}
