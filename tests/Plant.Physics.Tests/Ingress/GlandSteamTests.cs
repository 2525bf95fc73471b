using Plant.Physics.Ingress;

namespace Plant.Physics.Tests.Ingress;

public sealed class GlandSteamTests
{
    // Martin 1908 (from memory), by hand: 1 cm², 1.2 bar, 400 K to 1 bar over 5 teeth; ρ0 = 0.650 kg/m³, 1 − β² = 0.30556, n − ln β = 5.18232
    [Fact]
    public void LabyrinthKgS_Example_IsMartinsFormula() => Checks.Near(1e-4 * Math.Sqrt(1.2e5 * 0.65002 * 0.305556 / 5.182322), GlandSteam.LabyrinthKgS(1e-4, 1.2e5, 400, 1e5, 5), 1e-5);

    // one tooth and a small difference is a hole without contraction: A·√(2ρΔp)
    [Fact]
    public void LabyrinthKgS_OneToothSmallDifference_IsBernoulli()
    {
        var density = 1e5 / (Constants.WaterVapourJKgK * 400);
        Checks.Near(1e-4 * Math.Sqrt(2 * density * 10), GlandSteam.LabyrinthKgS(1e-4, 1e5, 400, 1e5 - 10, 1), 2e-4);
    }

    [Property]
    public Property LabyrinthKgS_MoreTeethOrLessPressure_LeaksLess() => Prop.ForAll(Inputs.Between(1, 30), Inputs.Between(1.05e5, 3e5), (teeth, pressure) =>
        GlandSteam.LabyrinthKgS(1e-4, pressure, 420, 1e5, teeth + 1) < GlandSteam.LabyrinthKgS(1e-4, pressure, 420, 1e5, teeth)
        && GlandSteam.LabyrinthKgS(1e-4, pressure * 1.05, 420, 1e5, teeth) > GlandSteam.LabyrinthKgS(1e-4, pressure, 420, 1e5, teeth)
        && GlandSteam.LabyrinthKgS(1e-4, pressure, 420, pressure, teeth) == 0);

    // 1 kg/h that all condenses is 24 kg a day
    [Fact]
    public void IngressKgS_OneKilogramAnHour_IsTwentyFourADay() => Checks.Near(24, GlandSteam.IngressKgS(1.0 / 3600, 1) * 86_400, 1e-12);

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => GlandSteam.LabyrinthKgS(1, 1e5, 400, 2e5, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => GlandSteam.LabyrinthKgS(1, 1e5, 400, 5e4, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => GlandSteam.LabyrinthKgS(double.NaN, 1e5, 400, 5e4, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => GlandSteam.IngressKgS(1, 1.1));
    }
}
