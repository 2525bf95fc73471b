using Plant.Physics.Fluids;

namespace Plant.Physics.Calculators;

/// <summary>Asks where measured water is, at the running and at the coldest temperature.</summary>
/// <param name="Fluid">The fluid.</param>
/// <param name="TemperatureC">Running temperature [°C].</param>
/// <param name="ColdestTemperatureC">Coldest temperature [°C].</param>
/// <param name="WaterPpm">Water content [mg/kg].</param>
/// <param name="StandardUncertaintyPpm">Standard uncertainty [mg/kg].</param>
public sealed record WaterSplitRequest(FluidRequest? Fluid, double? TemperatureC, double? ColdestTemperatureC, double? WaterPpm, double? StandardUncertaintyPpm);

/// <summary>Where the water is.</summary>
/// <param name="DissolvedPpm">Dissolved [mg/kg].</param>
/// <param name="UndissolvedPpm">Undissolved [mg/kg].</param>
/// <param name="SaturationPpm">Saturation [mg/kg].</param>
/// <param name="WaterActivity">Relative saturation [0 to 1].</param>
/// <param name="ProbabilityFree">Chance of free water [0 to 1].</param>
/// <param name="DissolvedPpmAtColdest">Dissolved at the coldest temperature [mg/kg].</param>
/// <param name="UndissolvedPpmAtColdest">Undissolved at the coldest temperature [mg/kg].</param>
/// <param name="SaturationPpmAtColdest">Saturation at the coldest temperature [mg/kg].</param>
/// <param name="WaterActivityAtColdest">Relative saturation at the coldest temperature [0 to 1].</param>
/// <param name="ProbabilityFreeAtColdest">Chance of free water at the coldest temperature [0 to 1].</param>
/// <param name="Working">How it came about.</param>
public sealed record WaterSplitResponse(
    double DissolvedPpm, double UndissolvedPpm, double SaturationPpm, double WaterActivity, double ProbabilityFree,
    double DissolvedPpmAtColdest, double UndissolvedPpmAtColdest, double SaturationPpmAtColdest, double WaterActivityAtColdest, double ProbabilityFreeAtColdest,
    IReadOnlyList<WorkingStep> Working);

/// <summary>Split of water at two temperatures.</summary>
public static class WaterSplitCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<WaterSplitResponse> Compute(WaterSplitRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var warm = refusals.TemperatureK("temperatureC", request.TemperatureC);
        var cold = refusals.TemperatureK("coldestTemperatureC", request.ColdestTemperatureC);
        var water = refusals.Within("waterPpm", request.WaterPpm, 0, 1e6, "mg/kg");
        var uncertainty = refusals.Within("standardUncertaintyPpm", request.StandardUncertaintyPpm ?? 0, 0, 1e6, "mg/kg");
        if (cold > warm)
        {
            refusals.Add(new Refusal("coldestTemperatureC", FormattableString.Invariant($"{request.ColdestTemperatureC}"),
                FormattableString.Invariant($"must not be above temperatureC ({request.TemperatureC})")));
        }

        if (fluid is { HasSaturation: false })
        {
            refusals.Add(new Refusal("fluid.solubilityA", "", "this polyalkylene glycol is taken as water-soluble: it has no saturation, so water cannot be split; give solubilityA and solubilityB where it is not"));
        }

        if (refusals.Count > 0 || fluid is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        working.Add("at the running temperature", FormattableString.Invariant($"T = {warm:0.##} K"), request.TemperatureC, "°C", "given");
        var now = WaterSplit.Compute(fluid, warm, water, uncertainty, working);
        working.Add("at the coldest temperature", FormattableString.Invariant($"T = {cold:0.##} K"), request.ColdestTemperatureC, "°C", "given");
        var later = WaterSplit.Compute(fluid, cold, water, uncertainty, working);
        return new(
            new WaterSplitResponse(now.DissolvedPpm, now.UndissolvedPpm, now.SaturationPpm, now.WaterActivity, now.ProbabilityFree,
                later.DissolvedPpm, later.UndissolvedPpm, later.SaturationPpm, later.WaterActivity, later.ProbabilityFree, working.Steps), []);
    }
}
