using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Droplets;

public sealed class SettlingTests
{
    // the test oil: 850 kg/m³ and 0.0391 Pa·s at 40 °C, water 992.2 kg/m³ and 0.653 mPa·s; recomputed apart from this code
    [Theory]
    [InlineData(1, 1.981395e-9, 1.981395e-9, 2.947881e-9)]
    [InlineData(10, 1.981395e-7, 1.981392e-7, 2.947881e-7)]
    [InlineData(50, 4.953487e-6, 4.953309e-6, 7.369701e-6)]
    [InlineData(100, 1.981395e-5, 1.981097e-5, 2.947881e-5)]
    [InlineData(500, 4.953487e-4, 4.933104e-4, 7.369701e-4)]
    [InlineData(1000, 1.981395e-3, 1.948102e-3, 2.947881e-3)]
    [InlineData(2000, 7.925579e-3, 7.414580e-3, 1.179152e-2)]
    public void Velocities_TestOil_AreTheTable(double diameterUm, double stokes, double schillerNaumann, double mobile)
    {
        var d = diameterUm * 1e-6;
        Checks.Near(stokes, Settling.StokesMS(d, 142.2, 0.0391), 3e-7);
        Checks.Near(schillerNaumann, Settling.SchillerNaumannMS(d, 142.2, 0.0391, 850), 3e-7);
        Checks.Near(mobile, Settling.StokesMS(d, 142.2, 0.0391) * Settling.HadamardRybczynskiFactor(0.653e-3 / 0.0391), 3e-7);
    }

    // 70 µm sphere of 2600 kg/m³ in water-like 1000 kg/m³, 1 mPa·s, recomputed apart from this code; a public library gives 0.004142 with another drag law
    [Fact]
    public void Velocities_PublishedSphere_SpreadByTheDragLaw()
    {
        Checks.Near(0.004271341, Settling.StokesMS(70e-6, 1600, 1e-3), 1e-6);
        Checks.Near(0.004019088, Settling.SchillerNaumannMS(70e-6, 1600, 1e-3, 1000), 1e-6);
        Checks.Near(0.004142497, Settling.SchillerNaumannMS(70e-6, 1600, 1e-3, 1000), 0.031);
    }

    // water 983.2 in a polyalkylene glycol of 1005 kg/m³: it floats
    [Fact]
    public void StokesMS_LighterDrop_Rises() => Checks.Near(-7.593953e-7, Settling.StokesMS(50e-6, 983.2 - 1005, 0.0391), 1e-6);

    [Theory]
    [InlineData(0, 1.5)]
    [InlineData(0.1, 1.434783)]
    [InlineData(1, 1.2)]
    [InlineData(10, 1.03125)]
    [InlineData(1e9, 1)]
    public void HadamardRybczynskiFactor_ViscosityRatios_AreTheLimits(double ratio, double factor) =>
        Checks.Within(factor, Settling.HadamardRybczynskiFactor(ratio), 1e-6);

    // Schiller and Naumann 1933, recomputed apart from this code
    [Theory]
    [InlineData(0.1, 247.401206)]
    [InlineData(1, 27.6)]
    [InlineData(10, 4.151066)]
    [InlineData(100, 1.091731)]
    [InlineData(500, 0.562665)]
    [InlineData(800, 0.474258)]
    [InlineData(2000, 0.44)]
    public void SchillerNaumannDrag_ReynoldsNumbers_AreTheTable(double reynolds, double drag) => Checks.Within(drag, Settling.SchillerNaumannDrag(reynolds), 1e-6);

    // published: 4.44 µm/s hindered at φ 0.30 with n 4.5 is 22.1 µm/s of one drop
    [Fact]
    public void RichardsonZakiFactor_PublishedSuspension_IsTheRatio() => Checks.Within(22.1, 4.44 / Settling.RichardsonZakiFactor(0.30, 4.5), 0.05);

    [Theory]
    [InlineData(0, 1)]
    [InlineData(0.1, 0.612664)]
    [InlineData(1, 0)]
    public void RichardsonZakiFactor_Fractions_AreThePower(double fraction, double factor) => Checks.Within(factor, Settling.RichardsonZakiFactor(fraction), 1e-5);

    // Rowe 1987 (from memory), recomputed apart from this code
    [Theory]
    [InlineData(0.05, 4.65718)]
    [InlineData(0.5, 4.47784)]
    [InlineData(10, 3.53087)]
    [InlineData(100, 2.70361)]
    [InlineData(1000, 2.41624)]
    public void RoweExponent_ReynoldsNumbers_AreTheTable(double reynolds, double exponent) => Checks.Within(exponent, Settling.RoweExponent(reynolds), 1e-5);

    [Property(MaxTest = 500)]
    public Property SchillerNaumannMS_AnyDrop_SolvesItsEquation() => Prop.ForAll(Inputs.Logarithmic(1e-7, 3e-3), Inputs.Between(-150, 300), Inputs.Logarithmic(2e-3, 1), (d, difference, viscosity) =>
    {
        var v = Settling.SchillerNaumannMS(d, difference, viscosity, 900);
        var reynolds = 900 * Math.Abs(v) * d / viscosity;
        var stokes = Settling.StokesMS(d, difference, viscosity);
        return reynolds >= 1000 || Math.Abs((v * (1 + (0.15 * Math.Pow(reynolds, 0.687)))) - stokes) <= 1e-5 * Math.Abs(stokes);
    });

    [Property]
    public Property Velocities_AnyDrop_LieBetweenRigidAndMobile() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-3), Inputs.Logarithmic(5e-3, 1), (d, viscosity) =>
        Settling.SchillerNaumannMS(d, 120, viscosity, 870) <= Settling.StokesMS(d, 120, viscosity)
        && Settling.HadamardRybczynskiFactor(6e-4 / viscosity) is >= 1 and <= 1.5);

    [Property]
    public Property SchillerNaumannMS_SignTurned_IsMirrored() => Prop.ForAll(Inputs.Logarithmic(1e-6, 2e-3), Inputs.Between(1, 200), (d, difference) =>
        Settling.SchillerNaumannMS(d, difference, 0.03, 870) == -Settling.SchillerNaumannMS(d, -difference, 0.03, 870));

    [Theory]
    [InlineData(double.NaN, 100, 0.03)]
    [InlineData(-1e-6, 100, 0.03)]
    [InlineData(1e-6, double.NaN, 0.03)]
    [InlineData(1e-6, 100, 0)]
    [InlineData(1e-6, 100, double.NaN)]
    public void Velocities_BadArgument_Throw(double diameterM, double difference, double viscosity)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.StokesMS(diameterM, difference, viscosity));
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.SchillerNaumannMS(diameterM, difference, viscosity, 870));
    }

    [Fact]
    public void Factors_BadArgument_Throw()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.HadamardRybczynskiFactor(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.SchillerNaumannDrag(0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.RichardsonZakiFactor(1.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.RichardsonZakiFactor(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.RoweExponent(-1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Settling.SchillerNaumannMS(1e-4, 100, 0.03, double.NaN));
    }
}
