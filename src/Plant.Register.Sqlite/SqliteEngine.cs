using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;
using Plant.Register.Samples;
using Plant.Register.Storage;

namespace Plant.Register.Sqlite;

/// <summary>SQLite: one writer in the process, immediate transactions, prepared bulk inserts, copies by VACUUM INTO.</summary>
public sealed class SqliteEngine : IDatabaseEngine, IDisposable
{
    private const int ConstraintFailed = 19;

    private readonly SemaphoreSlim gate = new(1, 1);

    public string Name => "Sqlite";

    public async Task<IWriteTransaction> BeginWriteAsync(PlantDbContext context, CancellationToken cancellation)
    {
        await gate.WaitAsync(cancellation);
        try
        {
            // the driver begins IMMEDIATE, so a transaction that reads first cannot fail at its first write
            return new Gated(gate, await context.Database.BeginTransactionAsync(cancellation));
        }
        catch
        {
            gate.Release();
            throw;
        }
    }

    public async Task InsertReadingsAsync(PlantDbContext context, IReadOnlyList<Reading> readings, CancellationToken cancellation)
    {
        await using var command = Command(context, "INSERT INTO readings (\"SeriesNumber\", \"AtMs\", \"OilTemperatureC\", \"WaterActivity\") VALUES ($s, $t, $c, $a)");
        var series = command.Parameters.Add("$s", SqliteType.Integer);
        var at = command.Parameters.Add("$t", SqliteType.Integer);
        var temperature = command.Parameters.Add("$c", SqliteType.Real);
        var activity = command.Parameters.Add("$a", SqliteType.Real);
        foreach (var reading in readings)
        {
            series.Value = reading.SeriesNumber;
            at.Value = reading.AtMs;
            temperature.Value = reading.OilTemperatureC ?? (object)DBNull.Value;
            activity.Value = reading.WaterActivity ?? (object)DBNull.Value;
            command.ExecuteNonQuery();
        }
    }

    public async Task InsertSamplesAsync(PlantDbContext context, IReadOnlyList<Sample> samples, CancellationToken cancellation)
    {
        var names = SampleTable.Columns.Select((_, index) => SampleTable.Parameter(index)).ToList();
        await using var command = Command(context, $"INSERT INTO samples ({SampleTable.ColumnList}) VALUES ({string.Join(", ", names)})");
        var parameters = names.Select(name => command.Parameters.Add(new SqliteParameter(name, null))).ToList();
        foreach (var sample in samples)
        {
            var values = SampleTable.Values(sample);
            for (var i = 0; i < values.Length; i++)
            {
                parameters[i].Value = values[i] switch
                {
                    null => DBNull.Value,
                    Guid id => id.ToString().ToUpperInvariant(),
                    DateTime time => new DateTimeOffset(time).ToUnixTimeMilliseconds(),
                    var value => value,
                };
            }

            command.ExecuteNonQuery();
        }
    }

    public async Task<IReadOnlyList<string>> CheckAsync(PlantDbContext context, CancellationToken cancellation)
    {
        await context.Database.OpenConnectionAsync(cancellation);
        return await CheckAsync((SqliteConnection)context.Database.GetDbConnection(), cancellation);
    }

    public async Task BackupAsync(PlantDbContext context, string file, CancellationToken cancellation)
    {
        var unfinished = file + ".part";
        File.Delete(unfinished);
        await context.Database.OpenConnectionAsync(cancellation);
        await using (var command = context.Database.GetDbConnection().CreateCommand())
        {
            command.CommandText = "VACUUM INTO $file";
            command.Parameters.Add(new SqliteParameter("$file", unfinished));
            await command.ExecuteNonQueryAsync(cancellation);
        }

        await RequireSoundAsync(unfinished, cancellation);
        await using (var stream = new FileStream(unfinished, FileMode.Open, FileAccess.ReadWrite))
        {
            stream.Flush(flushToDisk: true);
        }

        File.Move(unfinished, file, overwrite: true);
    }

