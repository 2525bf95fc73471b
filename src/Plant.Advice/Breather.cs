namespace Plant.Advice;

/// <summary>How a reservoir breathes.</summary>
public enum Breather
{
    /// <summary>Open vent or a plain filter: ambient air comes in.</summary>
    Open,

    /// <summary>Desiccant breather.</summary>
    Desiccant,

    /// <summary>Sealed headspace.</summary>
    Sealed,

    /// <summary>Headspace purged with dry air or gas.</summary>
    DryPurge,
}
