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
}
