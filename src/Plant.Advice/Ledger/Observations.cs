using Plant.Physics;
using Plant.Physics.Fluids;
using Plant.Physics.Laboratory;

namespace Plant.Advice.Ledger;

/// <summary>Turns recorded samples and readings into observations of the circulating oil.</summary>
public static class Observations
{
    // a sample from near the bottom may hold settled water: it counts, but as a weak one
    private const double BottomShare = 0.25;
    private const double ActivitySd = 0.03;
    private const double OutlierDistance = 3.5;
    private const int SensorWeeks = 16;

    /// <summary>Observations known at a time, in order, replicates averaged, contradicted ones marked.</summary>
    /// <param name="history">The records.</param>
    /// <param name="fluid">The fluid; null where its sheet cannot be used.</param>
    /// <param name="asOf">The time (UTC).</param>
    /// <returns>The observations.</returns>
    public static IReadOnlyList<Observation> Of(ReservoirHistory history, FluidModel? fluid, DateTime asOf)
    {
        ArgumentNullException.ThrowIfNull(history);
        var found = new List<Observation>(history.Samples.Count);
        foreach (var group in history.Samples.Where(s => s.TakenAt <= asOf && (s.ReceivedAt ?? s.TakenAt) <= asOf && s.Point != SamplePoint.Drain).GroupBy(s => s.Sample))
        {
            if (FromSample([.. group], history, fluid) is { } observation)
            {
                found.Add(observation);
            }
        }

        AddSensor(found, history, fluid, asOf);
        found.Sort((one, other) => one.At != other.At ? one.At.CompareTo(other.At) : one.WaterPpm.CompareTo(other.WaterPpm));
        return MarkOutlying(found);
    }

    private static Observation? FromSample(List<WaterSample> replicates, ReservoirHistory history, FluidModel? fluid)
    {
        double sum = 0, methodVariance = 0;
        var count = 0;
        foreach (var replicate in replicates)
        {
            if (replicate.WaterPpm is { } ppm)
            {
                sum += ppm;
                methodVariance = Math.Max(methodVariance, Square(KarlFischer.StandardUncertaintyPpm(Code.Of(replicate.Method), ppm, 1)));
                count++;
            }
            else if (replicate.WaterActivity is { } activity && fluid is { HasSaturation: true }
                && (replicate.OilTemperatureC ?? history.OperatingTemperatureC) is { } temperature)
            {
                var saturation = fluid.SaturationPpm(temperature + Constants.ZeroCelsiusK);
                sum += activity * saturation;
                methodVariance = Math.Max(methodVariance, Square(ActivitySd * saturation) + Square(Priors.SaturationLogSd(fluid) * activity * saturation));
                count++;
            }
        }

        if (count == 0)
        {
            return null;
        }

        var first = replicates[0];
        var mean = sum / count;
        var scatter = first.Point == SamplePoint.Bottom ? BottomShare : Priors.SamplingShare;
        return new Observation(first.TakenAt, mean, Math.Sqrt((methodVariance / count) + Square(scatter * mean) + Square(Priors.SamplingPpm)), count, false);
    }

    /// <summary>The newest sensor readings as one observation: thousands of readings share one error and count once.</summary>
    private static void AddSensor(List<Observation> found, ReservoirHistory history, FluidModel? fluid, DateTime asOf)
    {
        if (fluid is not { HasSaturation: true } || history.Readings.Count == 0)
        {
            return;
        }

        // three-day medians a week apart, newest first: one pass backwards, however many readings there are
        DateTime? last = null;
        var week = new List<double>();
        var begun = 0;
        for (var i = history.Readings.Count - 1; i >= 0; i--)
        {
            var reading = history.Readings[i];
            if (reading.At > asOf || reading.WaterActivity is not { } activity)
            {
                continue;
            }

            last ??= reading.At;
            var age = (last.Value - reading.At).TotalDays;
            if (age >= 7 * SensorWeeks)
            {
                break;
            }

            if ((int)(age / 7) != begun)
            {
                AddWeek(found, week, last.Value.AddDays(-7 * begun), fluid);
                begun = (int)(age / 7);
            }

            if (age % 7 < 3)
            {
                week.Add(activity * fluid.SaturationPpm((reading.OilTemperatureC ?? history.OperatingTemperatureC ?? 40) + Constants.ZeroCelsiusK));
            }
        }

        if (last is { } newest)
        {
            AddWeek(found, week, newest.AddDays(-7 * begun), fluid);
        }
    }

    private static void AddWeek(List<Observation> found, List<double> week, DateTime at, FluidModel fluid)
    {
        if (week.Count > 0)
        {
            var middle = Robust.Median(week);
            found.Add(new Observation(at, middle, Math.Max(Priors.SamplingPpm, Priors.SaturationLogSd(fluid) * middle), 0, false));
            week.Clear();
        }
    }

    /// <summary>One high result between two that agree with each other is a dirty bottle; two high ones in a row are believed.</summary>
    private static List<Observation> MarkOutlying(List<Observation> found)
    {
        var marked = new List<Observation>(found.Count);
        for (var i = 0; i < found.Count; i++)
        {
            marked.Add(found[i] with { Outlying = i > 0 && Contradicted(found, marked, i) });
        }

        return marked;
    }

    private static bool Contradicted(List<Observation> found, List<Observation> before, int i)
    {
        var earlier = before.FindLastIndex(o => !o.Outlying);
        if (earlier < 0)
        {
            return false;
        }

        var tooHigh = Distance(found[i], before[earlier]) > OutlierDistance;
        if (!tooHigh || i + 1 >= found.Count)
        {
            // the newest one cannot be judged yet: it counts, and the next will tell
            return false;
        }

        return Distance(found[i], found[i + 1]) > OutlierDistance;
    }

    private static double Distance(Observation high, Observation other) =>
        (high.WaterPpm - other.WaterPpm) / Math.Sqrt(Square(high.StandardUncertaintyPpm) + Square(other.StandardUncertaintyPpm));

    private static double Square(double x) => x * x;
}
