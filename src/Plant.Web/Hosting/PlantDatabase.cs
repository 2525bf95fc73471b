using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.PostgreSql;
using Plant.Register.Sqlite;
using Plant.Register.Storage;

namespace Plant.Web.Hosting;

/// <summary>The register with its database: the same for the web app and for commands.</summary>
public static class PlantDatabase
{
    public static IServiceCollection AddPlant(this IServiceCollection services, PlantSettings settings)
    {
        services.AddSingleton(settings);
        services.AddSingleton(settings.Planning);
        services.AddSingleton(TimeProvider.System);
        services.Configure<IdentityOptions>(IdentitySchema.Apply);
        if (settings.Provider == PlantSettings.Sqlite)
        {
            services.AddSingleton<IDatabaseEngine, SqliteEngine>();
            services.AddDbContextFactory<PlantDbContext>(options => options.UsePlantSqlite(settings.ConnectionString));
        }
        else
        {
            services.AddSingleton<IDatabaseEngine, PostgreSqlEngine>();
            services.AddDbContextFactory<PlantDbContext>(options => options.UsePlantPostgreSql(settings.ConnectionString));
        }

        return services.AddRegister();
    }

    /// <summary>Creates the data folder, readable by this user alone.</summary>
    public static void PrepareFolder(this PlantSettings settings)
    {
        if (OperatingSystem.IsWindows())
        {
            Directory.CreateDirectory(settings.DataFolder);
        }
        else
        {
            Directory.CreateDirectory(settings.DataFolder, UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
        }
    }
}
