using Plant.Physics.Tanks;

namespace Plant.Physics.Tests.Tanks;

public sealed class TankGeometryTests
{
    // segment of a circle, recomputed apart from this code
    [Theory]
    [InlineData(0.05, 0.01869304)]
    [InlineData(0.1, 0.05204402)]
    [InlineData(0.25, 0.19550111)]
    [InlineData(0.5, 0.5)]
    [InlineData(0.75, 0.80449889)]
    [InlineData(0.9, 0.94795598)]
    public void VolumeM3_LyingCylinder_IsTheSegment(double depth, double share)
    {
        var tank = Tank(TankShape.HorizontalCylinder, 3000, null, 1000);
        Checks.Within(share, tank.VolumeM3(depth) / tank.FullVolumeM3, 6e-9);
    }

    // a public library's test: diameter 1.5 m, length 5 m, half full; then 1 m³ in diameter 1.2 m, length 3 m, recomputed apart from this code
    [Fact]
    public void VolumeAndDepth_PublishedCylinders_Agree()
    {
        Checks.Within(4.417864669, Tank(TankShape.HorizontalCylinder, 5000, null, 1500).VolumeM3(0.75), 1e-9);
        Checks.Within(0.40293626, Tank(TankShape.HorizontalCylinder, 3000, null, 1200).DepthM(1), 6e-9);
    }

    [Theory]
    [InlineData(TankShape.Rectangular, 2000.0, 1000.0, 800.0, 1.6)]
    [InlineData(TankShape.HorizontalCylinder, 2000.0, null, 1000.0, Math.PI / 2)]
    [InlineData(TankShape.VerticalCylinder, null, 1000.0, 2000.0, Math.PI / 2)]
    public void FullVolumeM3_Shapes_IsTheBody(TankShape shape, double? length, double? width, double? height, double volume) =>
        Checks.Near(volume, Tank(shape, length, width, height).FullVolumeM3, 1e-12);

    [Theory]
    [InlineData(TankShape.Rectangular, 0.3, 2)]
    [InlineData(TankShape.HorizontalCylinder, 0.5, 2)]
    [InlineData(TankShape.HorizontalCylinder, 0.1, 1.2)]
    [InlineData(TankShape.VerticalCylinder, 0.3, Math.PI / 4)]
    public void SurfaceAreaM2_AtALevel_IsThePlanArea(TankShape shape, double depth, double area) => Checks.Near(area, Tank(shape, 2000, 1000, 1000).SurfaceAreaM2(depth), 1e-12);

    [Property(MaxTest = 1000)]
    public Property DepthM_OfTheVolume_IsTheDepth() => Prop.ForAll(Shape(), Inputs.Between(0, 1), Inputs.Logarithmic(100, 20_000), (shape, share, size) =>
    {
        var tank = Tank(shape, size * 2, size, size * 1.5);
        return Math.Abs(tank.DepthM(tank.VolumeM3(share * tank.HeightM)) - (share * tank.HeightM)) <= 1e-9 * tank.HeightM;
    });

    [Property(MaxTest = 1000)]
    public Property VolumeM3_OfTheDepth_IsTheVolume() => Prop.ForAll(Shape(), Inputs.Between(0, 1), (shape, share) =>
    {
        var tank = Tank(shape, 3000, 1200, 900);
        return Math.Abs(tank.VolumeM3(tank.DepthM(share * tank.FullVolumeM3)) - (share * tank.FullVolumeM3)) <= 1e-9 * tank.FullVolumeM3;
    });

    [Property]
    public Property VolumeM3_Slope_IsThePlanArea() => Prop.ForAll(Shape(), Inputs.Between(0.05, 0.94), (shape, share) =>
    {
        var tank = Tank(shape, 3000, 1200, 900);
        var depth = share * tank.HeightM;
        const double step = 1e-5;
        return Math.Abs(((tank.VolumeM3(depth + step) - tank.VolumeM3(depth - step)) / (2 * step)) - tank.SurfaceAreaM2(depth)) < 1e-5;
    });

    [Theory]
    [InlineData(TankShape.Rectangular, null, null, null, "lengthMm,widthMm,heightMm")]
    [InlineData(TankShape.HorizontalCylinder, null, null, null, "lengthMm,heightMm")]
    [InlineData(TankShape.VerticalCylinder, null, null, null, "widthMm,heightMm")]
    [InlineData(TankShape.Rectangular, 1000.0, double.NaN, -5.0, "widthMm,heightMm")]
    [InlineData(TankShape.Rectangular, 0.0, 1000.0, 2e6, "lengthMm,heightMm")]
    public void TryCreate_MissingOrImpossible_IsRefusedByName(TankShape shape, double? length, double? width, double? height, string fields)
    {
        var refusals = new List<Refusal>();
        Assert.Null(TankGeometry.TryCreate(shape, length, width, height, refusals));
        Assert.Equal(fields, string.Join(',', refusals.Select(refusal => refusal.Field)));
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1.1)]
    [InlineData(double.NaN)]
    public void EveryMethod_OutsideTheTank_Throws(double value)
    {
        var tank = Tank(TankShape.HorizontalCylinder, 1000, null, 1000);
        Assert.Throws<ArgumentOutOfRangeException>(() => tank.VolumeM3(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => tank.SurfaceAreaM2(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => tank.DepthM(value));
    }

    private static Arbitrary<TankShape> Shape() => Inputs.OneOf(Enum.GetValues<TankShape>());

    private static TankGeometry Tank(TankShape shape, double? lengthMm, double? widthMm, double? heightMm)
    {
        var refusals = new List<Refusal>();
        var tank = TankGeometry.TryCreate(shape, lengthMm, widthMm, heightMm, refusals);
        Assert.Empty(refusals);
        Assert.NotNull(tank);
        return tank;
    }
}
