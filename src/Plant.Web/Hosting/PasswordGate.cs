using Plant.Web.Features.Account;

namespace Plant.Web.Hosting;

/// <summary>Whoever signed in with a one-time password chooses an own one before anything else.</summary>
public sealed class PasswordGate(RequestDelegate next)
{
    public Task InvokeAsync(HttpContext context)
    {
        if (context.User.HasClaim(claim => claim.Type == PlantClaims.MustChangePassword) && context.GetEndpoint() is not null
            && !context.Request.Path.StartsWithSegments("/account") && !context.Request.Path.StartsWithSegments("/_framework")
            && context.GetEndpoint()!.Metadata.GetMetadata<Microsoft.AspNetCore.Authorization.IAllowAnonymous>() is null)
        {
            context.Response.Redirect("/account");
            return Task.CompletedTask;
        }

        return next(context);
    }
}
