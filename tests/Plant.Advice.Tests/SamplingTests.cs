namespace Plant.Advice.Tests;

public class SamplingTests
{
    [Theory]
    [InlineData(0, false)]
    [InlineData(30, false)]
    [InlineData(60, true)]
    public void IsOverdue_MonthlySamples_AfterOneAndAHalfIntervals(double daysLater, bool expected) =>
        Assert.Equal(expected, Sampling.IsOverdue(Histories.Tank.Sampled(50, 50, 50, 50), Histories.Now.AddDays(daysLater)));

    [Fact]
    public void IsOverdue_NeverSampled_True() => Assert.True(Sampling.IsOverdue(Histories.Tank, Histories.Now));
}
