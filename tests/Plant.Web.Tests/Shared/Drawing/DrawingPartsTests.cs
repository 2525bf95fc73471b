using Bunit;
using Plant.Advice;
using Plant.Physics.Tanks;
using Plant.Web.Shared.Drawing;

namespace Plant.Web.Tests.Shared.Drawing;

public sealed class DrawingPartsTests : BunitContext
{
    private static readonly SectionState Tank = new()
    {
        Shape = TankShape.Rectangular, LengthMm = 2000, WidthMm = 1000, HeightMm = 1000, OilVolumeL = 1600, SuctionHeightMm = 120, Condition = Condition.FreeWater,
        SettledL = 40, SettledLowL = 20, SettledHighL = 70, CapacityL = 200,
    };

    [Theory]
    [InlineData(Condition.FreeWater, "g-water")]
    [InlineData(Condition.FreeWaterWhenCold, "g-hatch")]
    public void TankCell_Wet_IsToldByShapeAndWords(Condition condition, string shape)
    {
        var cell = Render<TankCell>(p => p.Add(c => c.State, Tank with { Condition = condition }));
        Assert.NotNull(cell.Find($".{shape}"));
        Assert.Equal(ConditionMark.Words(condition), cell.Find("svg").GetAttribute("aria-label"));
    }

    [Fact]
    public void TankCell_Dry_HoldsNothingInTheWatersHue() => Assert.Empty(Render<TankCell>(p => p.Add(c => c.State, Tank with { Condition = Condition.Dry })).FindAll(".g-water,.g-hatch"));

    [Fact]
    public void TankCell_Unknown_IsDashed() => Assert.Contains("dash", Render<TankCell>(p => p.Add(c => c.State, Tank with { Condition = Condition.Unknown })).Find("path").GetAttribute("class")!, StringComparison.Ordinal);

    [Fact]
    public void TankSection_TellsTheSameInWords()
    {
        var words = Render<TankSection>(p => p.Add(s => s.State, Tank)).Find("svg").GetAttribute("aria-label")!;
        Assert.Contains("free water", words, StringComparison.Ordinal);
        Assert.Contains("40 L", words, StringComparison.Ordinal);
        Assert.Contains("20–70", words, StringComparison.Ordinal);
        Assert.Contains("capacity 200 L", words, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(50, 0, 0)]
    [InlineData(150, 1, 0)]
    [InlineData(300, 1, 1)]
    public void HeadroomBar_FillsByTheTwoSaturations(double water, int hatched, int solid)
    {
        var bar = Render<HeadroomBar>(p => p.Add(b => b.Water, water).Add(b => b.Low, water - 5).Add(b => b.High, water + 5).Add(b => b.Warm, 250).Add(b => b.Cold, 100));
        Assert.Equal(hatched, bar.FindAll(".g-hatch").Count);
        Assert.Equal(solid, bar.FindAll(".g-water").Count);
    }

    [Fact]
    public void TankFoot_NamesEachHeightWithItsDate()
    {
        var foot = Render<TankFoot>(p => p.Add(f => f.State, Tank).Add(f => f.Steps, [new FootStep(120, "60 % of capacity", new DateTime(2026, 4, 2, 0, 0, 0, DateTimeKind.Utc))]));
        var words = foot.Find("svg").GetAttribute("aria-label")!;
        Assert.Contains("60 % of capacity 120 L, about 2 Apr", words, StringComparison.Ordinal);
        Assert.Contains("water 40 L", words, StringComparison.Ordinal);
    }

    [Fact]
    public void Interval_FiguresFollowTheInterval()
    {
        Assert.Equal("230 ppm 190–270", Render<Interval>(p => p.Add(i => i.Value, 229.3).Add(i => i.Low, 188.8).Add(i => i.High, 271.4).Add(i => i.Unit, "ppm")).Nodes.Aggregate("", (t, n) => t + n.TextContent).ReplaceLineEndings(" ").Trim().Replace("    ", "", StringComparison.Ordinal));
        Assert.Equal("not known", Render<Interval>(p => p.Add(i => i.Value, null)).Find(".iv").TextContent);
    }
}
