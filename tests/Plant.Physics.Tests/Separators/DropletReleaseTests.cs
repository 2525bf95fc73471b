using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class DropletReleaseTests
{
    // 30 µm contact, 30 mN/m, 142.2 kg/m³: 1.5703 mm, recomputed apart from this code
    [Fact]
    public void WeightM_Example_IsTatesLaw() => Checks.Near(1.5703e-3, DropletRelease.WeightM(30e-6, 0.03, 142.2), 3e-5);

    [Property]
    public Property WeightM_AtTheSize_WeightIsTension() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-4), Inputs.Between(-200, -5), (contact, difference) =>
    {
        var d = DropletRelease.WeightM(contact, 0.03, difference);
        return Math.Abs((Math.PI / 6 * d * d * d * -difference * Constants.GravityMS2 / (Math.PI * contact * 0.03)) - 1) < 1e-12;
    });

    [Property]
    public Property DragM_AtTheSize_DragIsTension() => Prop.ForAll(Inputs.Logarithmic(1e-6, 1e-4), Inputs.Logarithmic(1e-4, 0.1), (contact, velocity) =>
        Math.Abs((3 * Math.PI * 0.04 * velocity * DropletRelease.DragM(contact, 0.03, 0.04, velocity) / (Math.PI * contact * 0.03)) - 1) < 1e-12);

    // 2 L/s at 0.01 m/s on 0.05 m² each: exactly four, in spite of rounding
    [Theory]
    [InlineData(2e-3, 4)]
    [InlineData(2.001e-3, 5)]
    [InlineData(0, 0)]
    public void Elements_Flow_IsRoundedUp(double flow, double count) => Assert.Equal(count, DropletRelease.Elements(flow, 0.01, 0.05));

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => DropletRelease.WeightM(1, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => DropletRelease.WeightM(0, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => DropletRelease.DragM(1, 1, 1, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => DropletRelease.Elements(-1, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => DropletRelease.Elements(1, 0, 1));
    }
}
