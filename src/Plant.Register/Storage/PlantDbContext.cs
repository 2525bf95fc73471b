using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Identity.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Audit;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.WorkOrders;

namespace Plant.Register.Storage;

/// <summary>The register's database. Writes go through <see cref="RegisterWriter"/>, which audits them; this class maps.</summary>
public sealed class PlantDbContext(DbContextOptions<PlantDbContext> options)
    : IdentityDbContext<PlantUser, IdentityRole<Guid>, Guid>(options)
{
    public DbSet<Site> Sites => Set<Site>();

    public DbSet<Area> Areas => Set<Area>();

    public DbSet<Fluid> Fluids => Set<Fluid>();

    public DbSet<Reservoir> Reservoirs => Set<Reservoir>();

    public DbSet<Sample> Samples => Set<Sample>();

    public DbSet<DrainEvent> Drains => Set<DrainEvent>();

    public DbSet<TopUpEvent> TopUps => Set<TopUpEvent>();

    public DbSet<Separator> Separators => Set<Separator>();

    public DbSet<SeparatorRunEvent> SeparatorRuns => Set<SeparatorRunEvent>();

    public DbSet<Reading> Readings => Set<Reading>();

    public DbSet<WorkOrder> WorkOrders => Set<WorkOrder>();

    public DbSet<DrainRound> Rounds => Set<DrainRound>();

    public DbSet<ApiToken> ApiTokens => Set<ApiToken>();

    public DbSet<AuditEntry> AuditEntries => Set<AuditEntry>();

    public DbSet<Revision> Revisions => Set<Revision>();
}
