using Plant.Advice.Dehydration;
using Plant.Advice.Ledger;
using Plant.Physics.Fluids;

namespace Plant.Advice.Tests.Dehydration;

/// <summary>Choices as common practice makes them.</summary>
public class MethodChoiceTests
{
    [Theory]
    [InlineData(FluidFamily.Mineral, 46, 100, 0, SeparatorKind.VacuumDehydrator)]
    [InlineData(FluidFamily.Mineral, 46, 400, 300, SeparatorKind.Coalescer)]
    [InlineData(FluidFamily.Mineral, 680, 400, 300, SeparatorKind.VacuumDehydrator)]
    [InlineData(FluidFamily.Diesel, 3, 400, 300, SeparatorKind.Coalescer)]
    [InlineData(FluidFamily.Diesel, 3, 50, 0, SeparatorKind.Absorbent)]
    [InlineData(FluidFamily.PhosphateEster, 46, 1000, 0, SeparatorKind.VacuumDehydrator)]
    [InlineData(FluidFamily.TransformerMineral, 10, 20, 0, SeparatorKind.VacuumDehydrator)]
    public void For_WhatMustGoAndWhatTheFluidAllows_Kind(FluidFamily family, double isoVg, double targetPpm, double emulsifiedPpm, SeparatorKind expected)
    {
        var sheet = new FluidSheet { Family = family, IsoVg = isoVg, InterfacialTensionMNM = 30, DemulsibilityMin = 10, Viscosity40Mm2S = isoVg };
        var oil = OilState.Of(Histories.Tank with { Fluid = sheet, OilVolumeL = 2000 });

        Assert.Equal(expected, MethodChoice.For(oil, targetPpm, emulsifiedPpm).Kind);
    }

    [Fact]
    public void For_TightEmulsion_NoCoalescer()
    {
        var oil = OilState.Of(Histories.Tank with { Fluid = Simulation.Oils.Turbine with { DemulsibilityMin = 60 } });

        Assert.Equal(SeparatorKind.VacuumDehydrator, MethodChoice.For(oil, 400, 300).Kind);
    }

    [Fact]
    public void For_SmallVolumeAboveADissolvedTarget_Absorbent() =>
        Assert.Equal(SeparatorKind.Absorbent, MethodChoice.For(OilState.Of(Histories.Tank with { OilVolumeL = 80 }), 100, 0).Kind);
}
