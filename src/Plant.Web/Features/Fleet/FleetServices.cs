using Plant.Register.Access;
using Plant.Register.Interchange;

namespace Plant.Web.Features.Fleet;

/// <summary>The fleet page's services and downloads.</summary>
public static class FleetServices
{
    public static IServiceCollection AddFleet(this IServiceCollection services) => services.AddSingleton<FleetBoard>();

    public static void MapFleet(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/find", async (FleetBoard board, string? q, CancellationToken stop) =>
        {
            var text = q?.Trim() ?? string.Empty;
            var rows = await board.RowsAsync(stop);
            var exact = rows.FirstOrDefault(r => r.Tag.Equals(text, StringComparison.OrdinalIgnoreCase));
            return TypedResults.LocalRedirect(exact is not null ? $"/reservoirs/{Uri.EscapeDataString(exact.Tag)}" : new FleetQuery { Search = text }.Address());
        }).RequireAuthorization(Duty.Read.ToString()).ExcludeFromDescription();

        routes.MapGet("/fleet.csv", async (FleetBoard board, HttpContext http, [AsParameters] FleetFilter filter, CancellationToken stop) =>
        {
            var rows = filter.ToQuery().Apply(await board.RowsAsync(stop));
            http.Response.ContentType = "text/csv; charset=utf-8";
            http.Response.Headers.ContentDisposition = "attachment; filename=\"fleet.csv\"";
            await using var writer = new StringWriter { NewLine = "\r\n" };
            AssessmentColumns.Write(writer, rows.Select(r => r.Assessment));
            await http.Response.WriteAsync(writer.ToString(), stop);
        }).RequireAuthorization(Duty.Read.ToString()).ExcludeFromDescription();
    }

    /// <summary>The filters of the address, for the download.</summary>
    internal sealed record FleetFilter(string? Condition, string? Area, string? Fluid, string? Q, string? Only, string? Order, bool? Desc)
    {
        public FleetQuery ToQuery() => new() { Condition = Condition, Area = Area, Fluid = Fluid, Search = Q, Only = Only, Order = Order ?? "drain", Descending = Desc ?? false };
    }
}
