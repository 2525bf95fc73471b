using Microsoft.EntityFrameworkCore;
using Plant.Register.Laboratory;
using Plant.Register.Tests.Storage;
using Plant.Register.Tests.WorkOrders;

namespace Plant.Register.Tests.Laboratory;

[Collection(PlantsCollection.Name)]
public sealed class BenchServiceTests(Plants plants)
{
    public static TheoryData<Engine> Engines => [Engine.Sqlite, Engine.PostgreSql];

    [Theory, MemberData(nameof(Engines))]
    public async Task Bottle_ScannedTypedReleased_IsAResultWithWhatWasTyped(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var (bench, batch) = await OpenAsync(plant, "mass-and-water");
        var scan = (await bench.ScanAsync(TestPlant.Lab, batch.Id, Guid.CreateVersion7(), "B-1")).Value!;
        Assert.Equal(BenchScanKind.Opened, scan.Kind);
        Assert.InRange(100, scan.Row!.ExpectedLowPpm!.Value, scan.Row.ExpectedHighPpm!.Value);
        string[] typed = ["2,000", "208.0", "2.0", "206"];
        for (var i = 0; i < typed.Length; i++)
        {
            Assert.True((await bench.TypeAsync(TestPlant.Lab, scan.Row.Id, i, typed[i])).IsDone);
        }

        var released = await bench.ReleaseAsync(TestPlant.Lab, batch.Id);
        Assert.Equal(["B-1"], released.Value!);
        await using var context = await plant.OpenAsync();
        var samples = await context.Samples.Where(s => s.Code == "B-1").OrderBy(s => s.Replicate).ToListAsync();
        // (208.0 − 4·1 − 2)/2.000 and (206 − 4·1 − 2)/2.0
        Assert.Equal([101.0, 100.0], samples.Select(s => s.WaterPpm!.Value));
        Assert.Contains("2,000", samples[0].Remark, StringComparison.Ordinal);
        Assert.Contains("instrument K2", samples[0].Remark, StringComparison.Ordinal);
        Assert.Equal("lab@test", samples[0].Analyst);

        var again = (await bench.OpenAsync(TestPlant.Lab)).Value!;
        Assert.NotEqual(batch.Id, again.Id);
        Assert.Equal((BenchEntry.MassAndWater, "K2", 2.0), (again.Entry, again.Instrument, again.BlankUg!.Value));
        Assert.Equal(BenchScanKind.Done, (await bench.ScanAsync(TestPlant.Lab, again.Id, Guid.CreateVersion7(), "B-1")).Value!.Kind);
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Scan_UnknownTwiceElsewhereOrRepeated_IsToldApart(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var (bench, batch) = await OpenAsync(plant, "ppm");
        Assert.Equal(BenchScanKind.Unknown, (await bench.ScanAsync(TestPlant.Lab, batch.Id, Guid.CreateVersion7(), "NOBODYS")).Value!.Kind);
        var row = Guid.CreateVersion7();
        Assert.Equal(BenchScanKind.Opened, (await bench.ScanAsync(TestPlant.Lab, batch.Id, row, "B-1")).Value!.Kind);
        // the same request again, as a retry sends it
        Assert.Equal(BenchScanKind.Opened, (await bench.ScanAsync(TestPlant.Lab, batch.Id, row, "B-1")).Value!.Kind);
        Assert.Equal(BenchScanKind.Twice, (await bench.ScanAsync(TestPlant.Lab, batch.Id, Guid.CreateVersion7(), "B-1")).Value!.Kind);
        var other = (await bench.OpenAsync(TestPlant.Administrator)).Value!;
        Assert.Equal(BenchScanKind.Elsewhere, (await bench.ScanAsync(TestPlant.Administrator, other.Id, Guid.CreateVersion7(), "B-1")).Value!.Kind);
        Assert.Single((await bench.OpenAsync(TestPlant.Lab)).Value!.Rows);
    }

    [Fact]
    public async Task Warnings_NeverBlock_ImpossibleValuesDo()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var (bench, batch) = await OpenAsync(plant, "ppm");
        var row = (await bench.ScanAsync(TestPlant.Lab, batch.Id, Guid.CreateVersion7(), "B-1")).Value!.Row!;
        foreach (var wrong in new[] { "abc", "-5", "1e400", "1 000", "--" })
        {
            Assert.False((await bench.TypeAsync(TestPlant.Lab, row.Id, 0, wrong)).IsDone, wrong);
        }

        Assert.True((await bench.TypeAsync(TestPlant.Lab, row.Id, 0, "4000")).IsDone);
        Assert.True((await bench.TypeAsync(TestPlant.Lab, row.Id, 1, "2000")).IsDone);
        var open = (await bench.OpenAsync(TestPlant.Lab)).Value!;
        var warning = BenchArithmetic.Of(open, open.Rows[0]).Warning;
        Assert.Contains("duplicates differ by 2000", warning, StringComparison.Ordinal);
        Assert.Contains("far above", warning, StringComparison.Ordinal);
        Assert.Contains("free water likely", warning, StringComparison.Ordinal);
        Assert.Equal(["B-1"], (await bench.ReleaseAsync(TestPlant.Lab, batch.Id)).Value!);
    }

    [Fact]
    public async Task SetAside_AndIncomplete_AreNotReleased()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var (bench, batch) = await OpenAsync(plant, "ppm");
        var first = (await bench.ScanAsync(TestPlant.Lab, batch.Id, Guid.CreateVersion7(), "B-1")).Value!.Row!;
        await bench.ScanAsync(TestPlant.Lab, batch.Id, Guid.CreateVersion7(), "B-2");
        await bench.TypeAsync(TestPlant.Lab, first.Id, 0, "100");
        await bench.TypeAsync(TestPlant.Lab, first.Id, 1, "101");
        Assert.True((await bench.SetAsideAsync(TestPlant.Lab, first.Id, true)).IsDone);
        Assert.Empty((await bench.ReleaseAsync(TestPlant.Lab, batch.Id)).Value!);
        Assert.Equal(batch.Id, (await bench.OpenAsync(TestPlant.Lab)).Value!.Id);
    }

    [Fact]
    public async Task Planner_MayNotTypeResults()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        Assert.Equal(OutcomeKind.Forbidden, (await plant.Get<BenchService>().OpenAsync(TestPlant.Planner)).Kind);
    }

    private static async Task<(BenchService Bench, BenchBatch Batch)> OpenAsync(TestPlant plant, string entry)
    {
        await WorkOrderStepsTests.FillAsync(plant);
        foreach (var code in new[] { "B-1", "B-2" })
        {
            Assert.True((await plant.Get<BottleService>().CreateAsync(TestPlant.Lab, null, new BottleFields { Code = code, Tag = "R1", Point = "return", TakenAt = plant.Clock.GetUtcNow().AddHours(-1) })).IsDone);
        }

        var bench = plant.Get<BenchService>();
        var batch = (await bench.OpenAsync(TestPlant.Lab)).Value!;
        var set = await bench.SetHeaderAsync(TestPlant.Lab, batch.Id, new BenchHeader { Method = "kf-coulometric", Entry = entry, Duplicates = true, Instrument = "K2", BlankUg = 2, DriftUgPerMin = 4, Minutes = 1 });
        Assert.True(set.IsDone, string.Join("; ", set.Refusals));
        return (bench, batch);
    }
}
