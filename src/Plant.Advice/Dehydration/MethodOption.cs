namespace Plant.Advice.Dehydration;

/// <summary>A way to dry a reservoir, or why it is out.</summary>
/// <param name="Kind">The separator; null: settling alone.</param>
/// <param name="First">What is done before; empty: nothing.</param>
/// <param name="FloorPpm">Where it ends with the ingress [mg/kg]; null where it cannot be told.</param>
/// <param name="Hours">Time to the target [h]; null: never.</param>
/// <param name="EnergyKWh">Electricity and heat [kWh]; null where it is out.</param>
/// <param name="Consumables">What is used up, in words.</param>
/// <param name="WasteL">Oily water to dispose of [L].</param>
/// <param name="Cost">Cost by the plant's rates; null where it is out.</param>
/// <param name="Out">Why it is out; empty where it works.</param>
public sealed record MethodOption(SeparatorKind? Kind, string First, double? FloorPpm, double? Hours, double? EnergyKWh, string Consumables, double WasteL, double? Cost, string Out)
{
    /// <summary>True where it reaches the target.</summary>
    public bool Works => Out.Length == 0;
}
