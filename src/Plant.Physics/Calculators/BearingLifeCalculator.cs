using Plant.Physics.Laboratory;

namespace Plant.Physics.Calculators;

/// <summary>Asks for the effect of water on bearings.</summary>
/// <param name="WaterPpm">Water content [mg/kg].</param>
public sealed record BearingLifeRequest(double? WaterPpm);

/// <summary>Effect of water on bearings.</summary>
/// <param name="RelativeLife">Life relative to that at 100 ppm [1].</param>
/// <param name="Working">How it came about.</param>
public sealed record BearingLifeResponse(double RelativeLife, IReadOnlyList<WorkingStep> Working);

/// <summary>Relative life of bearings.</summary>
public static class BearingLifeCalculator
{
    /// <summary>Computes.</summary>
    /// <param name="request">The request.</param>
    /// <returns>The response, or the refusals.</returns>
    public static CalculatorResult<BearingLifeResponse> Compute(BearingLifeRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var refusals = new List<Refusal>();
        var water = refusals.Within("waterPpm", request.WaterPpm, 0, 1e6, "mg/kg", openLow: true);
        if (refusals.Count > 0)
        {
            return new(null, refusals);
        }

        var working = new Working();
        var life = BearingLife.Relative(water);
        working.Add("relative life", FormattableString.Invariant($"(100/{water})^0.6"), life, "1", Citations.Cantley,
            water is < BearingLife.TestedFromPpm or > BearingLife.TestedToPpm ? "outside the tested 25 to 400 mg/kg: extrapolated" : null);
        return new(new BearingLifeResponse(life, working.Steps), []);
    }
}
