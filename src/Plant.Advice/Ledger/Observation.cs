namespace Plant.Advice.Ledger;

/// <summary>What a sample or a sensor says of the water in the circulating oil.</summary>
/// <param name="At">When (UTC).</param>
/// <param name="WaterPpm">Water content [mg/kg].</param>
/// <param name="StandardUncertaintyPpm">Standard uncertainty, sampling included [mg/kg].</param>
/// <param name="Replicates">Number of replicates; 0 for a sensor.</param>
/// <param name="Outlying">True where its neighbours contradict it: a dirty bottle, or water carried over from the bottom.</param>
public sealed record Observation(DateTime At, double WaterPpm, double StandardUncertaintyPpm, int Replicates, bool Outlying);
