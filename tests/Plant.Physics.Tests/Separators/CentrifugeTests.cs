using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class CentrifugeTests
{
    private const double Rpm = 2 * Math.PI / 60;
    // the published examples take 9.81 m/s²
    private const double TextbookGravity = 9.81 / Constants.GravityMS2;
    private const double Degree = Math.PI / 180;

    // published tubular bowl: 1055 rpm, 25.5 mm, 15.5 mm of liquid, 102.5 mm long: 31.75 g and 0.2358 m² (with π = 3.1428; exactly 0.235509)
    [Fact]
    public void TubularM2_PublishedBowl_IsTheArea()
    {
        Checks.Near(31.7517, Centrifuge.AccelerationRatio(1055 * Rpm, 25.5e-3), 1e-3);
        Checks.Near(0.235509 * TextbookGravity, Centrifuge.TubularM2(102.5e-3, 1055 * Rpm, 25.5e-3, 10e-3), 3e-6);
    }

    // 100 discs, 7000 rpm, 0.13 and 0.06 m, 40°: 27093.3 m², recomputed apart from this code
    [Fact]
    public void DiscStackM2_Example_IsTheTable() => Checks.Near(27_093.3, Centrifuge.DiscStackM2(100, 7000 * Rpm, 0.13, 0.06, 40 * Degree), 3e-6);

    // textbook scale-up: 25 discs of 1 to 5 cm at 35° and 3000 rpm take 3.5 L/min; 55 discs of 2.35 to 7.5 cm at 45° take 80 L/min at 6363.7 rpm
    [Fact]
    public void DiscStackM2_ScaleUp_IsTheSpeed()
    {
        var small = Centrifuge.DiscStackM2(25, 3000 * Rpm, 0.05, 0.01, 35 * Degree);
        Checks.Near(93.288 * TextbookGravity, small, 2e-5);
        var perSpeedSquared = Centrifuge.DiscStackM2(55, 1, 0.075, 0.0235, 45 * Degree);
        Checks.Near(6363.7, Math.Sqrt(small * 80 / 3.5 / perSpeedSquared) / Rpm, 1e-5);
    }

    // the same disc stack at 2 m³/h on oil of 0.0391 Pa·s and 142.2 kg/m³: 3.217 µm
    [Fact]
    public void CutSizeM_Example_IsTheTable() => Checks.Near(3.217e-6, Assert.NotNull(Centrifuge.CutSizeM(2.0 / 3600, 27_093.3, 142.2, 0.0391)), 2e-4);

    [Property]
    public Property CutSizeM_AtTheSize_SettlesAtFlowOverArea() => Prop.ForAll(Inputs.Logarithmic(1e-5, 1e-2), Inputs.Logarithmic(1, 1e5), Inputs.Between(6, 250), (flow, area, difference) =>
    {
        var d = Centrifuge.CutSizeM(flow, area, -difference, 0.05)!.Value;
        return Math.Abs((Physics.Droplets.Settling.StokesMS(d, difference, 0.05) * area / flow) - 1) < 1e-9 && Centrifuge.Removal(d, d) == 1 && Math.Abs(Centrifuge.Removal(d / 2, d) - 0.25) < 1e-12;
    });

    [Fact]
    public void CutSizeM_EqualDensity_HasNone() => Assert.Null(Centrifuge.CutSizeM(1e-3, 1e4, 4.9, 0.05));

    [Fact]
    public void TubularM2_ThinLayer_IsAWallTimesItsAcceleration() =>
        Checks.Near(2 * Math.PI * 0.1 * 0.3 * Centrifuge.AccelerationRatio(100, 0.1), Centrifuge.TubularM2(0.3, 100, 0.1, 0.1 * (1 - 1e-7)), 1e-6);

    // 992.2 on 850 kg/m³, overflows at 60 and 50 mm
    [Fact]
    public void InterfaceM_Example_IsWhereThePressuresMeet()
    {
        Checks.Near(0.100872, Assert.NotNull(Centrifuge.InterfaceM(992.2, 0.060, 850, 0.050)), 1e-5);
        Assert.Null(Centrifuge.InterfaceM(992.2, 0.060, 990, 0.050));
        Assert.Null(Centrifuge.InterfaceM(992.2, 0.040, 850, 0.050));
        Assert.Null(Centrifuge.InterfaceM(983, 0.060, 1005, 0.050));
    }

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.AccelerationRatio(double.NaN, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.DiscStackM2(10, 1, 0.1, 0.2, 0.7));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.DiscStackM2(10, 1, 0.2, 0.1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.DiscStackM2(10, 1, 0.2, 0.1, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.TubularM2(1, 1, 0.1, 0.2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.CutSizeM(1, 0, 100, 0.05));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.CutSizeM(1, 1, double.NaN, 0.05));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.Removal(1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Centrifuge.InterfaceM(double.NaN, 1, 1, 1));
    }
}
