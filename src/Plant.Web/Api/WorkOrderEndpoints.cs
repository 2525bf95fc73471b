using System.Security.Claims;
using Plant.Register.Access;
using Plant.Register.WorkOrders;
using Plant.Web.Features.Account;

namespace Plant.Web.Api;

/// <summary>The steps of work orders.</summary>
public static class WorkOrderEndpoints
{
    public static void MapWorkOrderSteps(this IEndpointRouteBuilder api)
    {
        api.MapPost("/work-orders/{number}/steps", async (WorkOrderSteps steps, WorkOrderService orders, ClaimsPrincipal user, HttpContext http, string number, CancellationToken stop) =>
        {
            var (body, refused) = await Problem.ReadAsync(http.Request, stop);
            if (refused is not null || RecordEndpoints.IfMatch(http.Request, out var token) is { } missing && (refused = missing) is not null)
            {
                return refused;
            }

            var (fields, unbound) = Problem.Bind<WorkOrderStepFields>(body);
            if (unbound is not null)
            {
                return unbound;
            }

            var outcome = await steps.TakeAsync(user.ToActor(), number, token, fields!, stop);
            return outcome.IsDone ? RecordEndpoints.Answer(http, await orders.GetAsync(user.ToActor(), number, stop), StatusCodes.Status200OK) : Problem.Of(outcome);
        }).RequireAuthorization(Duty.Read.ToString()).WithTags("work-orders").Accepts<WorkOrderStepFields>("application/json").Produces<WorkOrderFields>()
            .ProducesProblem(StatusCodes.Status409Conflict).ProducesProblem(StatusCodes.Status412PreconditionFailed);

        api.MapPost("/work-orders/drafts", async (WorkOrderDrafter drafter, ClaimsPrincipal user, HttpContext http, CancellationToken stop) =>
        {
            var (body, refused) = await Problem.ReadAsync(http.Request, stop);
            if (refused is not null)
            {
                return refused;
            }

            var (fields, unbound) = Problem.Bind<DraftRequest>(body);
            if (unbound is not null)
            {
                return unbound;
            }

            WorkOrderKind? kind = null;
            if (fields!.Kind is { Length: > 0 } code)
            {
                if (!Plant.Physics.Code.TryParse<WorkOrderKind>(code, out var known))
                {
                    return Problem.Of(StatusCodes.Status400BadRequest, "kind", code, $"must be one of {string.Join(", ", Plant.Physics.Code.All<WorkOrderKind>())}");
                }

                kind = known;
            }

            var outcome = await drafter.DraftAsync(user.ToActor(), fields.Tags ?? [], kind, stop);
            return outcome.IsDone ? TypedResults.Json(new { numbers = outcome.Value }, ApiSetup.Json, statusCode: StatusCodes.Status201Created) : Problem.Of(outcome);
        }).RequireAuthorization(Duty.PlanWork.ToString()).WithTags("work-orders").Accepts<DraftRequest>("application/json").ProducesProblem(StatusCodes.Status400BadRequest);
    }

    /// <summary>Asks for drafts from the advice.</summary>
    /// <param name="Tags">Reservoirs.</param>
    /// <param name="Kind">Kind of work; empty: what the advice calls for first.</param>
    public sealed record DraftRequest(IReadOnlyList<string>? Tags, string? Kind);
}
