using Plant.Physics.Fluids;
using Plant.Physics.Separators;

namespace Plant.Physics.Tests.Separators;

public sealed class FibreCoalescerTests
{
    // 850 kg/m³ and 46 mm²/s: 0.0391 Pa·s at 40 °C
    private static readonly FluidModel Oil = Checks.Fluid(new FluidSheet { Family = FluidFamily.Mineral, Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 850, ExpansionPerK = 0 });

    private static readonly FibreBed Bed = new() { FibreM = 10e-6, Solidity = 0.1, ThicknessM = 5e-3, FaceVelocityMS = 5e-3 };

    // recomputed apart from this code
    [Theory]
    [InlineData(1e-6, 0.697072)]
    [InlineData(3e-6, 0.999920)]
    public void Removal_Drops_IsTheTable(double diameter, double share) => Checks.Within(share, new FibreCoalescer(Oil, 313.15, Bed).Removal(diameter), 1e-6);

    [Property]
    public Property Removal_Stages_MultiplyPenetrationAndAddPressure() => Prop.ForAll(Inputs.Logarithmic(1e-8, 1e-5), Inputs.OneOf(2, 3, 5), (diameter, stages) =>
    {
        var one = new FibreCoalescer(Oil, 320, Bed);
        var all = new FibreCoalescer(Oil, 320, Bed with { Stages = stages });
        return Math.Abs(1 - all.Removal(diameter) - Math.Pow(1 - one.Removal(diameter), stages)) < 1e-12 && Math.Abs((all.PressureDropPa / one.PressureDropPa) - stages) < 1e-12;
    });

    // diffusion falls and interception rises with size: one least caught size between
    [Fact]
    public void Removal_Sizes_HasOneMinimum()
    {
        var coalescer = new FibreCoalescer(Oil, 333, Bed with { ThicknessM = 1e-3, FaceVelocityMS = 1e-3 });
        var shares = Enumerable.Range(0, 200).Select(i => coalescer.Removal(1e-9 * Math.Pow(10, i / 50.0))).ToList();
        var least = shares.IndexOf(shares.Min());
        Assert.InRange(least, 1, 198);
        Assert.All(Enumerable.Range(1, 199), i => Assert.True(i <= least ? shares[i] <= shares[i - 1] : shares[i] >= shares[i - 1]));
    }

    [Fact]
    public void Removal_SlowerOrThicker_CatchesMore()
    {
        var usual = new FibreCoalescer(Oil, 333, Bed).Removal(5e-7);
        Assert.True(new FibreCoalescer(Oil, 333, Bed with { FaceVelocityMS = 1e-4 }).Removal(5e-7) > usual);
        Assert.True(new FibreCoalescer(Oil, 333, Bed with { ThicknessM = 8e-3 }).Removal(5e-7) > usual);
        Assert.True(new FibreCoalescer(Oil, 333, Bed with { FibreM = 5e-6 }).Removal(5e-7) > usual);
    }

    [Fact]
    public void EveryMember_BadArgument_Throws()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new FibreCoalescer(Oil, 313, Bed with { FaceVelocityMS = 0 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FibreCoalescer(Oil, 313, Bed with { Stages = 0 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FibreCoalescer(Oil, double.NaN, Bed));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FibreCoalescer(Oil, 313, Bed).Removal(0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FibreCoalescer(Oil, 313, Bed).FibreEfficiency(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new FibreCoalescer(Oil, 313, Bed).Peclet(-1));
    }
}
