namespace Plant.Advice.Tests.Simulation;

/// <summary>How an invented plant is built: two of them differ in structure, so that an estimate fitted to one is judged on the other.</summary>
/// <param name="StandEveryDays">Mean days between cold stands [days].</param>
/// <param name="StandHours">Length of a cold stand [h].</param>
/// <param name="SwingK">Largest daily swing of the running temperature [K].</param>
/// <param name="LeakPerYear">Leaks that start in a year [1/year].</param>
/// <param name="IngressMedianPpmPerDay">Median of the usual ingress [mg/kg/day].</param>
/// <param name="GrossErrorShare">Share of bottles that are dirty [1].</param>
/// <param name="DrainDays">Days between drains, drawn from these; 0 is never.</param>
/// <param name="FastPools">True where undissolved water clears in two pools, false where in one.</param>
internal sealed record PlantKind(
    double StandEveryDays, double StandHours, double SwingK, double LeakPerYear, double IngressMedianPpmPerDay,
    double GrossErrorShare, int[] DrainDays, bool FastPools)
{
    /// <summary>A mill that stops seldom and drains monthly.</summary>
    public static PlantKind Mill { get; } = new(60, 48, 3, 0.3, 15, 0.04, [14, 30, 30, 91], true);

    /// <summary>A batch plant that stops every other week, drains at odd times, and clears in one slow pool.</summary>
    public static PlantKind Batch { get; } = new(17, 36, 6, 0.5, 8, 0.04, [0, 14, 28, 60], false);
}
