using Microsoft.EntityFrameworkCore;
using Plant.Register.Access;
using Plant.Register.Audit;
using Plant.Register.Laboratory;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Tests.Storage;
using Plant.Register.WorkOrders;

namespace Plant.Register.Tests.WorkOrders;

[Collection(PlantsCollection.Name)]
public sealed class WorkOrderStepsTests(Plants plants)
{
    private static readonly Actor Supervisor = new("supervisor@test", new HashSet<string> { PlantRole.Supervisor });
    private static readonly Actor Other = new("other@test", new HashSet<string> { PlantRole.Supervisor });
    private static readonly Actor[] Everybody = [TestPlant.Planner, TestPlant.Lab, Supervisor, Other, TestPlant.Administrator];

    public static TheoryData<Engine> Engines => [Engine.Sqlite, Engine.PostgreSql];

    [Theory, MemberData(nameof(Engines))]
    public async Task Order_FromDraftToClosed_EntersTheRegisterAndIsVerified(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await FillAsync(plant);
        var order = await DraftAsync(plant);
        Assert.NotNull(order.Evidence);
        Assert.NotEmpty(WorkOrderDrafter.EvidenceOf(order)!.Steps);
        order = await StepAsync(plant, TestPlant.Planner, order, "submit");
        order = await StepAsync(plant, Supervisor, order, "approve");
        Assert.Equal("supervisor@test", order.DecidedBy);
        order = await StepAsync(plant, TestPlant.Lab, order, "begin");
        plant.Clock.Advance(TimeSpan.FromHours(2));
        order = await TakenAsync(plant, TestPlant.Lab, order, new WorkOrderStepFields { Step = "finish", Findings = "drained until oil came", DrainedWaterL = 12.5 });
        await using (var context = await plant.OpenAsync())
        {
            var drain = await context.Drains.SingleAsync();
            Assert.Equal((12.5, order.DoneAt), (drain.WaterL, (DateTime?)drain.DrainedAt));
        }

        var early = await plant.Get<WorkOrderSteps>().TakeAsync(TestPlant.Planner, order.Number, order.Token, new WorkOrderStepFields { Step = "verify" });
        Assert.Contains("no sample", early.Refusals[0].Reason, StringComparison.Ordinal);
        plant.Clock.Advance(TimeSpan.FromDays(2));
        await SampleAsync(plant, "AFTER", plant.Clock.GetUtcNow(), 90);
        order = await StepAsync(plant, TestPlant.Planner, order, "verify");
        Assert.Equal(("AFTER", 90.0), (order.VerifiedBySample, order.FoundPpm!.Value));
        Assert.True(order.ExpectedLowPpm < order.ExpectedHighPpm);
        order = await StepAsync(plant, TestPlant.Planner, order, "close");
        Assert.Equal(WorkOrderState.Closed, order.State);
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task OwnOrder_IsNeverDecidedByItsAuthor_NotEvenAfterAnEdit(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await FillAsync(plant);
        var order = await DraftAsync(plant, Supervisor);
        order = await StepAsync(plant, Supervisor, order, "submit");
        var own = await plant.Get<WorkOrderSteps>().TakeAsync(Supervisor, order.Number, order.Token, new WorkOrderStepFields { Step = "approve" });
        Assert.Equal(OutcomeKind.Forbidden, own.Kind);
        Assert.Contains("your own", own.Message, StringComparison.Ordinal);

        var orders = plant.Get<WorkOrderService>();
        var read = (await orders.GetAsync(Other, order.Number)).Value!;
        var edited = await orders.AmendAsync(Other, order.Number, read.Token, read.Fields with { Task = "Drain twice." }, "one drain is not enough");
        Assert.True(edited.IsDone, edited.Message);
        Assert.Equal("other@test", edited.Value!.Fields.Author);
        var editor = await plant.Get<WorkOrderSteps>().TakeAsync(Other, order.Number, edited.Value.Token, new WorkOrderStepFields { Step = "approve" });
        Assert.Equal(OutcomeKind.Forbidden, editor.Kind);
        var former = await plant.Get<WorkOrderSteps>().TakeAsync(Supervisor, order.Number, edited.Value.Token, new WorkOrderStepFields { Step = "approve" });
        Assert.True(former.IsDone, former.Message);
    }

    [Theory, MemberData(nameof(Engines))]
    public async Task TwoSupervisors_AtTheSameTime_OneDecidesAndTheOtherIsToldWho(Engine engine)
    {
        await using var plant = await plants.EmptyAsync(engine);
        await FillAsync(plant);
        var order = await StepAsync(plant, TestPlant.Planner, await DraftAsync(plant), "submit");
        var steps = plant.Get<WorkOrderSteps>();
        var both = await Task.WhenAll(
            steps.TakeAsync(Supervisor, order.Number, order.Token, new WorkOrderStepFields { Step = "approve" }),
            steps.TakeAsync(Other, order.Number, order.Token, new WorkOrderStepFields { Step = "reject", Note = "the sump was drained yesterday" }));
        var loser = Assert.Single(both, o => !o.IsDone);
        var winner = Assert.Single(both, o => o.IsDone);
        Assert.Equal(OutcomeKind.Stale, loser.Kind);
        Assert.Contains(winner.Value!.DecidedBy!, loser.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task RandomSteps_OfAllRoles_NeverLeaveTheStateMachine()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await FillAsync(plant);
        var random = new Random(11);
        var steps = plant.Get<WorkOrderSteps>();
        var order = await DraftAsync(plant);
        var taken = 0;
        for (var n = 0; n < 1500; n++)
        {
            if (WorkOrderRules.Next(order.State, WorkOrderStep.Close) is null && Enum.GetValues<WorkOrderStep>().All(s => WorkOrderRules.Next(order.State, s) is null))
            {
                order = await DraftAsync(plant, random.Next(2) == 0 ? TestPlant.Planner : Supervisor);
            }

            var actor = Everybody[random.Next(Everybody.Length)];
            var step = (WorkOrderStep)random.Next(Enum.GetValues<WorkOrderStep>().Length);
            var fields = new WorkOrderStepFields { Step = Plant.Physics.Code.Of(step), Note = "a reason in words", Findings = "water", DrainedWaterL = 1 };
            var before = order.State;
            plant.Clock.Advance(TimeSpan.FromSeconds(1));
            var outcome = await steps.TakeAsync(actor, order.Number, order.Token, fields);
            if (!outcome.IsDone)
            {
                Assert.True(outcome.Kind is OutcomeKind.Forbidden or OutcomeKind.Conflict or OutcomeKind.Invalid, outcome.Kind.ToString());
                continue;
            }

            taken++;
            Assert.Equal(WorkOrderRules.Next(before, step), outcome.Value!.State);
            Assert.True(actor.May(WorkOrderRules.DutyOf(step)));
            if (step is WorkOrderStep.Approve or WorkOrderStep.Reject or WorkOrderStep.AskBack)
            {
                Assert.NotEqual(outcome.Value.Author, actor.Name);
            }

            order = await ReadAsync(plant, order.Number);
        }

        Assert.True(taken > 40, $"only {taken} steps were taken");
        Assert.Empty(await plant.Get<AuditVerifier>().VerifyAsync());
    }

    [Fact]
    public async Task Decision_WithAnOldProof_AsksWhoItIs()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await FillAsync(plant);
        var order = await StepAsync(plant, TestPlant.Planner, await DraftAsync(plant), "submit");
        var person = await PersonAsync(plant, PlantRole.Supervisor);
        var old = person with { ConfirmedAt = plant.Clock.GetUtcNow().UtcDateTime.AddMinutes(-11) };
        var outcome = await plant.Get<WorkOrderSteps>().TakeAsync(old, order.Number, order.Token, new WorkOrderStepFields { Step = "approve" });
        Assert.Equal(OutcomeKind.Forbidden, outcome.Kind);
        Assert.Contains("confirm that it is you", outcome.Message, StringComparison.Ordinal);
        var fresh = await plant.Get<WorkOrderSteps>().TakeAsync(old with { ConfirmedAt = plant.Clock.GetUtcNow().UtcDateTime.AddMinutes(-9) }, order.Number, order.Token, new WorkOrderStepFields { Step = "approve" });
        Assert.True(fresh.IsDone, fresh.Message);
    }

    [Fact]
    public async Task RoleTakenAway_WorksAtTheNextWrite()
    {
        await using var plant = await plants.EmptyAsync(Engine.Sqlite);
        await FillAsync(plant);
        var person = await PersonAsync(plant, PlantRole.Planner);
        Assert.True((await plant.Get<WorkOrderDrafter>().DraftAsync(person, ["R1"], null)).IsDone);
        await using (var context = await plant.OpenAsync())
        {
            await context.UserRoles.ExecuteDeleteAsync();
        }

        var after = await plant.Get<WorkOrderDrafter>().DraftAsync(person, ["R1"], null);
        Assert.Equal(OutcomeKind.Forbidden, after.Kind);
        Assert.Contains("sign in again", after.Message, StringComparison.Ordinal);
    }

    private static async Task<Actor> PersonAsync(TestPlant plant, string role)
    {
        await using var context = await plant.OpenAsync();
        var user = new PlantUser { Id = Guid.CreateVersion7(), UserName = $"{role}@people", Email = $"{role}@people" };
        var known = new Microsoft.AspNetCore.Identity.IdentityRole<Guid> { Id = Guid.CreateVersion7(), Name = role, NormalizedName = role.ToUpperInvariant() };
        context.Users.Add(user);
        context.Roles.Add(known);
        context.UserRoles.Add(new() { UserId = user.Id, RoleId = known.Id });
        await context.SaveChangesAsync();
        return new Actor(user.Email, new HashSet<string> { role }) { PersonId = user.Id };
    }

    internal static async Task FillAsync(TestPlant plant)
    {
        Assert.True((await plant.Get<FluidService>().CreateAsync(TestPlant.Planner, null, RegisterTests.Mineral("M1") with { SolubilityA = 7.0895, SolubilityB = 1567 })).IsDone);
        Assert.True((await plant.Get<ReservoirService>().CreateAsync(TestPlant.Planner, null, new ReservoirFields
        {
            Tag = "R1", Name = "Tank", Fluid = "M1", Shape = "rectangular", LengthMm = 2000, WidthMm = 1200, HeightMm = 1000, OilVolumeL = 1800, SuctionHeightMm = 60, OperatingTemperatureC = 55, ColdestTemperatureC = 15,
        })).IsDone);
        for (var week = 8; week > 0; week--)
        {
            await SampleAsync(plant, $"S{week}", plant.Clock.GetUtcNow().AddDays(-7 * week), 100);
        }
    }

    private static async Task SampleAsync(TestPlant plant, string code, DateTimeOffset at, double ppm) =>
        Assert.True((await plant.Get<SampleService>().CreateAsync(TestPlant.Lab, null, new SampleFields { Sample = code, Tag = "R1", TakenAt = at, Point = "return", Method = "kf-coulometric", WaterPpm = ppm, Replicate = 1 })).IsDone);

    private static async Task<WorkOrder> DraftAsync(TestPlant plant, Actor? actor = null)
    {
        var outcome = await plant.Get<WorkOrderDrafter>().DraftAsync(actor ?? TestPlant.Planner, ["R1"], WorkOrderKind.Drain);
        Assert.True(outcome.IsDone, outcome.Message);
        return await ReadAsync(plant, outcome.Value![0]);
    }

    private static async Task<WorkOrder> ReadAsync(TestPlant plant, string number)
    {
        await using var context = await plant.OpenAsync();
        return await context.WorkOrders.AsNoTracking().SingleAsync(o => o.Number == number);
    }

    private static Task<WorkOrder> StepAsync(TestPlant plant, Actor actor, WorkOrder order, string step) => TakenAsync(plant, actor, order, new WorkOrderStepFields { Step = step });

    private static async Task<WorkOrder> TakenAsync(TestPlant plant, Actor actor, WorkOrder order, WorkOrderStepFields fields)
    {
        var outcome = await plant.Get<WorkOrderSteps>().TakeAsync(actor, order.Number, order.Token, fields);
        Assert.True(outcome.IsDone, outcome.Message ?? string.Join("; ", outcome.Refusals));
        return await ReadAsync(plant, order.Number);
    }
}
