using Microsoft.EntityFrameworkCore;

namespace Plant.Register.PostgreSql;

/// <summary>PostgreSQL, where several instances share one database.</summary>
public static class PostgreSqlProvider
{
    public static DbContextOptionsBuilder UsePlantPostgreSql(this DbContextOptionsBuilder options, string connectionString) =>
        options.UseNpgsql(connectionString, npgsql => npgsql.MigrationsAssembly(typeof(PostgreSqlProvider).Assembly.GetName().Name));
}
