using Plant.Physics.Water;

namespace Plant.Physics.Tests.Water;

public sealed class WaterPropertiesTests
{
    public static TheoryData<string, double, double, double> Rows()
    {
        var rows = new TheoryData<string, double, double, double>();
        foreach (var row in Checks.Of("water").EnumerateArray())
        {
            foreach (var (column, tolerance) in new[] { ("rhoKell", 1e-8), ("muPas", 1e-7), ("eps", 1e-6), ("sigma_mNm", 1e-6), ("psatWP_Pa", 1e-6) })
            {
                rows.Add(column, row.Number("tC"), row.Number(column), tolerance);
            }
        }

        return rows;
    }

    // density: Kell 1975; viscosity and permittivity: IAPWS SR6-08 at 0.1 MPa; tension: IAPWS R1-76(2014); vapour pressure: Wagner and Pruß 2002,
    // whose row of 0 °C is the triple point at 0.01 °C. All recomputed apart from this code.
    [Theory]
    [MemberData(nameof(Rows))]
    public void EveryProperty_CheckTemperatures_IsThePublishedEquation(string column, double temperatureC, double expected, double tolerance)
    {
        var temperatureK = Checks.Kelvin(temperatureC);
        var actual = column switch
        {
            "rhoKell" => WaterProperties.DensityKgM3(temperatureK),
            "muPas" => WaterProperties.ViscosityPaS(temperatureK),
            "eps" => WaterProperties.RelativePermittivity(temperatureK),
            "sigma_mNm" => WaterProperties.SurfaceTensionNM(temperatureK) * 1000,
            _ => WaterProperties.VapourPressurePa(Math.Max(temperatureK, 273.16)),
        };
        Checks.Near(expected, actual, tolerance);
    }

    // IAPWS R1-76(2014), values printed with the release
    [Theory]
    [InlineData(300, 0.0716859625)]
    [InlineData(450, 0.0428914992)]
    public void SurfaceTensionNM_PrintedValues_Agree(double temperatureK, double tensionNM) =>
        Checks.Near(tensionNM, WaterProperties.SurfaceTensionNM(temperatureK), 2e-9);

    // IAPWS-IF97, verification values of region 4: another equation for the same pressure
    [Theory]
    [InlineData(300, 3536.5894130130105)]
    [InlineData(500, 2638897.7562732217)]
    [InlineData(600, 12344314.578376647)]
    public void VapourPressurePa_IndustrialFormulation_AgreesWithin150Ppm(double temperatureK, double pressurePa) =>
        Checks.Near(pressurePa, WaterProperties.VapourPressurePa(temperatureK), 1.5e-4);

    [Fact]
    public void VapourPressurePa_NormalBoilingPoint_IsOneAtmosphere() => Checks.Near(101325, WaterProperties.VapourPressurePa(373.1243), 1e-6);

    // ASTM D2270 gives 1.0034 mm²/s for water at 20 °C
    [Fact]
    public void KinematicViscosity_At20C_IsThatOfTheStandard() =>
        Checks.Within(1.0034, WaterProperties.ViscosityPaS(293.15) / WaterProperties.DensityKgM3(293.15) * 1e6, 1e-4);

    [Theory]
    [InlineData(0)]
    [InlineData(40)]
    [InlineData(100)]
    public void DensityKgM3_AgainstIapws_AgreesWithin16Grams(double t)
    {
        var row = Checks.Of("water").EnumerateArray().First(r => r.Number("tC") == t);
        Checks.Within(row.Number("rhoIapwsSR"), WaterProperties.DensityKgM3(Checks.Kelvin(t)), 0.016);
    }

    [Fact]
    public void DensityKgM3_At4C_IsLargest()
    {
        var largest = WaterProperties.DensityKgM3(Checks.Kelvin(3.98));
        Assert.True(largest > WaterProperties.DensityKgM3(Checks.Kelvin(3)));
        Assert.True(largest > WaterProperties.DensityKgM3(Checks.Kelvin(5)));
    }

    [Property]
    public Property Properties_Warmer_FallOrRise() => Prop.ForAll(Inputs.Between(278, 372), Inputs.Between(0.1, 1), (temperature, step) =>
        WaterProperties.DensityKgM3(temperature) > WaterProperties.DensityKgM3(temperature + step)
        && WaterProperties.ViscosityPaS(temperature) > WaterProperties.ViscosityPaS(temperature + step)
        && WaterProperties.RelativePermittivity(temperature) > WaterProperties.RelativePermittivity(temperature + step)
        && WaterProperties.SurfaceTensionNM(temperature) > WaterProperties.SurfaceTensionNM(temperature + step)
        && WaterProperties.VapourPressurePa(temperature) < WaterProperties.VapourPressurePa(temperature + step));

    [Fact]
    public void SurfaceTensionNM_CriticalPoint_IsZero() => Assert.Equal(0, WaterProperties.SurfaceTensionNM(WaterProperties.CriticalTemperatureK));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void EveryProperty_NotANumber_Throws(double temperatureK)
    {
        Assert.Equal("temperatureK", Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.DensityKgM3(temperatureK)).ParamName);
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.ViscosityPaS(temperatureK));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.RelativePermittivity(temperatureK));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.SurfaceTensionNM(temperatureK));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.VapourPressurePa(temperatureK));
    }

    [Theory]
    [InlineData(647.2)]
    [InlineData(-1)]
    public void VapourPressurePa_OutsideTheLiquid_Throws(double temperatureK) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.VapourPressurePa(temperatureK));
}
