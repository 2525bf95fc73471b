using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class SeparatorScreenTests
{
    private const double Degree = Math.PI / 180;

    // Young–Laplace, 20 µm pore, recomputed apart from this code
    [Theory]
    [InlineData(0.045, 150, 7794.2)]
    [InlineData(0.03, 150, 5196.2)]
    [InlineData(0.015, 150, 2598.1)]
    [InlineData(0.005, 150, 866.0)]
    [InlineData(0.03, 120, 3000)]
    [InlineData(0.03, 30, 5196.2)]
    public void BreakthroughPa_Screen_IsTheTable(double tension, double angleDeg, double pressure) =>
        Checks.Within(pressure, SeparatorScreen.BreakthroughPa(tension, angleDeg * Degree, 20e-6), 0.05);

    [Property]
    public Property BreakthroughPa_AnglesMirrored_IsTheSame() => Prop.ForAll(Inputs.Between(0, 90), Inputs.Logarithmic(1e-6, 1e-3), (angle, pore) =>
        Math.Abs(SeparatorScreen.BreakthroughPa(0.03, angle * Degree, pore) - SeparatorScreen.BreakthroughPa(0.03, (180 - angle) * Degree, pore)) < 1e-9 / pore
        && SeparatorScreen.BreakthroughPa(0.03, angle * Degree, 2 * pore) <= SeparatorScreen.BreakthroughPa(0.03, angle * Degree, pore));

    [Theory]
    [InlineData(0, true)]
    [InlineData(89.9, true)]
    [InlineData(90, false)]
    [InlineData(150, false)]
    public void WaterWets_Angles_BelowNinety(double angleDeg, bool wets) => Assert.Equal(wets, SeparatorScreen.WaterWets(angleDeg * Degree));

    // Washburn 1921 (from memory): water of 1 mPa·s and 72 mN/m into 2 µm pores soaks √(0.072·1e-6·1/(2e-3)) = 6 mm in a second
    [Fact]
    public void WashburnDepthM_Water_IsTheRoot()
    {
        Checks.Near(6e-3, SeparatorScreen.WashburnDepthM(0.072, 0, 2e-6, 1e-3, 1), 1e-12);
        Assert.Equal(0, SeparatorScreen.WashburnDepthM(0.072, 2, 2e-6, 1e-3, 1));
    }

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => SeparatorScreen.BreakthroughPa(0, 2, 1e-5));
        Assert.Throws<ArgumentOutOfRangeException>(() => SeparatorScreen.BreakthroughPa(0.03, 4, 1e-5));
        Assert.Throws<ArgumentOutOfRangeException>(() => SeparatorScreen.BreakthroughPa(0.03, 2, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => SeparatorScreen.WaterWets(-0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => SeparatorScreen.WashburnDepthM(0.03, 1, 1e-6, 0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => SeparatorScreen.WashburnDepthM(0.03, 1, 1e-6, 1e-3, -1));
    }
}
