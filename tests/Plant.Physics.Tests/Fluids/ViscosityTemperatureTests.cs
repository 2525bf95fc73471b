using Plant.Physics.Fluids;

namespace Plant.Physics.Tests.Fluids;

public sealed class ViscosityTemperatureTests
{
    public static TheoryData<double, double, double, double> Curves()
    {
        var rows = new TheoryData<double, double, double, double>();
        foreach (var row in Checks.Of("d341").EnumerateArray())
        {
            foreach (var (temperature, viscosity) in row.GetProperty("nu").Pairs())
            {
                rows.Add(row.Number("nu40"), row.Number("nu100"), temperature, viscosity);
            }
        }

        return rows;
    }

    public static TheoryData<double, double, double, double> Lines()
    {
        var rows = new TheoryData<double, double, double, double>();
        foreach (var row in Checks.Of("d341").EnumerateArray())
        {
            rows.Add(row.Number("nu40"), row.Number("nu100"), row.Number("A"), row.Number("B"));
        }

        return rows;
    }

    // ASTM D341, short form with the exponential terms, recomputed apart from this code
    [Theory]
    [MemberData(nameof(Curves))]
    public void AtMm2S_CheckOils_IsD341(double viscosity40, double viscosity100, double temperatureC, double expected) =>
        Checks.Near(expected, Through(viscosity40, viscosity100).AtMm2S(Checks.Kelvin(temperatureC)), 5e-6);

    [Theory]
    [MemberData(nameof(Lines))]
    public void Through_CheckOils_HasTheConstants(double viscosity40, double viscosity100, double a, double b)
    {
        var line = Through(viscosity40, viscosity100);
        Checks.Within(a, line.A, 1e-7);
        Checks.Within(b, line.B, 1e-7);
    }

    // trade page on ASTM D341: 32 and 5.4 mm²/s with T = t + 273 give A 9.5259, B 3.7449 and 8.5 mm²/s at 80 °C
    [Fact]
    public void Through_PublishedExample_HasThePublishedConstants()
    {
        var line = ViscosityTemperature.Through(313, 32, 373, 5.4);
        Checks.Within(9.5259, line.A, 5e-5);
        Checks.Within(3.7449, line.B, 5e-5);
        Checks.Within(8.5, line.AtMm2S(353), 0.05);
    }

    [Property]
    public Property AtMm2S_TheTwoPoints_AreMet() => Prop.ForAll(Inputs.Logarithmic(2, 3000), Inputs.Between(0.05, 0.6), (viscosity40, share) =>
    {
        var viscosity100 = Math.Max(1, viscosity40 * share);
        var line = Through(viscosity40, viscosity100);
        return Math.Abs(line.AtMm2S(313.15) - viscosity40) < 1e-3 * viscosity40 && Math.Abs(line.AtMm2S(373.15) - viscosity100) < 1e-3 * viscosity100;
    });

    [Property]
    public Property AtMm2S_Warmer_IsThinner() => Prop.ForAll(Inputs.Logarithmic(3, 1000), Inputs.Between(253, 420), (viscosity40, temperature) =>
    {
        var line = Through(viscosity40, viscosity40 * 0.3);
        return line.AtMm2S(temperature + 1) < line.AtMm2S(temperature);
    });

    [Fact]
    public void Equality_SameAndOtherPoints_IsByTheLine()
    {
        Assert.True(Through(46, 6.8) == Through(46, 6.8));
        Assert.True(Through(46, 6.8) != Through(46, 7));
        Assert.Equal(Through(46, 6.8).GetHashCode(), Through(46, 6.8).GetHashCode());
        Assert.False(Through(46, 6.8).Equals((object)46.0));
    }

    [Theory]
    [InlineData(double.NaN, 6.8)]
    [InlineData(46, double.NaN)]
    [InlineData(0, 6.8)]
    [InlineData(46, -1)]
    public void Through_NotAViscosity_Throws(double viscosity40, double viscosity100) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Through(viscosity40, viscosity100));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(0)]
    public void AtMm2S_NotATemperature_Throws(double temperatureK) =>
        Assert.Equal("temperatureK", Assert.Throws<ArgumentOutOfRangeException>(() => Through(46, 6.8).AtMm2S(temperatureK)).ParamName);

    private static ViscosityTemperature Through(double viscosity40, double viscosity100) => ViscosityTemperature.Through(313.15, viscosity40, 373.15, viscosity100);
}
