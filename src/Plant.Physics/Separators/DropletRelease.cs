namespace Plant.Physics.Separators;

/// <summary>Drops that leave the downstream face of a coalescer, and how many elements carry a flow.</summary>
public static class DropletRelease
{
    /// <summary>Size at which weight tears a hanging drop off.</summary>
    /// <param name="contactM">Diameter of the contact line, about that of the fibre or pore [m].</param>
    /// <param name="interfacialTensionNM">Interfacial tension [N/m].</param>
    /// <param name="densityDifferenceKgM3">Density of water less density of oil, either sign [kg/m³].</param>
    /// <returns>Diameter [m]; an upper bound.</returns>
    /// <remarks>Equation: (6·d_c·γ/(|Δρ|g))^(1/3). Source: Tate 1864 (from memory). Valid for: slow growth; the whole drop falls.</remarks>
    public static double WeightM(double contactM, double interfacialTensionNM, double densityDifferenceKgM3) =>
        Math.Cbrt(6 * Guard.Positive(contactM) * Guard.Positive(interfacialTensionNM) / (Guard.Positive(Math.Abs(densityDifferenceKgM3)) * Constants.GravityMS2));

    /// <summary>Size at which the flow drags a drop off.</summary>
    /// <param name="contactM">Diameter of the contact line, about that of the fibre or pore [m].</param>
    /// <param name="interfacialTensionNM">Interfacial tension [N/m].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <param name="velocityMS">Velocity of the oil [m/s].</param>
    /// <returns>Diameter [m].</returns>
    /// <remarks>Equation: d_c·γ/(3μU). Source: Stokes drag against the tension of the contact line. Valid for: creeping flow and drops larger than the contact.</remarks>
    public static double DragM(double contactM, double interfacialTensionNM, double viscosityPaS, double velocityMS) =>
        Guard.Positive(contactM) * Guard.Positive(interfacialTensionNM) / (3 * Guard.Positive(viscosityPaS) * Guard.Positive(velocityMS));

    /// <summary>Number of elements for a flow.</summary>
    /// <param name="flowM3S">Flow [m³/s].</param>
    /// <param name="ratedVelocityMS">Face velocity that an element is rated for at this viscosity [m/s].</param>
    /// <param name="areaM2">Face area of an element [m²].</param>
    /// <returns>Number of elements [1].</returns>
    /// <remarks>Equation: ⌈Q/(u·A)⌉. Source: definition. Valid for: elements in parallel.</remarks>
    public static double Elements(double flowM3S, double ratedVelocityMS, double areaM2) =>
        Math.Ceiling((Guard.NotNegative(flowM3S) / (Guard.Positive(ratedVelocityMS) * Guard.Positive(areaM2))) - 1e-9);
}
