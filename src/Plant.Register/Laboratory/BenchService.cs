using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Assessments;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Storage;

namespace Plant.Register.Laboratory;

/// <summary>The bench: opens batches, takes scanned bottles and typed cells, releases results.</summary>
public sealed class BenchService(IDbContextFactory<PlantDbContext> contexts, RegisterWriter writer, AssessmentService assessments, TimeProvider clock)
{
    /// <summary>The open batch of this person; a new one takes its header from the last.</summary>
    public Task<Outcome<BenchBatch>> OpenAsync(Actor actor, CancellationToken cancellation = default) =>
        GuardAsync(actor, (context, stop) => OpenAsync(context, actor, stop), cancellation);

    /// <summary>Changes what holds for the whole batch.</summary>
    public Task<Outcome<BenchBatch>> SetHeaderAsync(Actor actor, Guid batchId, BenchHeader header, CancellationToken cancellation = default) =>
        GuardAsync(actor, async (context, stop) =>
        {
            var refusals = new List<Refusal>();
            header.Check(refusals);
            if (refusals.Count > 0)
            {
                return Outcome<BenchBatch>.Invalid(refusals);
            }

            if (await FindAsync(context, actor, batchId, stop) is not { } batch)
            {
                return NoBatch<BenchBatch>();
            }

            var entry = Rule.Parse<BenchEntry>(header.Entry)!.Value;
            if (batch.Rows.Any(r => r.ReleasedAt is null && r.Cells.Any(c => c.Length > 0)) && (entry != batch.Entry || header.Duplicates != batch.Duplicates))
            {
                return Outcome<BenchBatch>.Invalid(new Refusal("entry", header.Entry!, "results are typed already: release them or clear them before what is typed changes its meaning"));
            }

            (batch.Method, batch.Entry, batch.Duplicates) = (Rule.Parse<WaterMethod>(header.Method)!.Value, entry, header.Duplicates);
            (batch.Instrument, batch.StandardPpm, batch.StandardFoundPpm) = (header.Instrument?.Trim() ?? "", header.StandardPpm, header.StandardFoundPpm);
            (batch.BlankUg, batch.DriftUgPerMin, batch.Minutes) = (header.BlankUg, header.DriftUgPerMin, header.Minutes);
            return Outcome<BenchBatch>.Done(batch);
        }, cancellation);

