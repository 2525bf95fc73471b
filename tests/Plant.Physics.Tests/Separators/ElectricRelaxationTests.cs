using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class ElectricRelaxationTests
{
    // ε/σ at εr 2.2, recomputed apart from this code
    [Theory]
    [InlineData(1e-12, 19.479)]
    [InlineData(1e-10, 0.19479)]
    [InlineData(1e-8, 1.948e-3)]
    [InlineData(1e-6, 1.948e-5)]
    public void LiquidS_Conductivities_IsTheTable(double conductivity, double time) => Checks.Near(time, ElectricRelaxation.LiquidS(2.2, conductivity), 5e-5);

    // water of 5 mS/m and εr 78 in oil of 2.2: 0.1459 µs, recomputed apart from this code; hence a conductor at mains frequency
    [Fact]
    public void DropS_Water_IsTheTable()
    {
        Checks.Near(1.459e-7, ElectricRelaxation.DropS(78, 5e-3, 2.2, 1e-12), 5e-4);
        Assert.True(ElectricRelaxation.CornerHz(ElectricRelaxation.DropS(78, 5e-3, 2.2, 1e-12)) > 1e5);
    }

    // 1 mm of εr 2.1 on 20 mm of oil of εr 2.2, recomputed apart from this code
    [Theory]
    [InlineData(1e-9, 0.39136, 0.4067)]
    [InlineData(5e-8, 0.0078272, 20.33)]
    public void InsulatedElectrodeS_Layers_IsTheTable(double conductivity, double time, double frequency)
    {
        var tau = ElectricRelaxation.InsulatedElectrodeS(2.1, 1e-3, 2.2, 20e-3, conductivity);
        Checks.Near(time, tau, 2e-5);
        Checks.Near(frequency, ElectricRelaxation.CornerHz(tau), 2e-4);
    }

    [Property]
    public Property DropS_MoreConductiveWater_IsFaster() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1), sigma =>
        ElectricRelaxation.DropS(78, sigma * 1.1, 2.2, 1e-12) < ElectricRelaxation.DropS(78, sigma, 2.2, 1e-12));

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectricRelaxation.LiquidS(2, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectricRelaxation.DropS(78, 0, 2, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectricRelaxation.DropS(78, -1, 2, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectricRelaxation.InsulatedElectrodeS(2, 0, 2, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectricRelaxation.CornerHz(double.NaN));
    }
}
