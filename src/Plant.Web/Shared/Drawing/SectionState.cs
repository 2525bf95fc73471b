using Plant.Advice;
using Plant.Physics.Fluids;
using Plant.Physics.Tanks;

namespace Plant.Web.Shared.Drawing;

/// <summary>What a section shows: the tank, its oil, its water. Null is "not known".</summary>
public sealed record SectionState
{
    public TankShape? Shape { get; init; }

    public double? LengthMm { get; init; }

    public double? WidthMm { get; init; }

    public double? HeightMm { get; init; }

    public double? OilVolumeL { get; init; }

    public double? SuctionHeightMm { get; init; }

    public Condition Condition { get; init; }

    public bool Floats { get; init; }

    public bool Emulsified { get; init; }

    public double? SettledL { get; init; }

    public double? SettledLowL { get; init; }

    public double? SettledHighL { get; init; }

    public double? CapacityL { get; init; }

    /// <summary>The geometry where all dimensions are known.</summary>
    public TankGeometry? Tank => Shape is { } shape ? TankGeometry.TryCreate(shape, LengthMm, WidthMm, HeightMm, []) : null;

    /// <summary>Depth of the oil [mm].</summary>
    public double? OilDepthMm => Tank is { } tank && OilVolumeL is > 0 and { } volume ? tank.DepthM(Math.Min(volume / 1000, tank.FullVolumeM3)) * 1000 : null;

    /// <summary>Thickness of a water layer [mm], from the floor or from the oil's surface.</summary>
    public double? LayerMm(double? litres)
    {
        if (Tank is not { } tank || litres is not { } volume)
        {
            return null;
        }

        var cubic = Math.Clamp(volume / 1000, 0, tank.FullVolumeM3);
        if (!Floats)
        {
            return tank.DepthM(cubic) * 1000;
        }

        return OilDepthMm is { } depth && OilVolumeL is { } oil
            ? depth - (tank.DepthM(Math.Max(0, Math.Min(oil / 1000, tank.FullVolumeM3) - cubic)) * 1000)
            : null;
    }

    /// <summary>The state of a reservoir.</summary>
    public static SectionState Of(ReservoirHistory facts, Assessment assessment) => new()
    {
        Shape = facts.Shape,
        LengthMm = facts.LengthMm,
        WidthMm = facts.WidthMm,
        HeightMm = facts.HeightMm,
        OilVolumeL = facts.OilVolumeL,
        SuctionHeightMm = facts.SuctionHeightMm,
        Condition = assessment.Condition,
        Floats = assessment.WaterGoes == WaterDirection.Up,
        Emulsified = assessment.EmulsifiedPpm > 0.05 * assessment.SaturationNowPpm,
        SettledL = assessment.SettledWaterL,
        SettledLowL = assessment.SettledWaterLLow90,
        SettledHighL = assessment.SettledWaterLHigh90,
        CapacityL = assessment.CapacityL,
    };
}
