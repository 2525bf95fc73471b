namespace Plant.Physics;

/// <summary>
/// Collects the steps of a calculation. Every calculation takes one that may be null: who does not ask for the working pays nothing for it.
/// </summary>
public sealed class Working
{
    private readonly List<WorkingStep> steps = [];

    /// <summary>The steps in the order in which they were done.</summary>
    public IReadOnlyList<WorkingStep> Steps => steps;

    /// <summary>Adds one step.</summary>
    /// <param name="name">What the step gives.</param>
    /// <param name="formula">The formula with its inputs and their units.</param>
    /// <param name="value">The value; null where the step is a statement.</param>
    /// <param name="unit">Unit of the value.</param>
    /// <param name="source">Where it comes from, with its standing.</param>
    /// <param name="flag">A warning, or null.</param>
    public void Add(string name, string formula, double? value, string unit, string source, string? flag = null) =>
        steps.Add(new WorkingStep(name, formula, value, unit, source, flag));
}
