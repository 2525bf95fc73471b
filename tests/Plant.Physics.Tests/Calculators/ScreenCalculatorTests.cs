using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class ScreenCalculatorTests
{
    // Young–Laplace, 20 µm pore, recomputed apart from this code
    [Theory]
    [InlineData(45, 150, 7.7942, false, false)]
    [InlineData(30, 120, 3.0, false, false)]
    [InlineData(30, 60, 3.0, true, false)]
    [InlineData(30, 90, 0, false, true)]
    [InlineData(5, 150, 0.8660, false, true)]
    public void Compute_Screen_IsTheTable(double tension, double angle, double pressure, bool wets, bool flagged)
    {
        var response = Requests.Done(ScreenCalculator.Compute(new ScreenRequest(tension, angle, 20)));
        Checks.Within(pressure, response.BreakthroughKPa, 5e-5);
        Assert.Equal(wets, response.WaterWets);
        Assert.Equal(flagged, response.Working.Any(step => step.Flag is not null));
        Requests.ShowsItsWorking(response.Working);
    }

    [Theory]
    [InlineData(null, null, null, "interfacialTensionMNM,contactAngleDeg,poreUm")]
    [InlineData(0.0, 150.0, 20.0, "interfacialTensionMNM")]
    [InlineData(30.0, 181.0, 20.0, "contactAngleDeg")]
    [InlineData(30.0, -1.0, 20.0, "contactAngleDeg")]
    [InlineData(30.0, 150.0, double.NaN, "poreUm")]
    public void Compute_BadInput_NamesTheField(double? tension, double? angle, double? pore, string fields) =>
        Assert.Equal(fields, Requests.Refused(ScreenCalculator.Compute(new ScreenRequest(tension, angle, pore))));
}
