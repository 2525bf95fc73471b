using FsCheck.Xunit;
using Plant.Physics.Tanks;

namespace Plant.Physics.Tests.Tanks;

public class SuctionLimitsTests
{
    // C·(Q²/g')^(1/5) with C 0.69 (Lubin and Springer 1967, from memory), recomputed by hand
    [Theory]
    [InlineData(1e-3, 142.2, 0.0394320)]
    [InlineData(1e-3, 5, 0.0770255)]
    [InlineData(1e-4, 142.2, 0.0156982)]
    public void WithdrawalHeightM_GivesTheCheckValue(double flow, double difference, double height) => Assert.Equal(height, SuctionLimits.WithdrawalHeightM(flow, difference, 850), 1e-6);

    // a floor of 2 m by 1 m that falls 50 mm (geometry)
    [Theory]
    [InlineData(0.02, 0.008)]
    [InlineData(0.1, 0.15)]
    [InlineData(0.05, 0.05)]
    public void SlopedFloorM3_GivesTheWedgeAndThePrism(double height, double volume) => Assert.Equal(volume, SuctionLimits.SlopedFloorM3(1, 2, 0.05, height), 1e-12);

    [Fact]
    public void SlopedFloorHeightM_OfFiveLitres_IsATallWedge() => Assert.Equal(0.01581139, SuctionLimits.SlopedFloorHeightM(1, 2, 0.05, 0.005), 1e-8);

    [Property(MaxTest = 1000)]
    public void SlopedFloor_HeightAndVolume_AreEachOthersInverse(byte fall, byte height)
    {
        var (dz, h) = (fall / 1000.0, height / 500.0);
        var volume = SuctionLimits.SlopedFloorM3(1.2, 3, dz, h);
        Assert.Equal(h, SuctionLimits.SlopedFloorHeightM(1.2, 3, dz, volume), 1e-9);
    }

    [Fact]
    public void Richardson_FallsWithTheSquareOfTheVelocity()
    {
        var gravity = SuctionLimits.ReducedGravityMS2(-142.2, 850);
        Assert.Equal(9.80665 * 142.2 / 850, gravity, 1e-12);
        Assert.Equal(4, SuctionLimits.Richardson(gravity, 0.3, 0.05) / SuctionLimits.Richardson(gravity, 0.3, 0.1), 1e-9);
    }

    [Theory]
    [InlineData(double.NaN, 100, 850)]
    [InlineData(-1, 100, 850)]
    [InlineData(1e-3, 0, 850)]
    [InlineData(1e-3, 100, 0)]
    public void WithdrawalHeightM_BadArgument_IsRefused(double flow, double difference, double oil) => Assert.Throws<ArgumentOutOfRangeException>(() => SuctionLimits.WithdrawalHeightM(flow, difference, oil));
}
