using System.Buffers.Binary;
using System.Text;
using System.Text.Json;
using System.Text.Json.Serialization;
using System.Text.Json.Serialization.Metadata;
using Plant.Register.Laboratory;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.Storage;
using Plant.Register.WorkOrders;

namespace Plant.Register.Audit;

/// <summary>The content of a record as one text: the same on every database and machine, whatever the order of its properties in the code.</summary>
public static class RecordContent
{
    /// <summary>Kind of the sensor readings, which are no records of their own.</summary>
    public const string ReadingKind = "reading";

    /// <summary>Kind of what records said before.</summary>
    public const string RevisionKind = "revision";

    private static readonly Dictionary<Type, string> Kinds = new()
    {
        [typeof(Fluid)] = "fluid",
        [typeof(Reservoir)] = "reservoir",
        [typeof(Sample)] = "sample",
        [typeof(DrainEvent)] = "drain",
        [typeof(TopUpEvent)] = "top-up",
        [typeof(Separator)] = "separator",
        [typeof(SeparatorRunEvent)] = "separator-run",
        [typeof(WorkOrder)] = "work-order",
        [typeof(DrainRound)] = "round",
        [typeof(Bottle)] = "bottle",
    };

    private static readonly JsonSerializerOptions Options = new()
    {
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        Encoder = System.Text.Encodings.Web.JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) },
        TypeInfoResolver = new DefaultJsonTypeInfoResolver { Modifiers = { KeepColumnsInOrder } },
    };

    public static string KindOf(IRecord record) => Kinds[record.GetType()];

    public static string Of(IRecord record) => JsonSerializer.Serialize(record, record.GetType(), Options);

    public static byte[] Bytes(IRecord record) => JsonSerializer.SerializeToUtf8Bytes(record, record.GetType(), Options);

    public static byte[] Bytes(string content) => Encoding.UTF8.GetBytes(content);

    public static byte[] Bytes(Revision revision) => JsonSerializer.SerializeToUtf8Bytes(
        new object[] { revision.Id, revision.Kind, revision.RecordId, revision.Number, revision.Content, new DateTimeOffset(revision.ReplacedAt).ToUnixTimeMilliseconds(), revision.ReplacedBy, revision.Reason });

    /// <summary>Content of a sensor reading in 28 bytes.</summary>
    public static void Write(Reading reading, Span<byte> content)
    {
        BinaryPrimitives.WriteInt32LittleEndian(content, reading.SeriesNumber);
        BinaryPrimitives.WriteInt64LittleEndian(content[4..], reading.AtMs);
        BinaryPrimitives.WriteDoubleLittleEndian(content[12..], reading.OilTemperatureC ?? double.NaN);
        BinaryPrimitives.WriteDoubleLittleEndian(content[20..], reading.WaterActivity ?? double.NaN);
    }

    private static void KeepColumnsInOrder(JsonTypeInfo type)
    {
        if (type.Kind != JsonTypeInfoKind.Object)
        {
            return;
        }

        var kept = type.Properties
            .Where(p => p.Name is not ("token" or "naturalKey") && !(p.PropertyType.IsClass && p.PropertyType.Namespace!.StartsWith("Plant.Register", StringComparison.Ordinal)))
            .OrderBy(p => p.Name, StringComparer.Ordinal)
            .ToList();
        type.Properties.Clear();
        foreach (var property in kept)
        {
            type.Properties.Add(property);
        }
    }
}
