using Microsoft.EntityFrameworkCore;

namespace Plant.Register.Storage;

/// <summary>Creates or upgrades the database.</summary>
public sealed class DatabaseMigrator(IDbContextFactory<PlantDbContext> contexts, IDatabaseEngine engine)
{
    /// <summary>Name of an empty database's version.</summary>
    public const string Nothing = "nothing";

    /// <summary>Brings the schema to this program's version and says from which to which.</summary>
    public async Task<(string From, string To)> MigrateAsync(CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var known = context.Database.GetMigrations().ToList();
        var applied = await engine.ExistsAsync(context, cancellation) ? (await context.Database.GetAppliedMigrationsAsync(cancellation)).ToList() : [];
        var newer = applied.Except(known).ToList();
        if (newer.Count > 0)
        {
            throw new InvalidOperationException($"the database is of a newer program (it knows {newer[^1]}); nothing was touched: use that program or a newer one");
        }

        var from = applied.Count == 0 ? Nothing : applied[^1];
        if (applied.Count == known.Count)
        {
            return (from, from);
        }

        if (applied.Count > 0)
        {
            await engine.BackupBeforeUpgradeAsync(context, from, cancellation);
        }

        await engine.ClearStaleMigrationLockAsync(context, cancellation);
        await context.Database.MigrateAsync(cancellation);
        return (from, known[^1]);
    }
}
