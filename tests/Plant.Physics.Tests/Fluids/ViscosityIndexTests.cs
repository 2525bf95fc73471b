using Plant.Physics.Fluids;

namespace Plant.Physics.Tests.Fluids;

public sealed class ViscosityIndexTests
{
    public static TheoryData<double, double, double> Oils()
    {
        var rows = new TheoryData<double, double, double>();
        foreach (var row in Checks.Of("vi").EnumerateArray())
        {
            rows.Add(row.Number("nu40"), row.Number("nu100"), row.Number("vi"));
        }

        return rows;
    }

    // ASTM D2270, among them its worked examples (92, 156, 111). L and H below 70 mm²/s are a fit, good to 0.3 in the index
    [Theory]
    [MemberData(nameof(Oils))]
    public void Of_CheckOils_IsD2270(double viscosity40, double viscosity100, double expected) =>
        Checks.Within(expected, Assert.NotNull(ViscosityIndex.Of(viscosity40, viscosity100)), 0.3);

    // entries of the table of ASTM D2270 (from memory)
    [Theory]
    [InlineData(2.0, 7.994, 6.394)]
    [InlineData(5.0, 40.23, 28.49)]
    [InlineData(10, 147.7, 82.87)]
    [InlineData(20, 493.2, 229.5)]
    [InlineData(40, 1730, 651.8)]
    [InlineData(70, 4905, 1558)]
    public void LimitsMm2S_TableEntries_AgreeWithinATenthOfAPercent(double viscosity100, double l, double h)
    {
        var limits = ViscosityIndex.LimitsMm2S(viscosity100);
        Checks.Near(l, limits.L, 1e-3);
        Checks.Near(h, limits.H, 1e-3);
    }

    // ASTM D2270, equations above 70 mm²/s at 100 °C: L 9604, H 2772 at 100
    [Fact]
    public void LimitsMm2S_Above70_IsTheStandardsEquation()
    {
        var (l, h) = ViscosityIndex.LimitsMm2S(100);
        Checks.Within(9604, l, 1e-9);
        Checks.Within(2772, h, 1e-9);
    }

    [Theory]
    [InlineData(1.99)]
    [InlineData(0.5)]
    public void Of_Below2AtHundred_IsNull(double viscosity100) => Assert.Null(ViscosityIndex.Of(6, viscosity100));

    [Fact]
    public void Of_AtTheLimits_Is0And100()
    {
        var (l, h) = ViscosityIndex.LimitsMm2S(8);
        Checks.Within(0, Assert.NotNull(ViscosityIndex.Of(l, 8)), 1e-9);
        Checks.Within(100, Assert.NotNull(ViscosityIndex.Of(h, 8)), 1e-9);
    }

    [Property]
    public Property Of_AroundHundred_IsContinuous() => Prop.ForAll(Inputs.Between(2.1, 120), viscosity100 =>
    {
        var (_, h) = ViscosityIndex.LimitsMm2S(viscosity100);
        return Math.Abs(ViscosityIndex.Of(h * (1 + 1e-9), viscosity100)!.Value - ViscosityIndex.Of(h * (1 - 1e-9), viscosity100)!.Value) < 1e-4;
    });

    [Property]
    public Property Of_ThickerAt40_IsLower() => Prop.ForAll(Inputs.Between(2.1, 100), Inputs.Between(1.5, 15), (viscosity100, ratio) =>
        ViscosityIndex.Of(viscosity100 * ratio * 1.01, viscosity100) < ViscosityIndex.Of(viscosity100 * ratio, viscosity100));

    [Property]
    public Property LimitsMm2S_Thicker_Rise() => Prop.ForAll(Inputs.Between(2, 200), viscosity100 =>
    {
        var thin = ViscosityIndex.LimitsMm2S(viscosity100);
        var thick = ViscosityIndex.LimitsMm2S(viscosity100 * 1.01);
        return thick.L > thin.L && thick.H > thin.H && thin.L > thin.H;
    });

    [Theory]
    [InlineData(double.NaN, 6.8)]
    [InlineData(46, double.NaN)]
    [InlineData(-1, 6.8)]
    public void Of_NotAViscosity_Throws(double viscosity40, double viscosity100) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ViscosityIndex.Of(viscosity40, viscosity100));
}
