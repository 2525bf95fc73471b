using System.Security.Claims;
using System.Text.Encodings.Web;
using Microsoft.AspNetCore.Authentication;
using Microsoft.Extensions.Options;
using Plant.Register.Access;

namespace Plant.Web.Features.Account;

/// <summary>Authorization: Bearer … with an API token.</summary>
public sealed class TokenHandler(IOptionsMonitor<AuthenticationSchemeOptions> options, ILoggerFactory logger, UrlEncoder encoder, TokenService tokens)
    : AuthenticationHandler<AuthenticationSchemeOptions>(options, logger, encoder)
{
    public const string SchemeName = "Token";
    private const string Prefix = "Bearer ";

    public static bool IsBearer(HttpRequest request) => request.Headers.Authorization.ToString().StartsWith(Prefix, StringComparison.OrdinalIgnoreCase);

    protected override async Task<AuthenticateResult> HandleAuthenticateAsync()
    {
        if (!IsBearer(Request))
        {
            return AuthenticateResult.NoResult();
        }

        var actor = await tokens.ValidateAsync(Request.Headers.Authorization.ToString()[Prefix.Length..].Trim(), Context.RequestAborted);
        if (actor is null)
        {
            return AuthenticateResult.Fail("the token is unknown, revoked or has expired");
        }

        var identity = new ClaimsIdentity([new Claim(ClaimTypes.Name, actor.Name), PlantClaims.Confirmed(TimeProvider.GetUtcNow()), .. actor.Roles.Select(role => new Claim(ClaimTypes.Role, role))], SchemeName);
        return AuthenticateResult.Success(new AuthenticationTicket(new ClaimsPrincipal(identity), SchemeName));
    }

    protected override Task HandleChallengeAsync(AuthenticationProperties properties)
    {
        Response.StatusCode = StatusCodes.Status401Unauthorized;
        Response.Headers.WWWAuthenticate = "Bearer";
        return Task.CompletedTask;
    }
}
