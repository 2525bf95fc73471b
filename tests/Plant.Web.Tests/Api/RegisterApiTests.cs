using System.Net;
using System.Net.Http.Json;
using System.Text;
using System.Text.Json.Nodes;
using Plant.Register.Access;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Api;

[Collection(WebPlantCollection.Name)]
public sealed class RegisterApiTests(WebPlant plant)
{
    [Fact]
    public async Task Fluid_CreatedReadAmendedWithdrawn()
    {
        using var http = plant.Token(PlantRole.Planner);
        var id = Guid.CreateVersion7();
        var fluid = new { id, code = "API-1", name = "Oil", family = "mineral", density15KgM3 = 870.0 };
        using var made = await http.PostAsJsonAsync("/api/v1/fluids", fluid);
        Assert.Equal(HttpStatusCode.Created, made.StatusCode);
        using var again = await http.PostAsJsonAsync("/api/v1/fluids", fluid);
        Assert.Equal(made.Headers.ETag, again.Headers.ETag);

        using var without = await http.PutAsJsonAsync("/api/v1/fluids/API-1", new { code = "API-1", name = "Oil", family = "mineral" });
        Assert.Equal(HttpStatusCode.PreconditionRequired, without.StatusCode);
        using var amended = await PutAsync(http, made.Headers.ETag!.Tag, new { code = "API-1", name = "Better oil", family = "mineral", amendReason = "the name was mistyped" });
        Assert.Equal(HttpStatusCode.OK, amended.StatusCode);
        using var stale = await PutAsync(http, made.Headers.ETag.Tag, new { code = "API-1", name = "Other oil", family = "mineral", amendReason = "somebody else's idea" });
        Assert.Equal(HttpStatusCode.PreconditionFailed, stale.StatusCode);

        using var delete = new HttpRequestMessage(HttpMethod.Delete, "/api/v1/fluids/API-1?reason=no%20longer%20in%20use");
        delete.Headers.TryAddWithoutValidation("If-Match", amended.Headers.ETag!.Tag);
        using var withdrawn = await http.SendAsync(delete);
        Assert.Equal(HttpStatusCode.OK, withdrawn.StatusCode);
        using var gone = await http.GetAsync(new Uri("/api/v1/fluids/API-1", UriKind.Relative));
        Assert.Equal(HttpStatusCode.NotFound, gone.StatusCode);
    }

