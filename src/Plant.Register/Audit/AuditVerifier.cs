using Microsoft.EntityFrameworkCore;
using Plant.Register.Storage;

namespace Plant.Register.Audit;

/// <summary>Checks the database, the audit chain, and the records against what the chain says of them.</summary>
public sealed class AuditVerifier(IDbContextFactory<PlantDbContext> contexts, IDatabaseEngine engine)
{
    /// <summary>Findings in plain words; empty where all is well.</summary>
    public async Task<IReadOnlyList<string>> VerifyAsync(CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var findings = new List<string>(await engine.CheckAsync(context, cancellation));
        var sums = await WalkChainAsync(context, findings, cancellation);
        await CompareHeadsAsync(context, sums, findings, cancellation);
        foreach (var (kind, recorded) in sums)
        {
            if (recorded is { } expected && !await MatchesAsync(context, kind, expected, cancellation))
            {
                findings.Add($"records of kind {kind} differ from what the audit chain says of them: at least one was altered, added or removed outside the program");
            }
        }

        return findings;
    }

    private static async Task<Dictionary<string, string?>> WalkChainAsync(PlantDbContext context, List<string> findings, CancellationToken cancellation)
    {
        var sums = new Dictionary<string, string?>(StringComparer.Ordinal);
        var previous = default(ContentSum).ToString();
        var next = 1L;
        await foreach (var entry in context.AuditEntries.AsNoTracking().OrderBy(e => e.Sequence).AsAsyncEnumerable().WithCancellation(cancellation))
        {
            if (entry.Sequence != next || entry.PreviousHash != previous || entry.Hash != AuditChain.HashOf(entry))
            {
                findings.Add(FormattableString.Invariant($"audit chain: entry {entry.Sequence} is not the one that was written (the first bad entry)"));
                return sums;
            }

            next++;
            previous = entry.Hash;
            sums[entry.Kind] = entry.ContentSum;
        }

        return sums;
    }

    private static async Task CompareHeadsAsync(PlantDbContext context, Dictionary<string, string?> sums, List<string> findings, CancellationToken cancellation)
    {
        var heads = await context.AuditHeads.AsNoTracking().ToListAsync(cancellation);
        var last = await context.AuditEntries.AsNoTracking().OrderByDescending(e => e.Sequence).FirstOrDefaultAsync(cancellation);
        var chain = heads.Find(h => h.Kind.Length == 0);
        if (chain?.Sum != last?.Hash || (chain?.Count ?? 0) != (last?.Sequence ?? 0))
        {
            findings.Add("audit chain: its last entries are missing");
        }

        foreach (var head in heads.Where(h => h.Kind.Length > 0 && sums.TryGetValue(h.Kind, out var sum) && sum != h.Sum))
        {
            findings.Add($"audit chain: the running sum of kind {head.Kind} was altered");
        }
    }

    private static async Task<bool> MatchesAsync(PlantDbContext context, string kind, string expected, CancellationToken cancellation)
    {
        var sum = default(ContentSum);
        if (kind == RecordContent.ReadingKind)
        {
            var content = new byte[28];
            await foreach (var reading in context.Readings.AsNoTracking().AsAsyncEnumerable().WithCancellation(cancellation))
            {
                RecordContent.Write(reading, content);
                sum.Add(content);
            }

            return sum.ToString() == expected;
        }

        if (kind == RecordContent.RevisionKind)
        {
            await foreach (var revision in context.Revisions.AsNoTracking().AsAsyncEnumerable().WithCancellation(cancellation))
            {
                sum.Add(RecordContent.Bytes(revision));
            }

            return sum.ToString() == expected;
        }

        if (Records(context, kind) is not { } records)
        {
            return true;
        }

        await foreach (var record in records.AsAsyncEnumerable().WithCancellation(cancellation))
        {
            sum.Add(RecordContent.Bytes(record));
        }

        return sum.ToString() == expected;
    }

    /// <summary>The table of a kind; null for what is chained by its entry alone (areas, people, tokens).</summary>
    private static IQueryable<IRecord>? Records(PlantDbContext context, string kind) => kind switch
    {
        "fluid" => context.Fluids.AsNoTracking(),
        "reservoir" => context.Reservoirs.AsNoTracking(),
        "sample" => context.Samples.AsNoTracking(),
        "drain" => context.Drains.AsNoTracking(),
        "top-up" => context.TopUps.AsNoTracking(),
        "separator" => context.Separators.AsNoTracking(),
        "separator-run" => context.SeparatorRuns.AsNoTracking(),
        "work-order" => context.WorkOrders.AsNoTracking(),
        "round" => context.Rounds.AsNoTracking(),
        "bottle" => context.Bottles.AsNoTracking(),
        _ => null,
    };
}
