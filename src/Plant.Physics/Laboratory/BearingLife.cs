namespace Plant.Physics.Laboratory;

/// <summary>Effect of water on the fatigue life of rolling bearings.</summary>
public static class BearingLife
{
    /// <summary>Lowest content of the tests [mg/kg].</summary>
    public const double TestedFromPpm = 25;

    /// <summary>Highest content of the tests [mg/kg].</summary>
    public const double TestedToPpm = 400;

    /// <summary>Life relative to that at 100 ppm.</summary>
    /// <param name="waterPpm">Water content [mg/kg].</param>
    /// <returns>Relative life [1].</returns>
    /// <remarks>
    /// Equation: (100/X)^0.6. Source: Cantley 1977 (read). Valid for: 25 to 400 ppm in a mineral oil; outside it extrapolates.
    /// Disagrees with: fluids of other solubility; not to be multiplied with the contamination factor of ISO 281.
    /// </remarks>
    public static double Relative(double waterPpm) => Math.Pow(100 / Guard.Positive(waterPpm), 0.6);
}
