using Microsoft.EntityFrameworkCore;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.WorkOrders;

namespace Plant.Register.Storage;

/// <summary>What a commit touched.</summary>
/// <param name="ReservoirIds">Reservoirs whose assessment may differ now.</param>
/// <param name="WholeFleet">True where a fluid or a batch changed: all may differ.</param>
public sealed record RegisterChange(IReadOnlySet<Guid> ReservoirIds, bool WholeFleet)
{
    internal static RegisterChange Of(PlantDbContext context)
    {
        var ids = new HashSet<Guid>();
        var all = context.Batches.Count > 0;
        foreach (var entry in context.ChangeTracker.Entries<IRecord>())
        {
            if (entry.State is not (EntityState.Added or EntityState.Modified))
            {
                continue;
            }

            switch (entry.Entity)
            {
                case Reservoir reservoir: ids.Add(reservoir.Id); break;
                case Sample sample: ids.Add(sample.ReservoirId); break;
                case DrainEvent drain: ids.Add(drain.ReservoirId); break;
                case TopUpEvent topUp: ids.Add(topUp.ReservoirId); break;
                case SeparatorRunEvent run: ids.Add(run.ReservoirId); break;
                case WorkOrder order: ids.Add(order.ReservoirId); break;
                case Fluid or Separator: all = true; break;
            }
        }

        return new RegisterChange(ids, all);
    }
}
