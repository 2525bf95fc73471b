using MathNet.Numerics;

namespace Plant.Physics.Fluids;

/// <summary>Where measured water is: in solution or out of it.</summary>
/// <param name="DissolvedPpm">Dissolved [mg/kg].</param>
/// <param name="UndissolvedPpm">Undissolved [mg/kg].</param>
/// <param name="SaturationPpm">Saturation [mg/kg].</param>
/// <param name="WaterActivity">Relative saturation [0 to 1].</param>
/// <param name="ProbabilityFree">Chance that some water is undissolved [0 to 1].</param>
public readonly record struct WaterSplitResult(double DissolvedPpm, double UndissolvedPpm, double SaturationPpm, double WaterActivity, double ProbabilityFree);

/// <summary>Split of water into dissolved and undissolved.</summary>
public static class WaterSplit
{
    /// <summary>Splits a water content at a temperature.</summary>
    /// <param name="fluid">The fluid; it must have a saturation.</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="waterPpm">Water content [mg/kg].</param>
    /// <param name="standardUncertaintyPpm">Standard uncertainty of the content [mg/kg].</param>
    /// <param name="working">Receives the steps, or null.</param>
    /// <returns>The split.</returns>
    /// <remarks>Equation: dissolved = min(w, S); P(free) = Φ((w − S)/u). Source: definition; normal measurement error. Valid for: as the solubility curve.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">A content is negative or no number.</exception>
    public static WaterSplitResult Compute(FluidModel fluid, double temperatureK, double waterPpm, double standardUncertaintyPpm, Working? working = null)
    {
        ArgumentNullException.ThrowIfNull(fluid);
        Guard.NotNegative(waterPpm);
        Guard.NotNegative(standardUncertaintyPpm);
        var saturation = fluid.SaturationPpm(temperatureK, working);
        var dissolved = Math.Min(waterPpm, saturation);
        var activity = Math.Min(1, waterPpm / saturation);
        var excess = waterPpm - saturation;
        var chance = standardUncertaintyPpm > 0 ? Normal(excess / standardUncertaintyPpm) : excess > 0 ? 1 : 0;
        if (working is not null)
        {
            working.Add("dissolved", FormattableString.Invariant($"min({waterPpm:0.###}, {saturation:0.###})"), dissolved, "mg/kg", "definition");
            working.Add("undissolved", FormattableString.Invariant($"max(0, {waterPpm:0.###} − {saturation:0.###})"), waterPpm - dissolved, "mg/kg", "definition");
            working.Add("water activity", FormattableString.Invariant($"min(1, {waterPpm:0.###}/{saturation:0.###})"), activity, "1", "definition",
                activity > 0.9 ? "above 0.9 the straight line is an approximation" : null);
            working.Add("chance of free water", FormattableString.Invariant($"Φ(({waterPpm:0.###} − {saturation:0.###})/{standardUncertaintyPpm:0.###})"), chance, "1", Citations.Normal);
        }

        return new WaterSplitResult(dissolved, waterPpm - dissolved, saturation, activity, chance);
    }

    private static double Normal(double z) => 0.5 * SpecialFunctions.Erfc(-z / Math.Sqrt(2));
}
