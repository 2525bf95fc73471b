using System.Security.Cryptography;
using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Storage;

namespace Plant.Register.Audit;

/// <summary>Appends to the chain within the caller's transaction. The caller holds the write lock.</summary>
internal sealed class AuditChain
{
    private const string ChainKind = "";

    private readonly PlantDbContext context;
    private readonly DateTime now;
    private readonly Actor actor;
    private readonly string? reason;
    private readonly Dictionary<string, AuditHead> heads;

    private AuditChain(PlantDbContext context, DateTime now, Actor actor, string? reason, Dictionary<string, AuditHead> heads)
    {
        this.context = context;
        this.now = now;
        this.actor = actor;
        this.reason = reason;
        this.heads = heads;
    }

    public static async Task<AuditChain> OpenAsync(PlantDbContext context, DateTime now, Actor actor, string? reason, CancellationToken cancellation) =>
        new(context, now, actor, reason, await context.AuditHeads.ToDictionaryAsync(head => head.Kind, cancellation));

    /// <summary>Hash of an entry: covers every field and the hash before it.</summary>
    public static string HashOf(AuditEntry entry) => Convert.ToHexStringLower(SHA256.HashData(JsonSerializer.SerializeToUtf8Bytes(new object?[]
    {
        entry.Sequence, entry.At.ToString("yyyy-MM-ddTHH:mm:ss.fffZ", System.Globalization.CultureInfo.InvariantCulture), entry.Actor, entry.Action, entry.Kind,
        entry.RecordId, entry.Key, entry.Reason, entry.Detail, entry.ContentSum, entry.PreviousHash,
    })));

    public void Append(string action, string kind, Guid? id, string key, string detail, long countDelta, ContentSum sumDelta)
    {
        var head = Head(kind);
        var sum = ContentSum.Parse(head.Sum);
        sum.Add(sumDelta);
        head.Sum = sum.ToString();
        head.Count += countDelta;

        var chain = Head(ChainKind);
        var entry = new AuditEntry
        {
            Sequence = chain.Count + 1,
            At = now,
            Actor = actor.Name,
            Action = action,
            Kind = kind,
            RecordId = id,
            Key = key,
            Reason = reason,
            Detail = detail,
            ContentSum = head.Sum,
            PreviousHash = chain.Sum,
            Hash = string.Empty,
        };
        var sealedEntry = Seal(entry);
        chain.Count = entry.Sequence;
        chain.Sum = sealedEntry.Hash;
        context.AuditEntries.Add(sealedEntry);
    }

    private static AuditEntry Seal(AuditEntry entry) => new()
    {
        Sequence = entry.Sequence,
        At = entry.At,
        Actor = entry.Actor,
        Action = entry.Action,
        Kind = entry.Kind,
        RecordId = entry.RecordId,
        Key = entry.Key,
        Reason = entry.Reason,
        Detail = entry.Detail,
        ContentSum = entry.ContentSum,
        PreviousHash = entry.PreviousHash,
        Hash = HashOf(entry),
    };

    private AuditHead Head(string kind)
    {
        if (!heads.TryGetValue(kind, out var head))
        {
            head = new AuditHead { Kind = kind, Sum = default(ContentSum).ToString() };
            heads.Add(kind, head);
            context.AuditHeads.Add(head);
        }

        return head;
    }
}
