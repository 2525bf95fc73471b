namespace Plant.Physics.Coalescence;

/// <summary>Oil in turbulent flow.</summary>
/// <param name="ViscosityPaS">Dynamic viscosity [Pa·s].</param>
/// <param name="DensityKgM3">Density [kg/m³].</param>
/// <param name="TensionNM">Interfacial tension [N/m].</param>
/// <param name="DissipationWKg">Dissipation [W/kg].</param>
/// <param name="VolumeFraction">Volume fraction of water [0 to 1).</param>
public sealed record TurbulentOil(double ViscosityPaS, double DensityKgM3, double TensionNM, double DissipationWKg, double VolumeFraction);
