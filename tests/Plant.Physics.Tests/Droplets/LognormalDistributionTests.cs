using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Droplets;

public sealed class LognormalDistributionTests
{
    // median by number 5 µm, deviation 1.8; recomputed apart from this code
    [Fact]
    public void Means_Example_AreTheTable()
    {
        var drops = LognormalDistribution.ByNumber(5e-6, 1.8);
        Checks.Near(5.942824e-6, drops.MeanM(1, 0), 1e-6);
        Checks.Near(11.85999e-6, drops.SauterM, 1e-6);
        Checks.Near(16.75445e-6, drops.MeanM(4, 3), 1e-6);
        Checks.Near(14.09637e-6, drops.MedianVolumeM, 1e-6);
    }

    [Property]
    public Property ByVolume_AndBack_IsTheSame() => Prop.ForAll(Inputs.Logarithmic(1e-7, 1e-2), Inputs.Between(1, 10), (median, deviation) =>
        Math.Abs((LognormalDistribution.ByVolume(median, deviation).MedianVolumeM / median) - 1) < 1e-12);

    // D32 = Σnd³/Σnd² over fine steps of the distribution by number
    [Fact]
    public void SauterM_AgainstSums_Agrees()
    {
        var drops = LognormalDistribution.ByVolume(40e-6, 1.7);
        double cubes = 0, squares = 0;
        for (var i = 0; i < 40_000; i++)
        {
            double low = 1e-8 * Math.Pow(1e6, i / 40_000.0), high = 1e-8 * Math.Pow(1e6, (i + 1) / 40_000.0), middle = Math.Sqrt(low * high);
            var share = drops.NumberBelow(high) - drops.NumberBelow(low);
            cubes += share * middle * middle * middle;
            squares += share * middle * middle;
        }

        Checks.Near(cubes / squares, drops.SauterM, 1e-5);
    }

    [Property]
    public Property VolumeBelow_Median_IsHalfAndRises() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-3), Inputs.Between(1.01, 5), (median, deviation) =>
    {
        var drops = LognormalDistribution.ByVolume(median, deviation);
        return Math.Abs(drops.VolumeBelow(median) - 0.5) < 1e-12 && drops.VolumeBelow(median * 1.01) > 0.5 && drops.NumberBelow(median) > drops.VolumeBelow(median);
    });

    [Fact]
    public void VolumeBelow_OneSize_IsAStep()
    {
        var drops = LognormalDistribution.ByVolume(1e-5, 1);
        Assert.Equal((0, 1), (drops.VolumeBelow(0.999e-5), drops.VolumeBelow(1.001e-5)));
        Assert.Equal(1e-5, drops.SauterM);
    }

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByNumber(0, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByNumber(1e-5, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByVolume(1e-5, 0.9));
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByVolume(double.NaN, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByVolume(1e-5, 2).MeanM(double.NaN, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByVolume(1e-5, 2).VolumeBelow(-1));
        Assert.Throws<ArgumentOutOfRangeException>(() => LognormalDistribution.ByVolume(1e-5, 2).NumberBelow(double.NaN));
    }
}
