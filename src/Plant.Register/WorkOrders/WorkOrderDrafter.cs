using System.Globalization;
using System.Text.Json;
using System.Text.Json.Serialization;
using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Assessments;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Drafts work orders from the advice, with the assessment and its working frozen as they stood.</summary>
public sealed class WorkOrderDrafter(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer, AssessmentService assessments, TimeProvider clock)
{
    private const int FirstNumber = 1001;

    private static readonly JsonSerializerOptions Options = new(JsonSerializerDefaults.Web) { Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) } };

    /// <summary>Reads the evidence of an order; null for one by hand.</summary>
    public static WorkOrderEvidence? EvidenceOf(WorkOrder order) => order.Evidence is null ? null : JsonSerializer.Deserialize<WorkOrderEvidence>(order.Evidence, Options);

    /// <summary>One draft a reservoir, of the kind that is asked for or else the one that the advice calls for first.</summary>
    /// <returns>Numbers of the drafts.</returns>
    public async Task<Outcome<IReadOnlyList<string>>> DraftAsync(Actor actor, IReadOnlyList<string> tags, WorkOrderKind? kind, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.PlanWork))
        {
            return Outcome<IReadOnlyList<string>>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not draft work orders");
        }

        if (tags.Count == 0)
        {
            return Outcome<IReadOnlyList<string>>.Invalid(new Refusal("tags", string.Empty, "choose at least one reservoir"));
        }

        var now = DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds()).UtcDateTime;
        var evidence = new List<WorkOrderEvidence>();
        foreach (var tag in tags.Distinct(StringComparer.Ordinal))
        {
            var working = new Working();
            if (await assessments.OneAsync(tag, now, working, cancellation) is not { } assessment)
            {
                return Outcome<IReadOnlyList<string>>.Invalid(new Refusal("tags", tag, "names no reservoir of the register"));
            }

            evidence.Add(new WorkOrderEvidence(assessment, working.Steps));
        }

        return await writer.WriteAsync(actor, null, async (context, stop) =>
        {
            var number = await NextNumberAsync(context, stop);
            var made = new List<string>();
            foreach (var item in evidence)
            {
                var reservoir = await context.Reservoirs.FirstAsync(r => r.Tag == item.Assessment.Tag && r.WithdrawnAt == null, stop);
                var what = kind ?? KindFor(item.Assessment);
                var order = new WorkOrder
                {
                    Id = Guid.CreateVersion7(),
                    Number = number.ToString(CultureInfo.InvariantCulture),
                    ReservoirId = reservoir.Id,
                    Reservoir = reservoir,
                    Kind = what,
                    Task = TaskFor(what, item.Assessment),
                    Reason = item.Assessment.Reason,
                    Author = actor.Name,
                    CreatedAt = now,
                    DueAt = DueFor(what, item.Assessment),
                    Evidence = JsonSerializer.Serialize(item, Options),
                };
                context.WorkOrders.Add(order);
                made.Add(order.Number);
                number++;
            }

            return Outcome<IReadOnlyList<string>>.Done(made);
        }, cancellation);
    }

    /// <summary>The next free number, for an order by hand.</summary>
    public async Task<string> NextNumberAsync(CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        return (await NextNumberAsync(context, cancellation)).ToString(CultureInfo.InvariantCulture);
    }

    /// <summary>What the advice calls for first.</summary>
    public static WorkOrderKind KindFor(Assessment assessment) =>
        assessment.IngressChangedAt is not null && assessment.DrainBy is null ? WorkOrderKind.Repair
        : assessment.DrainBy is not null ? WorkOrderKind.Drain
        : assessment.Dehydration is not null ? WorkOrderKind.Dehydrate
        : assessment.IngressChangedAt is not null ? WorkOrderKind.Repair
        : WorkOrderKind.SampleAgain;

    private static async Task<int> NextNumberAsync(PlantDbContext context, CancellationToken cancellation)
    {
        var numbers = await context.WorkOrders.AsNoTracking().Select(o => o.Number).ToListAsync(cancellation);
        return Math.Max(FirstNumber, 1 + numbers.Select(n => int.TryParse(n, NumberStyles.None, CultureInfo.InvariantCulture, out var value) ? value : 0).DefaultIfEmpty(0).Max());
    }

    private static string TaskFor(WorkOrderKind kind, Assessment assessment)
    {
        var lead = kind switch
        {
            WorkOrderKind.Drain => assessment.WaterGoes == Plant.Physics.Fluids.WaterDirection.Up ? "Skim the water" : "Drain",
            WorkOrderKind.Dehydrate => "Dehydrate",
            WorkOrderKind.Repair => "Find",
            WorkOrderKind.SampleAgain => "Take a",
            _ => "Change",
        };
        return assessment.Actions.FirstOrDefault(a => a.StartsWith(lead, StringComparison.Ordinal)) ?? kind switch
        {
            WorkOrderKind.Drain => "Drain at the lowest point until oil comes; measure the water.",
            WorkOrderKind.Dehydrate => "Dehydrate until the water in the oil is below its limit.",
            WorkOrderKind.Repair => "Find and repair the way water comes in: cooler, gland, breather.",
            WorkOrderKind.ChangeFluid => "Change the fluid: drain, clean, refill, and sample after a day of running.",
            _ => "Take another sample from the return line while it runs.",
        };
    }

    private static DateTime? DueFor(WorkOrderKind kind, Assessment assessment) => kind switch
    {
        WorkOrderKind.Drain => assessment.DrainBy,
        WorkOrderKind.Dehydrate => assessment.DehydrateBy,
        WorkOrderKind.SampleAgain => assessment.AsOf.AddDays(3),
        _ => assessment.DrainBy ?? assessment.AsOf.AddDays(14),
    };
}

/// <summary>What stood when an order was drafted.</summary>
/// <param name="Assessment">The assessment.</param>
/// <param name="Steps">Its working.</param>
public sealed record WorkOrderEvidence(Assessment Assessment, IReadOnlyList<WorkingStep> Steps);
