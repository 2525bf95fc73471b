using Microsoft.EntityFrameworkCore;
using Plant.Register.Audit;
using Plant.Register.Interchange;
using Plant.Register.Tests.Storage;

namespace Plant.Register.Tests.Interchange;

[Collection(PlantsCollection.Name)]
public sealed class RoundTripTests(Plants plants)
{
    private static readonly string Foreign = Path.Combine(AppContext.BaseDirectory, "Interchange", "foreign");

    public static TheoryData<Engine> Engines => [Engine.Sqlite, Engine.PostgreSql];

    [Theory, MemberData(nameof(Engines))]
    public async Task Export_Import_Export_IsByteEqual(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await ImportAsync(plant, Foreign);
        var first = Path.Combine(plant.Folder, "first");
        await plant.Get<Exporter>().ExportAsync(first, TestPlant.Planner);
        await using var other = await plants.EmptyAsync(engine);
        await ImportAsync(other, first);
        var second = Path.Combine(other.Folder, "second");
        await other.Get<Exporter>().ExportAsync(second, TestPlant.Planner);
        foreach (var file in Files.All)
        {
            Assert.Equal(await File.ReadAllBytesAsync(Path.Combine(first, file)), await File.ReadAllBytesAsync(Path.Combine(second, file)));
        }

        Assert.Empty(await other.Get<AuditVerifier>().VerifyAsync());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Import_Repeated_HasNoEffect(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var first = await ImportAsync(plant, Foreign);
        Assert.Equal((7, 36, 425), (first.Files[0].New, first.Files[1].New, first.Files[2].New));
        var second = await ImportAsync(plant, Foreign);
        Assert.All(second.Files, file => Assert.Equal((0, 0, 0), (file.New, file.Amended, file.Refused)));
        Assert.Equal(first.Files.Sum(f => f.New), second.Files.Sum(f => f.Unchanged));
    }

    [Fact]
    public async Task NastyText_ComesBackTheSame()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var folder = Path.Combine(plant.Folder, "in");
        Directory.CreateDirectory(folder);
        string[] remarks = ["=1+2", "+49", "-5", "@cmd", "\tindented", "\rreturn", "'=quoted", "''=twice", "plain, with comma", "say \"wet\"", "two\nlines", "Ünïcödé µ°", "'", "'plain", "=HYPERLINK(\"x\")"];
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), "code,name,family\r\nM,Oil,mineral\r\n");
        await File.WriteAllTextAsync(Path.Combine(folder, "reservoirs.csv"), "tag,name,fluid\r\nR1,Tank,M\r\n");
        await ImportAsync(plant, folder);
        for (var i = 0; i < remarks.Length; i++)
        {
            var outcome = await plant.Get<Plant.Register.Samples.SampleService>().CreateAsync(TestPlant.Lab, null, RegisterTests.Sample($"S{i:00}") with { Remark = remarks[i] });
            Assert.True(outcome.IsDone, outcome.Refusals.Count > 0 ? outcome.Refusals[0].ToString() : outcome.Message);
        }

        var first = Path.Combine(plant.Folder, "first");
        await plant.Get<Exporter>().ExportAsync(first, TestPlant.Planner);
        await using var other = await plants.EmptyAsync(Engine.Sqlite);
        await ImportAsync(other, first);
        await using var context = await other.OpenAsync();
        Assert.Equal(remarks, await context.Samples.OrderBy(s => s.Code).Select(s => s.Remark!).ToArrayAsync());
        var text = await File.ReadAllTextAsync(Path.Combine(first, "samples.csv"));
        Assert.DoesNotContain(",=", text, StringComparison.Ordinal);
        Assert.DoesNotContain(",\"=", text, StringComparison.Ordinal);
        Assert.DoesNotContain(",@", text, StringComparison.Ordinal);
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task ChangedRow_NeedsAReasonAndKeepsTheOldOne(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await ImportAsync(plant, Foreign);
        var folder = Path.Combine(plant.Folder, "changed");
        Directory.CreateDirectory(folder);
        var fluids = (await File.ReadAllTextAsync(Path.Combine(Foreign, "fluids.csv"))).Replace("862", "863", StringComparison.Ordinal);
        var reservoirs = (await File.ReadAllTextAsync(Path.Combine(Foreign, "reservoirs.csv"))).Replace("716,382,382,100,20", "716,382,382,99,20", StringComparison.Ordinal);
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), fluids);
        await File.WriteAllTextAsync(Path.Combine(folder, "reservoirs.csv"), reservoirs);
        var refused = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions(), TestPlant.Planner);
        Assert.False(refused.IsDone);
        Assert.Contains("--amend", refused.Value!.Files[0].Errors[0].Remedy, StringComparison.Ordinal);
        Assert.Equal("density15KgM3", refused.Value.Files[0].Errors[0].Column);

        var preview = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions { Preview = true }, TestPlant.Planner);
        Assert.False(preview.Value!.Written);
        Assert.Contains("862 → 863", Assert.Single(preview.Value.Files[0].ChangedRows).Change, StringComparison.Ordinal);

        var amended = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions { AmendReason = "new data sheet of June" }, TestPlant.Planner);
        Assert.True(amended.IsDone, amended.Message ?? string.Join("; ", amended.Value!.Files.SelectMany(f => f.Errors)));
        await using var context = await plant.OpenAsync();
        Assert.Equal(2, await context.Revisions.CountAsync());
        Assert.Equal(863, (await context.Fluids.SingleAsync(f => f.Code == "LUB-T32")).Density15KgM3);
        Assert.Equal(99, (await context.Reservoirs.SingleAsync(r => r.Tag == "P-101A")).OilVolumeL);
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task SecondImport_OfNewRows_KeepsTheChainWhole(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await ImportAsync(plant, Foreign);
        var folder = Directory.CreateDirectory(Path.Combine(plant.Folder, "more")).FullName;
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), "code,name,family\nNEW-1,Oil,mineral\n");
        await File.WriteAllTextAsync(Path.Combine(folder, "samples.csv"), "sample,tag,takenAt,point,method,waterPpm,replicate\nNEW-S1,P-101A,2026-06-01T08:00:00Z,return,kf-coulometric,100,1\n");
        await File.WriteAllTextAsync(Path.Combine(folder, "readings.csv"), "tag,readAt,oilTemperatureC,waterActivity\nP-101A,2026-06-01T08:00:00Z,50,0.5\n");
        var second = await ImportAsync(plant, folder);
        Assert.Equal(3, second.Files.Sum(f => f.New));

        var after = await plant.Get<Plant.Register.Reservoirs.FluidService>().CreateAsync(TestPlant.Planner, null, RegisterTests.Mineral("NEW-2"));
        Assert.True(after.IsDone, after.Message);
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
    }

    [Fact]
    public async Task WithoutNames_ThingsAreCalledByTheirKeys_AndASecondImportIsTheSame()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var folder = Directory.CreateDirectory(Path.Combine(plant.Folder, "nameless")).FullName;
        await File.WriteAllTextAsync(Path.Combine(folder, "fluids.csv"), "code,family\nM-1,mineral\n");
        await File.WriteAllTextAsync(Path.Combine(folder, "reservoirs.csv"), "tag,fluid,name\nR-1,M-1,\n");
        await ImportAsync(plant, folder);
        await using var context = await plant.OpenAsync();
        Assert.Equal(("M-1", "R-1"), ((await context.Fluids.SingleAsync()).Name, (await context.Reservoirs.SingleAsync()).Name));
        Assert.All((await ImportAsync(plant, folder)).Files, file => Assert.Equal((0, 0), (file.New, file.Refused)));
    }

    [Fact]
    public async Task OneBadRow_WritesNothing()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var folder = Path.Combine(plant.Folder, "bad");
        Directory.CreateDirectory(folder);
        foreach (var file in Files.All)
        {
            File.Copy(Path.Combine(Foreign, file), Path.Combine(folder, file));
        }

        await File.AppendAllTextAsync(Path.Combine(folder, "readings.csv"), "NO-SUCH,2025-03-03T00:00:00Z,50,0.5\n");
        var outcome = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions(), TestPlant.Planner);
        Assert.False(outcome.IsDone);
        await using var context = await plant.OpenAsync();
        Assert.Equal((0, 0, 0, 0), (await context.Fluids.CountAsync(), await context.Samples.CountAsync(), await context.Readings.CountAsync(), await context.AuditEntries.CountAsync()));
    }

    private static async Task<ImportReport> ImportAsync(TestPlant plant, string folder)
    {
        var outcome = await plant.Get<Importer>().ImportAsync(folder, new ImportOptions(), TestPlant.Planner);
        Assert.True(outcome.IsDone, outcome.Message ?? string.Join("; ", outcome.Value?.Files.SelectMany(f => f.Errors).Take(5) ?? []));
        return outcome.Value!;
    }
}
