using System.Data.Common;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace Plant.Register.Sqlite;

/// <summary>The embedded database.</summary>
public static class SqliteProvider
{
    public static DbContextOptionsBuilder UsePlantSqlite(this DbContextOptionsBuilder options, string connectionString) =>
        options
            .UseSqlite(connectionString, sqlite => sqlite.MigrationsAssembly(typeof(SqliteProvider).Assembly.GetName().Name))
            .AddInterceptors(Pragmas.Instance);

    /// <summary>Each connection: a write that was acknowledged is on the disk, and foreign keys hold.</summary>
    private sealed class Pragmas : DbConnectionInterceptor
    {
        public static readonly Pragmas Instance = new();

        private const string Sql = "PRAGMA journal_mode=WAL; PRAGMA synchronous=FULL; PRAGMA foreign_keys=ON; PRAGMA busy_timeout=5000; PRAGMA cache_size=-32768;";

        public override void ConnectionOpened(DbConnection connection, ConnectionEndEventData eventData)
        {
            using var command = connection.CreateCommand();
            command.CommandText = Sql;
            command.ExecuteNonQuery();
        }

        public override async Task ConnectionOpenedAsync(DbConnection connection, ConnectionEndEventData eventData, CancellationToken cancellationToken = default)
        {
            await using var command = connection.CreateCommand();
            command.CommandText = Sql;
            await command.ExecuteNonQueryAsync(cancellationToken);
        }
    }
}
