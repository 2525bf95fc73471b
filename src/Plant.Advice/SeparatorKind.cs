namespace Plant.Advice;

/// <summary>Kind of equipment that takes water out of oil.</summary>
public enum SeparatorKind
{
    /// <summary>Mechanical coalescer.</summary>
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
}
