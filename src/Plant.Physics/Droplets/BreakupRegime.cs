namespace Plant.Physics.Droplets;

/// <summary>What breaks a drop in turbulence.</summary>
public enum BreakupRegime
{
    /// <summary>Pressure differences across drops larger than the smallest eddies.</summary>
    Inertial,

    /// <summary>Shear within eddies larger than the drop, as is common in viscous oil.</summary>
    Viscous,
}
