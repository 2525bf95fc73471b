using System.Globalization;
using System.Text.Json;
using Plant.Physics.Fluids;

namespace Plant.Physics.Tests;

/// <summary>The check values in <c>checks/properties-checks.json</c>, and comparisons.</summary>
internal static class Checks
{
    private static readonly JsonDocument Document = Read();

    public static JsonElement Of(string section) => Document.RootElement.GetProperty(section);

    public static double Number(this JsonElement row, string name) => row.GetProperty(name).GetDouble();

    /// <summary>The pairs of an object whose names are numbers, such as a temperature.</summary>
    public static IEnumerable<(double Key, double Value)> Pairs(this JsonElement map) =>
        map.EnumerateObject().Select(pair => (double.Parse(pair.Name, CultureInfo.InvariantCulture), pair.Value.GetDouble()));

    public static double Kelvin(double temperatureC) => temperatureC + 273.15;

    public static void Near(double expected, double actual, double relative)
    {
        Assert.True(Math.Abs(actual - expected) <= relative * Math.Abs(expected), FormattableString.Invariant($"expected {expected:R} within {relative:R} of it, got {actual:R}"));
    }

    public static void Within(double expected, double actual, double absolute)
    {
        Assert.True(Math.Abs(actual - expected) <= absolute, FormattableString.Invariant($"expected {expected:R} ± {absolute:R}, got {actual:R}"));
    }

    public static FluidModel Fluid(FluidSheet sheet)
    {
        var refusals = new List<Refusal>();
        var model = FluidModel.TryCreate(sheet, refusals);
        Assert.Empty(refusals);
        Assert.NotNull(model);
        return model;
    }

    /// <summary>Mineral oil of grade 46 with the solubility curve of IEEE C57.106 (coefficients from memory).</summary>
    public static FluidModel MineralOil() => Fluid(new FluidSheet
    {
        Family = FluidFamily.Mineral, Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 870, SolubilityA = 7.0895, SolubilityB = 1567,
    });

    private static JsonDocument Read()
    {
        using var stream = typeof(Checks).Assembly.GetManifestResourceStream("properties-checks.json") ?? throw new InvalidOperationException("the check values are not embedded");
        return JsonDocument.Parse(stream);
    }
}
