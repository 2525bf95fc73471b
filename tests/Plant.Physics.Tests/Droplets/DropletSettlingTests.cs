using Plant.Physics.Droplets;
using Plant.Physics.Fluids;

namespace Plant.Physics.Tests.Droplets;

public sealed class DropletSettlingTests
{
    // the test oil of the settling table; water is Kell's 992.216 here, not 992.2, hence the tolerance
    [Theory]
    [InlineData(50, 4.953309e-6, 7.369701e-6)]
    [InlineData(500, 4.933104e-4, 7.369701e-4)]
    [InlineData(2000, 7.414580e-3, 1.179152e-2)]
    public void VelocityMS_TestOil_IsTheTable(double diameterUm, double rigid, double mobile)
    {
        var settling = new DropletSettling(TestOil(), 313.15);
        Checks.Near(rigid, settling.VelocityMS(diameterUm * 1e-6), 3e-4);
        Checks.Near(mobile, settling.VelocityMS(diameterUm * 1e-6, 0, mobileInterface: true), 3e-4);
    }

    // 5 m³/h on 2 m² catches 592.016 µm in the test oil by Stokes, recomputed apart from this code; the drag of Schiller and Naumann slows that drop by 0.6 %
    [Fact]
    public void CutSizeM_TestOil_IsAboveStokesByTheDrag()
    {
        const double rate = 5.0 / 3600 / 2;
        Checks.Near(rate, Settling.StokesMS(592.016e-6, 142.2, 0.0391), 2e-6);
        var cut = Assert.NotNull(new DropletSettling(TestOil(), 313.15).CutSizeM(rate));
        Checks.Near(592.016e-6 * 1.003, cut, 5e-4);
        Checks.Near(rate, Settling.SchillerNaumannMS(cut, 142.2158, 0.0391, 850), 1e-4);
    }

    [Fact]
    public void VelocityMS_Hindered_IsTimesThePower()
    {
        var settling = new DropletSettling(TestOil(), 313.15);
        Checks.Near(settling.VelocityMS(1e-4) * Math.Pow(0.9, 4.65), settling.VelocityMS(1e-4, 0.1), 1e-12);
    }

    [Property]
    public Property CutSizeM_OfAVelocity_IsTheDiameter() => Prop.ForAll(Inputs.Logarithmic(1e-6, 2e-3), Inputs.Between(283, 353), (diameter, temperature) =>
    {
        var settling = new DropletSettling(Checks.MineralOil(), temperature);
        return Math.Abs(settling.CutSizeM(settling.VelocityMS(diameter))!.Value - diameter) <= 1e-9 * diameter;
    });

    [Property]
    public Property VelocityMS_LargerDrop_IsFaster() => Prop.ForAll(Inputs.Logarithmic(1e-6, 3e-3), Inputs.Between(273, 353), (diameter, temperature) =>
    {
        var settling = new DropletSettling(Checks.MineralOil(), temperature);
        return settling.VelocityMS(diameter * 1.01) > settling.VelocityMS(diameter);
    });

    [Fact]
    public void VelocityMS_DenseFluid_Rises()
    {
        var settling = new DropletSettling(Checks.Fluid(new FluidSheet { Family = FluidFamily.PhosphateEster }), 323.15);
        Assert.True(settling.VelocityMS(1e-4) < 0);
        Assert.True(settling.CutSizeM(1e-4) > 0);
        Assert.True(settling.Reynolds(1e-4, settling.VelocityMS(1e-4)) > 0);
    }

    [Fact]
    public void CutSizeM_FasterThanAnyDrop_IsNull() => Assert.Null(new DropletSettling(TestOil(), 313.15).CutSizeM(10));

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new DropletSettling(TestOil(), double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new DropletSettling(TestOil(), 313.15).VelocityMS(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new DropletSettling(TestOil(), 313.15).VelocityMS(1e-4, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => new DropletSettling(TestOil(), 313.15).CutSizeM(double.NaN));
    }

    private static FluidModel TestOil() =>
        Checks.Fluid(new FluidSheet { Family = FluidFamily.Mineral, Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 850, ExpansionPerK = 0 });
}
