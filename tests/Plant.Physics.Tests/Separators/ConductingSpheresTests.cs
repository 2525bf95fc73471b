using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class ConductingSpheresTests
{
    private static double OverFar(double gap) => ConductingSpheres.AttractionN(1, gap, 1, 1) / ConductingSpheres.FarAttractionN(1, 1, 2 + gap, 1, 1);

    // multipoles about each centre (30 to 220 of them) with the derivative taken exactly, computed apart from this code; the last by a difference quotient, good to 1e-4
    [Theory]
    [InlineData(10, 1.002368)]
    [InlineData(4, 1.020467)]
    [InlineData(2, 1.080521)]
    [InlineData(1, 1.251269)]
    [InlineData(0.5, 1.643886)]
    [InlineData(0.2, 2.801903)]
    [InlineData(0.1, 4.538344)]
    [InlineData(0.05, 7.581778)]
    [InlineData(0.02, 15.2314372583)]
    [InlineData(0.01, 25.9909399434)]
    [InlineData(0.001, 158.98)]
    public void AttractionN_Gaps_IsTheMultipoleTable(double gap, double overFar) => Checks.Near(overFar, OverFar(gap), gap < 0.005 ? 1e-4 : 1e-6);

    [Theory]
    [InlineData(1, 1.16473)]
    [InlineData(0.1, 17.59468)]
    [InlineData(0.01, 120.060147)]
    public void AttractionN_Gaps_IsTheTableInFieldUnits(double gap, double force) => Checks.Near(force, ConductingSpheres.AttractionN(1, gap, 1, 1), 5e-6);

    [Fact]
    public void AttractionN_WhereTheFormChanges_HasNoJump() =>
        Checks.Near(ConductingSpheres.AttractionN(1, 58 * (1 + 1e-9), 1, 1), ConductingSpheres.AttractionN(1, 58 * (1 - 1e-9), 1, 1), 1e-7);

    [Fact]
    public void AttractionN_FarApart_IsTheDipoleLimit() => Checks.Near(1, OverFar(1000), 1e-8);

    [Property]
    public Property AttractionN_CloserDrops_AttractMore() => Prop.ForAll(Inputs.Logarithmic(1e-5, 1e4), gap =>
        ConductingSpheres.AttractionN(1, gap, 1, 1) > ConductingSpheres.AttractionN(1, gap * 1.02, 1, 1) && OverFar(gap) > 1);

    [Property]
    public Property AttractionN_ScaleAndField_AreSquares() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-3), Inputs.Logarithmic(1e-3, 10), Inputs.Logarithmic(1e3, 1e6), (radius, gap, field) =>
    {
        var force = ConductingSpheres.AttractionN(radius, gap * radius, 2e-11, field);
        return Math.Abs((force / (2e-11 * Math.Pow(radius * field, 2) * ConductingSpheres.AttractionN(1, gap, 1, 1))) - 1) < 1e-9
            && force == ConductingSpheres.AttractionN(radius, gap * radius, 2e-11, -field);
    });

    // two dipoles: repulsion beyond 54.7356° to the field, half the attraction across it
    [Fact]
    public void FarRadialN_Angles_ChangeSignAtTheMagicAngle()
    {
        const double magic = 54.7356103172 * Math.PI / 180;
        var along = ConductingSpheres.FarAttractionN(1, 2, 10, 3, 5);
        Checks.Near(24 * Math.PI * 3 * 8 * 25 / 1e4, along, 1e-12);
        Checks.Within(0, ConductingSpheres.FarRadialN(1, 2, 10, magic, 3, 5) / along, 1e-10);
        Checks.Near(-0.5, ConductingSpheres.FarRadialN(1, 2, 10, Math.PI / 2, 3, 5) / along, 1e-12);
    }

    [Property]
    public Property FarForces_DropsExchanged_AreTheSameAndOnePotential() => Prop.ForAll(Inputs.Between(1, 3), Inputs.Between(0.1, 1.5), Inputs.Between(8, 20), (r, angle, s) =>
    {
        double Radial(double at) => ConductingSpheres.FarRadialN(1, r, s, at, 1, 1);
        // curl-free: the turning force s·T is the slope over the angle of the potential that gives the radial one
        var slope = -(Radial(angle + 1e-5) - Radial(angle - 1e-5)) / 2e-5 / 3;
        return Math.Abs(Radial(angle) - ConductingSpheres.FarRadialN(r, 1, s, angle, 1, 1)) <= 1e-12 * Math.Abs(Radial(0))
            && Math.Abs(slope - ConductingSpheres.FarTurningN(1, r, s, angle, 1, 1)) < 1e-7 * Radial(0);
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.AttractionN(1, 0, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.AttractionN(1, 1e-9, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.AttractionN(double.NaN, 1, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.AttractionN(1, 1, 0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.AttractionN(1, 1, 1, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.FarAttractionN(1, 1, 1.9, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.FarRadialN(1, 1, 3, double.NaN, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConductingSpheres.FarTurningN(1, -1, 3, 1, 1, 1));
    }
}
