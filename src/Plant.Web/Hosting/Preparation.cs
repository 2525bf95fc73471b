using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Interchange;
using Plant.Register.Storage;
using Plant.Web.Features.Account;

namespace Plant.Web.Hosting;

/// <summary>What is done once before the first request.</summary>
public static class Preparation
{
    public static async Task PrepareAsync(this WebApplication app)
    {
        var stop = app.Lifetime.ApplicationStopping;
        var services = app.Services;
        var log = services.GetRequiredService<ILoggerFactory>().CreateLogger("Plant.Web");
        var (from, to) = await services.GetRequiredService<DatabaseMigrator>().MigrateAsync(stop);
        if (from != to)
        {
            log.LogInformation("database brought from version {From} to {To}", from, to);
        }

        if (app.Environment.IsDevelopment())
        {
            await ImportDemoPlantAsync(services, log, stop);
        }

        await services.GetRequiredService<DemoPeople>().PrepareAsync(stop);
        await services.GetRequiredService<FirstAdministrator>().OfferAsync(stop);
    }

    private static async Task ImportDemoPlantAsync(IServiceProvider services, ILogger log, CancellationToken stop)
    {
        var folder = Path.Combine(AppContext.BaseDirectory, "seed-data");
        await using (var context = await services.GetRequiredService<IDbContextFactory<PlantDbContext>>().CreateDbContextAsync(stop))
        {
            if (!Directory.Exists(folder) || await context.Reservoirs.AnyAsync(stop) || await context.Fluids.AnyAsync(stop))
            {
                return;
            }
        }

        var outcome = await services.GetRequiredService<Importer>().ImportAsync(folder, new ImportOptions(), Actor.Console("demo plant"), stop);
        if (!outcome.IsDone)
        {
            throw new InvalidDataException($"the demo plant is refused: {outcome.Value?.Files.SelectMany(f => f.Errors).FirstOrDefault()?.ToString() ?? outcome.Message}");
        }

        log.LogInformation("demo plant imported: {Rows} rows", outcome.Value!.Files.Sum(f => f.New));
    }
}
