using System.Globalization;
using Plant.Register.Access;
using Plant.Register.Interchange;

namespace Plant.Web.Features.Records;

/// <summary>The records page's service and its download.</summary>
public static class RecordPages
{
    private const int MostRows = 100_000;

    public static IServiceCollection AddRecords(this IServiceCollection services) => services.AddSingleton<RecordQueries>();

    public static void MapRecords(this IEndpointRouteBuilder routes) =>
        routes.MapGet("/records.csv", async (RecordQueries queries, HttpContext http, string? kind, string? key, string? person, DateOnly? from, DateOnly? to, CancellationToken stop) =>
        {
            http.Response.ContentType = "text/csv; charset=utf-8";
            http.Response.Headers.ContentDisposition = "attachment; filename=\"records.csv\"";
            await http.Response.WriteAsync("sequence,at,who,what,kind,record,reason,hash\r\n", stop);
            foreach (var entry in await queries.EntriesAsync(new RecordFilter(kind, key, person, from, to, null), MostRows, stop))
            {
                string[] cells = [entry.Sequence.ToString(CultureInfo.InvariantCulture), entry.At.ToString("yyyy-MM-ddTHH:mm:ss.fffZ", CultureInfo.InvariantCulture),
                    .. new[] { entry.Actor, entry.Action, entry.Kind, entry.Key, entry.Reason ?? "", entry.Hash }.Select(CsvText.Quote)];
                await http.Response.WriteAsync(string.Join(',', cells) + "\r\n", stop);
            }
        }).RequireAuthorization(Duty.Read.ToString()).ExcludeFromDescription();
}
