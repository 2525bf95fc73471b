using Plant.Advice.Drains;

namespace Plant.Advice.Tests.Drains;

public class SettledWaterTests
{
    private static readonly SettledWater Filling = new(2, 0.3, 0.1, 0.3, 0, 20);

    [Fact]
    public void At_Median_AmountNowAndRateTimesTime() => Assert.Equal(2 + (0.1 * 30), Filling.At(30, 0.5), 9);

    [Fact]
    public void At_Quantile_OfOneLognormal()
    {
        // 1.6449 is the 95 % point of the normal distribution: (2 + 3)·e^(0.3·1.6449) = 8.19
        Assert.Equal(5 * Math.Exp(0.3 * 1.6448536), Filling.At(30, 0.95), 6);
    }

    [Fact]
    public void ChanceAbove_MedianNow_IsHalf() => Assert.Equal(0.5, Filling.ChanceAbove(2, 0), 0.001);

    [Fact]
    public void ChanceAbove_MoreTime_Grows()
    {
        var before = 0.0;
        for (var day = 0; day <= 365; day += 5)
        {
            var chance = Filling.ChanceAbove(10, day);
            Assert.InRange(chance, before - 1e-3, 1);
            before = chance;
        }

        Assert.True(before > 0.9);
    }

    [Fact]
    public void ChanceAbove_LeakMayStartUnseen_WithinItsChance()
    {
        // far from full at the usual rate, yet a leak may start: 0.25 a year over 120 days, and the larger ones fill 60 L
        var chance = Filling.ChanceAbove(60, 100);

        Assert.InRange(chance, 0.01, 1 - Math.Exp(-0.25 * 120 / 365));
    }

    [Fact]
    public void At_WarmUnsaturatedOil_MayHaveTakenItBack()
    {
        var thirsty = Filling with { RedissolvedL = 5 };

        Assert.Equal(0, thirsty.At(0, 0.05));
        Assert.Equal(Filling.At(0, 0.95), thirsty.At(0, 0.95));
    }
}
