using Plant.Physics.Calculators;

namespace Plant.Physics.Tests.Calculators;

public sealed class CoalescerCalculatorTests
{
    private static readonly CoalescerRequest Bed = new()
    {
        Fluid = Requests.Oil with { Density15KgM3 = 850, ExpansionPerK = 0 }, TemperatureC = 40, FaceVelocityMmPerS = 5, FibreUm = 10, Solidity = 0.1, ThicknessMm = 5, DropletUm = [1, 3],
    };

    // Kuwabara, exact interception, Lee and Liu's diffusion, Davies: recomputed apart from this code
    [Fact]
    public void Compute_Bed_IsTheTable()
    {
        var response = Requests.Done(CoalescerCalculator.Compute(Bed));
        Assert.Equal([1, 3], response.Results.Select(row => row.DropletUm));
        Checks.Within(0.697072, response.Results[0].RemovalFraction, 1e-6);
        Checks.Within(0.999920, response.Results[1].RemovalFraction, 1e-6);
        Checks.Near(20.891, response.PressureDropKPa, 3e-5);
        Requests.ShowsItsWorking(response.Working);
    }

    [Fact]
    public void Compute_TwoStages_MultiplyAndAdd()
    {
        var response = Requests.Done(CoalescerCalculator.Compute(Bed with { Stages = 2 }));
        Checks.Within(1 - Math.Pow(1 - 0.697072, 2), response.Results[0].RemovalFraction, 1e-6);
        Checks.Near(41.782, response.PressureDropKPa, 3e-5);
    }

    [Theory]
    [InlineData(100, 0.1, "sieve")]
    [InlineData(1, 0.4, "0.006 to 0.3")]
    public void Compute_BeyondValidity_GivesAFlaggedValue(double droplet, double solidity, string words)
    {
        var response = Requests.Done(CoalescerCalculator.Compute(Bed with { DropletUm = [droplet], Solidity = solidity }));
        Assert.InRange(response.Results[0].RemovalFraction, 0, 1);
        Assert.Contains(response.Working, step => step.Flag?.Contains(words, StringComparison.Ordinal) == true);
    }

    [Fact]
    public void Compute_LowTension_SaysThatDropsDoNotMerge() =>
        Assert.Contains(Requests.Done(CoalescerCalculator.Compute(Bed with { Fluid = Bed.Fluid! with { InterfacialTensionMNM = 8 } })).Working, step => step.Flag?.Contains("coalescers fail", StringComparison.Ordinal) == true);

    [Fact]
    public void Compute_SolublePolyglycol_ComputesWithoutASaturation() =>
        Requests.ShowsItsWorking(Requests.Done(CoalescerCalculator.Compute(Bed with { Fluid = Requests.SolublePolyglycol })).Working);

    [Fact]
    public void Compute_BadInput_NamesTheField()
    {
        Assert.Equal("fluid,temperatureC,faceVelocityMmPerS,fibreUm,solidity,thicknessMm,dropletUm", Requests.Refused(CoalescerCalculator.Compute(new CoalescerRequest())));
        foreach (var (request, field) in new[]
        {
            (Bed with { FaceVelocityMmPerS = 0 }, "faceVelocityMmPerS"), (Bed with { FibreUm = -1 }, "fibreUm"), (Bed with { Solidity = 0 }, "solidity"), (Bed with { Solidity = 1 }, "solidity"),
            (Bed with { ThicknessMm = double.NaN }, "thicknessMm"), (Bed with { DropletUm = [1, 0] }, "dropletUm[1]"), (Bed with { Stages = 0 }, "stages"), (Bed with { Stages = 1.5 }, "stages"),
        })
        {
            Assert.Equal(field, Requests.Refused(CoalescerCalculator.Compute(request)));
        }
    }
}
