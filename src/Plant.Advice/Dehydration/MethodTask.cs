namespace Plant.Advice.Dehydration;

/// <summary>What is to be reached, from where.</summary>
/// <param name="StartPpm">Water in the oil now [mg/kg].</param>
/// <param name="TargetPpm">Content to reach [mg/kg].</param>
/// <param name="IngressGPerDay">Water that comes in meanwhile [g/day].</param>
/// <param name="SettledL">Settled water, to be drained first [L].</param>
public sealed record MethodTask(double StartPpm, double TargetPpm, double IngressGPerDay, double SettledL);
