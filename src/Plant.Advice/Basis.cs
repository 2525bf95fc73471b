namespace Plant.Advice;

/// <summary>What an assessment rests on.</summary>
public enum Basis
{
    /// <summary>Samples, and a solubility curve given for the fluid.</summary>
    Measured,

    /// <summary>Samples, but the family's default solubility.</summary>
    FamilyDefault,

    /// <summary>No usable sample.</summary>
    NoSamples,
}
