using System.Net;
using System.Text;
using System.Text.Json.Nodes;
using Plant.Register.Access;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Api;

/// <summary>The calculators over HTTP against published or independently computed values (sources beside each).</summary>
[Collection(WebPlantCollection.Name)]
public sealed class CalculatorApiTests(WebPlant plant)
{
    private const string Oil = "{\"family\":\"mineral\",\"viscosity40Mm2S\":46,\"viscosity100Mm2S\":6.8,\"density15KgM3\":870,\"solubilityA\":7.0895,\"solubilityB\":1567}";

    private const string Coalescence = "{\"fluid\":" + Oil + ",\"temperatureC\":50,\"waterVolumeFraction\":0.0005,\"dropletMedianUm\":10,\"geometricDeviation\":1.8,\"depthMm\":500,\"hours\":24,\"shearRatePerS\":5,\"collisionEfficiency\":0.1,\"fieldKVPerCm\":0";

    [Theory]
    // ASTM D341 through 46/6.8, computed independently: 20.6227 mm²/s at 60 °C
    [InlineData("fluid-state", "{\"fluid\":" + Oil + ",\"temperatureC\":60}", "kinematicViscosityMm2S", 20.6227, 1e-4)]
    // ASTM D1250-80, lubricating oil 870 at 40 °C: 854.223 kg/m³
    [InlineData("fluid-state", "{\"fluid\":" + Oil + ",\"temperatureC\":40}", "densityKgM3", 854.223, 1e-3)]
    // Kell 1975 at 40 °C: 992.2158 kg/m³
    [InlineData("fluid-state", "{\"fluid\":" + Oil + ",\"temperatureC\":40}", "waterDensityKgM3", 992.2158, 1e-3)]
    // IEEE C57.106 form with A 7.0895, B 1567: 121.761 mg/kg at 40 °C
    [InlineData("water-split", "{\"fluid\":" + Oil + ",\"temperatureC\":60,\"coldestTemperatureC\":40,\"waterPpm\":150,\"standardUncertaintyPpm\":10}", "dissolvedPpmAtColdest", 121.761, 1e-3)]
    [InlineData("water-split", "{\"fluid\":" + Oil + ",\"temperatureC\":60,\"coldestTemperatureC\":40,\"waterPpm\":150,\"standardUncertaintyPpm\":10}", "undissolvedPpmAtColdest", 28.239, 1e-3)]
    // worked titration: (412.5 − 6.0·3.5 − 18.0)/5.000 = 74.70 mg/kg
    [InlineData("karl-fischer", "{\"method\":\"kf-coulometric\",\"replicates\":[{\"sampleG\":5,\"waterUg\":412.5,\"driftUgPerMin\":6,\"minutes\":3.5,\"blankUg\":18}]}", "waterPpm", 74.7, 1e-9)]
    // Faraday: 4.000 C titrate 373.430 µg
    [InlineData("karl-fischer", "{\"method\":\"kf-coulometric\",\"replicates\":[{\"sampleG\":1,\"chargeC\":4}]}", "waterPpm", 373.430, 1e-3)]
    // ISO 12937 (from memory): r = 26.50 mg/kg at 200
    [InlineData("karl-fischer", "{\"method\":\"kf-coulometric\",\"replicates\":[{\"sampleG\":1,\"waterUg\":200}]}", "repeatabilityPpm", 26.50, 1e-2)]
    // Cantley 1977: 2.297397 at 25 ppm
    [InlineData("bearing-life", "{\"waterPpm\":25}", "relativeLife", 2.297397, 1e-6)]
    // Young–Laplace, 45 mN/m, 150°, 20 µm: 7794.2 Pa
    [InlineData("screen", "{\"interfacialTensionMNM\":45,\"contactAngleDeg\":150,\"poreUm\":20}", "breakthroughKPa", 7.7942, 1e-4)]
    // Davies (from memory) with 46 mm²/s and 854.223 kg/m³: 20.891 kPa at 0.0391 Pa·s, 20.995 kPa at 0.039294
    [InlineData("coalescer", "{\"fluid\":" + Oil + ",\"temperatureC\":40,\"faceVelocityMmPerS\":5,\"fibreUm\":10,\"solidity\":0.1,\"thicknessMm\":5,\"dropletUm\":[3],\"stages\":1}", "pressureDropKPa", 20.995, 2e-3)]
    // Taylor's limit in oil of εr 2.2 at 30 mN/m (defaults of the family), √(0.21025·γ/(ε·r)): 8.0474 kV/cm for 1 mm
    [InlineData("electric-field", "{\"fluid\":" + Oil + ",\"temperatureC\":40,\"dropletUm\":1000,\"gapUm\":100,\"fieldKVPerCm\":3}", "criticalFieldKVPerCm", 8.0474, 1e-4)]
    // S·p/psat at 60 °C and 10 mbar with A 7.0895: 12.2057·10^−0.0005 = 12.1917 mg/kg
    [InlineData("dry-down", "{\"fluid\":" + Oil + ",\"oilVolumeL\":5000,\"startPpm\":300,\"targetPpm\":50,\"kind\":\"vacuum-dehydrator\",\"flowLPerMin\":80,\"efficiency\":0.8,\"pressureKPa\":1,\"oilTemperatureC\":60,\"coldestTemperatureC\":20}", "floorPpm", 12.1917, 2e-3)]
    // no drop is lost by the computation
    [InlineData("coalescence", Coalescence + ",\"cells\":40}", "massErrorFraction", 0, 1e-12)]
    public async Task Calculator_GivesThePublishedValue(string name, string body, string field, double value, double tolerance)
    {
        var (status, answer) = await PostAsync(name, body);
        Assert.Equal(HttpStatusCode.OK, status);
        Assert.Equal(value, answer[field]!.GetValue<double>(), tolerance);
        Assert.All(answer["working"]!.AsArray(), step => Assert.All(new[] { "name", "formula", "unit", "source" }, key => Assert.NotNull(step![key])));
    }

