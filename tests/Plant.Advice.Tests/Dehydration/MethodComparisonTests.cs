using Plant.Advice.Dehydration;
using Plant.Advice.Ledger;
using Plant.Physics.Fluids;

namespace Plant.Advice.Tests.Dehydration;

public class MethodComparisonTests
{
    private static readonly OilState Oil = OilState.Of(Histories.Tank);

    [Fact]
    public void TargetBelowSaturation_IsReachedByVacuumAndNotByACoalescer()
    {
        var saturation = Oil.SaturationPpm!.Value;
        var options = MethodComparison.Of(Oil, new MethodTask(0.9 * saturation, 0.4 * saturation, 10, 0));
        Assert.True(Option(options, SeparatorKind.VacuumDehydrator).Works);
        var coalescer = options.First(o => o is { Kind: SeparatorKind.Coalescer, First: "" });
        Assert.False(coalescer.Works);
        Assert.Contains("above the target", coalescer.Out, StringComparison.Ordinal);
        Assert.Equal(saturation, coalescer.FloorPpm!.Value, 0.05 * saturation);
    }

    [Fact]
    public void CoolingFirst_LetsACoalescerGoBelowItsWarmFloor()
    {
        var target = 1.3 * Math.Max(Oil.SaturationColdestPpm!.Value, Oil.Fluid!.SaturationPpm(293.15));
        Assert.True(target < Oil.SaturationPpm);
        var options = MethodComparison.Of(Oil, new MethodTask(Oil.SaturationPpm!.Value, target, 1, 0));
        Assert.False(options.First(o => o is { Kind: SeparatorKind.Coalescer, First: "" }).Works);
        Assert.True(options.First(o => o.Kind == SeparatorKind.Coalescer && o.First.StartsWith("cool", StringComparison.Ordinal)).Works);
    }

    [Fact]
    public void SettledWater_IsDrainedFirst() =>
        Assert.Equal("drain", Option(MethodComparison.Of(Oil, new MethodTask(300, 100, 10, 20)), SeparatorKind.VacuumDehydrator).First);

    [Theory]
    [InlineData(FluidFamily.Diesel, SeparatorKind.VacuumDehydrator, "light ends")]
    [InlineData(FluidFamily.Diesel, SeparatorKind.ElectrostaticCoalescer, "ignite")]
    [InlineData(FluidFamily.PhosphateEster, SeparatorKind.ElectrostaticCoalescer, "conducts")]
    public void UnsafeOrUnfit_IsOutWithItsReason(FluidFamily family, SeparatorKind kind, string why)
    {
        var oil = OilState.Of(Histories.Tank with { Fluid = new FluidSheet { Family = family } });
        Assert.Contains(why, Option(MethodComparison.Of(oil, new MethodTask(1000, 400, 10, 0)), kind).Out, StringComparison.Ordinal);
    }

    [Fact]
    public void MoreIngress_NeverMakesAnyMethodFaster()
    {
        for (var start = 150; start < 900; start += 150)
        {
            var calm = MethodComparison.Of(Oil, new MethodTask(start, 100, 5, 0)).ToDictionary(o => (o.Kind, o.First));
            foreach (var option in MethodComparison.Of(Oil, new MethodTask(start, 100, 500, 0)).Where(o => o is { Works: true, Kind: not null }))
            {
                Assert.True(calm[(option.Kind, option.First)].Hours <= option.Hours);
            }
        }
    }

    [Fact]
    public void WhatWorks_StandsFirstAndCheapestFirst()
    {
        var options = MethodComparison.Of(Oil, new MethodTask(300, 120, 10, 2));
        var works = options.TakeWhile(o => o.Works).ToList();
        Assert.All(options.Skip(works.Count), o => Assert.False(o.Works));
        Assert.Equal(works.Select(o => o.Cost).Order(), works.Select(o => o.Cost));
        Assert.NotEmpty(works);
    }

    [Fact]
    public void WithoutVolume_NothingIsClaimed() => Assert.Empty(MethodComparison.Of(OilState.Of(Histories.Tank with { OilVolumeL = null }), new MethodTask(300, 100, 10, 0)));

    private static MethodOption Option(IReadOnlyList<MethodOption> options, SeparatorKind kind) => options.First(o => o.Kind == kind);
}
