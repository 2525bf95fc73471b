namespace Plant.Physics.Separators;

/// <summary>Centrifuges by the theory of the equivalent settling area.</summary>
public static class Centrifuge
{
    /// <summary>Share of the theoretical area that real bowls reach, from 0.4 to 0.6 (common practice) [1].</summary>
    public const double PracticalShare = 0.5;

    /// <summary>Acceleration over that of gravity.</summary>
    /// <param name="speedRadS">Angular speed [rad/s].</param>
    /// <param name="radiusM">Radius [m].</param>
    /// <returns>Ratio [1].</returns>
    /// <remarks>Equation: ω²r/g. Source: definition. Valid for: any.</remarks>
    public static double AccelerationRatio(double speedRadS, double radiusM) => Math.Pow(Guard.Finite(speedRadS), 2) * Guard.NotNegative(radiusM) / Constants.GravityMS2;

    /// <summary>Equivalent settling area of a disc stack.</summary>
    /// <param name="discs">Number of gaps between discs [1].</param>
    /// <param name="speedRadS">Angular speed [rad/s].</param>
    /// <param name="outerM">Outer radius of the discs [m].</param>
    /// <param name="innerM">Inner radius of the discs [m].</param>
    /// <param name="halfAngleRad">Angle between disc and axis [rad].</param>
    /// <returns>Area Σ [m²].</returns>
    /// <remarks>Equation: 2π·n·ω²(r_o³ − r_i³)/(3g·tan θ). Source: Ambler 1952 (from memory; published examples recomputed). Valid for: creeping drops, even flow between the discs.</remarks>
    public static double DiscStackM2(double discs, double speedRadS, double outerM, double innerM, double halfAngleRad) =>
        2 * Math.PI * Guard.NotNegative(discs) * Math.Pow(Guard.Finite(speedRadS), 2) * (Math.Pow(Guard.Positive(outerM), 3) - Math.Pow(Guard.Between(innerM, 0, outerM), 3))
        / (3 * Constants.GravityMS2 * Math.Tan(Guard.Positive(Guard.Between(halfAngleRad, 0, 0.5 * Math.PI))));

    /// <summary>Equivalent settling area of a tubular bowl.</summary>
    /// <param name="lengthM">Length of the bowl [m].</param>
    /// <param name="speedRadS">Angular speed [rad/s].</param>
    /// <param name="outerM">Inside radius of the bowl [m].</param>
    /// <param name="innerM">Radius of the liquid's surface [m].</param>
    /// <returns>Area Σ [m²].</returns>
    /// <remarks>Equation: π·L·ω²(r_o² − r_i²)/(g·ln(r_o/r_i)). Source: Ambler 1952 (from memory; a published example recomputed). Valid for: creeping drops, plug flow.</remarks>
    public static double TubularM2(double lengthM, double speedRadS, double outerM, double innerM)
    {
        var ratio = Guard.Positive(outerM) / Guard.Positive(Guard.Between(innerM, 0, outerM));
        var mean = ratio - 1 < 1e-9 ? 2 : (1 - (1 / (ratio * ratio))) / Math.Log(ratio);
        return Math.PI * Guard.Positive(lengthM) * Math.Pow(Guard.Finite(speedRadS) * outerM, 2) * mean / Constants.GravityMS2;
    }

    /// <summary>Size above which every drop is taken.</summary>
    /// <param name="flowM3S">Flow [m³/s].</param>
    /// <param name="areaM2">Equivalent settling area [m²].</param>
    /// <param name="densityDifferenceKgM3">Density of water less density of oil, either sign [kg/m³].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the oil [Pa·s].</param>
    /// <returns>Diameter [m]; null within 5 kg/m³, where no speed parts them.</returns>
    /// <remarks>Equation: √(18μQ/(g|Δρ|Σ)). Source: Stokes velocity in gravity = Q/Σ. Valid for: creeping drops. Disagrees with: texts that cut at one half and write Q/2Σ.</remarks>
    public static double? CutSizeM(double flowM3S, double areaM2, double densityDifferenceKgM3, double viscosityPaS) =>
        Math.Abs(Guard.Finite(densityDifferenceKgM3)) < Constants.NeutralDensityKgM3
            ? null
            : Math.Sqrt(18 * Guard.Positive(viscosityPaS) * Guard.NotNegative(flowM3S) / (Constants.GravityMS2 * Math.Abs(densityDifferenceKgM3) * Guard.Positive(areaM2)));

    /// <summary>Share of drops of one size that is taken.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <param name="cutSizeM">Size above which every drop is taken [m].</param>
    /// <returns>Share [0 to 1].</returns>
    /// <remarks>Equation: min(1, (d/d_c)²). Source: equivalent settling area with drops spread evenly over the inlet. Valid for: creeping drops that do not merge or break.</remarks>
    public static double Removal(double diameterM, double cutSizeM) => Math.Min(1, Math.Pow(Guard.NotNegative(diameterM) / Guard.Positive(cutSizeM), 2));

    /// <summary>Radius of the interface between oil and water in a bowl with two overflows.</summary>
    /// <param name="waterKgM3">Density of water [kg/m³].</param>
    /// <param name="waterOverflowM">Radius of the water overflow [m].</param>
    /// <param name="oilKgM3">Density of oil [kg/m³].</param>
    /// <param name="oilOverflowM">Radius of the oil overflow [m].</param>
    /// <returns>Radius [m]; null where the densities are too near or no interface forms.</returns>
    /// <remarks>Equation: √((ρw·r_w² − ρo·r_o²)/(ρw − ρo)). Source: equal pressure of both columns (from memory). Valid for: water heavier by more than 5 kg/m³; it runs away as they come near.</remarks>
    public static double? InterfaceM(double waterKgM3, double waterOverflowM, double oilKgM3, double oilOverflowM)
    {
        var difference = Guard.Positive(waterKgM3) - Guard.Positive(oilKgM3);
        var square = ((waterKgM3 * Math.Pow(Guard.Positive(waterOverflowM), 2)) - (oilKgM3 * Math.Pow(Guard.Positive(oilOverflowM), 2))) / difference;
        return difference < Constants.NeutralDensityKgM3 || square <= 0 ? null : Math.Sqrt(square);
    }
}
