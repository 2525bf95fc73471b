namespace Plant.Physics;

/// <summary>Constants that every calculation shares.</summary>
public static class Constants
{
    /// <summary>Standard acceleration of free fall [m/s²].</summary>
    public const double GravityMS2 = 9.80665;

    /// <summary>0 °C [K].</summary>
    public const double ZeroCelsiusK = 273.15;

    /// <summary>Below this difference of densities gravity does not separate water from oil [kg/m³] (judgement: about twice the uncertainty of a density).</summary>
    public const double NeutralDensityKgM3 = 5;

    /// <summary>Permittivity of vacuum (CODATA) [F/m].</summary>
    public const double VacuumPermittivityFM = 8.8541878128e-12;

    /// <summary>Boltzmann constant (SI) [J/K].</summary>
    public const double BoltzmannJK = 1.380649e-23;

    /// <summary>Gas constant of water vapour: 8.314462618/0.01801528 [J/(kg·K)].</summary>
    public const double WaterVapourJKgK = 461.5227721;
}
