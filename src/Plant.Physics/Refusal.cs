namespace Plant.Physics;

/// <summary>Why an input cannot be used: the field, the value as given, and what would be accepted.</summary>
/// <param name="Field">Name of the field as the caller knows it (camelCase, with its unit).</param>
/// <param name="Value">The value as given.</param>
/// <param name="Reason">What is wrong with it and what to do, with the allowed range where there is one.</param>
public sealed record Refusal(string Field, string Value, string Reason);
