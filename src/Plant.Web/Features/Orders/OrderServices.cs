using System.Security.Claims;
using Microsoft.AspNetCore.Mvc;
using Plant.Register.Access;
using Plant.Register.WorkOrders;
using Plant.Web.Features.Account;

namespace Plant.Web.Features.Orders;

/// <summary>The services of the order pages, and where their forms post to.</summary>
public static class OrderServices
{
    public static IServiceCollection AddOrders(this IServiceCollection services) => services.AddSingleton<OrderQueries>();

    public static void MapOrders(this IEndpointRouteBuilder routes)
    {
        routes.MapPost("/draft-orders", async (WorkOrderDrafter drafter, ClaimsPrincipal user, [FromForm] DraftForm form, CancellationToken stop) =>
        {
            var outcome = await drafter.DraftAsync(user.ToActor(), form.Tag ?? [], Plant.Register.Storage.Rule.Parse<WorkOrderKind>(form.Kind), stop);
            return outcome is { IsDone: true, Value: { Count: 1 } one } ? TypedResults.LocalRedirect($"/orders/{one[0]}")
                : outcome.IsDone ? TypedResults.LocalRedirect("/orders?mine=true")
                : TypedResults.LocalRedirect($"/orders?message={Uri.EscapeDataString(OrderQueries.Told(outcome))}");
        }).RequireAuthorization(Duty.PlanWork.ToString()).ExcludeFromDescription();
    }

    /// <summary>Reservoirs to draft orders for.</summary>
    public sealed record DraftForm
    {
        public List<string>? Tag { get; set; }

        public string? Kind { get; set; }
    }
}
