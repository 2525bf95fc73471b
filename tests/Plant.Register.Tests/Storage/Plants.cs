using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Time.Testing;
using Npgsql;
using Plant.Advice;
using Plant.Register.Access;
using Plant.Register.PostgreSql;
using Plant.Register.Sqlite;
using Plant.Register.Storage;
using Plant.Tests.Support;

namespace Plant.Register.Tests.Storage;

/// <summary>The two databases that every test of this project runs on.</summary>
public enum Engine
{
    Sqlite,
    PostgreSql,
}

/// <summary>Makes empty registers on real databases.</summary>
public sealed class Plants : IAsyncLifetime
{
    private PostgresServer? postgres;
    private int number;

    public async ValueTask InitializeAsync() => postgres = await PostgresServer.StartAsync();

    public async ValueTask DisposeAsync()
    {
        if (postgres is not null)
        {
            await postgres.DisposeAsync();
        }
    }

    public async Task<TestPlant> EmptyAsync(Engine engine)
    {
        if (engine == Engine.PostgreSql)
        {
            Assert.SkipWhen(postgres!.Connection is null, "no PostgreSQL on this machine: apt-get install postgresql");
        }

        var name = $"t{Environment.ProcessId}_{Interlocked.Increment(ref number)}";
        var plant = new TestPlant(engine, postgres?.Connection, name);
        await plant.CreateAsync();
        return plant;
    }
}

/// <summary>One register on its own database, with a clock that the test sets.</summary>
public sealed class TestPlant : IAsyncDisposable
{
    private readonly ServiceProvider services;
    private readonly Engine engine;
    private readonly string? maintenance;
    private readonly string name;

    public TestPlant(Engine engine, string? maintenance, string name)
    {
        this.engine = engine;
        this.maintenance = maintenance;
        this.name = name;
        Folder = Directory.CreateTempSubdirectory("plant-").FullName;
        var collection = new ServiceCollection().AddLogging();
        collection.Configure<IdentityOptions>(IdentitySchema.Apply);
        collection.AddSingleton<TimeProvider>(Clock);
        collection.AddSingleton(new PlanningRule());
        if (engine == Engine.Sqlite)
        {
            collection.AddSingleton<IDatabaseEngine, SqliteEngine>();
            collection.AddDbContextFactory<PlantDbContext>(options => options.UsePlantSqlite($"Data Source={File}"));
        }
        else
        {
            collection.AddSingleton<IDatabaseEngine, PostgreSqlEngine>();
            collection.AddDbContextFactory<PlantDbContext>(options => options.UsePlantPostgreSql(new NpgsqlConnectionStringBuilder(maintenance) { Database = name }.ToString()));
        }

        services = collection.AddRegister().BuildServiceProvider();
    }

    public FakeTimeProvider Clock { get; } = new(new DateTimeOffset(2026, 12, 1, 8, 0, 0, TimeSpan.Zero));

    public string Folder { get; }

    public string File => Path.Combine(Folder, "plant.db");

    public static Actor Planner { get; } = new("planner@test", new HashSet<string> { PlantRole.Planner });

    public static Actor Lab { get; } = new("lab@test", new HashSet<string> { PlantRole.Lab });

    public static Actor Administrator { get; } = new("admin@test", new HashSet<string> { PlantRole.Administrator });

    public T Get<T>()
        where T : notnull => services.GetRequiredService<T>();

    public Task<PlantDbContext> OpenAsync() => Get<IDbContextFactory<PlantDbContext>>().CreateDbContextAsync();

    public async Task CreateAsync()
    {
        if (engine == Engine.PostgreSql)
        {
            await ExecuteAsync($"CREATE DATABASE {name}");
        }

        await Get<DatabaseMigrator>().MigrateAsync();
    }

    public async ValueTask DisposeAsync()
    {
        await services.DisposeAsync();
        if (engine == Engine.PostgreSql)
        {
            NpgsqlConnection.ClearAllPools();
            await ExecuteAsync($"DROP DATABASE {name} WITH (FORCE)");
        }
        else
        {
            Microsoft.Data.Sqlite.SqliteConnection.ClearAllPools();
        }

        Directory.Delete(Folder, recursive: true);
    }

    private async Task ExecuteAsync(string sql)
    {
        await using var connection = new NpgsqlConnection(maintenance);
        await connection.OpenAsync();
        await using var command = connection.CreateCommand();
        command.CommandText = sql;
        await command.ExecuteNonQueryAsync();
    }
}

[CollectionDefinition(Name)]
public sealed class PlantsCollection : ICollectionFixture<Plants>
{
    public const string Name = "real databases";
}
