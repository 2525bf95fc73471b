namespace Plant.Physics.Droplets;

/// <summary>Largest drop that turbulence leaves.</summary>
/// <param name="DiameterM">Diameter [m].</param>
/// <param name="KolmogorovM">Size of the smallest eddies [m].</param>
/// <param name="Regime">What breaks the drops.</param>
/// <param name="NearBorder">True where the drop is within a factor 3 of the smallest eddies: neither formula is then good.</param>
public sealed record BreakupSize(double DiameterM, double KolmogorovM, BreakupRegime Regime, bool NearBorder);
