using Plant.Advice.Dehydration;
using Plant.Advice.Ledger;

namespace Plant.Advice.Tests.Dehydration;

public class LimitForecastTests
{
    [Theory]
    [InlineData(100, 0.5)]
    [InlineData(83.4, 0.9)]
    public void ChanceAbove_OneCase_NormalOfTheLogarithm(double limitPpm, double expected)
    {
        // median 100, log sd 0.1416: ln(100/83.4)/0.1416 = 1.282, whose normal chance is 0.90 (tables of the normal distribution)
        var water = new OilWater([new WaterCase(1, 100, 0.1416)], 0, 0, 0, false);

        Assert.Equal(expected, LimitForecast.ChanceAbove(water, limitPpm, 0, null), 0.001);
    }

    [Fact]
    public void PassedBy_Rising_BeforeTheMedianPassesTheLimit()
    {
        var water = new OilWater([new WaterCase(1, 100, 0.1)], 1, 0.1, 2, false);

        var by = LimitForecast.PassedBy(water, 150, null, Histories.Now);

        // the median takes 50 to 75 days (the trend fades); the chance of 5 % comes before
        Assert.InRange(by!.Value, Histories.Now.AddDays(1), Histories.Now.AddDays(60));
    }

    [Fact]
    public void At_RiseToSaturation_StopsThere()
    {
        var water = new OilWater([new WaterCase(1, 100, 0.1)], 5, 0.1, 0, false);

        Assert.Equal(180, LimitForecast.At(water, 300, 180)[0].WaterPpm);
    }
}
