namespace Plant.Physics.Separators;

/// <summary>Heat and electricity of drying.</summary>
public static class DryingEnergy
{
    /// <summary>Latent heat of water.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Latent heat [J/kg].</returns>
    /// <remarks>Equation: 2.501e6 − 2361·t. Source: linear fit used in meteorology (from memory). Valid for: 0 to 100 °C. Disagrees with: steam tables by less than 0.4 %.</remarks>
    public static double LatentHeatJKg(double temperatureK) => 2.501e6 - (2361 * (Guard.Between(temperatureK, 250, 400) - Constants.ZeroCelsiusK));

    /// <summary>Specific heat of a petroleum oil.</summary>
    /// <param name="density15KgM3">Density at 15 °C [kg/m³].</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Specific heat [J/kg/K].</returns>
    /// <remarks>Equation: (1685 + 3.39·t)/√(ρ15/1000). Source: Cragoe 1929 (from memory). Valid for: petroleum oils from 0 to 200 °C, within 4 %.</remarks>
    public static double OilSpecificHeatJKgK(double density15KgM3, double temperatureK) =>
        (1685 + (3.39 * (Guard.Positive(temperatureK) - Constants.ZeroCelsiusK))) / Math.Sqrt(Guard.Positive(density15KgM3) / 1000);

    /// <summary>Heat to warm oil and to evaporate its water.</summary>
    /// <param name="oilKg">Mass of oil [kg].</param>
    /// <param name="specificHeatJKgK">Specific heat of the oil [J/kg/K].</param>
    /// <param name="riseK">Rise of temperature [K].</param>
    /// <param name="waterKg">Water that evaporates [kg].</param>
    /// <param name="temperatureK">Temperature at which it evaporates [K].</param>
    /// <returns>Heat [J].</returns>
    /// <remarks>Equation: m·cp·ΔT + w·h. Source: heat balance. Valid for: no losses to the surroundings.</remarks>
    public static double HeatJ(double oilKg, double specificHeatJKgK, double riseK, double waterKg, double temperatureK) =>
        (Guard.NotNegative(oilKg) * Guard.Positive(specificHeatJKgK) * Guard.NotNegative(riseK)) + (Guard.NotNegative(waterKg) * LatentHeatJKg(temperatureK));

    /// <summary>Cooling of oil by the water that evaporates from it.</summary>
    /// <param name="evaporatedPpm">Water that evaporates [mg/kg].</param>
    /// <param name="specificHeatJKgK">Specific heat of the oil [J/kg/K].</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <returns>Fall of temperature [K].</returns>
    /// <remarks>Equation: w·h/cp. Source: heat balance. Valid for: no heat from outside.</remarks>
    public static double SelfCoolingK(double evaporatedPpm, double specificHeatJKgK, double temperatureK) =>
        Guard.NotNegative(evaporatedPpm) * 1e-6 * LatentHeatJKg(temperatureK) / Guard.Positive(specificHeatJKgK);

    /// <summary>Power of an oil pump.</summary>
    /// <param name="flowM3S">Flow [m³/s].</param>
    /// <param name="pressureRisePa">Rise of pressure [Pa].</param>
    /// <param name="efficiency">Efficiency of pump and motor [0 to 1].</param>
    /// <returns>Electric power [W].</returns>
    /// <remarks>Equation: Q·Δp/η. Source: definition. Valid for: liquids.</remarks>
    public static double PumpPowerW(double flowM3S, double pressureRisePa, double efficiency) =>
        Guard.NotNegative(flowM3S) * Guard.NotNegative(pressureRisePa) / Guard.Positive(Guard.Between(efficiency, 0, 1));

    /// <summary>Power of a vacuum pump.</summary>
    /// <param name="suctionM3S">Flow at the suction [m³/s].</param>
    /// <param name="suctionPa">Absolute pressure at the suction [Pa].</param>
    /// <param name="dischargePa">Absolute pressure at the discharge [Pa].</param>
    /// <param name="efficiency">Isothermal efficiency with the motor [0 to 1].</param>
    /// <returns>Electric power [W].</returns>
    /// <remarks>Equation: p·Q·ln(p2/p)/η. Source: isothermal compression of an ideal gas. Valid for: vapour that does not condense in the pump.</remarks>
    public static double VacuumPumpPowerW(double suctionM3S, double suctionPa, double dischargePa, double efficiency) =>
        Guard.NotNegative(suctionM3S) * Guard.Positive(suctionPa) * Math.Log(Guard.Between(dischargePa, suctionPa, 1e7) / suctionPa) / Guard.Positive(Guard.Between(efficiency, 0, 1));
}
