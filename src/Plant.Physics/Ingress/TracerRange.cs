namespace Plant.Physics.Ingress;

/// <summary>Lognormal range of a tracer in one kind of water. A judgement, meant to be edited.</summary>
/// <param name="Median">Median in the tracer's unit.</param>
/// <param name="GeometricDeviation">Geometric standard deviation [1], above 1.</param>
public readonly record struct TracerRange(double Median, double GeometricDeviation);
