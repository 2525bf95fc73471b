using System.Globalization;
using Plant.Physics.Calculators;
using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Calculators;

public sealed class CoalescenceCalculatorTests
{
    private static readonly CoalescenceRequest Tank = new()
    {
        Fluid = Requests.Oil, TemperatureC = 50, WaterVolumeFraction = 500e-6, DropletMedianUm = 10, GeometricDeviation = 1.8, DepthMm = 500, Hours = 24,
        ShearRatePerS = 5, CollisionEfficiency = 0.1, FieldKVPerCm = 0, Cells = 80,
    };

    [Theory]
    [InlineData(20, 1.8, 10)]
    [InlineData(40, 1.8, 10)]
    [InlineData(64, 1.8, 10)]
    [InlineData(80, 1.8, 10)]
    [InlineData(160, 1.8, 10)]
    [InlineData(40, 1.15, 25)]
    [InlineData(100, 1.3, 15)]
    [InlineData(50, 2.4, 20)]
    public void Compute_AnyCells_IsWithinOnePercentOfTheConvergedAnswer(double cells, double deviation, double medianUm)
    {
        var request = Tank with { Cells = cells, GeometricDeviation = deviation, DropletMedianUm = medianUm };
        var response = Requests.Done(CoalescenceCalculator.Compute(request));
        Requests.ShowsItsWorking(response.Working);
        var fluid = Checks.MineralOil();
        var kernel = new CollisionKernel
        {
            TemperatureK = 323.15, ViscosityPaS = fluid.DynamicViscosityPaS(323.15), DensityDifferenceKgM3 = fluid.DensityDifferenceKgM3(323.15), ShearRatePerS = 5, Efficiency = 0.1,
        };
        var fine = new PopulationBalance(new VolumeGrid(400), new PopulationBalanceSetup { KernelM3S = kernel.RateM3S, SettlingMS = kernel.SpeedMS, DepthM = 0.5, Tolerance = 1e-6 })
            .Solve(LognormalDistribution.ByVolume(medianUm * 1e-6, deviation), 500e-6, response.TimesS);
        Assert.Equal(25, response.TimesS.Count);
        Assert.Equal((0, 86_400), (response.TimesS[0], response.TimesS[^1]));
        for (var i = 0; i < response.TimesS.Count; i++)
        {
            Checks.Near(fine.States[i].SuspendedVolumeFraction / 500e-6, response.SuspendedFraction[i], 0.01);
            Checks.Near(fine.States[i].NumberPerM3, response.NumberPerM3[i], 0.01);
            Checks.Near(Assert.NotNull(fine.States[i].MedianM) * 1e6, Assert.NotNull(response.MedianUm[i]), 0.01);
        }

        Assert.InRange(response.MassErrorFraction, 0, 1e-12);
    }

    [Fact]
    public void Compute_OneSize_Answers()
    {
        var response = Requests.Done(CoalescenceCalculator.Compute(Tank with { GeometricDeviation = 1, Cells = 320 }));
        Checks.Near(500e-6 / (Math.PI / 6 * 1e-15), response.NumberPerM3[0], 1e-3);
        Assert.Contains(response.Working, step => step.Flag?.Contains("narrower", StringComparison.Ordinal) == true);
    }

    [Fact]
    public void Compute_Field_StrengthensAndIsLabelled()
    {
        var response = Requests.Done(CoalescenceCalculator.Compute(Tank with { FieldKVPerCm = 2 }));
        Assert.True(response.NumberPerM3[1] < Requests.Done(CoalescenceCalculator.Compute(Tank)).NumberPerM3[1]);
        var step = Assert.Single(response.Working, step => step.Name.StartsWith("field", StringComparison.Ordinal));
        Assert.True(step.Value > 1 && step.Source.Contains("judgement", StringComparison.Ordinal) && step.Flag is not null);
    }