    public async Task<string> RestoreAsync(PlantDbContext context, string file, CancellationToken cancellation)
    {
        await RequireSoundAsync(file, cancellation);
        var database = FileOf(context);
        var kept = FormattableString.Invariant($"{database}.replaced-{new FileInfo(file).LastWriteTimeUtc:yyyyMMddHHmmssfff}");
        if (File.Exists(database))
        {
            await context.Database.OpenConnectionAsync(cancellation);
            await using (var command = context.Database.GetDbConnection().CreateCommand())
            {
                command.CommandText = "PRAGMA wal_checkpoint(TRUNCATE)";
                await command.ExecuteNonQueryAsync(cancellation);
            }

            await context.Database.CloseConnectionAsync();
            SqliteConnection.ClearAllPools();
            File.Move(database, kept, overwrite: true);
            File.Delete(database + "-wal");
            File.Delete(database + "-shm");
        }

        File.Copy(file, database + ".part", overwrite: true);
        File.Move(database + ".part", database);
        return kept;
    }

    public Task<bool> ExistsAsync(PlantDbContext context, CancellationToken cancellation) =>
        Task.FromResult(File.Exists(FileOf(context)));

    public Task BackupBeforeUpgradeAsync(PlantDbContext context, string version, CancellationToken cancellation) =>
        BackupAsync(context, $"{FileOf(context)}.before-{version}", cancellation);

    public async Task ClearStaleMigrationLockAsync(PlantDbContext context, CancellationToken cancellation)
    {
        if (!File.Exists(FileOf(context)))
        {
            return;
        }

        // an embedded database has one program: a lock row that is there before this one starts its upgrade is left from a killed one
        await context.Database.OpenConnectionAsync(cancellation);
        await using var command = Command(context, "DROP TABLE IF EXISTS \"__EFMigrationsLock\"");
        await command.ExecuteNonQueryAsync(cancellation);
    }

    public bool IsUniqueViolation(Exception failure) =>
        failure.InnerException is SqliteException { SqliteErrorCode: ConstraintFailed, SqliteExtendedErrorCode: 2067 or 1555 };

    public void Dispose() => gate.Dispose();

    private static string FileOf(PlantDbContext context) => new SqliteConnectionStringBuilder(context.Database.GetConnectionString()).DataSource;

    private static SqliteCommand Command(PlantDbContext context, string sql)
    {
        var command = ((SqliteConnection)context.Database.GetDbConnection()).CreateCommand();
        command.Transaction = (SqliteTransaction?)context.Database.CurrentTransaction?.GetDbTransaction();
        command.CommandText = sql;
        return command;
    }

    private static async Task RequireSoundAsync(string file, CancellationToken cancellation)
    {
        if (!File.Exists(file))
        {
            throw new FileNotFoundException($"there is no file {file}", file);
        }

        IReadOnlyList<string> findings;
        try
        {
            await using var connection = new SqliteConnection(new SqliteConnectionStringBuilder { DataSource = file, Mode = SqliteOpenMode.ReadOnly, Pooling = false }.ToString());
            await connection.OpenAsync(cancellation);
            findings = await CheckAsync(connection, cancellation);
        }
        catch (SqliteException damaged)
        {
            throw new InvalidDataException($"{file} is no sound database: {damaged.Message}", damaged);
        }

        if (findings.Count > 0)
        {
            throw new InvalidDataException($"{file} is no sound database: {findings[0]}");
        }
    }

    private static async Task<IReadOnlyList<string>> CheckAsync(SqliteConnection connection, CancellationToken cancellation)
    {
        var findings = new List<string>();
        await using var command = connection.CreateCommand();
        command.CommandText = "PRAGMA integrity_check";
        await using (var reader = await command.ExecuteReaderAsync(cancellation))
        {
            while (await reader.ReadAsync(cancellation))
            {
                if (reader.GetString(0) != "ok")
                {
                    findings.Add($"integrity: {reader.GetString(0)}");
                }
            }
        }

        command.CommandText = "PRAGMA foreign_key_check";
        await using (var reader = await command.ExecuteReaderAsync(cancellation))
        {
            while (await reader.ReadAsync(cancellation))
            {
                findings.Add(FormattableString.Invariant($"foreign key: row {reader.GetValue(1)} of {reader.GetString(0)} names no row of {reader.GetString(2)}"));
            }
        }

        return findings;
    }

    private sealed class Gated(SemaphoreSlim gate, IDbContextTransaction transaction) : IWriteTransaction
    {
        public IDbContextTransaction Transaction => transaction;

        public async ValueTask DisposeAsync()
        {
            try
            {
                await transaction.DisposeAsync();
            }
            finally
            {
                gate.Release();
            }
        }
    }
}
