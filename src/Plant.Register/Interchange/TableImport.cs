using System.Text;
using Microsoft.EntityFrameworkCore;
using Plant.Register.Audit;
using Plant.Register.Storage;

namespace Plant.Register.Interchange;

/// <summary>What the import of one kind of record needs to know of it.</summary>
/// <param name="Columns">Columns of its file.</param>
/// <param name="KeyOf">Key of a row.</param>
/// <param name="Existing">Known records by their key.</param>
/// <param name="FieldsOf">Columns of a known record.</param>
/// <param name="Make">A new record; adds a refusal where the row names something that is not there.</param>
/// <param name="Apply">Amends a known record; adds a refusal where the row names something that is not there.</param>
/// <param name="Detach">Lets go of what a known record points at, so that only itself is written.</param>
internal sealed record TableKind<TFields, TRecord>(
    IReadOnlyList<Column<TFields>> Columns,
    Func<TFields, string> KeyOf,
    Dictionary<string, TRecord> Existing,
    Func<TRecord, TFields> FieldsOf,
    Func<TFields, List<Physics.Refusal>, TRecord?> Make,
    Action<TRecord, TFields, List<Physics.Refusal>> Apply,
    Action<TRecord>? Detach = null)
    where TRecord : class, IRecord
    where TFields : class, IFields, new();

/// <summary>Imports one file of records: new ones are added, equal ones counted, others amended where a reason was given.</summary>
internal sealed class TableImport<TFields, TRecord>(PlantDbContext context, TableKind<TFields, TRecord> kind, FileReport report, ImportOptions options)
    where TRecord : class, IRecord
    where TFields : class, IFields, new()
{
    private readonly Dictionary<string, long> seen = new(StringComparer.Ordinal);
    private readonly List<Physics.Refusal> refusals = [];
    private ContentSum sum;

    /// <summary>Reads the file. New records are handed on in portions.</summary>
    public async Task RunAsync(string path, Func<IReadOnlyList<TRecord>, Task> store, CancellationToken cancellation)
    {
        const int portion = 5_000;
        var fresh = new List<TRecord>(portion);
        foreach (var (line, fields) in new CsvFile<TFields>(path, kind.Columns, report).Rows())
        {
            cancellation.ThrowIfCancellationRequested();
            if (Take(line, fields) is { } record)
            {
                fresh.Add(record);
                if (fresh.Count == portion)
                {
                    await StoreAsync(fresh, store);
                }
            }

            options.Progress?.Report((report.File, line));
        }

        await StoreAsync(fresh, store);
        if (report.New > 0)
        {
            context.Batches.Add(new RecordBatch(
                RecordContent.KindOf(kind.Existing.Values.First(r => context.Batched.Contains(r.Id))), report.File,
                FormattableString.Invariant($"{{\"new\":{report.New},\"unchanged\":{report.Unchanged},\"amended\":{report.Amended},\"sum\":\"{sum}\"}}"), report.New, sum));
        }
    }

    private async Task StoreAsync(List<TRecord> fresh, Func<IReadOnlyList<TRecord>, Task> store)
    {
        if (fresh.Count == 0)
        {
            return;
        }

        if (report.Refused == 0)
        {
            await store(fresh);
        }

        fresh.Clear();
    }

    private TRecord? Take(long line, TFields fields)
    {
        var key = kind.KeyOf(fields);
        if (kind.Existing.TryGetValue(key, out var known))
        {
            Compare(line, key, known, fields);
            return null;
        }

        refusals.Clear();
        var record = kind.Make(fields, refusals);
        if (record is null || refusals.Count > 0)
        {
            foreach (var refusal in refusals)
            {
                report.Refuse(line, refusal.Field, refusal.Value, refusal.Reason);
            }

            report.CountRefusedRow();
            return null;
        }

        record.Token = Guid.CreateVersion7();
        kind.Existing.Add(key, record);
        seen.Add(key, line);
        context.Batched.Add(record.Id);
        sum.Add(RecordContent.Bytes(record));
        report.New++;
        return record;
    }

    private void Compare(long line, string key, TRecord known, TFields fields)
    {
        var change = Difference(kind.FieldsOf(known), fields);
        if (change is null && known.WithdrawnAt is null)
        {
            report.Unchanged++;
            return;
        }

        if (seen.TryGetValue(key, out var first))
        {
            report.Refuse(line, kind.Columns.First(c => c.IsKey).Name, key, FormattableString.Invariant($"stands with other values on line {first} too: keep one of them ({change})"));
            report.CountRefusedRow();
            return;
        }

        change ??= "was withdrawn";
        report.Change(new ChangedRow(line, key, change));
        if (options.AmendReason is null)
        {
            if (!options.Preview)
            {
                report.Refuse(line, change.Split(':')[0], string.Empty, $"{key} is recorded with other values ({change}): say why with --amend \"reason\" to correct it");
                report.CountRefusedRow();
            }

            return;
        }

        Amend(line, known, fields);
        seen.Add(key, line);
    }

    private void Amend(long line, TRecord known, TFields fields)
    {
        if (report.Refused > 0)
        {
            return;
        }

        refusals.Clear();
        kind.Detach?.Invoke(known);
        context.Entry(known).State = EntityState.Unchanged;
        kind.Apply(known, fields, refusals);
        known.WithdrawnAt = null;
        if (refusals.Count > 0)
        {
            report.Refuse(line, refusals[0].Field, refusals[0].Value, refusals[0].Reason);
            report.CountRefusedRow();
        }
    }

    private string? Difference(TFields known, TFields fields)
    {
        StringBuilder? found = null;
        foreach (var column in kind.Columns)
        {
            var (before, after) = (column.Write(known), column.Write(fields));
            if (before != after)
            {
                found = found is null ? new StringBuilder() : found.Append("; ");
                found.Append(column.Name).Append(": ").Append(before.Length == 0 ? "(empty)" : before).Append(" → ").Append(after.Length == 0 ? "(empty)" : after);
            }
        }

        return found?.ToString();
    }
}
