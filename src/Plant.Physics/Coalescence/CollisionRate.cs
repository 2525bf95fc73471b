namespace Plant.Physics.Coalescence;

/// <summary>Rate constants of collisions of two drops: collisions per time and volume over both numbers per volume. Two of one kind count half.</summary>
public static class CollisionRate
{
    /// <summary>Coefficient of Coulaloglou and Tavlarides as a public library has it [1].</summary>
    public const double InertialCoefficient = 2.8;

    /// <summary>Mean over directions of the attracting part of (3cos²θ − 1)/2, (1/√3 − 1/(3√3))/2 [1].</summary>
    private const double AttractingShare = 0.19245008972987526;

    /// <summary>By Brownian motion.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="temperatureK">Temperature [K].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>Equation: 2kT/(3μ)·(d1 + d2)(1/d1 + 1/d2). Source: Smoluchowski 1917 (from memory). Valid for: drops up to 1 or 2 µm, where it counts.</remarks>
    public static double BrownianM3S(double firstM, double secondM, double temperatureK, double viscosityPaS)
    {
        var sum = Guard.Positive(firstM) + Guard.Positive(secondM);
        return 2 * Constants.BoltzmannJK * Guard.Positive(temperatureK) / (3 * Guard.Positive(viscosityPaS)) * sum * sum / (firstM * secondM);
    }

    /// <summary>By laminar shear.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="shearRatePerS">Shear rate [1/s].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>Equation: G·(d1 + d2)³/6. Source: Smoluchowski 1917 (from memory). Valid for: drops small against the flow.</remarks>
    public static double LaminarShearM3S(double firstM, double secondM, double shearRatePerS)
    {
        var sum = Guard.NotNegative(firstM) + Guard.NotNegative(secondM);
        return Guard.NotNegative(shearRatePerS) / 6 * sum * sum * sum;
    }

    /// <summary>By turbulence below the smallest eddies.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <param name="kinematicViscosityM2S">Kinematic viscosity of the oil [m²/s].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>
    /// Equation: √(8π/15)·√(ε/ν)·(r1 + r2)³. Source: Saffman and Turner 1956 (from memory). Valid for: drops below the Kolmogorov length; an upper bound.
    /// Disagrees with: code that puts diameters for the radii, which is eight times as much.
    /// </remarks>
    public static double SaffmanTurnerM3S(double firstM, double secondM, double dissipationWKg, double kinematicViscosityM2S)
    {
        var radii = 0.5 * (Guard.NotNegative(firstM) + Guard.NotNegative(secondM));
        return Math.Sqrt(8 * Math.PI / 15 * Guard.NotNegative(dissipationWKg) / Guard.Positive(kinematicViscosityM2S)) * radii * radii * radii;
    }

    /// <summary>By different speeds of settling.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="firstMS">Velocity of the one [m/s].</param>
    /// <param name="secondMS">Velocity of the other [m/s].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>Equation: π/4·(d1 + d2)²·|v1 − v2|. Source: swept cylinder (from memory). Valid for: straight paths; flow around the larger drop is left to the collision efficiency.</remarks>
    public static double DifferentialSettlingM3S(double firstM, double secondM, double firstMS, double secondMS)
    {
        var sum = Guard.NotNegative(firstM) + Guard.NotNegative(secondM);
        return Math.PI / 4 * sum * sum * Math.Abs(Guard.Finite(firstMS) - Guard.Finite(secondMS));
    }

    /// <summary>By turbulence of eddies smaller than the drops.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="dissipationWKg">Dissipation [W/kg].</param>
    /// <param name="volumeFraction">Volume fraction of water [0 to 1).</param>
    /// <param name="coefficient">Coefficient, to be calibrated [1].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>
    /// Equation: C1·(v1^⅔ + v2^⅔)·(v1^(2/9) + v2^(2/9))^½·ε^⅓/(1 + φ), v the volumes. Source: Coulaloglou and Tavlarides 1977 (C1 as in a public library).
    /// Valid for: drops above the Kolmogorov length. Disagrees with: forms with (d1 + d2)² for d1² + d2², twice as much for equal drops.
    /// </remarks>
    public static double InertialM3S(double firstM, double secondM, double dissipationWKg, double volumeFraction, double coefficient = InertialCoefficient)
    {
        double v1 = Math.PI / 6 * Math.Pow(Guard.Positive(firstM), 3), v2 = Math.PI / 6 * Math.Pow(Guard.Positive(secondM), 3);
        return Guard.NotNegative(coefficient) * (Math.Pow(v1, 2.0 / 3) + Math.Pow(v2, 2.0 / 3)) * Math.Sqrt(Math.Pow(v1, 2.0 / 9) + Math.Pow(v2, 2.0 / 9))
            * Math.Cbrt(Guard.NotNegative(dissipationWKg)) / (1 + Guard.Between(volumeFraction, 0, 1));
    }

    /// <summary>By attraction of the charges that a field induces.</summary>
    /// <param name="firstM">Diameter of the one drop [m].</param>
    /// <param name="secondM">Diameter of the other [m].</param>
    /// <param name="fieldVM">Field [V/m].</param>
    /// <param name="relativePermittivity">Relative permittivity of the oil [1].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <returns>Rate constant [m³/s].</returns>
    /// <remarks>
    /// Equation: 4π·s²·u·0.19245 with s = r1 + r2, u = F(s)/(6πμ)·(1/r1 + 1/r2), F = 24πεr1³r2³E²/s⁴; hence 16π·0.19245·εE²·r1²r2²/(μ·s). Source: force of far dipoles (from memory), flux at contact by judgement.
    /// Valid for: conducting drops in insulating oil, water below about 10 %; the true force near contact is larger. Calibrate.
    /// </remarks>
    public static double FieldM3S(double firstM, double secondM, double fieldVM, double relativePermittivity, double viscosityPaS)
    {
        double r1 = 0.5 * Guard.Positive(firstM), r2 = 0.5 * Guard.Positive(secondM);
        var stress = Guard.Between(relativePermittivity, 1, 200) * Constants.VacuumPermittivityFM * Guard.NotNegative(fieldVM) * fieldVM;
        return 16 * Math.PI * AttractingShare * stress * r1 * r1 * r2 * r2 / (Guard.Positive(viscosityPaS) * (r1 + r2));
    }
}
