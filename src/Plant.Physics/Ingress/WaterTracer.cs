namespace Plant.Physics.Ingress;

/// <summary>What is measured in separated water (not in oil) to tell where it came from.</summary>
public enum WaterTracer
{
    /// <summary>Sodium [mg/L].</summary>
    Sodium,

    /// <summary>Chloride [mg/L].</summary>
    Chloride,

    /// <summary>Hardness as calcium carbonate [mg/L].</summary>
    Hardness,

    /// <summary>Glycol [mg/L].</summary>
    Glycol,

    /// <summary>Boron [mg/L].</summary>
    Boron,

    /// <summary>Conductivity at 25 °C [µS/cm].</summary>
    Conductivity,
}
