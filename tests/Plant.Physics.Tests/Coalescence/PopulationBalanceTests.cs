using Plant.Physics.Coalescence;
using Plant.Physics.Droplets;

namespace Plant.Physics.Tests.Coalescence;

public sealed class PopulationBalanceTests
{
    // Two-moment cells solved by SUNDIALS give number 1.344559e11 and 24.25961 ppm at 80 cells, 1.326257e11 and 24.03585 ppm at 160;
    // at 320 and 640 cells 1.321014e11 and 23.95745 ppm, 1.319480e11 and 23.93097 ppm, which extrapolate to 1.3189e11 and 23.92.
    [Theory]
    [InlineData(60, 0.004, 0.002)]
    [InlineData(80, 0.0015, 0.0005)]
    [InlineData(160, 0.0005, 0.0003)]
    public void Solve_StandingTank_IsTheConvergedAnswer(int cells, double ofNumber, double ofWater)
    {
        var result = new PopulationBalance(new VolumeGrid(cells), Balances.StandingTank).Solve(Balances.TankStart, 500e-6, [86_400]);
        var end = Assert.Single(result.States);
        Checks.Near(ConvergedNumber, end.NumberPerM3, ofNumber);
        Checks.Near(ConvergedPpm * 1e-6, end.SuspendedVolumeFraction, ofWater);
        Checks.Near(1 - (ConvergedPpm / 500), end.SettledVolumeFraction / 500e-6, 2e-4);
        Assert.True(result.Complete && result.Steps < 60);
    }

    private const double ConvergedNumber = 1.3188e11;
    private const double ConvergedPpm = 23.918;

    [Theory]
    [InlineData(8e-6, 1.6)]
    [InlineData(30e-6, 1.9)]
    [InlineData(200e-6, 1.3)]
    public void Solve_AtTheStart_IsTheDistribution(double median, double deviation)
    {
        var start = LognormalDistribution.ByVolume(median, deviation);
        var state = new PopulationBalance(new VolumeGrid(80), Balances.StandingTank).Solve(start, 1e-3, [0]).States[0];
        Checks.Near(1e-3, state.SuspendedVolumeFraction, 1e-12);
        Checks.Near(median, Assert.NotNull(state.MedianM), 2e-3);
        Checks.Near(1e-3 / (Math.PI / 6 * Math.Pow(start.MeanM(3, 0), 3)), state.NumberPerM3, 2e-3);
    }

    // narrower than the cells: number and volume are still kept
    [Theory]
    [InlineData(1)]
    [InlineData(1.02)]
    public void Solve_NarrowStart_KeepsNumberAndVolume(double deviation)
    {
        var start = LognormalDistribution.ByVolume(20e-6, deviation);
        var state = new PopulationBalance(new VolumeGrid(40), Balances.StandingTank).Solve(start, 1e-3, [0]).States[0];
        Checks.Near(1e-3 / (Math.PI / 6 * Math.Pow(start.MeanM(3, 0), 3)), state.NumberPerM3, 1e-3);
        Checks.Near(1e-3, state.WaterByCell.Sum(), 1e-12);
    }

    [Fact]
    public void Solve_Twice_IsTheSame()
    {
        var balance = new PopulationBalance(new VolumeGrid(40), Balances.StandingTank);
        var first = balance.Solve(Balances.TankStart, 500e-6, [3600, 86_400]);
        var second = balance.Solve(Balances.TankStart, 500e-6, [3600, 86_400]);
        Assert.Equal(first.States[1].WaterByCell, second.States[1].WaterByCell);
        Assert.Equal((first.Steps, first.Evaluations), (second.Steps, second.Evaluations));
    }

    [Fact]
    public void Solve_MoreTimes_HardlyMoveTheEnd()
    {
        var balance = new PopulationBalance(new VolumeGrid(60), Balances.StandingTank);
        var once = balance.Solve(Balances.TankStart, 500e-6, [86_400]).States[0];
        var often = balance.Solve(Balances.TankStart, 500e-6, [.. Enumerable.Range(0, 25).Select(i => 3600.0 * i)]).States[^1];
        Checks.Near(once.NumberPerM3, often.NumberPerM3, 1e-4);
        Checks.Near(once.SuspendedVolumeFraction, often.SuspendedVolumeFraction, 1e-4);
    }

