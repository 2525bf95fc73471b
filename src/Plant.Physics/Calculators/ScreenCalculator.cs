using Plant.Physics.Separators;

namespace Plant.Physics.Calculators;

/// <summary>Asks what a separator screen holds.</summary>
/// <param name="InterfacialTensionMNM">Interfacial tension [mN/m].</param>
/// <param name="ContactAngleDeg">Contact angle measured through the water [°].</param>
/// <param name="PoreUm">Diameter of the largest pore [µm].</param>
public sealed record ScreenRequest(double? InterfacialTensionMNM, double? ContactAngleDeg, double? PoreUm);

/// <summary>What a separator screen holds.</summary>
/// <param name="BreakthroughKPa">Pressure at which the held liquid comes through [kPa].</param>
/// <param name="WaterWets">True where water wets the screen.</param>
/// <param name="Working">How it came about.</param>
public sealed record ScreenResponse(double BreakthroughKPa, bool WaterWets, IReadOnlyList<WorkingStep> Working);

/// <summary>A separator screen.</summary>
public static class ScreenCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<ScreenResponse> Compute(ScreenRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var tension = refusals.Within("interfacialTensionMNM", request.InterfacialTensionMNM, 0, 80, "mN/m", openLow: true);
        var angle = refusals.Within("contactAngleDeg", request.ContactAngleDeg, 0, 180, "°");
        var pore = refusals.Within("poreUm", request.PoreUm, 0, 1e5, "µm", openLow: true);
        if (refusals.Count > 0)
        {
            return new(null, refusals);
        }

        var wets = angle < 90;
        var pressure = SeparatorScreen.BreakthroughPa(tension / 1000, angle * Math.PI / 180, pore * 1e-6) / 1000;
        var working = new Working();
        working.Add("breakthrough pressure", FormattableString.Invariant($"4·{tension} mN/m·|cos {angle}°|/{pore} µm"), pressure, "kPa", Citations.YoungLaplace,
            angle is > 80 and < 100 ? "near 90° the screen hardly holds either liquid" : null);
        working.Add("wetting", wets ? "angle through the water below 90°: water passes, the pressure holds oil back" : "angle through the water 90° or more: oil passes, the pressure holds water back", angle, "°", Citations.YoungLaplace,
            tension < 10 ? "below 10 mN/m surfactants disable screens: measure the tension of the used oil" : null);
        return new(new ScreenResponse(pressure, wets, working.Steps), []);
    }
}
