namespace Plant.Physics.Laboratory;

/// <summary>Arithmetic of Karl Fischer titration.</summary>
public static class KarlFischer
{
    /// <summary>Mass of water that a charge titrates [µg/C]: M/(2F).</summary>
    public const double MicrogramPerCoulomb = 93.35761;

    /// <summary>Smallest standard uncertainty of a single result [mg/kg]: a drop of room air.</summary>
    public const double SmallestPpm = 1.5;

    // 95 % range of n results over their standard deviation: studentised range with infinite degrees of freedom
    private static readonly double[] RangeFactors = [2.7718, 3.3145, 3.6332, 3.8577, 4.0301, 4.1696, 4.2863, 4.3865, 4.4741];

    /// <summary>Mass of water from a charge.</summary>
    /// <param name="chargeC">Charge [C].</param>
    /// <returns>Mass of water [µg].</returns>
    /// <remarks>Equation: Q·M/(2F). Source: Faraday's law, CODATA. Valid for: one iodine a water molecule.</remarks>
    public static double WaterUg(double chargeC) => Guard.NotNegative(chargeC) * MicrogramPerCoulomb;

    /// <summary>Water content of one titration.</summary>
    /// <param name="waterUg">Mass of water found [µg].</param>
    /// <param name="driftUgPerMin">Drift [µg/min].</param>
    /// <param name="minutes">Duration [min].</param>
    /// <param name="blankUg">Blank [µg].</param>
    /// <param name="sampleG">Mass of the sample [g].</param>
    /// <returns>Water content [mg/kg]; negative where drift and blank exceed what was found.</returns>
    /// <remarks>Equation: (m − drift·t − blank)/sample. Source: common practice. Valid for: any.</remarks>
    public static double ContentPpm(double waterUg, double driftUgPerMin, double minutes, double blankUg, double sampleG) =>
        (Guard.NotNegative(waterUg) - (Guard.NotNegative(driftUgPerMin) * Guard.NotNegative(minutes)) - Guard.NotNegative(blankUg)) / Guard.Positive(sampleG);

    /// <summary>Critical range of several results.</summary>
    /// <param name="repeatabilityPpm">Repeatability r of the method [mg/kg].</param>
    /// <param name="count">Number of results [1]; from 2 to 10.</param>
    /// <returns>Range that results of one sample exceed once in twenty times [mg/kg].</returns>
    /// <remarks>Equation: f(n)·r/f(2). Source: ISO 5725-6 (studentised range, recomputed). Valid for: 2 to 10 results.</remarks>
    public static double CriticalRangePpm(double repeatabilityPpm, int count) =>
        Guard.NotNegative(repeatabilityPpm) * RangeFactors[Math.Clamp(count, 2, 10) - 2] / RangeFactors[0];

    /// <summary>Standard uncertainty of the mean of replicates.</summary>
    /// <param name="method">Code of the method; an unknown one is taken as volumetric.</param>
    /// <param name="waterPpm">Water content [mg/kg].</param>
    /// <param name="count">Number of replicates [1].</param>
    /// <returns>Standard uncertainty [mg/kg].</returns>
    /// <remarks>Equation: max(r/2.7718, 1.5)/√n. Source: ISO 5725-6; the method's row. Valid for: within one laboratory.</remarks>
    public static double StandardUncertaintyPpm(string method, double waterPpm, int count)
    {
        var row = Repeatability.Of(method) ?? Repeatability.Of("kf-volumetric")!;
        return Math.Max(SmallestPpm, row.AtPpm(Math.Max(0, waterPpm)) / RangeFactors[0]) / Math.Sqrt(Math.Max(1, count));
    }
}
