using Plant.Advice.Dehydration;
using Plant.Advice.Ledger;

namespace Plant.Advice;

/// <summary>One day of a forecast.</summary>
/// <param name="Day">Days from now.</param>
/// <param name="WaterPpm">Median water in the oil [mg/kg].</param>
/// <param name="WaterLow90Ppm">Lower end of its 90 % interval [mg/kg].</param>
/// <param name="WaterHigh90Ppm">Upper end of its 90 % interval [mg/kg].</param>
/// <param name="WaterLow50Ppm">Lower end of its 50 % interval [mg/kg].</param>
/// <param name="WaterHigh50Ppm">Upper end of its 50 % interval [mg/kg].</param>
/// <param name="SettledL">Median settled water if nobody drains [L]; null where unknown.</param>
/// <param name="SettledLow90L">Lower end of its 90 % interval [L].</param>
/// <param name="SettledHigh90L">Upper end of its 90 % interval [L].</param>
public readonly record struct ForecastDay(
    int Day, double? WaterPpm, double? WaterLow90Ppm, double? WaterHigh90Ppm, double? WaterLow50Ppm, double? WaterHigh50Ppm,
    double? SettledL, double? SettledLow90L, double? SettledHigh90L);

/// <summary>The same balance run forward.</summary>
public static class Forecaster
{
    /// <summary>Forecast by the day, if nobody does anything.</summary>
    /// <param name="history">The records.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <param name="rule">The planning rule.</param>
    /// <param name="days">Number of days.</param>
    /// <returns>A row a day, today first.</returns>
    public static IReadOnlyList<ForecastDay> Forecast(ReservoirHistory history, DateTime asOf, PlanningRule rule, int days)
    {
        var evidence = Evidence.Gather(history, asOf, rule, null);
        var rows = new List<ForecastDay>(days + 1);
        for (var day = 0; day <= days; day++)
        {
            var cases = evidence.Water is { } water ? LimitForecast.At(water, day, evidence.CeilingPpm) : null;
            double? Ppm(double chance) => cases is null ? null : OilWater.Quantile(cases, chance);
            rows.Add(new ForecastDay(day, Ppm(0.5), Ppm(0.05), Ppm(0.95), Ppm(0.25), Ppm(0.75),
                evidence.Settled?.At(day, 0.5), evidence.Settled?.At(day, 0.05), evidence.Settled?.At(day, 0.95)));
        }

        return rows;
    }

    /// <summary>The samples as they are judged, for the trend.</summary>
    /// <param name="history">The records.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>Observations in order, contradicted ones marked.</returns>
    public static IReadOnlyList<Observation> Observed(ReservoirHistory history, DateTime asOf) => Observations.Of(history, OilState.Of(history).Fluid, asOf);
}
