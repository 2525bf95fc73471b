using System.Text.Json;
using System.Text.Json.Serialization;
using Microsoft.AspNetCore.Antiforgery;
using Plant.Physics.Calculators;
using Plant.Register.Access;
using Plant.Register.Laboratory;
using Plant.Register.Reservoirs;
using Plant.Register.Samples;
using Plant.Register.Separators;
using Plant.Register.WorkOrders;
using Plant.Web.Features.Account;

namespace Plant.Web.Api;

/// <summary>The HTTP interface.</summary>
public static class ApiSetup
{
    /// <summary>How messages are written: camelCase, and a member that is not known is refused.</summary>
    public static readonly JsonSerializerOptions Json = new(JsonSerializerDefaults.Web)
    {
        UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
        NumberHandling = JsonNumberHandling.Strict,
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) },
    };

    public static IServiceCollection AddApi(this IServiceCollection services)
    {
        services.ConfigureHttpJsonOptions(options =>
        {
            options.SerializerOptions.UnmappedMemberHandling = Json.UnmappedMemberHandling;
            options.SerializerOptions.NumberHandling = Json.NumberHandling;
            options.SerializerOptions.Converters.Add(new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower));
        });
        return services.AddOpenApi("v1", options => options.AddDocumentTransformer((document, _, _) =>
        {
            document.Info.Title = "Sump Ledger";
            document.Info.Description = "Register, assessments and calculators. Advisory: a person decides; follow local codes and licensed practice. Water content is mg of water per kg of oil.";
            return Task.CompletedTask;
        }));
    }

    public static void MapApi(this WebApplication app)
    {
        app.MapOpenApi("/openapi/{documentName}.json").RequireAuthorization(Duty.Read.ToString());
        var api = app.MapGroup("/api/v1").AddEndpointFilter(RequireOwnFormAsync);
        api.MapRecords<Fluid, FluidFields, FluidService>("fluids", Duty.EditRegister);
        api.MapRecords<Reservoir, ReservoirFields, ReservoirService>("reservoirs", Duty.EditRegister);
        api.MapRecords<Sample, SampleFields, SampleService>("samples", Duty.RecordSamples);
        api.MapRecords<DrainEvent, DrainFields, DrainService>("drains", Duty.RecordWork);
        api.MapRecords<TopUpEvent, TopUpFields, TopUpService>("topups", Duty.RecordWork);
        api.MapRecords<Separator, SeparatorFields, SeparatorService>("separators", Duty.EditRegister);
        api.MapRecords<SeparatorRunEvent, SeparatorRunFields, SeparatorRunService>("separator-runs", Duty.RecordWork);
        api.MapRecords<WorkOrder, WorkOrderFields, WorkOrderService>("work-orders", Duty.PlanWork);
        api.MapRecords<DrainRound, RoundFields, RoundService>("rounds", Duty.PlanWork);
        api.MapRecords<Bottle, BottleFields, BottleService>("bottles", Duty.RecordWork);
        api.MapWorkOrderSteps();
        api.MapReadings();
        api.MapAssessments();
        var calculators = api.MapGroup("/calc").RequireAuthorization(Duty.Read.ToString()).WithTags("calculators");
        calculators.MapCalculator<FluidStateRequest, FluidStateResponse>("fluid-state", FluidStateCalculator.Compute);
        calculators.MapCalculator<WaterSplitRequest, WaterSplitResponse>("water-split", WaterSplitCalculator.Compute);
        calculators.MapCalculator<SettlingRequest, SettlingResponse>("settling", SettlingCalculator.Compute);
        calculators.MapCalculator<TankRequest, TankResponse>("tank", TankCalculator.Compute);
        calculators.MapCalculator<CoalescenceRequest, CoalescenceResponse>("coalescence", CoalescenceCalculator.Compute);
        calculators.MapCalculator<KarlFischerRequest, KarlFischerResponse>("karl-fischer", KarlFischerCalculator.Compute);
        calculators.MapCalculator<CoalescerRequest, CoalescerResponse>("coalescer", CoalescerCalculator.Compute);
        calculators.MapCalculator<ScreenRequest, ScreenResponse>("screen", ScreenCalculator.Compute);
        calculators.MapCalculator<ElectricFieldRequest, ElectricFieldResponse>("electric-field", ElectricFieldCalculator.Compute);
        calculators.MapCalculator<DryDownRequest, DryDownResponse>("dry-down", DryDownCalculator.Compute);
        calculators.MapCalculator<BearingLifeRequest, BearingLifeResponse>("bearing-life", BearingLifeCalculator.Compute);
    }

    /// <summary>A write that rests on the sign-in cookie must carry the page's own antiforgery token; a bearer token cannot be sent by another site.</summary>
    private static async ValueTask<object?> RequireOwnFormAsync(EndpointFilterInvocationContext context, EndpointFilterDelegate next)
    {
        var http = context.HttpContext;
        if (!HttpMethods.IsGet(http.Request.Method) && !HttpMethods.IsHead(http.Request.Method) && !TokenHandler.IsBearer(http.Request)
            && !await http.RequestServices.GetRequiredService<IAntiforgery>().IsRequestValidAsync(http))
        {
            return Problem.Of(StatusCodes.Status400BadRequest, "X-CSRF-Token", "", "a write with the sign-in cookie needs the antiforgery token of the page; use a bearer token instead");
        }

        return await next(context);
    }
}