    [Fact]
    public void Solve_LongerTime_AllocatesNoMore()
    {
        var balance = new PopulationBalance(new VolumeGrid(40), Balances.StandingTank);
        balance.Solve(Balances.TankStart, 500e-6, [60]);
        long Allocated(double time)
        {
            var before = GC.GetAllocatedBytesForCurrentThread();
            balance.Solve(Balances.TankStart, 500e-6, [time]);
            return GC.GetAllocatedBytesForCurrentThread() - before;
        }

        Assert.Equal(Allocated(60), Allocated(864_000));
    }

    [Fact]
    public void Solve_TooManySteps_EndsIncomplete()
    {
        var result = new PopulationBalance(new VolumeGrid(20), Balances.StandingTank).Solve(Balances.TankStart, 500e-6, [.. Enumerable.Range(1, PopulationBalance.MostSteps + 100).Select(i => (double)i)]);
        Assert.False(result.Complete);
        Assert.Equal((PopulationBalance.MostSteps, PopulationBalance.MostSteps), (result.Steps, result.States.Count));
    }

    [Fact]
    public void Solve_Cancelled_Stops()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();
        Assert.Throws<OperationCanceledException>(() => new PopulationBalance(new VolumeGrid(40), Balances.StandingTank).Solve(Balances.TankStart, 500e-6, [86_400], stop.Token));
    }

    [Fact]
    public void Solve_GrowthPastTheLastCell_StaysInIt()
    {
        // no settling and a fast kernel: all ends as drops of the largest size
        var result = new PopulationBalance(new VolumeGrid(40), Balances.StandingTank with { SettlingMS = _ => 0, KernelM3S = (a, b) => 1e4 * (a + b) * (a + b) * (a + b) }).Solve(Balances.TankStart, 1e-2, [86_400]);
        Assert.True(result.Complete);
        Checks.Near(1e-2, result.States[0].WaterByCell[^1], 1e-6);
        Assert.Equal(0, result.States[0].SettledVolumeFraction, 1e-15);
    }

    [Fact]
    public void Solve_NoWater_StaysEmpty()
    {
        var result = new PopulationBalance(new VolumeGrid(40), Balances.StandingTank).Solve(Balances.TankStart, 0, [3600]);
        Assert.True(result.Complete);
        Assert.Equal((0, 0, null), (result.States[0].NumberPerM3, result.MassErrorFraction, result.States[0].MedianM));
    }

    [Fact]
    public void EveryMethod_BadArgument_Throws()
    {
        var grid = new VolumeGrid(40);
        var good = Balances.StandingTank;
        Assert.Throws<ArgumentNullException>(() => new PopulationBalance(null!, good));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PopulationBalance(grid, good with { DepthM = 0 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PopulationBalance(grid, good with { Depths = 0 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PopulationBalance(grid, good with { Tolerance = double.NaN }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PopulationBalance(grid, good with { SourcePerS = -1 }));
        Assert.Throws<ArgumentException>(() => new PopulationBalance(grid, good with { SourcePerS = 1 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PopulationBalance(grid, good with { SettlingMS = _ => -1 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => new PopulationBalance(grid, good with { KernelM3S = (_, _) => double.NaN }));
        var balance = new PopulationBalance(grid, good);
        Assert.Throws<ArgumentOutOfRangeException>(() => balance.Solve(Balances.TankStart, double.NaN, [1]));
        Assert.Throws<ArgumentOutOfRangeException>(() => balance.Solve(Balances.TankStart, 1e-3, [2, 1]));
        Assert.Throws<ArgumentOutOfRangeException>(() => balance.Solve(Balances.TankStart, 1e-3, [double.NaN]));
        Assert.Throws<ArgumentNullException>(() => balance.Solve(null!, 1e-3, [1]));
        Assert.Throws<ArgumentException>(() => balance.Solve(LognormalDistribution.ByVolume(1e-8, 1.01), 1e-3, [1]));
    }
}
