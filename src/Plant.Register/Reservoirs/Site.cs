namespace Plant.Register.Reservoirs;

/// <summary>The site: one row; its name and time zone head every page and print.</summary>
public sealed class Site
{
    public Guid Id { get; init; }

    public required string Name { get; set; }

    /// <summary>IANA time zone, such as Europe/Oslo.</summary>
    public required string TimeZone { get; set; }
}
