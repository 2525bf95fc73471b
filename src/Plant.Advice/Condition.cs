namespace Plant.Advice;

/// <summary>State of a reservoir; the first that holds.</summary>
public enum Condition
{
    /// <summary>Nothing to go by.</summary>
    Unknown,

    /// <summary>Undissolved water is more likely than not now.</summary>
    FreeWater,

    /// <summary>Undissolved water is more likely than not after standing at the coldest temperature.</summary>
    FreeWaterWhenCold,

    /// <summary>More likely than not above 80 % of saturation at the coldest temperature.</summary>
    NearSaturation,

    /// <summary>None of these.</summary>
    Dry,
}
