namespace Plant.Physics.Separators;

/// <summary>Forms in which water is in oil.</summary>
[Flags]
public enum WaterForms
{
    /// <summary>None.</summary>
    None = 0,

    /// <summary>Free: settles by itself.</summary>
    Free = 1,

    /// <summary>Emulsified: drops that do not settle in useful time.</summary>
    Emulsified = 2,

    /// <summary>Dissolved.</summary>
    Dissolved = 4,
}
