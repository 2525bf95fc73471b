using Plant.Physics.Fluids;
using Plant.Physics.Separators;
using Plant.Physics.Water;

namespace Plant.Physics.Tests.Separators;

public sealed class PurgeAirTests
{
    // air of 30 °C and 80 %: 0.0242823 kg/m³, recomputed apart from this code with IF97
    [Fact]
    public void VapourDensityKgM3_HumidAir_IsTheTable() =>
        Checks.Near(0.0242823, PurgeAir.VapourDensityKgM3(Checks.Kelvin(30), Headspace.WaterPressurePa(Checks.Kelvin(30), 0.8)), 1e-4);

    [Property]
    public Property FlowM3S_AnyWater_IsTheInverse() => Prop.ForAll(Inputs.Logarithmic(1e-9, 1e-2), Inputs.Between(280, 370), (water, temperature) =>
    {
        var flow = PurgeAir.FlowM3S(water, temperature, WaterProperties.VapourPressurePa(temperature), 100)!.Value;
        return Math.Abs(PurgeAir.RemovalKgS(flow, temperature, WaterProperties.VapourPressurePa(temperature), 100) - water) < 1e-12 * water;
    });

    [Fact]
    public void Purge_WetAir_BringsWaterAndCannotDry()
    {
        Assert.True(PurgeAir.RemovalKgS(1, 300, 100, 200) < 0);
        Assert.Null(PurgeAir.FlowM3S(1e-3, 300, 100, 200));
        Assert.Throws<ArgumentOutOfRangeException>(() => PurgeAir.RemovalKgS(-1, 300, 100, 50));
        Assert.Throws<ArgumentOutOfRangeException>(() => PurgeAir.VapourDensityKgM3(300, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => PurgeAir.FlowM3S(double.NaN, 300, 200, 50));
    }
}
