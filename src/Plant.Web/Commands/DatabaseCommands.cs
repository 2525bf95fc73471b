using Microsoft.EntityFrameworkCore;
using Plant.Register.Audit;
using Plant.Register.Storage;

namespace Plant.Web.Commands;

/// <summary>migrate, backup, restore, verify.</summary>
internal static class DatabaseCommands
{
    public static async Task<int> MigrateAsync(CommandContext context)
    {
        context.NoWords();
        var (from, to) = await context.Get<DatabaseMigrator>().MigrateAsync();
        context.Out.WriteLine(from == to ? $"The database is at version {to}; nothing to do." : $"The database was brought from version {from} to {to}.");
        return CommandRunner.Done;
    }

    public static async Task<int> BackupAsync(CommandContext context)
    {
        var file = CommandContext.PathOf(context.Word("FILE"));
        await using var database = await context.Get<IDbContextFactory<PlantDbContext>>().CreateDbContextAsync();
        await RequireDatabaseAsync(context, database);
        await context.Get<IDatabaseEngine>().BackupAsync(database, file, CancellationToken.None);
        context.Out.WriteLine($"Copied to {file}, verified.");
        return CommandRunner.Done;
    }

    public static async Task<int> RestoreAsync(CommandContext context)
    {
        var file = CommandContext.PathOf(context.Word("FILE"));
        await using var database = await context.Get<IDbContextFactory<PlantDbContext>>().CreateDbContextAsync();
        var kept = await context.Get<IDatabaseEngine>().RestoreAsync(database, file, CancellationToken.None);
        context.Out.WriteLine($"Restored from {file}. What it replaced is kept as {kept}.");
        return CommandRunner.Done;
    }

    public static async Task<int> VerifyAsync(CommandContext context)
    {
        context.NoWords();
        await using (var database = await context.Get<IDbContextFactory<PlantDbContext>>().CreateDbContextAsync())
        {
            await RequireDatabaseAsync(context, database);
        }

        var findings = await context.Get<AuditVerifier>().VerifyAsync();
        foreach (var finding in findings)
        {
            context.Error.WriteLine(finding);
        }

        if (findings.Count == 0)
        {
            context.Out.WriteLine("Integrity, foreign keys, audit chain and records are sound.");
        }

        return findings.Count == 0 ? CommandRunner.Done : CommandRunner.Refused;
    }

    private static async Task RequireDatabaseAsync(CommandContext context, PlantDbContext database)
    {
        if (!await context.Get<IDatabaseEngine>().ExistsAsync(database, CancellationToken.None))
        {
            throw new InvalidOperationException("there is no database yet: import a plant or start the program first");
        }
    }
}
