using Plant.Advice.Drains;

namespace Plant.Advice.Tests.Drains;

public class DrainPlanTests
{
    private static readonly SettledWater Filling = new(2, 0.3, 0.1, 0.3, 0, 20);

    [Fact]
    public void Of_Filling_TheRuleIsKeptUntilTheDateAndNotLongAfter()
    {
        var rule = new PlanningRule(0.6, 0.02);
        var plan = DrainPlan.Of(Filling, 20, rule, Histories.Now);
        var days = (plan.By!.Value - Histories.Now).TotalDays;

        Assert.True(Filling.ChanceAbove(12, days) <= 0.021);
        Assert.True(Filling.ChanceAbove(12, days + 1) > 0.02);
    }

    [Fact]
    public void Of_StricterRule_Sooner()
    {
        var usual = DrainPlan.Of(Filling, 20, new PlanningRule(), Histories.Now);
        var strict = DrainPlan.Of(Filling, 20, new PlanningRule(0.4, 0.01), Histories.Now);

        Assert.True(strict.By < usual.By);
        Assert.True(strict.IntervalDays < usual.IntervalDays);
    }

    [Fact]
    public void Of_NothingSettles_None()
    {
        var plan = DrainPlan.Of(new SettledWater(0, 0, 0, 0, 0, 10), 20, new PlanningRule(), Histories.Now);

        Assert.Equal(DrainPlan.None, plan);
    }

    [Fact]
    public void Of_FullAlready_Now() =>
        Assert.Equal(Histories.Now, DrainPlan.Of(Filling with { NowL = 15 }, 20, new PlanningRule(), Histories.Now).By);
}
