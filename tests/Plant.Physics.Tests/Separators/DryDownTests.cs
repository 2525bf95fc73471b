using Plant.Physics.Fluids;
using Plant.Physics.Separators;
using Plant.Physics.Water;

namespace Plant.Physics.Tests.Separators;

public sealed class DryDownTests
{
    private static readonly FluidModel Oil = Checks.Fluid(new FluidSheet
    {
        Family = FluidFamily.TransformerMineral, Viscosity40Mm2S = 9.5, Viscosity100Mm2S = 2.5, Density15KgM3 = 850, ExpansionPerK = 0, SolubilityA = 7.09, SolubilityB = 1567,
    });

    private static DryDownDuty Duty(DryingMethod method, double ingressKgDay = 0) => new()
    {
        Method = method, OilVolumeM3 = 5, FlowM3S = 5.0 / 3600, Efficiency = 0.8, OilTemperatureK = Checks.Kelvin(60), IngressKgS = ingressKgDay / 86_400,
    };

    /// <summary>A vacuum dehydrator with 20 mg/kg in equilibrium.</summary>
    private static DryDown Vacuum(double ingressKgDay = 0) => new(Oil, Duty(DryingMethod.VacuumDehydrator, ingressKgDay) with
    {
        PressurePa = 20 / Oil.SaturationPpm(Checks.Kelvin(60)) * WaterProperties.VapourPressurePa(Checks.Kelvin(60)),
    });

    // S·p/psat with log10 S = 7.09 − 1567/T (from memory) and psat by IF97, recomputed apart from this code; Wagner–Pruß differs by 0.006 %
    [Theory]
    [InlineData(500, 6.1028)]
    [InlineData(1000, 12.2057)]
    [InlineData(5000, 61.0283)]
    [InlineData(10_000, 122.0567)]
    [InlineData(50_000, 243.452)]
    public void EquilibriumPpm_Vacuum_IsTheTableCappedAtSaturation(double pressurePa, double expected) =>
        Checks.Near(expected, new DryDown(Oil, Duty(DryingMethod.VacuumDehydrator) with { PressurePa = pressurePa }).EquilibriumPpm, 1e-4);

    // 5 m³, 5 m³/h, η 0.8, from 300 with 20 mg/kg in equilibrium, recomputed apart from this code
    [Theory]
    [InlineData(1, 145.8121)]
    [InlineData(2, 76.5310)]
    [InlineData(4, 31.4134)]
    [InlineData(8, 20.4652)]
    public void AtPpm_Vacuum_IsTheTable(double hours, double expected) => Checks.Within(expected, Vacuum().AtPpm(300, hours * 3600), 6e-5);

    // the same to 50 mg/kg, and with 1 kg of water a day into oil of 850 kg/m³
    [Theory]
    [InlineData(0, 20, 2.791990)]
    [InlineData(1, 32.25490, 3.392408)]
    public void TimeToS_Vacuum_IsTheTable(double ingressKgDay, double floor, double hours)
    {
        var drying = Vacuum(ingressKgDay);
        Checks.Near(floor, Assert.NotNull(drying.FloorPpm), 2e-7);
        Checks.Near(hours, Assert.NotNull(drying.TimeToS(300, 50)) / 3600, 2e-7);
    }

    [Fact]
    public void TimeToS_FloorAboveTarget_IsNeverReached()
    {
        Assert.Null(Vacuum(1).TimeToS(300, 32));
        Assert.NotNull(Vacuum(1).TimeToS(300, 32.3));
        Assert.Equal(0, Vacuum(1).TimeToS(20, 25));
    }

    [Theory]
    [InlineData(DryingMethod.Coalescer)]
    [InlineData(DryingMethod.ElectrostaticCoalescer)]
    [InlineData(DryingMethod.Centrifuge)]
    public void WhatTakesDrops_NeverGoesBelowSaturation(DryingMethod method)
    {
        var drying = new DryDown(Oil, Duty(method));
        var saturation = Oil.SaturationPpm(Checks.Kelvin(60));
        Assert.Equal(saturation, drying.FloorPpm);
        Assert.Null(drying.TimeToS(600, saturation - 1));
        Assert.Equal(100, drying.AtPpm(100, 1e6));
        Assert.Equal(100, drying.EndPpm(100));
        Checks.Near(saturation + ((600 - saturation) * Math.Exp(-0.8)), drying.AtPpm(600, 3600), 1e-12);
    }