    [Fact]
    public async Task Tank_RemovesWhatTheOverflowRateSays()
    {
        var (_, answer) = await PostAsync("tank", "{\"fluid\":" + Oil + ",\"temperatureC\":40,\"shape\":\"rectangular\",\"lengthMm\":2000,\"widthMm\":1000,\"heightMm\":1000,\"oilVolumeL\":1600,\"circulationLPerMin\":100,\"tanksInSeries\":1,\"dropletMedianUm\":300,\"geometricDeviation\":1}");
        Assert.Equal(800, answer["oilDepthMm"]!.GetValue<double>(), 1e-9);
        Assert.Equal(2, answer["surfaceAreaM2"]!.GetValue<double>(), 1e-9);
        Assert.Equal(16, answer["residenceTimeMin"]!.GetValue<double>(), 1e-9);
        Assert.InRange(answer["removalFraction"]!.GetValue<double>(), 0.05, 0.95);
    }

    // start: 500 ppm of lognormal drops, median 10 µm by volume, deviation 1.8: 4.5185e12 per m³
    [Fact]
    public async Task Coalescence_StartsAsGivenAndLosesDrops()
    {
        var (_, answer) = await PostAsync("coalescence", Coalescence + "}");
        var (suspended, number, median) = (Numbers("suspendedFraction"), Numbers("numberPerM3"), Numbers("medianUm"));
        Assert.Equal(86_400, Numbers("timesS")[^1]);
        Assert.Equal(1, suspended[0], 1e-12);
        Assert.Equal(10, median[0], 0.01);
        Assert.Equal(4.5185e12, number[0], 1e9);
        Assert.True(number[^1] < 0.1 * number[0] && suspended[^1] < 0.1);

        List<double> Numbers(string field) => [.. answer[field]!.AsArray().Select(value => value!.GetValue<double>())];
    }

