using System.Security.Claims;
using Microsoft.AspNetCore.Antiforgery;
using Plant.Register;
using Plant.Register.Access;
using Plant.Register.Laboratory;
using Plant.Web.Api;
using Plant.Web.Features.Account;

namespace Plant.Web.Features.Bench;

/// <summary>
/// What the bench's script talks to. Each accepted cell is one request that may be repeated: a cut link or a killed server loses
/// nothing that was told to be saved, and what was not told is kept in the browser and sent again.
/// </summary>
public static class BenchPages
{
    public static void MapBench(this IEndpointRouteBuilder routes)
    {
        var bench = routes.MapGroup("/bench/batches").RequireAuthorization(Duty.RecordSamples.ToString()).AddEndpointFilter(RequireOwnFormAsync).ExcludeFromDescription();
        bench.MapGet("/open", async (BenchService service, ClaimsPrincipal user, CancellationToken stop) => Answer(await service.OpenAsync(user.ToActor(), stop), BenchView.Of));
        bench.MapPut("/{batch:guid}/header", async (BenchService service, ClaimsPrincipal user, Guid batch, BenchHeader header, CancellationToken stop) =>
            Answer(await service.SetHeaderAsync(user.ToActor(), batch, header, stop), BenchView.Of));
        bench.MapPost("/{batch:guid}/scan", async (BenchService service, ClaimsPrincipal user, Guid batch, ScanRequest scan, CancellationToken stop) =>
            Answer(await service.ScanAsync(user.ToActor(), batch, scan.Row, scan.Bottle ?? "", stop), s => new { kind = Plant.Physics.Code.Of(s.Kind), text = s.Text, row = s.Row?.Id }));
        bench.MapPost("/bottles", async (BottleService bottles, ClaimsPrincipal user, TimeProvider clock, BottleRequest bottle, CancellationToken stop) =>
            Answer(await bottles.CreateAsync(user.ToActor(), null, new BottleFields
            {
                Code = bottle.Bottle, Tag = bottle.Tag, Point = "return", TakenAt = DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds()),
            }, stop), b => new { b.Fields.Code }));
        bench.MapPut("/rows/{row:guid}/cells/{cell:int}", async (BenchService service, ClaimsPrincipal user, Guid row, int cell, CellRequest text, CancellationToken stop) =>
            Answer(await service.TypeAsync(user.ToActor(), row, cell, text.Text ?? "", stop), r => new { r.Id, r.Cells }));
        bench.MapPut("/rows/{row:guid}/aside", async (BenchService service, ClaimsPrincipal user, Guid row, AsideRequest aside, CancellationToken stop) =>
            Answer(await service.SetAsideAsync(user.ToActor(), row, aside.Aside, stop), r => new { r.Id, r.SetAside }));
        bench.MapPost("/{batch:guid}/release", async (BenchService service, ClaimsPrincipal user, Guid batch, CancellationToken stop) =>
            Answer(await service.ReleaseAsync(user.ToActor(), batch, stop), released => new { released }));
    }

    private static IResult Answer<T>(Outcome<T> outcome, Func<T, object> view) => outcome.IsDone ? TypedResults.Json(view(outcome.Value!), ApiSetup.Json) : Problem.Of(outcome);

    private static async ValueTask<object?> RequireOwnFormAsync(EndpointFilterInvocationContext context, EndpointFilterDelegate next) =>
        HttpMethods.IsGet(context.HttpContext.Request.Method) || await context.HttpContext.RequestServices.GetRequiredService<IAntiforgery>().IsRequestValidAsync(context.HttpContext)
            ? await next(context)
            : Problem.Of(StatusCodes.Status400BadRequest, "X-CSRF-Token", "", "is missing or old: load the page again; what was typed is kept");

    /// <summary>A scanned bottle, with the id of the row that it is to open.</summary>
    public sealed record ScanRequest(Guid Row, string? Bottle);

    /// <summary>A bottle that nobody logged.</summary>
    public sealed record BottleRequest(string? Bottle, string? Tag);

    /// <summary>A typed cell.</summary>
    public sealed record CellRequest(string? Text);

    /// <summary>Set aside, or taken back.</summary>
    public sealed record AsideRequest(bool Aside);
}
