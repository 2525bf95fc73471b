namespace Plant.Advice;

/// <summary>The plant's rule for drain intervals: at most <see cref="Risk"/> chance that settled water passes <see cref="CapacityShare"/> of its capacity.</summary>
/// <param name="CapacityShare">Share of the capacity [0 to 1].</param>
/// <param name="Risk">Accepted chance [0 to 1].</param>
public sealed record PlanningRule(double CapacityShare = 0.6, double Risk = 0.02);
