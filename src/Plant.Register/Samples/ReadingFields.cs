using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Samples;

/// <summary>Columns of readings.csv.</summary>
public sealed record ReadingFields : IFields
{
    public string? Tag { get; set; }

    public DateTimeOffset? ReadAt { get; set; }

    public double? OilTemperatureC { get; set; }

    public double? WaterActivity { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("tag", Tag);
        refusals.Required("readAt", ReadAt);
        refusals.Time("readAt", ReadAt);
        refusals.Temperature("oilTemperatureC", OilTemperatureC);
        refusals.Range("waterActivity", WaterActivity, 0, 1, string.Empty);
        if (OilTemperatureC is null && WaterActivity is null)
        {
            refusals.Add(new Refusal("waterActivity", string.Empty, "a reading needs oilTemperatureC or waterActivity"));
        }
    }
}
