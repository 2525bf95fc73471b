using Plant.Physics;
using Plant.Register.Laboratory;

namespace Plant.Web.Features.Bench;

/// <summary>A batch as the script draws it.</summary>
public sealed record BenchView(Guid Id, BenchHeader Header, IReadOnlyList<string> CellNames, IReadOnlyList<BenchRowView> Rows)
{
    private static readonly string[] Ppm = ["ppm 1", "ppm 2"];
    private static readonly string[] Water = ["Mass 1, g", "Water 1, µg", "Mass 2, g", "Water 2, µg"];
    private static readonly string[] Charge = ["Mass 1, g", "Charge 1, C", "Mass 2, g", "Charge 2, C"];

    public static BenchView Of(BenchBatch batch) => new(
        batch.Id,
        new BenchHeader
        {
            Method = Code.Of(batch.Method), Entry = Code.Of(batch.Entry), Duplicates = batch.Duplicates, Instrument = batch.Instrument, StandardPpm = batch.StandardPpm,
            StandardFoundPpm = batch.StandardFoundPpm, BlankUg = batch.BlankUg, DriftUgPerMin = batch.DriftUgPerMin, Minutes = batch.Minutes,
        },
        (batch.Entry switch { BenchEntry.Ppm => Ppm, BenchEntry.MassAndWater => Water, _ => Charge })[..BenchArithmetic.CellCount(batch)],
        [.. batch.Rows.OrderBy(r => r.Ordinal).Select(r => BenchRowView.Of(batch, r))]);
}

/// <summary>A row as the script draws it.</summary>
public sealed record BenchRowView(
    Guid Id, int Ordinal, string Bottle, string Tag, string Point, IReadOnlyList<string> Cells, double? MeanPpm, double? ExpectedLowPpm, double? ExpectedHighPpm,
    bool Complete, string Wrong, string Warning, bool SetAside, bool Released)
{
    public static BenchRowView Of(BenchBatch batch, BenchRow row)
    {
        var result = BenchArithmetic.Of(batch, row);
        return new(row.Id, row.Ordinal, row.Bottle, row.Tag, Code.Of(row.Point), row.Cells, result.MeanPpm, row.ExpectedLowPpm, row.ExpectedHighPpm,
            result.Complete, result.Wrong, result.Warning, row.SetAside, row.ReleasedAt is not null);
    }
}
