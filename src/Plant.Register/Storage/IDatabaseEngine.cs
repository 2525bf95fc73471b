using Microsoft.EntityFrameworkCore.Storage;
using Plant.Register.Samples;

namespace Plant.Register.Storage;

/// <summary>What differs between the two databases.</summary>
public interface IDatabaseEngine
{
    /// <summary>Sqlite or PostgreSql, as in the setting Database:Provider.</summary>
    string Name { get; }

    /// <summary>Takes the one place of a writer and opens a transaction that will not have to wait again; disposing gives both back.</summary>
    Task<IWriteTransaction> BeginWriteAsync(PlantDbContext context, CancellationToken cancellation);

    /// <summary>Inserts readings, ordered by series and time, that the table does not hold yet.</summary>
    Task InsertReadingsAsync(PlantDbContext context, IReadOnlyList<Reading> readings, CancellationToken cancellation);

    /// <summary>Inserts samples that the table does not hold yet, without tracking.</summary>
    Task InsertSamplesAsync(PlantDbContext context, IReadOnlyList<Sample> samples, CancellationToken cancellation);

    /// <summary>The database's own checks of integrity and foreign keys; empty where all is well.</summary>
    Task<IReadOnlyList<string>> CheckAsync(PlantDbContext context, CancellationToken cancellation);

    /// <summary>Writes a consistent copy while the program runs.</summary>
    Task BackupAsync(PlantDbContext context, string file, CancellationToken cancellation);

    /// <summary>Checks a copy, then puts it in the place of the database and keeps what it replaced.</summary>
    Task<string> RestoreAsync(PlantDbContext context, string file, CancellationToken cancellation);

    /// <summary>True where there is a database yet.</summary>
    Task<bool> ExistsAsync(PlantDbContext context, CancellationToken cancellation);

    /// <summary>Keeps a copy beside an embedded database before its schema changes; a server's operator makes their own.</summary>
    Task BackupBeforeUpgradeAsync(PlantDbContext context, string version, CancellationToken cancellation);

    /// <summary>Removes the lock that a process killed during an upgrade left behind.</summary>
    Task ClearStaleMigrationLockAsync(PlantDbContext context, CancellationToken cancellation);

    /// <summary>True where a failed write hit a unique key.</summary>
    bool IsUniqueViolation(Exception failure);
}

/// <summary>The place of the writer and its transaction.</summary>
public interface IWriteTransaction : IAsyncDisposable
{
    IDbContextTransaction Transaction { get; }
}
