namespace Plant.Register.Laboratory;

/// <summary>What is read off the titrator.</summary>
public enum BenchEntry
{
    /// <summary>The content itself [mg/kg].</summary>
    Ppm,

    /// <summary>Mass of the sample [g] and mass of water [µg].</summary>
    MassAndWater,

    /// <summary>Mass of the sample [g] and charge [C].</summary>
    MassAndCharge,
}
