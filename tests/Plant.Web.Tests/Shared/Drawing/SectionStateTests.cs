using Plant.Physics.Tanks;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Tests.Shared.Drawing;

public sealed class SectionStateTests
{
    private static readonly SectionState Flat = new() { Shape = TankShape.Rectangular, LengthMm = 2000, WidthMm = 1000, HeightMm = 1000, OilVolumeL = 1600 };

    [Fact]
    public void LayerMm_Settled_IsMeasuredFromTheFloor()
    {
        Assert.Equal(800, Flat.OilDepthMm!.Value, 1e-6);
        Assert.Equal(10, Flat.LayerMm(20)!.Value, 1e-6);
    }

    [Fact]
    public void LayerMm_FloatingInALyingCylinder_IsMeasuredFromTheOilsSurface()
    {
        var lying = new SectionState { Shape = TankShape.HorizontalCylinder, LengthMm = 3000, HeightMm = 1000, OilVolumeL = 3000 * Math.PI / 8, Floats = true };
        Assert.Equal(500, lying.OilDepthMm!.Value, 1e-3);
        // at half full the surface is 1 m by 3 m: 3 L stand 1 mm
        Assert.Equal(1, lying.LayerMm(3)!.Value, 0.01);
    }

    [Fact]
    public void LayerMm_WithoutDimensions_IsNotKnown() => Assert.Null(new SectionState { OilVolumeL = 100 }.LayerMm(1));

    [Fact]
    public void Slab_OfTheWholeRectangle_IsTheWall()
    {
        var geometry = SectionGeometry.Fit(TankShape.Rectangular, 1000, 500, 0, 0, 100, 100);
        Assert.Equal(0.1, geometry.Scale, 1e-12);
        Assert.Equal("M0 100H100V50H0Z", geometry.Slab(0, 500));
        Assert.Equal("", geometry.Slab(300, 300));
    }
}
