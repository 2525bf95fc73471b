using Plant.Advice.Tests.Simulation;
using Plant.Physics;
using Plant.Physics.Fluids;

namespace Plant.Advice.Tests;

public class AssessorTests
{
    [Fact]
    public void Assess_NothingRecorded_UnknownAndNoSamples()
    {
        var said = Histories.Tank.Assess();

        Assert.Equal(Condition.Unknown, said.Condition);
        Assert.Equal(Basis.NoSamples, said.Basis);
        Assert.Null(said.WaterPpm);
        Assert.Null(said.SettledWaterL);
        Assert.Null(said.DrainBy);
        Assert.True(said.SampleOverdue);
        Assert.Contains("No usable sample", said.Reason, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(30, Condition.Dry)]
    [InlineData(75, Condition.NearSaturation)]
    [InlineData(150, Condition.FreeWaterWhenCold)]
    [InlineData(400, Condition.FreeWater)]
    public void Assess_SteadySamples_ConditionIsTheFirstThatHolds(double ppm, Condition expected)
    {
        // saturation of this oil by its own curve: 238 mg/kg at 50 °C, 80 at 20 °C; 0.8 of that is 64
        var said = Histories.Tank.Sampled(ppm, ppm, ppm, ppm, ppm, ppm).Drained(0, 0, 0, 0, 0, 0).Assess();

        Assert.Equal(expected, said.Condition);
        Assert.Equal(Basis.Measured, said.Basis);
        Assert.InRange(said.SaturationColdestPpm!.Value, 79.9, 80.1);
        Assert.InRange(said.SaturationNowPpm!.Value, 237, 240);
    }

    [Fact]
    public void Assess_SteadySamples_IntervalHoldsTheirMeanAndSplitAddsUp()
    {
        var said = Histories.Tank.Sampled(395, 405, 400, 410, 390, 400).Assess();

        Assert.InRange(said.WaterPpm!.Value, 340, 420);
        Assert.True(said.WaterPpmLow90 < 395 && said.WaterPpmHigh90 > 405);
        Assert.Equal(said.WaterPpm.Value, said.DissolvedPpm!.Value + said.EmulsifiedPpm!.Value, 9);
        Assert.Equal(said.SaturationNowPpm!.Value, said.DissolvedPpm.Value, 9);
    }

    [Fact]
    public void Assess_FluidWithoutItsOwnCurve_SaysFamilyDefault()
    {
        var said = (Histories.Tank with { Fluid = Oils.Turbine with { SolubilityA = null, SolubilityB = null } }).Sampled(50, 50, 50).Assess();

        Assert.Equal(Basis.FamilyDefault, said.Basis);
        Assert.NotNull(said.SaturationNowPpm);
    }

    [Fact]
    public void Assess_WaterSolubleGlycol_UnknownWithTheReason()
    {
        var said = (Histories.Tank with { Fluid = Histories.Glycol }).Sampled(4000, 4100, 4000).Assess();

        Assert.Equal(Condition.Unknown, said.Condition);
        Assert.Null(said.SaturationNowPpm);
        Assert.Null(said.ProbabilityFreeNow);
        Assert.NotNull(said.WaterPpm);
        Assert.Contains("no saturation", said.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Assess_GlycolHeavierThanWater_WaterGoesUpAndTheCapacityIsAFloatingLayer()
    {
        var glycol = Histories.Glycol with { SolubilityA = 5.8416, SolubilityB = 400 };
        var said = (Histories.Tank with { Fluid = glycol }).Sampled(4000, 4000, 4000).Assess();

        Assert.Equal(WaterDirection.Up, said.WaterGoes);
        // 25 mm over 2.0 m × 1.0 m
        Assert.Equal(50, said.CapacityL!.Value, 6);
    }

    [Fact]
    public void Assess_CapacityNotGiven_VolumeBelowTheSuction()
    {
        // 20 mm over 2.0 m × 1.0 m
        Assert.Equal(40, Histories.Tank.Assess().CapacityL!.Value, 6);
        Assert.Equal(7, (Histories.Tank with { WaterCapacityL = 7 }).Assess().CapacityL);
    }

    [Fact]
    public void Assess_GeometryNotKnown_NoDateAndAnActionThatAsksForIt()
    {
        var said = (Histories.Tank with { SuctionHeightMm = null }).Sampled(260, 255, 262, 258).Drained(3, 3, 3, 3).Assess();

        Assert.Null(said.CapacityL);
        Assert.Null(said.DrainBy);
        Assert.Null(said.DrainIntervalDays);
        Assert.Contains(said.Actions, action => action.Contains("suction height", StringComparison.Ordinal));
        Assert.Contains("capacity", said.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Assess_FlatAtSaturationWhileTheSumpFills_HasADrainDate()
    {
        var said = Histories.Tank.Sampled(240, 236, 241, 239, 237, 240).Drained(6, 7, 6, 6.5, 6, 7).Assess();

        Assert.Equal(Condition.FreeWater, said.Condition);
        Assert.NotNull(said.DrainBy);
        // 24 L of room at about 0.24 L/day fill in 100 days: the rule must stay below that
        Assert.InRange(said.DrainIntervalDays!.Value, 10, 100);
        Assert.InRange(said.DrainBy.Value, Histories.Now.AddDays(1), Histories.Now.AddDays(100));
        Assert.True(said.DrainByEarliest <= said.DrainBy);
        Assert.True(said.DrainByLatest is null || said.DrainByLatest >= said.DrainBy);
    }

    [Fact]
    public void Assess_DryAndDrainsBringNothing_NoDrainDue()
    {
        var said = Histories.Tank.Sampled(30, 31, 30, 29, 30, 31).Drained(0, 0, 0, 0).Assess();

        Assert.Equal(Condition.Dry, said.Condition);
        Assert.Null(said.DrainBy);
        Assert.Null(said.DrainIntervalDays);
        Assert.Null(said.Dehydration);
        Assert.InRange(said.SettledWaterLHigh90!.Value, 0, 0.1);
    }

    [Fact]
    public void Assess_WarmOilFarFromSaturationAndNeverDrained_NoFreeWaterWhileItRuns()
    {
        // a little above the 80 mg/kg that it holds when cold, far below the 238 that it holds while it runs: what fell out is taken up again
        var said = Histories.Tank.Sampled(90, 92, 90, 91).Assess();

        Assert.Equal(Condition.FreeWaterWhenCold, said.Condition);
        Assert.True(said.ProbabilityFreeNow < 0.5);
    }

    [Fact]
    public void Assess_WaterStandsBeyondItsShare_DrainIsDueNow()
    {
        var history = Histories.Tank.Sampled(240, 241, 243, 240) with
        {
            Drains = [.. Enumerable.Range(0, 6).Select(i => new Drain(Histories.Now.AddDays(-250 + (30 * i)), 12, null))],
        };

        // 0.44 L/day for 100 days: 44 L against 24
        Assert.Equal(Histories.Now, history.Assess().DrainBy);
    }

    [Fact]
    public void Assess_DrainsThatBringNothing_LowerSettledWaterAndIngress()
    {
        var wet = Histories.Tank.Sampled(240, 238, 241, 240).Drained(3, 3, 3, 3, 3).Assess();
        var empty = Histories.Tank.Sampled(240, 238, 241, 240).Drained(3, 3, 3, 0, 0).Assess();

        Assert.True(empty.SettledWaterL < wet.SettledWaterL);
        Assert.True(empty.IngressGPerDay < wet.IngressGPerDay);
    }

    [Fact]
    public void Assess_LimitPassed_DehydrateNowAndDrainingIsToldApart()
    {
        var said = (Histories.Tank with { WaterLimitPpm = 100 }).Sampled(150, 155, 150, 152).Assess();

        Assert.Equal(Histories.Now, said.DehydrateBy);
        Assert.Equal(SeparatorKind.VacuumDehydrator, said.Dehydration);
        Assert.Contains("limit of 100 ppm is passed", said.Reason, StringComparison.Ordinal);
        Assert.Contains("Advisory", said.Reason, StringComparison.Ordinal);
        Assert.NotEmpty(said.Cautions);
    }

    [Fact]
    public void Assess_FarBelowTheLimit_NoDehydration()
    {
        var said = Histories.Tank.Sampled(30, 31, 30, 29).Assess();

        Assert.Null(said.DehydrateBy);
        Assert.Null(said.Dehydration);
    }

    [Fact]
    public void Assess_OwnLimit_GoesBeforeTheFluids()
    {
        var sheet = Oils.Turbine with { WaterLimitPpm = 200 };

        Assert.Equal(500, (Histories.Tank with { Fluid = sheet }).Assess().LimitPpm);
        Assert.Equal(200, (Histories.Tank with { Fluid = sheet, WaterLimitPpm = null }).Assess().LimitPpm);
    }

    [Fact]
    public void Assess_SampleNotYetReceived_DoesNotCount()
    {
        var history = Histories.Tank.Sampled(60, 61, 60);
        var late = Histories.Karl(3, 900) with { ReceivedAt = Histories.Now.AddDays(1) };

        var crackle = Histories.Crackle(2, true) with { ReceivedAt = Histories.Now.AddDays(1) };
        var said = (history with { Samples = [.. history.Samples, late, crackle] }).Assess();

        Assert.Equal(history.Assess().WaterPpm, said.WaterPpm);
        Assert.Equal(history.Assess().ProbabilityFreeNow, said.ProbabilityFreeNow);
        Assert.Equal(history.Samples[^1].TakenAt, said.LastSampleAt);
    }

    [Fact]
    public void Assess_RecordsOfTheFuture_ChangeNothing()
    {
        var plant = new SimulatedReservoir(PlantKind.Mill, 17).Live(250);
        var then = plant.Now;
        var before = Assessor.Assess(plant.History, then, new PlanningRule());
        plant.Live(120);

        var after = Assessor.Assess(plant.History, then, new PlanningRule());

        Assert.Equal(before with { Actions = [], Cautions = [] }, after with { Actions = [], Cautions = [] });
        Assert.Equal(before.Actions, after.Actions);
    }

    [Fact]
    public void Assess_CrackleOnly_FreeWaterWithUnknownAmount()
    {
        var said = (Histories.Tank with { Samples = [Histories.Crackle(3, true)] }).Assess();

        Assert.Equal(Condition.FreeWater, said.Condition);
        Assert.Null(said.WaterPpm);
        Assert.Equal(Condition.Unknown, (Histories.Tank with { Samples = [Histories.Crackle(3, false)] }).Assess().Condition);
    }

    [Fact]
    public void Assess_SensorAtHalfSaturation_DissolvedIsHalfOfTheCurve()
    {
        var readings = Enumerable.Range(0, 24 * 60).Select(hour => new SensorReading(Histories.Now.AddHours(hour - (24 * 60)), 50, 0.5)).ToList();
        var said = (Histories.Tank with { Readings = readings }).Assess();

        Assert.InRange(said.DissolvedPpm!.Value, 100, 125);
        // thousands of readings share the error of the curve, 14 %: the interval stays wide
        Assert.True(said.WaterPpmHigh90 / said.WaterPpm > 1.15);
    }

    [Fact]
    public void Assess_WithWorking_ExplainsEachNumberAndChangesNone()
    {
        var history = Histories.Tank.Sampled(240, 236, 241, 239).Drained(2, 2, 2);
        var working = new Working();

        var said = Assessor.Assess(history, Histories.Now, new PlanningRule(), working);

        Assert.Equal(history.Assess() with { Actions = [], Cautions = [] }, said with { Actions = [], Cautions = [] });
        foreach (var name in new[] { "water in the circulating oil", "ingress", "settled water", "chance of free water now", "chance of free water at the coldest temperature", "drain interval", "capacity for settled water" })
        {
            Assert.Contains(working.Steps, step => step.Name == name && step.Source.Length > 0);
        }
    }
}
