using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Sqlite;

/// <summary>Gives the migration tool its context.</summary>
public sealed class DesignFactory : IDesignTimeDbContextFactory<PlantDbContext>
{
    public PlantDbContext CreateDbContext(string[] args)
    {
        var options = new DbContextOptionsBuilder<PlantDbContext>();
        options.UseApplicationServiceProvider(IdentitySchema.Services);
        options.UsePlantSqlite("Data Source=design.db");
        return new PlantDbContext(options.Options);
    }
}