    [Theory]
    [InlineData("{\"code\":\"X\",\"name\":\"Oil\",\"family\":\"petrol\"}", "family")]
    [InlineData("{\"code\":\"X\",\"name\":\"Oil\",\"family\":\"mineral\",\"colour\":\"red\"}", "colour")]
    [InlineData("{\"code\":\"X\",\"name\":\"Oil\",\"family\":\"mineral\",\"density15KgM3\":\"870\"}", "density15KgM3")]
    [InlineData("{\"code\":\"X\",\"name\":\"Oil\",\"family\":\"mineral\",\"density15KgM3\":-870}", "density15KgM3")]
    [InlineData("{\"code\":\"X\"", "body")]
    [InlineData("[]", "body")]
    public async Task BadBody_IsAProblemThatNamesTheField(string body, string field)
    {
        using var http = plant.Token(PlantRole.Planner);
        using var content = new StringContent(body, Encoding.UTF8, "application/json");
        using var answer = await http.PostAsync(new Uri("/api/v1/fluids", UriKind.Relative), content);
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Equal("application/problem+json", answer.Content.Headers.ContentType!.MediaType);
        var problem = JsonNode.Parse(await answer.Content.ReadAsStringAsync())!;
        Assert.NotNull(problem["errors"]![field]);
        Assert.DoesNotContain(" at Plant.", problem.ToJsonString(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task List_IsPagedWithALink()
    {
        using var http = plant.Token(PlantRole.Lab);
        using var answer = await http.GetAsync(new Uri("/api/v1/reservoirs?limit=50", UriKind.Relative));
        var page = JsonNode.Parse(await answer.Content.ReadAsStringAsync())!;
        Assert.Equal(50, page["items"]!.AsArray().Count);
        Assert.Contains("rel=\"next\"", Assert.Single(answer.Headers.GetValues("Link")), StringComparison.Ordinal);
        Assert.True(page["items"]![0]!["oilVolumeL"]!.GetValue<double>() > 0);
    }

    [Fact]
    public async Task Readings_RepeatedPost_HasOneEffect()
    {
        using var http = plant.Token(PlantRole.Sensor);
        using var reader = plant.Token(PlantRole.Lab);
        var list = JsonNode.Parse(await reader.GetStringAsync(new Uri("/api/v1/reservoirs?limit=1", UriKind.Relative)))!;
        var tag = list["items"]![0]!["tag"]!.GetValue<string>();
        var batch = Enumerable.Range(0, 10_000).Select(i => new { tag, readAt = new DateTime(2020, 1, 1, 0, 0, 0, DateTimeKind.Utc).AddMinutes(i), waterActivity = 0.5 }).ToArray();
        using var first = await http.PostAsJsonAsync("/api/v1/readings", batch);
        using var second = await http.PostAsJsonAsync("/api/v1/readings", batch);
        Assert.Equal("{\"stored\":10000,\"unchanged\":0}", await first.Content.ReadAsStringAsync());
        Assert.Equal("{\"stored\":0,\"unchanged\":10000}", await second.Content.ReadAsStringAsync());
        using var many = await http.PostAsJsonAsync("/api/v1/readings", batch.Append(batch[0]).ToArray());
        Assert.Equal(HttpStatusCode.BadRequest, many.StatusCode);
    }

    [Fact]
    public async Task Assessment_HasTheColumnsOfTheFile_AndTheWorkingOnDemand()
    {
        using var http = plant.Token(PlantRole.Planner);
        var list = JsonNode.Parse(await http.GetStringAsync(new Uri("/api/v1/reservoirs?limit=1", UriKind.Relative)))!;
        var tag = Uri.EscapeDataString(list["items"]![0]!["tag"]!.GetValue<string>());
        var plain = JsonNode.Parse(await http.GetStringAsync(new Uri($"/api/v1/reservoirs/{tag}/assessment?asOf=2026-11-30T00:00:00Z", UriKind.Relative)))!.AsObject();
        Assert.Equal(Plant.Register.Interchange.AssessmentColumns.All.Select(c => c.Name), plain.Select(p => p.Key));
        var worked = JsonNode.Parse(await http.GetStringAsync(new Uri($"/api/v1/reservoirs/{tag}/assessment?working=true", UriKind.Relative)))!;
        Assert.True(worked["working"]!.AsArray().Count > 2);
        Assert.NotNull(worked["working"]![0]!["source"]);
    }

    [Fact]
    public async Task OpenApi_Is31AndDescribesTheCalculators()
    {
        using var http = plant.Token(PlantRole.Planner);
        var document = JsonNode.Parse(await http.GetStringAsync(new Uri("/openapi/v1.json", UriKind.Relative)))!;
        Assert.StartsWith("3.1", document["openapi"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.NotNull(document["paths"]!["/api/v1/calc/water-split"]);
        Assert.NotNull(document["paths"]!["/api/v1/reservoirs"]);
        Assert.DoesNotContain("/account", document["paths"]!.ToJsonString(), StringComparison.Ordinal);
    }

    private static async Task<HttpResponseMessage> PutAsync(HttpClient http, string tag, object body)
    {
        using var request = new HttpRequestMessage(HttpMethod.Put, "/api/v1/fluids/API-1") { Content = JsonContent.Create(body) };
        request.Headers.TryAddWithoutValidation("If-Match", tag);
        return await http.SendAsync(request);
    }
}
