using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class BearingLifeCalculatorTests
{
    // Cantley 1977; tested from 25 to 400 mg/kg
    [Theory]
    [InlineData(100, 1, false)]
    [InlineData(400, 0.43527528, false)]
    [InlineData(25, 2.29739671, false)]
    [InlineData(1000, 0.25118864, true)]
    [InlineData(10, 3.98107171, true)]
    public void Compute_Content_IsCantleyAndFlaggedOutsideTheTests(double waterPpm, double life, bool flagged)
    {
        var result = Requests.Done(BearingLifeCalculator.Compute(new BearingLifeRequest(waterPpm)));
        Checks.Within(life, result.RelativeLife, 6e-9);
        Assert.Equal(flagged, Assert.Single(result.Working).Flag is not null);
        Requests.ShowsItsWorking(result.Working);
    }

    [Theory]
    [InlineData(null)]
    [InlineData(0.0)]
    [InlineData(-3.0)]
    [InlineData(double.NaN)]
    [InlineData(2e6)]
    public void Compute_NotAContent_IsRefused(double? waterPpm) =>
        Assert.Equal("waterPpm", Requests.Refused(BearingLifeCalculator.Compute(new BearingLifeRequest(waterPpm))));
}
