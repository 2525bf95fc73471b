using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Work orders as drafts: made, changed and withdrawn by those who plan work.</summary>
public sealed class WorkOrderService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer, TimeProvider clock)
    : RecordService<WorkOrder, WorkOrderFields>(contexts, writer)
{
    protected override Duty WriteDuty => Duty.PlanWork;

    protected override IQueryable<WorkOrder> Query(PlantDbContext context) => context.WorkOrders.Include(o => o.Reservoir);

    protected override IQueryable<WorkOrder> OfTag(IQueryable<WorkOrder> query, string tag) => query.Where(o => o.Reservoir!.Tag == tag);

    protected override Task<WorkOrder?> FindByKeyAsync(PlantDbContext context, string key, CancellationToken cancellation) =>
        Query(context).FirstOrDefaultAsync(o => o.Number == key, cancellation);

    protected override Task<WorkOrder?> FindByFieldsAsync(PlantDbContext context, WorkOrderFields fields, References references, CancellationToken cancellation) =>
        FindByKeyAsync(context, fields.Number!, cancellation);

    protected override async Task<References> ResolveAsync(PlantDbContext context, WorkOrderFields fields, List<Refusal> refusals, CancellationToken cancellation) =>
        new(Reservoir: await References.ReservoirAsync(context, fields.Tag, refusals, cancellation));

    protected override WorkOrder Make(Guid id, WorkOrderFields fields, References references, Actor actor) => new()
    {
        Id = id,
        Number = fields.Number!,
        ReservoirId = references.Reservoir!.Id,
        Reservoir = references.Reservoir,
        Kind = Rule.Parse<WorkOrderKind>(fields.Kind)!.Value,
        Task = fields.Task!,
        Reason = fields.Reason!,
        Author = actor.Name,
        CreatedAt = DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds()).UtcDateTime,
        DueAt = fields.DueAt?.UtcDateTime,
    };

    protected override void Apply(WorkOrder record, WorkOrderFields fields, References references)
    {
        record.Kind = Rule.Parse<WorkOrderKind>(fields.Kind)!.Value;
        record.Task = fields.Task!;
        record.Reason = fields.Reason!;
        record.DueAt = fields.DueAt?.UtcDateTime;
    }

    protected override WorkOrderFields ToFields(WorkOrder record) => new()
    {
        Number = record.Number,
        Tag = record.Reservoir?.Tag,
        Kind = Code.Of(record.Kind),
        Task = record.Task,
        Reason = record.Reason,
        DueAt = record.DueAt is { } time ? new DateTimeOffset(time, TimeSpan.Zero) : null,
        State = Code.Of(record.State),
        Author = record.Author,
    };

    protected override void CheckKey(WorkOrder record, WorkOrderFields fields, List<Refusal> refusals)
    {
        KeyStays(refusals, "number", fields.Number, record.Number);
        KeyStays(refusals, "tag", fields.Tag, record.Reservoir!.Tag);
    }

    protected override string? MayAmend(WorkOrder record, Actor actor) =>
        record.State != WorkOrderState.Draft ? $"{record.Number} is {Code.Of(record.State)}: only a draft is changed"
        : record.Author != actor.Name && !actor.Is(PlantRole.Administrator) ? $"{record.Number} is a draft of {record.Author}: only its author changes it"
        : null;
}