    [Fact]
    public void Compute_NoEfficiency_GuessesAndSaysSo()
    {
        var response = Requests.Done(CoalescenceCalculator.Compute(Tank with { CollisionEfficiency = null, Fluid = Requests.Oil with { DemulsibilityMin = 30, InterfacialTensionMNM = 35 } }));
        Assert.Contains(response.Working, step => step.Source.Contains("judgement", StringComparison.Ordinal) && step.Flag?.Contains("collisionEfficiency", StringComparison.Ordinal) == true);
    }

    [Fact]
    public void Compute_OptionalFieldsLeftOut_Answers() =>
        Requests.ShowsItsWorking(Requests.Done(CoalescenceCalculator.Compute(Tank with { ShearRatePerS = null, FieldKVPerCm = null, Cells = null })).Working);

    [Fact]
    public void Compute_WideDistribution_SaysThatItIsCut() =>
        Assert.Contains(Requests.Done(CoalescenceCalculator.Compute(Tank with { GeometricDeviation = 8 })).Working, step => step.Flag?.Contains("cut", StringComparison.Ordinal) == true);

    [Fact]
    public void Compute_DropsThatOutgrowTheCells_AreFlagged() =>
        Assert.Contains(Requests.Done(CoalescenceCalculator.Compute(Tank with { WaterVolumeFraction = 0.02, ShearRatePerS = 200, CollisionEfficiency = 1, DepthMm = 5000, Hours = 1 })).Working,
            step => step.Flag?.Contains("2 mm", StringComparison.Ordinal) == true);

    [Fact]
    public void Compute_Cancelled_Stops()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();
        Assert.Throws<OperationCanceledException>(() => CoalescenceCalculator.Compute(Tank, stop.Token));
    }

    [Theory]
    [InlineData(19)]
    [InlineData(321)]
    [InlineData(80.5)]
    [InlineData(double.NaN)]
    [InlineData(1e9)]
    public void Compute_BadCells_NamesFieldValueAndRange(double cells)
    {
        var result = CoalescenceCalculator.Compute(Tank with { Cells = cells });
        var refusal = Assert.Single(result.Refusals);
        Assert.Equal(("cells", cells.ToString("R", CultureInfo.InvariantCulture)), (refusal.Field, refusal.Value));
        Assert.Contains("20", refusal.Reason, StringComparison.Ordinal);
        Assert.Contains("320", refusal.Reason, StringComparison.Ordinal);
    }

    public static TheoryData<string, double?> BadFields() => new()
    {
        { "temperatureC", null }, { "temperatureC", 900 }, { "waterVolumeFraction", null }, { "waterVolumeFraction", 0 }, { "waterVolumeFraction", 0.5 }, { "dropletMedianUm", 0.5 }, { "dropletMedianUm", 2001 },
        { "geometricDeviation", 0.9 }, { "geometricDeviation", null }, { "depthMm", 0 }, { "hours", null }, { "hours", 1e5 }, { "shearRatePerS", -1 }, { "collisionEfficiency", 1.1 }, { "fieldKVPerCm", double.NaN },
    };

    [Theory]
    [MemberData(nameof(BadFields))]
    public void Compute_BadField_IsRefusedByName(string field, double? value) => Assert.Equal(field, Requests.Refused(CoalescenceCalculator.Compute(With(field, value))));

    [Fact]
    public void Compute_NoFluid_IsRefused() => Assert.Equal("fluid", Requests.Refused(CoalescenceCalculator.Compute(Tank with { Fluid = null })));

    private static CoalescenceRequest With(string field, double? value) => field switch
    {
        "temperatureC" => Tank with { TemperatureC = value },
        "waterVolumeFraction" => Tank with { WaterVolumeFraction = value },
        "dropletMedianUm" => Tank with { DropletMedianUm = value },
        "geometricDeviation" => Tank with { GeometricDeviation = value },
        "depthMm" => Tank with { DepthMm = value },
        "hours" => Tank with { Hours = value },
        "shearRatePerS" => Tank with { ShearRatePerS = value },
        "collisionEfficiency" => Tank with { CollisionEfficiency = value },
        _ => Tank with { FieldKVPerCm = value },
    };
}
