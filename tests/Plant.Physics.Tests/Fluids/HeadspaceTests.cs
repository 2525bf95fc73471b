using Plant.Physics.Fluids;
using Plant.Physics.Water;

namespace Plant.Physics.Tests.Fluids;

public sealed class HeadspaceTests
{
    // equal activity with Wagner and Pruß's vapour pressure, recomputed apart from this code
    [Theory]
    [InlineData(25, 25, 0.60, 1901.89, 0.600000, 40.9173, 654.341)]
    [InlineData(50, 25, 0.60, 1901.89, 0.153969, 26.7788, 252.679)]
    [InlineData(60, 30, 0.80, 3397.54, 0.170325, 41.4182, 323.556)]
    [InlineData(80, 20, 0.50, 1169.60, 0.024667, 11.0766, 61.2434)]
    public void EquilibriumPpm_OilUnderAir_IsTheTable(double oilC, double airC, double humidity, double pressure, double activity, double mineral, double natural)
    {
        var waterPressure = Headspace.WaterPressurePa(Checks.Kelvin(airC), humidity);
        Checks.Within(pressure, waterPressure, 0.006);
        Checks.Within(activity, Headspace.EquilibriumActivity(Checks.Kelvin(oilC), waterPressure), 1e-6);
        Checks.Near(mineral, Headspace.EquilibriumPpm(Checks.MineralOil(), Checks.Kelvin(oilC), waterPressure), 2e-5);
        Checks.Near(natural, Headspace.EquilibriumPpm(Checks.Fluid(new FluidSheet { Family = FluidFamily.NaturalEster }), Checks.Kelvin(oilC), waterPressure), 2e-5);
    }

    // Henry's constant S/psat of transformer oil, recomputed apart from this code
    [Theory]
    [InlineData(20, 0.0237163)]
    [InlineData(40, 0.0164874)]
    [InlineData(60, 0.0121907)]
    [InlineData(80, 0.00947042)]
    public void EquilibriumPpm_OnePascal_IsHenrysConstant(double temperatureC, double constant) =>
        Checks.Near(constant, Headspace.EquilibriumPpm(Checks.MineralOil(), Checks.Kelvin(temperatureC), 1), 5e-6);

    // 38.744 % relative humidity is a dew point of 10 °C in air of 25 °C, recomputed apart from this code
    [Fact]
    public void DewPointK_HumidAir_IsTheDewPoint() => Checks.Within(283.15, Headspace.DewPointK(Headspace.WaterPressurePa(298.15, 0.38744)), 2e-4);

    [Property]
    public Property DewPointK_OfSaturatedAir_IsItsTemperature() => Prop.ForAll(Inputs.Between(275, 420), temperature =>
        Math.Abs(Headspace.DewPointK(WaterProperties.VapourPressurePa(temperature)) - temperature) < 1e-8);

    [Property]
    public Property EquilibriumPpm_SameAirWarmerOil_HoldsLess() => Prop.ForAll(Inputs.Between(280, 360), Inputs.Between(100, 900), (temperature, pressure) =>
        Headspace.EquilibriumPpm(Checks.MineralOil(), temperature + 1, pressure) < Headspace.EquilibriumPpm(Checks.MineralOil(), temperature, pressure));

    [Fact]
    public void EquilibriumActivity_MoreThanSaturated_IsOne() => Assert.Equal(1, Headspace.EquilibriumActivity(293.15, 5000));

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Headspace.WaterPressurePa(298.15, 1.2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Headspace.WaterPressurePa(double.NaN, 0.5));
        Assert.Throws<ArgumentOutOfRangeException>(() => Headspace.EquilibriumActivity(298.15, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Headspace.EquilibriumPpm(Checks.MineralOil(), double.NaN, 100));
        Assert.Throws<ArgumentOutOfRangeException>(() => Headspace.DewPointK(0));
    }
}
