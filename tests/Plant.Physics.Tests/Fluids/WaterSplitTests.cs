using Plant.Physics.Fluids;

namespace Plant.Physics.Tests.Fluids;

public sealed class WaterSplitTests
{
    // 150 mg/kg in transformer oil, curve of IEEE C57.106 (from memory), recomputed apart from this code: 61.68 % at 60 °C, 28.239 free at 40 °C, 94.523 free at 20 °C
    [Theory]
    [InlineData(60, 150, 0, 0.6168)]
    [InlineData(40, 121.761, 28.239, 1)]
    [InlineData(20, 55.477, 94.523, 1)]
    public void Compute_Example_Splits(double temperatureC, double dissolved, double undissolved, double activity)
    {
        var split = WaterSplit.Compute(Checks.MineralOil(), Checks.Kelvin(temperatureC), 150, 0);
        Checks.Within(dissolved, split.DissolvedPpm, 6e-4);
        Checks.Within(undissolved, split.UndissolvedPpm, 6e-4);
        Checks.Within(activity, split.WaterActivity, 6e-5);
        Assert.Equal(undissolved > 0 ? 1 : 0, split.ProbabilityFree);
    }

    // Φ of the standard normal distribution (any table)
    [Theory]
    [InlineData(-3, 0.0013498980316301)]
    [InlineData(-1, 0.1586552539314571)]
    [InlineData(0, 0.5)]
    [InlineData(1, 0.8413447460685429)]
    [InlineData(1.6448536269514722, 0.95)]
    [InlineData(3, 0.9986501019683699)]
    public void Compute_UncertainContent_ChanceIsNormal(double deviations, double expected)
    {
        var saturation = Checks.MineralOil().SaturationPpm(313.15);
        Checks.Within(expected, WaterSplit.Compute(Checks.MineralOil(), 313.15, saturation + (10 * deviations), 10).ProbabilityFree, 1e-12);
    }

    [Fact]
    public void Compute_ExactlySaturatedAndCertain_IsNotFree()
    {
        var saturation = Checks.MineralOil().SaturationPpm(313.15);
        var split = WaterSplit.Compute(Checks.MineralOil(), 313.15, saturation, 0);
        Assert.Equal(0, split.ProbabilityFree);
        Assert.Equal(1, split.WaterActivity);
        Assert.Equal(0, split.UndissolvedPpm);
    }

    [Property(MaxTest = 1000)]
    public Property Compute_AnyContent_ConservesWater() => Prop.ForAll(Inputs.Between(263, 370), Inputs.Logarithmic(0.1, 1e5), Inputs.Between(0, 100), (temperature, water, uncertainty) =>
    {
        var split = WaterSplit.Compute(Checks.MineralOil(), temperature, water, uncertainty);
        return Math.Abs(split.DissolvedPpm + split.UndissolvedPpm - water) <= 1e-12 * water
            && split.DissolvedPpm <= split.SaturationPpm && split.UndissolvedPpm >= 0
            && split.WaterActivity is >= 0 and <= 1 && split.ProbabilityFree is >= 0 and <= 1;
    });

    [Property]
    public Property Compute_Colder_NeverDissolvesMore() => Prop.ForAll(Inputs.Between(263, 370), Inputs.Logarithmic(1, 1e4), Inputs.Between(0.1, 50), (temperature, water, uncertainty) =>
    {
        var warm = WaterSplit.Compute(Checks.MineralOil(), temperature + 5, water, uncertainty);
        var cold = WaterSplit.Compute(Checks.MineralOil(), temperature, water, uncertainty);
        return cold.DissolvedPpm <= warm.DissolvedPpm && cold.ProbabilityFree >= warm.ProbabilityFree;
    });

    [Fact]
    public void Compute_SolubleFluid_Throws() =>
        Assert.Throws<InvalidOperationException>(() => WaterSplit.Compute(Checks.Fluid(new FluidSheet { Family = FluidFamily.Pag }), 313.15, 100, 10));

    [Theory]
    [InlineData(double.NaN, 100, 10)]
    [InlineData(313.15, double.NaN, 10)]
    [InlineData(313.15, -1, 10)]
    [InlineData(313.15, 100, double.NaN)]
    [InlineData(313.15, 100, -1)]
    public void Compute_BadArgument_Throws(double temperatureK, double waterPpm, double uncertaintyPpm) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterSplit.Compute(Checks.MineralOil(), temperatureK, waterPpm, uncertaintyPpm));

    [Fact]
    public void Compute_NearSaturation_FlagsTheStraightLine()
    {
        var working = new Working();
        WaterSplit.Compute(Checks.MineralOil(), 313.15, 118, 5, working);
        Assert.NotNull(working.Steps.Single(step => step.Name == "water activity").Flag);
        Assert.Equal(5, working.Steps.Count);
    }
}
