namespace Plant.Physics.Droplets;

/// <summary>Largest drops that survive in turbulent oil.</summary>
public static class Breakup
{
    /// <summary>Coefficient of Hinze's formula [1].</summary>
    public const double HinzeCoefficient = 0.725;

    /// <summary>A drop within this factor of the smallest eddies is in neither regime [1].</summary>
    public const double BorderFactor = 3;

    /// <summary>Size of the smallest eddies.</summary>
    /// <param name="kinematicViscosityM2S">Kinematic viscosity of the oil [m²/s].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <returns>Kolmogorov length [m].</returns>
    /// <remarks>Equation: (ν³/ε)^¼. Source: Kolmogorov 1941 (from memory). Valid for: turbulent flow.</remarks>
    public static double KolmogorovM(double kinematicViscosityM2S, double dissipationWKg) =>
        Math.Pow(Math.Pow(Guard.Positive(kinematicViscosityM2S), 3) / Guard.Positive(dissipationWKg), 0.25);

    /// <summary>Largest drop by inertial breakup.</summary>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="densityKgM3">Density of the oil [kg/m³].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <returns>Diameter [m].</returns>
    /// <remarks>Equation: 0.725·(σ/ρ)^0.6·ε^−0.4. Source: Hinze 1955 (coefficient from memory). Valid for: drops well above the Kolmogorov length, dilute, thin drop fluid.</remarks>
    public static double HinzeM(double tensionNM, double densityKgM3, double dissipationWKg) =>
        HinzeCoefficient * Math.Pow(Guard.Positive(tensionNM) / Guard.Positive(densityKgM3), 0.6) * Math.Pow(Guard.Positive(dissipationWKg), -0.4);

    /// <summary>Largest drop by inertial breakup where the drop's own viscosity resists.</summary>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="densityKgM3">Density of the oil [kg/m³].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <param name="dropViscosityPaS">Dynamic viscosity of the drop [Pa·s].</param>
    /// <returns>Diameter [m].</returns>
    /// <remarks>Equation: d = 0.725·((σ + 0.7·μd·(εd)^⅓/4)/ρ)^0.6·ε^−0.4, by iteration. Source: Davies 1985 (from memory). Valid for: as Hinze; for water the term hardly counts.</remarks>
    public static double DaviesM(double tensionNM, double densityKgM3, double dissipationWKg, double dropViscosityPaS)
    {
        var diameter = HinzeM(tensionNM, densityKgM3, dissipationWKg);
        for (var i = 0; i < 100; i++)
        {
            var next = HinzeM(tensionNM + (0.7 * Guard.NotNegative(dropViscosityPaS) * Math.Cbrt(dissipationWKg * diameter) / 4), densityKgM3, dissipationWKg);
            if (Math.Abs(next - diameter) <= 1e-14 * next)
            {
                break;
            }

            diameter = next;
        }

        return diameter;
    }

    /// <summary>Largest drop by viscous breakup.</summary>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="kinematicViscosityM2S">Kinematic viscosity of the oil [m²/s].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <param name="coefficient">Coefficient of order 1, to be fitted [1].</param>
    /// <returns>Diameter [m].</returns>
    /// <remarks>Equation: C·σ/(μ·√(ε/ν)). Source: form read, coefficient of order 1. Valid for: drops below the Kolmogorov length.</remarks>
    public static double ViscousM(double tensionNM, double viscosityPaS, double kinematicViscosityM2S, double dissipationWKg, double coefficient = 1) =>
        Guard.Positive(coefficient) * Guard.Positive(tensionNM) / (Guard.Positive(viscosityPaS) * Math.Sqrt(Guard.Positive(dissipationWKg) / Guard.Positive(kinematicViscosityM2S)));

    /// <summary>Largest drop, by the regime that its size puts it in.</summary>
    /// <param name="tensionNM">Interfacial tension [N/m].</param>
    /// <param name="densityKgM3">Density of the oil [kg/m³].</param>
    /// <param name="kinematicViscosityM2S">Kinematic viscosity of the oil [m²/s].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <returns>The size, its regime, and whether it is near the border.</returns>
    /// <remarks>Equation: Hinze where that is above the Kolmogorov length, else viscous. Source: Hinze 1955; viscous form read. Valid for: dilute water; near the border a factor of 2 either way.</remarks>
    public static BreakupSize Largest(double tensionNM, double densityKgM3, double kinematicViscosityM2S, double dissipationWKg)
    {
        var eddy = KolmogorovM(kinematicViscosityM2S, dissipationWKg);
        var inertial = HinzeM(tensionNM, densityKgM3, dissipationWKg);
        var regime = inertial > eddy ? BreakupRegime.Inertial : BreakupRegime.Viscous;
        var size = regime == BreakupRegime.Inertial ? inertial : ViscousM(tensionNM, densityKgM3 * kinematicViscosityM2S, kinematicViscosityM2S, dissipationWKg);
        return new(size, eddy, regime, inertial < BorderFactor * eddy && inertial > eddy / BorderFactor);
    }
}
