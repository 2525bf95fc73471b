using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class WaterSplitCalculatorTests
{
    // 150 mg/kg in transformer oil, recomputed apart from this code: 61.68 % at 60 °C; 94.523 free at 20 °C
    [Fact]
    public void Compute_Example_SplitsAtBothTemperatures()
    {
        var split = Requests.Done(WaterSplitCalculator.Compute(new WaterSplitRequest(Requests.Oil, 60, 20, 150, 10)));
        Checks.Within(150, split.DissolvedPpm, 1e-12);
        Assert.Equal(0, split.UndissolvedPpm);
        Checks.Within(243.1717, split.SaturationPpm, 6e-4);
        Checks.Within(0.6168, split.WaterActivity, 6e-5);
        Assert.True(split.ProbabilityFree < 1e-15);
        Checks.Within(55.477, split.DissolvedPpmAtColdest, 6e-4);
        Checks.Within(94.523, split.UndissolvedPpmAtColdest, 6e-4);
        Checks.Within(55.4771, split.SaturationPpmAtColdest, 6e-4);
        Assert.Equal(1, split.WaterActivityAtColdest);
        Checks.Within(1, split.ProbabilityFreeAtColdest, 1e-12);
        Requests.ShowsItsWorking(split.Working);
    }

    [Fact]
    public void Compute_SolublePolyglycol_IsRefusedWithTheReason()
    {
        var result = WaterSplitCalculator.Compute(new WaterSplitRequest(Requests.SolublePolyglycol, 60, 20, 150, 10));
        Assert.Equal("fluid.solubilityA", Requests.Refused(result));
        Assert.Contains("water-soluble", result.Refusals[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Compute_PolyglycolWithCurve_Splits()
    {
        var fluid = Requests.SolublePolyglycol with { SolubilityA = 5.8416, SolubilityB = 400 };
        Checks.Near(36666, Requests.Done(WaterSplitCalculator.Compute(new WaterSplitRequest(fluid, 40, 40, 150, 10))).SaturationPpm, 1e-3);
    }

    [Theory]
    [InlineData(60.0, 61.0, 150.0, 10.0, "coldestTemperatureC")]
    [InlineData(null, 20.0, 150.0, 10.0, "temperatureC")]
    [InlineData(60.0, null, 150.0, 10.0, "coldestTemperatureC")]
    [InlineData(60.0, 20.0, null, 10.0, "waterPpm")]
    [InlineData(60.0, 20.0, -1.0, 10.0, "waterPpm")]
    [InlineData(60.0, 20.0, 2e6, 10.0, "waterPpm")]
    [InlineData(60.0, 20.0, double.NaN, 10.0, "waterPpm")]
    [InlineData(60.0, 20.0, 150.0, -1.0, "standardUncertaintyPpm")]
    [InlineData(60.0, 20.0, 150.0, double.NaN, "standardUncertaintyPpm")]
    [InlineData(null, null, null, -1.0, "temperatureC,coldestTemperatureC,waterPpm,standardUncertaintyPpm")]
    public void Compute_BadField_IsRefusedByName(double? warm, double? cold, double? water, double? uncertainty, string fields) =>
        Assert.Equal(fields, Requests.Refused(WaterSplitCalculator.Compute(new WaterSplitRequest(Requests.Oil, warm, cold, water, uncertainty))));
}
