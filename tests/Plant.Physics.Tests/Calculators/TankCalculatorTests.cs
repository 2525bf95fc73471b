using Plant.Physics.Calculators;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Calculators;

public sealed class TankCalculatorTests
{
    // 6 m² and 600 L/min on 6 m³: 1 m deep, 10 minutes; worked by hand
    [Fact]
    public void Compute_RectangularTank_IsTheHandCalculation()
    {
        var tank = Requests.Done(TankCalculator.Compute(Requests.Tank));
        Checks.Within(1000, tank.OilDepthMm, 1e-9);
        Checks.Within(6, tank.SurfaceAreaM2, 1e-12);
        Checks.Within(10, tank.ResidenceTimeMin, 1e-12);
        var cut = Assert.NotNull(tank.CutSizeUm);
        Checks.Near(0.01 / 6, new DropletSettling(Checks.MineralOil(), 313.15).VelocityMS(cut * 1e-6), 1e-9);
        Assert.InRange(tank.RemovalFraction, 0.05, 0.95);
        Requests.ShowsItsWorking(tank.Working);
    }

    // 6 m² and 600 L/min cut 917 µm in the test oil by Stokes' law; drag adds a little
    [Fact]
    public void Compute_TestOil_CutsThePublishedSize()
    {
        var fluid = Requests.Oil with { Density15KgM3 = 850, ExpansionPerK = 0 };
        Assert.InRange(Assert.NotNull(Requests.Done(TankCalculator.Compute(Requests.Tank with { Fluid = fluid })).CutSizeUm), 917, 917 * 1.01);
    }

    // diameter 1.2 m, length 3 m, 1 m³ stands 402.936 mm deep, recomputed apart from this code
    [Fact]
    public void Compute_LyingCylinder_HasTheDepthAndArea()
    {
        var tank = Requests.Done(TankCalculator.Compute(Requests.Tank with { Shape = "horizontal-cylinder", LengthMm = 3000, WidthMm = null, HeightMm = 1200, OilVolumeL = 1000 }));
        Checks.Within(402.93626, tank.OilDepthMm, 6e-6);
        Checks.Near(2 * 3 * Math.Sqrt(0.40293626 * (1.2 - 0.40293626)), tank.SurfaceAreaM2, 1e-7);
    }

    [Fact]
    public void Compute_StandingCylinder_NeedsNoLength()
    {
        var tank = Requests.Done(TankCalculator.Compute(Requests.Tank with { Shape = "vertical-cylinder", LengthMm = null, WidthMm = 2000, HeightMm = 2500, OilVolumeL = 5000 }));
        Checks.Near(Math.PI, tank.SurfaceAreaM2, 1e-12);
        Checks.Near(5000 / Math.PI, tank.OilDepthMm, 1e-9);
    }

    [Fact]
    public void Compute_OneSize_IsMinOfOneAndTheRatio()
    {
        var request = Requests.Tank with { DropletMedianUm = 200, GeometricDeviation = 1 };
        var ratio = new DropletSettling(Checks.MineralOil(), 313.15).VelocityMS(200e-6) / (0.01 / 6);
        Checks.Near(ratio, Requests.Done(TankCalculator.Compute(request)).RemovalFraction, 1e-9);
        Checks.Near(1 - Math.Pow(1 + (ratio / 3), -3), Requests.Done(TankCalculator.Compute(request with { TanksInSeries = 3 })).RemovalFraction, 1e-9);
        Assert.Equal(1, Requests.Done(TankCalculator.Compute(request with { DropletMedianUm = 5000 })).RemovalFraction);
    }

    [Fact]
    public void Compute_MoreThanTheTankHolds_IsRefusedWithWhatItHolds()
    {
        var result = TankCalculator.Compute(Requests.Tank with { OilVolumeL = 7201 });
        Assert.Equal("oilVolumeL", Requests.Refused(result));
        Assert.Contains("7200 L", result.Refusals[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Compute_LyingCylinderFullToTheCrown_IsRefused() =>
        Assert.Equal("oilVolumeL", Requests.Refused(TankCalculator.Compute(Requests.Tank with { Shape = "horizontal-cylinder", LengthMm = 1000, HeightMm = 1000, OilVolumeL = 250 * Math.PI })));

    [Fact]
    public void Compute_UnknownShape_IsRefusedWithTheCodes()
    {
        var result = TankCalculator.Compute(Requests.Tank with { Shape = "sphere" });
        Assert.Equal("shape", Requests.Refused(result));
        Assert.Contains("horizontal-cylinder", result.Refusals[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Compute_Nothing_RefusesEveryField() =>
        Assert.Equal("fluid,temperatureC,shape,oilVolumeL,circulationLPerMin,dropletMedianUm,geometricDeviation", Requests.Refused(TankCalculator.Compute(new TankRequest())));

    [Theory]
    [InlineData("LengthMm", null, "lengthMm")]
    [InlineData("WidthMm", -1.0, "widthMm")]
    [InlineData("HeightMm", double.NaN, "heightMm")]
    [InlineData("OilVolumeL", 0.0, "oilVolumeL")]
    [InlineData("CirculationLPerMin", 0.0, "circulationLPerMin")]
    [InlineData("TanksInSeries", 0.0, "tanksInSeries")]
    [InlineData("TanksInSeries", double.NaN, "tanksInSeries")]
    [InlineData("DropletMedianUm", null, "dropletMedianUm")]
    [InlineData("GeometricDeviation", 0.9, "geometricDeviation")]
    public void Compute_BadField_IsRefusedByName(string property, double? value, string field)
    {
        var request = Requests.Tank with { };
        typeof(TankRequest).GetProperty(property)!.SetValue(request, value);
        Assert.Equal(field, Requests.Refused(TankCalculator.Compute(request)));
    }
}
