using Microsoft.AspNetCore.Identity;

namespace Plant.Register.Access;

/// <summary>A person who signs in.</summary>
public sealed class PlantUser : IdentityUser<Guid>
{
    public string? DisplayName { get; set; }

    public bool Disabled { get; set; }

    /// <summary>True until a one-time password was replaced.</summary>
    public bool MustChangePassword { get; set; }
}
