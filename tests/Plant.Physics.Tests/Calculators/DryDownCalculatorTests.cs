using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class DryDownCalculatorTests
{
    // transformer oil with log10 S = 7.09 − 1567/T (from memory) and 850 kg/m³
    private static readonly DryDownRequest Vacuum = new()
    {
        Fluid = Requests.Oil with { Family = "transformer-mineral", Viscosity40Mm2S = 9.5, Viscosity100Mm2S = 2.5, Density15KgM3 = 850, ExpansionPerK = 0, SolubilityA = 7.09 },
        OilVolumeL = 5000, StartPpm = 300, TargetPpm = 50, IngressGPerDay = 0, Kind = "vacuum-dehydrator", FlowLPerMin = 5000.0 / 60, Efficiency = 0.8,
        PressureKPa = 1, OilTemperatureC = 60, ColdestTemperatureC = 20,
    };

    // C_eq 12.2057 mg/kg at 60 °C and 10 mbar; k 0.8 1/h; recomputed apart from this code
    [Theory]
    [InlineData(0, 12.2057)]
    [InlineData(1000, 12.2057 + 12.25490)]
    public void Compute_Vacuum_IsTheClosedForm(double ingressGPerDay, double floor)
    {
        var response = Requests.Done(DryDownCalculator.Compute(Vacuum with { IngressGPerDay = ingressGPerDay }));
        Checks.Near(floor, Assert.NotNull(response.FloorPpm), 1e-4);
        Checks.Near(Math.Log((300 - floor) / (50 - floor)) / 0.8, Assert.NotNull(response.HoursToTarget), 1e-4);
        Assert.Equal(response.TimesH.Count, response.WaterPpm.Count);
        Assert.Equal(300, response.WaterPpm[0]);
        Checks.Near(response.HoursToTarget.Value, response.TimesH[^1], 1e-12);
        Checks.Near(50, response.WaterPpm[^1], 1e-9);
        Assert.False(response.FreeWhenCold);
        Requests.ShowsItsWorking(response.Working);
    }

    // a coalescer leaves hot oil saturated (243.45 mg/kg at 60 °C): it hazes when it stands at 20 °C
    [Fact]
    public void Compute_Coalescer_StopsAtSaturationAndHazesCold()
    {
        var response = Requests.Done(DryDownCalculator.Compute(Vacuum with { Kind = "coalescer", PressureKPa = null }));
        Assert.Null(response.HoursToTarget);
        Checks.Near(243.452, Assert.NotNull(response.FloorPpm), 1e-5);
        Assert.True(response.FreeWhenCold);
        Assert.Contains(response.Working, step => step.Flag?.StartsWith("cannot be reached", StringComparison.Ordinal) == true);
    }

    [Fact]
    public void Compute_CoalescerOnDryOil_ChangesNothing()
    {
        var response = Requests.Done(DryDownCalculator.Compute(Vacuum with { Kind = "coalescer", StartPpm = 40, TargetPpm = 20 }));
        Assert.Null(response.HoursToTarget);
        Assert.All(response.WaterPpm, water => Assert.Equal(40, water));
        Assert.False(response.FreeWhenCold);
    }

    [Fact]
    public void Compute_AlreadyDry_IsZeroHoursAndSaysItRises()
    {
        var response = Requests.Done(DryDownCalculator.Compute(Vacuum with { StartPpm = 10, TargetPpm = 11, IngressGPerDay = 1000 }));
        Assert.Equal(0, response.HoursToTarget);
        Assert.Contains(response.Working, step => step.Flag?.Contains("lifts", StringComparison.Ordinal) == true);
        Assert.True(response.TimesH[^1] > 0);
    }

    [Theory]
    [InlineData("centrifuge")]
    [InlineData("electrostatic-coalescer")]
    [InlineData("absorbent")]
    [InlineData("dry-air-purge")]
    [InlineData("desiccant-breather")]
    public void Compute_EveryKind_ShowsItsWorking(string kind) => Requests.ShowsItsWorking(Requests.Done(DryDownCalculator.Compute(Vacuum with { Kind = kind })).Working);

    [Fact]
    public void Compute_PurgeDrownedByIngress_HasNoFloor()
    {
        var response = Requests.Done(DryDownCalculator.Compute(Vacuum with { Kind = "dry-air-purge", FlowLPerMin = 1, IngressGPerDay = 1e6 }));
        Assert.Null(response.FloorPpm);
        Assert.Null(response.HoursToTarget);
        Assert.True(response.FreeWhenCold);
    }

    [Theory]
    [InlineData("vacuum-dehydrator", "light ends")]
    [InlineData("electrostatic-coalescer", "vapour space")]
    public void Compute_Fuel_IsCautioned(string kind, string words) =>
        Assert.Contains(words, Requests.Done(DryDownCalculator.Compute(Vacuum with { Kind = kind, Fluid = new FluidRequest { Family = "diesel" } })).Working[0].Flag, StringComparison.Ordinal);

    [Fact]
    public void Compute_BadInput_NamesTheField()
    {
        Assert.Equal("fluid,oilVolumeL,kind,flowLPerMin,efficiency,oilTemperatureC,startPpm,targetPpm,coldestTemperatureC", Requests.Refused(DryDownCalculator.Compute(new DryDownRequest())));
        foreach (var (request, field) in new[]
        {
            (Vacuum with { OilVolumeL = 0 }, "oilVolumeL"), (Vacuum with { StartPpm = -1 }, "startPpm"), (Vacuum with { TargetPpm = double.NaN }, "targetPpm"), (Vacuum with { IngressGPerDay = -5 }, "ingressGPerDay"),
            (Vacuum with { Kind = "magic" }, "kind"), (Vacuum with { FlowLPerMin = 0 }, "flowLPerMin"), (Vacuum with { Efficiency = 80 }, "efficiency"), (Vacuum with { PressureKPa = null }, "pressureKPa"),
            (Vacuum with { PressureKPa = -80 }, "pressureKPa"), (Vacuum with { OilTemperatureC = 900 }, "oilTemperatureC"), (Vacuum with { ColdestTemperatureC = 70 }, "coldestTemperatureC"),
            (Vacuum with { Fluid = Requests.SolublePolyglycol }, "fluid.solubilityA"),
        })
        {
            Assert.Equal(field, Requests.Refused(DryDownCalculator.Compute(request)));
        }
    }
}