    /// <summary>Takes a scanned bottle. The row's id is made by the caller: a scan sent twice opens one row.</summary>
    public async Task<Outcome<BenchScan>> ScanAsync(Actor actor, Guid batchId, Guid rowId, string code, CancellationToken cancellation = default)
    {
        code = code.Trim();
        var expectation = await ExpectAsync(code, cancellation);
        return await GuardAsync(actor, async (context, stop) =>
        {
            if (await FindAsync(context, actor, batchId, stop) is not { } batch)
            {
                return NoBatch<BenchScan>();
            }

            if (batch.Rows.FirstOrDefault(r => r.Id == rowId) is { } same)
            {
                return Told(BenchScanKind.Opened, same, "");
            }

            if (batch.Rows.FirstOrDefault(r => r.Bottle == code && r.ReleasedAt is null) is { } twice)
            {
                return Told(BenchScanKind.Twice, twice, $"{code} stands in this batch already, in row {twice.Ordinal}");
            }

            var elsewhere = await context.BenchBatches.Where(b => b.ClosedAt == null && b.Id != batchId && b.Rows.Any(r => r.Bottle == code && r.ReleasedAt == null)).Select(b => b.Owner).FirstOrDefaultAsync(stop);
            if (elsewhere is not null)
            {
                return Told(BenchScanKind.Elsewhere, null, $"{code} stands in an open batch of {elsewhere}");
            }

            var done = await context.Samples.AsNoTracking().Where(s => s.Code == code && s.WithdrawnAt == null).OrderBy(s => s.Replicate).ToListAsync(stop);
            if (done.Count > 0)
            {
                return Told(BenchScanKind.Done, null, string.Create(CultureInfo.InvariantCulture, $"{code} was released with {string.Join(" and ", done.Select(s => $"{s.WaterPpm:0.#}"))} ppm{(done[0].Analyst is { } analyst ? $" by {analyst}" : "")}"));
            }

            var bottle = await context.Bottles.AsNoTracking().Include(b => b.Reservoir).FirstOrDefaultAsync(b => b.Code == code && b.WithdrawnAt == null, stop);
            if (bottle is null)
            {
                return Told(BenchScanKind.Unknown, null, $"nobody logged a bottle {code}");
            }

            var row = new BenchRow
            {
                Id = rowId, BatchId = batchId, Ordinal = 1 + batch.Rows.Select(r => r.Ordinal).DefaultIfEmpty(0).Max(), Bottle = code, ReservoirId = bottle.ReservoirId, Tag = bottle.Reservoir!.Tag,
                Point = bottle.Point, TakenAt = bottle.TakenAt, OilTemperatureC = bottle.OilTemperatureC,
                ExpectedLowPpm = expectation?.WaterPpmLow90, ExpectedHighPpm = expectation?.WaterPpmHigh90, SaturationPpm = expectation?.SaturationNowPpm, SavedAt = Now,
            };
            context.BenchRows.Add(row);
            return Told(BenchScanKind.Opened, row, "");
        }, cancellation);
    }

    /// <summary>Keeps what was typed into a cell.</summary>
    public Task<Outcome<BenchRow>> TypeAsync(Actor actor, Guid rowId, int cell, string text, CancellationToken cancellation = default) =>
        OfRowAsync(actor, rowId, (batch, row) =>
        {
            if (cell < 0 || cell >= BenchArithmetic.CellCount(batch))
            {
                return new Refusal("cell", cell.ToString(CultureInfo.InvariantCulture), $"this batch has {BenchArithmetic.CellCount(batch)} cells a row");
            }

            if (text.Length > 30 || BenchArithmetic.Refuse(text) is { } wrong && (wrong.Length > 0))
            {
                return new Refusal("text", text, BenchArithmetic.Refuse(text) ?? "is too long");
            }

            var cells = row.Cells.ToList();
            while (cells.Count <= cell)
            {
                cells.Add("");
            }

            cells[cell] = text.Trim();
            row.Cells = cells;
            return null;
        }, cancellation);

    /// <summary>Sets a bottle aside as dirty, or takes it back.</summary>
    public Task<Outcome<BenchRow>> SetAsideAsync(Actor actor, Guid rowId, bool aside, CancellationToken cancellation = default) =>
        OfRowAsync(actor, rowId, (_, row) =>
        {
            row.SetAside = aside;
            return null;
        }, cancellation);

    /// <summary>Releases every complete row: its results become records. Warnings never block, what cannot be does.</summary>
    public Task<Outcome<IReadOnlyList<string>>> ReleaseAsync(Actor actor, Guid batchId, CancellationToken cancellation = default) =>
        GuardAsync(actor, async (context, stop) =>
        {
            if (await FindAsync(context, actor, batchId, stop) is not { } batch)
            {
                return NoBatch<IReadOnlyList<string>>();
            }

            var released = new List<string>();
            foreach (var row in batch.Rows.Where(r => r is { ReleasedAt: null, SetAside: false }).OrderBy(r => r.Ordinal))
            {
                var result = BenchArithmetic.Of(batch, row);
                if (result.Wrong.Length > 0)
                {
                    return Outcome<IReadOnlyList<string>>.Invalid(new Refusal(row.Bottle, "", result.Wrong));
                }

                if (!result.Complete)
                {
                    continue;
                }

                var reservoir = await context.Reservoirs.FirstAsync(r => r.Id == row.ReservoirId, stop);
                for (var i = 0; i < result.ReplicatePpm.Count; i++)
                {
                    context.Samples.Add(Result(batch, row, reservoir, i, result.ReplicatePpm[i], actor));
                }

                row.ReleasedAt = Now;
                released.Add(row.Bottle);
            }

            if (batch.Rows.All(r => r.ReleasedAt is not null || r.SetAside) && batch.Rows.Count > 0)
            {
                batch.ClosedAt = Now;
            }

            return Outcome<IReadOnlyList<string>>.Done(released);
        }, cancellation);

    private DateTime Now => DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds()).UtcDateTime;

    private static Outcome<BenchScan> Told(BenchScanKind kind, BenchRow? row, string text) => Outcome<BenchScan>.Done(new BenchScan(kind, row, text));

    private static Outcome<T> NoBatch<T>() => Outcome<T>.Refused(OutcomeKind.NotFound, "this batch is closed, or not yours: open the bench again");

    private static Task<BenchBatch?> FindAsync(PlantDbContext context, Actor actor, Guid id, CancellationToken cancellation) =>
        context.BenchBatches.Include(b => b.Rows).FirstOrDefaultAsync(b => b.Id == id && b.Owner == actor.Name && b.ClosedAt == null, cancellation);

    private async Task<Outcome<BenchBatch>> OpenAsync(PlantDbContext context, Actor actor, CancellationToken cancellation)
    {
        var open = await context.BenchBatches.Include(b => b.Rows).OrderByDescending(b => b.OpenedAt).FirstOrDefaultAsync(b => b.Owner == actor.Name && b.ClosedAt == null, cancellation);
        if (open is not null)
        {
            return Outcome<BenchBatch>.Done(open);
        }

        var last = await context.BenchBatches.AsNoTracking().OrderByDescending(b => b.OpenedAt).FirstOrDefaultAsync(b => b.Owner == actor.Name, cancellation);
        var batch = new BenchBatch { Id = Guid.CreateVersion7(), Owner = actor.Name, OpenedAt = Now };
        if (last is not null)
        {
            (batch.Method, batch.Entry, batch.Duplicates, batch.Instrument) = (last.Method, last.Entry, last.Duplicates, last.Instrument);
            (batch.StandardPpm, batch.BlankUg, batch.DriftUgPerMin, batch.Minutes) = (last.StandardPpm, last.BlankUg, last.DriftUgPerMin, last.Minutes);
        }

        context.BenchBatches.Add(batch);
        return Outcome<BenchBatch>.Done(batch);
    }

    private async Task<Assessment?> ExpectAsync(string code, CancellationToken cancellation)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var bottle = await context.Bottles.AsNoTracking().Where(b => b.Code == code && b.WithdrawnAt == null).Select(b => new { b.Reservoir!.Tag, b.TakenAt }).FirstOrDefaultAsync(cancellation);
        return bottle is null ? null : await assessments.OneAsync(bottle.Tag, bottle.TakenAt, cancellation: cancellation);
    }

    private Sample Result(BenchBatch batch, BenchRow row, Reservoir reservoir, int index, double ppm, Actor actor)
    {
        var width = batch.Entry == BenchEntry.Ppm ? 1 : 2;
        var typed = string.Join(batch.Entry == BenchEntry.MassAndCharge ? " g, C " : " g, µg ", row.Cells.Skip(index * width).Take(width));
        var remark = string.Join("; ", new[]
        {
            $"typed {typed}",
            batch.Instrument.Length > 0 ? $"instrument {batch.Instrument}" : null,
            batch.StandardFoundPpm is { } found ? string.Create(CultureInfo.InvariantCulture, $"standard {found} of {batch.StandardPpm} ppm") : null,
            batch.Entry != BenchEntry.Ppm ? string.Create(CultureInfo.InvariantCulture, $"blank {batch.BlankUg ?? 0} µg, drift {batch.DriftUgPerMin ?? 0} µg/min for {batch.Minutes ?? 0} min") : null,
        }.OfType<string>());
        return new Sample
        {
            Id = Guid.CreateVersion7(), Code = row.Bottle, Replicate = index + 1, ReservoirId = reservoir.Id, Reservoir = reservoir, TakenAt = row.TakenAt,
            ReceivedAt = row.TakenAt > Now ? row.TakenAt : Now, Point = row.Point, OilTemperatureC = row.OilTemperatureC, Method = batch.Method, WaterPpm = Math.Round(ppm, 3), Analyst = actor.Name, Remark = remark,
        };
    }

    private Task<Outcome<BenchRow>> OfRowAsync(Actor actor, Guid rowId, Func<BenchBatch, BenchRow, Refusal?> change, CancellationToken cancellation) =>
        GuardAsync(actor, async (context, stop) =>
        {
            var batch = await context.BenchBatches.Include(b => b.Rows).FirstOrDefaultAsync(b => b.Owner == actor.Name && b.ClosedAt == null && b.Rows.Any(r => r.Id == rowId), stop);
            if (batch?.Rows.First(r => r.Id == rowId) is not { ReleasedAt: null } row)
            {
                return Outcome<BenchRow>.Refused(OutcomeKind.NotFound, "this row is released, or not yours: correct a released result with a reason");
            }

            if (change(batch, row) is { } refusal)
            {
                return Outcome<BenchRow>.Invalid(refusal);
            }

            row.SavedAt = Now;
            return Outcome<BenchRow>.Done(row);
        }, cancellation);

    private Task<Outcome<T>> GuardAsync<T>(Actor actor, Func<PlantDbContext, CancellationToken, Task<Outcome<T>>> change, CancellationToken cancellation) =>
        actor.May(Duty.RecordSamples)
            ? writer.WriteAsync(actor, null, change, cancellation)
            : Task.FromResult(Outcome<T>.Refused(OutcomeKind.Forbidden, $"{actor.Name} may not record laboratory results"));
}
