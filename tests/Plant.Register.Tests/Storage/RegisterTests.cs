using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Storage;
using Plant.Register.WorkOrders;

namespace Plant.Register.Tests.Storage;

[Collection(PlantsCollection.Name)]
public sealed class RegisterTests(Plants plants)
{
    public static TheoryData<Engine> Engines => [Engine.Sqlite, Engine.PostgreSql];

    [Theory, MemberData(nameof(Engines))]
    public async Task Model_AfterMigration_HasNoPendingChanges(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await using var context = await plant.OpenAsync();
        Assert.False(context.Database.HasPendingModelChanges());
        Assert.Empty(await context.Database.GetPendingMigrationsAsync());
    }

    [Fact]
    public async Task Sqlite_EveryConnection_IsDurable()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await using var context = await plant.OpenAsync();
        await context.Database.OpenConnectionAsync();
        foreach (var (pragma, wanted) in new[] { ("journal_mode", "wal"), ("synchronous", "2"), ("foreign_keys", "1"), ("busy_timeout", "5000") })
        {
            await using var command = context.Database.GetDbConnection().CreateCommand();
            command.CommandText = $"PRAGMA {pragma}";
            Assert.Equal(wanted, Convert.ToString(await command.ExecuteScalarAsync(), System.Globalization.CultureInfo.InvariantCulture));
        }
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Create_Repeated_HasOneEffect(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var id = Guid.CreateVersion7();
        var fields = Mineral("M1");
        var first = await plant.Get<FluidService>().CreateAsync(TestPlant.Planner, id, fields);
        var second = await plant.Get<FluidService>().CreateAsync(TestPlant.Planner, id, fields);
        Assert.True(first.IsDone && second.IsDone);
        Assert.Equal(first.Value!.Token, second.Value!.Token);
        var other = await plant.Get<FluidService>().CreateAsync(TestPlant.Planner, id, fields with { Density15KgM3 = 900 });
        Assert.Equal(OutcomeKind.Conflict, other.Kind);
        await using var context = await plant.OpenAsync();
        Assert.Equal(1, await context.Fluids.CountAsync());
        Assert.Equal(1, await context.AuditEntries.CountAsync());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Amend_OfAStaleVersion_IsRefusedAndNamesWho(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var fluids = plant.Get<FluidService>();
        var seen = (await fluids.CreateAsync(TestPlant.Planner, null, Mineral("M1"))).Value!.Token;
        var first = await fluids.AmendAsync(TestPlant.Administrator, "M1", seen, Mineral("M1") with { Density15KgM3 = 871 }, "measured in our laboratory");
        Assert.True(first.IsDone, first.Message);
        var second = await fluids.AmendAsync(TestPlant.Planner, "M1", seen, Mineral("M1") with { Density15KgM3 = 880 }, "from the new data sheet");
        Assert.Equal(OutcomeKind.Stale, second.Kind);
        Assert.Contains("admin@test", second.Message, StringComparison.Ordinal);
        Assert.Equal(871, (await fluids.GetAsync(TestPlant.Planner, "M1")).Value!.Fields.Density15KgM3);
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Amend_InRandomInterleavings_NeverLosesAWrite(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var fluids = plant.Get<FluidService>();
        await fluids.CreateAsync(TestPlant.Planner, null, Mineral("M1"));
        var random = new Random(7);
        var held = new Guid[4];
        for (var i = 0; i < held.Length; i++)
        {
            held[i] = (await fluids.GetAsync(TestPlant.Planner, "M1")).Value!.Token;
        }

        var (saved, stale) = (0, 0);
        for (var step = 0; step < 120; step++)
        {
            var who = random.Next(held.Length);
            if (random.Next(3) == 0)
            {
                held[who] = (await fluids.GetAsync(TestPlant.Planner, "M1")).Value!.Token;
                continue;
            }

            var current = (await fluids.GetAsync(TestPlant.Planner, "M1")).Value!.Token;
            var outcome = await fluids.AmendAsync(TestPlant.Planner, "M1", held[who], Mineral("M1") with { Density15KgM3 = 860 + (step * 0.1) }, "interleaved writes of a test");
            Assert.Equal(held[who] == current ? OutcomeKind.Done : OutcomeKind.Stale, outcome.Kind);
            (saved, stale) = outcome.IsDone ? (saved + 1, stale) : (saved, stale + 1);
        }

        Assert.True(saved > 5 && stale > 5, $"{saved} saved, {stale} stale: the interleavings show nothing");
        await using var context = await plant.OpenAsync();
        Assert.Equal(saved, await context.Revisions.CountAsync());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Amend_KeepsWhatWasSaidBefore(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        var fluids = plant.Get<FluidService>();
        var token = (await fluids.CreateAsync(TestPlant.Planner, null, Mineral("M1"))).Value!.Token;
        var refused = await fluids.AmendAsync(TestPlant.Planner, "M1", token, Mineral("M1") with { Name = "Other" }, "short");
        Assert.Equal("reason", Assert.Single(refused.Refusals).Field);
        Assert.True((await fluids.AmendAsync(TestPlant.Planner, "M1", token, Mineral("M1") with { Name = "Other" }, "the name was mistyped")).IsDone);
        await using var context = await plant.OpenAsync();
        var revision = await context.Revisions.SingleAsync();
        Assert.Contains("\"name\":\"Oil M1\"", revision.Content, StringComparison.Ordinal);
        Assert.Equal(("planner@test", "the name was mistyped", 1), (revision.ReplacedBy, revision.Reason, revision.Number));
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Withdraw_LeavesTheRecordReadableAndCountsForNothing(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await SeedAsync(plant);
        var drains = plant.Get<DrainService>();
        var made = (await drains.CreateAsync(TestPlant.Lab, null, new DrainFields { Tag = "R1", DrainedAt = At(1), WaterL = 3 })).Value!;
        var outcome = await drains.WithdrawAsync(TestPlant.Lab, made.Id.ToString(), made.Token, "entered on the wrong tank", plant.Clock.GetUtcNow().UtcDateTime);
        Assert.True(outcome.IsDone, outcome.Message);
        Assert.Empty((await drains.ListAsync(TestPlant.Lab, "R1", 10, null)).Value!.Items);
        await using var context = await plant.OpenAsync();
        Assert.Equal(3, (await context.Drains.SingleAsync()).WaterL);
        Assert.Equal("withdrawn", (await context.AuditEntries.Where(e => e.Kind == "drain").OrderBy(e => e.Sequence).LastAsync()).Action);
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task List_WalkedByCursor_ShowsEachRecordOnce(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        for (var i = 0; i < 25; i++)
        {
            await plant.Get<FluidService>().CreateAsync(TestPlant.Planner, null, Mineral($"M{i:00}"));
        }

        var seen = new List<string>();
        Guid? cursor = null;
        do
        {
            var page = (await plant.Get<FluidService>().ListAsync(TestPlant.Lab, null, 7, cursor)).Value!;
            seen.AddRange(page.Items.Select(i => i.Fields.Code!));
            cursor = page.NextCursor;
        }
        while (cursor is not null);
        Assert.Equal(25, seen.Count);
        Assert.Equal(25, seen.Distinct().Count());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Writers_EightAtOnce_AllEndAndNoneIsLost(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await SeedAsync(plant);
        await Parallel.ForEachAsync(Enumerable.Range(0, 64), new ParallelOptions { MaxDegreeOfParallelism = 8 }, async (i, _) =>
        {
            var outcome = await plant.Get<DrainService>().CreateAsync(TestPlant.Planner, null, new DrainFields { Tag = "R1", DrainedAt = At(i), WaterL = i });
            Assert.True(outcome.IsDone, outcome.Message);
        });
        await using var context = await plant.OpenAsync();
        Assert.Equal(64, await context.Drains.CountAsync());
        Assert.Empty(await plant.Get<Plant.Register.Audit.AuditVerifier>().VerifyAsync());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task Readings_Repeated_AreStoredOnceAndNeverChanged(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await SeedAsync(plant);
        var readings = plant.Get<ReadingService>();
        var batch = Enumerable.Range(0, 500).Select(i => new ReadingFields { Tag = "R1", ReadAt = At(i), OilTemperatureC = 50 + (i * 0.01), WaterActivity = 0.4 }).ToList();
        Assert.Equal(new ReadingReceipt(500, 0), (await readings.PostAsync(TestPlant.Planner, batch)).Value);
        Assert.Equal(new ReadingReceipt(0, 500), (await readings.PostAsync(TestPlant.Planner, batch)).Value);
        var changed = await readings.PostAsync(TestPlant.Planner, [batch[3] with { OilTemperatureC = 99 }]);
        Assert.Equal(OutcomeKind.Invalid, changed.Kind);
        var future = await readings.PostAsync(TestPlant.Planner, [batch[0] with { ReadAt = plant.Clock.GetUtcNow().AddMinutes(6) }]);
        Assert.Equal("readings[0].readAt", Assert.Single(future.Refusals).Field);
        Assert.Equal(500, (await readings.ListAsync(TestPlant.Lab, "R1", null, 1000)).Value!.Count);
    }

    [Fact]
    public async Task Roles_EachServiceRefusesWhomTheMatrixDoesNotName()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await SeedAsync(plant);
        foreach (var role in PlantRole.All)
        {
            var actor = new Actor(role, new HashSet<string> { role });
            await ExpectAsync(actor, Duty.EditRegister, async () => (await plant.Get<FluidService>().CreateAsync(actor, null, Mineral("X-" + role))).Kind);
            await ExpectAsync(actor, Duty.RecordSamples, async () => (await plant.Get<SampleService>().CreateAsync(actor, null, Sample("S-" + role))).Kind);
            await ExpectAsync(actor, Duty.RecordWork, async () => (await plant.Get<DrainService>().CreateAsync(actor, null, new DrainFields { Tag = "R1", DrainedAt = At(Array.IndexOf(PlantRole.All.ToArray(), role)), WaterL = 1 })).Kind);
            await ExpectAsync(actor, Duty.PlanWork, async () => (await plant.Get<WorkOrderService>().CreateAsync(actor, null, new WorkOrderFields { Number = "W-" + role, Tag = "R1", Kind = "drain", Task = "drain it", Reason = "water stands under the oil" })).Kind);
            await ExpectAsync(actor, Duty.PostReadings, async () => (await plant.Get<ReadingService>().PostAsync(actor, [new ReadingFields { Tag = "R1", ReadAt = At(0), WaterActivity = 0.5 }])).Kind);
            await ExpectAsync(actor, Duty.Administer, async () => (await plant.Get<TokenService>().CreateAsync(actor, "t", PlantRole.Lab, 1)).Kind);
            await ExpectAsync(actor, Duty.Read, async () => (await plant.Get<FluidService>().ListAsync(actor, null, 1, null)).Kind);
        }

        static async Task ExpectAsync(Actor actor, Duty duty, Func<Task<OutcomeKind>> call) =>
            Assert.Equal(actor.May(duty) ? OutcomeKind.Done : OutcomeKind.Forbidden, await call());
    }

    [Fact]
    public async Task Token_IsStoredAsAHashAndExpires()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        var tokens = plant.Get<TokenService>();
        var plain = (await tokens.CreateAsync(TestPlant.Administrator, "gateway", PlantRole.Sensor, 2)).Value!;
        Assert.Equal([PlantRole.Sensor], (await tokens.ValidateAsync(plain))!.Roles);
        Assert.Null(await tokens.ValidateAsync(plain + "0"));
        plant.Clock.Advance(TimeSpan.FromDays(2));
        Assert.Null(await tokens.ValidateAsync(plain));
        await using var context = await plant.OpenAsync();
        Assert.DoesNotContain(plain, (await context.ApiTokens.SingleAsync()).Hash, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Migrate_OfANewerDatabase_RefusesAndTouchesNothing()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await using (var context = await plant.OpenAsync())
        {
            await context.Database.ExecuteSqlRawAsync("INSERT INTO \"__EFMigrationsHistory\" VALUES ('29990101000000_Later', '99')");
        }

        var refused = await Assert.ThrowsAsync<InvalidOperationException>(() => plant.Get<DatabaseMigrator>().MigrateAsync());
        Assert.Contains("29990101000000_Later", refused.Message, StringComparison.Ordinal);
    }

    internal static FluidFields Mineral(string code) => new() { Code = code, Name = $"Oil {code}", Family = "mineral", Viscosity40Mm2S = 46, Viscosity100Mm2S = 6.8, Density15KgM3 = 870 };

    internal static SampleFields Sample(string code) => new()
    {
        Sample = code, Replicate = 1, Tag = "R1", TakenAt = At(1), Point = "return", Method = "kf-coulometric", WaterPpm = 120,
    };

    internal static DateTimeOffset At(int hours) => new DateTimeOffset(2026, 1, 1, 0, 0, 0, TimeSpan.Zero).AddHours(hours);

    internal static async Task SeedAsync(TestPlant plant)
    {
        Assert.True((await plant.Get<FluidService>().CreateAsync(TestPlant.Planner, null, Mineral("M"))).IsDone);
        var outcome = await plant.Get<ReservoirService>().CreateAsync(TestPlant.Planner, null, new ReservoirFields
        {
            Tag = "R1", Name = "Tank", Area = "Hall", Fluid = "M", OilVolumeL = 1000, OperatingTemperatureC = 50, ColdestTemperatureC = 15,
        });
        Assert.True(outcome.IsDone, outcome.Message);
    }
}
