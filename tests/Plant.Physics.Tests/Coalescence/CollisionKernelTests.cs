using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Coalescence;

public sealed class CollisionKernelTests
{
    private static readonly CollisionKernel Oil = new() { TemperatureK = 313.15, ViscosityPaS = 0.0391, DensityDifferenceKgM3 = 142.2, ShearRatePerS = 10, Efficiency = 0.1 };

    // a tenth of 5.3076e-19 + 3.6e-13 + 1.3445e-14
    [Fact]
    public void RateM3S_TestOil_IsTheSum() => Checks.Near(0.1 * (5.3076e-19 + 3.6e-13 + 1.3445e-14), Oil.RateM3S(10e-6, 50e-6), 1e-5);

    [Fact]
    public void SpeedMS_FloatingWater_IsNotNegative()
    {
        Checks.Near(1.981395e-7, Oil.SpeedMS(10e-6), 1e-6);
        Assert.Equal(Oil.SpeedMS(10e-6), (Oil with { DensityDifferenceKgM3 = -142.2 }).SpeedMS(10e-6));
    }

    [Property]
    public Property FieldFactor_StrongerField_IsLarger() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-3), Inputs.Logarithmic(1e3, 1e6), (size, field) =>
        Oil.FieldFactor(size) == 1 && (Oil with { FieldVM = field }).FieldFactor(size) > 1
        && Math.Abs(((Oil with { FieldVM = 2 * field }).FieldFactor(size) - 1) / ((Oil with { FieldVM = field }).FieldFactor(size) - 1) - 4) < 1e-3);

    [Fact]
    public void RateM3S_BadEfficiency_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => (Oil with { Efficiency = 1.5 }).RateM3S(1e-6, 1e-6));

    [Fact]
    public void RateM3S_TimesAnEfficiencyOfTheSizes_IsAKernelToo()
    {
        // any efficiency that depends on the sizes is a function over the kernel
        double Kernel(double a, double b) => (Oil with { Efficiency = 1 }).RateM3S(a, b) * CollisionEfficiency.CoulaloglouTavlarides(a, b, new TurbulentOil(0.0391, 850, 0.03, 1, 0.01));
        var result = new PopulationBalance(new VolumeGrid(60), new PopulationBalanceSetup { KernelM3S = Kernel, SettlingMS = Oil.SpeedMS, DepthM = 0.5 })
            .Solve(LognormalDistribution.ByVolume(20e-6, 1.8), 1e-3, [3600]);
        Assert.True(result.Complete && result.States[0].NumberPerM3 > 0);
    }
}
