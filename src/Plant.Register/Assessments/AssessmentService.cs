using Plant.Advice;
using Plant.Physics;

namespace Plant.Register.Assessments;

/// <summary>The one door to assessments: page, API and command ask here.</summary>
public sealed class AssessmentService(HistoryReader histories, PlanningRule rule)
{
    /// <summary>The planning rule in force.</summary>
    public PlanningRule Rule => rule;

    /// <summary>Every reservoir as of a time, in order of tag.</summary>
    public async Task<IReadOnlyList<Assessment>> FleetAsync(DateTime asOf, CancellationToken cancellation = default)
    {
        var fleet = await histories.ReadAsync(asOf, null, cancellation);
        var found = new Assessment[fleet.Count];
        Parallel.For(0, fleet.Count, new ParallelOptions { CancellationToken = cancellation }, i => found[i] = Assessor.Assess(fleet[i], asOf, rule));
        return found;
    }

    /// <summary>One reservoir as of a time, with its working where it is asked for; null where there is none of this tag.</summary>
    public async Task<Assessment?> OneAsync(string tag, DateTime asOf, Working? working = null, CancellationToken cancellation = default)
    {
        var history = await histories.ReadAsync(asOf, [tag], cancellation);
        return history.Count == 0 ? null : Assessor.Assess(history[0], asOf, rule, working);
    }

    /// <summary>Some reservoirs as of a time, each with its history.</summary>
    public async Task<IReadOnlyList<(ReservoirHistory History, Assessment Assessment)>> SomeAsync(
        DateTime asOf, IReadOnlyCollection<string>? tags, CancellationToken cancellation = default)
    {
        var fleet = await histories.ReadAsync(asOf, tags, cancellation);
        return [.. fleet.AsParallel().AsOrdered().Select(history => (history, Assessor.Assess(history, asOf, rule)))];
    }
}
