namespace Plant.Physics.Separators;

/// <summary>Capacity of absorbent elements and desiccant breathers.</summary>
public static class Absorbent
{
    private const double PureRatio = 500;
    private const double SaltyRatio = 50;
    private const double SaltyFraction = 0.009;

    /// <summary>Water that a superabsorbent polymer takes, over its own mass.</summary>
    /// <param name="saltFraction">Mass fraction of salt in the water [0 to 1].</param>
    /// <returns>Ratio of masses [1].</returns>
    /// <remarks>
    /// Equation: (500^(−5/3) + b·c)^(−3/5), b from 50 at 0.9 % salt. Source: ionic term of Flory's swelling theory (from memory) through two published points.
    /// Valid for: loose polymer; packed in an element it takes less. Hard water cuts it further.
    /// </remarks>
    public static double SwellingRatio(double saltFraction)
    {
        const double power = -5.0 / 3;
        var slope = (Math.Pow(SaltyRatio, power) - Math.Pow(PureRatio, power)) / SaltyFraction;
        return Math.Pow(Math.Pow(PureRatio, power) + (slope * Guard.Between(saltFraction, 0, 1)), 1 / power);
    }

    /// <summary>Water that an element takes.</summary>
    /// <param name="polymerKg">Mass of the polymer [kg].</param>
    /// <param name="saltFraction">Mass fraction of salt in the water [0 to 1].</param>
    /// <returns>Capacity [kg].</returns>
    /// <remarks>Equation: mass × swelling ratio. Source: definition. Valid for: loose polymer.</remarks>
    public static double CapacityKg(double polymerKg, double saltFraction) => Guard.NotNegative(polymerKg) * SwellingRatio(saltFraction);

    /// <summary>Time until an element or a breather is full.</summary>
    /// <param name="capacityKg">Capacity [kg].</param>
    /// <param name="waterKgS">Water that it takes [kg/s].</param>
    /// <returns>Life [s].</returns>
    /// <remarks>Equation: capacity/flow. Source: definition. Valid for: a steady flow.</remarks>
    public static double LifeS(double capacityKg, double waterKgS) => Guard.NotNegative(capacityKg) / Guard.Positive(waterKgS);

    /// <summary>Water that a silica gel breather takes until it is spent.</summary>
    /// <param name="desiccantKg">Mass of dry gel [kg].</param>
    /// <param name="uptakeFraction">Mass of water over mass of gel [0 to 1].</param>
    /// <returns>Capacity [kg].</returns>
    /// <remarks>Equation: mass × uptake. Source: common practice, indicator fades near 0.15, spent at 0.3 to 0.4. Valid for: air of more than 40 % relative humidity.</remarks>
    public static double BreatherCapacityKg(double desiccantKg, double uptakeFraction = 0.3) => Guard.NotNegative(desiccantKg) * Guard.Between(uptakeFraction, 0, 1);
}
