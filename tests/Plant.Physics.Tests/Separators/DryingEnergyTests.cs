using Plant.Physics.Separators;
using Plant.Physics.Water;

namespace Plant.Physics.Tests.Separators;

public sealed class DryingEnergyTests
{
    // linear latent heat: 2.35934 MJ/kg at 60 °C; steam tables (from memory) 2.5009, 2.4535, 2.3577, 2.2564 MJ/kg
    [Theory]
    [InlineData(60, 2.35934e6, 1e-9)]
    [InlineData(0, 2.5009e6, 1e-3)]
    [InlineData(20, 2.4535e6, 1e-3)]
    [InlineData(60, 2.3577e6, 1e-3)]
    [InlineData(100, 2.2564e6, 4e-3)]
    public void LatentHeatJKg_Temperatures_AreTheTables(double temperatureC, double expected, double relative) =>
        Checks.Near(expected, DryingEnergy.LatentHeatJKg(Checks.Kelvin(temperatureC)), relative);

    // Clausius and Clapeyron with the vapour pressure of the other formula: two ways to the same heat, but for the gas law's 1 %
    [Property]
    public Property LatentHeatJKg_AgainstTheSlopeOfTheVapourPressure_Agrees() => Prop.ForAll(Inputs.Between(275, 370), t =>
    {
        var slope = Math.Log(WaterProperties.VapourPressurePa(t + 0.01) / WaterProperties.VapourPressurePa(t - 0.01)) / 0.02;
        return Math.Abs((Constants.WaterVapourJKgK * t * t * slope / DryingEnergy.LatentHeatJKg(t)) - 1) < 0.02;
    });

    // 4250 kg by 20 K at 1950 J/(kg·K): 46.04 kWh; 1000 mg/kg evaporated at 60 °C cools 1.2099 K; recomputed apart from this code
    [Fact]
    public void Heat_Examples_AreTheTable()
    {
        Checks.Near(46.04, DryingEnergy.HeatJ(4250, 1950, 20, 0, Checks.Kelvin(60)) / 3.6e6, 1e-4);
        Checks.Near(0.6554, DryingEnergy.HeatJ(0, 1950, 0, 1, Checks.Kelvin(60)) / 3.6e6, 1e-4);
        Checks.Near(1.2099, DryingEnergy.SelfCoolingK(1000, 1950, Checks.Kelvin(60)), 1e-4);
    }

    // Cragoe 1929 (from memory): oil of 870 kg/m³ near 1.95 kJ/(kg·K) at 40 °C
    [Fact]
    public void OilSpecificHeatJKgK_TurbineOil_IsNearTheHandbook() => Checks.Near(1950, DryingEnergy.OilSpecificHeatJKgK(870, Checks.Kelvin(40)), 0.01);

    [Fact]
    public void Power_Examples_AreTheDefinitions()
    {
        Checks.Near(1000, DryingEnergy.PumpPowerW(1e-3, 5e5, 0.5), 1e-12);
        Checks.Near(1000 * Math.Log(50) / 0.4, DryingEnergy.VacuumPumpPowerW(0.5, 2000, 1e5, 0.4), 1e-12);
        Assert.Equal(0, DryingEnergy.VacuumPumpPowerW(0.5, 2000, 2000, 0.4));
    }

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.LatentHeatJKg(500));
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.OilSpecificHeatJKgK(0, 300));
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.HeatJ(-1, 1950, 20, 0, 300));
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.SelfCoolingK(1, 0, 300));
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.PumpPowerW(1, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.PumpPowerW(1, 1, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => DryingEnergy.VacuumPumpPowerW(1, 2000, 1000, 0.5));
    }
}
