using System.Buffers.Binary;
using System.Security.Cryptography;

namespace Plant.Register.Audit;

/// <summary>
/// Sum mod 2²⁵⁶ of content hashes: adding and taking away records keeps it current without reading the table, and recomputing it
/// from the table shows whether a byte was altered behind the chain's back.
/// </summary>
public struct ContentSum : IEquatable<ContentSum>
{
    private ulong a;
    private ulong b;
    private ulong c;
    private ulong d;

    public static bool operator ==(ContentSum left, ContentSum right) => left.Equals(right);

    public static bool operator !=(ContentSum left, ContentSum right) => !left.Equals(right);

    public static ContentSum Parse(string hex)
    {
        var bytes = Convert.FromHexString(hex);
        return new ContentSum
        {
            a = BinaryPrimitives.ReadUInt64LittleEndian(bytes),
            b = BinaryPrimitives.ReadUInt64LittleEndian(bytes.AsSpan(8)),
            c = BinaryPrimitives.ReadUInt64LittleEndian(bytes.AsSpan(16)),
            d = BinaryPrimitives.ReadUInt64LittleEndian(bytes.AsSpan(24)),
        };
    }

    /// <summary>Adds a record's content.</summary>
    public void Add(ReadOnlySpan<byte> content)
    {
        Span<byte> hash = stackalloc byte[32];
        SHA256.HashData(content, hash);
        Add(Read(hash));
    }

    /// <summary>Takes a record's content away.</summary>
    public void Remove(ReadOnlySpan<byte> content)
    {
        Span<byte> hash = stackalloc byte[32];
        SHA256.HashData(content, hash);
        var other = Read(hash);
        Add(new ContentSum { a = ~other.a, b = ~other.b, c = ~other.c, d = ~other.d });
        Add(new ContentSum { a = 1 });
    }

    public void Add(ContentSum other)
    {
        UInt128 sum = (UInt128)a + other.a;
        a = (ulong)sum;
        sum = (UInt128)b + other.b + (sum >> 64);
        b = (ulong)sum;
        sum = (UInt128)c + other.c + (sum >> 64);
        c = (ulong)sum;
        d = unchecked(d + other.d + (ulong)(sum >> 64));
    }

    public readonly bool Equals(ContentSum other) => a == other.a && b == other.b && c == other.c && d == other.d;

    public override readonly bool Equals(object? obj) => obj is ContentSum other && Equals(other);

    public override readonly int GetHashCode() => HashCode.Combine(a, b, c, d);

    public override readonly string ToString()
    {
        Span<byte> bytes = stackalloc byte[32];
        BinaryPrimitives.WriteUInt64LittleEndian(bytes, a);
        BinaryPrimitives.WriteUInt64LittleEndian(bytes[8..], b);
        BinaryPrimitives.WriteUInt64LittleEndian(bytes[16..], c);
        BinaryPrimitives.WriteUInt64LittleEndian(bytes[24..], d);
        return Convert.ToHexStringLower(bytes);
    }

    private static ContentSum Read(ReadOnlySpan<byte> hash) => new()
    {
        a = BinaryPrimitives.ReadUInt64LittleEndian(hash),
        b = BinaryPrimitives.ReadUInt64LittleEndian(hash[8..]),
        c = BinaryPrimitives.ReadUInt64LittleEndian(hash[16..]),
        d = BinaryPrimitives.ReadUInt64LittleEndian(hash[24..]),
    };
}
