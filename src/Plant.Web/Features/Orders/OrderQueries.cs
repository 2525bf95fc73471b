using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Assessments;
using Plant.Register.Audit;
using Plant.Register.Storage;
using Plant.Register.WorkOrders;

namespace Plant.Web.Features.Orders;

/// <summary>Reads for the order pages.</summary>
public sealed class OrderQueries(IDbContextFactory<PlantDbContext> contexts, AssessmentService assessments, TimeProvider clock)
{
    private const int MostLines = 500;

    /// <summary>A refused write in a sentence.</summary>
    public static string Told<T>(Outcome<T> outcome) => outcome.Message ?? string.Join("; ", outcome.Refusals.Select(r => $"{r.Field} {r.Reason}"));

    /// <summary>Orders, those that wait longest for a date first.</summary>
    public async Task<IReadOnlyList<OrderLine>> ListAsync(string? author, WorkOrderState? state, bool open, CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var query = context.WorkOrders.AsNoTracking().Where(o => o.WithdrawnAt == null);
        query = author is null ? query : query.Where(o => o.Author == author);
        query = state is { } one ? query.Where(o => o.State == one) : query;
        query = open ? query.Where(o => o.State != WorkOrderState.Closed && o.State != WorkOrderState.Withdrawn && o.State != WorkOrderState.Rejected) : query;
        return await query.OrderBy(o => o.DueAt ?? o.CreatedAt).ThenBy(o => o.Number).Take(MostLines)
            .Select(o => new OrderLine(o.Number, o.Reservoir!.Tag, o.Reservoir.Name, o.Kind, o.State, o.Task, o.Author, o.CreatedAt, o.DueAt, o.Reservoir.Criticality)).ToListAsync(cancellation);
    }

    /// <summary>How many orders wait for a decision.</summary>
    public async Task<int> WaitingAsync(CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        return await context.WorkOrders.CountAsync(o => o.WithdrawnAt == null && o.State == WorkOrderState.Submitted, cancellation);
    }

    /// <summary>An order with its story; null where there is none of this number.</summary>
    public async Task<OrderView?> ReadAsync(string number, CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var order = await context.WorkOrders.AsNoTracking().Include(o => o.Reservoir).FirstOrDefaultAsync(o => o.Number == number && o.WithdrawnAt == null, cancellation);
        if (order is null)
        {
            return null;
        }

        var entries = await context.AuditEntries.AsNoTracking().Where(e => e.Kind == "work-order" && e.RecordId == order.Id).OrderBy(e => e.Sequence).ToListAsync(cancellation);
        var now = await assessments.SomeAsync(clock.GetUtcNow().UtcDateTime, [order.Reservoir!.Tag], cancellation);
        return new OrderView(order, WorkOrderDrafter.EvidenceOf(order), Story(entries), await SinceAsync(context, order, cancellation), now.Count > 0 ? now[0].Assessment : null, now.Count > 0 ? now[0].History : null);
    }

    private static List<OrderEvent> Story(List<AuditEntry> entries)
    {
        var story = new List<OrderEvent>();
        string? before = null;
        foreach (var entry in entries)
        {
            using var content = System.Text.Json.JsonDocument.Parse(entry.Detail);
            var state = content.RootElement.TryGetProperty("state", out var told) ? told.GetString()! : "draft";
            var what = entry.Action == "created" ? "drafted" : state != before ? state.Replace('-', ' ') : "changed";
            var why = entry.Reason is { } reason && !reason.StartsWith("step: ", StringComparison.Ordinal) ? $": {reason}" : "";
            story.Add(new OrderEvent(entry.At, entry.Actor, what + why));
            before = state;
        }

        return story;
    }

    private static async Task<List<OrderEvent>> SinceAsync(PlantDbContext context, WorkOrder order, CancellationToken cancellation)
    {
        var samples = await context.Samples.AsNoTracking().Where(s => s.ReservoirId == order.ReservoirId && s.WithdrawnAt == null && (s.ReceivedAt ?? s.TakenAt) > order.CreatedAt).ToListAsync(cancellation);
        var drains = await context.Drains.AsNoTracking().Where(d => d.ReservoirId == order.ReservoirId && d.WithdrawnAt == null && d.DrainedAt > order.CreatedAt).ToListAsync(cancellation);
        return [.. samples.Select(s => new OrderEvent(s.ReceivedAt ?? s.TakenAt, s.Analyst ?? "", string.Create(CultureInfo.InvariantCulture, $"sample {s.Code}: {(s.WaterPpm is { } ppm ? $"{ppm:0.#} ppm" : s.Remark)}")))
            .Concat(drains.Select(d => new OrderEvent(d.DrainedAt, "", string.Create(CultureInfo.InvariantCulture, $"drained {d.WaterL:0.##} L of water")))).OrderBy(e => e.At)];
    }
}
