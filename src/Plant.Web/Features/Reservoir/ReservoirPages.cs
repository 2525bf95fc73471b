namespace Plant.Web.Features.Reservoir;

/// <summary>The reservoir page's services.</summary>
public static class ReservoirPages
{
    public static IServiceCollection AddReservoirPages(this IServiceCollection services) => services.AddSingleton<ReservoirQueries>();
}
