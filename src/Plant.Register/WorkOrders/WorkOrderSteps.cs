using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Separators;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Moves work orders through <see cref="WorkOrderRules"/>; what the work found and drained enters the register in the same transaction.</summary>
public sealed class WorkOrderSteps(RegisterWriter writer, Verification verification, TimeProvider clock)
{
    /// <summary>How old a proof of who somebody is may be for a decision.</summary>
    public static readonly TimeSpan ProofLife = TimeSpan.FromMinutes(10);

    /// <summary>Takes a step on the version that the caller saw. The same step repeated on what it led to has no second effect.</summary>
    public async Task<Outcome<WorkOrder>> TakeAsync(Actor actor, string number, Guid token, WorkOrderStepFields fields, CancellationToken cancellation = default)
    {
        var refusals = new List<Refusal>();
        fields.Check(refusals);
        if (refusals.Count > 0)
        {
            return Outcome<WorkOrder>.Invalid(refusals);
        }

        var step = Rule.Parse<WorkOrderStep>(fields.Step)!.Value;
        if (step is WorkOrderStep.Approve or WorkOrderStep.Reject && actor.PersonId is not null && !(clock.GetUtcNow().UtcDateTime - actor.ConfirmedAt < ProofLife))
        {
            return Outcome<WorkOrder>.Refused(OutcomeKind.Forbidden, "you signed in more than ten minutes ago: confirm that it is you, then decide");
        }

        var reason = string.IsNullOrWhiteSpace(fields.Note) ? $"step: {WorkOrderRules.Words(step)}" : fields.Note.Trim();
        return await writer.WriteAsync(actor, reason, async (context, stop) =>
        {
            var order = await context.WorkOrders.Include(o => o.Reservoir).FirstOrDefaultAsync(o => o.Number == number && o.WithdrawnAt == null, stop);
            if (order is null)
            {
                return Outcome<WorkOrder>.Refused(OutcomeKind.NotFound, $"there is no work order {number}");
            }

            if (order.Token != token)
            {
                return await StaleAsync(context, order, stop);
            }

            if (WorkOrderRules.Refusal(order.Number, order.State, order.Author, step, actor) is { } refusal)
            {
                return Outcome<WorkOrder>.Refused(WorkOrderRules.Next(order.State, step) is null ? OutcomeKind.Conflict : OutcomeKind.Forbidden, refusal);
            }

            if (WorkOrderRules.NeedsReason(order.State, step) && (fields.Note?.Trim().Length ?? 0) < RegisterWriter.ReasonLength)
            {
                return Outcome<WorkOrder>.Invalid(new Refusal("note", fields.Note ?? string.Empty, $"say why in at least {RegisterWriter.ReasonLength} characters"));
            }

            RegisterWriter.Expect(context, order, token);
            var found = await ApplyAsync(context, order, step, fields, actor, stop);
            if (found.Count > 0)
            {
                return Outcome<WorkOrder>.Invalid(found);
            }

            order.State = WorkOrderRules.Next(order.State, step)!.Value;
            order.Note = string.IsNullOrWhiteSpace(fields.Note) ? null : fields.Note.Trim();
            return Outcome<WorkOrder>.Done(order);
        }, cancellation);
    }

    /// <summary>Notes that a person looks at an order now.</summary>
    /// <returns>When it looked before; null where never.</returns>
    public async Task<DateTime?> LookAsync(Actor actor, Guid orderId, CancellationToken cancellation = default)
    {
        DateTime? before = null;
        await writer.WriteAsync(actor, null, async (context, stop) =>
        {
            var look = await context.OrderLooks.FirstOrDefaultAsync(l => l.OrderId == orderId && l.Person == actor.Name, stop);
            before = look?.At;
            if (look is null)
            {
                context.OrderLooks.Add(new OrderLook { OrderId = orderId, Person = actor.Name, At = Now });
            }
            else
            {
                look.At = Now;
            }

            return Outcome<bool>.Done(true);
        }, cancellation);
        return before;
    }

