using Plant.Advice;

namespace Plant.Web.Hosting;

/// <summary>The settings of the program, checked at start: a wrong one stops it with the key's name.</summary>
public sealed record PlantSettings(string Provider, string ConnectionString, string DataFolder, PlanningRule Planning)
{
    public const string Sqlite = "Sqlite";
    public const string PostgreSql = "PostgreSql";

    public static PlantSettings Read(IConfiguration configuration)
    {
        var folder = Path.GetFullPath(configuration["Data:Folder"] ?? "data");
        var provider = configuration["Database:Provider"] ?? Sqlite;
        if (provider is not (Sqlite or PostgreSql))
        {
            throw new SettingException("Database:Provider", provider, $"must be {Sqlite} or {PostgreSql}");
        }

        var connection = configuration.GetConnectionString("Plant");
        if (string.IsNullOrWhiteSpace(connection))
        {
            connection = provider == Sqlite
                ? $"Data Source={Path.Combine(folder, "plant.db")}"
                : throw new SettingException("ConnectionStrings:Plant", "", "is needed for PostgreSql, such as Host=localhost;Database=plant;Username=plant");
        }

        var rule = new PlanningRule(Share(configuration, "Planning:CapacityShare", 0.6), Share(configuration, "Planning:Risk", 0.02));
        return new PlantSettings(provider, connection, folder, rule);
    }

    private static double Share(IConfiguration configuration, string key, double standard)
    {
        var text = configuration[key];
        if (text is null)
        {
            return standard;
        }

        return double.TryParse(text, System.Globalization.NumberStyles.Float, System.Globalization.CultureInfo.InvariantCulture, out var value) && value is > 0 and < 1
            ? value
            : throw new SettingException(key, text, "must be a number between 0 and 1");
    }
}

/// <summary>A setting that cannot be used.</summary>
public sealed class SettingException(string key, string value, string remedy) : Exception($"setting {key} = \"{value}\" {remedy}");
