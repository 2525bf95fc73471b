using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Laboratory;

/// <summary>Bottles that were taken.</summary>
public sealed class BottleService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer) : RecordService<Bottle, BottleFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.RecordWork;

    protected override IQueryable<Bottle> Query(PlantDbContext context) => context.Bottles.Include(b => b.Reservoir);

    protected override IQueryable<Bottle> OfTag(IQueryable<Bottle> query, string tag) => query.Where(b => b.Reservoir!.Tag == tag);

    protected override Task<Bottle?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) => Query(context).FirstOrDefaultAsync(b => b.Code == key, cancellation);

    protected override Task<Bottle?> FindByFieldsAsync(PlantDbContext context, BottleFields fields, References references, CancellationToken cancellation) =>
        FindByKeyAsync(context, fields.Code!, cancellation);

    protected override async Task<References> ResolveAsync(PlantDbContext context, BottleFields fields, List<Refusal> refusals, CancellationToken cancellation) =>
        new(Reservoir: await References.ReservoirAsync(context, fields.Tag, refusals, cancellation));

    protected override Bottle Make(Guid id, BottleFields fields, References references, Actor actor)
    {
        var bottle = new Bottle
        {
            Id = id, Code = fields.Code!, ReservoirId = references.Reservoir!.Id, Point = Rule.Parse<SamplePoint>(fields.Point)!.Value, TakenAt = fields.TakenAt!.Value.UtcDateTime, TakenBy = actor.Name,
        };
        Apply(bottle, fields, references);
        return bottle;
    }

    protected override void Apply(Bottle record, BottleFields fields, References references)
    {
        (record.ReservoirId, record.Reservoir) = (references.Reservoir!.Id, references.Reservoir);
        record.Point = Rule.Parse<SamplePoint>(fields.Point)!.Value;
        record.TakenAt = fields.TakenAt!.Value.UtcDateTime;
        record.OilTemperatureC = fields.OilTemperatureC;
    }

    protected override BottleFields ToFields(Bottle record) => new()
    {
        Code = record.Code,
        Tag = record.Reservoir?.Tag,
        Point = Code.Of(record.Point),
        TakenAt = new DateTimeOffset(record.TakenAt, TimeSpan.Zero),
        OilTemperatureC = record.OilTemperatureC,
        TakenBy = record.TakenBy,
    };

    protected override void CheckKey(Bottle record, BottleFields fields, List<Refusal> refusals) => KeyStays(refusals, "code", fields.Code, record.Code);
}
