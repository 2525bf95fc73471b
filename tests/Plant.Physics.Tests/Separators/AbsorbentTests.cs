using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class AbsorbentTests
{
    // published: 500 times its mass of distilled water, about 50 times of 0.9 % salt
    [Theory]
    [InlineData(0, 500)]
    [InlineData(0.009, 50)]
    public void SwellingRatio_PublishedPoints_AreMet(double salt, double ratio) => Checks.Near(ratio, Absorbent.SwellingRatio(salt), 1e-12);

    [Property]
    public Property SwellingRatio_MoreSalt_IsLess() => Prop.ForAll(Inputs.Between(0, 0.1), salt => Absorbent.SwellingRatio(salt + 0.001) < Absorbent.SwellingRatio(salt));

    [Fact]
    public void CapacityAndLife_Examples_AreProducts()
    {
        Checks.Near(250, Absorbent.CapacityKg(0.5, 0), 1e-12);
        Checks.Near(0.6, Absorbent.BreatherCapacityKg(2), 1e-12);
        Checks.Near(200 * 86_400, Absorbent.LifeS(0.6, 0.003 / 86_400), 1e-12);
        Assert.Throws<ArgumentOutOfRangeException>(() => Absorbent.SwellingRatio(-0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Absorbent.CapacityKg(double.NaN, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Absorbent.BreatherCapacityKg(1, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Absorbent.LifeS(1, 0));
    }
}
