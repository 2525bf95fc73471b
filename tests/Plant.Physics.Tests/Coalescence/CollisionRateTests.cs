using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Coalescence;

public sealed class CollisionRateTests
{
    private const double Viscosity = 0.0391;

    // the test oil: 850 kg/m³, 0.0391 Pa·s, water 992.2 kg/m³, 40 °C; G 10 /s, ε 0.1 W/kg, ν 46e-6 m²/s; recomputed apart from this code
    [Theory]
    [InlineData(1, 1, 2.9487e-19, 1.3333e-17, 6.0353e-17, 0)]
    [InlineData(1, 10, 8.9198e-19, 2.2183e-15, 1.0041e-14, 1.8642e-17)]
    [InlineData(10, 10, 2.9487e-19, 1.3333e-14, 6.0353e-14, 0)]
    [InlineData(10, 50, 5.3076e-19, 3.6e-13, 1.6295e-12, 1.3445e-14)]
    public void Rates_TestOil_AreTheTable(double firstUm, double secondUm, double brownian, double shear, double turbulent, double settling)
    {
        double a = firstUm * 1e-6, b = secondUm * 1e-6;
        double Speed(double d) => Settling.StokesMS(d, 142.2, Viscosity);
        Checks.Near(brownian, CollisionRate.BrownianM3S(a, b, 313.15, Viscosity), 3e-5);
        Checks.Near(shear, CollisionRate.LaminarShearM3S(a, b, 10), 3e-5);
        Checks.Near(turbulent, CollisionRate.SaffmanTurnerM3S(a, b, 0.1, 46e-6), 3e-5);
        Checks.Near(settling, CollisionRate.DifferentialSettlingM3S(a, b, Speed(a), Speed(b)), 1e-4);
    }

    // 2 µm drops, 500 ppm: half of the number is gone after 18.42 h = 2/(K·N)
    [Fact]
    public void BrownianM3S_HalfLife_IsSmoluchowskis()
    {
        var number = 4.28427e-4 / (Math.PI / 6 * 8e-18);
        Checks.Near(18.42, 2 / (CollisionRate.BrownianM3S(2e-6, 2e-6, 313.15, Viscosity) * number) / 3600, 3e-4);
    }

    // code that puts diameters for radii has 4/3·√(0.3π·ε/ν)·(d1 + d2)³: the same factor, on eight times the cube
    [Fact]
    public void SaffmanTurnerM3S_AgainstDiametersForRadii_IsAnEighth() =>
        Checks.Near(4.0 / 3 * Math.Sqrt(0.3 * Math.PI * 0.1 / 46e-6) * Math.Pow(60e-6, 3) / 8, CollisionRate.SaffmanTurnerM3S(10e-6, 50e-6, 0.1, 46e-6), 1e-12);

    // 50 and 100 µm, ε 1 W/kg, φ 0.01, C1 2.8
    [Fact]
    public void InertialM3S_Example_IsTheValue() => Checks.Near(1.241496e-9, CollisionRate.InertialM3S(50e-6, 100e-6, 1, 0.01), 1e-6);

    // flux to contact by quadrature over the directions of attraction
    [Fact]
    public void FieldM3S_AgainstQuadrature_Agrees()
    {
        double r1 = 5e-6, r2 = 12e-6, s = r1 + r2, field = 2e5, permittivity = 2.2 * 8.8541878128e-12;
        var force = 24 * Math.PI * permittivity * Math.Pow(r1 * r2, 3) * field * field / Math.Pow(s, 4);
        var speed = force / (6 * Math.PI * Viscosity) * ((1 / r1) + (1 / r2));
        var flux = 0.0;
        const int steps = 100_000;
        for (var i = 0; i < steps; i++)
        {
            var cosine = -1 + (2 * (i + 0.5) / steps);
            flux += 2 * Math.PI * s * s * speed * Math.Max(0, ((3 * cosine * cosine) - 1) / 2) * 2 / steps;
        }

        Checks.Near(flux, CollisionRate.FieldM3S(2 * r1, 2 * r2, field, 2.2, Viscosity), 1e-6);
    }

    [Property]
    public Property EveryRate_ExchangedDrops_IsTheSame() => Prop.ForAll(Inputs.Logarithmic(5e-7, 2e-3), Inputs.Logarithmic(5e-7, 2e-3), (a, b) =>
    {
        Func<double, double, double>[] rates =
        [
            (x, y) => CollisionRate.BrownianM3S(x, y, 313.15, Viscosity),
            (x, y) => CollisionRate.LaminarShearM3S(x, y, 5),
            (x, y) => CollisionRate.SaffmanTurnerM3S(x, y, 0.1, 46e-6),
            (x, y) => CollisionRate.DifferentialSettlingM3S(x, y, x * x, y * y),
            (x, y) => CollisionRate.InertialM3S(x, y, 0.1, 0.01),
            (x, y) => CollisionRate.FieldM3S(x, y, 1e5, 2.2, Viscosity),
        ];
        return rates.All(rate => Math.Abs(rate(a, b) - rate(b, a)) <= 1e-14 * rate(a, b) && rate(a, b) >= 0);
    });

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.BrownianM3S(0, 1e-6, 300, 0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.BrownianM3S(1e-6, 1e-6, 300, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.LaminarShearM3S(1e-6, 1e-6, -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.SaffmanTurnerM3S(1e-6, 1e-6, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.DifferentialSettlingM3S(1e-6, 1e-6, double.NaN, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.InertialM3S(1e-6, 1e-6, 1, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => CollisionRate.FieldM3S(1e-6, 1e-6, 1e5, 0.5, 0.1));
    }
}
