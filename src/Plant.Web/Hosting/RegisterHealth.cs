using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Diagnostics.HealthChecks;
using Plant.Register.Storage;

namespace Plant.Web.Hosting;

/// <summary>Ready: the database answers and its schema is this program's.</summary>
public sealed class RegisterHealth(IDbContextFactory<PlantDbContext> contexts) : IHealthCheck
{
    public async Task<HealthCheckResult> CheckHealthAsync(HealthCheckContext context, CancellationToken cancellationToken = default)
    {
        try
        {
            await using var database = await contexts.CreateDbContextAsync(cancellationToken);
            return (await database.Database.GetPendingMigrationsAsync(cancellationToken)).Any()
                ? HealthCheckResult.Unhealthy("the schema is older than the program")
                : HealthCheckResult.Healthy();
        }
        catch (System.Data.Common.DbException failure)
        {
            return HealthCheckResult.Unhealthy("the database does not answer", failure);
        }
    }
}
