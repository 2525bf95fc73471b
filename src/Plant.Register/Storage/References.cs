using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Reservoirs;
using Plant.Register.Separators;

namespace Plant.Register.Storage;

/// <summary>Records that a row names.</summary>
public sealed record References(Reservoir? Reservoir = null, Fluid? Fluid = null, Separator? Separator = null, Area? Area = null)
{
    public static async Task<Reservoir?> ReservoirAsync(PlantDbContext context, string? tag, List<Refusal> refusals, CancellationToken cancellation)
    {
        var reservoir = await context.Reservoirs.FirstOrDefaultAsync(r => r.Tag == tag && r.WithdrawnAt == null, cancellation);
        if (reservoir is null)
        {
            refusals.Add(new Refusal("tag", tag ?? string.Empty, "names no reservoir of the register: enter the reservoir first, or correct the tag"));
        }

        return reservoir;
    }
}
