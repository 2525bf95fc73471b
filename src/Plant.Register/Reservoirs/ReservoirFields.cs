using System.Globalization;
using Plant.Advice;
using Plant.Physics;
using Plant.Physics.Tanks;
using Plant.Register.Storage;

namespace Plant.Register.Reservoirs;

/// <summary>Columns of reservoirs.csv, and the origin of each group of values.</summary>
public sealed record ReservoirFields : IFields
{
    public string? Tag { get; set; }

    /// <summary>Where it has none, it is called by its key.</summary>
    public string? Name
    {
        get => string.IsNullOrEmpty(field) ? Tag : field;
        set;
    }

    public string? Area { get; set; }

    public string? Service { get; set; }

    public string? Fluid { get; set; }

    public string? Shape { get; set; }

    public double? LengthMm { get; set; }

    public double? WidthMm { get; set; }

    public double? HeightMm { get; set; }

    public double? OilVolumeL { get; set; }

    public double? SuctionHeightMm { get; set; }

    public double? CirculationLPerMin { get; set; }

    public double? OperatingTemperatureC { get; set; }

    public double? ColdestTemperatureC { get; set; }

    public double? HeadspaceRhPercent { get; set; }

    public string? Breather { get; set; }

    public double? WaterLimitPpm { get; set; }

    public double? WaterCapacityL { get; set; }

    public double? Criticality { get; set; }

    public DateTimeOffset? CommissionedAt { get; set; }

    public string? DimensionsOrigin { get; set; }

    public string? TemperaturesOrigin { get; set; }

    public string? LimitOrigin { get; set; }

    public string? CapacityOrigin { get; set; }

    public void Check(List<Refusal> refusals)
    {
        refusals.Required("tag", Tag);
        refusals.Text("name", Name, 200);
        refusals.Text("area", Area);
        refusals.Text("service", Service, 200);
        refusals.Required("fluid", Fluid);
        refusals.OneOf<TankShape>("shape", Shape);
        refusals.Positive("lengthMm", LengthMm, 1e6, "mm");
        refusals.Positive("widthMm", WidthMm, 1e6, "mm");
        refusals.Positive("heightMm", HeightMm, 1e6, "mm");
        refusals.Positive("oilVolumeL", OilVolumeL, 1e9, "L");
        refusals.Range("suctionHeightMm", SuctionHeightMm, 0, 1e6, "mm");
        refusals.Range("circulationLPerMin", CirculationLPerMin, 0, 1e7, "L/min");
        refusals.Temperature("operatingTemperatureC", OperatingTemperatureC);
        refusals.Temperature("coldestTemperatureC", ColdestTemperatureC);
        refusals.Range("headspaceRhPercent", HeadspaceRhPercent, 0, 100, "%");
        refusals.OneOf<Breather>("breather", Breather);
        refusals.Ppm("waterLimitPpm", WaterLimitPpm);
        refusals.Positive("waterCapacityL", WaterCapacityL, 1e9, "L");
        refusals.Range("criticality", Criticality, 1, 5, string.Empty);
        refusals.Time("commissionedAt", CommissionedAt);
        foreach (var (field, origin) in new[]
        {
            ("dimensionsOrigin", DimensionsOrigin), ("temperaturesOrigin", TemperaturesOrigin), ("limitOrigin", LimitOrigin), ("capacityOrigin", CapacityOrigin),
        })
        {
            refusals.OneOf<ValueOrigin>(field, origin);
        }

        CheckTogether(refusals);
    }

    private void CheckTogether(List<Refusal> refusals)
    {
        if (Criticality is { } criticality && criticality != Math.Floor(criticality))
        {
            refusals.Add(new Refusal("criticality", Number(criticality), "must be a whole number from 1 to 5"));
        }

        if (ColdestTemperatureC > OperatingTemperatureC)
        {
            refusals.Add(new Refusal("coldestTemperatureC", Number(ColdestTemperatureC.Value), $"must not be above operatingTemperatureC ({Number(OperatingTemperatureC.Value)})"));
        }

        if (SuctionHeightMm > HeightMm)
        {
            refusals.Add(new Refusal("suctionHeightMm", Number(SuctionHeightMm.Value), $"must not be above heightMm ({Number(HeightMm.Value)})"));
        }

        if (FullVolumeL is { } full && OilVolumeL > full * 1.05)
        {
            refusals.Add(new Refusal("oilVolumeL", Number(OilVolumeL.Value), string.Create(CultureInfo.InvariantCulture, $"is more than the tank of these dimensions holds ({full:0} L): check the shape and its dimensions")));
        }

        if (WaterCapacityL > OilVolumeL)
        {
            refusals.Add(new Refusal("waterCapacityL", Number(WaterCapacityL.Value), $"must not be above oilVolumeL ({Number(OilVolumeL.Value)})"));
        }
    }

    private double? FullVolumeL => Rule.Parse<TankShape>(Shape) switch
    {
        TankShape.Rectangular => LengthMm * WidthMm * HeightMm / 1e6,
        TankShape.HorizontalCylinder => LengthMm * Math.PI / 4 * HeightMm * HeightMm / 1e6,
        TankShape.VerticalCylinder => HeightMm * Math.PI / 4 * WidthMm * WidthMm / 1e6,
        _ => null,
    };

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
