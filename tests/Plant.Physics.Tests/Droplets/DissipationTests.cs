using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Droplets;

public sealed class DissipationTests
{
    // f 0.03, 2 m/s, 50 mm
    [Fact]
    public void PipeWKg_Example_IsTheValue() => Checks.Near(2.4, Dissipation.PipeWKg(0.03, 2, 0.05), 1e-12);

    // 5 bar, 1 L/s, 0.1 L
    [Fact]
    public void ValveWKg_Example_IsTheValue() => Checks.Near(5882.353, Dissipation.ValveWKg(5e5, 1e-3, 850, 1e-4), 1e-6);

    // a pump of efficiency one half loses as much as it gives
    [Fact]
    public void PumpWKg_HalfEfficiency_IsAValveOfTheSamePressure() => Checks.Near(Dissipation.ValveWKg(5e5, 1e-3, 850, 1e-4), Dissipation.PumpWKg(5e5, 1e-3, 0.5, 850, 1e-4), 1e-12);

    [Fact]
    public void PumpWKg_NoLoss_IsZero() => Assert.Equal(0, Dissipation.PumpWKg(5e5, 1e-3, 1, 850, 1e-4));

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Dissipation.PipeWKg(0.03, double.NaN, 0.05));
        Assert.Throws<ArgumentOutOfRangeException>(() => Dissipation.PipeWKg(0.03, 2, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Dissipation.ValveWKg(-1, 1e-3, 850, 1e-4));
        Assert.Throws<ArgumentOutOfRangeException>(() => Dissipation.PumpWKg(5e5, 1e-3, 0, 850, 1e-4));
        Assert.Throws<ArgumentOutOfRangeException>(() => Dissipation.PumpWKg(5e5, 1e-3, 0.5, 850, double.NaN));
    }
}
