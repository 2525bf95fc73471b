using Plant.Advice;
using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Laboratory;

/// <summary>A bottle as it is logged.</summary>
public sealed record BottleFields : IFields
{
    public string? Code { get; set; }

    public string? Tag { get; set; }

    public string? Point { get; set; }

    public DateTimeOffset? TakenAt { get; set; }

    public double? OilTemperatureC { get; set; }

    /// <summary>Read only.</summary>
    public string? TakenBy { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("code", Code, 100);
        refusals.Required("tag", Tag);
        refusals.Required("point", Point);
        refusals.OneOf<SamplePoint>("point", string.IsNullOrWhiteSpace(Point) ? null : Point);
        refusals.Required("takenAt", TakenAt);
        refusals.Time("takenAt", TakenAt);
        refusals.Temperature("oilTemperatureC", OilTemperatureC);
    }
}
