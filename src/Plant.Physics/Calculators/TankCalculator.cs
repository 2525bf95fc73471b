using System.Globalization;
using Plant.Physics.Droplets;
using Plant.Physics.Tanks;

namespace Plant.Physics.Calculators;

/// <summary>Asks what a reservoir separates by gravity.</summary>
public sealed record TankRequest
{
    /// <summary>The fluid.</summary>
    public FluidRequest? Fluid { get; init; }

    /// <summary>Temperature [°C].</summary>
    public double? TemperatureC { get; init; }

    /// <summary>Code of the shape.</summary>
    public string? Shape { get; init; }

    /// <summary>Inside length [mm].</summary>
    public double? LengthMm { get; init; }

    /// <summary>Inside width or diameter [mm].</summary>
    public double? WidthMm { get; init; }

    /// <summary>Inside height or diameter [mm].</summary>
    public double? HeightMm { get; init; }

    /// <summary>Oil volume [L].</summary>
    public double? OilVolumeL { get; init; }

    /// <summary>Circulation [L/min].</summary>
    public double? CirculationLPerMin { get; init; }

    /// <summary>Number of tanks in series [1]; null for the ideal tank.</summary>
    public double? TanksInSeries { get; init; }

    /// <summary>Median diameter by volume [µm].</summary>
    public double? DropletMedianUm { get; init; }

    /// <summary>Geometric standard deviation [1].</summary>
    public double? GeometricDeviation { get; init; }
}

/// <summary>What a reservoir separates by gravity.</summary>
/// <param name="OilDepthMm">Depth of the oil [mm].</param>
/// <param name="SurfaceAreaM2">Plan area at the level [m²].</param>
/// <param name="ResidenceTimeMin">Mean residence time [min].</param>
/// <param name="CutSizeUm">Size that is just caught [µm]; null where no drop is.</param>
/// <param name="RemovalFraction">Removed share of the water [0 to 1].</param>
/// <param name="Working">How it came about.</param>
public sealed record TankResponse(
    double OilDepthMm, double SurfaceAreaM2, double ResidenceTimeMin, double? CutSizeUm, double RemovalFraction, IReadOnlyList<WorkingStep> Working);

/// <summary>A reservoir as a gravity separator.</summary>
public static class TankCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<TankResponse> Compute(TankRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var fluid = FluidRequest.Model(request.Fluid, refusals);
        var temperature = refusals.TemperatureK("temperatureC", request.TemperatureC);
        var geometry = Geometry(request, refusals);
        var volume = refusals.Within("oilVolumeL", request.OilVolumeL, 0, 1e9, "L", openLow: true) / 1000;
        var flow = refusals.Within("circulationLPerMin", request.CirculationLPerMin, 0, 1e7, "L/min", openLow: true) / 60_000;
        var series = refusals.Optional("tanksInSeries", request.TanksInSeries, 0, 1000, "", openLow: true);
        var median = refusals.Within("dropletMedianUm", request.DropletMedianUm, 0, 1e5, "µm", openLow: true) * 1e-6;
        var deviation = refusals.Within("geometricDeviation", request.GeometricDeviation, 1, 20, "");
        if (geometry is not null && volume > geometry.FullVolumeM3 * (1 + 1e-9))
        {
            refusals.Add(new Refusal("oilVolumeL", request.OilVolumeL!.Value.ToString("R", CultureInfo.InvariantCulture),
                string.Create(CultureInfo.InvariantCulture, $"is more than the tank holds ({geometry.FullVolumeM3 * 1000:0.#} L)")));
        }

        if (refusals.Count > 0 || fluid is null || geometry is null)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var depth = geometry.DepthM(volume);
        var area = geometry.SurfaceAreaM2(depth);
        if (geometry.Shape == TankShape.HorizontalCylinder && depth > 0.9999 * geometry.HeightM)
        {
            refusals.Add(new Refusal("oilVolumeL", request.OilVolumeL!.Value.ToString("R", CultureInfo.InvariantCulture), "fills the cylinder to the crown: it has no surface; give the volume that it runs with"));
            return new(null, refusals);
        }

        var settling = new DropletSettling(fluid, temperature, working);
        var rate = GravitySeparation.OverflowRateMS(flow, area);
        var cut = settling.CutSizeM(rate) * 1e6;
        var removal = GravitySeparation.LognormalRemoval(fluid, temperature, rate, series, median, deviation);
        var residence = GravitySeparation.ResidenceTimeS(volume, flow) / 60;
        working.Add("oil depth", "inverse of the volume", depth * 1000, "mm", Citations.Geometry);
        working.Add("plan area at the level", $"{request.Shape}", area, "m²", Citations.Geometry);
        working.Add("residence time", "V/Q", residence, "min", Citations.Geometry);
        working.Add("overflow rate", "Q/A", rate * 1000, "mm/s", Citations.Overflow);
        working.Add("cut size", "v(d) = Q/A with Schiller–Naumann drag", cut, "µm", Citations.SchillerNaumann, cut is null ? "no drop up to 100 mm is that fast" : null);
        working.Add("removed share", series is { } n ? FormattableString.Invariant($"∫ 1 − (1 + vA/({n}Q))^−{n} dF, lognormal by volume") : "∫ min(1, vA/Q) dF, lognormal by volume", removal, "1", Citations.Overflow);
        return new(new TankResponse(depth * 1000, area, residence, cut, removal, working.Steps), []);
    }

    private static TankGeometry? Geometry(TankRequest request, List<Refusal> refusals)
    {
        if (request.Shape is null || !Code.TryParse<TankShape>(request.Shape, out var shape))
        {
            refusals.Add(new Refusal("shape", request.Shape ?? "", $"must be one of {string.Join(", ", Code.All<TankShape>())}"));
            return null;
        }

        return TankGeometry.TryCreate(shape, request.LengthMm, request.WidthMm, request.HeightMm, refusals);
    }
}
