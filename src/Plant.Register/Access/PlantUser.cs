using Microsoft.AspNetCore.Identity;

namespace Plant.Register.Access;

/// <summary>A person who signs in.</summary>
public sealed class PlantUser : IdentityUser<Guid>
{
    public string? DisplayName { get; set; }

    public bool Disabled { get; set; }
}
