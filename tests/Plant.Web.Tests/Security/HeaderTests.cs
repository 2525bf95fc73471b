using System.Net;
using Plant.Register.Access;
using Plant.Web.Features.Account;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Security;

[Collection(WebPlantCollection.Name)]
public sealed class HeaderTests(WebPlant plant)
{
    [Theory]
    [InlineData("/account/sign-in")]
    [InlineData("/no-such-page")]
    [InlineData("/api/v1/fluids")]
    [InlineData("/health/live")]
    public async Task EveryAnswer_CarriesTheSecurityHeaders(string path)
    {
        using var http = plant.Anonymous();
        using var answer = await http.GetAsync(new Uri(path, UriKind.Relative));
        var policy = Assert.Single(answer.Headers.GetValues("Content-Security-Policy"));
        Assert.DoesNotContain("unsafe-eval", policy, StringComparison.Ordinal);
        Assert.Contains("frame-ancestors 'none'", policy, StringComparison.Ordinal);
        Assert.DoesNotMatch("script-src[^;]*unsafe-inline", policy);
        Assert.Equal("nosniff", Assert.Single(answer.Headers.GetValues("X-Content-Type-Options")));
        Assert.False(answer.Headers.Contains("Server"));
    }

    [Fact]
    public async Task SignOut_EndsTheSession()
    {
        using var http = await plant.PersonAsync(PlantRole.Planner);
        using var before = await http.GetAsync(new Uri("/account", UriKind.Relative));
        Assert.Equal(HttpStatusCode.OK, before.StatusCode);
        using var form = new FormUrlEncodedContent(new Dictionary<string, string> { ["__RequestVerificationToken"] = await WebPlant.FormTokenAsync(http, "/account") });
        using var left = await http.PostAsync(new Uri("/account/sign-out", UriKind.Relative), form);
        using var after = await http.GetAsync(new Uri("/account", UriKind.Relative));
        Assert.Equal(HttpStatusCode.Found, after.StatusCode);
    }

    [Fact]
    public async Task FormWithoutAntiforgeryToken_IsRefused()
    {
        using var http = plant.Anonymous();
        using var form = new FormUrlEncodedContent(new Dictionary<string, string> { ["role"] = PlantRole.Planner });
        using var answer = await http.PostAsync(new Uri("/account/demo", UriKind.Relative), form);
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
    }

    [Fact]
    public async Task WriteByCookieWithoutAntiforgeryToken_IsRefused()
    {
        using var http = await plant.PersonAsync(PlantRole.Planner);
        using var content = new StringContent("{\"code\":\"CSRF\",\"name\":\"x\",\"family\":\"mineral\"}", System.Text.Encoding.UTF8, "application/json");
        using var answer = await http.PostAsync(new Uri("/api/v1/fluids", UriKind.Relative), content);
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains("antiforgery", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/", "/")]
    [InlineData("/register", "/register")]
    [InlineData("//evil.example", "/")]
    [InlineData("/\\evil.example", "/")]
    [InlineData("https://evil.example", "/")]
    [InlineData(null, "/")]
    public void ReturnAddress_StaysOnThisSite(string? given, string used) => Assert.Equal(used, AccountEndpoints.Local(given));
}
