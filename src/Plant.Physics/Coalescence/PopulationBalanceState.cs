namespace Plant.Physics.Coalescence;

/// <summary>The drops at one time.</summary>
/// <param name="TimeS">Time [s].</param>
/// <param name="SuspendedVolumeFraction">Water in suspension, mean of the depths [1].</param>
/// <param name="SettledVolumeFraction">Water that has settled, per volume of oil [1].</param>
/// <param name="NumberPerM3">Drops per volume, mean of the depths [1/m³].</param>
/// <param name="MedianM">Median diameter by volume [m]; null where nothing is suspended.</param>
/// <param name="WaterByCell">Water in each cell, mean of the depths [volume fraction].</param>
public sealed record PopulationBalanceState(
    double TimeS, double SuspendedVolumeFraction, double SettledVolumeFraction, double NumberPerM3, double? MedianM, IReadOnlyList<double> WaterByCell);
