using Plant.Physics.Coalescence;

namespace Plant.Physics.Tests.Coalescence;

public sealed class VolumeGridTests
{
    [Property]
    public Property Cells_AnyNumber_FillTheRangeGeometrically() => Prop.ForAll(Inputs.Between(20, 400), count =>
    {
        var grid = new VolumeGrid((int)count);
        var inside = true;
        for (var i = 1; i < grid.Cells; i++)
        {
            inside &= Math.Abs((grid.VolumesM3[i] / grid.VolumesM3[i - 1]) - grid.VolumeRatio) < 1e-11 && grid.UpperEdgeM(i - 1) > grid.DiametersM[i - 1] && grid.UpperEdgeM(i - 1) < grid.DiametersM[i];
        }

        return inside && Math.Abs((grid.UpperEdgeM(grid.Cells - 1) / 2e-3) - 1) < 1e-12 && Math.Abs((grid.UpperEdgeM(-1) / 0.5e-6) - 1) < 1e-12;
    });

    [Fact]
    public void Constructor_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new VolumeGrid(19));
        Assert.Throws<ArgumentOutOfRangeException>(() => new VolumeGrid(401));
        Assert.Throws<ArgumentOutOfRangeException>(() => new VolumeGrid(40, 1e-3, 1e-3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new VolumeGrid(40, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new VolumeGrid(40, 1e-6, double.NaN));
    }
}
