namespace Plant.Physics;

/// <summary>One step of a calculation as a reader can follow it.</summary>
/// <param name="Name">What the step gives.</param>
/// <param name="Formula">The formula with its inputs and their units.</param>
/// <param name="Value">The value; null where the step is a statement.</param>
/// <param name="Unit">Unit of <paramref name="Value"/>; "1" where it has none.</param>
/// <param name="Source">Where formula or value come from, with the standing (read, from memory, unverified, common practice).</param>
/// <param name="Flag">A warning, such as a value outside the range of validity; null where there is none.</param>
public sealed record WorkingStep(string Name, string Formula, double? Value, string Unit, string Source, string? Flag = null);
