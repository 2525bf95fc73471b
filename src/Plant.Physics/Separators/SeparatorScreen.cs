namespace Plant.Physics.Separators;

/// <summary>A screen whose pores let one liquid through and hold the other.</summary>
public static class SeparatorScreen
{
    /// <summary>Pressure at which the liquid that is held comes through.</summary>
    /// <param name="interfacialTensionNM">Interfacial tension, the lowest that the oil comes to [N/m].</param>
    /// <param name="contactAngleRad">Contact angle in oil, measured through the water [rad].</param>
    /// <param name="poreM">Diameter of the largest pore [m].</param>
    /// <returns>Breakthrough pressure [Pa].</returns>
    /// <remarks>Equation: 4γ·|cos θ|/d. Source: Young–Laplace (read). Valid for: round pores; above 90° the screen holds water, below it oil.</remarks>
    public static double BreakthroughPa(double interfacialTensionNM, double contactAngleRad, double poreM) =>
        4 * Guard.Positive(interfacialTensionNM) * Math.Abs(Math.Cos(Guard.Between(contactAngleRad, 0, Math.PI))) / Guard.Positive(poreM);

    /// <summary>Whether water wets the screen.</summary>
    /// <param name="contactAngleRad">Contact angle in oil, measured through the water [rad].</param>
    /// <returns>True below 90°.</returns>
    /// <remarks>Equation: θ &lt; π/2. Source: Young 1805. Valid for: any angle.</remarks>
    public static bool WaterWets(double contactAngleRad) => Guard.Between(contactAngleRad, 0, Math.PI) < Math.PI / 2;

    /// <summary>Depth to which a liquid that wets has soaked into pores.</summary>
    /// <param name="interfacialTensionNM">Interfacial tension [N/m].</param>
    /// <param name="contactAngleRad">Contact angle through the liquid that soaks in [rad].</param>
    /// <param name="poreM">Diameter of the pores [m].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the liquid [Pa·s].</param>
    /// <param name="timeS">Time [s].</param>
    /// <returns>Depth [m]; 0 where it does not wet.</returns>
    /// <remarks>Equation: √(γ·r·cos θ·t/(2μ)). Source: Washburn 1921 (from memory). Valid for: one liquid much more viscous than the one it displaces.</remarks>
    public static double WashburnDepthM(double interfacialTensionNM, double contactAngleRad, double poreM, double viscosityPaS, double timeS)
    {
        var pull = Math.Max(0, Math.Cos(Guard.Between(contactAngleRad, 0, Math.PI)));
        return Math.Sqrt(Guard.Positive(interfacialTensionNM) * 0.5 * Guard.Positive(poreM) * pull * Guard.NotNegative(timeS) / (2 * Guard.Positive(viscosityPaS)));
    }
}
