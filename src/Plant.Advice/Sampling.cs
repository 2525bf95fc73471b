using Plant.Advice.Ledger;

namespace Plant.Advice;

/// <summary>Whether sampling keeps its own rhythm.</summary>
public static class Sampling
{
    private const double LongestDays = 200;
    private const double ShortestDays = 45;

    /// <summary>True where the newest sample is older than one and a half of the reservoir's usual interval.</summary>
    /// <param name="history">The records.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>True where a sample is overdue; a reservoir never sampled is.</returns>
    public static bool IsOverdue(ReservoirHistory history, DateTime asOf)
    {
        ArgumentNullException.ThrowIfNull(history);
        var days = history.Samples.Where(s => s.TakenAt <= asOf).Select(s => s.TakenAt.Date).Distinct().Order().ToList();
        if (days.Count == 0)
        {
            return true;
        }

        var gaps = new List<double>(days.Count);
        for (var i = Math.Max(1, days.Count - 8); i < days.Count; i++)
        {
            gaps.Add((days[i] - days[i - 1]).TotalDays);
        }

        var usual = gaps.Count > 0 ? Robust.Median(gaps) : 60;
        return (asOf - days[^1]).TotalDays > Math.Clamp(1.5 * usual, ShortestDays, LongestDays);
    }
}
