using Plant.Physics.Fluids;

namespace Plant.Advice.Tests;

public class CautionsTests
{
    [Theory]
    [InlineData(FluidFamily.Diesel, "vapour")]
    [InlineData(FluidFamily.PhosphateEster, "Phosphate ester")]
    [InlineData(FluidFamily.TransformerMineral, "PCB")]
    [InlineData(FluidFamily.Mineral, "oily waste")]
    public void For_Drain_NamesTheDangerOfTheFluid(FluidFamily family, string expected) =>
        Assert.Contains(Cautions.For(Histories.Tank with { Fluid = new FluidSheet { Family = family } }, true, null), c => c.Contains(expected, StringComparison.Ordinal));

    [Fact]
    public void For_VacuumDehydrator_NamesTheVessel() =>
        Assert.Contains(Cautions.For(Histories.Tank, false, SeparatorKind.VacuumDehydrator), c => c.Contains("Vacuum vessel", StringComparison.Ordinal));

    [Fact]
    public void For_NoWork_OnlyTheAdvisory() => Assert.Equal([Cautions.Advisory], Cautions.For(Histories.Tank, false, null));
}
