using Plant.Advice.Ledger;

namespace Plant.Advice.Tests.Ledger;

public class RobustTests
{
    [Fact]
    public void TheilSen_TrendWithAnOutlier_ReferenceValue()
    {
        // t = 0, 7 … 49 with one outlier: slope 0.56122449, where least squares give 0.85034014 (computed with an independent statistics package)
        double[] days = [0, 7, 14, 21, 28, 35, 42, 49];
        double[] ppm = [82, 85, 91, 88, 97, 160, 104, 109];

        Assert.Equal(0.56122449, Robust.TheilSen(days, ppm)!.Value, 8);
    }

    [Fact]
    public void TheilSen_OnePlace_None() => Assert.Null(Robust.TheilSen([3, 3], [1, 2]));

    [Theory]
    [InlineData(new double[] { 5 }, 5)]
    [InlineData(new double[] { 9, 1, 5 }, 5)]
    [InlineData(new double[] { 4, 1, 2, 3 }, 2.5)]
    public void Median_Values_Middle(double[] values, double expected) => Assert.Equal(expected, Robust.Median(values));
}
