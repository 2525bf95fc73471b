using Plant.Physics.Droplets;
using Plant.Physics.Tanks;

namespace Plant.Physics.Tests.Tanks;

public sealed class GravitySeparationTests
{
    // equal stirred tanks in series, recomputed apart from this code; null is the ideal tank
    [Theory]
    [InlineData(0.5, 1.0, 0.33333)]
    [InlineData(0.5, 2.0, 0.36000)]
    [InlineData(0.5, 4.0, 0.37570)]
    [InlineData(0.5, 8.0, 0.38430)]
    [InlineData(0.5, null, 0.5)]
    [InlineData(1.0, 1.0, 0.5)]
    [InlineData(1.0, 2.0, 0.55556)]
    [InlineData(1.0, 4.0, 0.59040)]
    [InlineData(1.0, 8.0, 0.61026)]
    [InlineData(1.0, null, 1.0)]
    [InlineData(2.0, 1.0, 0.66667)]
    [InlineData(2.0, 2.0, 0.75)]
    [InlineData(2.0, 4.0, 0.80247)]
    [InlineData(2.0, 8.0, 0.83223)]
    [InlineData(2.0, null, 1.0)]
    public void Removal_Ratios_AreTheTable(double ratio, double? tanks, double expected)
    {
        Checks.Within(expected, GravitySeparation.Removal(ratio * 1e-3, 1e-3, tanks), 6e-6);
        Checks.Within(expected, GravitySeparation.Removal(-ratio * 1e-3, 1e-3, tanks), 6e-6);
    }

    [Theory]
    [InlineData(0.5)]
    [InlineData(1)]
    [InlineData(2)]
    public void Removal_ManyTanks_IsThePlugFlowLimit(double ratio) => Checks.Within(1 - Math.Exp(-ratio), GravitySeparation.Removal(ratio, 1, 1e7), 1e-6);

    // published basin: 25 × 5 m, 0.6 m³/s, 0.002 m/s removes 41.667 %
    [Fact]
    public void Removal_PublishedBasin_IsTheShare() => Checks.Within(0.41667, GravitySeparation.Removal(0.002, GravitySeparation.OverflowRateMS(0.6, 125)), 5e-6);

    // 5 m³/h on 2 m² is 6.944444e-4 m/s
    [Fact]
    public void OverflowRateMS_Example_IsFlowOverArea() => Checks.Near(6.944444e-4, GravitySeparation.OverflowRateMS(5.0 / 3600, 2), 1e-6);

    // 6 m³ at 600 L/min stay 10 minutes
    [Fact]
    public void ResidenceTimeS_Example_IsVolumeOverFlow() => Checks.Near(600, GravitySeparation.ResidenceTimeS(6, 0.01), 1e-12);

    [Fact]
    public void LognormalRemoval_OneSize_IsThatOfTheSize()
    {
        var velocity = new DropletSettling(Checks.MineralOil(), 313.15).VelocityMS(3e-4);
        Assert.Equal(GravitySeparation.Removal(velocity, 4e-4), GravitySeparation.LognormalRemoval(Checks.MineralOil(), 313.15, 4e-4, null, 3e-4, 1));
    }

    // fine trapezoid rule over the same distribution: another way to the same integral
    [Theory]
    [InlineData(null, 200e-6, 1.8)]
    [InlineData(null, 50e-6, 2.5)]
    [InlineData(3.0, 200e-6, 1.8)]
    [InlineData(1.0, 600e-6, 1.3)]
    public void LognormalRemoval_AgainstTheTrapezoidRule_Agrees(double? tanks, double median, double deviation)
    {
        var settling = new DropletSettling(Checks.MineralOil(), 313.15);
        const double rate = 3e-4;
        const int steps = 200_000;
        var sum = 0.0;
        for (var i = 0; i <= steps; i++)
        {
            var z = -8 + (16.0 * i / steps);
            sum += GravitySeparation.Removal(settling.VelocityMS(median * Math.Pow(deviation, z)), rate, tanks) * Math.Exp(-z * z / 2) / Math.Sqrt(2 * Math.PI) * 16 / steps;
        }

        Checks.Within(sum, GravitySeparation.LognormalRemoval(Checks.MineralOil(), 313.15, rate, tanks, median, deviation), 1e-7);
    }

    [Property(MaxTest = 50)]
    public Property LognormalRemoval_MoreTanksAndLargerDrops_RemoveMore() => Prop.ForAll(Inputs.Logarithmic(2e-5, 1e-3), Inputs.Between(1.1, 3), (median, deviation) =>
    {
        double Share(double? tanks, double size) => GravitySeparation.LognormalRemoval(Checks.MineralOil(), 313.15, 3e-4, tanks, size, deviation);
        var one = Share(1, median);
        var four = Share(4, median);
        return one is > 0 and < 1 && four >= one && Share(null, median) >= four && Share(1, median * 1.1) > one;
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.ResidenceTimeS(1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.ResidenceTimeS(double.NaN, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.OverflowRateMS(1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.Removal(double.NaN, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.Removal(1, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.LognormalRemoval(Checks.MineralOil(), 313.15, 1, null, double.NaN, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => GravitySeparation.LognormalRemoval(Checks.MineralOil(), 313.15, 1, null, 1e-4, 0.5));
    }
}
