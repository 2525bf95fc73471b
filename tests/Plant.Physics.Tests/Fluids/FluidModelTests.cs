using Plant.Physics.Fluids;

namespace Plant.Physics.Tests.Fluids;

public sealed class FluidModelTests
{
    public static TheoryData<double, double, double, double> Solubilities()
    {
        var rows = new TheoryData<double, double, double, double>();
        foreach (var row in Checks.Of("solubility").EnumerateArray())
        {
            foreach (var (temperature, saturation) in row.GetProperty("S").Pairs())
            {
                rows.Add(row.Number("A"), row.Number("B"), temperature, saturation);
            }
        }

        return rows;
    }

    // log10 S = A − B/T with T = t + 273.15, recomputed apart from this code
    [Theory]
    [MemberData(nameof(Solubilities))]
    public void SaturationPpm_GivenCurve_IsTheCurve(double a, double b, double temperatureC, double expected)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = FluidFamily.TransformerMineral, SolubilityA = a, SolubilityB = b });
        Checks.Near(expected, fluid.SaturationPpm(Checks.Kelvin(temperatureC)), 3e-6);
        Assert.False(fluid.SolubilityIsFamilyDefault);
    }

    // public table of water in mineral transformer oil (trade page); made with T = t + 273, hence 2 % at the cold end
    [Theory]
    [InlineData(0, 22, 0.025)]
    [InlineData(10, 36, 0.01)]
    [InlineData(20, 55, 0.01)]
    [InlineData(30, 83, 0.01)]
    [InlineData(40, 121, 0.01)]
    [InlineData(50, 173, 0.01)]
    [InlineData(60, 242, 0.01)]
    [InlineData(70, 331, 0.01)]
    [InlineData(80, 446, 0.01)]
    [InlineData(90, 592, 0.01)]
    [InlineData(100, 772, 0.01)]
    public void SaturationPpm_TransformerOilByDefault_IsThePublicTable(double temperatureC, double published, double relative)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = FluidFamily.TransformerMineral });
        Checks.Near(published, fluid.SaturationPpm(Checks.Kelvin(temperatureC)), relative);
        Assert.True(fluid.SolubilityIsFamilyDefault);
    }

    // engineering defaults of the families (from memory, unverified)
    [Theory]
    [InlineData(FluidFamily.Mineral, 130, 262, 487)]
    [InlineData(FluidFamily.Pao, 90, 191, 370)]
    [InlineData(FluidFamily.Ester, 2000, 2841, 3870)]
    [InlineData(FluidFamily.PhosphateEster, 2500, 3378, 4402)]
    [InlineData(FluidFamily.NaturalEster, 996.6, 1404.6, 1899.6)]
    [InlineData(FluidFamily.Silicone, 190, 403, 782)]
    [InlineData(FluidFamily.TransformerMineral, 55.48, 121.76, 243.17)]
    [InlineData(FluidFamily.Diesel, 70, 149, 288)]
    public void SaturationPpm_FamilyDefault_IsTheTable(FluidFamily family, double at20, double at40, double at60)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = family });
        Checks.Near(at20, fluid.SaturationPpm(293.15), 4e-3);
        Checks.Near(at40, fluid.SaturationPpm(313.15), 4e-3);
        Checks.Near(at60, fluid.SaturationPpm(333.15), 4e-3);
    }

    // recomputed apart from this code: Oommen's and Griffin's curves (coefficients from memory)
    [Theory]
    [InlineData(7.0895, 1567, 30, 6.054)]
    [InlineData(7.0895, 1567, 200, 54.094)]
    [InlineData(7.42, 1670, 30, 7.859)]
    [InlineData(7.42, 1670, 200, 53.088)]
    public void HazeTemperatureK_Content_IsWhereTheCurveMeetsIt(double a, double b, double waterPpm, double temperatureC)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = FluidFamily.TransformerMineral, SolubilityA = a, SolubilityB = b });
        Checks.Within(Checks.Kelvin(temperatureC), Assert.NotNull(fluid.HazeTemperatureK(waterPpm)), 6e-4);
    }

    [Property]
    public Property HazeTemperatureK_OfTheSaturation_IsTheTemperature() => Prop.ForAll(Inputs.Between(253, 400), temperature =>
        Math.Abs(Checks.MineralOil().HazeTemperatureK(Checks.MineralOil().SaturationPpm(temperature))!.Value - temperature) < 1e-8);

    [Theory]
    [InlineData(0)]
    [InlineData(2e7)]
    public void HazeTemperatureK_ContentThatNeverFallsOut_IsNull(double waterPpm) => Assert.Null(Checks.MineralOil().HazeTemperatureK(waterPpm));

    // ASTM D1250-80 for lubricating oil, then for fuels by their group
    [Theory]
    [InlineData(FluidFamily.Mineral, 850, 834.221, 808.665)]
    [InlineData(FluidFamily.Pao, 850, 834.221, 808.665)]
    [InlineData(FluidFamily.TransformerMineral, 870, 854.223, 828.675)]
    [InlineData(FluidFamily.Mineral, 890, 874.225, 848.686)]
    [InlineData(FluidFamily.Diesel, 840, 822.173, 793.258)]
    [InlineData(FluidFamily.Diesel, 835, 817.091, 788.038)]
    [InlineData(FluidFamily.Diesel, 950, 932.836, 905.043)]
    public void DensityKgM3_WithoutExpansion_IsD1250(FluidFamily family, double density15, double at40, double at80)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = family, Density15KgM3 = density15 });
        Checks.Within(at40, fluid.DensityKgM3(313.15), 6e-4);
        Checks.Within(at80, fluid.DensityKgM3(353.15), 6e-4);
    }

    [Theory]
    [InlineData(FluidFamily.Ester, 7.5e-4)]
    [InlineData(FluidFamily.PhosphateEster, 6.9e-4)]
    [InlineData(FluidFamily.Pag, 7.8e-4)]
    [InlineData(FluidFamily.NaturalEster, 7.3e-4)]
    [InlineData(FluidFamily.Silicone, 1e-3)]
    public void DensityKgM3_FamilyOutsideD1250_ExpandsLinearly(FluidFamily family, double expansion) =>
        Checks.Near(1000 * (1 - (expansion * 45)), Checks.Fluid(new FluidSheet { Family = family, Density15KgM3 = 1000 }).DensityKgM3(333.15), 1e-12);

    [Fact]
    public void DensityKgM3_GivenExpansion_WinsOverD1250() =>
        Checks.Near(870 * (1 - (8e-4 * 45)), Checks.Fluid(new FluidSheet { Family = FluidFamily.Mineral, Density15KgM3 = 870, ExpansionPerK = 8e-4 }).DensityKgM3(333.15), 1e-12);

    // linear expansion against Kell's water, recomputed apart from this code
    [Theory]
    [InlineData(995, 7.8e-4, 8.823)]
    [InlineData(1000, 7.8e-4, 16.450)]
    [InlineData(1005, 7.8e-4, 25.221)]
    [InlineData(1010, 7.8e-4, 35.480)]
    [InlineData(1020, 7.8e-4, 63.693)]
    public void InversionTemperatureK_Polyglycol_IsWhereDensitiesMeet(double density15, double expansion, double temperatureC)
    {
        var fluid = Polyglycol(density15, expansion);
        var inversion = Assert.NotNull(fluid.InversionTemperatureK());
        Checks.Within(temperatureC, inversion - 273.15, 6e-4);
        Checks.Within(0, fluid.DensityDifferenceKgM3(inversion), 1e-9);
        Assert.Equal(WaterDirection.Neither, fluid.WaterGoes(inversion));
    }

    [Fact]
    public void InversionTemperatureK_AlwaysDenserOrLighter_IsNull()
    {
        Assert.Null(Polyglycol(1050, 7.4e-4).InversionTemperatureK());
        Assert.Null(Checks.MineralOil().InversionTemperatureK());
    }

    // polyglycol less water, recomputed apart from this code
    [Theory]
    [InlineData(995, 7.8e-4, -7.08, -16.62, -23.12, -27.24)]
    [InlineData(1000, 7.8e-4, -2.10, -11.72, -18.30, -22.50)]
    [InlineData(1005, 7.8e-4, 2.88, -6.81, -13.47, -17.75)]
    [InlineData(1010, 7.8e-4, 7.86, -1.91, -8.65, -13.00)]
    [InlineData(1020, 7.8e-4, 17.82, 7.89, 1.00, -3.51)]
    [InlineData(1050, 7.4e-4, 47.91, 38.36, 31.84, 27.70)]
    public void DensityDifferenceKgM3_Polyglycol_IsTheTable(double density15, double expansion, double at20, double at40, double at60, double at80)
    {
        var fluid = Polyglycol(density15, expansion);
        Checks.Within(-at20, fluid.DensityDifferenceKgM3(293.15), 0.006);
        Checks.Within(-at40, fluid.DensityDifferenceKgM3(313.15), 0.006);
        Checks.Within(-at60, fluid.DensityDifferenceKgM3(333.15), 0.006);
        Checks.Within(-at80, fluid.DensityDifferenceKgM3(353.15), 0.006);
    }

    [Theory]
    [InlineData(1010, 10, WaterDirection.Up)]
    [InlineData(1010, 40, WaterDirection.Neither)]
    [InlineData(1010, 80, WaterDirection.Down)]
    [InlineData(1050, 80, WaterDirection.Up)]
    [InlineData(870, 20, WaterDirection.Down)]
    public void WaterGoes_ByDensities_IsDownUpOrNeither(double density15, double temperatureC, WaterDirection expected) =>
        Assert.Equal(expected, Polyglycol(density15, 7.8e-4).WaterGoes(Checks.Kelvin(temperatureC)));

    [Fact]
    public void KinematicViscosityM2S_GivenViscosities_IsD341()
    {
        // 46 and 6.8 mm²/s, D341: 133.83818 at 20 °C
        Checks.Near(133.83818e-6, Checks.MineralOil().KinematicViscosityM2S(293.15), 1e-6);
        Checks.Near(46e-6 * Checks.MineralOil().DensityKgM3(313.15), Checks.MineralOil().DynamicViscosityPaS(313.15), 1e-4);
        Assert.False(Checks.MineralOil().ViscosityIsFamilyDefault);
    }

    [Theory]
    [InlineData(FluidFamily.Mineral, 32, 97)]
    [InlineData(FluidFamily.Mineral, 68, 97)]
    [InlineData(FluidFamily.Mineral, 320, 97)]
    [InlineData(FluidFamily.Pao, 46, 138)]
    [InlineData(FluidFamily.Ester, 46, 145)]
    [InlineData(FluidFamily.PhosphateEster, 46, 20)]
    [InlineData(FluidFamily.Pag, 220, 200)]
    public void KinematicViscosityM2S_OnlyTheGrade_HasTheTypicalIndex(FluidFamily family, double grade, double index)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = family, IsoVg = grade });
        Assert.True(fluid.ViscosityIsFamilyDefault);
        Checks.Near(grade * 1e-6, fluid.KinematicViscosityM2S(313.15), 1e-5);
        Checks.Within(index, Assert.NotNull(ViscosityIndex.Of(grade, fluid.KinematicViscosityM2S(373.15) * 1e6)), 0.2);
    }

    // below 2 mm²/s at 100 °C there is no index: the family's slope serves
    [Theory]
    [InlineData(FluidFamily.Diesel, 2)]
    [InlineData(FluidFamily.Diesel, 3)]
    [InlineData(FluidFamily.TransformerMineral, 5)]
    public void KinematicViscosityM2S_ThinGrade_ThinsWhenWarm(FluidFamily family, double grade)
    {
        var fluid = Checks.Fluid(new FluidSheet { Family = family, IsoVg = grade });
        Assert.InRange(fluid.KinematicViscosityM2S(373.15), 0.3e-6, 0.6 * fluid.KinematicViscosityM2S(313.15));
    }

    [Fact]
    public void TryCreate_NothingButTheFamily_IsTheDefaultAndSaysSo()
    {
        foreach (var family in Enum.GetValues<FluidFamily>())
        {
            var fluid = Checks.Fluid(new FluidSheet { Family = family });
            Assert.True(fluid.ViscosityIsFamilyDefault && fluid.DensityIsFamilyDefault && fluid.SolubilityIsFamilyDefault);
            Assert.Equal(family != FluidFamily.Pag, fluid.HasSaturation);
            Assert.Equal(FluidFamilyDefaults.Of(family).Density15KgM3, fluid.DensityKgM3(288.15), 9);
            Assert.Equal(family, fluid.Family);
        }
    }

    [Fact]
    public void SaturationPpm_PolyglycolWithoutCurve_Throws()
    {
        var fluid = Polyglycol(1000, 7.8e-4);
        Assert.False(fluid.HasSaturation);
        Assert.Throws<InvalidOperationException>(() => fluid.SaturationPpm(313.15));
        Assert.Null(fluid.HazeTemperatureK(500));
    }

    [Fact]
    public void SaturationPpm_PolyglycolWithCurve_IsTheCurve() =>
        Checks.Near(36666, Checks.Fluid(new FluidSheet { Family = FluidFamily.Pag, SolubilityA = 5.8416, SolubilityB = 400 }).SaturationPpm(313.15), 1e-3);

    [Property]
    public Property Fluid_Warmer_IsThinnerLighterAndHoldsMore() => Prop.ForAll(Inputs.Between(263, 390), temperature =>
    {
        var fluid = Checks.MineralOil();
        return fluid.KinematicViscosityM2S(temperature + 0.5) < fluid.KinematicViscosityM2S(temperature)
            && fluid.DensityKgM3(temperature + 0.5) < fluid.DensityKgM3(temperature)
            && fluid.SaturationPpm(temperature + 0.5) > fluid.SaturationPpm(temperature);
    });

    [Theory]
    [InlineData("isoVg", 0)]
    [InlineData("isoVg", double.NaN)]
    [InlineData("viscosity40Mm2S", -46)]
    [InlineData("viscosity40Mm2S", double.NaN)]
    [InlineData("viscosity100Mm2S", 0)]
    [InlineData("density15KgM3", 0.87)]
    [InlineData("density15KgM3", double.PositiveInfinity)]
    [InlineData("expansionPerK", 0.7)]
    [InlineData("solubilityA", 99)]
    [InlineData("solubilityB", 99999)]
    [InlineData("interfacialTensionMNM", 500)]
    [InlineData("relativePermittivity", 0.5)]
    [InlineData("conductivityPSM", -1)]
    [InlineData("demulsibilityMin", -1)]
    [InlineData("waterLimitPpm", 2e6)]
    public void TryCreate_ImpossibleValue_IsRefusedByName(string field, double value)
    {
        var sheet = new FluidSheet { Family = FluidFamily.Mineral, SolubilityA = 7.0895, SolubilityB = 1567 };
        var property = typeof(FluidSheet).GetProperty(char.ToUpperInvariant(field[0]) + field[1..])!;
        property.SetValue(sheet, value);
        var refusals = new List<Refusal>();
        Assert.Null(FluidModel.TryCreate(sheet, refusals));
        var refusal = Assert.Single(refusals);
        Assert.Equal(field, refusal.Field);
        Assert.Equal(value.ToString("R", System.Globalization.CultureInfo.InvariantCulture), refusal.Value);
        Assert.Contains("must", refusal.Reason, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(7.0895, null, "solubilityB")]
    [InlineData(null, 1567.0, "solubilityA")]
    public void TryCreate_HalfACurve_IsRefused(double? a, double? b, string field)
    {
        var refusals = new List<Refusal>();
        Assert.Null(FluidModel.TryCreate(new FluidSheet { Family = FluidFamily.Mineral, SolubilityA = a, SolubilityB = b }, refusals));
        Assert.Equal(field, Assert.Single(refusals).Field);
    }

    [Fact]
    public void TryCreate_ThickerWhenHot_IsRefused()
    {
        var refusals = new List<Refusal>();
        Assert.Null(FluidModel.TryCreate(new FluidSheet { Family = FluidFamily.Mineral, Viscosity40Mm2S = 6.8, Viscosity100Mm2S = 46 }, refusals));
        Assert.Equal("viscosity100Mm2S", Assert.Single(refusals).Field);
    }

    [Fact]
    public void TryCreate_SeveralImpossibleValues_AreAllRefused()
    {
        var refusals = new List<Refusal>();
        Assert.Null(FluidModel.TryCreate(new FluidSheet { Family = FluidFamily.Mineral, IsoVg = -1, Density15KgM3 = 3, WaterLimitPpm = -5 }, refusals));
        Assert.Equal(["isoVg", "density15KgM3", "waterLimitPpm"], refusals.Select(refusal => refusal.Field));
    }

    [Fact]
    public void EveryProperty_NotATemperature_Throws()
    {
        var fluid = Checks.MineralOil();
        Assert.Throws<ArgumentOutOfRangeException>(() => fluid.KinematicViscosityM2S(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => fluid.DynamicViscosityPaS(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => fluid.DensityKgM3(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => fluid.SaturationPpm(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => fluid.HazeTemperatureK(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => fluid.WaterGoes(double.NaN));
    }

    [Fact]
    public void Working_Asked_NamesTheDefaultsAndTheSources()
    {
        var working = new Working();
        var fluid = Checks.Fluid(new FluidSheet { Family = FluidFamily.Mineral });
        fluid.DynamicViscosityPaS(313.15, working);
        fluid.SaturationPpm(313.15, working);
        Assert.Equal(["kinematic viscosity", "density of the fluid", "dynamic viscosity", "saturation"], working.Steps.Select(step => step.Name));
        Assert.All(working.Steps, step => Assert.NotEmpty(step.Source));
        Assert.Equal(3, working.Steps.Count(step => step.Flag is not null));
    }

    private static FluidModel Polyglycol(double density15, double expansion) =>
        Checks.Fluid(new FluidSheet { Family = FluidFamily.Pag, Density15KgM3 = density15, ExpansionPerK = expansion });

    // ester polarises more than hydrocarbons (from memory: about 3 against 2.2); a sheet always wins
    [Fact]
    public void ElectricProperties_SheetOrFamily_AreInSiUnits()
    {
        var family = Checks.Fluid(new FluidSheet { Family = FluidFamily.Ester });
        Assert.InRange(family.RelativePermittivity, 3, 3.6);
        Assert.InRange(family.InterfacialTensionNM, 0.01, 0.05);
        var given = Checks.Fluid(new FluidSheet { Family = FluidFamily.Ester, RelativePermittivity = 2.9, InterfacialTensionMNM = 17, ConductivityPSM = 250 });
        Assert.Equal(2.9, given.RelativePermittivity);
        Checks.Near(0.017, given.InterfacialTensionNM, 1e-12);
        Checks.Near(2.5e-10, given.ConductivitySM, 1e-12);
    }
}
