using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Droplets;

public sealed class BreakupTests
{
    // σ 0.03 N/m, 850 kg/m³, ν 46e-6 m²/s; recomputed apart from this code
    [Theory]
    [InlineData(0.1, 3.8811e-3, 9.93e-4)]
    [InlineData(1, 1.5451e-3, 5.59e-4)]
    [InlineData(10, 6.1512e-4, 3.14e-4)]
    [InlineData(100, 2.4488e-4, 1.77e-4)]
    [InlineData(1e3, 9.7490e-5, 9.93e-5)]
    [InlineData(1e4, 3.8811e-5, 5.59e-5)]
    public void HinzeAndKolmogorov_Dissipations_AreTheTable(double dissipation, double hinze, double kolmogorov)
    {
        Checks.Near(hinze, Breakup.HinzeM(0.03, 850, dissipation), 2e-5);
        Checks.Near(kolmogorov, Breakup.KolmogorovM(46e-6, dissipation), 3e-3);
    }

    [Fact]
    public void HinzeM_LowerTension_IsTheValue() => Checks.Near(4.0583e-4, Breakup.HinzeM(0.015, 850, 10), 2e-5);

    [Fact]
    public void DaviesM_ViscousDrop_IsTheValue() => Checks.Near(4.3760e-5, Breakup.DaviesM(0.03, 850, 1e4, 0.05), 2e-5);

    [Fact]
    public void DaviesM_DropWithoutViscosity_IsHinze() => Checks.Near(Breakup.HinzeM(0.03, 850, 50), Breakup.DaviesM(0.03, 850, 50, 0), 1e-14);

    [Theory]
    [InlineData(0.01, BreakupRegime.Inertial, false)]
    [InlineData(100, BreakupRegime.Inertial, true)]
    [InlineData(1e4, BreakupRegime.Viscous, true)]
    [InlineData(1e8, BreakupRegime.Viscous, false)]
    public void Largest_Dissipations_PicksTheRegimeAndFlagsTheBorder(double dissipation, BreakupRegime regime, bool nearBorder)
    {
        var size = Breakup.Largest(0.03, 850, 46e-6, dissipation);
        Assert.Equal((regime, nearBorder), (size.Regime, size.NearBorder));
        Checks.Near(regime == BreakupRegime.Inertial ? Breakup.HinzeM(0.03, 850, dissipation) : 0.03 / (850 * 46e-6 * Math.Sqrt(dissipation / 46e-6)), size.DiameterM, 1e-12);
    }

    [Property]
    public Property Largest_WithinOneRegime_FallsWithDissipation() => Prop.ForAll(Inputs.Logarithmic(1e-2, 1e6), Inputs.Logarithmic(1e-6, 1e-3), (dissipation, viscosity) =>
    {
        var here = Breakup.Largest(0.03, 850, viscosity, dissipation);
        var there = Breakup.Largest(0.03, 850, viscosity, dissipation * 1.1);
        return here.Regime != there.Regime || there.DiameterM < here.DiameterM;
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.KolmogorovM(0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.KolmogorovM(1e-5, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.HinzeM(-1, 850, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.HinzeM(0.03, double.NaN, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.DaviesM(0.03, 850, 1, -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.ViscousM(0.03, 0.04, 46e-6, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Breakup.Largest(0.03, 850, 46e-6, 0));
    }
}
