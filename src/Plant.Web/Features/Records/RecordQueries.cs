using System.Globalization;
using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using Plant.Register.Audit;
using Plant.Register.Storage;

namespace Plant.Web.Features.Records;

/// <summary>Which audit entries are meant, as it stands in the address.</summary>
public sealed record RecordFilter(string? Kind, string? Key, string? Person, DateOnly? From, DateOnly? To, long? Before)
{
    /// <summary>The address with this filter.</summary>
    public string Address(string path) => Microsoft.AspNetCore.WebUtilities.QueryHelpers.AddQueryString(path, new Dictionary<string, string?>
    {
        ["kind"] = Kind, ["key"] = Key, ["person"] = Person, ["from"] = From?.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture), ["to"] = To?.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture),
        ["before"] = Before?.ToString(CultureInfo.InvariantCulture),
    }.Where(p => !string.IsNullOrEmpty(p.Value)).ToDictionary());
}

/// <summary>A version of a record: what it said, from when, by whom, why it was replaced.</summary>
public sealed record RecordVersion(int Number, string Said, DateTime? ReplacedAt, string? ReplacedBy, string? Reason, IReadOnlyDictionary<string, string> Fields);

/// <summary>Reads for the records page.</summary>
public sealed class RecordQueries(IDbContextFactory<PlantDbContext> contexts)
{
    /// <summary>Entries on a page.</summary>
    public const int PageSize = 100;

    /// <summary>Entries that fit, newest first.</summary>
    public async Task<IReadOnlyList<AuditEntry>> EntriesAsync(RecordFilter filter, int count, CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var query = context.AuditEntries.AsNoTracking().Where(e => e.Action != "kept");
        query = filter.Kind is { Length: > 0 } kind ? query.Where(e => e.Kind == kind) : query;
        query = filter.Key is { Length: > 0 } key ? query.Where(e => e.Key.StartsWith(key)) : query;
        query = filter.Person is { Length: > 0 } person ? query.Where(e => e.Actor.Contains(person)) : query;
        if (filter.From is { } from)
        {
            var begin = from.ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc);
            query = query.Where(e => e.At >= begin);
        }

        if (filter.To is { } to)
        {
            var end = to.AddDays(1).ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc);
            query = query.Where(e => e.At < end);
        }

        query = filter.Before is { } before ? query.Where(e => e.Sequence < before) : query;
        return await query.OrderByDescending(e => e.Sequence).Take(count).ToListAsync(cancellation);
    }

    /// <summary>All versions of a record, the present one last.</summary>
    public async Task<(string Key, IReadOnlyList<RecordVersion> Versions)> VersionsAsync(Guid id, CancellationToken cancellation = default)
    {
        await using var context = await contexts.CreateDbContextAsync(cancellation);
        var revisions = await context.Revisions.AsNoTracking().Where(r => r.RecordId == id).OrderBy(r => r.Number).ToListAsync(cancellation);
        var last = await context.AuditEntries.AsNoTracking().Where(e => e.RecordId == id && e.Action != "kept").OrderByDescending(e => e.Sequence).FirstOrDefaultAsync(cancellation);
        var versions = revisions.ConvertAll(r => new RecordVersion(r.Number, r.Content, r.ReplacedAt, r.ReplacedBy, r.Reason, FieldsOf(r.Content)));
        if (last is not null)
        {
            versions.Add(new RecordVersion(versions.Count + 1, last.Detail, null, null, null, FieldsOf(last.Detail)));
        }

        return (last?.Key ?? "", versions);
    }

    private static Dictionary<string, string> FieldsOf(string content)
    {
        using var json = JsonDocument.Parse(content);
        return json.RootElement.EnumerateObject().ToDictionary(p => p.Name, p => p.Value.ToString());
    }
}
