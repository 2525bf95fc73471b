namespace Plant.Register.Reservoirs;

/// <summary>A part of the site.</summary>
public sealed class Area
{
    public Guid Id { get; init; }

    public required Guid SiteId { get; init; }

    public required string Name { get; set; }
}
