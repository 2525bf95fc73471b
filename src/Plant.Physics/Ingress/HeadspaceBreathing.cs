using Plant.Physics.Fluids;
using Plant.Physics.Separators;
using Plant.Physics.Water;

namespace Plant.Physics.Ingress;

/// <summary>Water that a tank draws in as it warms and cools, and what condenses on its cold walls.</summary>
public static class HeadspaceBreathing
{
    // ratio of heat to mass transfer in humid air, Lewis number 0.86 to the power 2/3
    private const double LewisFactor = 0.904;
    private const double AirJKgK = 287.05;
    private const double AirSpecificHeatJKgK = 1006;
    private const double AtmospherePa = 101_325;

    /// <summary>Air drawn in by one cycle of temperature.</summary>
    /// <param name="headspaceM3">Volume of the headspace [m³].</param>
    /// <param name="oilM3">Volume of the oil [m³].</param>
    /// <param name="coldK">Coldest temperature [K].</param>
    /// <param name="warmK">Warmest temperature [K].</param>
    /// <param name="expansionPerK">Expansion of the oil [1/K].</param>
    /// <returns>Volume at the coldest temperature [m³].</returns>
    /// <remarks>Equation: V_h(1 − T_min/T_max) + β·V_o·ΔT. Source: ideal gas and expansion. Valid for: an open breather; AP-42 adds a term for the vent valve.</remarks>
    public static double CycleM3(double headspaceM3, double oilM3, double coldK, double warmK, double expansionPerK) =>
        (Guard.NotNegative(headspaceM3) * (1 - (Guard.Positive(coldK) / Guard.Between(warmK, coldK, 1000)))) + (Guard.NotNegative(expansionPerK) * Guard.NotNegative(oilM3) * (warmK - coldK));

    /// <summary>Water in a volume of air.</summary>
    /// <param name="airM3">Volume of air [m³].</param>
    /// <param name="airK">Temperature of the air [K].</param>
    /// <param name="relativeHumidity">Relative humidity [0 to 1].</param>
    /// <returns>Mass of water [kg].</returns>
    /// <remarks>Equation: V·RH·psat·M/(R·T). Source: ideal gas; Wagner and Pruß 2002 (from memory). Valid for: air at 1 bar. Grams a day: breathing alone seldom explains litres.</remarks>
    public static double WaterKg(double airM3, double airK, double relativeHumidity) =>
        Guard.NotNegative(airM3) * PurgeAir.VapourDensityKgM3(airK, Headspace.WaterPressurePa(airK, relativeHumidity));

    /// <summary>Water that condenses on a wall.</summary>
    /// <param name="areaM2">Area of the wall [m²].</param>
    /// <param name="heatTransferWM2K">Heat transfer coefficient of the air, 3 to 10 at rest (judgement) [W/m²/K].</param>
    /// <param name="airK">Temperature of the air [K].</param>
    /// <param name="waterPa">Partial pressure of water in the air [Pa].</param>
    /// <param name="wallK">Temperature of the wall [K].</param>
    /// <returns>Condensation [kg/s]; 0 where the wall is not below the dew point.</returns>
    /// <remarks>Equation: h/(ρ·cp·Le^(2/3))·A·(ρv − ρv,wall), Le^(2/3) = 0.904. Source: Chilton and Colburn 1934 (from memory). Valid for: dilute vapour in air at 1 atm.</remarks>
    public static double CondensationKgS(double areaM2, double heatTransferWM2K, double airK, double waterPa, double wallK)
    {
        var excess = PurgeAir.VapourDensityKgM3(airK, waterPa) - PurgeAir.VapourDensityKgM3(wallK, WaterProperties.VapourPressurePa(wallK));
        var heatCapacity = AtmospherePa / (AirJKgK * airK) * AirSpecificHeatJKgK;
        return Guard.NotNegative(areaM2) * Guard.NotNegative(heatTransferWM2K) / (heatCapacity * LewisFactor) * (waterPa > WaterProperties.VapourPressurePa(wallK) ? Math.Max(0, excess) : 0);
    }
}
