using System.Security.Claims;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Components.Server;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;
using Plant.Register.Access;

namespace Plant.Web.Features.Account;

/// <summary>An open page learns within a minute that its person was disabled or changed.</summary>
public sealed class RevalidatingState(ILoggerFactory logger, IServiceScopeFactory scopes, IOptions<IdentityOptions> options)
    : RevalidatingServerAuthenticationStateProvider(logger)
{
    protected override TimeSpan RevalidationInterval => TimeSpan.FromMinutes(1);

    protected override async Task<bool> ValidateAuthenticationStateAsync(AuthenticationState authenticationState, CancellationToken cancellationToken)
    {
        await using var scope = scopes.CreateAsyncScope();
        var users = scope.ServiceProvider.GetRequiredService<UserManager<PlantUser>>();
        var user = await users.GetUserAsync(authenticationState.User);
        if (user is null or { Disabled: true })
        {
            return false;
        }

        var roles = await users.GetRolesAsync(user);
        return authenticationState.User.FindFirstValue(options.Value.ClaimsIdentity.SecurityStampClaimType) == await users.GetSecurityStampAsync(user)
            && authenticationState.User.FindAll(ClaimTypes.Role).All(claim => roles.Contains(claim.Value));
    }
}
