using Microsoft.EntityFrameworkCore;
using Plant.Register.Audit;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Storage;
using Plant.Register.Tests.Storage;

namespace Plant.Register.Tests.Audit;

[Collection(PlantsCollection.Name)]
public sealed class VerifyTests(Plants plants)
{
    public static TheoryData<Engine, string, string> Alterations
    {
        get
        {
            var data = new TheoryData<Engine, string, string>();
            foreach (var engine in Enum.GetValues<Engine>())
            {
                data.Add(engine, "UPDATE samples SET \"WaterPpm\" = 121", "sample");
                data.Add(engine, "UPDATE drains SET \"WaterL\" = \"WaterL\" + 1", "drain");
                data.Add(engine, "UPDATE fluids SET \"Name\" = 'Oil m'", "fluid");
                data.Add(engine, "UPDATE reservoirs SET \"OilVolumeL\" = 1001", "reservoir");
                data.Add(engine, "UPDATE readings SET \"WaterActivity\" = 0.5001", "reading");
                data.Add(engine, "DELETE FROM drains", "drain");
                data.Add(engine, "UPDATE revisions SET \"Content\" = '[]'", "revision");
                data.Add(engine, "UPDATE audit_entries SET \"Actor\" = 'nobody' WHERE \"Sequence\" = 2", "entry 2");
                data.Add(engine, "UPDATE audit_entries SET \"Detail\" = '[]' WHERE \"Sequence\" = 3", "entry 3");
                data.Add(engine, "DELETE FROM audit_entries WHERE \"Sequence\" = (SELECT max(\"Sequence\") FROM audit_entries)", "last entries");
            }

            return data;
        }
    }

    [Theory, MemberData(nameof(Alterations))]
    public async Task Verify_AfterAnAlteration_NamesIt(Engine engine, string alteration, string named)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await FillAsync(plant);
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
        await using (var context = await plant.OpenAsync())
        {
            Assert.True(await context.Database.ExecuteSqlRawAsync(alteration) > 0);
        }

        var findings = await plant.Get<AuditVerifier>().VerifyAsync();
        Assert.Contains(findings, finding => finding.Contains(named, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Backup_WhileWriting_IsSoundAndComplete()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await FillAsync(plant);
        var copy = Path.Combine(plant.Folder, "copy.db");
        using var stop = new CancellationTokenSource();
        var writing = Task.Run(async () =>
        {
            for (var i = 100; !stop.IsCancellationRequested; i++)
            {
                await plant.Get<DrainService>().CreateAsync(TestPlant.Planner, null, new DrainFields { Tag = "R1", DrainedAt = RegisterTests.At(i), WaterL = 1 });
            }
        });
        await using (var context = await plant.OpenAsync())
        {
            await plant.Get<IDatabaseEngine>().BackupAsync(context, copy, CancellationToken.None);
        }

        await stop.CancelAsync();
        await writing;
        var kept = "";
        await using (var context = await plant.OpenAsync())
        {
            kept = await plant.Get<IDatabaseEngine>().RestoreAsync(context, copy, CancellationToken.None);
        }

        Assert.True(File.Exists(kept));
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task Restore_OfADamagedCopy_IsRefusedAndReplacesNothing(bool truncated)
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await FillAsync(plant);
        var copy = Path.Combine(plant.Folder, "copy.db");
        await using var context = await plant.OpenAsync();
        await plant.Get<IDatabaseEngine>().BackupAsync(context, copy, CancellationToken.None);
        var bytes = await File.ReadAllBytesAsync(copy);
        if (truncated)
        {
            bytes = bytes[..(bytes.Length / 2)];
        }
        else
        {
            Array.Fill(bytes, (byte)0xA5, 2 * 4096, 3 * 4096);
        }

        await File.WriteAllBytesAsync(copy, bytes);
        await Assert.ThrowsAsync<InvalidDataException>(() => plant.Get<IDatabaseEngine>().RestoreAsync(context, copy, CancellationToken.None));
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
    }

    private static async Task FillAsync(TestPlant plant)
    {
        await RegisterTests.SeedAsync(plant);
        await plant.Get<SampleService>().CreateAsync(TestPlant.Lab, null, RegisterTests.Sample("S1"));
        var drain = (await plant.Get<DrainService>().CreateAsync(TestPlant.Planner, null, new DrainFields { Tag = "R1", DrainedAt = RegisterTests.At(5), WaterL = 2 })).Value!;
        var amended = await plant.Get<DrainService>().AmendAsync(TestPlant.Planner, drain.Id.ToString(), drain.Token, drain.Fields with { WaterL = 3 }, "read off the wrong mark");
        Assert.True(amended.IsDone, amended.Message);
        await plant.Get<ReadingService>().PostAsync(TestPlant.Planner, [new ReadingFields { Tag = "R1", ReadAt = RegisterTests.At(6), WaterActivity = 0.5 }]);
    }
}
