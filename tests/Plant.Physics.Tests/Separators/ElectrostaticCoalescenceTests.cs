using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class ElectrostaticCoalescenceTests
{
    private const double Oil = 2.2 * Constants.VacuumPermittivityFM;

    // ε·E²·r/γ = 0.21025 in oil of εr 2.2, recomputed apart from this code with 0.4585 for √0.21025 (7e-5 less)
    [Theory]
    [InlineData(1e-3, 0.03, 8.0469e5)]
    [InlineData(100e-6, 0.03, 2.54466e6)]
    [InlineData(10e-6, 0.03, 8.0469e6)]
    [InlineData(1e-3, 0.01, 4.6459e5)]
    public void CriticalFieldVM_Drops_IsTheTable(double diameter, double tension, double field) =>
        Checks.Near(field, ElectrostaticCoalescence.CriticalFieldVM(Oil, diameter / 2, tension), 1e-4);

    // Taylor 1964 writes it E = 0.648·√(γ/(2εr)) in these units
    [Fact]
    public void CriticalFieldVM_TaylorsForm_IsTheSame() =>
        Checks.Near(0.6485 * Math.Sqrt(0.03 / (2 * Oil * 1e-4)), ElectrostaticCoalescence.CriticalFieldVM(Oil, 1e-4, 0.03), 1e-4);

    [Property]
    public Property CapillaryNumber_AtTheCriticalField_IsTheLimit() => Prop.ForAll(Inputs.Logarithmic(1e-7, 1e-2), Inputs.Logarithmic(1e-3, 0.08), (radius, tension) =>
    {
        var field = ElectrostaticCoalescence.CriticalFieldVM(Oil, radius, tension);
        return Math.Abs(ElectrostaticCoalescence.CapillaryNumber(Oil, field, radius, tension) - ElectrostaticCoalescence.TaylorLimit) < 1e-12;
    });

    // 0.0391 Pa·s, 3 kV/cm: recomputed by quadrature apart from this code
    [Theory]
    [InlineData(1e-4, 2.817e4)]
    [InlineData(1e-3, 606.88)]
    [InlineData(1e-2, 13.06)]
    public void ApproachTimeS_Fractions_IsTheTable(double fraction, double time) => Checks.Near(time, ElectrostaticCoalescence.ApproachTimeS(0.0391, Oil, 3e5, fraction), 4e-4);

    // the same pair, stepped through Stokes drag and far dipoles
    [Fact]
    public void ApproachTimeS_AgainstSteppedMotion_Agrees()
    {
        const double a = 5e-6;
        var start = ElectrostaticCoalescence.SpacingM(2 * a, 0.01);
        var time = 0.0;
        const int steps = 20_000;
        var step = (start - (2 * a)) / steps;
        for (var i = 0; i < steps; i++)
        {
            var s = start - ((i + 0.5) * step);
            time += step / (2 * ConductingSpheres.FarAttractionN(a, a, s, Oil, 3e5) / (6 * Math.PI * 0.0391 * a));
        }

        Checks.Near(time, ElectrostaticCoalescence.ApproachTimeS(0.0391, Oil, 3e5, 0.01), 1e-6);
    }

    // drops that touch in a cube fill π/6 of it
    [Fact]
    public void SpacingM_FullCubes_IsTheDiameter()
    {
        Checks.Near(1e-5, ElectrostaticCoalescence.SpacingM(1e-5, Math.PI / 6), 1e-12);
        Assert.Equal(0, ElectrostaticCoalescence.ApproachTimeS(0.04, Oil, 1e5, 0.9));
    }

    // 1 nS/m at 3 kV/cm: 90 W a cubic metre
    [Fact]
    public void PowerW_Oil_IsOhmsLaw() => Checks.Near(90, ElectrostaticCoalescence.PowerW(1e-9, 3e5, 1), 1e-12);

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.CapillaryNumber(Oil, double.NaN, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.CapillaryNumber(Oil, 1, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.CriticalFieldVM(Oil, 0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.SpacingM(1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.SpacingM(1, 1.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.ApproachTimeS(0.04, Oil, 0, 0.01));
        Assert.Throws<ArgumentOutOfRangeException>(() => ElectrostaticCoalescence.PowerW(-1, 1, 1));
    }
}
