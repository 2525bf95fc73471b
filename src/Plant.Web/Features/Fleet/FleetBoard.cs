using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Register.Assessments;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;
using Plant.Register.WorkOrders;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Features.Fleet;

/// <summary>The newest assessments of the fleet, in memory: renewed where a write touched, and as a whole when they age.</summary>
public sealed class FleetBoard : IDisposable
{
    private static readonly TimeSpan Life = TimeSpan.FromMinutes(15);

    private readonly IDbContextFactory<PlantDbContext> contexts;
    private readonly AssessmentService assessments;
    private readonly RegisterWriter writer;
    private readonly TimeProvider clock;
    private readonly SemaphoreSlim renewing = new(1, 1);
    private readonly Lock changes = new();
    private readonly HashSet<Guid> touched = [];
    private bool allTouched = true;
    private long sequence = -1;
    private DateTimeOffset renewedAt;
    private Dictionary<string, FleetRow> rows = new(StringComparer.Ordinal);

    public FleetBoard(IDbContextFactory<PlantDbContext> contexts, AssessmentService assessments, RegisterWriter writer, TimeProvider clock)
    {
        this.contexts = contexts;
        this.assessments = assessments;
        this.writer = writer;
        this.clock = clock;
        writer.Changed += Touch;
    }

    /// <summary>All rows, current.</summary>
    public async Task<IReadOnlyCollection<FleetRow>> RowsAsync(CancellationToken cancellation = default)
    {
        await renewing.WaitAsync(cancellation);
        try
        {
            await RenewAsync(cancellation);
            return rows.Values;
        }
        finally
        {
            renewing.Release();
        }
    }

    public void Dispose()
    {
        writer.Changed -= Touch;
        renewing.Dispose();
    }

    private void Touch(RegisterChange change)
    {
        lock (changes)
        {
            allTouched |= change.WholeFleet;
            touched.UnionWith(change.ReservoirIds);
        }
    }

    private async Task RenewAsync(CancellationToken cancellation)
    {
        var now = clock.GetUtcNow();
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var head = await context.AuditEntries.MaxAsync(e => (long?)e.Sequence, cancellation) ?? 0;
        HashSet<Guid> some;
        bool all;
        lock (changes)
        {
            // a change that this process did not make came from another one: the whole fleet is read again
            all = allTouched || now - renewedAt > Life || (head != sequence && touched.Count == 0);
            some = [.. touched];
            touched.Clear();
            allTouched = false;
        }

        if (!all && some.Count == 0)
        {
            return;
        }

        var facts = await context.Reservoirs.AsNoTracking().Where(r => r.WithdrawnAt == null && (all || some.Contains(r.Id)))
            .Select(r => new { r.Tag, r.Name, Area = r.Area!.Name, Fluid = r.Fluid!.Code, r.Id }).ToListAsync(cancellation);
        var orders = await context.WorkOrders.AsNoTracking().Where(o => o.WithdrawnAt == null && o.State != WorkOrderState.Closed && o.State != WorkOrderState.Withdrawn)
            .Select(o => new { o.ReservoirId, o.Kind, o.State }).ToListAsync(cancellation);
        var work = orders.ToLookup(o => o.ReservoirId, o => $"{Plant.Physics.Code.Of(o.Kind).Replace('-', ' ')}, {Plant.Physics.Code.Of(o.State)}");
        var judged = await assessments.SomeAsync(now.UtcDateTime, all ? null : facts.ConvertAll(f => f.Tag), cancellation);
        var byTag = judged.ToDictionary(j => j.History.Tag, StringComparer.Ordinal);
        var next = all ? new Dictionary<string, FleetRow>(StringComparer.Ordinal) : new Dictionary<string, FleetRow>(rows, StringComparer.Ordinal);
        foreach (var fact in facts.Where(f => byTag.ContainsKey(f.Tag)))
        {
            var (history, assessment) = byTag[fact.Tag];
            next[fact.Tag] = new FleetRow(fact.Tag, fact.Name, fact.Area ?? "", fact.Fluid, string.Join("; ", work[fact.Id]), SectionState.Of(history, assessment), assessment);
        }

        rows = next;
        sequence = head;
        if (all)
        {
            renewedAt = now;
        }
    }
}
