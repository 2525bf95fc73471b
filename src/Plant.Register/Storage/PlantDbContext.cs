using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Identity.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage.ValueConversion;
using Plant.Register.Access;
using Plant.Register.Audit;
using Plant.Register.Laboratory;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.Storage.Mapping;
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

    public DbSet<OrderLook> OrderLooks => Set<OrderLook>();

    public DbSet<DrainRound> Rounds => Set<DrainRound>();

    public DbSet<Bottle> Bottles => Set<Bottle>();

    public DbSet<BenchBatch> BenchBatches => Set<BenchBatch>();

    public DbSet<BenchRow> BenchRows => Set<BenchRow>();

    public DbSet<ApiToken> ApiTokens => Set<ApiToken>();

    public DbSet<AuditEntry> AuditEntries => Set<AuditEntry>();

    public DbSet<AuditHead> AuditHeads => Set<AuditHead>();

    public DbSet<Revision> Revisions => Set<Revision>();

    /// <summary>Rows written in bulk within this unit of work, for the audit chain.</summary>
    public List<RecordBatch> Batches { get; } = [];

    /// <summary>Ids of new records that a batch vouches for: they get no audit entry of their own.</summary>
    public HashSet<Guid> Batched { get; } = [];

    private bool IsSqlite => Database.ProviderName!.EndsWith("Sqlite", StringComparison.Ordinal);

    protected override void OnModelCreating(ModelBuilder builder)
    {
        base.OnModelCreating(builder);
        ReservoirMapping.Map(builder);
        SampleMapping.Map(builder);
        WorkMapping.Map(builder);
    }

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder)
    {
        base.ConfigureConventions(configurationBuilder);
        if (IsSqlite)
        {
            configurationBuilder.Properties<DateTime>().HaveConversion<UnixMilliseconds>();
        }
        else
        {
            configurationBuilder.Properties<DateTime>().HaveConversion<Utc>();
        }
    }

    private sealed class UnixMilliseconds() : ValueConverter<DateTime, long>(
        time => new DateTimeOffset(DateTime.SpecifyKind(time, DateTimeKind.Utc)).ToUnixTimeMilliseconds(),
        milliseconds => DateTimeOffset.FromUnixTimeMilliseconds(milliseconds).UtcDateTime);

    private sealed class Utc() : ValueConverter<DateTime, DateTime>(
        time => DateTime.SpecifyKind(time, DateTimeKind.Utc),
        time => DateTime.SpecifyKind(time, DateTimeKind.Utc));
}
