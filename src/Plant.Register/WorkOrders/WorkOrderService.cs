using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Work orders as they are written: made and changed by those who plan work. <see cref="WorkOrderSteps"/> moves them.</summary>
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
        DueAt = Offset(record.DueAt),
        State = Code.Of(record.State),
        Author = record.Author,
        SubmittedAt = Offset(record.SubmittedAt),
        DecidedBy = record.DecidedBy,
        DecidedAt = Offset(record.DecidedAt),
        Note = record.Note,
        DoneBy = record.DoneBy,
        DoneAt = Offset(record.DoneAt),
        Findings = record.Findings,
        DrainedWaterL = record.DrainedWaterL,
        DrainedOilL = record.DrainedOilL,
        Separator = record.Separator,
        RunHours = record.RunHours,
        VerifiedBySample = record.VerifiedBySample,
        FoundPpm = record.FoundPpm,
        ExpectedLowPpm = record.ExpectedLowPpm,
        ExpectedHighPpm = record.ExpectedHighPpm,
    };

    private static DateTimeOffset? Offset(DateTime? time) => time is { } at ? new DateTimeOffset(at, TimeSpan.Zero) : null;

    protected override void CheckKey(WorkOrder record, WorkOrderFields fields, List<Refusal> refusals)
    {
        KeyStays(refusals, "number", fields.Number, record.Number);
        KeyStays(refusals, "tag", fields.Tag, record.Reservoir!.Tag);
    }

    protected override string? MayAmend(WorkOrder record, Actor actor) => WorkOrderRules.AmendRefusal(record.Number, record.State, record.Author, actor);

    /// <summary>Who changes what is to be decided becomes its author.</summary>
    protected override void Amended(WorkOrder record, Actor actor) => record.Author = actor.Name;
}
