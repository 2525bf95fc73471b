using Plant.Web.Features.Calculators;

namespace Plant.Web.Tests.Features.Calculators;

public sealed class CalculatorSpecTests
{
    public static TheoryData<string> Codes => [.. CalculatorCatalogue.All.Select(c => c.Code)];

    [Theory, MemberData(nameof(Codes))]
    public void EveryCalculator_AnswersItsExampleWithSourcesAndAPicture(string code)
    {
        var spec = CalculatorCatalogue.Find(code)!;
        var typed = spec.Fields.ToDictionary(f => f.Path, f => f.Example);
        var answer = spec.Compute(typed);
        Assert.Empty(answer.Refused);
        Assert.NotEmpty(answer.Steps);
        Assert.All(answer.Steps, step => Assert.NotEqual("", step.Source));
        Assert.All(spec.Outputs, output => Assert.True(answer.Response!.ContainsKey(output.Name), output.Name));
        Assert.Equal(spec.Picture is not null, spec.Draw(typed, answer.Response!).Count > 0);
    }

    [Fact]
    public void Catalogue_HoldsEveryCalculatorOfTheInterface()
    {
        string[] contract = ["fluid-state", "water-split", "settling", "tank", "coalescence", "coalescer", "screen", "electric-field", "dry-down", "karl-fischer", "bearing-life"];
        Assert.Equal(contract.Order(StringComparer.Ordinal), CalculatorCatalogue.All.Select(c => c.Code).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Compute_GivesThePublishedValue()
    {
        // Cantley 1977: 2.297397 at 25 ppm; a comma is read as a point
        var answer = CalculatorCatalogue.Find("bearing-life")!.Compute(new Dictionary<string, string> { ["waterPpm"] = "25,0" });
        Assert.Equal(2.297397, (double)answer.Response!["relativeLife"]!, 1e-6);
    }

    [Theory]
    [InlineData("bearing-life", "waterPpm", "wet", "no number")]
    [InlineData("bearing-life", "waterPpm", "-4", "must")]
    [InlineData("settling", "dropletUm", "5 x 10", "no number")]
    [InlineData("karl-fischer", "replicates.1.sampleG", "0", "must")]
    [InlineData("water-split", "coldestTemperatureC", "90", "must not be above")]
    public void Compute_BadInput_StandsAtItsField(string code, string path, string text, string told)
    {
        var spec = CalculatorCatalogue.Find(code)!;
        var typed = spec.Fields.ToDictionary(f => f.Path, f => f.Example);
        typed[path] = text;
        var answer = spec.Compute(typed);
        Assert.Null(answer.Response);
        Assert.Contains(told, answer.Refused[path], StringComparison.Ordinal);
    }
}
