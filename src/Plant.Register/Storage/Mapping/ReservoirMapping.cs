using Microsoft.EntityFrameworkCore;
using Plant.Register.Reservoirs;

namespace Plant.Register.Storage.Mapping;

internal static class ReservoirMapping
{
    public static void Map(ModelBuilder model)
    {
        var site = model.Entity<Site>();
        site.ToTable("sites");
        site.Property(s => s.Id).ValueGeneratedNever();

        var area = model.Entity<Area>();
        area.ToTable("areas");
        area.Property(a => a.Id).ValueGeneratedNever();
        area.HasIndex(a => new { a.SiteId, a.Name }).IsUnique();
        area.HasOne<Site>().WithMany().HasForeignKey(a => a.SiteId).OnDelete(DeleteBehavior.Restrict);

        var fluid = model.Record<Fluid>("fluids");
        fluid.HasIndex(f => f.Code).IsUnique();
        fluid.Property(f => f.Family).AsCode();
        fluid.Property(f => f.ViscosityOrigin).AsCode();
        fluid.Property(f => f.DensityOrigin).AsCode();
        fluid.Property(f => f.SolubilityOrigin).AsCode();
        fluid.Property(f => f.LimitOrigin).AsCode();

        var reservoir = model.Record<Reservoir>("reservoirs");
        reservoir.HasIndex(r => r.Tag).IsUnique();
        reservoir.HasIndex(r => r.SeriesNumber).IsUnique();
        reservoir.Property(r => r.Shape).AsCode();
        reservoir.Property(r => r.Breather).AsCode();
        reservoir.Property(r => r.DimensionsOrigin).AsCode();
        reservoir.Property(r => r.TemperaturesOrigin).AsCode();
        reservoir.Property(r => r.LimitOrigin).AsCode();
        reservoir.Property(r => r.CapacityOrigin).AsCode();
        reservoir.HasOne(r => r.Area).WithMany().HasForeignKey(r => r.AreaId).OnDelete(DeleteBehavior.Restrict);
        reservoir.HasOne(r => r.Fluid).WithMany().HasForeignKey(r => r.FluidId).OnDelete(DeleteBehavior.Restrict);

        var drain = model.Record<DrainEvent>("drains");
        drain.HasIndex(d => new { d.ReservoirId, d.DrainedAt }).IsUnique();
        drain.HasOne(d => d.Reservoir).WithMany().HasForeignKey(d => d.ReservoirId).OnDelete(DeleteBehavior.Restrict);

        var topUp = model.Record<TopUpEvent>("topups");
        topUp.HasIndex(t => new { t.ReservoirId, t.AddedAt }).IsUnique();
        topUp.HasOne(t => t.Reservoir).WithMany().HasForeignKey(t => t.ReservoirId).OnDelete(DeleteBehavior.Restrict);
    }
}
