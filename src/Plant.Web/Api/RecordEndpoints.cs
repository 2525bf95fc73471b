using System.Security.Claims;
using System.Text.Json;
using System.Text.Json.Nodes;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Storage;
using Plant.Web.Features.Account;

namespace Plant.Web.Api;

/// <summary>Read, create, amend and withdraw the records of one kind.</summary>
public static class RecordEndpoints
{
    public static void MapRecords<TRecord, TFields, TService>(this IEndpointRouteBuilder api, string resource, Duty write)
        where TRecord : class, IRecord
        where TFields : class, IFields, new()
        where TService : RecordService<TRecord, TFields>
    {
        var group = api.MapGroup("/" + resource).WithTags(resource);
        group.MapGet("", async (TService service, ClaimsPrincipal user, HttpContext http, string? tag, int? limit, Guid? cursor, CancellationToken stop) =>
        {
            var outcome = await service.ListAsync(user.ToActor(), tag, limit ?? 100, cursor, stop);
            if (!outcome.IsDone)
            {
                return Problem.Of(outcome);
            }

            if (outcome.Value!.NextCursor is { } next)
            {
                http.Response.Headers.Link = $"<{http.Request.Path}{QueryString.Create([new("cursor", next.ToString()), new("limit", $"{limit ?? 100}"), .. tag is null ? [] : new[] { new KeyValuePair<string, string?>("tag", tag) }])}>; rel=\"next\"";
            }

            return TypedResults.Json(new { items = outcome.Value.Items.Select(Write), nextCursor = outcome.Value.NextCursor }, ApiSetup.Json);
        }).RequireAuthorization(Duty.Read.ToString()).Produces<IEnumerable<TFields>>();

        group.MapGet("/{key}", async (TService service, ClaimsPrincipal user, HttpContext http, string key, CancellationToken stop) =>
            Answer(http, await service.GetAsync(user.ToActor(), key, stop), StatusCodes.Status200OK)).RequireAuthorization(Duty.Read.ToString()).Produces<TFields>();

        group.MapPost("", async (TService service, ClaimsPrincipal user, HttpContext http, CancellationToken stop) =>
        {
            var (body, refused) = await Problem.ReadAsync(http.Request, stop);
            if (refused is not null || Take<Guid?>(body!, "id", out var id) is { } badId && (refused = badId) is not null)
            {
                return refused;
            }

            var (fields, unbound) = Problem.Bind<TFields>(body);
            if (unbound is not null)
            {
                return unbound;
            }

            var outcome = await service.CreateAsync(user.ToActor(), id, fields!, stop);
            if (outcome.IsDone)
            {
                http.Response.Headers.Location = $"{http.Request.Path}/{outcome.Value!.Id}";
            }

            return Answer(http, outcome, StatusCodes.Status201Created);
        }).RequireAuthorization(write.ToString()).Accepts<TFields>("application/json").Produces<TFields>(StatusCodes.Status201Created).ProducesProblem(StatusCodes.Status400BadRequest);

        group.MapPut("/{key}", async (TService service, ClaimsPrincipal user, HttpContext http, string key, CancellationToken stop) =>
        {
            var (body, refused) = await Problem.ReadAsync(http.Request, stop);
            if (refused is not null || IfMatch(http.Request, out var token) is { } missing && (refused = missing) is not null)
            {
                return refused;
            }

            _ = Take<Guid?>(body!, "id", out _);
            body!.Remove("version");
            if (Take<string?>(body, "amendReason", out var reason) is { } badReason)
            {
                return badReason;
            }

            var (fields, unbound) = Problem.Bind<TFields>(body);
            return unbound ?? Answer(http, await service.AmendAsync(user.ToActor(), key, token, fields!, reason, stop), StatusCodes.Status200OK);
        }).RequireAuthorization(write.ToString()).Accepts<TFields>("application/json").Produces<TFields>().ProducesProblem(StatusCodes.Status412PreconditionFailed);

        group.MapDelete("/{key}", async (TService service, ClaimsPrincipal user, HttpContext http, TimeProvider clock, string key, string? reason, CancellationToken stop) =>
            IfMatch(http.Request, out var token) is { } missing
                ? missing
                : Answer(http, await service.WithdrawAsync(user.ToActor(), key, token, reason, clock.GetUtcNow().UtcDateTime, stop), StatusCodes.Status200OK))
            .RequireAuthorization(write.ToString()).Produces<TFields>().ProducesProblem(StatusCodes.Status412PreconditionFailed);
    }

    /// <summary>The record with its version.</summary>
    public static IResult Answer<TFields>(HttpContext http, Outcome<Recorded<TFields>> outcome, int status)
    {
        if (!outcome.IsDone)
        {
            return Problem.Of(outcome);
        }

        http.Response.Headers.ETag = $"\"{outcome.Value!.Token}\"";
        return TypedResults.Json(Write(outcome.Value), ApiSetup.Json, statusCode: status);
    }

    private static JsonObject Write<TFields>(Recorded<TFields> record)
    {
        var row = JsonSerializer.SerializeToNode(record.Fields, ApiSetup.Json)!.AsObject();
        row["id"] = record.Id;
        row["version"] = record.Token;
        if (record.Withdrawn)
        {
            row["withdrawn"] = true;
        }

        return row;
    }

    /// <summary>The version that the caller read.</summary>
    public static IResult? IfMatch(HttpRequest request, out Guid token)
    {
        var header = request.Headers.IfMatch.ToString();
        token = Guid.Empty;
        return header.Length == 0 ? Problem.Of(StatusCodes.Status428PreconditionRequired, "If-Match", "", "is needed: send the ETag of the version that you read")
            : Guid.TryParse(header.Trim('"'), out token) ? null
            : Problem.Of(StatusCodes.Status412PreconditionFailed, "If-Match", header, "is no version of this record: read it again");
    }

    private static IResult? Take<T>(JsonObject body, string name, out T? value)
    {
        value = default;
        if (!body.TryGetPropertyValue(name, out var node))
        {
            return null;
        }

        body.Remove(name);
        try
        {
            value = node is null ? default : node.Deserialize<T>(ApiSetup.Json);
            return null;
        }
        catch (JsonException)
        {
            return Problem.Of(StatusCodes.Status400BadRequest, name, node?.ToString() ?? "", "is not of the documented type");
        }
    }
}
