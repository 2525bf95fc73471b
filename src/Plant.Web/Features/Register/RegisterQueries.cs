using Microsoft.EntityFrameworkCore;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Web.Features.Register;

/// <summary>A line of the register's overview.</summary>
public sealed record RegisterLine(string Key, string Name, string? Area, string? Fluid, string Assumed);

/// <summary>Reads for the register pages.</summary>
public sealed class RegisterQueries(IDbContextFactory<PlantDbContext> contexts)
{
    public async Task<(IReadOnlyList<RegisterLine> Reservoirs, IReadOnlyList<RegisterLine> Fluids, IReadOnlyList<RegisterLine> Separators)> OverviewAsync(CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var reservoirs = await context.Reservoirs.AsNoTracking().Include(r => r.Area).Include(r => r.Fluid).Where(r => r.WithdrawnAt == null).ToListAsync(cancellation);
        var fluids = await context.Fluids.AsNoTracking().Where(f => f.WithdrawnAt == null).ToListAsync(cancellation);
        var separators = await context.Separators.AsNoTracking().Include(s => s.Reservoir).Where(s => s.WithdrawnAt == null).ToListAsync(cancellation);
        return (
            [.. reservoirs.OrderBy(r => r.Tag, StringComparer.Ordinal).Select(r => new RegisterLine(r.Tag, r.Name, r.Area?.Name, r.Fluid?.Code, Missing(r)))],
            [.. fluids.OrderBy(f => f.Code, StringComparer.Ordinal).Select(f => new RegisterLine(f.Code, f.Name, Plant.Physics.Code.Of(f.Family), null, Missing(f)))],
            [.. separators.OrderBy(s => s.Code, StringComparer.Ordinal).Select(s => new RegisterLine(s.Code, Plant.Physics.Code.Of(s.Kind).Replace('-', ' '), s.Reservoir?.Tag ?? (s.Portable == true ? "portable" : ""), null, ""))]);
    }

    public async Task<(IReadOnlyList<string> Tags, IReadOnlyList<string> Fluids, IReadOnlyList<string> Areas)> ChoicesAsync(CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        return (
            await context.Reservoirs.Where(r => r.WithdrawnAt == null).OrderBy(r => r.Tag).Select(r => r.Tag).ToListAsync(cancellation),
            await context.Fluids.Where(f => f.WithdrawnAt == null).OrderBy(f => f.Code).Select(f => f.Code).ToListAsync(cancellation),
            await context.Areas.OrderBy(a => a.Name).Select(a => a.Name).ToListAsync(cancellation));
    }

    private static string Missing(Plant.Register.Reservoirs.Reservoir r) => string.Join(", ", new[]
    {
        r.HeightMm is null || r.Shape is null ? "dimensions" : null,
        r.OilVolumeL is null ? "volume" : null,
        r.OperatingTemperatureC is null ? "running temperature" : null,
        r.ColdestTemperatureC is null ? "coldest temperature" : null,
        r.SuctionHeightMm is null && r.WaterCapacityL is null ? "suction height" : null,
    }.OfType<string>());

    private static string Missing(Plant.Register.Reservoirs.Fluid f) => string.Join(", ", new[]
    {
        f.Viscosity40Mm2S is null ? "viscosity" : null,
        f.Density15KgM3 is null ? "density" : null,
        f.SolubilityA is null ? "solubility" : null,
    }.OfType<string>());
}