    [Fact]
    public void AtPpm_DryOilAtACoalescer_RisesStraightThenBends()
    {
        var drying = new DryDown(Oil, Duty(DryingMethod.Coalescer, 20));
        var saturation = drying.SaturationPpm;
        var toSaturation = (saturation - 100) / drying.IngressPpmS;
        Checks.Near(150, drying.AtPpm(100, 50 / drying.IngressPpmS), 1e-12);
        Checks.Near(saturation, drying.AtPpm(100, toSaturation), 1e-12);
        var floor = Assert.NotNull(drying.FloorPpm);
        Checks.Near(floor + ((saturation - floor) * Math.Exp(-0.8)), drying.AtPpm(100, toSaturation + 3600), 1e-12);
    }

    [Fact]
    public void Purge_WetOil_DriesStraightDownToSaturation()
    {
        var drying = new DryDown(Oil, Duty(DryingMethod.DryAirPurge) with { FlowM3S = 1e-3, DewPointK = 250 });
        var fall = drying.RatePpmS(drying.SaturationPpm);
        Assert.Equal(fall, drying.RatePpmS(drying.SaturationPpm + 300), 12);
        Checks.Near(drying.SaturationPpm + 100, drying.AtPpm(drying.SaturationPpm + 300, -200 / fall), 1e-12);
        // the water that goes is what the air carries: psat(60 °C) over the air's own
        var carried = 0.8 * PurgeAir.RemovalKgS(1e-3, Checks.Kelvin(60), WaterProperties.VapourPressurePa(Checks.Kelvin(60)), WaterProperties.VapourPressurePa(250));
        Checks.Near(-carried, fall * 1e-6 * drying.OilMassKg, 1e-9);
    }

    [Fact]
    public void Purge_MoreWaterThanTheAirCarries_HasNoFloor()
    {
        var drying = new DryDown(Oil, Duty(DryingMethod.DryAirPurge, 500) with { FlowM3S = 1e-4 });
        Assert.Null(drying.FloorPpm);
        Assert.Null(drying.EndPpm(100));
        Assert.Null(drying.TimeToS(800, 300));
        Assert.True(drying.AtPpm(100, 1e6) > drying.SaturationPpm);
    }

    [Fact]
    public void Absorbent_TakesHalfOfSaturationAndGivesNothingBack()
    {
        var drying = new DryDown(Oil, Duty(DryingMethod.Absorbent));
        Checks.Near(0.5 * drying.SaturationPpm, Assert.NotNull(drying.FloorPpm), 1e-12);
        Assert.Equal(50, drying.AtPpm(50, 1e5));
    }

    private static DryDown Any(int method, double ingress, double flow) =>
        new(Oil, Duty((DryingMethod)method, ingress) with { FlowM3S = flow, PressurePa = 3000 });

    [Property(MaxTest = 400)]
    public Property AtPpm_AnyMethod_SolvesItsRate() => Prop.ForAll(Inputs.OneOf(0, 2, 4, 5, 6), Inputs.Between(0, 800), Inputs.Logarithmic(10, 1e6), (method, start, time) =>
    {
        var drying = Any(method, 5, 1e-3);
        var step = 1e-4 * time;
        var slope = (drying.AtPpm(start, time + step) - drying.AtPpm(start, time)) / step;
        var (a, b) = (drying.RatePpmS(drying.AtPpm(start, time)), drying.RatePpmS(drying.AtPpm(start, time + step)));
        return slope >= Math.Min(a, b) - 1e-9 && slope <= Math.Max(a, b) + 1e-9;
    });

