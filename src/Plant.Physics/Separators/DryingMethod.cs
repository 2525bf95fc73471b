namespace Plant.Physics.Separators;

/// <summary>Way to take water out of oil, or to keep it out.</summary>
public enum DryingMethod
{
    /// <summary>Fibre coalescer.</summary>
    Coalescer,

    /// <summary>Electrostatic coalescer.</summary>
    ElectrostaticCoalescer,

    /// <summary>Vacuum dehydrator.</summary>
    VacuumDehydrator,

    /// <summary>Centrifuge.</summary>
    Centrifuge,

    /// <summary>Absorbent element.</summary>
    Absorbent,

    /// <summary>Dry-air purge of the headspace.</summary>
    DryAirPurge,

    /// <summary>Desiccant breather: a purge by the air that the tank breathes in.</summary>
    DesiccantBreather,
}
