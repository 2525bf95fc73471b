using System.Net;
using Microsoft.AspNetCore.Components.Endpoints;
using Microsoft.AspNetCore.Routing;
using Microsoft.Extensions.DependencyInjection;
using Plant.Register.Access;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Security;

/// <summary>Every endpoint and page against every role, over the wire. One that the matrix does not list fails.</summary>
[Collection(WebPlantCollection.Name)]
public sealed class RoleMatrixTests(WebPlant plant)
{
    private static readonly string[] Columns = ["anonymous", .. PlantRole.All];

    private static string File => Path.Combine(AppContext.BaseDirectory, "Security", "role-matrix.csv");

    [Fact]
    public void Matrix_ListsEveryEndpoint()
    {
        var listed = Rows().Select(r => $"{r.Method} {r.Route}").ToHashSet(StringComparer.Ordinal);
        var served = Served().ToHashSet(StringComparer.Ordinal);
        Assert.Equal([], served.Except(listed).Order(StringComparer.Ordinal));
        Assert.Equal([], listed.Except(served).Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task Matrix_HoldsOverTheWire()
    {
        var differences = new List<string>();
        foreach (var role in Columns)
        {
            using var token = role == "anonymous" ? plant.Anonymous() : plant.Token(role);
            using var person = PlantRole.ForPeople.Contains(role) ? await plant.PersonAsync(role) : role == "anonymous" ? plant.Anonymous() : null;
            foreach (var row in Rows())
            {
                var byToken = row.Route.StartsWith("/api/", StringComparison.Ordinal) || row.Route is "/openapi/{documentName}.json" or "/metrics";
                if ((byToken ? token : person) is not { } http)
                {
                    continue;
                }

                using var request = new HttpRequestMessage(new HttpMethod(row.Method), new Uri(Example(row.Route), UriKind.Relative));
                using var answer = await http.SendAsync(request);
                var got = Meaning(answer);
                if (got != row.Expected[role])
                {
                    differences.Add($"{role}: {row.Method} {row.Route}: expected {row.Expected[role]}, got {got} ({(int)answer.StatusCode})");
                }
            }
        }

        Assert.Equal([], differences);
    }

    private static string Meaning(HttpResponseMessage answer) => answer.StatusCode switch
    {
        HttpStatusCode.Unauthorized => "sign-in",
        HttpStatusCode.Forbidden => "no",
        HttpStatusCode.Found when answer.Headers.Location!.OriginalString.Contains("/account/sign-in?returnUrl", StringComparison.Ordinal) => "sign-in",
        HttpStatusCode.Found when answer.Headers.Location!.OriginalString.Contains("/account/denied", StringComparison.Ordinal) => "no",
        HttpStatusCode.TooManyRequests => "too many",
        _ => "yes",
    };

    private static string Example(string route) => System.Text.RegularExpressions.Regex.Replace(route.Replace("{documentName}", "v1", StringComparison.Ordinal), @"\{[^}]+\}", place =>
        place.Value.EndsWith(":guid}", StringComparison.Ordinal) ? Guid.Empty.ToString() : place.Value.EndsWith(":int}", StringComparison.Ordinal) ? "0" : "none");

    private IEnumerable<string> Served() =>
        from endpoint in plant.Services.GetRequiredService<EndpointDataSource>().Endpoints.OfType<RouteEndpoint>()
        let route = "/" + endpoint.RoutePattern.RawText!.Trim('/')
        where !route.StartsWith("/_", StringComparison.Ordinal) && !Path.HasExtension(route.Replace("{documentName}.json", "x", StringComparison.Ordinal)) || route is "/fleet.csv" or "/records.csv"
        where !route.Contains("{**", StringComparison.Ordinal)
        let methods = endpoint.Metadata.GetMetadata<ComponentTypeMetadata>() is not null ? ["GET"] : endpoint.Metadata.GetMetadata<HttpMethodMetadata>()?.HttpMethods ?? ["GET"]
        from method in methods
        select $"{method} {route}";

    private static List<(string Method, string Route, Dictionary<string, string> Expected)> Rows() =>
        [.. System.IO.File.ReadLines(File).Skip(1).Select(line => line.Split(',')).Select(cells => (cells[0], cells[1],
            Columns.Select((role, i) => (role, cells[i + 2])).ToDictionary(p => p.role, p => p.Item2)))];
}
