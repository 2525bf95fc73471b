using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using Plant.Advice.Tests.Simulation;
using Plant.Physics.Fluids;

namespace Plant.Advice.Tests;

/// <summary>What must hold for any history, however odd.</summary>
public class InvariantTests
{
    [Property(MaxTest = 300, Arbitrary = [typeof(OddHistories)])]
    public void Assess_AnyHistory_IntervalsOrderedChancesChancesAndNothingNaN(ReservoirHistory history)
    {
        var said = history.Assess();

        Chance(said.ProbabilityFreeNow);
        Chance(said.ProbabilityFreeColdest);
        Ordered(said.WaterPpmLow90, said.WaterPpm, said.WaterPpmHigh90);
        Ordered(said.SettledWaterLLow90, said.SettledWaterL, said.SettledWaterLHigh90);
        Ordered(said.IngressGPerDayLow90, said.IngressGPerDay, said.IngressGPerDayHigh90);
        Assert.True(said.ProbabilityFreeColdest is null || said.ProbabilityFreeColdest >= said.ProbabilityFreeNow);
        Assert.True(said.DrainBy is null || (said.DrainBy >= said.AsOf && said.DrainBy <= said.AsOf.AddDays(365)));
        Assert.True(said.DehydrateBy is null || (said.DehydrateBy >= said.AsOf && said.DehydrateBy <= said.AsOf.AddDays(365)));
        Assert.True(said.DrainIntervalDays is null or (>= 0 and <= 365));
        Assert.True(said.DrainBy is null || (said.DrainByEarliest <= said.DrainBy && (said.DrainByLatest is null || said.DrainByLatest >= said.DrainBy)));
        if (said.DissolvedPpm is { } dissolved)
        {
            Assert.Equal(said.WaterPpm!.Value, dissolved + said.EmulsifiedPpm!.Value, 6);
            Assert.True(said.SaturationNowPpm is null || dissolved <= said.SaturationNowPpm + 1e-9);
        }

        Assert.NotEmpty(said.Reason);
        Assert.NotEmpty(said.Actions);
    }

    [Property(MaxTest = 100, Arbitrary = [typeof(OddHistories)])]
    public void Assess_RecordsInAnotherOrder_SameAnswer(ReservoirHistory history)
    {
        var turned = history with
        {
            Samples = [.. history.Samples.Reverse()],
            Drains = [.. history.Drains.Reverse()],
            TopUps = [.. history.TopUps.Reverse()],
            SeparatorRuns = [.. history.SeparatorRuns.Reverse()],
        };

        Assert.Equal(history.Assess() with { Actions = [], Cautions = [] }, turned.Assess() with { Actions = [], Cautions = [] });
    }

    [Property(MaxTest = 100, Arbitrary = [typeof(OddHistories)])]
    public void Forecast_AnyHistory_OrderedAndStartsAtTheAssessment(ReservoirHistory history)
    {
        var said = history.Assess();
        var days = Forecaster.Forecast(history, Histories.Now, new PlanningRule(), 60);

        Assert.Equal(61, days.Count);
        Assert.Equal(said.WaterPpm is null, days[0].WaterPpm is null);
        if (said.WaterPpm is { } ppm)
        {
            Assert.Equal(ppm, days[0].WaterPpm!.Value, ppm * 1e-3);
        }

        Assert.Equal(said.SettledWaterL, days[0].SettledL);
        foreach (var day in days)
        {
            Ordered(day.WaterLow90Ppm, day.WaterLow50Ppm, day.WaterPpm);
            Ordered(day.WaterPpm, day.WaterHigh50Ppm, day.WaterHigh90Ppm);
            Ordered(day.SettledLow90L, day.SettledL, day.SettledHigh90L);
        }
    }

    private static void Chance(double? value) => Assert.True(value is null or (>= 0 and <= 1), $"{value}");

    private static void Ordered(double? low, double? middle, double? high)
    {
        Assert.Equal(low is null, middle is null);
        Assert.Equal(low is null, high is null);
        Assert.True(low is null || (double.IsFinite(low.Value) && double.IsFinite(high!.Value) && low >= 0 && low <= middle && middle <= high), $"{low} {middle} {high}");
    }

    /// <summary>Histories with gaps, repeated times, zeros, extremes and records of the future.</summary>
    public static class OddHistories
    {
        public static Arbitrary<ReservoirHistory> Any() => Gen.Choose(0, int.MaxValue).Select(Make).ToArbitrary();