    private DateTime Now => DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds()).UtcDateTime;

    private static async Task<Outcome<WorkOrder>> StaleAsync(PlantDbContext context, WorkOrder order, CancellationToken cancellation)
    {
        var last = await context.AuditEntries.AsNoTracking().Where(e => e.RecordId == order.Id).OrderByDescending(e => e.Sequence).FirstAsync(cancellation);
        return Outcome<WorkOrder>.Refused(OutcomeKind.Stale,
            FormattableString.Invariant($"{order.Number} is {WorkOrderRules.Words(order.State)} since {last.At:yyyy-MM-dd HH:mm} UTC, by {last.Actor}; look at it again"));
    }

    private async Task<IReadOnlyList<Refusal>> ApplyAsync(PlantDbContext context, WorkOrder order, WorkOrderStep step, WorkOrderStepFields fields, Actor actor, CancellationToken cancellation)
    {
        switch (step)
        {
            case WorkOrderStep.Submit:
                order.SubmittedAt = Now;
                return [];
            case WorkOrderStep.Approve or WorkOrderStep.Reject or WorkOrderStep.AskBack:
                (order.DecidedBy, order.DecidedAt) = (actor.Name, Now);
                return [];
            case WorkOrderStep.WithdrawApproval:
                (order.DecidedBy, order.DecidedAt) = (null, null);
                return [];
            case WorkOrderStep.Finish:
                return await FinishAsync(context, order, fields, actor, cancellation);
            case WorkOrderStep.Verify:
                return await verification.ApplyAsync(context, order, cancellation);
            default:
                return [];
        }
    }

    private async Task<IReadOnlyList<Refusal>> FinishAsync(PlantDbContext context, WorkOrder order, WorkOrderStepFields fields, Actor actor, CancellationToken cancellation)
    {
        var done = fields.DoneAt?.UtcDateTime ?? Now;
        var refusals = new List<Refusal>();
        refusals.Required("findings", fields.Findings, 4000);
        if (order.Kind == WorkOrderKind.Drain)
        {
            refusals.Required("drainedWaterL", fields.DrainedWaterL);
        }

        if (done > Now.AddMinutes(5))
        {
            refusals.Add(new Refusal("doneAt", fields.DoneAt!.Value.ToString("O", System.Globalization.CultureInfo.InvariantCulture), "lies in the future"));
        }

        var separator = string.IsNullOrWhiteSpace(fields.Separator) ? null
            : await context.Separators.FirstOrDefaultAsync(s => s.Code == fields.Separator && s.WithdrawnAt == null, cancellation);
        if (separator is null && !string.IsNullOrWhiteSpace(fields.Separator))
        {
            refusals.Add(new Refusal("separator", fields.Separator, "names no separator of the register"));
        }

        if (refusals.Count > 0)
        {
            return refusals;
        }

        (order.DoneBy, order.DoneAt, order.Findings) = (actor.Name, done, fields.Findings!.Trim());
        (order.DrainedWaterL, order.DrainedOilL, order.Separator, order.RunHours) = (fields.DrainedWaterL, fields.DrainedOilL, separator?.Code, fields.RunHours);
        if (fields.DrainedWaterL is { } water)
        {
            context.Drains.Add(new DrainEvent { Id = Guid.CreateVersion7(), ReservoirId = order.ReservoirId, Reservoir = order.Reservoir, DrainedAt = done, WaterL = water, OilL = fields.DrainedOilL });
        }

        if (separator is not null && fields.RunHours is > 0 and { } hours)
        {
            context.SeparatorRuns.Add(new SeparatorRunEvent
            {
                Id = Guid.CreateVersion7(), SeparatorId = separator.Id, Separator = separator, ReservoirId = order.ReservoirId, Reservoir = order.Reservoir,
                StartedAt = DateTimeOffset.FromUnixTimeMilliseconds(new DateTimeOffset(done.AddHours(-hours)).ToUnixTimeMilliseconds()).UtcDateTime, EndedAt = done,
            });
        }

        return [];
    }
}
