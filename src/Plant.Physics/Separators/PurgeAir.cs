namespace Plant.Physics.Separators;

/// <summary>Water carried out of a headspace by air.</summary>
public static class PurgeAir
{
    /// <summary>Density of water vapour.</summary>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="waterPressurePa">Partial pressure of water [Pa].</param>
    /// <returns>Density of the vapour [kg/m³].</returns>
    /// <remarks>Equation: p·M/(R·T). Source: ideal gas. Valid for: pressures up to 1 bar, within 1 %.</remarks>
    public static double VapourDensityKgM3(double temperatureK, double waterPressurePa) =>
        Guard.NotNegative(waterPressurePa) / (Constants.WaterVapourJKgK * Guard.Positive(temperatureK));

    /// <summary>Water that air takes along.</summary>
    /// <param name="flowM3S">Flow of air at the temperature [m³/s].</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="outletWaterPa">Partial pressure of water in the air that leaves [Pa].</param>
    /// <param name="inletWaterPa">Partial pressure of water in the air that comes [Pa].</param>
    /// <returns>Removal [kg/s]; negative where the air brings water.</returns>
    /// <remarks>Equation: Q·(p_out − p_in)·M/(R·T). Source: ideal gas. Valid for: pressures up to 1 bar, within 1 %.</remarks>
    public static double RemovalKgS(double flowM3S, double temperatureK, double outletWaterPa, double inletWaterPa) =>
        Guard.NotNegative(flowM3S) * (VapourDensityKgM3(temperatureK, outletWaterPa) - VapourDensityKgM3(temperatureK, inletWaterPa));

    /// <summary>Air needed to carry a flow of water.</summary>
    /// <param name="removalKgS">Water to carry out [kg/s].</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="outletWaterPa">Partial pressure of water in the air that leaves [Pa].</param>
    /// <param name="inletWaterPa">Partial pressure of water in the air that comes [Pa].</param>
    /// <returns>Flow of air at the temperature [m³/s]; null where the air is no drier than the headspace.</returns>
    /// <remarks>Equation: inverse of the removal. Source: ideal gas. Valid for: pressures up to 1 bar, within 1 %.</remarks>
    public static double? FlowM3S(double removalKgS, double temperatureK, double outletWaterPa, double inletWaterPa)
    {
        var carried = VapourDensityKgM3(temperatureK, outletWaterPa) - VapourDensityKgM3(temperatureK, inletWaterPa);
        return carried > 0 ? Guard.NotNegative(removalKgS) / carried : null;
    }
}
