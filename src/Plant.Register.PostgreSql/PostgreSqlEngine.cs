using System.Diagnostics;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;
using Npgsql;
using NpgsqlTypes;
using Plant.Register.Samples;
using Plant.Register.Storage;

namespace Plant.Register.PostgreSql;

/// <summary>PostgreSQL: writers queue on an advisory lock, bulk rows go by binary COPY, copies by pg_dump.</summary>
public sealed class PostgreSqlEngine : IDatabaseEngine
{
    private const long WriterLock = 0x53756D70;

    public string Name => "PostgreSql";

    public async Task<IWriteTransaction> BeginWriteAsync(PlantDbContext context, CancellationToken cancellation)
    {
        var transaction = await context.Database.BeginTransactionAsync(cancellation);
        await context.Database.ExecuteSqlAsync($"SELECT pg_advisory_xact_lock({WriterLock})", cancellation);
        return new Locked(transaction);
    }

    public async Task InsertReadingsAsync(PlantDbContext context, IReadOnlyList<Reading> readings, CancellationToken cancellation)
    {
        await using var copy = await Connection(context).BeginBinaryImportAsync(
            "COPY readings (\"SeriesNumber\", \"AtMs\", \"OilTemperatureC\", \"WaterActivity\") FROM STDIN (FORMAT BINARY)", cancellation);
        foreach (var reading in readings)
        {
            await copy.StartRowAsync(cancellation);
            await copy.WriteAsync(reading.SeriesNumber, NpgsqlDbType.Integer, cancellation);
            await copy.WriteAsync(reading.AtMs, NpgsqlDbType.Bigint, cancellation);
            await WriteAsync(copy, reading.OilTemperatureC, cancellation);
            await WriteAsync(copy, reading.WaterActivity, cancellation);
        }

        await copy.CompleteAsync(cancellation);
    }

    public async Task InsertSamplesAsync(PlantDbContext context, IReadOnlyList<Sample> samples, CancellationToken cancellation)
    {
        await using var copy = await Connection(context).BeginBinaryImportAsync($"COPY samples ({SampleTable.ColumnList}) FROM STDIN (FORMAT BINARY)", cancellation);
        foreach (var sample in samples)
        {
            await copy.StartRowAsync(cancellation);
            foreach (var value in SampleTable.Values(sample))
            {
                await (value switch
                {
                    null => copy.WriteNullAsync(cancellation),
                    Guid id => copy.WriteAsync(id, NpgsqlDbType.Uuid, cancellation),
                    DateTime time => copy.WriteAsync(time, NpgsqlDbType.TimestampTz, cancellation),
                    int number => copy.WriteAsync(number, NpgsqlDbType.Integer, cancellation),
                    double number => copy.WriteAsync(number, NpgsqlDbType.Double, cancellation),
                    _ => copy.WriteAsync((string)value, NpgsqlDbType.Text, cancellation),
                });
            }
        }

        await copy.CompleteAsync(cancellation);
    }

    public Task<IReadOnlyList<string>> CheckAsync(PlantDbContext context, CancellationToken cancellation) =>
        // the server checks pages (data checksums) and keys by itself as it reads; verify reads every row
        Task.FromResult<IReadOnlyList<string>>([]);

    public async Task BackupAsync(PlantDbContext context, string file, CancellationToken cancellation)
    {
        var unfinished = file + ".part";
        await RunAsync("pg_dump", context, ["--format=custom", $"--file={unfinished}"], cancellation);
        await RunAsync("pg_restore", null, ["--list", unfinished], cancellation);
        File.Move(unfinished, file, overwrite: true);
    }

    public async Task<string> RestoreAsync(PlantDbContext context, string file, CancellationToken cancellation)
    {
        await RunAsync("pg_restore", null, ["--list", file], cancellation);
        var kept = FormattableString.Invariant($"{file}.replaced");
        await BackupAsync(context, kept, cancellation);
        await RunAsync("pg_restore", context, ["--clean", "--if-exists", "--single-transaction", "--no-owner", file], cancellation);
        return kept;
    }

    public Task<bool> ExistsAsync(PlantDbContext context, CancellationToken cancellation) => context.Database.CanConnectAsync(cancellation);

    public Task BackupBeforeUpgradeAsync(PlantDbContext context, string version, CancellationToken cancellation) => Task.CompletedTask;

    // the server frees the lock of a process that died
    public Task ClearStaleMigrationLockAsync(PlantDbContext context, CancellationToken cancellation) => Task.CompletedTask;

    public bool IsUniqueViolation(Exception failure) => failure.InnerException is PostgresException { SqlState: PostgresErrorCodes.UniqueViolation };

    private static NpgsqlConnection Connection(PlantDbContext context) => (NpgsqlConnection)context.Database.GetDbConnection();

    private static Task WriteAsync(NpgsqlBinaryImporter copy, double? value, CancellationToken cancellation) =>
        value is { } number ? copy.WriteAsync(number, NpgsqlDbType.Double, cancellation) : copy.WriteNullAsync(cancellation);

    private static async Task RunAsync(string tool, PlantDbContext? context, IEnumerable<string> arguments, CancellationToken cancellation)
    {
        var start = new ProcessStartInfo(tool) { RedirectStandardError = true, RedirectStandardOutput = true };
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        if (context is not null)
        {
            var database = new NpgsqlConnectionStringBuilder(context.Database.GetConnectionString());
            start.Environment["PGHOST"] = database.Host;
            start.Environment["PGPORT"] = database.Port.ToString(System.Globalization.CultureInfo.InvariantCulture);
            start.Environment["PGUSER"] = database.Username;
            start.Environment["PGPASSWORD"] = database.Password ?? string.Empty;
            start.ArgumentList.Add($"--dbname={database.Database}");
        }

        using var process = Start(start, tool);
        var output = process.StandardOutput.ReadToEndAsync(cancellation);
        var error = await process.StandardError.ReadToEndAsync(cancellation);
        await output;
        await process.WaitForExitAsync(cancellation);
        if (process.ExitCode != 0)
        {
            throw new InvalidDataException($"{tool}: {error.Trim()}");
        }
    }

    private static Process Start(ProcessStartInfo start, string tool)
    {
        try
        {
            return Process.Start(start)!;
        }
        catch (System.ComponentModel.Win32Exception missing)
        {
            throw new InvalidOperationException($"{tool} is not on this machine: install the PostgreSQL client tools", missing);
        }
    }

    private sealed class Locked(IDbContextTransaction transaction) : IWriteTransaction
    {
        public IDbContextTransaction Transaction => transaction;

        public ValueTask DisposeAsync() => transaction.DisposeAsync();
    }
}
