using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.DependencyInjection;

namespace Plant.Register.Access;

/// <summary>Shape of the identity tables: host, migrations, commands and tests must agree on it.</summary>
public static class IdentitySchema
{
    /// <summary>For those who build a context without a host.</summary>
    public static IServiceProvider Services { get; } = new ServiceCollection().Configure<IdentityOptions>(Apply).BuildServiceProvider();

    public static void Apply(IdentityOptions options)
    {
        options.Stores.SchemaVersion = IdentitySchemaVersions.Version3;
        options.Stores.MaxLengthForKeys = 128;
    }
}
