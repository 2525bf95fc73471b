using System.Text.Json;
using System.Text.Json.Nodes;
using Microsoft.AspNetCore.Mvc;
using Plant.Physics;
using Plant.Register;

namespace Plant.Web.Api;

/// <summary>Errors as problem details, with the fields named.</summary>
public static class Problem
{
    public static IResult Of(int status, string field, string value, string reason) => Of(status, [new Refusal(field, value, reason)]);

    public static IResult Of(int status, IReadOnlyList<Refusal> refusals)
    {
        var problem = new ProblemDetails
        {
            Status = status,
            Title = status == StatusCodes.Status400BadRequest ? "The input is refused." : "The request is refused.",
            Detail = string.Join("; ", refusals.Take(5).Select(r => $"{r.Field} {(r.Value.Length > 0 ? $"\"{r.Value}\" " : "")}{r.Reason}")),
        };
        problem.Extensions["errors"] = refusals.GroupBy(r => r.Field).ToDictionary(g => g.Key, g => g.Select(r => r.Reason).ToArray());
        problem.Extensions["refusals"] = refusals.Select(r => new { pointer = "/" + r.Field.Replace('.', '/').Replace("[", "/", StringComparison.Ordinal).Replace("]", "", StringComparison.Ordinal), r.Field, r.Value, r.Reason }).ToArray();
        return TypedResults.Problem(problem);
    }

    /// <summary>The status of a refused write.</summary>
    public static IResult Of<T>(Outcome<T> outcome) => outcome.Kind switch
    {
        OutcomeKind.Invalid => Of(StatusCodes.Status400BadRequest, outcome.Refusals),
        OutcomeKind.NotFound => Plain(StatusCodes.Status404NotFound, outcome.Message),
        OutcomeKind.Forbidden => Plain(StatusCodes.Status403Forbidden, outcome.Message),
        OutcomeKind.Stale => Plain(StatusCodes.Status412PreconditionFailed, outcome.Message),
        OutcomeKind.Conflict => Plain(StatusCodes.Status409Conflict, outcome.Message),
        _ => throw new InvalidOperationException("a done write is no problem"),
    };

    public static IResult Plain(int status, string? detail) => TypedResults.Problem(detail, statusCode: status);

    /// <summary>Reads the body as an object; a malformed one is refused with the place, never with a stack.</summary>
    public static async Task<(JsonObject? Body, IResult? Refused)> ReadAsync(HttpRequest request, CancellationToken cancellation)
    {
        var (node, refused) = await ReadNodeAsync(request, cancellation);
        return node is JsonObject body ? (body, null) : (null, refused ?? Of(StatusCodes.Status400BadRequest, "body", "", "must be a JSON object"));
    }

    public static async Task<(JsonNode? Node, IResult? Refused)> ReadNodeAsync(HttpRequest request, CancellationToken cancellation)
    {
        if (!request.HasJsonContentType())
        {
            return (null, Of(StatusCodes.Status415UnsupportedMediaType, "Content-Type", request.ContentType ?? "", "must be application/json"));
        }

        try
        {
            return (await JsonNode.ParseAsync(request.Body, cancellationToken: cancellation), null);
        }
        catch (JsonException malformed)
        {
            return (null, Of(StatusCodes.Status400BadRequest, "body", "", FormattableString.Invariant($"is no JSON at line {malformed.LineNumber + 1}, byte {malformed.BytePositionInLine}")));
        }
    }

    /// <summary>Binds a node to a type; the member that does not fit is named.</summary>
    public static (T? Value, IResult? Refused) Bind<T>(JsonNode? node)
        where T : class
    {
        try
        {
            return node.Deserialize<T>(ApiSetup.Json) is { } value ? (value, null) : (null, Of(StatusCodes.Status400BadRequest, "body", "", "is empty"));
        }
        catch (JsonException mismatch)
        {
            var field = mismatch.Path is { Length: > 2 } path && path.StartsWith("$.", StringComparison.Ordinal) ? path[2..] : "body";
            var unknown = mismatch.Message.Contains("could not be mapped", StringComparison.Ordinal);
            if (unknown)
            {
                var quoted = mismatch.Message.Split('\'');
                field = quoted.Length > 1 ? (field is "body" ? quoted[1] : field) : field;
            }

            return (null, Of(StatusCodes.Status400BadRequest, field, "", unknown ? "is no member of this message" : $"must be {Wanted(mismatch.Message)}"));
        }
    }

    private static string Wanted(string message) =>
        message.Contains("Double", StringComparison.Ordinal) ? "a number" : message.Contains("DateTime", StringComparison.Ordinal) ? "a time as ISO 8601 with an offset or Z"
        : message.Contains("Boolean", StringComparison.Ordinal) ? "true or false" : message.Contains("String", StringComparison.Ordinal) ? "a text" : "of the documented type";
}