    [Theory]
    [InlineData("fluid-state", "{\"temperatureC\":40}", "fluid")]
    [InlineData("fluid-state", "{\"fluid\":{\"family\":\"wax\"},\"temperatureC\":40}", "fluid.family")]
    [InlineData("fluid-state", "{\"fluid\":{\"family\":\"mineral\",\"density15KgM3\":-1},\"temperatureC\":40}", "fluid.density15KgM3")]
    [InlineData("fluid-state", "{\"fluid\":{\"family\":\"mineral\"}}", "temperatureC")]
    [InlineData("water-split", "{\"fluid\":{\"family\":\"mineral\"},\"temperatureC\":20,\"coldestTemperatureC\":40,\"waterPpm\":100}", "coldestTemperatureC")]
    [InlineData("water-split", "{\"fluid\":{\"family\":\"pag\"},\"temperatureC\":40,\"coldestTemperatureC\":20,\"waterPpm\":100}", "fluid.solubilityA")]
    [InlineData("settling", "{\"fluid\":{\"family\":\"mineral\"},\"temperatureC\":40,\"dropletUm\":[],\"depthMm\":100}", "dropletUm")]
    [InlineData("settling", "{\"fluid\":{\"family\":\"mineral\"},\"temperatureC\":40,\"dropletUm\":[-5],\"depthMm\":100}", "dropletUm[0]")]
    [InlineData("tank", "{\"fluid\":{\"family\":\"mineral\"},\"temperatureC\":40,\"shape\":\"rectangular\",\"lengthMm\":1000,\"widthMm\":1000,\"heightMm\":1000,\"oilVolumeL\":2000,\"circulationLPerMin\":10,\"dropletMedianUm\":100,\"geometricDeviation\":2}", "oilVolumeL")]
    [InlineData("karl-fischer", "{\"method\":\"guess\",\"replicates\":[{\"sampleG\":1,\"waterUg\":1}]}", "method")]
    [InlineData("coalescence", Coalescence + ",\"cells\":5000}", "cells")]
    [InlineData("bearing-life", "{\"waterPpm\":-4}", "waterPpm")]
    [InlineData("screen", "{\"interfacialTensionMNM\":45,\"contactAngleDeg\":200,\"poreUm\":20}", "contactAngleDeg")]
    [InlineData("coalescer", "{\"fluid\":{\"family\":\"mineral\"},\"temperatureC\":40,\"faceVelocityMmPerS\":5,\"fibreUm\":10,\"solidity\":1.1,\"thicknessMm\":5,\"dropletUm\":[3],\"stages\":1}", "solidity")]
    [InlineData("electric-field", "{\"fluid\":{\"family\":\"mineral\"},\"temperatureC\":40,\"dropletUm\":1000,\"gapUm\":0,\"fieldKVPerCm\":3}", "gapUm")]
    [InlineData("dry-down", "{\"fluid\":{\"family\":\"mineral\"},\"oilVolumeL\":5000,\"startPpm\":300,\"targetPpm\":50,\"kind\":\"vacuum-dehydrator\",\"flowLPerMin\":80,\"efficiency\":80,\"pressureKPa\":1,\"oilTemperatureC\":60,\"coldestTemperatureC\":20}", "efficiency")]
    public async Task BadInput_NamesFieldValueAndRange(string name, string body, string field)
    {
        var (status, answer) = await PostAsync(name, body);
        Assert.Equal(HttpStatusCode.BadRequest, status);
        Assert.NotNull(answer["errors"]![field]);
    }

    private async Task<(HttpStatusCode Status, JsonNode Answer)> PostAsync(string name, string body)
    {
        using var http = plant.Token(PlantRole.Lab);
        using var content = new StringContent(body, Encoding.UTF8, "application/json");
        using var answer = await http.PostAsync(new Uri($"/api/v1/calc/{name}", UriKind.Relative), content);
        return (answer.StatusCode, JsonNode.Parse(await answer.Content.ReadAsStringAsync())!);
    }
}
