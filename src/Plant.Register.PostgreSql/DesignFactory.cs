using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.PostgreSql;

/// <summary>Gives the migration tool its context.</summary>
public sealed class DesignFactory : IDesignTimeDbContextFactory<PlantDbContext>
{
    public PlantDbContext CreateDbContext(string[] args)
    {
        var options = new DbContextOptionsBuilder<PlantDbContext>();
        options.UseApplicationServiceProvider(IdentitySchema.Services);
        options.UsePlantPostgreSql("Host=localhost;Database=design");
        return new PlantDbContext(options.Options);
    }
}
