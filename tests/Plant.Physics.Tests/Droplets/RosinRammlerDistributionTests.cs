using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Droplets;

public sealed class RosinRammlerDistributionTests
{
    // X = 100 µm; recomputed apart from this code
    [Theory]
    [InlineData(2.6, 86.85184, 68.73192, 88.82104, 152.5002)]
    [InlineData(1.5, 78.32198, 37.32822, 90.27453, 207.8111)]
    [InlineData(3.5, 90.05785, 78.37036, 89.97472, 136.8181)]
    public void Sizes_Spreads_AreTheTable(double spread, double medianUm, double sauterUm, double meanUm, double d95Um)
    {
        var drops = new RosinRammlerDistribution(100e-6, spread);
        Checks.Near(medianUm, drops.MedianVolumeM * 1e6, 1e-6);
        Checks.Near(sauterUm, Assert.NotNull(drops.SauterM([])) * 1e6, 1e-6);
        Checks.Near(meanUm, drops.VolumeMeanM * 1e6, 1e-6);
        Checks.Near(d95Um, drops.QuantileM(0.95) * 1e6, 1e-6);
    }

    [Theory]
    [InlineData(1.0)]
    [InlineData(0.8)]
    public void SauterM_WhereItDiverges_IsRefused(double spread)
    {
        var refusals = new List<Refusal>();
        Assert.Null(new RosinRammlerDistribution(100e-6, spread).SauterM(refusals));
        var refusal = Assert.Single(refusals);
        Assert.Equal("spread", refusal.Field);
        Assert.Contains("above 1", refusal.Reason, StringComparison.Ordinal);
    }

    [Property]
    public Property QuantileM_OfVolumeBelow_IsTheSize() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-3), Inputs.Between(1.1, 4), Inputs.Between(1e-6, 0.999), (size, spread, share) =>
    {
        var drops = new RosinRammlerDistribution(size, spread);
        return Math.Abs(drops.VolumeBelow(drops.QuantileM(share)) - share) < 1e-9;
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new RosinRammlerDistribution(0, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RosinRammlerDistribution(1e-4, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RosinRammlerDistribution(1e-4, 2).QuantileM(1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RosinRammlerDistribution(1e-4, 2).VolumeBelow(double.NaN));
        Assert.Throws<ArgumentNullException>(() => new RosinRammlerDistribution(1e-4, 2).SauterM(null!));
    }
}