    [Property(MaxTest = 400)]
    public Property TimeToS_AnyMethod_IsTheInverse() => Prop.ForAll(Inputs.OneOf(0, 2, 4, 5), Inputs.Between(100, 900), Inputs.Between(0, 900), (method, start, target) =>
    {
        var drying = Any(method, 0.5, 1e-3);
        return drying.TimeToS(start, target) is not { } time || (time == 0 ? start <= target : Math.Abs(drying.AtPpm(start, time) - target) < 1e-6);
    });

    [Property(MaxTest = 300)]
    public Property AtPpm_LongerOrInTwoSteps_IsMonotoneAndTheSame() => Prop.ForAll(Inputs.OneOf(0, 2, 4, 5), Inputs.Between(0, 900), Inputs.Logarithmic(10, 1e5), (method, start, time) =>
    {
        var drying = Any(method, 3, 1e-3);
        var once = drying.AtPpm(start, time);
        var twice = drying.AtPpm(drying.AtPpm(start, 0.3 * time), 0.7 * time);
        var later = drying.AtPpm(start, 2 * time);
        return Math.Abs(once - twice) < 1e-7 && (later - once) * (once - start) >= -1e-9;
    });

    [Property]
    public Property FloorPpm_MoreIngressOrLessFlow_IsHigher() => Prop.ForAll(Inputs.OneOf(0, 2, 4), Inputs.Between(0.1, 10), (method, ingress) =>
        Any(method, ingress * 1.1, 1e-3).FloorPpm > Any(method, ingress, 1e-3).FloorPpm && Any(method, ingress, 1e-3).FloorPpm > Any(method, ingress, 2e-3).FloorPpm);

    [Fact]
    public void EveryMember_BadArgument_Throws()
    {
        var good = Duty(DryingMethod.VacuumDehydrator);
        foreach (var duty in new[] { good with { Efficiency = 0 }, good with { Efficiency = 80 }, good with { FlowM3S = 0 }, good with { OilVolumeM3 = double.NaN }, good with { OilTemperatureK = -1 }, good with { IngressKgS = -1 }, good with { PressurePa = 0 } })
        {
            Assert.Throws<ArgumentOutOfRangeException>(() => new DryDown(Oil, duty));
        }

        Assert.Throws<ArgumentOutOfRangeException>(() => Vacuum().AtPpm(-1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Vacuum().AtPpm(1, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Vacuum().TimeToS(1, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Vacuum().RatePpmS(double.NaN));
        var soluble = Checks.Fluid(new FluidSheet { Family = FluidFamily.Pag });
        Assert.Throws<InvalidOperationException>(() => new DryDown(soluble, good));
    }

    [Fact]
    public void Removes_Method_NamesTheForms()
    {
        Assert.False(DryingMethods.Removes(DryingMethod.Coalescer).HasFlag(WaterForms.Dissolved));
        Assert.False(DryingMethods.Removes(DryingMethod.Centrifuge).HasFlag(WaterForms.Dissolved));
        Assert.True(DryingMethods.Removes(DryingMethod.VacuumDehydrator).HasFlag(WaterForms.Free | WaterForms.Emulsified | WaterForms.Dissolved));
        Assert.Equal(WaterForms.Dissolved, DryingMethods.Removes(DryingMethod.DesiccantBreather));
    }

    // at most 20 µs a call (measured near 0.5 µs); the quickest of many batches, since the machine may be busy
    [Fact]
    public void Call_WithoutWorking_TakesMicroseconds()
    {
        const int calls = 500;
        var duty = Duty(DryingMethod.VacuumDehydrator, 1);
        var quickest = TimeSpan.MaxValue;
        for (var batch = 0; batch < 30; batch++)
        {
            var start = TimeProvider.System.GetTimestamp();
            for (var i = 0; i < calls; i++)
            {
                Assert.NotNull(new DryDown(Oil, duty).TimeToS(300, 50));
            }

            var took = TimeProvider.System.GetElapsedTime(start);
            quickest = took < quickest ? took : quickest;
        }

        Assert.InRange(quickest.TotalMicroseconds / calls, 0, 20);
    }
}
