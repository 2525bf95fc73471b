namespace Plant.Register.Samples;

/// <summary>One sensor reading. Rows lie clustered by (series, time) and are read and written by the range, never tracked one by one.</summary>
public sealed class Reading
{
    /// <summary><see cref="Reservoirs.Reservoir.SeriesNumber"/>.</summary>
    public required int SeriesNumber { get; init; }

    /// <summary>Unix time [ms].</summary>
    public required long AtMs { get; init; }

    public double? OilTemperatureC { get; init; }

    public double? WaterActivity { get; init; }
}
