using Plant.Physics.Water;

namespace Plant.Physics.Calculators;

/// <summary>Asks for the properties of a fluid at a temperature.</summary>
/// <param name="Fluid">The fluid.</param>
/// <param name="TemperatureC">Temperature [°C].</param>
public sealed record FluidStateRequest(FluidRequest? Fluid, double? TemperatureC);

/// <summary>Properties of a fluid at a temperature.</summary>
/// <param name="KinematicViscosityMm2S">Kinematic viscosity [mm²/s].</param>
/// <param name="DynamicViscosityMPaS">Dynamic viscosity [mPa·s].</param>
/// <param name="DensityKgM3">Density [kg/m³].</param>
/// <param name="WaterDensityKgM3">Density of water [kg/m³].</param>
/// <param name="DensityDifferenceKgM3">Density of water less density of the fluid [kg/m³].</param>
/// <param name="SaturationPpm">Saturation [mg/kg]; null where there is none.</param>
/// <param name="WaterGoes">down, up or neither.</param>
/// <param name="InversionTemperatureC">Where both weigh the same [°C]; null where nowhere from 0 to 120 °C.</param>
/// <param name="Working">How it came about.</param>
public sealed record FluidStateResponse(
    double KinematicViscosityMm2S, double DynamicViscosityMPaS, double DensityKgM3, double WaterDensityKgM3, double DensityDifferenceKgM3,
    double? SaturationPpm, string WaterGoes, double? InversionTemperatureC, IReadOnlyList<WorkingStep> Working);

/// <summary>Properties of a fluid at a temperature.</summary>
public static class FluidStateCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<FluidStateResponse> Compute(FluidStateRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var temperature = refusals.TemperatureK("temperatureC", request.TemperatureC);
        if (refusals.Count > 0 || fluid is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var dynamic = fluid.DynamicViscosityPaS(temperature, working);
        var water = WaterProperties.DensityKgM3(temperature);
        working.Add("density of water", FormattableString.Invariant($"Kell's polynomial at {request.TemperatureC} °C"), water, "kg/m³", Citations.Kell,
            request.TemperatureC is < 0 or > 100 ? "outside 0 to 100 °C: extrapolated" : null);
        var goes = fluid.WaterGoes(temperature, working);
        double? saturation = fluid.HasSaturation ? fluid.SaturationPpm(temperature, working) : null;
        if (saturation is null)
        {
            working.Add("saturation", "a water-soluble polyalkylene glycol has none", null, "mg/kg", Citations.FamilyDefault);
        }

        var inversion = fluid.InversionTemperatureK() - Constants.ZeroCelsiusK;
        working.Add("inversion temperature", "density of water = density of the fluid, searched from 0 to 120 °C", inversion, "°C", Citations.Kell,
            inversion is null ? "none from 0 to 120 °C" : "an error of 2 kg/m³ in the density moves it by about 4 to 6 °C");
        return new(
            new FluidStateResponse(fluid.KinematicViscosityM2S(temperature) * 1e6, dynamic * 1000, fluid.DensityKgM3(temperature), water,
                fluid.DensityDifferenceKgM3(temperature), saturation, Code.Of(goes), inversion, working.Steps), []);
    }
}
