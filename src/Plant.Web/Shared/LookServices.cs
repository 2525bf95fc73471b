using MudBlazor.Services;

namespace Plant.Web.Shared;

/// <summary>Blazor and its components.</summary>
public static class LookServices
{
    /// <summary>Largest message from a browser: the framework's own limit; files go by HTTP.</summary>
    private const long HubMessageLimit = 32 * 1024;

    public static IServiceCollection AddLook(this IServiceCollection services)
    {
        services.AddRazorComponents().AddInteractiveServerComponents(options => options.DisconnectedCircuitMaxRetained = 200)
            .AddHubOptions(options => options.MaximumReceiveMessageSize = HubMessageLimit);
        return services.AddMudServices();
    }
}
