using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Register.Reservoirs;
using Plant.Register.Storage;

namespace Plant.Register.Assessments;

/// <summary>What the assessment needs to know of reservoirs, read in a few wide queries.</summary>
public sealed class HistoryReader(IDbContextFactory<PlantDbContext> contexts)
{
    /// <summary>How far back sensor readings are read.</summary>
    public static readonly TimeSpan ReadingSpan = TimeSpan.FromDays(120);

    /// <summary>Histories as of a time, in order of tag; of one reservoir, of some, or (null) of the fleet.</summary>
    public async Task<IReadOnlyList<ReservoirHistory>> ReadAsync(DateTime asOf, IReadOnlyCollection<string>? tags = null, CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var reservoirs = await context.Reservoirs.AsNoTracking().Include(r => r.Fluid)
            .Where(r => r.WithdrawnAt == null && (tags == null || tags.Contains(r.Tag)))
            .ToListAsync(cancellation);
        reservoirs.Sort((one, other) => string.CompareOrdinal(one.Tag, other.Tag));
        var ids = tags is null ? null : reservoirs.ConvertAll(r => r.Id);

        var samples = await context.Samples.AsNoTracking()
            .Where(s => s.WithdrawnAt == null && s.TakenAt <= asOf && (s.ReceivedAt == null || s.ReceivedAt <= asOf) && (ids == null || ids.Contains(s.ReservoirId)))
            .OrderBy(s => s.TakenAt).ThenBy(s => s.Code).ThenBy(s => s.Replicate)
            .Select(s => new
            {
                s.ReservoirId,
                Row = new WaterSample(s.Code, s.Replicate, s.TakenAt, s.ReceivedAt, s.Point, s.OilTemperatureC, s.Method, s.WaterPpm, s.WaterActivity,
                    s.Method == WaterMethod.Crackle ? s.Remark == "crackles" : null),
            }).ToListAsync(cancellation);
        var drains = await context.Drains.AsNoTracking().Where(d => d.WithdrawnAt == null && d.DrainedAt <= asOf && (ids == null || ids.Contains(d.ReservoirId)))
            .OrderBy(d => d.DrainedAt).Select(d => new { d.ReservoirId, d.DrainedAt, d.WaterL, d.OilL }).ToListAsync(cancellation);
        var topUps = await context.TopUps.AsNoTracking().Where(t => t.WithdrawnAt == null && t.AddedAt <= asOf && (ids == null || ids.Contains(t.ReservoirId)))
            .OrderBy(t => t.AddedAt).Select(t => new { t.ReservoirId, t.AddedAt, t.OilL, t.WaterPpm }).ToListAsync(cancellation);
        var runs = await context.SeparatorRuns.AsNoTracking().Where(r => r.WithdrawnAt == null && r.StartedAt <= asOf && (ids == null || ids.Contains(r.ReservoirId)))
            .OrderBy(r => r.StartedAt)
            .Select(r => new
            {
                r.ReservoirId,
                Row = new SeparatorRun(r.Separator!.Kind, r.StartedAt, r.EndedAt <= asOf ? r.EndedAt : null, r.Separator.FlowLPerMin, r.Separator.Efficiency,
                    r.Separator.PressureKPa, r.Separator.OilTemperatureC, r.Separator.CapacityL),
            }).ToListAsync(cancellation);
        var readings = await ReadingsAsync(context, asOf, tags is null ? null : reservoirs.ConvertAll(r => r.SeriesNumber), cancellation);

        var samplesOf = samples.ToLookup(s => s.ReservoirId, s => s.Row);
        var drainsOf = drains.ToLookup(d => d.ReservoirId, d => new Drain(d.DrainedAt, d.WaterL, d.OilL));
        var topUpsOf = topUps.ToLookup(t => t.ReservoirId, t => new TopUp(t.AddedAt, t.OilL, t.WaterPpm));
        var runsOf = runs.ToLookup(r => r.ReservoirId, r => r.Row);
        return reservoirs.ConvertAll(r => Facts(r) with
        {
            Samples = [.. samplesOf[r.Id]],
            Drains = [.. drainsOf[r.Id]],
            TopUps = [.. topUpsOf[r.Id]],
            SeparatorRuns = [.. runsOf[r.Id]],
            Readings = readings.TryGetValue(r.SeriesNumber, out var series) ? series : [],
        });
    }

    private static ReservoirHistory Facts(Reservoir r) => new()
    {
        Tag = r.Tag,
        Fluid = r.Fluid!.ToSheet(),
        Service = r.Service,
        Shape = r.Shape,
        LengthMm = r.LengthMm,
        WidthMm = r.WidthMm,
        HeightMm = r.HeightMm,
        OilVolumeL = r.OilVolumeL,
        SuctionHeightMm = r.SuctionHeightMm,
        CirculationLPerMin = r.CirculationLPerMin,
        OperatingTemperatureC = r.OperatingTemperatureC,
        ColdestTemperatureC = r.ColdestTemperatureC,
        HeadspaceRhPercent = r.HeadspaceRhPercent,
        Breather = r.Breather,
        WaterLimitPpm = r.WaterLimitPpm,
        WaterCapacityL = r.WaterCapacityL,
        Criticality = r.Criticality,
        CommissionedAt = r.CommissionedAt,
    };

    private static async Task<Dictionary<int, List<SensorReading>>> ReadingsAsync(
        PlantDbContext context, DateTime asOf, List<int>? series, CancellationToken cancellation)
    {
        var until = new DateTimeOffset(asOf).ToUnixTimeMilliseconds();
        var from = until - (long)ReadingSpan.TotalMilliseconds;
        var rows = context.Readings.AsNoTracking().Where(r => r.AtMs <= until && r.AtMs > from && (series == null || series.Contains(r.SeriesNumber)))
            .OrderBy(r => r.SeriesNumber).ThenBy(r => r.AtMs).AsAsyncEnumerable();
        var found = new Dictionary<int, List<SensorReading>>();
        await foreach (var row in rows.WithCancellation(cancellation))
        {
            if (!found.TryGetValue(row.SeriesNumber, out var list))
            {
                found.Add(row.SeriesNumber, list = []);
            }

            list.Add(new SensorReading(DateTimeOffset.FromUnixTimeMilliseconds(row.AtMs).UtcDateTime, row.OilTemperatureC, row.WaterActivity));
        }

        return found;
    }
}
