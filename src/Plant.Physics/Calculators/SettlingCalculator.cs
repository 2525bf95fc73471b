using Plant.Physics.Droplets;

namespace Plant.Physics.Calculators;

/// <summary>Asks how fast water drops settle.</summary>
/// <param name="Fluid">The fluid.</param>
/// <param name="TemperatureC">Temperature [°C].</param>
/// <param name="DropletUm">Diameters [µm].</param>
/// <param name="DepthMm">Depth to settle [mm].</param>
/// <param name="WaterVolumeFraction">Volume fraction of water [0 to 0.4].</param>
/// <param name="MobileInterface">True for clean drops.</param>
public sealed record SettlingRequest(
    FluidRequest? Fluid, double? TemperatureC, IReadOnlyList<double>? DropletUm, double? DepthMm, double? WaterVolumeFraction, bool? MobileInterface);

/// <summary>One drop.</summary>
/// <param name="DropletUm">Diameter [µm].</param>
/// <param name="VelocityMmPerS">Velocity, positive down [mm/s].</param>
/// <param name="Reynolds">Reynolds number [1].</param>
/// <param name="SettlingTimeS">Time for the depth [s]; null where gravity does not separate.</param>
public sealed record SettlingRow(double DropletUm, double VelocityMmPerS, double Reynolds, double? SettlingTimeS);

/// <summary>How fast water drops settle.</summary>
/// <param name="Results">A row a drop.</param>
/// <param name="Working">How it came about.</param>
public sealed record SettlingResponse(IReadOnlyList<SettlingRow> Results, IReadOnlyList<WorkingStep> Working);

/// <summary>Settling of drops.</summary>
public static class SettlingCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<SettlingResponse> Compute(SettlingRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var temperature = refusals.TemperatureK("temperatureC", request.TemperatureC);
        var sizes = refusals.DropletsUm(request.DropletUm);
        var depth = refusals.Within("depthMm", request.DepthMm, 0, 1e6, "mm", openLow: true) / 1000;
        var fraction = refusals.Within("waterVolumeFraction", request.WaterVolumeFraction ?? 0, 0, 0.4, "");
        if (refusals.Count > 0 || fluid is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var settling = new DropletSettling(fluid, temperature, working);
        var mobile = request.MobileInterface ?? false;
        working.Add("density of water less density of the fluid", "ρw − ρo", settling.DensityDifferenceKgM3, "kg/m³", Citations.Kell,
            Math.Abs(settling.DensityDifferenceKgM3) < Constants.NeutralDensityKgM3 ? "within 5 kg/m³: do not count on gravity" : null);
        working.Add("hindering", FormattableString.Invariant($"(1 − {fraction})^4.65"), Settling.RichardsonZakiFactor(fraction), "1", Citations.RichardsonZaki);
        var rows = new List<SettlingRow>(sizes.Count);
        var fastest = 0.0;
        foreach (var size in sizes)
        {
            var velocity = settling.VelocityMS(size * 1e-6, fraction, mobile);
            var reynolds = settling.Reynolds(size * 1e-6, velocity);
            fastest = Math.Max(fastest, reynolds);
            rows.Add(new SettlingRow(size, velocity * 1000, reynolds, velocity == 0 ? null : depth / Math.Abs(velocity)));
        }

        working.Add("velocity of one drop", mobile ? "g·d²·Δρ/(18μ)·3(1 + k)/(2 + 3k)" : "v·(1 + 0.15·Re^0.687) = g·d²·Δρ/(18μ)", rows[0].VelocityMmPerS, "mm/s",
            mobile ? Citations.HadamardRybczynski : Citations.SchillerNaumann, fastest > 1000 ? "a Reynolds number is above 1000: outside the range of the drag law" : null);
        return new(new SettlingResponse(rows, working.Steps), []);
    }
}
