namespace Plant.Physics.Coalescence;

/// <summary>How the drops develop.</summary>
/// <param name="States">The drops at each time asked for; fewer where the work was bounded.</param>
/// <param name="MassErrorFraction">Largest difference of water in suspension and settled from what was there and entered, over that [1].</param>
/// <param name="Complete">False where the end was not reached within the bound on steps.</param>
/// <param name="Steps">Steps in time [1].</param>
/// <param name="Evaluations">Sums over all pairs [1].</param>
public sealed record PopulationBalanceResult(IReadOnlyList<PopulationBalanceState> States, double MassErrorFraction, bool Complete, int Steps, int Evaluations);
