using Plant.Advice.Dehydration;
using Plant.Advice.Drains;
using Plant.Advice.Ledger;
using Plant.Physics;

namespace Plant.Advice;

/// <summary>What the records of one reservoir mean as of a time. The one door to it for page, API and command.</summary>
public static class Assessor
{
    /// <summary>Judges one reservoir.</summary>
    /// <param name="history">All that is recorded of it.</param>
    /// <param name="asOf">The time it is judged at (UTC); only what was known then counts.</param>
    /// <param name="rule">The plant's planning rule.</param>
    /// <param name="working">Receives how the numbers came about, or null.</param>
    /// <returns>The assessment; what cannot be known is null and the reason says why.</returns>
    public static Assessment Assess(ReservoirHistory history, DateTime asOf, PlanningRule rule, Working? working = null) =>
        Statement.Of(Evidence.Gather(history, asOf, rule, working), working);
}
