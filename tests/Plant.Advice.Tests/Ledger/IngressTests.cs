namespace Plant.Advice.Tests.Ledger;

public class IngressTests
{
    [Fact]
    public void Assess_SaturatedAndDrainedMonthly_DrainedVolumeOverItsShareAndTime()
    {
        // 3 L a month at an efficiency of 0.9; what the last left comes with the next: 3 L / 30 days = 0.1 L/day, 99.8 g/day (mass balance by hand)
        var said = Histories.Tank.Sampled(240, 238, 241, 240, 239, 240).Drained(3, 3, 3, 3, 3, 3).Assess();

        Assert.InRange(said.IngressGPerDay!.Value, 80, 120);
        Assert.True(said.IngressGPerDayLow90 < 99.8 && said.IngressGPerDayHigh90 > 99.8);
        Assert.Null(said.IngressChangedAt);
    }

    [Fact]
    public void Assess_RiseBelowSaturation_SlopeTimesMass()
    {
        // sealed, dry: 1 mg/kg/day in 0.85 t of oil is 0.85 g/day by hand
        var history = Histories.Tank.Sampled(5, 35, 65, 95, 125, 155) with { ColdestTemperatureC = 45 };
        var said = history.Assess();

        Assert.InRange(said.IngressGPerDay!.Value, 0.5, 2);
        Assert.True(said.IngressGPerDayLow90 < 0.85 && said.IngressGPerDayHigh90 > 0.85, $"{said.IngressGPerDayLow90} to {said.IngressGPerDayHigh90}");
    }

    [Fact]
    public void Assess_DrainsRoseTenfold_ChangeIsDated()
    {
        var said = Histories.Tank.Sampled(240, 238, 241, 240, 239, 240, 240, 241, 240, 239).Drained(0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 5, 5, 5).Assess();

        // the first of the three high drains was 65 days ago, and covers the 30 days before it
        Assert.InRange(said.IngressChangedAt!.Value, Histories.Now.AddDays(-100), Histories.Now.AddDays(-60));
        Assert.InRange(said.IngressGPerDay!.Value, 100, 250);
        Assert.Contains("Ingress rose", said.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Assess_SteadyDrains_NoChange() =>
        Assert.Null(Histories.Tank.Sampled(240, 238, 241, 240).Drained(2, 2.4, 1.8, 2.1, 2.3, 1.7, 2, 2.2).Assess().IngressChangedAt);

    [Fact]
    public void Assess_UndissolvedWaterRoseTwice_SurgeIsDatedAndDrainDueSooner()
    {
        var before = Histories.Tank.Sampled(240, 238, 241, 240, 239, 240).Drained(1, 1, 1, 1, 1) with { Drains = [.. Histories.Tank.Drained(1, 1, 1, 1, 1).Drains.Take(3)] };
        var after = before with { Samples = [.. Histories.Tank.Sampled(240, 238, 241, 240, 1300, 1400).Samples] };

        Assert.NotNull(after.Assess().IngressChangedAt);
        Assert.True(after.Assess().IngressGPerDay > 2 * before.Assess().IngressGPerDay);
        Assert.Equal(Histories.Now, after.Assess().DrainBy);
        Assert.True(before.Assess().DrainBy > Histories.Now);
    }
}
