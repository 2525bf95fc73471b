namespace Plant.Physics.Tanks;

/// <summary>What the suction and the flow do to water that has settled.</summary>
public static class SuctionLimits
{
    /// <summary>Coefficient of the height at which an interface is drawn down (from memory; published values span 0.62 to 0.69) [1].</summary>
    public const double WithdrawalCoefficient = 0.69;

    /// <summary>Margin on that height: the onset is sharp and has a hysteresis (common practice) [1].</summary>
    public const double WithdrawalMargin = 2;

    /// <summary>Richardson number below which a flow over the layer takes water up again (order of magnitude, from memory) [1].</summary>
    public const double SafeRichardson = 10;

    /// <summary>Height above the water at which a suction begins to draw it in.</summary>
    /// <param name="flowM3S">Flow into the suction [m³/s].</param>
    /// <param name="densityDifferenceKgM3">Density difference of water and oil, either way [kg/m³].</param>
    /// <param name="oilKgM3">Density of the oil [kg/m³].</param>
    /// <returns>Height [m]; multiply by the margin for planning.</returns>
    /// <remarks>Equation: C·(Q²/g')^(1/5), g' = g·Δρ/ρ. Source: Lubin and Springer 1967 (coefficient from memory). Valid for: thin oils, a single suction far from walls.</remarks>
    public static double WithdrawalHeightM(double flowM3S, double densityDifferenceKgM3, double oilKgM3) =>
        WithdrawalCoefficient * Math.Pow(Math.Pow(Guard.NotNegative(flowM3S), 2) / ReducedGravityMS2(densityDifferenceKgM3, oilKgM3), 0.2);

    /// <summary>Gravity that acts on the difference of two layers.</summary>
    /// <param name="densityDifferenceKgM3">Density difference of water and oil, either way [kg/m³].</param>
    /// <param name="oilKgM3">Density of the oil [kg/m³].</param>
    /// <returns>Acceleration [m/s²].</returns>
    /// <remarks>Equation: g·|Δρ|/ρ. Source: definition. Valid for: layers of a small difference.</remarks>
    public static double ReducedGravityMS2(double densityDifferenceKgM3, double oilKgM3) =>
        Constants.GravityMS2 * Guard.Positive(Math.Abs(Guard.Finite(densityDifferenceKgM3))) / Guard.Positive(oilKgM3);

    /// <summary>Whether a flow over settled water takes it up again.</summary>
    /// <param name="reducedGravityMS2">Gravity that acts on the difference [m/s²].</param>
    /// <param name="layerM">Depth of the oil that flows [m].</param>
    /// <param name="velocityMS">Its velocity [m/s].</param>
    /// <returns>Bulk Richardson number [1]; above <see cref="SafeRichardson"/> the layer stays.</returns>
    /// <remarks>Equation: g'·h/U². Source: bulk Richardson number (from memory). Valid for: order of magnitude only.</remarks>
    public static double Richardson(double reducedGravityMS2, double layerM, double velocityMS) =>
        Guard.Positive(reducedGravityMS2) * Guard.Positive(layerM) / Math.Pow(Guard.Positive(velocityMS), 2);

    /// <summary>Water on a floor that falls evenly towards one end.</summary>
    /// <param name="widthM">Width [m].</param>
    /// <param name="lengthM">Length over which it falls [m].</param>
    /// <param name="fallM">How much it falls [m].</param>
    /// <param name="heightM">Height above the lowest line [m].</param>
    /// <returns>Volume [m³].</returns>
    /// <remarks>Equation: W·L·h²/(2Δz) up to the fall, then W·L·(h − Δz/2). Source: geometry. Valid for: a flat sloped floor.</remarks>
    public static double SlopedFloorM3(double widthM, double lengthM, double fallM, double heightM)
    {
        var (area, fall, height) = (Guard.Positive(widthM) * Guard.Positive(lengthM), Guard.NotNegative(fallM), Guard.NotNegative(heightM));
        return height <= fall ? fall == 0 ? 0 : area * height * height / (2 * fall) : area * (height - (fall / 2));
    }

    /// <summary>Height of water on a floor that falls evenly towards one end.</summary>
    /// <param name="widthM">Width [m].</param>
    /// <param name="lengthM">Length over which it falls [m].</param>
    /// <param name="fallM">How much it falls [m].</param>
    /// <param name="volumeM3">Volume of the water [m³].</param>
    /// <returns>Height above the lowest line [m].</returns>
    /// <remarks>Equation: √(2·Δz·V/(W·L)) up to the fall, then V/(W·L) + Δz/2. Source: geometry. Valid for: a flat sloped floor.</remarks>
    public static double SlopedFloorHeightM(double widthM, double lengthM, double fallM, double volumeM3)
    {
        var (area, fall, volume) = (Guard.Positive(widthM) * Guard.Positive(lengthM), Guard.NotNegative(fallM), Guard.NotNegative(volumeM3));
        return volume <= area * fall / 2 ? Math.Sqrt(2 * fall * volume / area) : (volume / area) + (fall / 2);
    }
}
