using Plant.Advice.Ledger;

namespace Plant.Advice.Tests.Ledger;

public class OilWaterTests
{
    private static readonly double[] Steady = [100, 104, 98, 102, 101, 99];

    [Fact]
    public void Assess_DirtyBottleSinceContradicted_MovesAlmostNothing()
    {
        var clean = Histories.Tank.Sampled(Steady).Assess();
        var dirty = Histories.Tank.Sampled(100, 104, 98, 950, 101, 99).Assess();

        Assert.InRange(dirty.WaterPpm!.Value / clean.WaterPpm!.Value, 0.9, 1.1);
        Assert.InRange(dirty.WaterPpmHigh90!.Value / clean.WaterPpmHigh90!.Value, 0.8, 1.2);
        Assert.Equal(clean.Condition, dirty.Condition);
    }

    [Fact]
    public void Assess_NewestIsFarAbove_MedianStaysIntervalHoldsBothAndAskForAnother()
    {
        var said = Histories.Tank.Sampled([.. Steady, 950]).Assess();

        Assert.InRange(said.WaterPpm!.Value, 85, 200);
        Assert.True(said.WaterPpmHigh90 > 900);
        Assert.Contains(said.Actions, action => action.Contains("another sample", StringComparison.Ordinal));
    }

    [Fact]
    public void Assess_OlderSamples_WiderInterval()
    {
        var history = Histories.Tank.Sampled(Steady);
        var late = Assessor.Assess(history, Histories.Now.AddDays(120), new PlanningRule());
        var now = history.Assess();

        Assert.True(late.WaterPpmHigh90 / late.WaterPpmLow90 > now.WaterPpmHigh90 / now.WaterPpmLow90);
    }

    [Fact]
    public void Assess_DriedSince_OlderSamplesSayNothing()
    {
        var run = new SeparatorRun(SeparatorKind.VacuumDehydrator, Histories.Now.AddDays(-30), Histories.Now.AddDays(-20), 40, 0.8, 5, 60, null);
        var said = (Histories.Tank.Sampled(300, 305, 298, 302, 60) with { SeparatorRuns = [run] }).Assess();

        Assert.InRange(said.WaterPpm!.Value, 50, 75);
    }

    [Theory]
    [InlineData(100.0)]
    [InlineData(950.0)]
    [InlineData(60.0)]
    public void Estimate_AnyNewest_WeightsAddUpToOne(double newest)
    {
        var history = Histories.Tank.Sampled([.. Steady, newest]);
        var observations = Observations.Of(history, null, Histories.Now);

        var water = OilWater.Estimate(observations, Histories.Now, null, 260, 40)!;

        Assert.True(water.Cases.Count > 1);
        Assert.Equal(1, water.Cases.Sum(one => one.Weight), 12);
    }
}
