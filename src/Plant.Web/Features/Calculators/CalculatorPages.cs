namespace Plant.Web.Features.Calculators;

/// <summary>The calculators' service.</summary>
public static class CalculatorPages
{
    public static IServiceCollection AddCalculators(this IServiceCollection services) => services.AddSingleton<ReservoirInputs>();
}
