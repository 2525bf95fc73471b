using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.HttpOverrides;
using OpenTelemetry.Metrics;
using Plant.Register.Access;

namespace Plant.Web.Hosting;

/// <summary>What every request passes: headers, errors, who asks, limits.</summary>
public static class HostingSetup
{
    private const long BodyLimit = 64L * 1024 * 1024;

    public static void AddHosting(this WebApplicationBuilder builder, PlantSettings settings)
    {
        builder.WebHost.ConfigureKestrel(options =>
        {
            options.AddServerHeader = false;
            options.Limits.MaxRequestBodySize = BodyLimit;
        });
        builder.WebHost.UseStaticWebAssets();
        builder.Services.AddDataProtection().SetApplicationName("sump-ledger").PersistKeysToFileSystem(new DirectoryInfo(Path.Combine(settings.DataFolder, "keys")));
        builder.Services.AddProblemDetails();
        builder.Services.AddAntiforgery(options => options.HeaderName = "X-CSRF-Token");
        builder.Services.AddResponseCompression(options => options.EnableForHttps = false);
        builder.Services.AddHealthChecks().AddCheck<RegisterHealth>("register");
        builder.Services.AddOpenTelemetry().WithMetrics(metrics => metrics
            .AddAspNetCoreInstrumentation().AddRuntimeInstrumentation().AddMeter("Microsoft.AspNetCore.Components").AddPrometheusExporter());
        builder.Services.Configure<ForwardedHeadersOptions>(options => options.ForwardedHeaders = ForwardedHeaders.XForwardedFor | ForwardedHeaders.XForwardedProto);
    }

    public static void UseHosting(this WebApplication app)
    {
        app.UseForwardedHeaders();
        app.UseMiddleware<SecurityHeaders>();
        app.UseResponseCompression();
        if (!app.Environment.IsDevelopment())
        {
            app.UseHsts();
        }

        app.UseExceptionHandler("/error", createScopeForErrors: true);
        app.UseWhen(context => Features.Account.AccountServices.IsApi(context.Request), api => api.UseStatusCodePages());
        app.UseWhen(context => !Features.Account.AccountServices.IsApi(context.Request), pages => pages.UseStatusCodePagesWithReExecute("/missing", createScopeForStatusCodePages: true));
        app.MapStaticAssets().AllowAnonymous();
        app.UseRouting();
        app.UseAuthentication();
        app.UseMiddleware<PasswordGate>();
        app.UseAuthorization();
        app.UseRateLimiter();
        app.UseAntiforgery();
        app.MapPrometheusScrapingEndpoint("/metrics").RequireAuthorization(Duty.Read.ToString());
    }

    public static void MapHealth(this WebApplication app)
    {
        app.MapHealthChecks("/health/live", new() { Predicate = _ => false }).AllowAnonymous();
        app.MapHealthChecks("/health/ready").AllowAnonymous();
    }
}
