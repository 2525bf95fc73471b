using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class SettlingCalculatorTests
{
    private static readonly FluidRequest TestOil = Requests.Oil with { Density15KgM3 = 850, ExpansionPerK = 0 };

    // the test oil of the settling table (850 kg/m³, 0.0391 Pa·s at 40 °C); water is Kell's 992.216 here, not 992.2, hence the tolerance
    [Theory]
    [InlineData(50, false, 4.953309e-3)]
    [InlineData(500, false, 0.4933104)]
    [InlineData(500, true, 0.7369701)]
    public void Compute_TestOil_IsTheTable(double dropletUm, bool mobile, double velocityMmPerS)
    {
        var response = Requests.Done(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, [dropletUm], 1000, 0, mobile)));
        var row = Assert.Single(response.Results);
        Checks.Near(velocityMmPerS, row.VelocityMmPerS, 3e-4);
        Checks.Near(1000 / row.VelocityMmPerS, Assert.NotNull(row.SettlingTimeS), 1e-12);
        Checks.Near(850 * row.VelocityMmPerS * 1e-3 * dropletUm * 1e-6 / 0.0391, row.Reynolds, 1e-4);
        Requests.ShowsItsWorking(response.Working);
    }

    [Fact]
    public void Compute_Hindered_IsSlowerByThePower()
    {
        var free = Requests.Done(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, [100], 1000, null, null))).Results[0];
        var hindered = Requests.Done(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, [100], 1000, 0.2, false))).Results[0];
        Checks.Near(Math.Pow(0.8, 4.65), hindered.VelocityMmPerS / free.VelocityMmPerS, 1e-12);
    }

    [Fact]
    public void Compute_DenseFluid_HasNegativeVelocityAndATime()
    {
        var row = Requests.Done(SettlingCalculator.Compute(new SettlingRequest(Requests.SolublePolyglycol, 40, [200], 500, 0, false))).Results[0];
        Assert.True(row.VelocityMmPerS < 0);
        Checks.Near(500 / -row.VelocityMmPerS, Assert.NotNull(row.SettlingTimeS), 1e-12);
    }

    [Fact]
    public void Compute_NearEqualDensity_IsFlagged()
    {
        var fluid = new FluidRequest { Family = "pag", Density15KgM3 = 1010, ExpansionPerK = 7.8e-4 };
        Assert.Contains(Requests.Done(SettlingCalculator.Compute(new SettlingRequest(fluid, 40, [200], 500, 0, false))).Working, step => step.Flag?.Contains("gravity", StringComparison.Ordinal) == true);
    }

    [Fact]
    public void Compute_SeveralDrops_AnswerInOrder() =>
        Assert.Equal([300, 10, 50], Requests.Done(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, [300, 10, 50], 1000, 0, false))).Results.Select(row => row.DropletUm));

    [Fact]
    public void Compute_BadDrops_AreRefusedByIndex() =>
        Assert.Equal("dropletUm[1],dropletUm[2]", Requests.Refused(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, [10, -1, double.NaN], 1000, 0, false))));

    [Fact]
    public void Compute_NoDrops_IsRefused()
    {
        Assert.Equal("dropletUm", Requests.Refused(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, [], 1000, 0, false))));
        Assert.Equal("dropletUm", Requests.Refused(SettlingCalculator.Compute(new SettlingRequest(TestOil, 40, null, 1000, 0, false))));
    }

    [Theory]
    [InlineData(null, 1000.0, 0.0, "temperatureC")]
    [InlineData(40.0, null, 0.0, "depthMm")]
    [InlineData(40.0, 0.0, 0.0, "depthMm")]
    [InlineData(40.0, 1000.0, 0.9, "waterVolumeFraction")]
    [InlineData(40.0, 1000.0, double.NaN, "waterVolumeFraction")]
    public void Compute_BadField_IsRefusedByName(double? temperature, double? depth, double? fraction, string field) =>
        Assert.Equal(field, Requests.Refused(SettlingCalculator.Compute(new SettlingRequest(TestOil, temperature, [100], depth, fraction, false))));
}
