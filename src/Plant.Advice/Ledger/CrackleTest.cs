namespace Plant.Advice.Ledger;

/// <summary>The crackle test as evidence of undissolved water: yes or no, blind below about 500 mg/kg of it, and fooled by gas or solvent (common practice).</summary>
public static class CrackleTest
{
    /// <summary>Chance of undissolved water before anything is known (judgement) [0 to 1].</summary>
    public const double Prior = 0.3;

    private const double CountsForDays = 45;
    private const double CracklesIfFree = 0.6;
    private const double CracklesIfNot = 0.05;

    /// <summary>The newest result that still counts.</summary>
    /// <param name="samples">Samples in order of time.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>True where it crackled; null where there is none.</returns>
    public static bool? Newest(IReadOnlyList<WaterSample> samples, DateTime asOf)
    {
        ArgumentNullException.ThrowIfNull(samples);
        for (var i = samples.Count - 1; i >= 0 && (asOf - samples[i].TakenAt).TotalDays <= CountsForDays; i--)
        {
            if (samples[i] is { Method: WaterMethod.Crackle, Crackles: { } crackles, Point: not SamplePoint.Drain })
            {
                return crackles;
            }
        }

        return null;
    }

    /// <summary>Chance of undissolved water after the newest result (Bayes).</summary>
    /// <param name="chance">Chance before [0 to 1].</param>
    /// <param name="samples">Samples in order of time.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>Chance after [0 to 1].</returns>
    public static double Update(double chance, IReadOnlyList<WaterSample> samples, DateTime asOf)
    {
        if (Newest(samples, asOf) is not { } crackles)
        {
            return chance;
        }

        var free = chance * (crackles ? CracklesIfFree : 1 - CracklesIfFree);
        var not = (1 - chance) * (crackles ? CracklesIfNot : 1 - CracklesIfNot);
        return free / (free + not);
    }
}
