using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Columns of topups.csv.</summary>
public sealed record TopUpFields : IFields
{
    public string? Tag { get; set; }

    public DateTimeOffset? AddedAt { get; set; }

    public double? OilL { get; set; }

    public double? WaterPpm { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("tag", Tag);
        refusals.Required("addedAt", AddedAt);
        refusals.Time("addedAt", AddedAt);
        refusals.Required("oilL", OilL);
        refusals.Range("oilL", OilL, 0, 1e9, "L");
        refusals.Ppm("waterPpm", WaterPpm);
    }
}
