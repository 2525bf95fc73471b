using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Drain rounds.</summary>
public sealed class RoundService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer) : RecordService<DrainRound, RoundFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.PlanWork;

    protected override IQueryable<DrainRound> Query(PlantDbContext context) => context.Rounds;

    protected override IQueryable<DrainRound> OfTag(IQueryable<DrainRound> query, string tag) => query.Where(r => r.Tags.Contains(tag));

    protected override Task<DrainRound?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) =>
        context.Rounds.FirstOrDefaultAsync(r => r.Code == key, cancellation);

    protected override Task<DrainRound?> FindByFieldsAsync(PlantDbContext context, RoundFields fields, References references, CancellationToken cancellation) =>
        FindByKeyAsync(context, fields.Code!, cancellation);

    protected override async Task<References> ResolveAsync(PlantDbContext context, RoundFields fields, List<Refusal> refusals, CancellationToken cancellation)
    {
        foreach (var tag in fields.Tags!)
        {
            await References.ReservoirAsync(context, tag, refusals, cancellation);
        }

        return new References();
    }

    protected override DrainRound Make(Guid id, RoundFields fields, References references, Actor actor)
    {
        var round = new DrainRound { Id = id, Code = fields.Code!, Name = fields.Name! };
        Apply(round, fields, references);
        return round;
    }

    protected override void Apply(DrainRound record, RoundFields fields, References references)
    {
        record.Name = fields.Name!;
        record.PlannedFor = DateOnly.ParseExact(fields.PlannedFor!, "yyyy-MM-dd", CultureInfo.InvariantCulture);
        record.Tags = [.. fields.Tags!];
    }

    protected override RoundFields ToFields(DrainRound record) => new()
    {
        Code = record.Code,
        Name = record.Name,
        PlannedFor = record.PlannedFor.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture),
        Tags = [.. record.Tags],
    };

    protected override void CheckKey(DrainRound record, RoundFields fields, List<Refusal> refusals) => KeyStays(refusals, "code", fields.Code, record.Code);
}
