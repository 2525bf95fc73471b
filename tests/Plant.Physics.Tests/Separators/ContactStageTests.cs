using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class ContactStageTests
{
    // Kremser 1930 (from memory), recomputed apart from this code
    [Theory]
    [InlineData(2, 1, 0.666667)]
    [InlineData(2, 2, 0.857143)]
    [InlineData(2, 3, 0.933333)]
    [InlineData(0.5, 2, 0.428571)]
    [InlineData(1, 3, 0.75)]
    public void Kremser_Factors_AreTheTable(double factor, double stages, double expected) => Checks.Within(expected, ContactStage.Kremser(factor, stages), 5e-7);

    [Property]
    public Property Kremser_MoreStagesOrGas_TakeMore() => Prop.ForAll(Inputs.Logarithmic(0.05, 50), Inputs.Between(1, 20), (factor, stages) =>
    {
        var share = ContactStage.Kremser(factor, stages);
        return share is > 0 and <= 1 && ContactStage.Kremser(factor, stages + 1) >= share && ContactStage.Kremser(factor * 1.1, stages) >= share && share <= Math.Min(1, factor) + 1e-12;
    });

    [Fact]
    public void Kremser_NearOneAndManyStages_HasNoJump()
    {
        Checks.Near(ContactStage.Kremser(1, 4), ContactStage.Kremser(1 + 2e-7, 4), 1e-6);
        Assert.Equal(1, ContactStage.Kremser(3, 5000));
    }

    [Fact]
    public void Efficiency_Contents_IsTheShareOfTheWay()
    {
        Checks.Near(0.8, ContactStage.Efficiency(300, 76, 20), 1e-12);
        Assert.Throws<ArgumentOutOfRangeException>(() => ContactStage.Efficiency(20, 20, 20));
        Assert.Throws<ArgumentOutOfRangeException>(() => ContactStage.Efficiency(double.NaN, 20, 20));
        Assert.Throws<ArgumentOutOfRangeException>(() => ContactStage.Kremser(0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ContactStage.Kremser(1, double.NaN));
    }
}
