using System.Security.Claims;
using System.Text.Json.Nodes;
using Plant.Register.Access;
using Plant.Register.Samples;
using Plant.Web.Features.Account;

namespace Plant.Web.Api;

/// <summary>Sensor readings.</summary>
public static class ReadingEndpoints
{
    public static void MapReadings(this IEndpointRouteBuilder api)
    {
        var group = api.MapGroup("/readings").WithTags("readings");
        group.MapPost("", async (ReadingService readings, ClaimsPrincipal user, HttpRequest http, CancellationToken stop) =>
        {
            var (node, refused) = await Problem.ReadNodeAsync(http, stop);
            if (refused is not null)
            {
                return refused;
            }

            // a bare list, or an object that holds it
            var list = node is JsonObject { Count: 1 } holder && holder.ContainsKey("readings") ? holder["readings"] : node;
            var (rows, unbound) = Problem.Bind<List<ReadingFields>>(list);
            if (unbound is not null)
            {
                return unbound;
            }

            var outcome = await readings.PostAsync(user.ToActor(), rows!, stop);
            return outcome.IsDone ? TypedResults.Json(outcome.Value, ApiSetup.Json) : Problem.Of(outcome);
        }).RequireAuthorization(Duty.PostReadings.ToString()).Accepts<List<ReadingFields>>("application/json").Produces<ReadingReceipt>();

        group.MapGet("", async (ReadingService readings, ClaimsPrincipal user, string? tag, int? limit, string? cursor, CancellationToken stop) =>
        {
            if (tag is null)
            {
                return Problem.Of(StatusCodes.Status400BadRequest, "tag", "", "is missing: readings are listed by reservoir");
            }

            var after = Plant.Register.Interchange.CsvText.TryTime(cursor, out var time) ? time : (DateTimeOffset?)null;
            var count = Math.Clamp(limit ?? 1000, 1, 10_000);
            var outcome = await readings.ListAsync(user.ToActor(), tag, after, count, stop);
            return outcome.IsDone
                ? TypedResults.Json(new { items = outcome.Value, nextCursor = outcome.Value!.Count == count ? Plant.Register.Interchange.CsvText.Format(outcome.Value[^1].ReadAt) : null }, ApiSetup.Json)
                : Problem.Of(outcome);
        }).RequireAuthorization(Duty.Read.ToString()).Produces<IEnumerable<ReadingFields>>();
    }
}
