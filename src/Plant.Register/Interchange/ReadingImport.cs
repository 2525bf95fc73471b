using Microsoft.EntityFrameworkCore;
using Plant.Register.Audit;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Storage;

namespace Plant.Register.Interchange;

/// <summary>Imports sensor readings in portions; what is known is compared by the range, never by the row.</summary>
internal sealed class ReadingImport(PlantDbContext context, IDatabaseEngine engine, IReadOnlyDictionary<string, Reservoir> reservoirs, FileReport report, ImportOptions options)
{
    private const int Portion = 50_000;

    private readonly Dictionary<int, long> newest = [];
    private readonly List<(long Line, Reading Row)> rows = new(Portion);
    private ContentSum sum;

    public async Task RunAsync(string path, CancellationToken cancellation)
    {
        foreach (var series in await context.Readings.GroupBy(r => r.SeriesNumber).Select(g => new { g.Key, Last = g.Max(r => r.AtMs) }).ToListAsync(cancellation))
        {
            newest.Add(series.Key, series.Last);
        }

        foreach (var (line, fields) in new CsvFile<ReadingFields>(path, Files.Readings, report).Rows())
        {
            if (!reservoirs.TryGetValue(fields.Tag!, out var reservoir))
            {
                report.Refuse(line, "tag", fields.Tag!, "names no reservoir of the register or of this folder: enter the reservoir first, or correct the tag");
                report.CountRefusedRow();
                continue;
            }

            rows.Add((line, new Reading
            {
                SeriesNumber = reservoir.SeriesNumber,
                AtMs = fields.ReadAt!.Value.ToUnixTimeMilliseconds(),
                OilTemperatureC = fields.OilTemperatureC,
                WaterActivity = fields.WaterActivity,
            }));
            if (rows.Count == Portion)
            {
                await StoreAsync(cancellation);
                options.Progress?.Report((report.File, line));
            }
        }

        await StoreAsync(cancellation);
        if (report.New > 0)
        {
            context.Batches.Add(new RecordBatch(RecordContent.ReadingKind, report.File,
                FormattableString.Invariant($"{{\"new\":{report.New},\"unchanged\":{report.Unchanged},\"sum\":\"{sum}\"}}"), report.New, sum));
        }
    }

    private async Task StoreAsync(CancellationToken cancellation)
    {
        rows.Sort((one, other) => one.Row.SeriesNumber != other.Row.SeriesNumber
            ? one.Row.SeriesNumber.CompareTo(other.Row.SeriesNumber)
            : one.Row.AtMs != other.Row.AtMs ? one.Row.AtMs.CompareTo(other.Row.AtMs) : one.Line.CompareTo(other.Line));
        var fresh = new List<Reading>(rows.Count);
        for (var from = 0; from < rows.Count;)
        {
            var to = from;
            while (to < rows.Count && rows[to].Row.SeriesNumber == rows[from].Row.SeriesNumber)
            {
                to++;
            }

            await TakeAsync(from, to, fresh, cancellation);
            from = to;
        }

        if (fresh.Count > 0 && report.Refused == 0)
        {
            await engine.InsertReadingsAsync(context, fresh, cancellation);
        }

        rows.Clear();
    }

    /// <summary>One series of the portion: merges its rows with those that the register holds in the same range.</summary>
    private async Task TakeAsync(int from, int to, List<Reading> fresh, CancellationToken cancellation)
    {
        var series = rows[from].Row.SeriesNumber;
        var (first, last) = (rows[from].Row.AtMs, rows[to - 1].Row.AtMs);
        var known = new Dictionary<long, Reading>();
        if (newest.TryGetValue(series, out var end) && first <= end)
        {
            known = await context.Readings.AsNoTracking().Where(r => r.SeriesNumber == series && r.AtMs >= first && r.AtMs <= last).ToDictionaryAsync(r => r.AtMs, cancellation);
        }

        newest[series] = Math.Max(last, newest.GetValueOrDefault(series, long.MinValue));
        Reading? previous = null;
        for (var i = from; i < to; i++)
        {
            var (line, row) = rows[i];
            var other = previous is not null && previous.AtMs == row.AtMs ? previous : known.GetValueOrDefault(row.AtMs);
            if (other is null)
            {
                fresh.Add(row);
                Count(row);
                previous = row;
            }
            else if (Nullable.Equals(other.OilTemperatureC, row.OilTemperatureC) && Nullable.Equals(other.WaterActivity, row.WaterActivity))
            {
                report.Unchanged++;
            }
            else
            {
                report.Refuse(line, "readAt", CsvText.Format(DateTimeOffset.FromUnixTimeMilliseconds(row.AtMs)), "another reading of this reservoir at this time has other values: readings are not amended; remove the row");
                report.CountRefusedRow();
            }
        }
    }

    private void Count(Reading row)
    {
        Span<byte> content = stackalloc byte[28];
        RecordContent.Write(row, content);
        sum.Add(content);
        report.New++;
    }
}
