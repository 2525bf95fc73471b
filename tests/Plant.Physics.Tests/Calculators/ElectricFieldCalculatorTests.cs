using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class ElectricFieldCalculatorTests
{
    private static readonly FluidRequest Oil = Requests.Oil with { InterfacialTensionMNM = 30, RelativePermittivity = 2.2, ConductivityPSM = 100 };

    private static ElectricFieldRequest Field(double droplet, double gap, double field) => new(Oil, 40, droplet, gap, field);

    // F in units of ε·a²·E²: 17.59468 at a gap of a tenth of the radius, by multipoles apart from this code
    [Theory]
    [InlineData(100, 50, 1.16473)]
    [InlineData(100, 5, 17.59468)]
    [InlineData(20, 0.1, 120.060147)]
    public void Compute_TwoDrops_IsTheExactForce(double droplet, double gap, double force)
    {
        var response = Requests.Done(ElectricFieldCalculator.Compute(Field(droplet, gap, 3)));
        Checks.Near(force * 2.2 * 8.8541878128e-12 * Math.Pow(droplet / 2 * 1e-6 * 3e5, 2), response.AttractionN, 1e-5);
        Requests.ShowsItsWorking(response.Working);
    }

    // Taylor: 0.80469 MV/m for 1 mm, 2.54466 MV/m for 100 µm, recomputed apart from this code with 0.4585 for √0.21025
    [Theory]
    [InlineData(1000, 8.0, 8.0469, false)]
    [InlineData(1000, 8.1, 8.0469, true)]
    [InlineData(100, 8.1, 25.4466, false)]
    public void Compute_Field_BreaksDropsAboveTaylorsLimit(double droplet, double field, double critical, bool breaks)
    {
        var response = Requests.Done(ElectricFieldCalculator.Compute(Field(droplet, droplet, field)));
        Checks.Near(critical, response.CriticalFieldKVPerCm, 1e-4);
        Assert.Equal(breaks, response.BreaksUp);
        Assert.Equal(breaks, response.ElectricCapillaryNumber > 0.21025);
        Checks.Near(0.21025 * Math.Pow(field / critical, 2), response.ElectricCapillaryNumber, 2e-4);
    }

    [Fact]
    public void Compute_NoField_HasNoForce()
    {
        var response = Requests.Done(ElectricFieldCalculator.Compute(Field(100, 10, 0)));
        Assert.Equal(0, response.AttractionN);
        Assert.Equal(0, response.ElectricCapillaryNumber);
        Assert.False(response.BreaksUp);
        Requests.ShowsItsWorking(response.Working);
    }

    [Theory]
    [InlineData("diesel", "vapour space")]
    [InlineData("mineral", "licensed design")]
    public void Compute_AnyFluid_CarriesItsCaution(string family, string words)
    {
        var response = Requests.Done(ElectricFieldCalculator.Compute(new ElectricFieldRequest(new FluidRequest { Family = family }, 40, 100, 10, 5)));
        Assert.Contains(response.Working, step => step.Flag?.Contains(words, StringComparison.Ordinal) == true);
        Assert.Equal(2, response.Working.Count(step => step.Flag?.StartsWith("the family's default", StringComparison.Ordinal) == true));
    }

    [Fact]
    public void Compute_ConductingOil_SaysTheFieldDoesNotStand() =>
        Assert.Contains(Requests.Done(ElectricFieldCalculator.Compute(Field(100, 10, 1) with { Fluid = Oil with { ConductivityPSM = 1e5 } })).Working, step => step.Flag?.StartsWith("the oil conducts", StringComparison.Ordinal) == true);

    [Fact]
    public void Compute_BadInput_NamesTheField()
    {
        Assert.Equal("fluid,temperatureC,dropletUm,gapUm,fieldKVPerCm", Requests.Refused(ElectricFieldCalculator.Compute(new ElectricFieldRequest(null, null, null, null, null))));
        Assert.Equal("dropletUm", Requests.Refused(ElectricFieldCalculator.Compute(Field(0, 1, 1))));
        Assert.Equal("gapUm", Requests.Refused(ElectricFieldCalculator.Compute(Field(10, 0, 1))));
        Assert.Equal("gapUm", Requests.Refused(ElectricFieldCalculator.Compute(Field(100, 1e-8, 1))));
        Assert.Equal("fieldKVPerCm", Requests.Refused(ElectricFieldCalculator.Compute(Field(10, 1, -1))));
        Assert.Equal("fieldKVPerCm", Requests.Refused(ElectricFieldCalculator.Compute(Field(10, 1, double.NaN))));
    }
}
