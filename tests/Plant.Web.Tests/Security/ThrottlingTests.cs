using System.Net;
using Plant.Web.Tests.Support;

namespace Plant.Web.Tests.Security;

/// <summary>A server of its own: what is throttled here must not throttle other tests.</summary>
public sealed class ThrottlingTests : IAsyncLifetime
{
    private readonly WebPlant plant = new();

    public ValueTask InitializeAsync() => plant.InitializeAsync();

    public ValueTask DisposeAsync() => plant.DisposeAsync();

    [Fact]
    public async Task Guessing_IsLockedThenThrottled_WhileReadingGoesOn()
    {
        using var http = plant.Anonymous();
        var form = await WebPlant.FormTokenAsync(http, "/account/sign-in");
        var answers = new List<(HttpStatusCode Status, string? Location)>();
        for (var n = 0; n < 24; n++)
        {
            using var content = new FormUrlEncodedContent(new Dictionary<string, string>
            {
                ["email"] = "planner@demo.invalid", ["password"] = $"wrong guess {n}", ["__RequestVerificationToken"] = form,
            });
            using var answer = await http.PostAsync(new Uri("/account/sign-in", UriKind.Relative), content);
            answers.Add((answer.StatusCode, answer.Headers.Location?.ToString()));
        }

        Assert.Contains("failed=wrong", answers[0].Location, StringComparison.Ordinal);
        Assert.Contains("failed=locked", answers[10].Location, StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.TooManyRequests, answers[^1].Status);
        using var live = await http.GetAsync(new Uri("/health/live", UriKind.Relative));
        Assert.Equal(HttpStatusCode.OK, live.StatusCode);
    }
}
