using System.Security.Claims;
using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc;
using Plant.Register.Access;
using SignInResult = Microsoft.AspNetCore.Identity.SignInResult;

namespace Plant.Web.Features.Account;

/// <summary>What the forms of the account pages post to. Antiforgery is required by the forms themselves.</summary>
public static class AccountEndpoints
{
    public static void MapAccount(this IEndpointRouteBuilder routes)
    {
        var account = routes.MapGroup("/account").ExcludeFromDescription();
        account.MapPost("/sign-in", SignInAsync).AllowAnonymous().RequireRateLimiting(AccountServices.SignInLimit);
        account.MapPost("/demo", DemoAsync).AllowAnonymous();
        account.MapPost("/first", FirstAsync).AllowAnonymous().RequireRateLimiting(AccountServices.SignInLimit);
        account.MapPost("/sign-out", SignOutAsync).AllowAnonymous();
        account.MapPost("/confirm", ConfirmAsync).RequireRateLimiting(AccountServices.SignInLimit);
        account.MapPost("/everywhere", EverywhereAsync).RequireRateLimiting(AccountServices.SignInLimit);
        account.MapPost("/password", PasswordAsync).RequireRateLimiting(AccountServices.SignInLimit);
    }

    /// <summary>Only addresses of this site: nobody is sent elsewhere by a link.</summary>
    public static string Local(string? address) =>
        address is { Length: > 0 } && address[0] == '/' && (address.Length == 1 || address[1] is not ('/' or '\\')) ? address : "/";

    private static async Task<IResult> SignInAsync(
        SignInManager<PlantUser> signIn, UserManager<PlantUser> users, TimeProvider clock, [FromForm] string? email, [FromForm] string? password, [FromForm] string? returnUrl)
    {
        var user = await users.FindByEmailAsync(email ?? string.Empty);
        if (user is null)
        {
            // as long as a real check takes, so that the answer's time does not tell who is known
            users.PasswordHasher.HashPassword(new PlantUser(), password ?? string.Empty);
            return Failed("wrong", returnUrl);
        }

        var result = user.Disabled ? SignInResult.NotAllowed : await signIn.CheckPasswordSignInAsync(user, password ?? string.Empty, lockoutOnFailure: true);
        if (!result.Succeeded)
        {
            return Failed(result.IsLockedOut ? "locked" : "wrong", returnUrl);
        }

        await signIn.SignInWithClaimsAsync(user, isPersistent: false, [PlantClaims.Confirmed(clock.GetUtcNow())]);
        return TypedResults.LocalRedirect(user.MustChangePassword ? "/account" : Local(returnUrl));
    }

    private static async Task<IResult> DemoAsync(
        SignInManager<PlantUser> signIn, UserManager<PlantUser> users, DemoPeople demo, TimeProvider clock, [FromForm] string? role, [FromForm] string? returnUrl)
    {
        var user = demo.Offered && role is not null ? await users.FindByEmailAsync(DemoPeople.EmailOf(role)) : null;
        if (user is null)
        {
            return TypedResults.NotFound();
        }

        await signIn.SignInWithClaimsAsync(user, isPersistent: false, [PlantClaims.Confirmed(clock.GetUtcNow())]);
        return TypedResults.LocalRedirect(Local(returnUrl));
    }

    private static async Task<IResult> FirstAsync(
        FirstAdministrator first, UserManager<PlantUser> users, [FromForm] string? code, [FromForm] string? email, [FromForm] string? password, CancellationToken cancellation)
    {
        if (await WeaknessAsync(users, new PlantUser { Email = email }, password) is { } weak)
        {
            return Back("/account/first", weak);
        }

        var outcome = await first.MakeAsync(code ?? string.Empty, email ?? string.Empty, password!, cancellation);
        return outcome.IsDone
            ? TypedResults.LocalRedirect("/account/sign-in")
            : Back("/account/first", outcome.Message ?? outcome.Refusals[0].Field + " " + outcome.Refusals[0].Reason);
    }

    private static async Task<IResult> SignOutAsync(SignInManager<PlantUser> signIn, IAntiforgery antiforgery, HttpContext context)
    {
        // no field is bound here, so the framework would not check the token by itself
        if (!await antiforgery.IsRequestValidAsync(context))
        {
            return TypedResults.BadRequest();
        }

        await signIn.SignOutAsync();
        context.Response.Headers["Clear-Site-Data"] = "\"storage\"";
        return TypedResults.LocalRedirect("/account/sign-in");
    }

    private static async Task<IResult> PasswordAsync(
        ClaimsPrincipal principal, SignInManager<PlantUser> signIn, UserManager<PlantUser> users, [FromForm] string? current, [FromForm] string? password)
    {
        var user = await users.GetUserAsync(principal);
        if (user is null)
        {
            return TypedResults.LocalRedirect("/account/sign-in");
        }

        var result = await users.ChangePasswordAsync(user, current ?? string.Empty, password ?? string.Empty);
        if (!result.Succeeded)
        {
            return Back("/account", result.Errors.First().Description);
        }

        user.MustChangePassword = false;
        await users.UpdateAsync(user);
        await signIn.RefreshSignInAsync(user);
        return Back("/account", "The password was changed.");
    }

    /// <summary>Who is signed in proves it again: an approval asks for it after ten minutes.</summary>
    private static async Task<IResult> ConfirmAsync(
        ClaimsPrincipal principal, SignInManager<PlantUser> signIn, UserManager<PlantUser> users, DemoPeople demo, TimeProvider clock, [FromForm] string? password, [FromForm] string? returnUrl)
    {
        var user = await users.GetUserAsync(principal);
        if (user is null)
        {
            return TypedResults.LocalRedirect("/account/sign-in");
        }

        var proven = (demo.Offered && DemoPeople.IsDemo(user)) || (await signIn.CheckPasswordSignInAsync(user, password ?? string.Empty, lockoutOnFailure: true)).Succeeded;
        if (!proven)
        {
            return TypedResults.LocalRedirect($"/account/confirm?failed=wrong&returnUrl={Uri.EscapeDataString(Local(returnUrl))}");
        }

        await signIn.SignInWithClaimsAsync(user, isPersistent: false, [PlantClaims.Confirmed(clock.GetUtcNow())]);
        return TypedResults.LocalRedirect(Local(returnUrl));
    }

    /// <summary>Ends every session of this person, this one too.</summary>
    private static async Task<IResult> EverywhereAsync(ClaimsPrincipal principal, SignInManager<PlantUser> signIn, UserManager<PlantUser> users, IAntiforgery antiforgery, HttpContext context)
    {
        if (!await antiforgery.IsRequestValidAsync(context))
        {
            return TypedResults.BadRequest();
        }

        if (await users.GetUserAsync(principal) is { } user)
        {
            await users.UpdateSecurityStampAsync(user);
        }

        await signIn.SignOutAsync();
        return TypedResults.LocalRedirect("/account/sign-in");
    }

    private static async Task<string?> WeaknessAsync(UserManager<PlantUser> users, PlantUser user, string? password)
    {
        foreach (var validator in users.PasswordValidators)
        {
            var result = await validator.ValidateAsync(users, user, password);
            if (!result.Succeeded)
            {
                return result.Errors.First().Description;
            }
        }

        return null;
    }

    private static RedirectHttpResult Failed(string why, string? returnUrl) =>
        TypedResults.LocalRedirect($"/account/sign-in?failed={why}&returnUrl={Uri.EscapeDataString(Local(returnUrl))}");

    private static RedirectHttpResult Back(string page, string message) => TypedResults.LocalRedirect($"{page}?message={Uri.EscapeDataString(message)}");
}
