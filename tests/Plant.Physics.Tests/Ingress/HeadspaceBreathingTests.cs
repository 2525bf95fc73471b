using Plant.Physics.Fluids;
using Plant.Physics.Ingress;

namespace Plant.Physics.Tests.Ingress;

public sealed class HeadspaceBreathingTests
{
    // headspace 2 m³ between 15 and 35 °C, air of 15 °C and 80 %: with and without 10 m³ of oil; recomputed apart from this code
    [Theory]
    [InlineData(0, 0.129807, 1.33196)]
    [InlineData(10, 0.279807, 2.87111)]
    public void Cycle_Example_IsTheTable(double oil, double air, double grams)
    {
        var volume = HeadspaceBreathing.CycleM3(2, oil, Checks.Kelvin(15), Checks.Kelvin(35), 7.5e-4);
        Checks.Near(air, volume, 2e-6);
        Checks.Near(grams, HeadspaceBreathing.WaterKg(volume, Checks.Kelvin(15), 0.8) * 1000, 1e-4);
    }

    [Property]
    public Property CycleM3_WiderCycle_BreathesMore() => Prop.ForAll(Inputs.Between(0, 30), swing =>
        HeadspaceBreathing.CycleM3(2, 5, 280, 280 + swing + 1, 7e-4) > HeadspaceBreathing.CycleM3(2, 5, 280, 280 + swing, 7e-4) && HeadspaceBreathing.CycleM3(2, 5, 280, 280, 7e-4) == 0);

    // Lewis relation (from memory): at 5 W/(m²·K) air moves 4.6 mm/s of vapour; air of 30 °C and 80 % on a wall of 10 °C gives 0.0149 kg/m³ more than the wall holds
    [Fact]
    public void CondensationKgS_ColdWall_IsTheLewisRelation()
    {
        var water = Headspace.WaterPressurePa(Checks.Kelvin(30), 0.8);
        Checks.Near(4.7e-3 * (0.02428 - 0.00940), HeadspaceBreathing.CondensationKgS(1, 5, Checks.Kelvin(30), water, Checks.Kelvin(10)), 0.02);
    }

    [Property]
    public Property CondensationKgS_WallAboveTheDewPoint_IsNone() => Prop.ForAll(Inputs.Between(280, 310), Inputs.Between(0.1, 0.95), (air, humidity) =>
    {
        var water = Headspace.WaterPressurePa(air, humidity);
        var dew = Headspace.DewPointK(water);
        return HeadspaceBreathing.CondensationKgS(3, 5, air, water, dew + 0.01) == 0
            && HeadspaceBreathing.CondensationKgS(3, 5, air, water, dew - 6) > HeadspaceBreathing.CondensationKgS(3, 5, air, water, dew - 5);
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => HeadspaceBreathing.CycleM3(2, 1, 300, 290, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => HeadspaceBreathing.CycleM3(double.NaN, 1, 280, 290, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => HeadspaceBreathing.WaterKg(1, 290, 80));
        Assert.Throws<ArgumentOutOfRangeException>(() => HeadspaceBreathing.CondensationKgS(-1, 5, 300, 1000, 280));
        Assert.Throws<ArgumentOutOfRangeException>(() => HeadspaceBreathing.CondensationKgS(1, double.NaN, 300, 1000, 280));
    }
}
