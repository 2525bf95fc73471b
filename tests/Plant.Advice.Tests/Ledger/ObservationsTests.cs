using Plant.Advice.Ledger;
using Plant.Physics.Fluids;

namespace Plant.Advice.Tests.Ledger;

public class ObservationsTests
{
    private static readonly FluidModel Oil = FluidModel.TryCreate(Simulation.Oils.Turbine, [])!;

    [Fact]
    public void Of_Replicates_AveragedAndTheirUncertaintyByHand()
    {
        var history = Histories.Tank with { Samples = [Histories.Karl(5, 195, 1, "b"), Histories.Karl(5, 205, 2, "b")] };

        var one = Assert.Single(Observations.Of(history, Oil, Histories.Now));

        Assert.Equal(200, one.WaterPpm);
        Assert.Equal(2, one.Replicates);
        // repeatability 1.874·√205 = 26.83 (ISO 12937, from memory): standard deviation /2.77 = 9.68, of two results 6.85; scatter of sampling 7 % = 14 and 5: √(46.9 + 196 + 25) = 16.4
        Assert.Equal(16.4, one.StandardUncertaintyPpm, 0.1);
    }

    [Fact]
    public void Of_OneHighBetweenTwoThatAgree_IsADirtyBottle()
    {
        var history = Histories.Tank.Sampled(100, 105, 900, 102, 98);

        Assert.Equal([false, false, true, false, false], Observations.Of(history, Oil, Histories.Now).Select(o => o.Outlying));
    }

    [Fact]
    public void Of_TwoHighInARow_AreBelieved()
    {
        var history = Histories.Tank.Sampled(100, 105, 900, 950);

        Assert.DoesNotContain(Observations.Of(history, Oil, Histories.Now), o => o.Outlying);
    }

    [Fact]
    public void Of_DrainSample_SaysNothingOfTheCirculatingOil()
    {
        var history = Histories.Tank with { Samples = [Histories.Karl(5, 90_000) with { Point = SamplePoint.Drain }] };

        Assert.Empty(Observations.Of(history, Oil, Histories.Now));
    }

    [Fact]
    public void Of_BottomSample_CountsLess()
    {
        var bottom = Observations.Of(Histories.Tank with { Samples = [Histories.Karl(5, 200) with { Point = SamplePoint.Bottom }] }, Oil, Histories.Now);
        var middle = Observations.Of(Histories.Tank with { Samples = [Histories.Karl(5, 200)] }, Oil, Histories.Now);

        Assert.True(bottom[0].StandardUncertaintyPpm > 2 * middle[0].StandardUncertaintyPpm);
    }

    [Fact]
    public void Of_ActivityInTheLaboratory_TimesTheCurveAtItsTemperature()
    {
        var sample = new WaterSample("a", 1, Histories.Now.AddDays(-2), null, SamplePoint.Return, 20, WaterMethod.ActivitySensor, null, 0.5, null);

        // 80 mg/kg at 20 °C
        Assert.Equal(40, Observations.Of(Histories.Tank with { Samples = [sample] }, Oil, Histories.Now)[0].WaterPpm, 0.1);
    }

    [Fact]
    public void Of_MonthsOfReadings_AWeekIsOneObservation()
    {
        var readings = Enumerable.Range(0, 24 * 28).Select(hour => new SensorReading(Histories.Now.AddHours(hour - (24 * 28)), 50, 0.4)).ToList();

        Assert.Equal(4, Observations.Of(Histories.Tank with { Readings = readings }, Oil, Histories.Now).Count);
    }
}
