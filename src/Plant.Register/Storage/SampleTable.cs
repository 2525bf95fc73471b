using System.Globalization;
using Plant.Physics;
using Plant.Register.Samples;

namespace Plant.Register.Storage;

/// <summary>Columns of the samples table, for those who write it in bulk.</summary>
public static class SampleTable
{
    public static readonly IReadOnlyList<string> Columns =
    [
        "Id", "Token", "WithdrawnAt", "Code", "Replicate", "ReservoirId", "TakenAt", "ReceivedAt", "Point", "OilTemperatureC",
        "Method", "WaterPpm", "WaterActivity", "Analyst", "Remark",
    ];

    /// <summary>Column list for SQL.</summary>
    public static string ColumnList { get; } = string.Join(", ", Columns.Select(column => $"\"{column}\""));

    /// <summary>Values of one row in the order of <see cref="Columns"/>; times still as <see cref="DateTime"/>, ids as <see cref="Guid"/>.</summary>
    public static object?[] Values(Sample sample) =>
    [
        sample.Id, sample.Token, sample.WithdrawnAt, sample.Code, sample.Replicate, sample.ReservoirId, sample.TakenAt, sample.ReceivedAt,
        Code.Of(sample.Point), sample.OilTemperatureC, Code.Of(sample.Method), sample.WaterPpm, sample.WaterActivity, sample.Analyst, sample.Remark,
    ];

    /// <summary>A parameter name.</summary>
    public static string Parameter(int index) => "$p" + index.ToString(CultureInfo.InvariantCulture);
}
