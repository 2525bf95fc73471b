namespace Skarrow;

/// <summary>The people who sample, drain and fill one reservoir, and the rows they write.</summary>
public sealed class Keeper
{
    private readonly Unit unit;
    private readonly FluidSheet fluid;
    private readonly Reservoir water;
    private readonly Chance chance;
    private readonly DateTime start;
    private readonly DateTime end;
    private readonly Laboratory laboratory;
    private readonly double sensorOffset;
    private double? stuckAt;

    public Keeper(Unit unit, DateTime start, DateTime end)
    {
        this.unit = unit;
        this.start = start;
        this.end = end;
        fluid = Fluids.Of(unit.Fluid);
        chance = new Chance(unit.Tag + " people");
        water = new Reservoir(unit, start, end, Separators.On(unit.Tag));
        laboratory = new Laboratory(unit, water, chance);
        sensorOffset = 0.012 * chance.Normal();
    }

    public Reservoir Water => water;

    public List<SampleRow> Samples { get; } = [];

    public List<(DateTime At, double WaterL, double OilL)> Drains { get; } = [];

    public List<(DateTime At, double OilL, double? Ppm)> TopUps { get; } = [];

    public List<(DateTime At, double Celsius, double Activity)> Readings { get; } = [];

    /// <summary>Two years in steps of two hours, with what people do in between.</summary>
    public void Live()
    {
        var acts = new List<(DateTime At, Action<DateTime> Do)>();
        acts.AddRange(Rounds(unit.SampleDays, unit.LastSampleDay, 0.03).Select(at => (at, (Action<DateTime>)Sample)));
        acts.AddRange(Rounds(unit.DrainDays, unit.LastDrainDay, 0.05).Select(at => (at, (Action<DateTime>)Drain)));
        acts.AddRange(Rounds(TopUpDays(), 0, 0.15).Select(at => (at, (Action<DateTime>)TopUp)));
        acts.Sort((one, other) => one.At.CompareTo(other.At));
        var next = 0;
        for (var time = start; time < end; time = time.AddHours(Reservoir.StepHours))
        {
            for (; next < acts.Count && acts[next].At <= time; next++)
            {
                if (acts[next].At >= unit.CommissionedAt)
                {
                    acts[next].Do(acts[next].At);
                }
            }

            Read(time);
            water.Step(time);
        }
    }

    /// <summary>Working days about one interval apart, none at the turn of the year; now and then one is missed.</summary>
    private IEnumerable<DateTime> Rounds(double interval, double lastDay, double missed)
    {
        if (interval <= 0)
        {
            yield break;
        }

        for (var at = start.AddDays(interval * chance.Between(0.05, 0.95)); at < end.AddDays(-lastDay); at = at.AddDays(interval * chance.Between(0.86, 1.14)))
        {
            var day = at.DayOfWeek switch { DayOfWeek.Saturday => at.AddDays(2), DayOfWeek.Sunday => at.AddDays(1), _ => at };
            day = (day.Month, day.Day) is (12, >= 24) or (1, 1) ? day.AddDays(14) : day;
            var time = day.Date.AddMinutes(chance.Whole(6 * 60, 13 * 60));
            if (!chance.Yes(missed) && time < end.AddDays(-lastDay))
            {
                yield return time;
            }
        }
    }

    private double TopUpDays() => unit.Rhythm == Rhythm.Always ? 0 : unit.Rhythm == Rhythm.Standing ? 120 : unit.OilL < 100 ? 150 : 75;

    private void Sample(DateTime at)
    {
        foreach (var row in laboratory.Take(at, (end - at).TotalDays))
        {
            if (row.ReceivedAt is null || row.ReceivedAt < end)
            {
                Samples.Add(row);
            }
        }
    }

    private void Drain(DateTime at)
    {
        var stood = water.SettledL;
        var litres = water.Drain();
        var rounded = stood < 0.015 ? 0 : litres < 1 ? Math.Round(litres, 2) : litres < 20 ? Math.Round(litres, 1) : Math.Round(litres);
        var oil = chance.Between(0.1, 0.5) * (unit.OilL > 1000 ? 2 : 1);
        Drains.Add((at, rounded, Math.Round(oil, 1)));
    }

    private void TopUp(DateTime at)
    {
        var share = unit.Fluid == "DIESEL" ? chance.Between(0.08, 0.2) : chance.Between(0.005, 0.03);
        var step = unit.OilL > 3000 ? 20 : unit.OilL > 400 ? 5 : unit.OilL > 60 ? 1 : 0.5;
        var litres = Math.Max(step, Fleet.Step(unit.OilL * share, step));
        var saturation = Math.Min(fluid.SaturationPpm(20), 6000);
        var ppm = Math.Max(8, chance.LogNormal(Math.Min(0.4 * saturation, 900), 0.25));
        water.TopUp(litres, ppm);
        TopUps.Add((at, litres, chance.Yes(0.35) ? Math.Round(ppm) : null));
    }

    private void Read(DateTime at)
    {
        var before = (end - at).TotalDays;
        if (unit.Sensor is not { } sensor || before > sensor.FromDay || at.Hour % sensor.Hours != 0 || Silent(at))
        {
            return;
        }

        var activity = Math.Clamp((water.DissolvedPpm / water.SaturationPpm) + sensorOffset + (0.005 * chance.Normal()), 0.01, 1);
        if (before <= unit.SensorSticksDay)
        {
            activity = stuckAt ??= activity;
        }

        Readings.Add((at, Math.Round(water.TemperatureC + (0.2 * chance.Normal()), 1), Math.Round(activity, 3)));
    }

    /// <summary>The network was down for three days in the middle of May, and single telegrams are lost.</summary>
    private bool Silent(DateTime at) => (at.Month == 5 && at.Day is >= 16 and < 19) || chance.Yes(0.01);
}