        private static ReservoirHistory Make(int seed)
        {
            var draw = new Draw(seed);
            var families = Enum.GetValues<FluidFamily>();
            var own = draw.Index(2) == 0;
            return new ReservoirHistory
            {
                Tag = "odd",
                Fluid = new FluidSheet
                {
                    Family = families[draw.Index(families.Length)],
                    SolubilityA = own ? 5 + (3 * draw.Uniform()) : null,
                    SolubilityB = own ? 300 + (1500 * draw.Uniform()) : null,
                    Density15KgM3 = Maybe(() => 800 + (300 * draw.Uniform())),
                    WaterLimitPpm = Maybe(() => 2000 * draw.Uniform()),
                },
                Shape = draw.Index(3) > 0 ? (Plant.Physics.Tanks.TankShape)draw.Index(3) : null,
                LengthMm = Maybe(() => 3000 * draw.Uniform()),
                WidthMm = Maybe(() => 3000 * draw.Uniform()),
                HeightMm = Maybe(() => 3000 * draw.Uniform()),
                OilVolumeL = Maybe(() => Math.Pow(10, 5 * draw.Uniform())),
                SuctionHeightMm = Maybe(() => 300 * draw.Uniform()),
                OperatingTemperatureC = Maybe(() => -10 + (110 * draw.Uniform())),
                ColdestTemperatureC = Maybe(() => -30 + (60 * draw.Uniform())),
                HeadspaceRhPercent = Maybe(() => 100 * draw.Uniform()),
                Breather = draw.Index(2) == 0 ? (Breather)draw.Index(4) : null,
                WaterLimitPpm = Maybe(() => 2000 * draw.Uniform()),
                WaterCapacityL = Maybe(() => 50 * draw.Uniform()),
                CommissionedAt = draw.Index(2) == 0 ? At() : null,
                Samples = [.. Many(14, i => Sample(i)).OrderBy(s => s.TakenAt)],
                Drains = [.. Many(10, _ => new Drain(At(), draw.Index(3) == 0 ? 0 : Math.Pow(10, (5 * draw.Uniform()) - 3), null)).DistinctBy(d => d.At).OrderBy(d => d.At)],
                TopUps = [.. Many(4, _ => new TopUp(At(), 500 * draw.Uniform(), Maybe(() => 500 * draw.Uniform()))).DistinctBy(t => t.At).OrderBy(t => t.At)],
                SeparatorRuns = [.. Many(3, _ => Run()).DistinctBy(r => r.StartedAt).OrderBy(r => r.StartedAt)],
                Readings = [.. Many(40, _ => new SensorReading(At(), Maybe(() => 80 * draw.Uniform()), Maybe(draw.Uniform))).OrderBy(r => r.At)],
            };

            double? Maybe(Func<double> value) => draw.Index(4) == 0 ? null : value();

            DateTime At() => Histories.Now.AddDays(Math.Round((-500 * draw.Uniform()) + 30, draw.Index(2)));

            IEnumerable<T> Many<T>(int most, Func<int, T> one) => Enumerable.Range(0, draw.Index(3) == 0 ? 0 : draw.Index(most)).Select(one).ToList();

            WaterSample Sample(int i)
            {
                var method = (WaterMethod)draw.Index(5);
                var taken = At();
                return new WaterSample(
                    FormattableString.Invariant($"s{i}"), 1, taken, draw.Index(2) == 0 ? taken.AddDays(5 * draw.Uniform()) : null, (SamplePoint)draw.Index(4),
                    Maybe(() => 80 * draw.Uniform()), method, method <= WaterMethod.KfEvaporator ? (draw.Index(6) == 0 ? 0 : Math.Pow(10, 5 * draw.Uniform())) : null,
                    method == WaterMethod.ActivitySensor ? draw.Uniform() : null, method == WaterMethod.Crackle ? draw.Index(2) == 0 : null);
            }

            SeparatorRun Run()
            {
                var start = At();
                return new SeparatorRun(
                    (SeparatorKind)draw.Index(6), start, draw.Index(3) == 0 ? null : start.AddDays(10 * draw.Uniform()), Maybe(() => 100 * draw.Uniform()),
                    Maybe(draw.Uniform), Maybe(() => 10 * draw.Uniform()), Maybe(() => 80 * draw.Uniform()), Maybe(() => 10 * draw.Uniform()));
            }
        }
    }
}
