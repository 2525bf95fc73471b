using System.Text.Json;
using System.Text.Json.Nodes;
using Plant.Advice;
using Plant.Physics;
using Plant.Register.Access;
using Plant.Register.Assessments;
using Plant.Register.Interchange;

namespace Plant.Web.Api;

/// <summary>Assessments.</summary>
public static class AssessmentEndpoints
{
    public static void MapAssessments(this IEndpointRouteBuilder api)
    {
        api.MapGet("/reservoirs/{tag}/assessment", async (AssessmentService assessments, TimeProvider clock, string tag, string? asOf, bool? working, CancellationToken stop) =>
        {
            var time = clock.GetUtcNow();
            if (asOf is not null && !CsvText.TryTime(asOf, out time))
            {
                return Problem.Of(StatusCodes.Status400BadRequest, "asOf", asOf, "must be a time as ISO 8601 with Z or an offset");
            }

            var steps = working == true ? new Working() : null;
            var assessment = await assessments.OneAsync(tag, time.UtcDateTime, steps, stop);
            if (assessment is null)
            {
                return Problem.Plain(StatusCodes.Status404NotFound, $"there is no reservoir {tag}");
            }

            var row = Write(assessment);
            if (steps is not null)
            {
                row["working"] = JsonSerializer.SerializeToNode(steps.Steps, ApiSetup.Json);
            }

            return TypedResults.Json(row, ApiSetup.Json);
        }).RequireAuthorization(Duty.Read.ToString()).WithTags("assessments").Produces<Assessment>();

        api.MapGet("/assessments", async (AssessmentService assessments, TimeProvider clock, string? asOf, CancellationToken stop) =>
        {
            var time = clock.GetUtcNow();
            if (asOf is not null && !CsvText.TryTime(asOf, out time))
            {
                return Problem.Of(StatusCodes.Status400BadRequest, "asOf", asOf, "must be a time as ISO 8601 with Z or an offset");
            }

            var fleet = await assessments.FleetAsync(time.UtcDateTime, stop);
            return TypedResults.Json(new { items = fleet.Select(Write) }, ApiSetup.Json);
        }).RequireAuthorization(Duty.Read.ToString()).WithTags("assessments").Produces<IEnumerable<Assessment>>();
    }

    private static JsonObject Write(Assessment assessment)
    {
        var row = new JsonObject();
        foreach (var (name, value) in AssessmentColumns.All)
        {
            row[name] = value(assessment) switch
            {
                null => null,
                double number => AssessmentColumns.Round(number),
                DateTime time => CsvText.Format(new DateTimeOffset(time, TimeSpan.Zero)),
                var text => (string)text,
            };
        }

        return row;
    }
}
