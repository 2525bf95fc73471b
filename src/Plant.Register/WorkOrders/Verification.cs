using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Assessments;
using Plant.Register.Storage;

namespace Plant.Register.WorkOrders;

/// <summary>Holds the first sample after the work against what was expected of it before it was known.</summary>
public sealed class Verification(AssessmentService assessments)
{
    /// <summary>Writes sample, found and expected into the order, or says why it cannot.</summary>
    public async Task<IReadOnlyList<Refusal>> ApplyAsync(PlantDbContext context, WorkOrder order, CancellationToken cancellation)
    {
        var following = await context.Samples.AsNoTracking()
            .Where(s => s.ReservoirId == order.ReservoirId && s.WithdrawnAt == null && s.TakenAt > order.DoneAt && s.WaterPpm != null && (s.Point == SamplePoint.Return || s.Point == SamplePoint.Tank))
            .OrderBy(s => s.TakenAt).ThenBy(s => s.Code).ThenBy(s => s.Replicate).ToListAsync(cancellation);
        if (following.Count == 0)
        {
            return [new Refusal("sample", string.Empty, string.Create(CultureInfo.InvariantCulture,
                $"no sample of {order.Reservoir!.Tag} was taken since the work ended on {order.DoneAt:d MMM yyyy HH:mm} UTC: take one from the return line and enter it"))];
        }

        var first = following[0];
        var before = await assessments.OneAsync(order.Reservoir!.Tag, first.TakenAt.AddMilliseconds(-1), cancellation: cancellation);
        order.VerifiedBySample = first.Code;
        order.FoundPpm = following.Where(s => s.Code == first.Code).Average(s => s.WaterPpm!.Value);
        (order.ExpectedLowPpm, order.ExpectedHighPpm) = (before?.WaterPpmLow90, before?.WaterPpmHigh90);
        return [];
    }
}
