namespace Plant.Physics.Calculators;

/// <summary>What a calculator answers: a response, or why there is none.</summary>
/// <typeparam name="T">The response.</typeparam>
/// <param name="Response">The response; null where something was refused.</param>
/// <param name="Refusals">Every field that was refused.</param>
public sealed record CalculatorResult<T>(T? Response, IReadOnlyList<Refusal> Refusals)
    where T : class;
