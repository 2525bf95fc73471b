using Plant.Physics.Ingress;

namespace Plant.Physics.Tests.Ingress;

public sealed class WaterOriginTests
{
    private static Dictionary<WaterTracer, double> Water(double sodium, double chloride, double hardness, double glycol, double boron, double conductivity) => new()
    {
        [WaterTracer.Sodium] = sodium, [WaterTracer.Chloride] = chloride, [WaterTracer.Hardness] = hardness,
        [WaterTracer.Glycol] = glycol, [WaterTracer.Boron] = boron, [WaterTracer.Conductivity] = conductivity,
    };

    private static string Likeliest(IReadOnlyDictionary<WaterTracer, double> measured) => WaterOrigin.Judge(measured, WaterSource.Defaults).MaxBy(row => row.Probability).Source;

    // arithmetic by hand: priors (0.4, 0.25, 0.2, 0.15), likelihoods (0.05, 0.9, 0.3, 0.02)
    [Fact]
    public void Posterior_Example_IsTheArithmetic()
    {
        double[] expected = [0.064935, 0.730519, 0.194805, 0.009740];
        var posterior = WaterOrigin.Posterior([0.4, 0.25, 0.2, 0.15], [0.05, 0.9, 0.3, 0.02]);
        Assert.All(Enumerable.Range(0, 4), i => Checks.Within(expected[i], posterior[i], 1e-6));
    }

    // typical waters (from memory): the judgement that the defaults must at least pass
    [Theory]
    [InlineData("condensate or steam", 0.02, 0.02, 0, 0, 0, 4)]
    [InlineData("cooling tower", 150, 200, 600, 0, 0.3, 1600)]
    [InlineData("potable or wash water", 20, 30, 150, 0, 0.03, 350)]
    [InlineData("glycol coolant", 1800, 20, 5, 250_000, 150, 3500)]
    [InlineData("sea water", 10_800, 19_400, 6300, 0, 4.5, 52_000)]
    [InlineData("other", 90_000, 0.6, 0, 0, 900, 6)]
    public void Judge_TypicalWater_NamesIt(string source, double sodium, double chloride, double hardness, double glycol, double boron, double conductivity) =>
        Assert.Equal(source, Likeliest(Water(sodium, chloride, hardness, glycol, boron, conductivity)));

    [Fact]
    public void Judge_NothingMeasured_IsThePrior()
    {
        var judged = WaterOrigin.Judge(new Dictionary<WaterTracer, double>(), WaterSource.Defaults);
        Assert.All(judged.Zip(WaterSource.Defaults), pair => Checks.Near(pair.Second.Prior, pair.First.Probability, 1e-12));
    }

    [Fact]
    public void Judge_WithoutOther_AddsItWithItsLeastWeight()
    {
        var judged = WaterOrigin.Judge(new Dictionary<WaterTracer, double>(), [.. WaterSource.Defaults.Where(source => source.Name != WaterSource.Other)]);
        Checks.Near(WaterOrigin.LeastOther, judged.Single(row => row.Source == WaterSource.Other).Probability, 1e-12);
        Assert.Equal(1, Assert.Single(WaterOrigin.Judge(Water(1, 1, 1, 1, 1, 1), [])).Probability);
    }

    // one tracer alone moves the odds by no more than a hundred
    [Property]
    public Property Judge_OneTracer_IsHeldToItsFactor() => Prop.ForAll(Inputs.OneOf(Enum.GetValues<WaterTracer>()), Inputs.Logarithmic(1e-3, 1e6), (tracer, value) =>
    {
        var judged = WaterOrigin.Judge(new Dictionary<WaterTracer, double> { [tracer] = value }, WaterSource.Defaults);
        var factors = judged.Zip(WaterSource.Defaults, (row, source) => row.Probability / source.Prior).ToList();
        return Math.Abs(judged.Sum(row => row.Probability) - 1) < 1e-12 && factors.Max() / factors.Min() <= WaterOrigin.MostByOneTracer * (1 + 1e-9) && judged.All(row => row.Probability > 0);
    });

    [Property]
    public Property Judge_SourcesReordered_SaysTheSame() => Prop.ForAll(Inputs.Logarithmic(0.01, 2e4), Inputs.Logarithmic(0.01, 2e4), (sodium, hardness) =>
    {
        var measured = new Dictionary<WaterTracer, double> { [WaterTracer.Sodium] = sodium, [WaterTracer.Hardness] = hardness };
        var there = WaterOrigin.Judge(measured, WaterSource.Defaults).ToDictionary(row => row.Source, row => row.Probability);
        return WaterOrigin.Judge(measured, [.. WaterSource.Defaults.Reverse()]).All(row => Math.Abs(row.Probability - there[row.Source]) < 1e-12);
    });

    // boron of an additive is no coolant: what the new oil gives is taken off
    [Fact]
    public void Judge_BoronOfTheOil_IsTakenOff()
    {
        var measured = new Dictionary<WaterTracer, double> { [WaterTracer.Boron] = 200, [WaterTracer.Conductivity] = 6 };
        double Coolant(Dictionary<WaterTracer, double>? newOil) => WaterOrigin.Judge(measured, WaterSource.Defaults, newOil).Single(row => row.Source == "glycol coolant").Probability;
        Assert.True(Coolant(new Dictionary<WaterTracer, double> { [WaterTracer.Boron] = 200 }) < 0.2 * Coolant(null));
    }

    [Fact]
    public void Judge_EditedPrior_Shifts()
    {
        var measured = new Dictionary<WaterTracer, double> { [WaterTracer.Sodium] = 50 };
        var edited = WaterSource.Defaults.Select(source => source.Name == "cooling tower" ? source with { Prior = 0.9 } : source).ToList();
        Assert.True(WaterOrigin.Judge(measured, edited)[1].Probability > WaterOrigin.Judge(measured, WaterSource.Defaults)[1].Probability);
    }

    [Fact]
    public void Judge_WithWorking_ExplainsEachTracerAndSource()
    {
        var working = new Working();
        WaterOrigin.Judge(Water(150, 200, 600, 0, 0.3, 1600), WaterSource.Defaults, null, working);
        Assert.Equal(6 + 6, working.Steps.Count);
        Calculators.Requests.ShowsItsWorking(working.Steps);
        Assert.Contains(working.Steps, step => step.Flag?.StartsWith("below detection", StringComparison.Ordinal) == true);
    }

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentException>(() => WaterOrigin.Posterior([0.5, 0.5], [1]));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterOrigin.Posterior([0.5, -0.5], [1, 1]));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterOrigin.Posterior([0, 0], [1, 1]));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterOrigin.Judge(Water(double.NaN, 1, 1, 1, 1, 1), WaterSource.Defaults));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterOrigin.Judge(Water(-1, 1, 1, 1, 1, 1), WaterSource.Defaults));
    }
}
