using Plant.Physics.Laboratory;

namespace Plant.Physics.Tests.Laboratory;

public sealed class BearingLifeTests
{
    public static TheoryData<double, double> Contents()
    {
        var rows = new TheoryData<double, double>();
        foreach (var (water, life) in Checks.Of("cantley").Pairs())
        {
            rows.Add(water, life);
        }

        return rows;
    }

    // Cantley 1977, (100/X)^0.6, recomputed apart from this code
    [Theory]
    [MemberData(nameof(Contents))]
    public void Relative_CheckContents_IsCantley(double waterPpm, double life) => Checks.Within(life, BearingLife.Relative(waterPpm), 6e-9);

    // Cantley 1977: each cut of the water by 75 % lengthens life by about 2.3; a published table gives 6 for a cut to a twentieth
    [Theory]
    [InlineData(4, 2.3)]
    [InlineData(20, 6)]
    public void Relative_LessWater_LivesLongerByThePublishedFactor(double cut, double factor) => Checks.Near(factor, BearingLife.Relative(400 / cut) / BearingLife.Relative(400), 0.01);

    [Property]
    public Property Relative_MoreWater_IsShorter() => Prop.ForAll(Inputs.Logarithmic(1, 1e5), water => BearingLife.Relative(water * 1.01) < BearingLife.Relative(water));

    [Theory]
    [InlineData(0)]
    [InlineData(-5)]
    [InlineData(double.NaN)]
    public void Relative_NotAContent_Throws(double waterPpm) => Assert.Throws<ArgumentOutOfRangeException>(() => BearingLife.Relative(waterPpm));
}
