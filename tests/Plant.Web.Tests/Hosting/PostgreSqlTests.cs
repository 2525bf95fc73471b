using System.Net;
using System.Net.Http.Json;
using Npgsql;
using Plant.Register.Access;
using Plant.Tests.Support;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Hosting;

/// <summary>The whole server on a real PostgreSQL: what the file-based one shows, this one shows too.</summary>
public sealed class PostgreSqlTests : IAsyncLifetime
{
    private PostgresServer? server;
    private WebPlant? plant;

    public async ValueTask InitializeAsync()
    {
        server = await PostgresServer.StartAsync();
        Assert.SkipUnless(server.Connection is not null, "PostgreSQL is missing: apt-get install postgresql");
        var database = $"web_{Guid.CreateVersion7():N}";
        await using (var source = NpgsqlDataSource.Create(server.Connection))
        {
            await using var create = source.CreateCommand($"CREATE DATABASE {database}");
            await create.ExecuteNonQueryAsync();
        }

        var connection = new NpgsqlConnectionStringBuilder(server.Connection) { Database = database }.ConnectionString;
        plant = new WebPlant { Settings = new() { ["Database:Provider"] = "PostgreSql", ["ConnectionStrings:Plant"] = connection } };
        await plant.InitializeAsync();
    }

    public async ValueTask DisposeAsync()
    {
        if (plant is not null)
        {
            await plant.DisposeAsync();
        }

        NpgsqlConnection.ClearAllPools();
        if (server is not null)
        {
            await server.DisposeAsync();
        }
    }

    [Fact]
    public async Task DemoPlant_IsShownJudgedAndWrittenTo()
    {
        using var person = await plant!.PersonAsync(PlantRole.Planner);
        var fleet = await person.GetStringAsync(new Uri("/", UriKind.Relative));
        Assert.Contains("hold free water", fleet, StringComparison.Ordinal);
        using var http = plant.Token(PlantRole.Planner);
        Assert.Contains("\"condition\":", await http.GetStringAsync(new Uri("/api/v1/reservoirs/PH-TG-01/assessment", UriKind.Relative)), StringComparison.Ordinal);

        object[] readings = [new { tag = "PH-TG-01", readAt = "2026-11-30T10:00:01Z", oilTemperatureC = 52.5, waterActivity = 0.6 }];
        foreach (var _ in Enumerable.Range(0, 2))
        {
            using var posted = await http.PostAsJsonAsync("/api/v1/readings", readings);
            Assert.Equal(HttpStatusCode.OK, posted.StatusCode);
        }

        using var made = await http.PostAsJsonAsync("/api/v1/fluids", new { code = "PG-1", name = "Oil", family = "mineral" });
        Assert.Equal(HttpStatusCode.Created, made.StatusCode);
        using var ready = await http.GetAsync(new Uri("/health/ready", UriKind.Relative));
        Assert.Equal(HttpStatusCode.OK, ready.StatusCode);
    }
}
