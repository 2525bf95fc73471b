using System.Threading.RateLimiting;
using Microsoft.AspNetCore.Authentication;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Identity;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Web.Features.Account;

/// <summary>Sign-in, roles and tokens.</summary>
public static class AccountServices
{
    /// <summary>Rate limit of everything that tries a password.</summary>
    public const string SignInLimit = "sign-in";

    private const string Chooser = "Chooser";
    private const int HashIterations = 210_000;

    /// <summary>What commands need to add people.</summary>
    public static IServiceCollection AddPeople(this IServiceCollection services)
    {
        services.AddIdentityCore<PlantUser>(Configure)
            .AddRoles<IdentityRole<Guid>>()
            .AddEntityFrameworkStores<PlantDbContext>()
            .AddClaimsPrincipalFactory<PlantClaimsFactory>()
            .AddPasswordValidator<CommonPasswordValidator>();
        services.Configure<PasswordHasherOptions>(options => options.IterationCount = HashIterations);
        return services.AddSingleton<PeopleService>(provider => new PeopleService(
            provider.GetRequiredService<RegisterWriter>(),
            new PasswordHasher<PlantUser>(provider.GetService<Microsoft.Extensions.Options.IOptions<PasswordHasherOptions>>()),
            new UpperInvariantLookupNormalizer()));
    }

    public static IServiceCollection AddAccount(this IServiceCollection services)
    {
        services.AddPeople();
        services.AddHttpContextAccessor();
        new IdentityBuilder(typeof(PlantUser), typeof(IdentityRole<Guid>), services).AddSignInManager().AddDefaultTokenProviders();
        services.AddCascadingAuthenticationState();
        services.AddScoped<AuthenticationStateProvider, RevalidatingState>();
        services.AddAuthentication(Chooser)
            .AddPolicyScheme(Chooser, null, options => options.ForwardDefaultSelector = context =>
                TokenHandler.IsBearer(context.Request) || IsApi(context.Request) && !context.Request.Cookies.Keys.Any(k => k.StartsWith(CookieName, StringComparison.Ordinal))
                    ? TokenHandler.SchemeName
                    : IdentityConstants.ApplicationScheme)
            .AddScheme<AuthenticationSchemeOptions, TokenHandler>(TokenHandler.SchemeName, null)
            .AddIdentityCookies();
        services.ConfigureApplicationCookie(Cookie);
        services.Configure<SecurityStampValidatorOptions>(options =>
        {
            options.ValidationInterval = TimeSpan.FromMinutes(1);
            options.OnRefreshingPrincipal = context =>
            {
                // renewing the roles is no new proof of who it is, and does not undo the old one
                if (context.CurrentPrincipal?.FindFirst(PlantClaims.ConfirmedAt) is { } proof)
                {
                    context.NewPrincipal?.Identities.First().AddClaim(proof);
                }

                return Task.CompletedTask;
            };
        });
        services.AddAuthorization(options =>
        {
            foreach (var duty in Enum.GetValues<Duty>())
            {
                options.AddPolicy(duty.ToString(), policy => policy.RequireRole(Duties.RolesFor(duty)));
            }

            options.FallbackPolicy = new AuthorizationPolicyBuilder().RequireRole(PlantRole.ForPeople).Build();
        });
        services.AddRateLimiter(options =>
        {
            options.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
            options.OnRejected = (context, _) =>
            {
                context.HttpContext.Response.Headers.RetryAfter = "60";
                return ValueTask.CompletedTask;
            };
            options.AddPolicy(SignInLimit, context => RateLimitPartition.GetFixedWindowLimiter(
                context.Connection.RemoteIpAddress?.ToString() ?? "local", _ => new() { PermitLimit = 20, Window = TimeSpan.FromMinutes(1) }));
        });
        return services.AddSingleton<FirstAdministrator>().AddSingleton<DemoPeople>();
    }

    public static bool IsApi(HttpRequest request) => request.Path.StartsWithSegments("/api") || request.Path.StartsWithSegments("/openapi") || request.Path.StartsWithSegments("/metrics");

    private const string CookieName = "plant";

    private static void Configure(IdentityOptions options)
    {
        IdentitySchema.Apply(options);
        options.User.RequireUniqueEmail = true;
        options.Password = new PasswordOptions { RequiredLength = 12, RequireDigit = false, RequireLowercase = false, RequireUppercase = false, RequireNonAlphanumeric = false, RequiredUniqueChars = 1 };
        options.Lockout.MaxFailedAccessAttempts = 10;
        options.Lockout.DefaultLockoutTimeSpan = TimeSpan.FromMinutes(5);
    }

    private static void Cookie(Microsoft.AspNetCore.Authentication.Cookies.CookieAuthenticationOptions options)
    {
        options.Cookie.Name = CookieName;
        options.Cookie.HttpOnly = true;
        options.Cookie.SameSite = SameSiteMode.Lax;
        options.Cookie.SecurePolicy = CookieSecurePolicy.SameAsRequest;
        options.ExpireTimeSpan = TimeSpan.FromHours(12);
        options.LoginPath = "/account/sign-in";
        options.AccessDeniedPath = "/account/denied";
        options.ReturnUrlParameter = "returnUrl";
        options.Events.OnRedirectToLogin = context => Answer(context, StatusCodes.Status401Unauthorized);
        options.Events.OnRedirectToAccessDenied = context => Answer(context, StatusCodes.Status403Forbidden);
    }

    /// <summary>The API answers with a status, pages with a redirect.</summary>
    private static Task Answer(RedirectContext<Microsoft.AspNetCore.Authentication.Cookies.CookieAuthenticationOptions> context, int status)
    {
        if (IsApi(context.Request))
        {
            context.Response.StatusCode = status;
        }
        else
        {
            context.Response.Redirect(context.RedirectUri);
        }

        return Task.CompletedTask;
    }
}
