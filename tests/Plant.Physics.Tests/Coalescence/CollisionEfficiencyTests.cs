using Plant.Physics.Coalescence;

namespace Plant.Physics.Tests.Coalescence;

public sealed class CollisionEfficiencyTests
{
    private static readonly TurbulentOil Oil = new(0.0391, 850, 0.03, 1, 0.01);

    // 50 and 100 µm: the constant per cm² and the same number taken per m², recomputed apart from this code
    [Theory]
    [InlineData(1.83e13, 0.444966)]
    [InlineData(1.83e9, 0.999919)]
    public void CoulaloglouTavlarides_UnitsOfTheConstant_AreToldApart(double constant, double efficiency) =>
        Checks.Within(efficiency, CollisionEfficiency.CoulaloglouTavlarides(50e-6, 100e-6, Oil, constant), 1e-6);

    [Fact]
    public void CoulaloglouTavlarides_ByDefault_TakesThePapersUnit() => Checks.Within(0.444966, CollisionEfficiency.CoulaloglouTavlarides(50e-6, 100e-6, Oil), 1e-6);

    // A 4e-21 J, radii 5 µm, gap 10 nm
    [Fact]
    public void VanDerWaalsN_Example_IsTheValue() => Checks.Near(1.66667e-11 / 100, CollisionEfficiency.VanDerWaalsN(10e-6, 10e-6, 100e-9), 1e-5);

    // by hand: 3·0.04·(1e-5)²·1e-9/(16π·0.03²·(1e-8)²) = 2.6526e-3 s; π·1e-3·√1e-9/(2e-8)·(1e-5/(4π·0.03))^1.5 = 6.786e-7 s
    [Fact]
    public void DrainageTimes_Example_AreTheFormula()
    {
        Checks.Near(2.6526e-3, CollisionEfficiency.ImmobileDrainageS(0.04, 1e-5, 1e-9, 0.03, 1e-8), 1e-4);
        Checks.Near(6.786e-7, CollisionEfficiency.MobileDrainageS(1e-3, 1e-5, 1e-9, 0.03, 1e-8), 1e-3);
        Checks.Near(Math.Exp(-2), CollisionEfficiency.FilmDrainage(2, 1), 1e-14);
    }

    // at the critical thickness A·R/(8πσh³) is 1
    [Fact]
    public void CriticalFilmM_InItsDefinition_IsOne()
    {
        var film = CollisionEfficiency.CriticalFilmM(1e-5, 0.03);
        Checks.Near(1, 4e-21 * 1e-5 / (8 * Math.PI * 0.03 * film * film * film), 1e-12);
    }

    [Theory]
    [InlineData(null, null, 0.1)]
    [InlineData(10.0, 0.045, 0.1)]
    [InlineData(37.5, null, 0.01)]
    [InlineData(60.0, 0.045, 0.001)]
    [InlineData(15.0, 0.025, 0.0333333)]
    [InlineData(1000.0, 0.001, 1.11111e-5)]
    public void Prior_Oils_AreTheRule(double? minutes, double? tension, double expected) => Checks.Near(expected, CollisionEfficiency.Prior(minutes, tension), 1e-5);

    [Fact]
    public void Prior_Working_SaysThatItIsJudgement()
    {
        var working = new Working();
        CollisionEfficiency.Prior(30, null, working);
        var step = Assert.Single(working.Steps);
        Assert.Contains("judgement", step.Source, StringComparison.Ordinal);
        Assert.NotNull(step.Flag);
    }

    [Property]
    public Property Prior_SlowerOrWeakerOil_IsNotHigher() => Prop.ForAll(Inputs.Between(0, 120), Inputs.Between(0.002, 0.06), (minutes, tension) =>
    {
        var here = CollisionEfficiency.Prior(minutes, tension);
        return here is > 0 and <= 0.1 && CollisionEfficiency.Prior(minutes + 5, tension) <= here && CollisionEfficiency.Prior(minutes, tension * 0.9) <= here;
    });

    [Property]
    public Property CoulaloglouTavlarides_LargerDrops_AreLessEfficient() => Prop.ForAll(Inputs.Logarithmic(1e-6, 3e-4), Inputs.Logarithmic(1e-6, 3e-4), (a, b) =>
    {
        var here = CollisionEfficiency.CoulaloglouTavlarides(a, b, Oil);
        return here is >= 0 and <= 1 && CollisionEfficiency.CoulaloglouTavlarides(a * 1.2, b, Oil) <= here && Math.Abs(here - CollisionEfficiency.CoulaloglouTavlarides(b, a, Oil)) < 1e-12;
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.FilmDrainage(-1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.FilmDrainage(1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.ImmobileDrainageS(0.04, 1e-5, 1e-9, 0.03, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.MobileDrainageS(1e-3, double.NaN, 1e-9, 0.03, 1e-8));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.CriticalFilmM(1e-5, -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.VanDerWaalsN(1e-5, 1e-5, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.CoulaloglouTavlarides(0, 1e-5, Oil));
        Assert.Throws<ArgumentNullException>(() => CollisionEfficiency.CoulaloglouTavlarides(1e-5, 1e-5, null!));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.Prior(double.NaN, null));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionEfficiency.Prior(null, 0));
    }
}
