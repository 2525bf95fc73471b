namespace Plant.Physics.Ingress;

/// <summary>Leak through a hole in a cooler tube.</summary>
public static class CoolerLeak
{
    /// <summary>Discharge coefficient of a sharp hole (from memory) [1].</summary>
    public const double SharpHole = 0.61;

    /// <summary>Flow through a hole.</summary>
    /// <param name="holeM">Diameter of the hole [m].</param>
    /// <param name="pressureDifferencePa">Pressure difference, either sign [Pa].</param>
    /// <param name="densityKgM3">Density of the liquid that flows [kg/m³].</param>
    /// <param name="coefficient">Discharge coefficient [1].</param>
    /// <returns>Flow in the sense of the difference [m³/s].</returns>
    /// <remarks>Equation: Cd·A·√(2Δp/ρ). Source: orifice (coefficient from memory). Valid for: holes short against their width; a long thin one passes less, see the capillary.</remarks>
    public static double OrificeM3S(double holeM, double pressureDifferencePa, double densityKgM3, double coefficient = SharpHole) =>
        Math.CopySign(Guard.Positive(coefficient) * Math.PI / 4 * Math.Pow(Guard.NotNegative(holeM), 2) * Math.Sqrt(2 * Math.Abs(Guard.Finite(pressureDifferencePa)) / Guard.Positive(densityKgM3)), pressureDifferencePa);

    /// <summary>Water that comes through a hole between water and oil.</summary>
    /// <param name="holeM">Diameter of the hole [m].</param>
    /// <param name="waterPa">Pressure on the water side [Pa].</param>
    /// <param name="oilPa">Pressure on the oil side [Pa].</param>
    /// <param name="waterKgM3">Density of water [kg/m³].</param>
    /// <param name="oilKgM3">Density of oil [kg/m³].</param>
    /// <returns>Flow of water into the oil [m³/s]; negative: oil leaks into the water.</returns>
    /// <remarks>Equation: orifice with the density of the side of higher pressure. Source: orifice (coefficient from memory). Valid for: running pumps; at standstill the sign may turn and let water in.</remarks>
    public static double WaterIntoOilM3S(double holeM, double waterPa, double oilPa, double waterKgM3, double oilKgM3) =>
        OrificeM3S(holeM, Guard.Finite(waterPa) - Guard.Finite(oilPa), waterPa >= oilPa ? waterKgM3 : oilKgM3);

    /// <summary>Flow through a hole that is long against its width.</summary>
    /// <param name="holeM">Diameter of the hole [m].</param>
    /// <param name="lengthM">Length of the hole [m].</param>
    /// <param name="pressureDifferencePa">Pressure difference, either sign [Pa].</param>
    /// <param name="viscosityPaS">Dynamic viscosity of the liquid that flows [Pa·s].</param>
    /// <returns>Flow in the sense of the difference [m³/s].</returns>
    /// <remarks>Equation: π·d⁴Δp/(128μL). Source: Hagen and Poiseuille. Valid for: Reynolds numbers below 2300 only; above, take the orifice.</remarks>
    public static double CapillaryM3S(double holeM, double lengthM, double pressureDifferencePa, double viscosityPaS) =>
        Math.PI * Math.Pow(Guard.NotNegative(holeM), 4) * Guard.Finite(pressureDifferencePa) / (128 * Guard.Positive(viscosityPaS) * Guard.Positive(lengthM));

    /// <summary>Reynolds number of a flow in a hole.</summary>
    /// <param name="flowM3S">Flow, either sign [m³/s].</param>
    /// <param name="holeM">Diameter of the hole [m].</param>
    /// <param name="densityKgM3">Density [kg/m³].</param>
    /// <param name="viscosityPaS">Dynamic viscosity [Pa·s].</param>
    /// <returns>Reynolds number [1].</returns>
    /// <remarks>Equation: 4ρ|Q|/(π·μ·d). Source: definition. Valid for: round holes.</remarks>
    public static double Reynolds(double flowM3S, double holeM, double densityKgM3, double viscosityPaS) =>
        4 * Guard.Positive(densityKgM3) * Math.Abs(Guard.Finite(flowM3S)) / (Math.PI * Guard.Positive(viscosityPaS) * Guard.Positive(holeM));
}
