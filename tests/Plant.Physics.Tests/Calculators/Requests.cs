using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

/// <summary>Requests that are in order, for tests to spoil.</summary>
internal static class Requests
{
    public static FluidRequest Oil { get; } = new()
    {
        Family = "mineral", Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 870, SolubilityA = 7.0895, SolubilityB = 1567,
    };

    public static FluidRequest SolublePolyglycol { get; } = new() { Family = "pag", Viscosity40Mm2S = 220, Viscosity100Mm2S = 41, Density15KgM3 = 1050, ExpansionPerK = 7.4e-4 };

    public static TankRequest Tank { get; } = new()
    {
        Fluid = Oil, TemperatureC = 40, Shape = "rectangular", LengthMm = 3000, WidthMm = 2000, HeightMm = 1200, OilVolumeL = 6000,
        CirculationLPerMin = 600, DropletMedianUm = 200, GeometricDeviation = 1.8,
    };

    public static T Done<T>(CalculatorResult<T> result)
        where T : class
    {
        Assert.Empty(result.Refusals);
        Assert.NotNull(result.Response);
        return result.Response;
    }

    public static string Refused<T>(CalculatorResult<T> result)
        where T : class
    {
        Assert.Null(result.Response);
        Assert.All(result.Refusals, refusal => Assert.NotEmpty(refusal.Reason));
        return string.Join(',', result.Refusals.Select(refusal => refusal.Field));
    }

    public static void ShowsItsWorking(IReadOnlyList<WorkingStep> working)
    {
        Assert.NotEmpty(working);
        Assert.All(working, step => Assert.True(step.Name.Length > 0 && step.Formula.Length > 0 && step.Unit.Length > 0 && step.Source.Length > 0, $"step {step.Name} is not complete"));
        Assert.All(working, step => Assert.True(step.Value is null || double.IsFinite(step.Value.Value), $"step {step.Name} has no finite value"));
    }
}
