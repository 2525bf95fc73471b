namespace Plant.Physics.Separators;

/// <summary>What each method takes.</summary>
public static class DryingMethods
{
    /// <summary>The forms of water that a method takes.</summary>
    /// <param name="method">The method.</param>
    /// <returns>The forms.</returns>
    /// <remarks>Source: common practice. A centrifuge breaks an emulsion only as far down as its cut size; a coalescer fails where surfactants hold the drops apart.</remarks>
    public static WaterForms Removes(DryingMethod method) => method switch
    {
        DryingMethod.Coalescer or DryingMethod.ElectrostaticCoalescer or DryingMethod.Centrifuge => WaterForms.Free | WaterForms.Emulsified,
        DryingMethod.VacuumDehydrator or DryingMethod.Absorbent => WaterForms.Free | WaterForms.Emulsified | WaterForms.Dissolved,
        _ => WaterForms.Dissolved,
    };

    /// <summary>True for methods whose flow is that of air, not of oil.</summary>
    /// <param name="method">The method.</param>
    /// <returns>True for the purge and the breather.</returns>
    public static bool FlowIsAir(DryingMethod method) => method is DryingMethod.DryAirPurge or DryingMethod.DesiccantBreather;
}
