using Plant.Physics;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Columns of drains.csv.</summary>
public sealed record DrainFields : IFields
{
    public string? Tag { get; set; }

    public DateTimeOffset? DrainedAt { get; set; }

    public double? WaterL { get; set; }

    public double? OilL { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("tag", Tag);
        refusals.Required("drainedAt", DrainedAt);
        refusals.Time("drainedAt", DrainedAt);
        refusals.Required("waterL", WaterL);
        refusals.Range("waterL", WaterL, 0, 1e9, "L");
        refusals.Range("oilL", OilL, 0, 1e9, "L");
    }
}
