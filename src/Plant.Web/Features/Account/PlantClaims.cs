using System.Globalization;
using System.Security.Claims;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;
using Plant.Register.Access;

namespace Plant.Web.Features.Account;

/// <summary>From the signed-in principal to the actor that services know.</summary>
public static class PlantClaims
{
    /// <summary>Carried until a one-time password was replaced.</summary>
    public const string MustChangePassword = "must-change-password";

    /// <summary>When the person last proved who it is, in Unix seconds.</summary>
    public const string ConfirmedAt = "auth_time";

    public static Actor ToActor(this ClaimsPrincipal principal) => new(
        principal.Identity?.Name ?? "nobody",
        principal.FindAll(ClaimTypes.Role).Select(claim => claim.Value).ToHashSet(StringComparer.Ordinal))
    {
        PersonId = Guid.TryParse(principal.FindFirstValue(ClaimTypes.NameIdentifier), out var id) ? id : null,
        ConfirmedAt = long.TryParse(principal.FindFirstValue(ConfirmedAt), NumberStyles.None, CultureInfo.InvariantCulture, out var seconds) ? DateTimeOffset.FromUnixTimeSeconds(seconds).UtcDateTime : null,
    };

    /// <summary>The claim of a proof made now.</summary>
    public static Claim Confirmed(DateTimeOffset now) => new(ConfirmedAt, now.ToUnixTimeSeconds().ToString(CultureInfo.InvariantCulture));
}

/// <summary>Adds the roles and what the sign-in must still do.</summary>
public sealed class PlantClaimsFactory(UserManager<PlantUser> users, RoleManager<IdentityRole<Guid>> roles, IOptions<IdentityOptions> options)
    : UserClaimsPrincipalFactory<PlantUser, IdentityRole<Guid>>(users, roles, options)
{
    protected override async Task<ClaimsIdentity> GenerateClaimsAsync(PlantUser user)
    {
        var identity = await base.GenerateClaimsAsync(user);
        if (user.MustChangePassword)
        {
            identity.AddClaim(new Claim(PlantClaims.MustChangePassword, "true"));
        }

        return identity;
    }
}
