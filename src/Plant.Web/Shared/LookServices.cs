using MudBlazor.Services;

namespace Plant.Web.Shared;

/// <summary>Blazor and its components.</summary>
public static class LookServices
{
    /// <summary>Largest message from a browser: the framework's own limit; files go by HTTP.</summary>
    private const long HubMessageLimit = 32 * 1024;

    /// <summary>How long a call to a browser that may be gone is waited for: a chart that is left while it draws holds one of the browser's six connections so long.</summary>
    private static readonly TimeSpan ScriptLimit = TimeSpan.FromSeconds(5);

    public static IServiceCollection AddLook(this IServiceCollection services)
    {
        services.AddRazorComponents().AddInteractiveServerComponents(options =>
            {
                options.DisconnectedCircuitMaxRetained = 200;
                options.JSInteropDefaultCallTimeout = ScriptLimit;
            })
            .AddHubOptions(options => options.MaximumReceiveMessageSize = HubMessageLimit);
        return services.AddMudServices().AddSingleton<LiveRegister>();
    }
}
