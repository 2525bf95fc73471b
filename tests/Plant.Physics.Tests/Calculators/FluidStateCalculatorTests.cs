using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class FluidStateCalculatorTests
{
    // ASTM D341 and D1250-80 for 46 and 6.8 mm²/s, 870 kg/m³; Kell's water; curve of IEEE C57.106: the check values of the parts
    [Fact]
    public void Compute_MineralOil_IsThatOfThePublishedParts()
    {
        var state = Requests.Done(FluidStateCalculator.Compute(new FluidStateRequest(Requests.Oil, 40)));
        Checks.Within(46, state.KinematicViscosityMm2S, 1e-3);
        Checks.Within(854.223, state.DensityKgM3, 6e-4);
        Checks.Within(46 * 0.854223, state.DynamicViscosityMPaS, 1e-3);
        Checks.Within(992.2158, state.WaterDensityKgM3, 1e-4);
        Checks.Within(992.2158 - 854.223, state.DensityDifferenceKgM3, 6e-4);
        Checks.Within(121.761, Assert.NotNull(state.SaturationPpm), 6e-4);
        Assert.Equal("down", state.WaterGoes);
        Assert.Null(state.InversionTemperatureC);
        Requests.ShowsItsWorking(state.Working);
    }

    [Theory]
    [InlineData(1010, 10, "up")]
    [InlineData(1010, 40, "neither")]
    [InlineData(1010, 80, "down")]
    public void Compute_PolyglycolThatInverts_SaysWhichWay(double density15, double temperatureC, string goes)
    {
        var fluid = new FluidRequest { Family = "pag", Density15KgM3 = density15, ExpansionPerK = 7.8e-4 };
        var state = Requests.Done(FluidStateCalculator.Compute(new FluidStateRequest(fluid, temperatureC)));
        Assert.Equal(goes, state.WaterGoes);
        Checks.Within(35.480, Assert.NotNull(state.InversionTemperatureC), 6e-4);
        Assert.Null(state.SaturationPpm);
        Requests.ShowsItsWorking(state.Working);
    }

    [Theory]
    [InlineData("mineral")]
    [InlineData("pao")]
    [InlineData("ester")]
    [InlineData("phosphate-ester")]
    [InlineData("pag")]
    [InlineData("natural-ester")]
    [InlineData("silicone")]
    [InlineData("transformer-mineral")]
    [InlineData("diesel")]
    public void Compute_OnlyTheFamily_IsTheDefaultAndFlagged(string family)
    {
        var state = Requests.Done(FluidStateCalculator.Compute(new FluidStateRequest(new FluidRequest { Family = family }, 40)));
        Assert.True(state.KinematicViscosityMm2S > 0 && state.DensityKgM3 > 700);
        Assert.Contains(state.Working, step => step.Flag is not null && step.Flag.Contains("unverified", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(null)]
    [InlineData(double.NaN)]
    [InlineData(-300.0)]
    [InlineData(1000.0)]
    public void Compute_NotATemperature_IsRefused(double? temperatureC) =>
        Assert.Equal("temperatureC", Requests.Refused(FluidStateCalculator.Compute(new FluidStateRequest(Requests.Oil, temperatureC))));

    [Theory]
    [InlineData(null)]
    [InlineData("")]
    [InlineData("Mineral")]
    [InlineData("grease")]
    public void Compute_UnknownFamily_IsRefusedWithTheCodes(string? family)
    {
        var result = FluidStateCalculator.Compute(new FluidStateRequest(new FluidRequest { Family = family }, 40));
        Assert.Equal("fluid.family", Requests.Refused(result));
        Assert.Contains("phosphate-ester", result.Refusals[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Compute_EverythingWrong_IsAllRefusedAtOnce() =>
        Assert.Equal("fluid.viscosity40Mm2S,fluid.density15KgM3,temperatureC",
            Requests.Refused(FluidStateCalculator.Compute(new FluidStateRequest(Requests.Oil with { Viscosity40Mm2S = -1, Density15KgM3 = double.NaN }, null))));

    [Fact]
    public void Compute_Nothing_IsRefusedByName() => Assert.Equal("fluid,temperatureC", Requests.Refused(FluidStateCalculator.Compute(new FluidStateRequest(null, null))));

    [Fact]
    public void Compute_BeyondTheRangeOfWater_IsFlagged()
    {
        var state = Requests.Done(FluidStateCalculator.Compute(new FluidStateRequest(Requests.Oil, 140)));
        Assert.NotNull(state.Working.Single(step => step.Name == "density of water").Flag);
    }
}
