namespace Plant.Physics.Ingress;

/// <summary>How likely a kind of water is the one found.</summary>
/// <param name="Source">Name of the source.</param>
/// <param name="Probability">Probability [0 to 1].</param>
public readonly record struct SourceProbability(string Source, double Probability);
