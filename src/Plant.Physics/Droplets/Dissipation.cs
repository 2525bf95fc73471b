namespace Plant.Physics.Droplets;

/// <summary>Power that flow loses to turbulence, per mass of oil.</summary>
public static class Dissipation
{
    /// <summary>Mean dissipation in a pipe.</summary>
    /// <param name="frictionFactor">Darcy friction factor [1].</param>
    /// <param name="velocityMS">Mean velocity [m/s].</param>
    /// <param name="diameterM">Inner diameter [m].</param>
    /// <returns>Dissipation [W/kg].</returns>
    /// <remarks>Equation: f·U³/(2D). Source: loss of pressure times flow over mass. Valid for: full pipe; near the wall it is higher.</remarks>
    public static double PipeWKg(double frictionFactor, double velocityMS, double diameterM) =>
        Guard.Positive(frictionFactor) * Math.Pow(Guard.NotNegative(velocityMS), 3) / (2 * Guard.Positive(diameterM));

    /// <summary>Mean dissipation behind a valve or an orifice.</summary>
    /// <param name="lossPa">Lasting loss of pressure [Pa].</param>
    /// <param name="flowM3S">Flow [m³/s].</param>
    /// <param name="densityKgM3">Density of the oil [kg/m³].</param>
    /// <param name="volumeM3">Volume in which it dissipates, one to three pipe diameters long [m³].</param>
    /// <returns>Dissipation [W/kg].</returns>
    /// <remarks>Equation: Δp·Q/(ρ·V). Source: energy balance; the volume is a judgement and the largest doubt. Valid for: turbulent flow.</remarks>
    public static double ValveWKg(double lossPa, double flowM3S, double densityKgM3, double volumeM3) =>
        Guard.NotNegative(lossPa) * Guard.NotNegative(flowM3S) / (Guard.Positive(densityKgM3) * Guard.Positive(volumeM3));

    /// <summary>Mean dissipation in a pump.</summary>
    /// <param name="risePa">Rise of pressure [Pa].</param>
    /// <param name="flowM3S">Flow [m³/s].</param>
    /// <param name="efficiency">Hydraulic efficiency, above 0 [0 to 1].</param>
    /// <param name="densityKgM3">Density of the oil [kg/m³].</param>
    /// <param name="volumeM3">Volume of the wheel or the gaps [m³].</param>
    /// <returns>Dissipation [W/kg].</returns>
    /// <remarks>Equation: Δp·Q·(1/η − 1)/(ρ·V). Source: energy balance. Valid for: mean over the volume; gaps and blade tips are far higher.</remarks>
    public static double PumpWKg(double risePa, double flowM3S, double efficiency, double densityKgM3, double volumeM3) =>
        Guard.NotNegative(risePa) * Guard.NotNegative(flowM3S) * ((1 / Guard.Between(efficiency, 1e-3, 1)) - 1) / (Guard.Positive(densityKgM3) * Guard.Positive(volumeM3));
}
