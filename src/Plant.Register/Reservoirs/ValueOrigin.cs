namespace Plant.Register.Reservoirs;

/// <summary>Where a curve, a limit or a dimension comes from.</summary>
public enum ValueOrigin
{
    /// <summary>Nobody has checked it.</summary>
    Unverified,

    /// <summary>The published default of the fluid's family.</summary>
    FamilyDefault,

    /// <summary>From a data sheet or a drawing.</summary>
    DataSheet,

    /// <summary>Measured on this plant.</summary>
    Measured,
}
