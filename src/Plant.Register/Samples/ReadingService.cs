using Microsoft.EntityFrameworkCore;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Audit;
using Plant.Register.Storage;

namespace Plant.Register.Samples;

/// <summary>What became of posted readings.</summary>
public sealed record ReadingReceipt(int Stored, int Unchanged);

/// <summary>Sensor readings: posted by the batch, read by the range. A reading is never changed.</summary>
public sealed class ReadingService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer, IDatabaseEngine engine, TimeProvider clock)
{
    /// <summary>Most readings in one call.</summary>
    public const int BatchLimit = 10_000;

    /// <summary>How far a sensor's clock may run ahead.</summary>
    public static readonly TimeSpan ClockTolerance = TimeSpan.FromMinutes(5);

    /// <summary>Stores readings; answers only once they are durable. The same reading again has no effect; another one at the same time is refused.</summary>
    public async Task<Outcome<ReadingReceipt>> PostAsync(Actor actor, IReadOnlyList<ReadingFields> readings, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.PostReadings))
        {
            return Outcome<ReadingReceipt>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not post readings");
        }

        var refusals = Check(readings);
        if (refusals.Count > 0)
        {
            return Outcome<ReadingReceipt>.Invalid(refusals);
        }

        return await writer.WriteAsync(actor, null, async (context, stop) =>
        {
            var tags = readings.Select(r => r.Tag!).Distinct().ToList();
            var series = await context.Reservoirs.Where(r => tags.Contains(r.Tag) && r.WithdrawnAt == null).ToDictionaryAsync(r => r.Tag, r => r.SeriesNumber, stop);
            var rows = Distinct(readings, series, refusals);
            if (refusals.Count > 0)
            {
                return Outcome<ReadingReceipt>.Invalid(refusals);
            }

            var fresh = await FreshAsync(context, rows, series, refusals, stop);
            if (refusals.Count > 0)
            {
                return Outcome<ReadingReceipt>.Invalid(refusals);
            }

            if (fresh.Count > 0)
            {
                await engine.InsertReadingsAsync(context, fresh, stop);
                context.Batches.Add(Batch(fresh, FormattableString.Invariant($"{fresh.Count} readings of {string.Join(", ", tags.Take(5))}{(tags.Count > 5 ? " …" : "")}")));
            }

            return Outcome<ReadingReceipt>.Done(new(fresh.Count, readings.Count - fresh.Count));
        }, cancellation);
    }

    /// <summary>Readings of one reservoir in order of time.</summary>
    public async Task<Outcome<IReadOnlyList<ReadingFields>>> ListAsync(
        Actor actor, string tag, DateTimeOffset? after, int limit, CancellationToken cancellation = default)
    {
        if (!actor.May(Duty.Read))
        {
            return Outcome<IReadOnlyList<ReadingFields>>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not read the register");
        }

        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var series = await context.Reservoirs.Where(r => r.Tag == tag && r.WithdrawnAt == null).Select(r => (int?)r.SeriesNumber).FirstOrDefaultAsync(cancellation);
        if (series is null)
        {
            return Outcome<IReadOnlyList<ReadingFields>>.Refused(OutcomeKind.NotFound, $"there is no reservoir {tag}");
        }

        var from = after?.ToUnixTimeMilliseconds() ?? long.MinValue;
        var rows = await context.Readings.AsNoTracking().Where(r => r.SeriesNumber == series && r.AtMs > from).OrderBy(r => r.AtMs).Take(limit).ToListAsync(cancellation);
        return Outcome<IReadOnlyList<ReadingFields>>.Done(rows.ConvertAll(r => new ReadingFields
        {
            Tag = tag,
            ReadAt = DateTimeOffset.FromUnixTimeMilliseconds(r.AtMs),
            OilTemperatureC = r.OilTemperatureC,
            WaterActivity = r.WaterActivity,
        }));
    }

    /// <summary>The audit entry of readings written together.</summary>
    public static RecordBatch Batch(IReadOnlyList<Reading> readings, string key)
    {
        var sum = default(ContentSum);
        Span<byte> content = stackalloc byte[28];
        foreach (var reading in readings)
        {
            RecordContent.Write(reading, content);
            sum.Add(content);
        }

        return new RecordBatch(RecordContent.ReadingKind, key, FormattableString.Invariant($"{{\"stored\":{readings.Count},\"sum\":\"{sum}\"}}"), readings.Count, sum);
    }

    private List<Refusal> Check(IReadOnlyList<ReadingFields> readings)
    {
        var refusals = new List<Refusal>();
        if (readings.Count > BatchLimit)
        {
            refusals.Add(new Refusal("readings", readings.Count.ToString(System.Globalization.CultureInfo.InvariantCulture), $"at most {BatchLimit} readings a call: send the rest in another one"));
            return refusals;
        }

        var latest = clock.GetUtcNow() + ClockTolerance;
        var found = new List<Refusal>();
        for (var i = 0; i < readings.Count && refusals.Count < 100; i++)
        {
            found.Clear();
            readings[i].Check(found);
            if (readings[i].ReadAt > latest)
            {
                found.Add(new Refusal("readAt", readings[i].ReadAt!.Value.ToString("O", System.Globalization.CultureInfo.InvariantCulture), "lies in the future: set the sensor's clock"));
            }

            refusals.AddRange(found.Select(refusal => refusal with { Field = FormattableString.Invariant($"readings[{i}].{refusal.Field}") }));
        }

        return refusals;
    }

    private static SortedDictionary<(int Series, long At), Reading> Distinct(
        IReadOnlyList<ReadingFields> readings, Dictionary<string, int> series, List<Refusal> refusals)
    {
        var rows = new SortedDictionary<(int, long), Reading>();
        for (var i = 0; i < readings.Count; i++)
        {
            var fields = readings[i];
            if (!series.TryGetValue(fields.Tag!, out var number))
            {
                refusals.Add(new Refusal(FormattableString.Invariant($"readings[{i}].tag"), fields.Tag!, "names no reservoir of the register"));
                continue;
            }

            var row = new Reading
            {
                SeriesNumber = number,
                AtMs = fields.ReadAt!.Value.ToUnixTimeMilliseconds(),
                OilTemperatureC = fields.OilTemperatureC,
                WaterActivity = fields.WaterActivity,
            };
            if (!rows.TryAdd((number, row.AtMs), row) && !Same(rows[(number, row.AtMs)], row))
            {
                refusals.Add(new Refusal(FormattableString.Invariant($"readings[{i}].readAt"), fields.ReadAt.Value.ToString("O", System.Globalization.CultureInfo.InvariantCulture), "stands twice with different values"));
            }
        }

        return rows;
    }

    private static async Task<List<Reading>> FreshAsync(
        PlantDbContext context, SortedDictionary<(int Series, long At), Reading> rows, Dictionary<string, int> series, List<Refusal> refusals, CancellationToken cancellation)
    {
        var fresh = new List<Reading>(rows.Count);
        foreach (var group in rows.Values.GroupBy(r => r.SeriesNumber))
        {
            var (first, last) = (group.First().AtMs, group.Last().AtMs);
            var number = group.Key;
            var known = await context.Readings.AsNoTracking().Where(r => r.SeriesNumber == number && r.AtMs >= first && r.AtMs <= last).ToDictionaryAsync(r => r.AtMs, cancellation);
            foreach (var row in group)
            {
                if (!known.TryGetValue(row.AtMs, out var earlier))
                {
                    fresh.Add(row);
                }
                else if (!Same(earlier, row))
                {
                    refusals.Add(new Refusal("readAt", DateTimeOffset.FromUnixTimeMilliseconds(row.AtMs).ToString("O", System.Globalization.CultureInfo.InvariantCulture),
                        $"a reading of {series.First(s => s.Value == number).Key} at this time is stored with other values: readings are not changed"));
                }
            }
        }

        return fresh;
    }

    private static bool Same(Reading one, Reading other) =>
        Nullable.Equals(one.OilTemperatureC, other.OilTemperatureC) && Nullable.Equals(one.WaterActivity, other.WaterActivity);
}
