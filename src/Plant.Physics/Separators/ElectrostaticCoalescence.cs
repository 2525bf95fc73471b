namespace Plant.Physics.Separators;

/// <summary>Limits and times of water drops in an electric field.</summary>
public static class ElectrostaticCoalescence
{
    /// <summary>ε·E²·r/γ at which a conducting drop becomes unstable [1].</summary>
    public const double TaylorLimit = 0.21025;

    /// <summary>Electric capillary number of a drop.</summary>
    /// <param name="permittivityFM">Permittivity of the liquid [F/m].</param>
    /// <param name="fieldVM">Field, root mean square [V/m].</param>
    /// <param name="radiusM">Radius of the drop [m].</param>
    /// <param name="interfacialTensionNM">Interfacial tension [N/m].</param>
    /// <returns>Electric capillary number [1].</returns>
    /// <remarks>Equation: ε·E²·r/γ. Source: definition with the radius. Valid for: conducting drops in an insulator. Disagrees with: texts that take the diameter, by a factor of two.</remarks>
    public static double CapillaryNumber(double permittivityFM, double fieldVM, double radiusM, double interfacialTensionNM) =>
        Guard.Positive(permittivityFM) * Math.Pow(Guard.Finite(fieldVM), 2) * Guard.Positive(radiusM) / Guard.Positive(interfacialTensionNM);

    /// <summary>Field at which a drop breaks up.</summary>
    /// <param name="permittivityFM">Permittivity of the liquid [F/m].</param>
    /// <param name="radiusM">Radius of the drop [m].</param>
    /// <param name="interfacialTensionNM">Interfacial tension [N/m].</param>
    /// <returns>Critical field [V/m].</returns>
    /// <remarks>
    /// Equation: √(0.21025·γ/(ε·r)). Source: Taylor 1964 (read; the number by the balance of a spheroid). Valid for: a conducting drop alone at rest.
    /// Disagrees with: falling drops in silicone oil, which broke 26 % below it; design at half of it.
    /// </remarks>
    public static double CriticalFieldVM(double permittivityFM, double radiusM, double interfacialTensionNM) =>
        Math.Sqrt(TaylorLimit * Guard.Positive(interfacialTensionNM) / (Guard.Positive(permittivityFM) * Guard.Positive(radiusM)));

    /// <summary>Mean distance between neighbouring drops.</summary>
    /// <param name="diameterM">Diameter of the drops [m].</param>
    /// <param name="waterVolumeFraction">Volume fraction of water [0 to 1].</param>
    /// <returns>Distance of the centres [m].</returns>
    /// <remarks>Equation: d·(π/(6φ))^(1/3). Source: one drop a cube. Valid for: fractions below 0.5.</remarks>
    public static double SpacingM(double diameterM, double waterVolumeFraction) =>
        Guard.Positive(diameterM) * Math.Cbrt(Math.PI / (6 * Guard.Positive(Guard.Between(waterVolumeFraction, 0, 1))));

    /// <summary>Time in which two neighbouring equal drops come together.</summary>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="permittivityFM">Permittivity of the oil [F/m].</param>
    /// <param name="fieldVM">Field, root mean square [V/m].</param>
    /// <param name="waterVolumeFraction">Volume fraction of water [0 to 1].</param>
    /// <returns>Time [s]; the same for every size.</returns>
    /// <remarks>
    /// Equation: μ(s0⁵ − (2a)⁵)/(40ε·E²·a⁵), s0 = d(π/(6φ))^(1/3). Source: far dipoles against Stokes drag, integrated. Valid for: a pair on the field axis, fractions below 0.2.
    /// Disagrees with: near contact, where attraction and film drainage both grow; it is a time of approach, not of merging.
    /// </remarks>
    public static double ApproachTimeS(double viscosityPaS, double permittivityFM, double fieldVM, double waterVolumeFraction)
    {
        var far = 2 * SpacingM(1, waterVolumeFraction);
        return Guard.Positive(viscosityPaS) * Math.Max(0, Math.Pow(far, 5) - 32) / (40 * Guard.Positive(permittivityFM) * Math.Pow(Guard.Positive(fieldVM), 2));
    }

    /// <summary>Power that the conduction of the oil takes.</summary>
    /// <param name="conductivitySM">Conductivity [S/m].</param>
    /// <param name="fieldVM">Field, root mean square [V/m].</param>
    /// <param name="volumeM3">Volume between the electrodes [m³].</param>
    /// <returns>Power [W].</returns>
    /// <remarks>Equation: σ·E²·V. Source: Ohm's law. Valid for: a uniform field without discharges.</remarks>
    public static double PowerW(double conductivitySM, double fieldVM, double volumeM3) =>
        Guard.NotNegative(conductivitySM) * Math.Pow(Guard.Finite(fieldVM), 2) * Guard.NotNegative(volumeM3);
}
